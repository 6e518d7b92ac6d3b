import { useSyncExternalStore } from "react";

/**
 * Where in the field wing someone is. `at` is a check's key, or "close" for the closing screen; without a walk it is
 * "new-rig" where a rig is made.
 */
export interface Address {
  walk: string | null;
  at: string | null;
}

export const CLOSING = "close";
export const NEW_RIG = "new-rig";

const listeners = new Set<() => void>();

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  window.addEventListener("popstate", listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener("popstate", listener);
  };
}

/** The wing's own path for an address: one document, ids in the query string. */
export function hrefOf({ walk, at }: Partial<Address>): string {
  const query = new URLSearchParams({
    ...(walk && { walk }),
    ...((walk || at === NEW_RIG) && at && { at }),
  }).toString();
  return query ? `/field?${query}` : "/field";
}

/** The address that a query string says. */
export function addressOf(search: string): Address {
  const query = new URLSearchParams(search);
  return { walk: query.get("walk") || null, at: query.get("at") || null };
}

/** The query string now; the empty one while the page is prerendered. */
export function useSearch(): string {
  return useSyncExternalStore(
    subscribe,
    () => window.location.search,
    () => "",
  );
}

/** Goes to another screen, from which the browser's back button returns. */
export function goTo(address: Partial<Address>): void {
  window.history.pushState(null, "", hrefOf(address));
  window.scrollTo(0, 0);
  for (const listener of listeners) listener();
}

/** Moves within a screen: the browser's back button still leaves it. */
export function moveTo(address: Partial<Address>): void {
  window.history.replaceState(null, "", hrefOf(address));
  window.scrollTo(0, 0);
  for (const listener of listeners) listener();
}
