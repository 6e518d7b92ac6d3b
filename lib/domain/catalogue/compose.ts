import { purposes, type Purpose } from "../entry";
import { plainDocument } from "../plain-list";
import { stationKeys, type Check, type RevisionDocument, type StationKey } from "../revision";
import type { Sheet } from "../sheet/sheet";
import { CATALOGUE } from "./catalogue";
import { checksOf } from "./checks";
import { factsOf } from "./facts";
import { ordersFor } from "./order";

export { CATALOGUE };

/** The revision document of a sheet: the same sheet and catalogue make the same document, and so the same digest. */
export function compose(sheet: Sheet): RevisionDocument {
  const facts = factsOf(sheet);
  const listed = checksOf(facts).filter((one) => one.listed);
  const byKey = new Map(listed.map(({ check }) => [check.key, check]));
  const orders = ordersFor(facts.before);
  const walks = Object.fromEntries(
    purposes.map((purpose) => [purpose, orders[purpose].flatMap((key) => byKey.get(key) ?? [])]),
  ) as Record<Purpose, Check[]>;
  const walked = new Set(Object.values(walks).flat());
  const checks = Object.fromEntries(
    stationKeys.map((station) => [
      station,
      listed.filter((one) => one.station === station && walked.has(one.check)).map(({ check }) => check),
    ]),
  ) as Record<StationKey, Check[]>;
  return plainDocument({ sheet: { ...sheet }, catalogue: CATALOGUE, checks, walks });
}
