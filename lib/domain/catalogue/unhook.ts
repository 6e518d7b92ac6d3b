import { maybe, only, unless, unsaid } from "./conditions";
import { text, type Entry, type Words } from "./entry";
import type { Facts } from "./facts";
import { makersManual, practice } from "./origins";

const off = { key: "brake-off", station: "car-cabin", effect: "hold" } as const;
const offShared = {
  why: "A pedal that is still held, or a unit that is still set, brakes or surprises whoever drives the car next.",
  mend: "Take it off as the brake’s own manual has it, and look at the pedal again.",
  origin: makersManual("supplemental brakes"),
} satisfies Partial<Words>;

const builtInOff: Partial<
  Record<NonNullable<Facts["brake"]>, Pick<Words, "part" | "drawn" | "ask" | "how">>
> = {
  "installed-vacuum": {
    part: "brake",
    drawn: "installed",
    ask: "Brake off at its control, pedal up",
    how: "The brake is switched off as its own manual has it. The car’s pedal is all the way up.",
  },
  air: {
    part: "brake",
    drawn: "installed",
    ask: "Brake’s rod in, pedal all the way up",
    how: "The cylinder’s rod is in and the car’s pedal is all the way up. What its own manual wants before the car is driven is done.",
  },
  hydraulic: {
    part: "brake",
    drawn: "installed",
    ask: "Brake line off, capped, pedal firm",
    how: "The brake line is off and both halves of its coupling are capped. Nothing drips, and the car’s pedal is up and firm.",
  },
  surge: {
    part: "brake",
    drawn: "installed",
    ask: "Brake cable unhooked, pedal up",
    how: "The cable is off the bar and put where its own manual wants it. The car’s pedal is all the way up.",
  },
};

const stow = { key: "bar-stowed", station: "coach-tail", effect: "hold" } as const;
const stowShared = {
  why: "A bar that swings out hits what is next to it, and a pin left on the ground is missing tomorrow.",
  mend: "Fold it until the latch closes. Put each pin where it belongs before walking away.",
  caution: "Arms that fold can pinch a hand.",
  origin: makersManual("tow bars"),
} satisfies Partial<Words>;

const stowAsk = (lead: string, { armEnds }: Facts) =>
  `${lead}, ${armEnds === "quick" ? "clips back on" : "pins back in holes"}`;

function endsAway({ armEnds }: Facts): string {
  return armEnds === "quick"
    ? "Each arm’s spring clip is back on it, so that none is lost."
    : "The arms’ pins are back in their own holes with their clips.";
}

const plateArms = ({ removableArms }: Facts) =>
  removableArms && "The base plate’s own arms are off and put away, or home and locked.";

const hardWired = ({ sheet }: Facts) => sheet.gear?.cord?.carEnd === "hard-wired";

/** What hangs between the vehicles besides the bar, by name. */
function lines(facts: Facts): string {
  const { breakaway, airLine, sheet } = facts;
  const charge = sheet.gear?.chargeLine?.there && sheet.gear.chargeLine.plug === "own-plug";
  const names = [
    !hardWired(facts) && "cord",
    "cables",
    breakaway !== false && "lanyard",
    airLine && "air line",
    charge && "charge line",
  ].filter(Boolean);
  return names.join(", ").replace(/, (?=[^,]*$)/, " and ");
}

export const unhook: Entry[] = [
  {
    ...off,
    id: "brake-box-off",
    when: [only("brake"), only("brakeBox")],
    words: () => ({
      ...offShared,
      part: "pedal",
      ask: "Brake box out, no clamp on the pedal",
      how: "The unit is off and out of the footwell. The pedal is up on its stop, with no clamp and no prop left at it.",
    }),
  },
  {
    ...off,
    id: "brake-built-in-off",
    when: [only("brake"), unless("brakeBox")],
    // A brake of another kind keeps this off the list, where a reviewer still reads it.
    words: ({ brake }) => ({
      ...offShared,
      ...(builtInOff[brake ?? "installed-vacuum"] ?? builtInOff["installed-vacuum"]!),
    }),
  },
  {
    ...off,
    id: "brake-unsaid-off",
    when: [unsaid("brake")],
    words: () => ({
      ...offShared,
      part: "pedal",
      ask: "Brake off, nothing left at the pedal",
      how: "The brake for towing is off, as its own manual has it. The pedal is up on its stop, with no clamp and no prop left at it.",
    }),
  },
  {
    id: "lines-off",
    key: "lines-off",
    station: "cables-and-cord",
    effect: "hold",
    when: [only("every")],
    words: (facts) => ({
      part: "cord",
      // Its drawing has sockets on both vehicles, and a lanyard.
      drawn: facts.breakaway === false || hardWired(facts) ? "place" : "off",
      ask: "Cord, cables, lines off and capped",
      how: text(
        `Off and put away: ${lines(facts)}.`,
        hardWired(facts) && "The cord stays on the car, unplugged and tied up.",
        "The caps on the sockets are closed.",
        facts.breakaway !== false && "The pin stays in the breakaway switch.",
      ),
      why: "What still hangs between the vehicles is torn off when the first one drives. An open socket fills with water.",
      mend: "Take them off and close the caps.",
      origin: practice,
    }),
  },
  {
    id: "latches-released",
    key: "latches-released",
    station: "car-nose",
    effect: "hold",
    when: [{ condition: "aligning", on: ["yes", "unknown"] }],
    words: () => ({
      part: "arms-locked",
      drawn: "place",
      ask: "Arm latches released, no load on them",
      how: "The car is held. Each latch is released as the bar’s own manual has it, and each arm’s end is free to come out. Where one is bound, that manual has the way to unload it: no hammer.",
      why: "A latch under load snaps when it is struck, and the arm jumps.",
      mend: "Leave it, keep hands out, and follow the bar’s own manual.",
      caution: "Hands out of where the arms pinch.",
      origin: makersManual("self-aligning tow bars"),
    }),
  },
  {
    id: "one-side",
    key: "one-side",
    station: "car-nose",
    effect: "hold",
    when: [{ condition: "stowsOnCoach", on: ["yes", "unknown"] }],
    words: () => ({
      part: "chocks",
      ask: "First arm off: the car stands still",
      how: "Only one side is off yet, and the car has not moved. Its parking brake is on and the chocks are tight to the tread. Then the other side.",
      why: "With both sides off nothing but its own brake and the chocks hold the car.",
      mend: "Put the arm back where it can be put back, hold the car, and begin again.",
      caution: "Never both sides off before the car is held.",
      touches: ["car-held"],
      origin: practice,
    }),
  },
  {
    id: "bar-off-coach",
    key: "one-side",
    station: "car-nose",
    effect: "hold",
    when: [unless("stowsOnCoach")],
    words: () => ({
      part: "chocks",
      ask: "Bar off at the coach: car stands still",
      how: "The bar is off at the coach, and the car has not moved. Its parking brake is on and the chocks are tight to the tread.",
      why: "With the bar off at the coach nothing but its own brake and the chocks hold the car.",
      mend: "Stand clear. Hold the car before anyone goes near the bar again.",
      caution: "Never the bar off before the car is held. A bar that comes down can crush a foot.",
      touches: ["car-held"],
      origin: practice,
    }),
  },
  {
    id: "light-bar-off",
    key: "light-bar-off",
    station: "car-tail",
    effect: "fix",
    when: [maybe("lightBar")],
    words: ({ sheet: { gear } }) => ({
      part: "light-bar",
      drawn: "place",
      ask: "Light bar off, car’s own lamps in view",
      how: text(
        "The light bar is off the car and put away.",
        gear?.lightBar?.power !== "own-battery" && "Its cord is out of the way of doors and wheels.",
        "The car’s own lamps and its plate are in view.",
      ),
      why: "A light bar that was left on hides the car’s own lamps, or falls off on the road.",
      mend: "Take it off and put it where it is counted.",
      origin: practice,
    }),
  },
  {
    ...stow,
    id: "bar-stowed-coach",
    when: [only("stowsOnCoach")],
    words: (facts) => ({
      ...stowShared,
      part: "bar-stowed",
      // Its drawing has the arms' pins in their holes, and a bar in a receiver.
      ...((facts.armEnds !== "pin" || facts.coupling !== "direct") && { drawn: "place" as const }),
      ask: stowAsk("Bar folded", facts),
      how: text(
        "The arms are folded and their latch is down for the road.",
        endsAway(facts),
        "What holds the bar at the coach is still pinned and clipped.",
        plateArms(facts),
      ),
    }),
  },
  {
    ...stow,
    id: "bar-stowed-car",
    when: [unless("stowsOnCoach")],
    words: (facts) => ({
      ...stowShared,
      part: "bar-stowed",
      drawn: "place",
      ask: "Bar up on the car, pins back in holes",
      how: text(
        "The bar is folded and made fast on the car as its own manual shows, or taken off.",
        "Every pin and clip is back in its own hole. Nothing is left at the coach that swings.",
        plateArms(facts),
      ),
    }),
  },
  {
    ...stow,
    id: "bar-stowed-unsaid",
    when: [unsaid("stowsOnCoach")],
    words: (facts) => ({
      ...stowShared,
      part: "bar-stowed",
      drawn: "place",
      ask: stowAsk("Bar folded", facts),
      how: text(
        "The bar is folded and made fast as its own manual shows.",
        endsAway(facts),
        plateArms(facts),
      ),
    }),
  },
];
