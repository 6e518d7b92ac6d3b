import { lamps, signals, type Lamp, type LampState, type MarkBody, type Outcome, type Signal } from "./entry";
import type { Check } from "./revision";

/** What each lamp of a side pair does. */
export type LampPair = Record<Lamp, LampState>;

/** What was seen so far, by signal. */
export type Seen = NonNullable<MarkBody["seen"]>;

/**
 * What each lamp should do for each signal, combined or separate: a turning side flashes over the stop, the other
 * side follows the stop. Common practice (technicians' accounts of converters); a rig that differs when it is known
 * to be right carries its own.
 */
const usual: Record<Signal, LampPair> = {
  tail: { left: "steady", right: "steady" },
  left: { left: "flashing", right: "dark" },
  right: { left: "dark", right: "flashing" },
  stop: { left: "steady", right: "steady" },
  hazard: { left: "flashing", right: "flashing" },
  "stop-left": { left: "flashing", right: "steady" },
  "stop-right": { left: "steady", right: "flashing" },
};

/** What this rig's lamps should do for a signal. */
export function expectedOf(check: Pick<Check, "lamps">, signal: Signal): LampPair {
  return { ...usual[signal], ...check.lamps?.expected?.[signal] };
}

/** Whether what was seen of a signal is as drawn. */
export function isAsDrawn(check: Pick<Check, "lamps">, signal: Signal, pair: Partial<LampPair>): boolean {
  const expected = expectedOf(check, signal);
  return lamps.every((lamp) => pair[lamp] === expected[lamp]);
}

/** The signals that nobody has said anything about yet, in order. */
export function openSignals(seen: Seen): Signal[] {
  return signals.filter((signal) => seen[signal] === undefined);
}

/**
 * What a board comes to as a mark: anything odd is a fault; else all seven seen is good; else it could not be seen in
 * full.
 */
export function boardOutcome(check: Pick<Check, "lamps">, seen: Seen): Outcome {
  const odd = signals.some((signal) => {
    const pair = seen[signal];
    return pair !== undefined && !isAsDrawn(check, signal, pair);
  });
  if (odd) return "fault";
  return openSignals(seen).length === 0 ? "good" : "unseen";
}

/** Which of a side's two lamps a signal lights where turn and stop have lamps of their own. */
export function separateLook(signal: Signal, state: LampState): { turn: LampState; stop: LampState } {
  const stops = signal === "tail" || signal.startsWith("stop");
  const steadyStop = stops && (state === "flashing" || state === "steady");
  return {
    turn: state === "flashing" ? "flashing" : "dark",
    stop: state === "flashing" ? (steadyStop ? "steady" : "dark") : state,
  };
}
