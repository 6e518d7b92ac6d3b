import { useCallback, useLayoutEffect, useRef } from "react";

/** How long after something appears a touch on it does not count: the second half of a double tap on what went before. */
export const SETTLE_MS = 600;

/**
 * Whether what shows now has been there long enough for a touch to be meant for it.
 * @param appearance changes whenever something else appears under the finger
 */
export function useSettled(appearance: string): () => boolean {
  const since = useRef(Infinity);
  useLayoutEffect(() => {
    since.current = performance.now();
  }, [appearance]);
  return useCallback(() => performance.now() - since.current >= SETTLE_MS, []);
}

type Tap = { x: number; y: number; atMs: number };
let latest: Tap | null = null;
let before: Tap | null = null;

/** Remembers where the last two taps fell, for {@link isSecondTap}; what it returns stops it. */
export function followTaps(): () => void {
  const follow = ({ clientX: x, clientY: y }: MouseEvent) => {
    before = latest;
    latest = { x, y, atMs: performance.now() };
  };
  document.addEventListener("click", follow, true);
  return () => document.removeEventListener("click", follow, true);
}

/** Whether the tap being handled is the second half of a double tap that began on another screen. */
export function isSecondTap(): boolean {
  if (!latest || !before) return false;
  const apart = Math.hypot(latest.x - before.x, latest.y - before.y);
  return latest.atMs - before.atMs < SETTLE_MS && apart < 48;
}
