import { fields } from "./field";

const words = { kind: "text", most: 80 } as const;
const rating = { kind: "mass" } as const;

/** What every piece of gear has: how it looks, which one it is, since when it is on, where its torque record lies. */
const piece = fields({
  description: words,
  serial: { kind: "text", most: 40 },
  lot: { kind: "text", most: 40 },
  fittedOn: { kind: "date" },
});
const bolted = fields({ ...piece, torqueRecord: { kind: "text", most: 120 } });
const there = { kind: "yes-no" } as const;

export const couplings = ["direct", "ball", "pintle"] as const;
export type Coupling = (typeof couplings)[number];

export const armEnds = ["pin", "quick"] as const;

export const brakeFamilies = ["portable", "installed-vacuum", "air", "hydraulic", "surge", "none"] as const;
export type BrakeFamily = (typeof brakeFamilies)[number];

/**
 * The pieces of gear, in walking order. A piece with `there` may be missing on a rig; where it says no, the rest of it
 * means nothing.
 */
export const gearFields = {
  dropReceiver: fields({
    there,
    offset: { kind: "length" },
    direction: { kind: "choice", of: ["drop", "rise"] },
    rating,
    ...bolted,
  }),
  towBar: fields({
    coupling: { kind: "choice", of: couplings },
    stowsOn: { kind: "choice", of: ["coach", "car"] },
    armEnds: { kind: "choice", of: armEnds },
    selfAligning: { kind: "yes-no" },
    rating,
    slopeLimit: { kind: "length" },
    armLength: { kind: "length" },
    ...bolted,
  }),
  coupler: fields({ ballSize: { kind: "length" }, rating, ...bolted }),
  basePlate: fields({
    arms: { kind: "choice", of: ["fixed", "removable"] },
    rating,
    tabSpacing: { kind: "length" },
    ...bolted,
  }),
  cables: fields({
    count: { kind: "count", most: 4 },
    rating,
    length: { kind: "length" },
    ...piece,
  }),
  shortCables: fields({ there, rating, ...piece }),
  cord: fields({
    shape: { kind: "choice", of: ["coiled", "straight"] },
    carEnd: { kind: "choice", of: ["4-flat", "4-round", "6-round", "7-blade", "hard-wired", "other"] },
    length: { kind: "length" },
    ...piece,
  }),
  chargeLine: fields({
    there,
    plug: { kind: "choice", of: ["in-cord", "own-plug"] },
    fuseAmps: { kind: "count", most: 200 },
    gaugeAwg: { kind: "count", most: 24 },
    ...piece,
  }),
  airLine: fields({ there, ...piece }),
  brake: fields({
    family: { kind: "choice", of: brakeFamilies },
    proportional: { kind: "yes-no" },
    manualApply: { kind: "yes-no" },
    monitor: { kind: "yes-no" },
    boosterMode: { kind: "yes-no" },
    poweredFrom: words,
    ...piece,
  }),
  breakaway: fields({
    there,
    anchor: words,
    switchAt: words,
    battery: words,
    lastPulledOn: { kind: "date" },
    ...piece,
  }),
  lightBar: fields({
    heldBy: { kind: "choice", of: ["straps", "magnets", "brackets"] },
    power: { kind: "choice", of: ["cord", "own-battery"] },
    ...piece,
  }),
} as const;

export type GearKey = keyof typeof gearFields;
export const gearKeys = Object.keys(gearFields) as GearKey[];
