import { signals } from "./entry";

export type Signal = (typeof signals)[number];

const HALF_MINUTE_MS = 30_000;
const LEAST_NOTICE_MS = 5_000;

/** How long each signal may be held. */
export const holdChoicesMs = [6_000, 8_000, 12_000] as const;
export type HoldMs = (typeof holdChoicesMs)[number];
export const usualHoldMs: HoldMs = 8_000;

/** What a script asks for at one moment. */
export type ScriptMoment =
  | { phase: "waiting"; startsInMs: number }
  | { phase: "signal"; signal: Signal; next: Signal | null; leftMs: number; place: number; total: number }
  | { phase: "done" };

/**
 * When a script started now begins: the next half minute of the wall clock that leaves time to look up. Two phones
 * that share nothing but the time of day, and are tapped within the same half minute, begin together.
 */
export function startMomentMs(nowMs: number): number {
  return Math.ceil((nowMs + LEAST_NOTICE_MS) / HALF_MINUTE_MS) * HALF_MINUTE_MS;
}

/**
 * Where a script stands. It follows from the wall clock alone, so that a phone that slept or was busy is back in step
 * with the other one at its next look.
 * @param open the signals to be given, in their order
 */
export function scriptAt(
  startMs: number,
  nowMs: number,
  open: readonly Signal[],
  holdMs: number,
): ScriptMoment {
  if (nowMs < startMs) return { phase: "waiting", startsInMs: startMs - nowMs };
  const at = Math.floor((nowMs - startMs) / holdMs);
  const signal = open[at];
  if (signal === undefined) return { phase: "done" };
  return {
    phase: "signal",
    signal,
    next: open[at + 1] ?? null,
    leftMs: startMs + (at + 1) * holdMs - nowMs,
    place: at + 1,
    total: open.length,
  };
}

/** In how long what a script shows changes: with the signal, or with the second that is counted down. */
export function nextChangeMs(moment: ScriptMoment): number | null {
  if (moment.phase === "done") return null;
  const leftMs = moment.phase === "waiting" ? moment.startsInMs : moment.leftMs;
  return leftMs % 1000 || 1000;
}
