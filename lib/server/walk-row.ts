import "server-only";
import type { WalkRow } from "@/lib/domain/history";

/** A walk as a statement reads it for a row of the history. */
export interface ListedWalk extends Pick<WalkRow, "id" | "rig" | "member" | "purpose" | "state" | "verdict"> {
  revision: Buffer;
  openedAt: Date;
  receivedAt: Date;
  marks: number;
  faults: number;
}

/** The row of the history for a walk. */
export function walkRow(walk: ListedWalk): WalkRow {
  const { id, rig, purpose, member, state, verdict, marks, faults } = walk;
  return {
    id,
    rig,
    revision: walk.revision.toString("hex"),
    purpose,
    member,
    openedAt: walk.openedAt.toISOString(),
    receivedAt: walk.receivedAt.toISOString(),
    state,
    verdict,
    counts: { marks, faults },
  };
}
