import "server-only";
import { QueryTypes } from "sequelize";
import { PAGE, type WalkPage } from "@/lib/domain/history";
import type { Member } from "@/lib/domain/member";
import { may } from "@/lib/domain/permissions";
import { database } from "./database";
import { cursorOf, type WalkPlace } from "./walk-cursor";
import { walkRow, type ListedWalk } from "./walk-row";

const COLUMNS = `w.id, w.rig_id, w.revision_id, w.member_id, w.purpose, w.opened_at, w.received_at, w.sort_at,
  w.state, w.verdict, w.marks, w.faults`;

// This form walks down the index; a comparison of rows, (sort_at, id) < (?, ?), would read the whole of it.
const AFTER = "AND w.sort_at <= :sortAt AND (w.sort_at < :sortAt OR w.id < :id)";
const NEWEST = "ORDER BY w.sort_at DESC, w.id DESC";

// Forced, since left alone the planner reads a large organisation's index from its top down to the page.
const OWN = "walks w FORCE INDEX (walks_member) WHERE w.member_id = :member";
const MADE = "walks w FORCE INDEX (walks_organisation) WHERE w.organisation_id = :organisation";
// Rigs change hands rarely: the index tells the few walks by others from those of the keeper without reading these.
const KEPT = `rigs kept STRAIGHT_JOIN walks w FORCE INDEX (walks_rig_organisation) ON w.rig_id = kept.id
  WHERE kept.keeper_id = :organisation AND w.organisation_id <> :organisation`;

/** The statement for one page of the walks that a member may see, with what fills its places. */
export function walkListQuery(
  member: Member,
  after: WalkPlace | null,
  most: number,
): { sql: string; replacements: Record<string, unknown> } {
  const page = (from: string) => `SELECT ${COLUMNS} FROM ${from} ${after ? AFTER : ""} ${NEWEST} LIMIT :most`;
  // Two walks down two indexes: one condition with OR could use neither for the order.
  const seen = may(member.role, "walks.read-all") ? `(${page(MADE)}) UNION ALL (${page(KEPT)})` : page(OWN);
  return {
    sql: `SELECT w.id, w.rig_id AS rig, v.digest AS revision, w.member_id AS member, w.purpose,
        w.opened_at AS openedAt, w.received_at AS receivedAt, w.sort_at AS sortAt, w.state, w.verdict,
        w.marks, w.faults, r.name AS rigName, m.name AS memberName
      FROM (${seen}) AS w
      JOIN rigs r ON r.id = w.rig_id
      JOIN members m ON m.id = w.member_id
      JOIN revisions v ON v.id = w.revision_id
      ${NEWEST} LIMIT :most`,
    replacements: { member: member.id, organisation: member.organisation.id, most, ...after },
  };
}

/** A page of the walks that a member may see, newest first. */
export async function walkList(
  member: Member,
  after: WalkPlace | null,
  limit: number = PAGE.usual,
): Promise<WalkPage> {
  const { sql, replacements } = walkListQuery(member, after, limit + 1);
  const found = await database().query<ListedWalk & { sortAt: Date; rigName: string; memberName: string }>(
    sql,
    {
      type: QueryTypes.SELECT,
      replacements,
    },
  );
  const rows = found.slice(0, limit);
  const last = found.length > limit ? rows.at(-1) : undefined;
  const names = rows.flatMap((row) => [
    [row.rig, row.rigName],
    [row.member, row.memberName],
  ]);
  return {
    walks: rows.map(walkRow),
    next: last ? cursorOf(last) : null,
    names: Object.fromEntries(names) as Record<string, string>,
  };
}
