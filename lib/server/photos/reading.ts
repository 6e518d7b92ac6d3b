import { QueryTypes } from "sequelize";
import type { Member } from "@/lib/domain/member";
import { may } from "@/lib/domain/permissions";
import type { PhotoMime, WalkPhoto } from "@/lib/domain/photo";
import { Problem } from "@/lib/domain/problem";
import { database } from "../database";
import { photoStore } from "./store";

type Found = { organisation: string; bytes: number; mime: PhotoMime };

/**
 * A photograph's bytes for a member who may see a walk (as `maySeeWalk` says) or a rig's sheet that names it. One that has
 * not come, is named by none of them, or is not there at all is the same `not-found`. The bytes are always those that the
 * organisation of that walk or sheet has sent.
 */
export async function photoBytes(
  { id, role, organisation }: Member,
  sha256: string,
): Promise<{ mime: PhotoMime; bytes: Uint8Array<ArrayBuffer> } | Problem> {
  const seen = may(role, "walks.read-all")
    ? "(w.member_id = :id OR w.organisation_id = :organisation OR r.keeper_id = :organisation)"
    : "w.member_id = :id";
  const [found] = await database().query<Found>(
    `SELECT o.organisation_id AS organisation, o.bytes, o.mime
      FROM photo_entries p
      JOIN walks w ON w.id = p.walk_id
      JOIN rigs r ON r.id = w.rig_id
      JOIN photo_objects o ON o.sha256 = p.sha256 AND o.organisation_id = w.organisation_id
      WHERE p.sha256 = :sha256 AND ${seen}
      UNION ALL
      SELECT o.organisation_id AS organisation, o.bytes, o.mime
      FROM sheet_photos p
      JOIN rigs r ON r.id = p.rig_id AND :organisation IN (r.keeper_id, r.builder_id)
      JOIN photo_objects o ON o.sha256 = p.sha256 AND o.organisation_id = p.organisation_id
      WHERE p.sha256 = :sha256
      LIMIT 1`,
    {
      type: QueryTypes.SELECT,
      replacements: { sha256: Buffer.from(sha256, "hex"), organisation: organisation.id, id },
    },
  );
  const bytes = found && (await photoStore().read({ ...found, sha256 }));
  return bytes ? { mime: found.mime, bytes } : new Problem("not-found");
}

/** The photographs that a walk's entries name, in order, each with whether its bytes have come. */
export async function photosOf(walk: { id: string; organisationId: string }): Promise<WalkPhoto[]> {
  const rows = await database().query<{ seq: number; sha256: Buffer; check: string | null; arrived: number }>(
    `SELECT p.seq, p.sha256, p.check_key AS \`check\`, o.sha256 IS NOT NULL AS arrived
      FROM photo_entries p
      LEFT JOIN photo_objects o ON o.sha256 = p.sha256 AND o.organisation_id = :organisation
      WHERE p.walk_id = :id ORDER BY p.seq`,
    { type: QueryTypes.SELECT, replacements: { id: walk.id, organisation: walk.organisationId } },
  );
  return rows.map(({ seq, sha256, check, arrived }) => ({
    seq,
    sha256: sha256.toString("hex"),
    check,
    arrived: arrived === 1,
  }));
}
