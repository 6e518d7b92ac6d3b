/** Registers the service worker that opens this wing with no network. Without one the page works, but only online. */
export async function registerWorker(): Promise<void> {
  if (process.env.NODE_ENV !== "production" || !("serviceWorker" in navigator)) return;
  const { Workbox } = await import("workbox-window");
  // Offline, or with no worker built: the one that is installed stays.
  await new Workbox("/sw.js").register().catch(() => {});
}
