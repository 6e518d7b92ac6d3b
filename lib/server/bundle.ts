import "server-only";
import { QueryTypes } from "sequelize";
import type { Purpose, Verdict } from "@/lib/domain/entry";
import type { Bundle, BundleRig } from "@/lib/domain/field";
import type { Member } from "@/lib/domain/member";
import type { RevisionDocument } from "@/lib/domain/revision";
import { database } from "./database";
import { serverKeys } from "./server-key";

/** The most rigs in a bundle. */
const MOST_RIGS = 50;

interface StoredRig {
  id: string;
  name: string;
  revisionId: string;
  digest: Buffer;
  document: Buffer;
  walkId: string | null;
  purpose: Purpose;
  verdict: Verdict;
  openedAt: Date;
}

/** What a member's phone keeps: the rigs that the organisation keeps, each with its latest revision and walk. */
export async function bundleFor(member: Member, now: Date = new Date()): Promise<Bundle> {
  const rigs = await storedRigs(member);
  return { generatedAt: now.toISOString(), member, rigs: rigs.map(bundleRig), keys: serverKeys() };
}

function bundleRig(rig: StoredRig): BundleRig {
  const { id, name, walkId, purpose, verdict } = rig;
  return {
    id,
    name,
    revision: {
      id: rig.revisionId,
      digest: rig.digest.toString("hex"),
      document: JSON.parse(rig.document.toString("utf8")) as RevisionDocument,
    },
    openFindings: [],
    lastWalk: walkId === null ? null : { id: walkId, purpose, verdict, at: rig.openedAt.toISOString() },
  };
}

/**
 * One index look-up for each rig's latest revision and for its latest sealed walk, whoever made it: a colleague's hold
 * holds for everyone. Latest as in the history, so that an old walk that arrives late does not stand before a newer one.
 */
async function storedRigs(member: Member): Promise<StoredRig[]> {
  return database().query<StoredRig>(
    `SELECT r.id, r.name, v.id AS revisionId, v.digest, v.document,
        w.id AS walkId, w.purpose, w.verdict, w.opened_at AS openedAt
      FROM rigs r
      JOIN revisions v ON v.rig_id = r.id
        AND v.number = (SELECT MAX(number) FROM revisions WHERE rig_id = r.id)
      LEFT JOIN walks w ON w.id = (
        SELECT id FROM walks WHERE rig_id = r.id AND state = 'sealed'
        ORDER BY sort_at DESC, id DESC LIMIT 1)
      WHERE r.keeper_id = :organisation
      ORDER BY r.name, r.id
      LIMIT :most`,
    {
      type: QueryTypes.SELECT,
      replacements: { organisation: member.organisation.id, most: MOST_RIGS },
    },
  );
}
