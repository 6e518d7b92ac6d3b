import type { DrawingKey, DrawingWords } from "./drawings";

const quickCallouts = {
  A: ["turned, marks", "in line"],
  B: ["spring clip", "closed"],
  C: ["seated,", "no gap"],
} as const;

const quickDescription = (side: string) =>
  `The ${side} arm’s end is an insert that goes into the base plate’s socket. It sits flush against the socket with no ` +
  "gap, it is turned until the mark on it stands in line with the mark on the socket, so that its two lugs lie behind " +
  "the socket’s ledge, and the spring clip goes through both and is snapped closed around the socket.";

/** The drawings of what joins the vehicles, besides those of the usual rig. */
export const betweenWords = {
  ball: {
    title: "Ball coupler at the coach’s tail",
    description:
      "The coupler sits all the way down over the ball, with its clamp closed under the ball. The latch lies flat along " +
      "the coupler, its tab is back in its slot, and a pin goes through the latch with a clip through the pin’s end.",
    callouts: {
      A: ["latch down,", "tab back in slot"],
      B: ["pin through latch,", "clip on its end"],
      C: ["ball all the", "way in"],
    },
  },
  pintle: {
    title: "Pintle hook and ring at the coach’s tail",
    description:
      "The bar’s ring lies in the hook. The latch is closed down onto the hook’s tip, and a pin goes through the latch " +
      "with a clip through the pin’s end. The ring is as thick where it rests in the hook as it is all around.",
    callouts: {
      A: ["latch down on", "the hook’s tip"],
      B: ["pin through latch,", "clip on its end"],
      C: ["ring in hook,", "not worn thin"],
    },
  },
  "arm-quick-left": {
    title: "Left arm’s quick disconnect at the base plate",
    description: quickDescription("left"),
    callouts: quickCallouts,
  },
  "arm-quick-right": {
    title: "Right arm’s quick disconnect at the base plate",
    description: quickDescription("right"),
    callouts: quickCallouts,
  },
  "base-plate": {
    title: "Base plate seen from in front of the car",
    description:
      "The base plate’s cross tube is bolted to both frame rails of the car and carries two pairs of tabs. A line drawn " +
      "over each bolt head and the plate beside it is still one line. There is no crack at a bolt or along a weld, and " +
      "nothing is loose when the tabs are pushed down and pulled up.",
    callouts: {
      A: ["marks in line", "at every bolt"],
      B: ["no crack at", "bolt or weld"],
      C: ["nothing loose,", "up or down"],
    },
  },
  "short-cables": {
    title: "Short cables of the removable base-plate arms, from above",
    description:
      "Two removable arms sit in the base plate’s sockets on the car. Each has a short cable of its own from an eye on " +
      "the arm to an eye on the part of the base plate that stays on the car, and every link is screwed shut.",
    callouts: {
      A: ["one at", "each arm"],
      B: ["to the part that", "stays on the car"],
      C: ["links screwed shut"],
    },
  },
  "arms-locked": {
    title: "Both arms of the tow bar seen from above",
    description:
      "Both arms are drawn out to their ends. On each the latch is home: its lever lies flat along the arm and, seen " +
      "close up, its plunger has dropped into the inner tube.",
    callouts: {
      A: ["latch home, left and right"],
      B: ["both arms", "drawn out"],
      C: ["plunger", "down"],
    },
  },
  lanyard: {
    title: "Breakaway switch and its lanyard",
    description:
      "The breakaway switch is on the car. Its pin is fully in. The lanyard runs from the pin in line with the switch, " +
      "with some slack, to a point of its own on the coach’s frame. It is not on the bar and not wound around it.",
    callouts: {
      A: ["pin fully in"],
      B: ["own point on the", "coach’s frame"],
      C: ["slack, clear", "of the bar"],
    },
  },
  "air-line": {
    title: "Air line between coach and car",
    description:
      "The air hose’s end is pushed all the way into the coach’s coupler and the coupler’s sleeve has sprung forward " +
      "over it. The hose hangs in a loop without a kink and rubs on nothing, and its other end is coupled at the car.",
    callouts: {
      A: ["coupled,", "sleeve forward"],
      B: ["no kink,", "rubs nowhere"],
      C: ["coupled at", "the car"],
    },
  },
  "charge-line": {
    title: "Charge line to the car’s battery",
    description:
      "The charge line’s plug is pushed home. From it the line runs through a fuse in its holder, with the cover " +
      "closed, to a clamp on the plus post of the car’s battery.",
    callouts: {
      A: ["plugged in"],
      B: ["fuse in,", "cover shut"],
      C: ["clamp on post"],
    },
  },
} as const satisfies Partial<Record<DrawingKey, DrawingWords>>;
