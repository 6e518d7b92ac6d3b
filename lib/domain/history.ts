import * as z from "zod/mini";
import { depths, entryShape, purposes, verdicts } from "./entry";
import { walkPhotoShape } from "./photo";
import { receiptShape } from "./receipt";
import { revisionShape } from "./revision";
import { countShape, digestShape, instantShape, uuidShape } from "./shapes";
import { algorithms } from "./signature";

/** A walk as a row of the history. Ids for rig and member, a digest for the revision. */
export const walkRowShape = z.object({
  id: uuidShape,
  rig: uuidShape,
  revision: digestShape,
  purpose: z.enum(purposes),
  member: uuidShape,
  openedAt: instantShape,
  receivedAt: instantShape,
  state: z.enum(["open", "sealed"]),
  verdict: z.enum(verdicts),
  counts: z.object({ marks: countShape, faults: countShape }),
});
export type WalkRow = z.infer<typeof walkRowShape>;

/**
 * A page of the history, newest first; `next` is the `after` of the page that follows, null on the last. `names` has
 * the name of every rig and member that the rows speak of, by id.
 */
export const walkPageShape = z.object({
  walks: z.array(walkRowShape),
  next: z.nullable(z.string()),
  names: z.record(uuidShape, z.string()),
});
export type WalkPage = z.infer<typeof walkPageShape>;

export const PAGE = { usual: 50, most: 200 } as const;

/** Which page of the history is asked for. */
export const walkQueryShape = z.strictObject({
  after: z.optional(z.string()),
  limit: z.optional(z.coerce.number().check(z.int(), z.gte(1), z.lte(PAGE.most))),
});

/** One walk read back: its row, names to show beside the ids, the revision as it was, every entry, and its seal. */
export const walkReadingShape = z.object({
  walk: walkRowShape,
  names: z.object({ rig: z.string(), member: z.string() }),
  depth: z.enum(depths),
  device: uuidShape,
  elapsedMs: countShape,
  document: revisionShape,
  entries: z.array(z.object({ digest: digestShape, receivedAt: instantShape, entry: entryShape })),
  /** The photographs that the entries name, in their order. */
  photos: z.array(walkPhotoShape),
  /** The verdict that the phone closed with, where it differs from the server's own replay. */
  closedAs: z.nullable(z.enum(verdicts)),
  seal: z.nullable(
    z.object({
      seal: digestShape,
      alg: z.enum(algorithms),
      signature: z.string(),
      device: uuidShape,
      receipt: receiptShape,
    }),
  ),
});
export type WalkReading = z.infer<typeof walkReadingShape>;
