import type { Check } from "./revision";
import { drawingWords, type CalloutLetter } from "./messages/drawings";

export function calloutsOf({ part, side }: Pick<Check, "part" | "side" | "drawn">): {
  letter: CalloutLetter;
  text: string;
}[] {
  const words = drawingWords[part === "arm" ? (`arm-${side ?? "left"}` as const) : part];
  return Object.entries(words.callouts).map(([letter, lines]) => ({
    letter: letter as CalloutLetter,
    text: lines.join(" "),
  }));
}
