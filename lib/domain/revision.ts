import * as z from "zod/mini";
import { lamps, lampStates, purposes, signals, type Depth, type Purpose } from "./entry";

/** The seven places to stand, in walking order. */
export const stationKeys = [
  "coach-tail",
  "car-nose",
  "cables-and-cord",
  "car-cabin",
  "pull",
  "car-tail",
  "last-look",
] as const;
export type StationKey = (typeof stationKeys)[number];

/** The parts that have a drawing. */
export const partKeys = [
  "receiver",
  "arm",
  "cables",
  "cord",
  "cabin",
  "brake",
  "wheels",
  "lamps",
  "last-look",
  "chocks",
  "bar-stowed",
  "ball",
  "pintle",
  "arm-quick",
  "base-plate",
  "short-cables",
  "arms-locked",
  "lanyard",
  "air-line",
  "charge-line",
  "coach-held",
  "steering",
  "parking-brake",
  "fuse",
  "pedal",
  "brake-air",
  "brake-hydraulic",
  "brake-surge",
  "monitor",
  "manual-apply",
  "jacks",
  "light-bar",
] as const;
export type PartKey = (typeof partKeys)[number];

/**
 * How a check's drawing differs from its part's usual one: `off` with cord and lanyard off, `standing` with the rig at
 * rest, `joints` or `tires` with only that called out, `installed` a brake without a box at the pedal, and `place`
 * where the drawing only says where to look, so that nothing is to be as drawn.
 */
export const drawnStates = ["off", "standing", "joints", "tires", "installed", "place"] as const;
export type DrawnState = (typeof drawnStates)[number];

export const effects = ["hold", "fix"] as const;
export type Effect = (typeof effects)[number];

/**
 * What a check's value is measured in. `unit` is the one it is kept in; a person enters it in theirs. `beside` is what
 * the sheet or the vehicle says of it, shown beside what was entered and never decided by.
 */
export const measureShape = z.looseObject({
  quantity: z.enum(["pressure", "length", "voltage"]),
  unit: z.enum(["kPa", "mm", "V"]),
  ask: z.string(),
  beside: z.optional(z.string()),
});
export type Measure = z.infer<typeof measureShape>;

/**
 * How a rig's lamps answer. `combined`: one red lamp a side does tail, stop and turn; `separate`: a turn lamp of its
 * own beside it. `expected` is what this rig does when it is known to be right, where that differs from the usual.
 */
export const lampsShape = z.looseObject({
  layout: z.enum(["combined", "separate"]),
  expected: z.optional(z.partialRecord(z.enum(signals), z.partialRecord(z.enum(lamps), z.enum(lampStates)))),
});

/** Where a check comes from; `says` names the rule or the manual, and common practice says that it is that. */
export const originShape = z.looseObject({
  kind: z.enum(["rule", "vehicle-manual", "equipment-manual", "practice"]),
  says: z.string(),
});
export type Origin = z.infer<typeof originShape>;

/**
 * One thing to look at: what is asked, how to look, why it matters and what a fault does. `who` says who may mend it,
 * `touches` names the checks that mending it can change, `figures` are the rig's own numbers by callout, `listed` says
 * what on the sheet puts it on this list, and `origin` where it comes from. `ruled` is a check that the sheet itself
 * answers with a fault: nothing that is seen at the rig makes it good.
 */
export const checkShape = z.looseObject({
  key: z.string().check(z.minLength(1)),
  kind: z.enum(["look", "lamps", "brake-idle"]),
  part: z.enum(partKeys),
  side: z.optional(z.enum(["left", "right"])),
  drawn: z.optional(z.enum(drawnStates)),
  ask: z.string(),
  how: z.string(),
  why: z.string(),
  mend: z.string(),
  effect: z.enum(effects),
  mayBeAbsent: z.boolean(),
  caution: z.optional(z.string()),
  who: z.optional(z.string()),
  touches: z.optional(z.array(z.string())),
  measure: z.optional(measureShape),
  lamps: z.optional(lampsShape),
  figures: z.optional(z.partialRecord(z.enum(["A", "B", "C", "D"]), z.string())),
  listed: z.optional(z.string()),
  ruled: z.optional(z.literal(true)),
  origin: z.optional(originShape),
});
export type Check = z.infer<typeof checkShape>;

const stationShape = z.looseObject({
  key: z.enum(stationKeys),
  title: z.string(),
  checks: z.array(checkShape),
});

const keysShape = z.array(z.string()).check(z.minLength(1));

/** The document that a revision's digest covers: the sheet, the list composed from it, and the walks. */
export const revisionShape = z
  .looseObject({
    v: z.literal(1),
    sheet: z.looseObject({}),
    catalogue: z.string(),
    list: z.looseObject({ stations: z.array(stationShape) }),
    walks: z.record(z.enum(purposes), z.object({ full: keysShape, short: keysShape })),
  })
  .check(z.refine(walksAreWhole, "walks name unknown checks, or a short walk leaves out a hold"));
export type RevisionDocument = z.infer<typeof revisionShape>;

function walksAreWhole(document: RevisionDocument): boolean {
  const checks = checksOf(document);
  return purposes.every((purpose) => {
    const { full, short } = document.walks[purpose];
    const holds = full.filter((key) => checks.get(key)?.effect === "hold");
    return (
      full.every((key) => checks.has(key)) &&
      short.every((key) => full.includes(key)) &&
      holds.every((key) => short.includes(key))
    );
  });
}

/** Every check of a revision by its key. */
export function checksOf(document: RevisionDocument): Map<string, Check> {
  return new Map(document.list.stations.flatMap((s) => s.checks).map((check) => [check.key, check]));
}

/** The keys of the checks made at a station, whatever walk they belong to. */
export function keysAtStation(document: RevisionDocument, station: StationKey): string[] {
  return document.list.stations
    .filter(({ key }) => key === station)
    .flatMap(({ checks }) => checks.map(({ key }) => key));
}

/** The checks of one walk in walking order, each with the station it is made at. */
export function walkChecks(
  document: RevisionDocument,
  purpose: Purpose,
  depth: Depth,
): { station: { key: StationKey; title: string }; check: Check }[] {
  const placed = new Map(
    document.list.stations.flatMap(({ key, title, checks }) =>
      checks.map((check) => [check.key, { station: { key, title }, check }] as const),
    ),
  );
  return document.walks[purpose][depth].flatMap((key) => placed.get(key) ?? []);
}

/** The checks of a list by which its sheet rules the rig out; none where it does not. */
export function ruledBy(document: RevisionDocument): Check[] {
  return document.list.stations.flatMap(({ checks }) => checks.filter(({ ruled }) => ruled));
}
