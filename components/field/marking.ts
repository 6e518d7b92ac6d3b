import { useLayoutEffect, useRef, useState } from "react";
import { feel } from "@/lib/client/feel";
import type { Recorder } from "@/lib/client/recorder";
import type { MarkBody, Outcome } from "@/lib/domain/entry";
import { touchedByMending } from "@/lib/domain/interruption";
import { CLOSING, moveTo } from "./address";
import { useSettled } from "./settling";
import { needsReason, nextStep, stepBefore, type Step } from "./walk-plan";

/**
 * What stands in place of the buttons: why a hold at fault is good now, what was done about it, what is wrong with a
 * check that was just marked fault, or what a gauge reads.
 */
export type Question = "why" | "what" | "details" | "measure";

/** What the buttons under a check do, and what came of it. */
export interface Marking {
  /** Saves a mark, then asks what belongs to it or goes on. */
  mark: (outcome: Outcome, more?: Partial<MarkBody>) => Promise<void>;
  /** Saves a mark that is not the last word on this check, and stays. */
  keep: (outcome: Outcome, more: Partial<MarkBody>) => Promise<void>;
  /** Saves the mark anew with more in it, and stays. */
  amend: (more: Partial<MarkBody>) => Promise<void>;
  back: () => void;
  /** Goes on without a new mark. */
  skip: () => void;
  asking: Question | null;
  ask: (question: Question | null) => void;
  /** The outcome saved last, to be read out with the next check. */
  saved: Outcome | null;
  /** What the store said when a mark was not kept; null where there is nothing to say. */
  error: unknown;
}

/** Marks one check: saves first, moves on only then, and takes no touch that was meant for what showed before. */
export function useMarking(recorder: Recorder, steps: readonly Step[], step: Step): Marking {
  const { check } = step;
  const { key } = check;
  const [question, setQuestion] = useState<{ at: string; question: Question } | null>(null);
  const [saved, setSaved] = useState<Outcome | null>(null);
  const [trouble, setTrouble] = useState<{ at: string; error: unknown } | null>(null);
  const saving = useRef(false);
  /** What was to be saved when the question why came first. */
  const pending = useRef<Partial<MarkBody>>({});
  const asking = question?.at === key ? question.question : null;
  const settled = useSettled(`${key} ${asking}`);
  useLayoutEffect(() => {
    saving.current = false;
    pending.current = {};
  }, [key]);

  const walk = recorder.view().walk.id;
  const state = () => recorder.view().replay;
  const show = (next: Step | null) => {
    setQuestion(null);
    moveTo({ walk, at: next?.check.key ?? CLOSING });
  };
  const ask = (next: Question | null) => setQuestion(next && { at: key, question: next });
  const takes = () => settled() && !saving.current;

  /** @returns whether the phone kept it */
  const save = async (outcome: Outcome, more: Partial<MarkBody>, whole = true): Promise<boolean> => {
    saving.current = true;
    try {
      await recorder.mark(key, outcome, more);
    } catch (error) {
      saving.current = false;
      setTrouble({ at: key, error });
      feel("trouble");
      return false;
    }
    setTrouble(null);
    setSaved(whole ? outcome : null);
    feel(!whole || outcome !== "fault" ? "saved" : check.effect === "hold" ? "hold" : "fault");
    return true;
  };
  /** What was mended here may have changed what was looked at before. */
  const askTouched = async () => {
    const again = touchedByMending(recorder.view().document, key, [...state().marks.keys()]);
    if (again.length > 0) await recorder.resume(again).catch(() => {});
  };
  const stay = (next: Question) => {
    saving.current = false;
    ask(next);
  };

  return {
    async mark(outcome, more = {}) {
      if (!takes()) return;
      if (outcome === "good" && !more.because && needsReason(check, state().faulted)) {
        pending.current = more;
        return ask("why");
      }
      const then = outcome === "fault" ? "details" : outcome === "good" && check.measure ? "measure" : null;
      // What is asked after the mark belongs to this check, which without an address of its own is no longer the next.
      if (then) moveTo({ walk, at: key });
      if (!(await save(outcome, { ...(more.because && pending.current), ...more }))) return;
      if (then) return stay(then);
      if (more.because?.startsWith("fixed")) await askTouched();
      show(nextStep(steps, state().marks, key));
    },
    async keep(outcome, more) {
      if (saving.current) return;
      moveTo({ walk, at: key });
      await save(outcome, more, false);
      saving.current = false;
    },
    async amend(more) {
      const mark = state().marks.get(key);
      if (!mark) return;
      const { outcome, measured, seen, because, note } = mark;
      const kept = { measured, seen, because, note };
      const known = Object.entries({ ...kept, ...more }).filter(([, value]) => value !== undefined);
      await save(outcome, Object.fromEntries(known), false);
      saving.current = false;
    },
    back() {
      const before = stepBefore(steps, state().marks, key);
      if (takes() && before) show(before);
      setSaved(null);
    },
    skip() {
      if (takes()) show(nextStep(steps, state().marks, key));
      setSaved(null);
    },
    asking,
    ask,
    saved,
    error: trouble?.at === key ? trouble.error : null,
  };
}
