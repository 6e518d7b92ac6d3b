import { QueryTypes } from "sequelize";
import type { Member } from "@/lib/domain/member";
import type { PhotoMime } from "@/lib/domain/photo";
import { database } from "../database";

/** What a sheet that the member's organisation saved says of a photograph, if any names it. */
export async function namedBySheet(
  { organisation }: Pick<Member, "organisation">,
  sha256: string,
): Promise<{ bytes: number; mime: string } | undefined> {
  const [named] = await database().query<{ bytes: number; mime: string }>(
    `SELECT bytes, mime FROM sheet_photos
      WHERE sha256 = :sha256 AND organisation_id = :organisation
      ORDER BY rig_id, number LIMIT 1`,
    { type: QueryTypes.SELECT, replacements: keys(organisation.id, sha256) },
  );
  return named;
}

/** Where the bytes are of a photograph that a sheet of a rig names which the member may read: kept or built by theirs. */
export async function seenOnSheet(
  { organisation }: Pick<Member, "organisation">,
  sha256: string,
): Promise<{ organisation: string; bytes: number; mime: PhotoMime } | undefined> {
  const [seen] = await database().query<{ organisation: string; bytes: number; mime: PhotoMime }>(
    `SELECT o.organisation_id AS organisation, o.bytes, o.mime
      FROM sheet_photos s
      JOIN rigs r ON r.id = s.rig_id
      JOIN photo_objects o ON o.sha256 = s.sha256 AND o.organisation_id = s.organisation_id
      WHERE s.sha256 = :sha256 AND :organisation IN (r.keeper_id, r.builder_id)
      LIMIT 1`,
    { type: QueryTypes.SELECT, replacements: keys(organisation.id, sha256) },
  );
  return seen;
}

function keys(organisation: string, sha256: string) {
  return { sha256: Buffer.from(sha256, "hex"), organisation };
}
