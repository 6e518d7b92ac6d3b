import * as z from "zod/mini";
import { revisionShape } from "./revision";
import { countShape, digestShape, instantShape, uuidShape } from "./shapes";

/** The most bytes of a sheet as it is sent. */
export const SHEET_BYTES = 128 * 1024;

const organisation = z.object({ id: uuidShape, name: z.string() });

/** A revision as a row of a rig's history; `by` is null where a phone or the demo made it. */
export const revisionRowShape = z.object({
  digest: digestShape,
  number: countShape,
  createdAt: instantShape,
  by: z.nullable(organisation),
  catalogue: z.string(),
});
export type RevisionRow = z.infer<typeof revisionRowShape>;

/** A rig as a row: who keeps it, who built it, whether its sheet rules it out, whether a newer catalogue waits. */
export const rigRowShape = z.object({
  id: uuidShape,
  name: z.string(),
  keeper: organisation,
  builder: z.nullable(organisation),
  /** Whether this member may save a new revision of it. */
  mayWrite: z.boolean(),
  revision: revisionRowShape,
  /** What on its sheet rules it out, in sentences. */
  ruledOut: z.array(z.string()),
  /** Whether today's catalogue would make another list of the same sheet. */
  newerList: z.boolean(),
});
export type RigRow = z.infer<typeof rigRowShape>;

export const rigListShape = z.object({ rigs: z.array(rigRowShape) });

/** One rig with its latest revision whole and the rows of all of them, newest first. */
export const rigReadingShape = z.extend(rigRowShape, {
  document: revisionShape,
  revisions: z.array(revisionRowShape),
});
export type RigReading = z.infer<typeof rigReadingShape>;

/** One revision, whole. */
export const revisionReadingShape = z.extend(revisionRowShape, { rig: uuidShape, document: revisionShape });
export type RevisionReading = z.infer<typeof revisionReadingShape>;

// A sheet is read by `readSheet`, which knows of newer versions; here it is JSON.
const sheetAsSent = z.looseObject({});

/** A new rig: its id is made by whoever fills the sheet in, so that sending it twice makes one. */
export const newRigShape = z.strictObject({ id: uuidShape, sheet: sheetAsSent });

/** A new revision, made over the one with digest `base`. */
export const newRevisionShape = z.strictObject({ base: digestShape, sheet: sheetAsSent });

/** What saving answers. */
export const savedShape = z.object({ rig: uuidShape, revision: revisionRowShape });
export type Saved = z.infer<typeof savedShape>;

/** A coach, a car or a piece of gear, and the rigs whose latest sheet has it. `kind` is `coach`, `car` or a gear's key. */
export const thingRowShape = z.object({
  id: uuidShape,
  kind: z.string(),
  /** Its description, with year or serial, as its latest sheet says. */
  label: z.string(),
  rigs: z.array(z.object({ id: uuidShape, name: z.string() })),
});
export type ThingRow = z.infer<typeof thingRowShape>;
export const thingListShape = z.object({ things: z.array(thingRowShape) });

/** A thing's history, newest first: on which rig's revision it was, and what was written down of it there. */
export const thingReadingShape = z.extend(thingRowShape, {
  history: z.array(
    z.object({
      rig: z.object({ id: uuidShape, name: z.string() }),
      revision: revisionRowShape,
      /** What the sheet said of it; null where this revision no longer has it. */
      state: z.nullable(z.record(z.string(), z.unknown())),
    }),
  ),
});
export type ThingReading = z.infer<typeof thingReadingShape>;
