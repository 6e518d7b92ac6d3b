import type { DrawingWords } from "./drawings";

/** The words on the drawings of the cabin, the brake families and what is around the rig. */
export const cabinDrawingWords = {
  "coach-held": {
    title: "Coach and car held, on level ground",
    description:
      "The coach and the car stand apart on level ground. On the coach’s dash the lamp for its parking brake is lit. A " +
      "chock is pushed tight against the tread in front of the car’s wheel and another behind it.",
    callouts: {
      A: ["coach brake", "set: lamp lit"],
      B: ["chocked,", "both sides"],
      C: ["level ground"],
    },
  },
  steering: {
    title: "Steering wheel, from the driver’s seat",
    description:
      "Two hands turn the car’s steering wheel a little to the left and a little to the right. The column does not catch " +
      "on either side.",
    callouts: {
      A: ["turns by hand, both ways"],
      B: ["column does not catch"],
    },
  },
  "parking-brake": {
    title: "Car’s parking brake off, chocks out",
    description:
      "The car’s wheel stands free: dashed lines show where the chocks were, and arrows that they are gone. The parking " +
      "brake’s lever is down and its lamp on the dash is dark.",
    callouts: {
      A: ["brake off,", "lamp dark"],
      B: ["chocks out"],
    },
  },
  fuse: {
    title: "Fuse box beside the column, fuse in",
    description:
      "The fuse box beside the steering column is open. The place that the car’s manual names has its fuse in it, and " +
      "the strip inside the fuse is whole.",
    callouts: {
      A: ["fuse in its place"],
      B: ["strip whole"],
    },
  },
  "fuse-off": {
    title: "Fuse box beside the column, fuse out",
    description:
      "The fuse box beside the steering column is open. The place that the car’s manual names is empty: its two slots " +
      "show. The fuse that was in it is kept.",
    callouts: {
      A: ["place empty"],
      B: ["fuse kept"],
    },
  },
  pedal: {
    title: "Brake pedal with nothing left at it",
    description:
      "The driver’s footwell from the side. The pedal is fully up on its stop. Dashed lines between pedal and seat show " +
      "where a prop and its clamp would stand; there is none.",
    callouts: {
      A: ["pedal up,", "on its stop"],
      B: ["no prop,", "no clamp"],
    },
  },
  "brake-air": {
    title: "Brake on the coach’s air",
    description:
      "In the car’s footwell the cylinder’s rod is in and the pedal is up on its stop. Between the vehicles the air line’s " +
      "coupling is home. In the coach, with its brake pedal down, the monitor lamp is lit.",
    callouts: {
      A: ["rod in,", "pedal up"],
      B: ["coupling home"],
      C: ["coach pedal", "down: lamp lit"],
    },
  },
  "brake-hydraulic": {
    title: "Hydraulic brake line at its coupling",
    description:
      "The brake line’s coupling at the coach, partly cut: the nose is all the way in and the sleeve has slid over the " +
      "balls that hold it. The coupling is dry underneath and so is the ground below it.",
    callouts: {
      A: ["nose in,", "sleeve home"],
      B: ["dry: no drips"],
    },
  },
  "brake-surge": {
    title: "Cable of the brake built into the bar",
    description:
      "A cable runs from the lever on the bar’s sliding head through the car’s nose to its brake pedal. With the rig at " +
      "rest the cable hangs slack on both sides, and the pedal is up on its stop.",
    callouts: {
      A: ["cable hangs", "slack"],
      B: ["pedal up,", "on its stop"],
      C: ["hooked on"],
    },
  },
  monitor: {
    title: "Brake monitor in the coach",
    description:
      "The monitor stands on the coach’s dash. It is on, its ready lamp is lit and its fault lamp is dark.",
    callouts: {
      A: ["on, ready lit"],
      B: ["fault lamp dark"],
    },
  },
  "manual-apply": {
    title: "Brake applied by hand from the coach",
    description:
      "A finger presses the control in the coach and its lamp is lit. In the car the brake pedal goes down from its place at rest, which is " +
      "dashed.",
    callouts: {
      A: ["control", "pressed"],
      B: ["car’s pedal", "goes down"],
    },
  },
  jacks: {
    title: "Coach’s jacks and air suspension",
    description:
      "The coach’s rear from the side, its skirt cut away. The jack’s foot is drawn up, well clear of the ground. The air " +
      "bag above the axle is filled to travel height.",
    callouts: {
      A: ["feet", "drawn up"],
      B: ["air bag at", "travel height"],
    },
  },
  "light-bar": {
    title: "Removable light bar on the car’s tail",
    description:
      "The car’s tail from behind. The light bar lies level across it, held at both ends by a strap. Its cord runs into the " +
      "car and does not hang. The plate can be read.",
    callouts: {
      A: ["both ends held"],
      B: ["cord in"],
      C: ["plate in view"],
    },
  },
} satisfies Record<string, DrawingWords>;
