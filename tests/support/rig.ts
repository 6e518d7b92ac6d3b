import { digestOf } from "@/lib/domain/digest";
import { purposes } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { stationKeys, type Check, type RevisionDocument } from "@/lib/domain/revision";

function check(key: string, over: Partial<Check> = {}): Check {
  return {
    key,
    kind: "look",
    part: "arm",
    ask: `${key} as drawn`,
    how: "",
    why: "",
    mend: "",
    effect: "hold",
    mayBeAbsent: false,
    ...over,
  };
}

/**
 * A small list with each kind of check: `pin` and `cables` hold, `air` holds and may be absent, `jacket` is a fix and
 * may be absent, `tires` is a fix. A short walk leaves the two fixes out; an unhook is `pin` alone.
 */
export const document: RevisionDocument = {
  v: 1,
  sheet: { name: "test rig" },
  catalogue: "test",
  list: {
    stations: stationKeys.map((key) => ({ key, title: key, checks: checksAt(key) })),
  },
  walks: Object.fromEntries(
    purposes.map((purpose) => [
      purpose,
      purpose === "unhook"
        ? { full: ["pin"], short: ["pin"] }
        : { full: ["pin", "cables", "air", "jacket", "tires"], short: ["pin", "cables", "air"] },
    ]),
  ) as RevisionDocument["walks"],
};

function checksAt(station: string): Check[] {
  if (station === "car-nose") return [check("pin", { side: "left" })];
  if (station === "cables-and-cord") {
    return [
      check("cables", { part: "cables" }),
      check("air", { part: "cord", mayBeAbsent: true }),
      check("jacket", { part: "cord", effect: "fix", mayBeAbsent: true }),
    ];
  }
  return station === "last-look" ? [check("tires", { part: "last-look", effect: "fix" })] : [];
}

export const revision = digestOf(document);

/** The rig as a phone's bundle has it. */
export const rig: BundleRig = {
  id: "00000000-0000-4000-8000-00000000000a",
  name: "Test rig",
  revision: { id: "00000000-0000-4000-8000-00000000000b", digest: revision, document },
  openFindings: [],
  lastWalk: null,
};
