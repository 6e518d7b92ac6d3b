import type { PartKey, StationKey } from "../revision";
import { betweenWords } from "./drawings-between";
import { cabinDrawingWords } from "./drawings-cabin";

export type DrawingSide = "left" | "right";
export const calloutLetters = ["A", "B", "C", "D"] as const;
export type CalloutLetter = (typeof calloutLetters)[number];
/** The parts that are drawn for each side. */
export type SidedPart = "arm" | "arm-quick";
/**
 * An arm end has words of its own for each side, the cord when it is off, the fuse when it is out, the wheels when they
 * stand, the brake when it is built into the car, the last look where it is for joints or for tires alone.
 */
export type DrawingKey =
  | Exclude<PartKey, SidedPart>
  | `${SidedPart}-${DrawingSide}`
  | "cord-off"
  | "fuse-off"
  | "wheels-standing"
  | "brake-installed"
  | "last-look-joints"
  | "last-look-tires";

export type DrawingWords = {
  title: string;
  /** What the drawing shows, for someone who cannot see it. */
  description: string;
  /** The label beside each letter, one string a line. */
  callouts: Partial<Record<CalloutLetter, readonly string[]>>;
};

const armCallouts = {
  A: ["pin down", "full depth"],
  B: ["ring over", "its end"],
  C: ["through", "both tabs"],
} as const;

const armDescription = (side: string) =>
  `The ${side} arm end sits between the two tabs of the base plate. The pin goes down through the upper tab, the ` +
  "arm end and the lower tab until its head rests on the upper tab. A clip passes through the pin below the lower " +
  "tab and its ring is snapped over the pin’s end.";

export const drawingWords: Record<DrawingKey, DrawingWords> = {
  ...betweenWords,
  receiver: {
    title: "Receiver, drop receiver and bar at the coach’s tail",
    description:
      "The drop receiver’s shank sits in the coach’s receiver with a hitch pin through both and a clip through the " +
      "pin’s end. The bar’s own shank sits in the drop receiver below it with a second pin and a second clip.",
    callouts: {
      A: ["hitch pin through,", "clip on its end"],
      B: ["bar: its own", "pin and clip"],
      C: ["shank seated,", "welds whole"],
    },
  },
  "arm-left": {
    title: "Left arm end at the base plate",
    description: armDescription("left"),
    callouts: armCallouts,
  },
  "arm-right": {
    title: "Right arm end at the base plate",
    description: armDescription("right"),
    callouts: armCallouts,
  },
  cables: {
    title: "Safety cables seen from above",
    description:
      "Two safety cables run from the coach’s frame to the car’s frame and cross under the bar. Each end is hooked to " +
      "the frame, none to the bar, and each link is screwed shut. Both cables hang with some slack.",
    callouts: {
      A: ["frame to frame,", "not to the bar"],
      B: ["crossed", "under the bar"],
      C: ["sleeve", "screwed", "shut"],
    },
  },
  cord: {
    title: "Cord and breakaway lanyard",
    description:
      "The cord is plugged in at the coach and at the car and hangs clear of the ground. The lanyard runs from the pin " +
      "of the breakaway switch on the car to a point of its own on the coach’s frame, not to the bar or a cable.",
    callouts: {
      A: ["plugged in,", "both ends"],
      B: ["clear of", "ground"],
      C: ["lanyard on its own", "point of the frame"],
      D: ["pin fully", "in switch"],
    },
  },
  "cord-off": {
    title: "Everything off between the vehicles, sockets capped",
    description:
      "Cord, safety cables and lanyard are off; only the bar is left between the vehicles. The caps on the coach’s and " +
      "the car’s sockets are closed. The pin stays in the breakaway switch.",
    callouts: {
      A: ["caps closed"],
      B: ["lanyard off,", "cables off"],
    },
  },
  cabin: {
    title: "Car cabin, as its own manual says",
    description:
      "From the driver’s seat: the car’s owner’s manual lies open at the page for this procedure, and what the car " +
      "shows agrees with the end state that page names. The steering wheel turns freely both ways.",
    callouts: {
      A: ["as the page", "says"],
      B: ["wheel turns free"],
      C: ["this car’s manual"],
    },
  },
  brake: {
    title: "Supplemental brake at the pedal",
    description:
      "The brake unit stands on the floor against the seat with its arm clamped to the brake pedal. The pedal is fully " +
      "up and the unit’s ready light is lit.",
    callouts: {
      A: ["pedal up,", "on its stop"],
      B: ["clamp", "closed"],
      C: ["ready light lit"],
      D: ["against the seat"],
    },
  },
  "brake-installed": {
    title: "Brake pedal of a car with its brake built in",
    description:
      "The driver’s footwell from the side. Nothing stands at the pedal and the pedal is fully up.",
    callouts: {
      A: ["pedal up,", "on its stop"],
    },
  },
  wheels: {
    title: "Both vehicles rolled a few feet",
    description:
      "The coach has pulled the car forward a few feet in a straight line. All four wheels of the car have turned with " +
      "it. Seen close up, the arm is drawn out to its end and its latch has dropped in.",
    callouts: {
      A: ["both arms out, latch down"],
      B: ["all four wheels turn"],
    },
  },
  "wheels-standing": {
    title: "The car’s wheels, with the rig stopped",
    description:
      "The coach and the car stand still. Marked are the wheels on one side of the car; each has its pair on the other side.",
    callouts: {
      A: ["left against right"],
    },
  },
  lamps: {
    title: "The car’s tail from behind",
    description: "The car seen from behind with its left and right lamps.",
    callouts: {},
  },
  "last-look": {
    title: "The whole rig from above",
    description:
      "A path leads once around the coach’s tail, the bar and the car. Marked on it are the joints to put a hand on: " +
      "hitch pin, both arm pins, both cables at each end, the cord’s two plugs and the lanyard. Every tire is marked too.",
    callouts: {
      A: ["a hand on every joint"],
      B: ["every tire"],
    },
  },
  "last-look-joints": {
    title: "Every joint of the rig from above",
    description:
      "A path leads once around the coach’s tail, the bar and the car. Marked on it are the joints to put a hand on: " +
      "hitch pin, both arm pins, both cables at each end, the cord’s two plugs and the lanyard.",
    callouts: {
      A: ["a hand on every joint"],
    },
  },
  "last-look-tires": {
    title: "Every tire of the rig from above",
    description:
      "A path leads once around the coach’s tail, the bar and the car. Every tire is marked on it.",
    callouts: {
      A: ["every tire"],
    },
  },
  chocks: {
    title: "Car wheel chocked, parking brake on",
    description:
      "A chock is pushed tight against the tread in front of the car’s wheel and another behind it. The parking brake " +
      "is on.",
    callouts: {
      A: ["tight to the tread, both sides"],
      B: ["parking", "brake on"],
    },
  },
  "bar-stowed": {
    title: "Bar folded at the coach",
    description:
      "Seen from behind the coach: both arms are folded together to one side and held by the stow latch. The arm pins " +
      "hang in their own holes with clips through them. The hitch pin and its clip are still in the receiver.",
    callouts: {
      A: ["arms folded,", "latch down"],
      B: ["pins back,", "clips on"],
      C: ["hitch pin,", "its clip"],
    },
  },
  ...cabinDrawingWords,
};

export const lampWords = {
  left: "LEFT",
  right: "RIGHT",
  steady: "steady",
  flashing: "flashing",
  dim: "dim",
  dark: "dark",
  wrong: "wrong",
  description: (left: string, right: string) => `Left lamp ${left}, right lamp ${right}.`,
} as const;

export const legendWords = {
  list: "Called out on the drawing",
  /** After a label that someone touched, for someone who cannot see that it is struck out. */
  marked: "not as drawn",
} as const;

/** Where you stand on the rig plan, for someone who cannot see it. */
export const rigPlanWords: Record<StationKey, string> = {
  "coach-tail": "You are at the coach’s tail",
  "car-nose": "You are at the car’s nose",
  "cables-and-cord": "You are between the vehicles, at the cables and the cord",
  "car-cabin": "You are in the car’s cabin",
  pull: "You are at the coach’s wheel",
  "car-tail": "You are behind the car",
  "last-look": "You are walking once around the whole rig",
};
