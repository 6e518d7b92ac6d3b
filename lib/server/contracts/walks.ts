import { walkPageShape, walkQueryShape, walkReadingShape } from "@/lib/domain/history";
import { contract } from "../contract";

export const listWalks = contract({
  method: "GET",
  path: "/api/walks",
  summary: "The walks that the member may see, newest first, page by page.",
  action: "walks.read-own",
  query: walkQueryShape,
  answers: { 200: { json: walkPageShape } },
});

export const readWalk = contract({
  method: "GET",
  path: "/api/walks/{id}",
  summary: "One walk read back, with the revision it was made on.",
  action: "walks.read-own",
  answers: { 200: { json: walkReadingShape } },
});

export const readRecord = contract({
  method: "GET",
  path: "/api/walks/{id}/record",
  summary: "The record file: the revision, every entry's canonical bytes, and the seal.",
  action: "walks.read-own",
  answers: { 200: { media: "application/x-ndjson" } },
});
