import {
  newRevisionShape,
  newRigShape,
  revisionReadingShape,
  rigListShape,
  rigReadingShape,
  savedShape,
  SHEET_BYTES,
  thingListShape,
  thingReadingShape,
} from "@/lib/domain/rigs";
import { contract } from "../contract";

// The sheet's own bytes, and what stands around it.
const limit = SHEET_BYTES + 1024;

export const listRigs = contract({
  method: "GET",
  path: "/api/rigs",
  summary: "The rigs that the member's organization keeps or built, by name, each with its latest revision.",
  action: "rigs.read",
  answers: { 200: { json: rigListShape } },
});

export const makeRig = contract({
  method: "POST",
  path: "/api/rigs",
  summary: "Make a rig of its first sheet: 201, or 200 when the same id and sheet come again.",
  action: "rigs.write",
  body: { shape: newRigShape, limit },
  answers: { 200: { json: savedShape }, 201: { json: savedShape } },
  problems: ["newer-schema", "impossible-sheet", "id-taken"],
});

export const readRig = contract({
  method: "GET",
  path: "/api/rigs/{id}",
  summary: "One rig with its latest revision, and the rows of all of them, newest first.",
  action: "rigs.read",
  answers: { 200: { json: rigReadingShape } },
});

export const saveRevision = contract({
  method: "POST",
  path: "/api/rigs/{id}/revisions",
  summary:
    "Save a sheet as the rig's next revision: 201, or 200 when it would change nothing. `base` has to be the latest.",
  action: "rigs.write",
  body: { shape: newRevisionShape, limit },
  answers: { 200: { json: savedShape }, 201: { json: savedShape } },
  problems: ["newer-schema", "impossible-sheet", "stale-base"],
});

export const readRevision = contract({
  method: "GET",
  path: "/api/rigs/{id}/revisions/{sha256}",
  summary: "One revision of a rig, by its digest.",
  action: "rigs.read",
  answers: { 200: { json: revisionReadingShape } },
});

export const listThings = contract({
  method: "GET",
  path: "/api/things",
  summary:
    "The coaches, cars and pieces of gear of the member's organization, each with the rigs that it is on.",
  action: "rigs.read",
  answers: { 200: { json: thingListShape } },
});

export const readThing = contract({
  method: "GET",
  path: "/api/things/{id}",
  summary:
    "One coach, car or piece of gear, and what was written down of it: a row for each revision that said something else.",
  action: "rigs.read",
  answers: { 200: { json: thingReadingShape } },
});

export const readSheetSchema = contract({
  method: "GET",
  path: "/api/sheet-schema",
  summary: "The JSON Schema of a rig sheet.",
  public: true,
  answers: { 200: { media: "application/schema+json" } },
  cacheS: 300,
});
