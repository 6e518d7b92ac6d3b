import { useSyncExternalStore } from "react";

const MINUTE_MS = 60_000;

function everyHalfMinute(listener: () => void): () => void {
  const timer = setInterval(listener, MINUTE_MS / 2);
  return () => clearInterval(timer);
}

/** The wall clock to the minute, so that "yesterday" is right on a page that stays open over midnight. */
export function useNowMs(): number {
  return useSyncExternalStore(
    everyHalfMinute,
    () => Math.floor(Date.now() / MINUTE_MS) * MINUTE_MS,
    () => 0,
  );
}
