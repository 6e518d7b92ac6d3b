import { createHmac, timingSafeEqual } from "node:crypto";
import type { PhotoLink, PhotoPut } from "@/lib/domain/photo";
import { secretFor } from "../server-key";
import type { StoredPhoto } from "./store";

/** How long a link is good for: long enough for a weak signal to begin sending. */
const GOOD_FOR_MS = 10 * 60_000;

/** A link to our own route that stands for one photograph of one organisation. */
export function signedPut(photo: StoredPhoto, now: Date): PhotoPut {
  const { sha256, bytes, mime } = photo;
  const expires = now.getTime() + GOOD_FOR_MS;
  const query = new URLSearchParams({
    bytes: String(bytes),
    mime,
    expires: String(expires),
    signature: signature(photo, expires).toString("base64url"),
  });
  return {
    url: `/api/photos/${sha256}?${query}`,
    method: "PUT",
    headers: { "content-type": mime },
    expiresAt: new Date(expires).toISOString(),
  };
}

/** Whether this server signed the link for this photograph, and it has not run out. */
export function linkHolds(photo: StoredPhoto, link: PhotoLink, now: Date): boolean {
  const claimed = Buffer.from(link.signature, "base64url");
  const expected = signature(photo, link.expires);
  return (
    claimed.length === expected.length && timingSafeEqual(claimed, expected) && link.expires > now.getTime()
  );
}

function signature({ organisation, sha256, bytes, mime }: StoredPhoto, expires: number): Buffer {
  return createHmac("sha256", secretFor("photo-link-v1"))
    .update([organisation, sha256, bytes, mime, expires].join("\n"))
    .digest();
}
