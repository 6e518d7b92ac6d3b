import {
  type CalloutLetter,
  calloutLetters,
  type DrawingKey,
  drawingWords,
  type SidedPart,
} from "./messages/drawings";
import type { Check, PartKey } from "./revision";

/** What picks a drawing: a part, its side where each side has one, and how it differs from the part's usual one. */
export type Drawn = Pick<Check, "part" | "side" | "drawn">;

const hasWords = (key: string): key is DrawingKey => Object.hasOwn(drawingWords, key);

/** The words of a check's drawing: those of its state where it has some, of its side, or of its part. */
export function drawingKeyOf({ part, side = "left", drawn }: Drawn): DrawingKey {
  const ofState = `${part}-${drawn}`;
  const ofSide = `${part}-${side}`;
  if (hasWords(ofState)) return ofState;
  return hasWords(ofSide) ? ofSide : (part as Exclude<PartKey, SidedPart>);
}

export type CalledOut = { letter: CalloutLetter; text: string };

/** What a check's drawing calls out, in the order of its letters: what can be other than as drawn. */
export function calloutsOf(check: Drawn): CalledOut[] {
  if (check.drawn === "place") return [];
  const { callouts } = drawingWords[drawingKeyOf(check)];
  return calloutLetters.flatMap((letter) => {
    const lines = callouts[letter];
    return lines ? [{ letter, text: lines.join(" ") }] : [];
  });
}
