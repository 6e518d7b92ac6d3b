import { photoFileName } from "@/lib/domain/photo";
import { Problem } from "@/lib/domain/problem";
import { askForPhoto, readPhoto, sendPhoto } from "@/lib/server/contracts/photos";
import { photoBytes } from "@/lib/server/photos/reading";
import { photoTaken, placeFor } from "@/lib/server/photos/sending";
import { serve } from "@/lib/server/serve";

export const POST = serve(askForPhoto, async ({ member, sha256 }) => {
  const place = await placeFor(member, sha256);
  return place instanceof Problem ? place : { status: 200, json: place };
});

export const PUT = serve(sendPhoto, async ({ member, sha256, query, request }) => {
  return (await photoTaken(member, sha256, query, request)) ?? { status: 204 };
});

export const GET = serve(readPhoto, async ({ member, sha256 }) => {
  const photo = await photoBytes(member, sha256);
  if (photo instanceof Problem) return photo;
  const headers = {
    // The digest names the bytes, so they never change; but another member's browser session must ask anew.
    "cache-control": "private, max-age=31536000, immutable",
    vary: "cookie",
    "content-length": String(photo.bytes.byteLength),
    "content-disposition": `inline; filename="${photoFileName(sha256, photo.mime)}"`,
    // Opened by itself it is a picture and nothing else, whatever its bytes say.
    "content-security-policy": "default-src 'none'; sandbox",
    "cross-origin-resource-policy": "same-origin",
  };
  return { status: 200, bytes: photo.bytes, media: photo.mime, headers };
});
