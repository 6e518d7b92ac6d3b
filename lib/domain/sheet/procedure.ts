import { fields } from "./field";

/**
 * What the owner's manual of this very car says about towing it on its four wheels, in the words of whoever read it.
 * `forbidden` and `not-recorded` both hold the rig, for different reasons. Nothing in here is Hookfast's own.
 */
export const procedureFields = fields({
  says: { kind: "choice", of: ["how", "forbidden", "not-recorded"] },
  manual: { kind: "text", most: 80 },
  page: { kind: "text", most: 20 },
  photo: { kind: "photo" },
  bar: { kind: "choice", of: ["before", "after"] },
  endState: { kind: "text", most: 400, lines: true },
  engineRunEveryHours: { kind: "count", most: 72 },
  engineRunEvery: { kind: "distance" },
  engineRunMinutes: { kind: "count", most: 60 },
  speedCap: { kind: "speed" },
  battery: { kind: "text", most: 120 },
  fuse: { kind: "text", most: 40 },
  fuseKept: { kind: "text", most: 80 },
  backToDriving: { kind: "text", most: 400, lines: true },
});
