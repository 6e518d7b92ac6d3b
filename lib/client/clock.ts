import type { ClockReading } from "../domain/chain";

/** Reads the wall clock and the monotonic clock together. */
export type Clock = () => ClockReading;

const ASLEEP_MS = 2_000;

/**
 * The browser's clocks. The epoch is this page load, or since a wake: the monotonic clock stands still while a phone
 * sleeps, so when a page that was out of sight comes back with the wall clock ahead, a new epoch begins.
 */
export function browserClock(page: Pick<Document, "visibilityState" | "addEventListener">): Clock {
  let monoEpoch = crypto.randomUUID();
  let epochMonoMs = 0;
  let hidden: { wallMs: number; monoMs: number } | null = null;
  page.addEventListener("visibilitychange", () => {
    const [wallMs, monoMs] = [Date.now(), performance.now()];
    if (page.visibilityState === "hidden") hidden = { wallMs, monoMs };
    else if (hidden) {
      const asleepMs = wallMs - hidden.wallMs - (monoMs - hidden.monoMs);
      if (asleepMs > ASLEEP_MS) [monoEpoch, epochMonoMs] = [crypto.randomUUID(), monoMs];
      hidden = null;
    }
  });
  return () => ({ wallMs: Date.now(), monoMs: performance.now(), monoEpoch, epochMonoMs });
}
