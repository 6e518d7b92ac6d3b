import { Readable } from "node:stream";
import { QueryTypes } from "sequelize";
import type { Member } from "@/lib/domain/member";
import { isPhotoMime, PHOTO, type PhotoAnswer, type PhotoLink } from "@/lib/domain/photo";
import { Problem } from "@/lib/domain/problem";
import { database, tables } from "../database";
import { linkHolds } from "./link";
import { photoStore, type StoredPhoto } from "./store";

type Recorded = { bytes: number; mime: string };

/**
 * The statement for what was recorded beside a digest, with what fills its places. Of several entries the sender's own
 * counts first: what a colleague wrote there may be wrong.
 */
export function recordedQuery({ id, organisation }: Pick<Member, "id" | "organisation">, sha256: string) {
  return {
    sql: `SELECT p.bytes, p.mime FROM photo_entries p JOIN walks w ON w.id = p.walk_id
      WHERE p.sha256 = :sha256 AND w.organisation_id = :organisation
      ORDER BY w.member_id = :id DESC, p.walk_id, p.seq LIMIT 1`,
    replacements: { sha256: Buffer.from(sha256, "hex"), organisation: organisation.id, id },
  };
}

/** The statement for what a sheet that the organisation saved says beside a digest, the newest first. */
export function onSheetQuery({ organisation }: Pick<Member, "organisation">, sha256: string) {
  return {
    sql: `SELECT p.bytes, p.mime FROM sheet_photos p JOIN revisions v ON v.rig_id = p.rig_id AND v.number = p.number
      WHERE p.sha256 = :sha256 AND p.organisation_id = :organisation
      ORDER BY v.created_at DESC, p.number DESC LIMIT 1`,
    replacements: { sha256: Buffer.from(sha256, "hex"), organisation: organisation.id },
  };
}

async function recordedAs(member: Member, sha256: string): Promise<Recorded | undefined> {
  for (const { sql, replacements } of [recordedQuery(member, sha256), onSheetQuery(member, sha256)]) {
    const [recorded] = await database().query<Recorded>(sql, { type: QueryTypes.SELECT, replacements });
    if (recorded) return recorded;
  }
  return undefined;
}

/**
 * Where the bytes of a photograph go that an entry of a walk or a sheet of the member's organisation names, or that they
 * are there. Asking is also how their arrival is noted: a store that is not ours does not tell.
 */
export async function placeFor(
  member: Member,
  sha256: string,
  now: Date = new Date(),
): Promise<PhotoAnswer | Problem> {
  const { organisation } = member;
  const recorded = await recordedAs(member, sha256);
  if (!recorded) return new Problem("not-found");
  const { bytes, mime } = recorded;
  if (bytes > PHOTO.bytes) return new Problem("too-large", { detail: `The most is ${PHOTO.bytes} bytes.` });
  if (!isPhotoMime(mime)) return new Problem("wrong-media");
  const photo = { organisation: organisation.id, sha256, bytes, mime };
  if (!(await photoStore().has(photo))) return { put: photoStore().presignPut(photo, now) };
  await noteArrival(photo, now);
  return { have: true };
}

/** Takes the bytes that a link of our own folder was given for. */
export async function photoTaken(
  { organisation }: Member,
  sha256: string,
  link: PhotoLink,
  request: Request,
  now: Date = new Date(),
): Promise<Problem | null> {
  const photo = { organisation: organisation.id, sha256, bytes: link.bytes, mime: link.mime };
  if (!linkHolds(photo, link, now)) return new Problem("bad-link");
  if (request.headers.get("content-type") !== link.mime) return new Problem("wrong-media");
  if (Number(request.headers.get("content-length")) > link.bytes) {
    return new Problem("too-large", { detail: `Recorded with ${link.bytes} bytes.` });
  }
  const fault = await photoStore().put(photo, request.body ?? Readable.from([]));
  if (!fault) await noteArrival(photo, now);
  return fault;
}

async function noteArrival({ organisation, sha256, bytes, mime }: StoredPhoto, now: Date): Promise<void> {
  const row = {
    organisationId: organisation,
    sha256: Buffer.from(sha256, "hex"),
    bytes,
    mime,
    storedAt: now,
  };
  await tables().PhotoObject.bulkCreate([row], { ignoreDuplicates: true });
}
