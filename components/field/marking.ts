import { useLayoutEffect, useRef, useState } from "react";
import type { Recorder } from "@/lib/client/recorder";
import { MovedOn } from "@/lib/client/walk-shelf";
import type { Outcome } from "@/lib/domain/entry";
import { fieldWords } from "@/lib/domain/messages/field";
import { CLOSING, moveTo } from "./address";
import { useSettled } from "./settling";
import { needsReason, nextStep, stepBefore, type Step } from "./walk-plan";

export type Question = "why" | "what";

/** What the buttons under a check do, and what came of it. */
export interface Marking {
  mark: (outcome: Outcome, because?: string) => Promise<void>;
  back: () => void;
  /** Goes on without a new mark. */
  skip: () => void;
  /** Which question stands in place of the buttons: why a hold at fault is good now, or what was done about it. */
  asking: Question | null;
  ask: (question: Question | null) => void;
  /** The outcome saved last, to be read out with the next check. */
  saved: Outcome | null;
  trouble: string | null;
}

/** Marks one check: saves first, moves on only then, and takes no touch that was meant for what showed before. */
export function useMarking(recorder: Recorder, steps: readonly Step[], step: Step): Marking {
  const { key } = step.check;
  const [question, setQuestion] = useState<{ at: string; question: Question } | null>(null);
  const [saved, setSaved] = useState<Outcome | null>(null);
  const [trouble, setTrouble] = useState<{ at: string; words: string } | null>(null);
  const saving = useRef(false);
  const asking = question?.at === key ? question.question : null;
  const settled = useSettled(`${key} ${asking}`);
  useLayoutEffect(() => {
    saving.current = false;
  }, [key]);

  const walk = recorder.view().walk.id;
  const marks = () => recorder.view().replay.marks;
  const show = (next: Step | null) => {
    setQuestion(null);
    moveTo({ walk, at: next?.check.key ?? CLOSING });
  };
  const ask = (next: Question | null) => setQuestion(next && { at: key, question: next });
  const takes = () => settled() && !saving.current;

  return {
    async mark(outcome, because) {
      if (!takes()) return;
      if (outcome === "good" && !because && needsReason(step.check, marks())) return ask("why");
      saving.current = true;
      try {
        await recorder.mark(key, outcome, because ? { because } : {});
      } catch (error) {
        saving.current = false;
        const { movedOn, notSaved } = fieldWords.walk;
        return setTrouble({ at: key, words: error instanceof MovedOn ? movedOn : notSaved });
      }
      setTrouble(null);
      setSaved(outcome);
      show(nextStep(steps, marks(), key));
    },
    back() {
      const before = stepBefore(steps, key);
      if (takes() && before) show(before);
      setSaved(null);
    },
    skip() {
      if (takes()) show(nextStep(steps, marks(), key));
      setSaved(null);
    },
    asking,
    ask,
    saved,
    trouble: trouble?.at === key ? trouble.words : null,
  };
}
