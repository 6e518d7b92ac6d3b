import { useSyncExternalStore } from "react";
import { Updates } from "@/lib/client/update-worker";
import { addressOf } from "./address";

let updates: Updates | null = null;
const listeners = new Set<() => void>();

/** Registers the service worker that opens this wing with no network. Without one the page works, but only online. */
export async function registerWorker(): Promise<void> {
  if (process.env.NODE_ENV !== "production" || !("serviceWorker" in navigator) || updates) return;
  const { Workbox } = await import("workbox-window");
  const worker = new Workbox("/sw.js");
  const covered = navigator.serviceWorker.controller !== null;
  updates = new Updates(worker, covered, showsNoWalk, () => window.location.reload());
  updates.subscribe(() => listeners.forEach((listener) => listener()));
  // Offline, or with no worker built: the one that is installed stays.
  await worker.register().catch(() => {});
  updates.followPage(document, Date.now);
}

function showsNoWalk(): boolean {
  return addressOf(window.location.search).walk === null;
}

/** Whether a new version waits on this phone. */
export function useWaitingVersion(): boolean {
  return useSyncExternalStore(
    (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => updates?.waiting() ?? false,
    () => false,
  );
}

/** Changes to the version that waits. */
export function takeVersion(): void {
  updates?.take();
}
