import type { ClockReading } from "../domain/chain";

/** Reads the wall clock and the monotonic clock together. */
export type Clock = () => ClockReading;

/** The browser's clocks; the epoch is this page load. */
export function browserClock(): Clock {
  const monoEpoch = crypto.randomUUID();
  return () => ({ wallMs: Date.now(), monoMs: performance.now(), monoEpoch });
}
