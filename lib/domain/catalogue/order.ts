import { purposes, type Purpose } from "../entry";

// What the sheet rules out stands at the head of every walk that would tow. A car that hangs on a coach must come off,
// whatever the sheet says, so nothing stands before an unhook.
const ruledOut = ["manual-page", "ruled-out"];

/** The walk up to the road. The manual's end state is seen before the arms where it wants that, else after the cord. */
function towing(before: boolean | null, atReceiver: string[], atNose: string[], proved: string[]): string[] {
  return [
    "receiver-pins",
    ...atReceiver,
    ...(before ? ["end-state"] : []),
    "base-plate",
    ...atNose,
    "arm-left",
    "arm-right",
    "cables",
    "lanyard",
    "cord",
    "cord-jacket",
    "charge-line",
    ...(before ? [] : ["end-state"]),
    "steering-free",
    "brake-ready",
    "chocks-out",
    "monitor",
    "wheels-roll",
    "arms-locked",
    "light-bar",
    "trailer-plug",
    "lamps",
    "manual-apply",
    ...proved,
    "joints",
    "jacks-up",
    "tires",
  ];
}

// The car is held before anything else, and before any pin above all.
const unhooking = [
  "car-held",
  "brake-off",
  "lines-off",
  "latches-released",
  "one-side",
  "bar-stowed",
  "light-bar-off",
  "fuse-back",
  "back-to-driving",
];

/**
 * The keys of each kind of walk in walking order, of which a list takes those that it has.
 * @param before whether the car's manual wants its steps done before the bar is on; null where nobody knows
 */
export function ordersFor(before: boolean | null): Record<Purpose, string[]> {
  return {
    "hook-up": [...ruledOut, "coach-held", ...towing(before, [], [], [])],
    "re-check": [
      ...ruledOut,
      "receiver-pins",
      "base-plate",
      "arm-left",
      "arm-right",
      "cables",
      "lanyard",
      "cord",
      "engine-run",
      "wheel-heat",
      "light-bar",
      "lamps",
    ],
    unhook: ["coach-held", ...unhooking],
    delivery: [
      ...ruledOut,
      "coach-held",
      ...towing(before, ["bar-level"], ["bolt-record", "short-cables"], ["breakaway-pull"]),
      ...unhooking,
      "driver-shows",
    ],
    "yard-out": [
      ...ruledOut,
      "coach-held",
      "pins-counted",
      "gear-counted",
      ...towing(before, [], ["short-cables"], []),
      "driver-shows",
    ],
    "yard-in": [
      "coach-held",
      "wheel-heat",
      ...unhooking,
      "pins-counted",
      "bar-play",
      "cord-jacket",
      "tire-scrub",
      "tires",
      "gear-counted",
    ],
  };
}

/** The kinds of walk that have a check, whatever the sheet. */
export function walksWith(key: string): Purpose[] {
  const orders = ordersFor(null);
  return purposes.filter((purpose) => orders[purpose].includes(key));
}
