import type { RevisionRow } from "@/lib/domain/rigs";

/** The columns of a revision's row, of revisions `v` and the members `m` who saved them. */
export const REVISION_COLUMNS = `v.digest, v.number, v.created_at AS createdAt, m.id AS memberId, m.name AS memberName,
  JSON_VALUE(CONVERT(v.document USING utf8mb4), '$.catalogue') AS catalogue`;

/** A revision as a statement with those columns reads it. */
export interface ListedRevision {
  digest: Buffer;
  number: number;
  createdAt: Date;
  memberId: string | null;
  memberName: string | null;
  catalogue: string;
}

/** The row of a rig's history for a revision. */
export function revisionRow(revision: ListedRevision): RevisionRow {
  const { digest, number, createdAt, memberId, memberName, catalogue } = revision;
  return {
    digest: digest.toString("hex"),
    number,
    createdAt: createdAt.toISOString(),
    by: memberId === null ? null : { id: memberId, name: memberName! },
    catalogue,
  };
}
