import { plainText } from "./json";
import * as z from "zod/mini";
import type { Check, RevisionDocument } from "./revision";
import * as check from "./plain-checks";
import { plainDocument, type PlainList } from "./plain-list";
import * as own from "./starter-checks";

export const hitches = ["direct", "ball", "pintle"] as const;
export const brakes = ["portable", "built-in", "none"] as const;
export const lampings = ["diodes", "bulbs", "light-bar", "trailer-plug"] as const;

export type Hitch = (typeof hitches)[number];
export type Brake = (typeof brakes)[number];
export type Lamping = (typeof lampings)[number];

/** The most characters of what someone may write here. */
export const STARTER = { name: 60, page: 20, endState: 300 } as const;

const words = (most: number) => z.string().check(z.minLength(1), z.maxLength(most));

/**
 * What the car's own manual says about towing it on its four wheels: its page and the end state that it names, that it
 * forbids it, or that nobody has written it down here yet. The last two hold a rig for different reasons.
 */
export const manualShape = z.discriminatedUnion("says", [
  z.object({ says: z.literal("how"), page: words(STARTER.page), endState: words(STARTER.endState) }),
  z.object({ says: z.literal("forbidden") }),
  z.object({ says: z.literal("not-recorded") }),
]);
export type Manual = z.infer<typeof manualShape>;

/** The few answers that a plain list is made of. */
export const starterShape = z.object({
  name: words(STARTER.name),
  hitch: z.enum(hitches),
  brake: z.enum(brakes),
  lamps: z.enum(lampings),
  /** Whether an air line runs from the coach to the car. */
  airLine: z.boolean(),
  manual: manualShape,
});
export type StarterAnswers = z.infer<typeof starterShape>;

/**
 * A plain list from a few answers: the same answers make the same document. It knows no ratings, no measures and no
 * maker; the sheet that is filled in later takes its place as a new revision.
 */
export function starterDocument(answers: StarterAnswers): RevisionDocument {
  const parts = partsOf(answers);
  return plainDocument({
    sheet: sheetOf(answers),
    catalogue: "plain 1",
    ...stationsOf(parts),
    walks: walksOf(parts),
  });
}

/** The checks that the answers decide; a list without one has nothing there. */
function partsOf({ hitch, brake, lamps, airLine, manual }: StarterAnswers) {
  const manualHold = { how: [], forbidden: [own.manualForbids], "not-recorded": [own.manualNotRecorded] };
  const lampGear = { diodes: [], bulbs: [], "light-bar": [own.lightBar], "trailer-plug": [own.trailerPlug] };
  return {
    manual: manualHold[manual.says],
    receiver: [own.receiverPin, ...{ direct: [], ball: [own.ball], pintle: [own.pintle] }[hitch]],
    cord: [brake === "none" ? own.cord : check.cordAndLanyard, ...(airLine ? [check.airLine] : [])],
    endState: manual.says === "how" ? [own.endState(manual.page, manual.endState)] : [],
    brake: [{ portable: own.brakeBox, "built-in": own.brakeBuiltIn, none: own.brakeMissing }[brake]],
    lampGear: lampGear[lamps],
  };
}

type Parts = ReturnType<typeof partsOf>;

const arms = [check.arm("left"), check.arm("right")];

function stationsOf({ manual, receiver, cord, endState, brake, lampGear }: Parts): Pick<PlainList, "checks"> {
  return {
    checks: {
      "coach-tail": [...manual, ...receiver, check.barStowed],
      "car-nose": arms,
      "cables-and-cord": [check.cables, ...cord, check.cordJacket, check.linesOff],
      "car-cabin": [...endState, ...brake, check.carHeld],
      pull: [check.rolling, check.wheelHeat],
      "car-tail": [...lampGear, check.lamps],
      "last-look": [check.joints, check.tires],
    },
  };
}

function walksOf({ manual, receiver, cord, endState, brake, lampGear }: Parts): PlainList["walks"] {
  const gear = [...manual, ...receiver, ...arms, check.cables, ...cord];
  const hookUp: Check[] = [
    ...gear,
    check.cordJacket,
    ...endState,
    ...brake,
    check.rolling,
    ...lampGear,
    check.lamps,
    check.joints,
    check.tires,
  ];
  // The car is held before anything comes off, whatever its manual says about towing.
  const unhook = [check.carHeld, check.linesOff, check.barStowed];
  return {
    "hook-up": hookUp,
    "re-check": [...gear, ...brake, check.wheelHeat, ...lampGear, check.lamps, check.tires],
    unhook,
    delivery: [...hookUp, ...unhook],
    "yard-out": hookUp,
    "yard-in": [...unhook, check.tires],
  };
}

function sheetOf({ name, hitch, brake, lamps, airLine, manual }: StarterAnswers): RevisionDocument["sheet"] {
  return {
    name,
    gear: { towBar: { coupling: hitch }, brake: { family: brake }, airLine },
    wiring: { style: lamps },
    procedure: manual,
  };
}

/** What someone typed as a list can hold it: one line, no longer than this, no half of an emoji. */
export function typedWords(text: string, most: number): string {
  return plainText(plainText(text).slice(0, most));
}
