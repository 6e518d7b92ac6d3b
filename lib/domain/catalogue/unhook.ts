import { butNot, only, unless, unsaid } from "./conditions";
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
    ask: "Pedal up and firm, nothing drips",
    how: "The car’s pedal is up and firm. Nothing drips where the line was coupled.",
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

/** What hangs between the vehicles besides the bar, by name. */
function lines({ breakaway, airLine }: Facts): string {
  const names = ["cord", "cables", breakaway !== false && "lanyard", airLine && "air line"].filter(Boolean);
  return `${names.slice(0, -1).join(", ")} and ${names.at(-1)}`;
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
    words: ({ brake }) => ({ ...offShared, ...builtInOff[brake ?? "installed-vacuum"]! }),
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
    effect: "fix",
    when: [only("every")],
    words: (facts) => ({
      part: "cord",
      drawn: facts.breakaway === false ? "place" : "off",
      ask: "Cord, cables, lines off and capped",
      how: text(
        `Off and put away: ${lines(facts)}. The caps on the sockets are closed.`,
        facts.breakaway !== false && "The pin stays in the breakaway switch.",
      ),
      why: "An open socket fills with water, and a cable that hangs gets caught.",
      mend: "Take them off and close the caps.",
      origin: practice,
    }),
  },
  {
    id: "latches-released",
    key: "latches-released",
    station: "car-nose",
    effect: "hold",
    when: [butNot("aligning") && { condition: "aligning", on: ["yes", "unknown"] }],
    words: () => ({
      part: "arms-locked",
      drawn: "place",
      ask: "Arm latches released, no load on them",
      how: "The car is held. Each latch is released as the bar’s own manual has it, and each pin is free to lift. Where one is bound, that manual has the way to unload it: no hammer.",
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
    when: [only("every")],
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
    ...stow,
    id: "bar-stowed-coach",
    when: [only("stowsOnCoach")],
    words: () => ({
      ...stowShared,
      part: "bar-stowed",
      ask: "Bar folded, pins back in holes",
      how: "The arms are folded and their latch is down for the road. The arms’ pins are back in their own holes with their clips. What holds the bar in the receiver is still pinned and clipped.",
    }),
  },
  {
    ...stow,
    id: "bar-stowed-car",
    when: [unless("stowsOnCoach")],
    words: () => ({
      ...stowShared,
      part: "bar-stowed",
      drawn: "place",
      ask: "Bar up on the car, pins back in holes",
      how: "The bar is folded and made fast on the car as its own manual shows, or taken off. Every pin and clip is back in its own hole. Nothing is left at the coach that swings.",
    }),
  },
  {
    ...stow,
    id: "bar-stowed-unsaid",
    when: [unsaid("stowsOnCoach")],
    words: () => ({
      ...stowShared,
      part: "bar-stowed",
      drawn: "place",
      ask: "Bar folded, pins back in holes",
      how: "The bar is folded and made fast as its own manual shows. Every pin and clip is back in its own hole.",
    }),
  },
];
