import { Op, QueryTypes } from "sequelize";
import { canonicalText } from "@/lib/domain/json";
import { sheetReadingWords as say } from "@/lib/domain/messages/sheet-reading";
import type { FieldError } from "@/lib/domain/problem";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { thingsIn } from "@/lib/domain/sheet/things";
import { database, tables } from "../database";
import type { Author } from "../rigs/store-revision";

interface LastSaid {
  thingId: string;
  present: number;
  body: Buffer;
}

/**
 * Sees to it that every thing of a sheet is one of the member's organisation: those that nobody has are made, those that
 * came with this rig from whoever kept it before are taken over.
 * @returns what is wrong with their ids, by pointers into the sheet; nothing is written then
 */
export async function claimThings(
  { member, now, transaction }: Author,
  rigId: string,
  sheet: Sheet,
): Promise<FieldError[]> {
  const { Thing } = tables();
  const things = thingsIn(sheet);
  const ids = things.map(({ id }) => id);
  const stored = await Thing.findAll({
    where: { id: { [Op.in]: ids } },
    attributes: ["id", "organisationId", "kind"],
    raw: true,
    transaction,
  });
  const known = new Map(stored.map((thing) => [thing.id, thing]));
  const ownId = member.organisation.id;
  const here = new Set((await lastSaid(rigId, transaction)).map(({ thingId }) => thingId));
  const faults = things.flatMap(({ id, kind, pointer }, at): FieldError[] => {
    const fault = (detail: string) => [{ pointer: `${pointer}/id`, detail }];
    const thing = known.get(id);
    if (ids.indexOf(id) < at) return fault(say.twice);
    if (thing && thing.organisationId !== ownId && !here.has(id)) return fault(say.foreign);
    return thing && thing.kind !== kind ? fault(say.otherKind) : [];
  });
  if (faults.length > 0) return faults;
  const made = things.filter(({ id }) => !known.has(id));
  await Thing.bulkCreate(
    made.map(({ id, kind }) => ({ id, kind, organisationId: ownId, createdAt: now })),
    { transaction },
  );
  const taken = stored.filter(({ organisationId }) => organisationId !== ownId).map(({ id }) => id);
  if (taken.length > 0) {
    await Thing.update({ organisationId: ownId }, { where: { id: { [Op.in]: taken } }, transaction });
  }
  return [];
}

/** Records what a rig's new revision says of its things, where that is something else than was said last. */
export async function recordThings(
  { transaction }: Pick<Author, "transaction">,
  rigId: string,
  number: number,
  sheet: Sheet,
): Promise<void> {
  const { ThingState } = tables();
  const before = await lastSaid(rigId, transaction);
  const things = thingsIn(sheet);
  const said = things.map(({ id, state }) => ({
    thingId: id,
    present: true,
    body: Buffer.from(canonicalText(state)),
  }));
  const anew = said.filter(({ thingId, body }) => {
    const last = before.find((state) => state.thingId === thingId);
    return !(last && last.present === 1 && body.equals(last.body));
  });
  const gone = before
    .filter(({ thingId, present }) => present === 1 && !things.some(({ id }) => id === thingId))
    .map(({ thingId, body }) => ({ thingId, present: false, body }));
  await ThingState.bulkCreate(
    [...anew, ...gone].map((state) => ({ ...state, rigId, number })),
    { transaction },
  );
}

/** What was said last of every thing that a rig ever had. */
async function lastSaid(rigId: string, transaction: Author["transaction"]): Promise<LastSaid[]> {
  return database().query<LastSaid>(
    `SELECT s.thing_id AS thingId, s.present, s.body FROM thing_states s
      WHERE s.rig_id = :rigId AND s.number = (
        SELECT MAX(number) FROM thing_states WHERE thing_id = s.thing_id AND rig_id = s.rig_id)`,
    { type: QueryTypes.SELECT, replacements: { rigId }, transaction },
  );
}
