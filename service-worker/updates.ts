import { clientsClaim } from "workbox-core";

declare const self: ServiceWorkerGlobalScope;

/**
 * A new worker waits until the page, which knows whether a walk is open, asks it to take over. Claiming matters for
 * the very first one: the page that installed it is covered without being opened again.
 */
export function takeOverWhenAsked(): void {
  self.addEventListener("message", (event) => {
    if ((event.data as { type?: unknown } | null)?.type === "SKIP_WAITING") void self.skipWaiting();
  });
  clientsClaim();
}
