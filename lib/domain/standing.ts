import type { Purpose, Verdict } from "./entry";

/** How long a verdict stands without a word about the rig. Our own rule: no figure is published. */
export const STALE_AFTER_MS = 4 * 60 * 60_000;

const beforeTowing: readonly Purpose[] = ["hook-up", "re-check", "delivery", "yard-out"];

/** Why a verdict no longer says how the rig is: it was left or its car entered, or too much time went by. */
export type Staleness = "left" | "old";

/**
 * Whether a verdict of "no hold" still says something. It goes stale when the rig was left unattended or the car was
 * entered, which only a person can say; after some hours it is taken to have been.
 * @param leftAt when someone said that the rig was left or its car entered
 * @returns null while it stands, and for walks after which nobody tows
 */
export function stalenessOf(
  last: { purpose: Purpose; verdict: Verdict; at: string },
  leftAt: string | null,
  nowMs: number,
): Staleness | null {
  if (last.verdict !== "no-hold" || !beforeTowing.includes(last.purpose)) return null;
  if (leftAt !== null) return "left";
  return nowMs - Date.parse(last.at) > STALE_AFTER_MS ? "old" : null;
}

/** Whether a person can be asked if this verdict's rig was left: it stands, and towing comes after it. */
export function canGoStale(last: { purpose: Purpose; verdict: Verdict }): boolean {
  return last.verdict === "no-hold" && beforeTowing.includes(last.purpose);
}
