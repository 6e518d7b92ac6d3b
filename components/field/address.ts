import { useSyncExternalStore } from "react";

/** Where in the field wing someone is. `at` is a check's key, or "close" for the closing screen. */
export interface Address {
  walk: string | null;
  at: string | null;
  /** The settings, instead of a walk. */
  settings?: true;
}

export const CLOSING = "close";

let moved = false;

/** Whether someone has gone from one screen to another since the page was loaded. */
export function hasMoved(): boolean {
  return moved;
}

const listeners = new Set<() => void>();

function subscribe(listener: () => void): () => void {
  const back = () => {
    moved = true;
    listener();
  };
  listeners.add(listener);
  window.addEventListener("popstate", back);
  return () => {
    listeners.delete(listener);
    window.removeEventListener("popstate", back);
  };
}

/** The wing's own path for an address: one document, ids in the query string. */
export function hrefOf({ walk, at, settings }: Partial<Address>): string {
  const query = new URLSearchParams({
    ...(walk && { walk }),
    ...(walk && at && { at }),
    ...(!walk && settings && { settings: "1" }),
  }).toString();
  return query ? `/field?${query}` : "/field";
}

/** The address that a query string says. */
export function addressOf(search: string): Address {
  const query = new URLSearchParams(search);
  const walk = query.get("walk") || null;
  const settings = !walk && query.has("settings") && { settings: true as const };
  return { walk, at: query.get("at") || null, ...settings };
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
  moved = true;
  for (const listener of listeners) listener();
}

/** Moves within a screen: the browser's back button still leaves it. */
export function moveTo(address: Partial<Address>): void {
  window.history.replaceState(null, "", hrefOf(address));
  window.scrollTo(0, 0);
  moved = true;
  for (const listener of listeners) listener();
}
