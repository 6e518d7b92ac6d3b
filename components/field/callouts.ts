import { useState } from "react";
import { calloutsOf } from "@/lib/domain/callouts";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";
import { walkingWords } from "@/lib/domain/messages/walking";
import type { Check } from "@/lib/domain/revision";
import type { Marking } from "./marking";

/** What is called out on a check's drawing, and what of it was touched as not as drawn. */
export interface Callouts {
  all: { letter: CalloutLetter; text: string }[];
  chosen: CalloutLetter[];
  /** What was said in words. */
  own: string;
  /** Touched on the drawing or on its button: the check is at fault there, or no longer. */
  touch: (letter: CalloutLetter) => void;
  say: (own: string) => Promise<void>;
}

/** Keeps what was touched beside the mark; every touch is saved at once, in the mark's note. */
export function useCallouts(check: Check, marking: Marking, kept: string | undefined): Callouts {
  const all = calloutsOf(check);
  const label = (letter: CalloutLetter) => all.find((each) => each.letter === letter)?.text ?? "";
  const [said, setSaid] = useState<{ at: string; chosen: CalloutLetter[]; own: string } | null>(null);
  // What is said of a fault that was marked earlier goes on from its note.
  const { chosen, own }: Pick<Callouts, "chosen" | "own"> =
    said?.at === check.key ? said : { chosen: [], own: kept ?? "" };

  const noteOf = (letters: readonly CalloutLetter[], text: string) =>
    walkingWords.details.noteOf(letters.map(label), text);
  return {
    all,
    chosen,
    own,
    touch(letter) {
      const after = chosen.includes(letter) ? chosen.filter((each) => each !== letter) : [...chosen, letter];
      setSaid({ at: check.key, chosen: after.toSorted(), own });
      const note = noteOf(after.toSorted(), own);
      if (marking.asking === "details") void marking.amend({ note });
      else void marking.mark("fault", { note });
    },
    async say(text) {
      setSaid({ at: check.key, chosen, own: text });
      await marking.amend({ note: noteOf(chosen, text) });
    },
  };
}
