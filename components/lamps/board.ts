import { useState } from "react";
import type { Marking } from "@/components/field/marking";
import { useSettled } from "@/components/field/settling";
import { signals, type Signal } from "@/lib/domain/entry";
import { boardOutcome, expectedOf, isAsDrawn, type LampPair, type Seen } from "@/lib/domain/lamp-board";
import type { Check } from "@/lib/domain/revision";

/** What shows at the board: a signal as it should be, one that is odd, or something beside the signals. */
export type BoardView = "signal" | "odd" | "whole" | "how";

/** A lamp board in use. Every signal is saved as it is answered, in the check's mark. */
export interface Board {
  signal: Signal;
  /** Counted from 1. */
  place: number;
  next: Signal | null;
  /** The signals that nobody has answered yet. */
  open: readonly Signal[];
  view: BoardView;
  show: (view: BoardView) => void;
  asDrawn: () => void;
  odd: (pair: LampPair) => void;
  unseen: () => void;
  back: () => void;
  /** Looks again at what was odd, after it was mended. */
  retest: () => void;
  /** Whether this signal has its answer; a script goes on from it by itself. */
  answered: boolean;
}

/**
 * Runs a board over its seven signals.
 * @param seen what the check's mark has so far
 * @param note kept with the mark: where the signals were seen, if not on the spot
 * @param following the signal that a script is at, which it and no answer leaves
 */
export function useBoard(
  check: Check,
  marking: Marking,
  seen: Seen,
  note: string | undefined,
  following: Signal | null,
): Board {
  const [passed, setPassed] = useState<readonly Signal[]>([]);
  const [again, setAgain] = useState<readonly Signal[]>([]);
  const answered = (signal: Signal) =>
    (seen[signal] !== undefined && !again.includes(signal)) || passed.includes(signal);
  const [chosen, setAt] = useState<Signal>(() => signals.find((signal) => !answered(signal)) ?? signals[0]);
  const at = following ?? chosen;
  const [view, setView] = useState<BoardView>("signal");
  const settled = useSettled(`${at} ${view}`);
  const place = signals.indexOf(at) + 1;

  const onward = (done: readonly Signal[], after: Seen, changed: boolean) => {
    const left = again.filter((signal) => signal !== at);
    const open = signals.filter(
      (signal) => (after[signal] === undefined || left.includes(signal)) && !done.includes(signal),
    );
    setAgain(left);
    const ahead = open.find((signal) => signals.indexOf(signal) >= place) ?? open[0];
    const more = { ...(Object.keys(after).length > 0 && { seen: after }), ...(note && { note }) };
    if (!ahead) return void marking.mark(boardOutcome(check, after), more);
    if (changed) void marking.keep(boardOutcome(check, after), more);
    if (!following) setAt(ahead);
    setView("signal");
  };
  const answer = (pair: LampPair) => {
    if (!settled()) return;
    setPassed(passed.filter((signal) => signal !== at));
    onward(
      passed.filter((signal) => signal !== at),
      { ...seen, [at]: pair },
      true,
    );
  };

  return {
    signal: at,
    place,
    next: signals[place] ?? null,
    open: signals.filter((signal) => !answered(signal)),
    view,
    show: (next) => settled() && setView(next),
    asDrawn: () => answer(expectedOf(check, at)),
    odd: answer,
    unseen() {
      if (!settled()) return;
      const done = [...passed.filter((signal) => signal !== at), at];
      setPassed(done);
      const after: Seen = { ...seen };
      delete after[at];
      onward(done, after, seen[at] !== undefined);
    },
    back() {
      if (view !== "signal") setView("signal");
      else if (place > 1 && settled()) setAt(signals[place - 2]!);
      else marking.back();
    },
    retest() {
      const odd = signals.filter((signal) => seen[signal] && !isAsDrawn(check, signal, seen[signal]));
      marking.ask(null);
      setPassed([]);
      setAgain(odd);
      setAt(odd[0] ?? signals[0]);
      setView("signal");
    },
    answered: answered(at),
  };
}
