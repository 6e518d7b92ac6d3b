import type { Check } from "../revision";
import { entries } from "./catalogue";
import { judge } from "./conditions";
import type { Entry } from "./entry";
import type { Facts } from "./facts";
import type { Reviewed } from "./reviewed";

/** Every check of the catalogue as it reads on one rig, listed or not. */
export function checksOf(facts: Facts): Omit<Reviewed, "walks">[] {
  const judged = entries.map((entry) => ({ entry, ...judge(entry.when, facts) }));
  const keys = new Set(judged.flatMap(({ entry, listed }) => (listed ? [entry.key] : [])));
  return judged.map(({ entry, listed, reason, mayBeAbsent }) => ({
    id: entry.id,
    station: entry.station,
    check: checkOf(entry, facts, { listed: reason, mayBeAbsent }, keys),
    listed,
    reason,
  }));
}

function checkOf(
  { key, effect, words }: Entry,
  facts: Facts,
  judged: Pick<Check, "listed" | "mayBeAbsent">,
  keys: ReadonlySet<string>,
): Check {
  const { touches, ...rest } = words(facts);
  // Mending can change only what this list has.
  const changes = touches?.filter((touched) => keys.has(touched)) ?? [];
  return {
    kind: "look",
    key,
    effect,
    ...rest,
    ...judged,
    ...(changes.length > 0 && { touches: changes }),
  };
}
