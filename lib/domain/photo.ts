import * as z from "zod/mini";
import { countShape, digestShape, instantShape } from "./shapes";

/** What a photograph may be kept as. A phone writes the first; another client may send the others. */
export const photoMimes = ["image/jpeg", "image/webp", "image/png"] as const;
export type PhotoMime = (typeof photoMimes)[number];

/** The most bytes a photograph may have, and the most pixels along its longer side when a phone keeps it. */
export const PHOTO = { bytes: 2 * 1024 * 1024, sidePx: 1600 } as const;

/** Whether the server takes photographs that are recorded as this. */
export function isPhotoMime(mime: string): mime is PhotoMime {
  return (photoMimes as readonly string[]).includes(mime);
}

/** The name of a photograph's file, by its digest. */
export function photoFileName(sha256: string, mime: PhotoMime): string {
  const ending = { "image/jpeg": "jpg", "image/webp": "webp", "image/png": "png" }[mime];
  return `hookfast-photograph-${sha256.slice(0, 12)}.${ending}`;
}

/** The whole pixels that a picture takes when its longer side has at most `mostPx`; a smaller one stays as it is. */
export function fitted(widthPx: number, heightPx: number, mostPx: number = PHOTO.sidePx) {
  const scale = Math.min(1, mostPx / Math.max(widthPx, heightPx));
  const side = (px: number) => Math.max(1, Math.round(px * scale));
  return { widthPx: side(widthPx), heightPx: side(heightPx) };
}

/** Where a photograph's bytes go: a request to make as it stands, until it runs out. */
export const putShape = z.object({
  url: z.string(),
  method: z.literal("PUT"),
  headers: z.record(z.string(), z.string()),
  expiresAt: instantShape,
});
export type PhotoPut = z.infer<typeof putShape>;

/** The answer to a phone that has a photograph to send: it is there, or this is where it goes. */
export const photoAnswerShape = z.union([z.object({ have: z.literal(true) }), z.object({ put: putShape })]);
export type PhotoAnswer = z.infer<typeof photoAnswerShape>;

/** What stands behind a link to our own folder: checked as one with its signature. */
export const photoLinkShape = z.strictObject({
  bytes: z.coerce.number().check(z.int(), z.gte(0), z.lte(PHOTO.bytes)),
  mime: z.enum(photoMimes),
  expires: z.coerce.number().check(z.int(), z.gte(0)),
  signature: z.string().check(z.maxLength(100)),
});
export type PhotoLink = z.infer<typeof photoLinkShape>;

/** A photograph that a walk's entries name, and whether its bytes have come after them. */
export const walkPhotoShape = z.object({
  seq: countShape,
  sha256: digestShape,
  check: z.nullable(z.string()),
  arrived: z.boolean(),
});
export type WalkPhoto = z.infer<typeof walkPhotoShape>;

/**
 * Photographs by the check they were taken at. One that names no check, or a check that is not read back here,
 * belongs to the walk (`null`).
 */
export function photosByCheck<P extends { check: string | null }>(
  photos: readonly P[],
  read: ReadonlySet<string>,
): ReadonlyMap<string | null, P[]> {
  const grouped = new Map<string | null, P[]>();
  for (const photo of photos) {
    const check = photo.check !== null && read.has(photo.check) ? photo.check : null;
    grouped.set(check, [...(grouped.get(check) ?? []), photo]);
  }
  return grouped;
}
