import { figure } from "../messages/catalogue-figures";
import { only, told, unsaid } from "./conditions";
import { text, type Entry, type Words } from "./entry";
import type { Facts } from "./facts";
import { couplingRule, makersManual, practice } from "./origins";

const BETWEEN = "Nobody between the vehicles while either can move.";
const pinWhy =
  "These pins hold everything behind the coach. A pin that walks out lets the whole bar slide out.";
const receiver = { key: "receiver-pins", station: "coach-tail", effect: "hold" } as const;
const touches = ["cables", "lanyard", "cord"];
const pinMend = {
  mend: "Push the pin through and close its clip. Replace a pin that is bent or worn.",
  who: "You, with a pin and clip of the maker’s kind. Cracked welds: a licensed shop.",
  caution: BETWEEN,
  touches,
  origin: couplingRule,
} satisfies Partial<Words>;

const armPieces = {
  pin: "A pin and a clip for each arm.",
  quick: "A spring clip for each arm.",
  unsaid: "What keeps each arm at the car.",
};

/** What is said of a drop receiver beside a coupler, which its drawing does not show. */
function dropWords({ drop }: Facts): string | false {
  if (drop === null) return "A drop receiver, where there is one, has a pin and clip of its own.";
  return drop && "The drop receiver has a pin and clip of its own.";
}

export const coachTail: Entry[] = [
  {
    id: "coach-held",
    key: "coach-held",
    station: "coach-tail",
    effect: "hold",
    when: [only("every")],
    words: () => ({
      part: "coach-held",
      ask: "Coach braked, car chocked",
      how: "The coach’s parking brake is set and its lamp is lit. A chock stands on each side of one car wheel. The ground is level, the rig in line, and a few feet of road ahead are clear.",
      why: "Between the vehicles is where people are crushed. Nothing may move while someone stands there.",
      mend: "Set the brake, chock the car, and come back only then.",
      caution: BETWEEN,
      origin: makersManual("tow bars"),
    }),
  },
  {
    ...receiver,
    id: "receiver-direct-drop",
    when: [only("direct"), only("drop")],
    words: () => ({
      ...pinMend,
      part: "receiver",
      ask: "Receiver pins in, clips closed",
      how: "Two pins: one through the coach’s receiver and the drop receiver’s shank, one through the drop receiver and the bar’s shank. Each goes all the way through, its clip or lock closed on its end. The welds are whole.",
      why: pinWhy,
    }),
  },
  {
    ...receiver,
    id: "receiver-direct",
    when: [only("direct"), { condition: "drop", on: ["no"] }],
    words: () => ({
      ...pinMend,
      part: "receiver",
      drawn: "place",
      ask: "Receiver pin in, its clip closed",
      how: "The pin goes all the way through the coach’s receiver and the bar’s shank, its clip or lock closed on its end. The shank is seated and the welds are whole.",
      why: "This pin holds everything behind the coach. A pin that walks out lets the whole bar slide out.",
    }),
  },
  {
    ...receiver,
    id: "receiver-direct-drop-unsaid",
    when: [only("direct"), unsaid("drop")],
    words: () => ({
      ...pinMend,
      part: "receiver",
      drawn: "place",
      ask: "Receiver pins in, clips closed",
      how: "The pin goes all the way through the coach’s receiver, its clip or lock closed on its end. A drop receiver, where there is one, has a second pin and clip of its own. The welds are whole.",
      why: pinWhy,
    }),
  },
  {
    ...receiver,
    id: "receiver-ball",
    when: [only("ball"), told("drop")],
    words: (facts) => {
      const size = facts.sheet.gear?.coupler?.ballSize;
      return {
        part: "ball",
        ask: "Coupler down on ball, latch pinned",
        how: text(
          "The coupler sits all the way down on the ball. Its latch lies flat, the tab back in its slot, a pin or lock through it, and lifted hard it stays down. The nut under the ball is in place, the shank not scraped. The ball mount’s hitch pin is through, its clip closed.",
          dropWords(facts),
        ),
        why: "A coupler whose latch is not pinned, or of another size than its ball, can be levered off in a deep dip.",
        mend: "Lift the coupler off, look into it, set it down again and pin the latch. A cracked part is replaced. The sizes on ball and coupler are the same.",
        who: "You for the latch and its pin. Cracks, and the ball’s nut: a licensed shop.",
        caution: text("A coupler that comes down can crush a hand.", BETWEEN),
        touches,
        origin: makersManual("tow bars with a coupler"),
        ...(size && { figures: { C: `${figure(size)} ball` } }),
      };
    },
  },
  {
    ...receiver,
    id: "receiver-pintle",
    when: [only("pintle"), told("drop")],
    words: (facts) => ({
      part: "pintle",
      ask: "Ring on the hook, latch pinned",
      how: text(
        "The ring lies in the hook and is not worn thin. The latch is closed onto the hook’s tip, its pin through, a clip on the pin’s end. The mount’s hitch pin is through the receiver, its clip closed.",
        dropWords(facts),
      ),
      why: "An open latch lets the ring lift off the hook where the road dips.",
      mend: "Close the latch until its pin goes through. A latch that does not close is replaced, and so is a worn ring.",
      who: "You for the latch and its pin. A worn ring or hook: a licensed shop.",
      caution: text("A ring that comes down can crush a hand.", BETWEEN),
      touches,
      origin: makersManual("pintle hooks"),
    }),
  },
  {
    ...receiver,
    id: "receiver-unsaid",
    when: [unsaid("direct"), told("drop")],
    words: (facts) => ({
      ...pinMend,
      part: "receiver",
      drawn: "place",
      ask: "Bar held at the coach, pins clipped",
      how: text(
        "The bar is seated at the coach as its own manual shows. Every pin there goes all the way through, its clip or lock closed on its end. A latch is closed, with a pin through it.",
        dropWords(facts),
      ),
      why: pinWhy,
    }),
  },
  {
    id: "bar-level",
    key: "bar-level",
    station: "coach-tail",
    effect: "hold",
    when: [only("every")],
    words: ({ sheet }) => {
      const limit = sheet.gear?.towBar?.slopeLimit;
      return {
        part: "receiver",
        drawn: "place",
        ask: "Bar level, within its maker’s limit",
        how: "Level ground, coach at travel height. Measure from the ground to the middle of the bar at the coach and at the car: the difference is within what the bar’s own manual allows.",
        why: "In a hard stop a bar that slopes lifts one end and presses the other down.",
        mend: "Have the drop or the rise between coach and bar changed.",
        who: "A licensed shop, by the bar maker’s manual.",
        measure: {
          quantity: "length",
          unit: "mm",
          ask: "The difference in height",
          beside: limit
            ? `The bar maker’s limit on the sheet is ${figure(limit)}.`
            : "The limit is in the bar’s own manual; the sheet does not have it.",
        },
        origin: makersManual("tow bars"),
      };
    },
  },
  {
    id: "pins-counted",
    key: "pins-counted",
    station: "coach-tail",
    effect: "hold",
    when: [only("every")],
    words: (facts) => ({
      part: "bar-stowed",
      drawn: "place",
      ask: "Pins, clips and locks: all there",
      how: text(
        "Count them against what belongs to this bar.",
        armPieces[facts.armEnds ?? "unsaid"],
        "A pin and a clip for the receiver.",
        facts.drop && "A second pair for the drop receiver.",
        facts.coupling === "ball" && "A pin or lock for the coupler’s latch.",
        facts.coupling === "pintle" && "A pin and a clip for the hook’s latch.",
        "None is bent, none is worn.",
      ),
      why: "A pin that is missing is noticed when it is needed, and then something else is put in its place.",
      mend: "Replace what is missing or bent with the maker’s own kind.",
      touches: ["receiver-pins", "arm-left", "arm-right"],
      origin: practice,
    }),
  },
];
