import { useSyncExternalStore } from "react";

const parts = ["walk", "at", "paper", "prompt", "settings"] as const;

/**
 * Where in the field wing someone is: in a walk, `at` a check's key or one of the places below; at a rig's `paper`
 * cards; at what this phone prompts someone through; in the settings; or nowhere of these, among the rigs.
 */
export type Address = Record<(typeof parts)[number], string | null>;

/** Where a walk is stopped or closed. */
export const CLOSING = "close";
/** Where a walk is called off, with the reason. */
export const CALL_OFF = "call-off";
/** The lamp test's prompter. */
export const LAMPS = "lamps";
/** The stations of a walk. */
export const PLAN = "plan";
/** Without a walk: where a rig is made on this phone. */
export const NEW_RIG = "new-rig";

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
export function hrefOf(address: Partial<Address>): string {
  const said = parts.flatMap((part) => (address[part] ? [[part, address[part]]] : []));
  const query = new URLSearchParams(said).toString();
  return query ? `/field?${query}` : "/field";
}

/** The address that a query string says. */
export function addressOf(search: string): Address {
  const query = new URLSearchParams(search);
  return Object.fromEntries(parts.map((part) => [part, query.get(part) || null])) as Address;
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
