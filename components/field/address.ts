import { useSyncExternalStore } from "react";

/** Where in the field wing someone is. `at` is a check's key, or one of the places below. */
export interface Address {
  walk: string | null;
  at: string | null;
  /** The rig whose paper cards show. */
  paper: string | null;
  /** What this phone prompts someone through, recording nothing. */
  prompt: string | null;
}

/** Where a walk is stopped or closed. */
export const CLOSING = "close";
/** Where a walk is called off, with the reason. */
export const CALL_OFF = "call-off";
/** The lamp test's prompter. */
export const LAMPS = "lamps";
/** The stations of a walk. */
export const PLAN = "plan";

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
export function hrefOf({ walk, at, paper, prompt }: Partial<Address>): string {
  const query = new URLSearchParams({
    ...(walk && { walk }),
    ...(walk && at && { at }),
    ...(!walk && paper && { paper }),
    ...(!walk && !paper && prompt && { prompt }),
  }).toString();
  return query ? `/field?${query}` : "/field";
}

/** The address that a query string says. */
export function addressOf(search: string): Address {
  const query = new URLSearchParams(search);
  return {
    walk: query.get("walk") || null,
    at: query.get("at") || null,
    paper: query.get("paper") || null,
    prompt: query.get("prompt") || null,
  };
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
