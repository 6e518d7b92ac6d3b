import { only, unsaid } from "./conditions";
import { text, type Entry, type Words } from "./entry";
import type { Facts } from "./facts";
import { makersManual, practice } from "./origins";

const HELD = "Secure the car first: parking brake on, wheels chocked.";
const sides = { left: "Left", right: "Right" } as const;
type Side = keyof typeof sides;

const armWhy =
  "An end that is not secured shakes out on the road, and one arm alone does not hold a car in line.";
const armTouches = ["cables", "arms-locked"];
const armCaution = `The arm can drop on a hand when it comes off. ${HELD}`;

function armEntries(side: Side): Entry[] {
  const name = sides[side];
  const arm = { key: `arm-${side}`, station: "car-nose", effect: "hold" } as const;
  const shared = { why: armWhy, caution: armCaution, touches: armTouches } satisfies Partial<Words>;
  return [
    {
      ...arm,
      id: `arm-${side}-pin`,
      when: [only("pinEnds")],
      words: () => ({
        ...shared,
        part: "arm",
        side,
        ask: `${name} arm: pin in, clip over it`,
        how: `Look at the ${side} arm where it meets the car. The pin is through both tabs, all the way down, and the ring of the clip is snapped over its end.`,
        mend: "Seat the pin to its full depth, then snap the ring over. A pin that needs force is bound: the bar’s own manual has the way to unload it, without a hammer.",
        who: "You, with the clip that belongs to this bar.",
        origin: makersManual("tow bars"),
      }),
    },
    {
      ...arm,
      id: `arm-${side}-quick`,
      when: [only("quickEnds")],
      words: () => ({
        ...shared,
        part: "arm-quick",
        side,
        ask: `${name} arm: turned in, clip closed`,
        how: `Look at the ${side} arm where it meets the car. Its end sits flush in the socket, no gap, marks in line, and the spring clip is snapped closed around the socket. Pull it with both hands.`,
        mend: "Take the end out, look into the socket, seat it again until the marks are in line, and close the clip. A clip without spring is replaced.",
        who: "You, with the clip that belongs to this bar. Adapters between makes: ask a licensed shop.",
        origin: makersManual("tow bars"),
      }),
    },
    {
      ...arm,
      id: `arm-${side}-unsaid`,
      when: [unsaid("pinEnds")],
      words: () => ({
        ...shared,
        part: "arm",
        side,
        drawn: "place",
        ask: `${name} arm: seated, clip closed`,
        how: `Look at the ${side} arm where it meets the car. Its end is seated as the bar’s own manual shows, and what keeps it there is closed. Pull it with both hands.`,
        mend: "Seat it again as the bar’s own manual shows, and close its clip.",
        who: "You, with the clip that belongs to this bar.",
        origin: makersManual("tow bars"),
      }),
    },
  ];
}

function plateHow({ removableArms }: Facts): string {
  return text(
    "Take each tab by hand, push down and pull up. The car may rise on its springs; the plate itself does not move. The marks at the bolts are in line, and no crack shows at a bolt, along a weld or in the bar’s arms.",
    removableArms && "Each removable arm is home in its socket and locked there.",
  );
}

export const carNose: Entry[] = [
  {
    id: "base-plate",
    key: "base-plate",
    station: "car-nose",
    effect: "hold",
    when: [only("every")],
    words: (facts) => ({
      part: "base-plate",
      ask: "Base plate, bar: none loose, no crack",
      how: plateHow(facts),
      why: "Everything between the vehicles hangs on this plate, the safeguards too.",
      mend: "Do not tighten it by feel. The plate’s own manual has the way, and a crack is not mended at a campsite.",
      who: "A licensed shop, by the plate maker’s manual.",
      touches: ["arm-left", "arm-right", "cables"],
      origin: makersManual("base plates and tow bars"),
    }),
  },
  ...armEntries("left"),
  ...armEntries("right"),
  {
    id: "bolt-record",
    key: "bolt-record",
    station: "car-nose",
    effect: "hold",
    when: [only("every")],
    words: ({ sheet: { gear } }) => {
      const record = gear?.basePlate?.torqueRecord;
      return {
        part: "base-plate",
        ask: "Every bolt recorded and marked",
        how: text(
          "The record has a value from the kit’s own sheet for every bolt of base plate, bar and receiver, and each bolt has its line of paint.",
          record ? `The plate’s record: ${record}.` : "The sheet does not say where the plate’s record is.",
        ),
        why: "A bolt that nobody recorded is the one that works loose. The line shows later whether it turned.",
        mend: "Do the bolts that are missing by the kit’s own sheet and write them down. Name the day to look at them again, as that sheet has it.",
        who: "A licensed shop, by the kit’s own sheet.",
        touches: ["base-plate"],
        origin: makersManual("base plates"),
      };
    },
  },
  {
    id: "bar-play",
    key: "bar-play",
    station: "car-nose",
    effect: "hold",
    when: [only("every")],
    words: ({ armEnds }) => ({
      part: armEnds === "quick" ? "arm-quick" : "arm",
      drawn: "place",
      ask: "Bar: no play, no bend, no crack",
      how: "Push and pull each joint of the bar by hand. Sight along both arms. Look at yoke, swivel and welds, and at each pin for a bend.",
      why: "Joints wear where a bar ran out of level or overloaded, and a bent arm was backed up or jackknifed.",
      mend: "Take the bar out of use and have it looked at. Ask the driver what happened.",
      who: "A licensed shop, by the bar maker’s manual.",
      origin: practice,
    }),
  },
];
