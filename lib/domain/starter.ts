import * as z from "zod/mini";
import { compose } from "./catalogue/compose";
import { plainText } from "./json";
import type { RevisionDocument } from "./revision";
import { brakeFamilies, couplings } from "./sheet/gear";
import { SHEET_VERSION, type Sheet } from "./sheet/sheet";
import { wiringStyles } from "./sheet/wiring";

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

/** The few answers that a first sheet is made of. */
export const starterShape = z.object({
  name: words(STARTER.name),
  hitch: z.enum(couplings),
  brake: z.enum(brakeFamilies),
  lamps: z.enum(wiringStyles),
  /** Whether an air line runs from the coach to the car. */
  airLine: z.boolean(),
  manual: manualShape,
});
export type StarterAnswers = z.infer<typeof starterShape>;

/** The sheet that a few answers come to: no ratings, no measures, and whatever else is not known stays open. */
export function starterSheet({ name, hitch, brake, lamps, airLine, manual }: StarterAnswers): Sheet {
  return {
    v: SHEET_VERSION,
    name,
    gear: { towBar: { coupling: hitch }, airLine: { there: airLine }, brake: { family: brake } },
    wiring: { style: lamps },
    procedure: manual,
  };
}

/** The list of a few answers: the same answers make the same document. */
export function starterDocument(answers: StarterAnswers): RevisionDocument {
  return compose(starterSheet(answers));
}

/** What someone typed as a list can hold it: one line, no longer than this, no half of an emoji. */
export function typedWords(text: string, most: number): string {
  return plainText(plainText(text).slice(0, most));
}
