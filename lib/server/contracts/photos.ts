import { PHOTO, photoAnswerShape, photoLinkShape, photoMimes } from "@/lib/domain/photo";
import { contract } from "../contract";

export const askForPhoto = contract({
  method: "POST",
  path: "/api/photos/{sha256}",
  summary:
    "Ask where a photograph's bytes go. An entry of a walk or a sheet of the member's organization has to name " +
    "it; ask once more after sending, and `have` says that it is there.",
  action: "walks.record",
  answers: { 200: { json: photoAnswerShape } },
  problems: ["too-large", "wrong-media"],
});

export const sendPhoto = contract({
  method: "PUT",
  path: "/api/photos/{sha256}",
  summary: "Send a photograph's bytes to the address that was given for them. Again is no error.",
  action: "walks.record",
  query: photoLinkShape,
  upload: { media: photoMimes, limit: PHOTO.bytes },
  answers: { 204: null },
  problems: ["bad-link"],
});

export const readPhoto = contract({
  method: "GET",
  path: "/api/photos/{sha256}",
  summary:
    "The bytes of a photograph as recorded, for whoever may read a walk or a rig's sheet that names it.",
  action: "walks.read-own",
  answers: { 200: { bytes: "image/*" } },
});
