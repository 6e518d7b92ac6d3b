import type { Entry } from "./entry";

/** An entry's own time beside the time at which the server had it. */
export type Arrival = { receivedAt: string; entry: Pick<Entry, "at"> };

/**
 * What the two clocks say of each other. `ahead`: an entry says it was made after it was received, so the phone's
 * clock was ahead by at least this much. `apart`: even the quickest entry came this much later than it says; no
 * signal, or a clock that was behind, and the record alone cannot tell which.
 */
export type ClockRemark = { kind: "ahead" | "apart"; byMs: number };

const NOTABLE_AHEAD_MS = 1_000;
const NOTABLE_APART_MS = 5 * 60_000;

/** The one thing worth saying about a walk's clock, if there is one. */
export function clockRemark(arrivals: readonly Arrival[]): ClockRemark | null {
  if (arrivals.length === 0) return null;
  const lags = arrivals.map(({ receivedAt, entry }) => Date.parse(receivedAt) - Date.parse(entry.at));
  const least = Math.min(...lags);
  if (least <= -NOTABLE_AHEAD_MS) return { kind: "ahead", byMs: -least };
  return least >= NOTABLE_APART_MS ? { kind: "apart", byMs: least } : null;
}
