import { MovedOn, WalkGone } from "./walk-shelf";

/** What can be wrong with the phone's store, for someone who has to do something about it. */
export const storeTroubles = ["full", "refused", "vanished", "unknown"] as const;
export type StoreTrouble = (typeof storeTroubles)[number];

// By name: the message of a full disk is empty in Chromium.
const byName: Record<string, StoreTrouble> = {
  QuotaExceededError: "full",
  NS_ERROR_DOM_QUOTA_REACHED: "full",
  // Site data is blocked; Firefox says the second in a private window that keeps nothing.
  SecurityError: "refused",
  InvalidStateError: "refused",
  NotAllowedError: "refused",
  // Our object store is not in the database: someone made it anew.
  NotFoundError: "vanished",
};

/**
 * What an error from the store means.
 * @returns null for one that is no trouble of the store's: another tab wrote to the walk
 */
export function storeTroubleOf(error: unknown): StoreTrouble | null {
  if (error instanceof WalkGone) return "vanished";
  if (error instanceof MovedOn) return null;
  const name = error instanceof Error || error instanceof DOMException ? error.name : "";
  if (Object.hasOwn(byName, name)) return byName[name]!;
  // A browser without such a thing: for a person that is a refusal.
  return typeof globalThis.indexedDB === "undefined" ? "refused" : "unknown";
}
