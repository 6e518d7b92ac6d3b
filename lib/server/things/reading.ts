import { QueryTypes } from "sequelize";
import type { Member } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import type { ThingReading, ThingRow } from "@/lib/domain/rigs";
import { thingLabel, type ThingKind, type ThingState } from "@/lib/domain/sheet/things";
import { database } from "../database";
import { REVISION_COLUMNS, revisionRow, type ListedRevision } from "../rigs/revision-row";

/** The most rows of a list of things: one for each thing and rig that it was on. */
const MOST_ROWS = 2000;

interface Said {
  id: string;
  kind: ThingKind;
  rigId: string;
  rigName: string;
  present: number;
  body: Buffer;
}

const SAID = "t.id, t.kind, r.id AS rigId, r.name AS rigName, s.present, s.body";

const OWN = `things t
  JOIN thing_states s ON s.thing_id = t.id
  JOIN rigs r ON r.id = s.rig_id AND :organisation IN (r.keeper_id, r.builder_id)
  JOIN revisions v ON v.rig_id = s.rig_id AND v.number = s.number`;

/**
 * The things of the member's organisation, by kind and age. Of the rigs that they are or were on, those count that the
 * organisation keeps or built.
 */
export async function thingList({ organisation }: Member): Promise<ThingRow[]> {
  const rows = await database().query<Said>(
    `SELECT ${SAID} FROM ${OWN}
      WHERE t.organisation_id = :organisation AND s.number = (
        SELECT MAX(number) FROM thing_states WHERE thing_id = s.thing_id AND rig_id = s.rig_id)
      ORDER BY t.kind, t.created_at, t.id, v.created_at DESC, r.id LIMIT ${MOST_ROWS}`,
    { type: QueryTypes.SELECT, replacements: { organisation: organisation.id } },
  );
  return grouped(rows, ({ id }) => id).map(thingRow);
}

/** One thing with its history. What is not there and what the member may not see are the same `not-found`. */
export async function thingReading({ organisation }: Member, id: string): Promise<ThingReading | Problem> {
  const rows = await database().query<Said & ListedRevision>(
    `SELECT ${SAID}, ${REVISION_COLUMNS} FROM ${OWN}
      LEFT JOIN members m ON m.id = v.member_id
      WHERE t.id = :id AND t.organisation_id = :organisation
      ORDER BY v.created_at DESC, s.number DESC, r.id`,
    { type: QueryTypes.SELECT, replacements: { id, organisation: organisation.id } },
  );
  if (rows.length === 0) return new Problem("not-found");
  const lastOnEach = grouped(rows, ({ rigId }) => rigId).map(([last]) => last!);
  return {
    ...thingRow(lastOnEach),
    history: rows.map((row) => ({
      rig: rigOf(row),
      revision: revisionRow(row),
      state: row.present === 1 ? stateOf(row) : null,
    })),
  };
}

/** A thing of what was said of it last on each rig, the newest first. */
function thingRow(rows: readonly Said[]): ThingRow {
  const [newest] = rows as [Said];
  return {
    id: newest.id,
    kind: newest.kind,
    label: thingLabel(newest.kind, stateOf(newest)),
    rigs: rows.filter(({ present }) => present === 1).map(rigOf),
  };
}

function stateOf({ body }: Said): ThingState {
  return JSON.parse(body.toString("utf8")) as ThingState;
}

function rigOf({ rigId, rigName }: Said): { id: string; name: string } {
  return { id: rigId, name: rigName };
}

/** Rows that share a key, in the order in which each key and each of its rows came. */
function grouped<Row>(rows: readonly Row[], keyOf: (row: Row) => string): Row[][] {
  const groups = new Map<string, Row[]>();
  for (const row of rows) {
    const key = keyOf(row);
    groups.set(key, [...(groups.get(key) ?? []), row]);
  }
  return [...groups.values()];
}
