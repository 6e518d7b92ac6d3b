import { PrecacheController } from "workbox-precaching";

declare const self: ServiceWorkerGlobalScope;

type Precached = { url: string; revision: string | null };

// Written in by the build.
declare const PRECACHED_FILES: Precached[];
declare const PRECACHED_DOCUMENTS: Precached[];

const controller = new PrecacheController({
  plugins: [
    {
      // A redirected answer is some other page: kept as a shell, it would be shown in the shell's place for good.
      cacheWillUpdate: async ({ response }) =>
        response.status === 200 && !response.redirected ? response : null,
    },
  ],
});

/** The paths of scripts, styles, fonts and icons that are on the phone. */
export const keptFiles: ReadonlySet<string> = new Set(PRECACHED_FILES.map(({ url }) => url));

/** Fetches the shell and its files when this worker is installed, and drops older ones when it takes over. */
export function keepFiles(): void {
  controller.addToCacheList([...PRECACHED_FILES, ...PRECACHED_DOCUMENTS]);
  self.addEventListener("install", (event) => void controller.install(event));
  self.addEventListener("activate", (event) => void controller.activate(event));
}

/** What was kept for a path, whatever the request's query and headers; nothing if the browser has evicted it. */
export async function kept(path: string): Promise<Response | undefined> {
  const key = controller.getCacheKeyForURL(path);
  if (!key) return undefined;
  const cache = await caches.open(controller.strategy.cacheName);
  // Next's documents vary by its router's headers, which no navigation carries.
  return await cache.match(key, { ignoreVary: true });
}
