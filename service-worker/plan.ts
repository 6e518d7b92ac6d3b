/** What the worker needs to know of a request. */
export type Asked = { method: string; mode: string; sameOrigin: boolean; path: string; fromRouter: boolean };

/** How a request is answered. `leave` is the browser's own doing: no cache, and a failure stays a failure. */
export type Plan = "shell" | "network-else-shell" | "network-else-offline" | "file" | "leave";

/**
 * Decides about a request. Requests of Next's router are left alone and so fail offline, upon which the router
 * falls back to a navigation, which can be answered. Nothing but the precached files is ever kept.
 */
export function planFor(asked: Asked, keptFiles: ReadonlySet<string>): Plan {
  const { method, mode, sameOrigin, path, fromRouter } = asked;
  if (method !== "GET" || !sameOrigin || fromRouter || path.startsWith("/api/")) return "leave";
  if (keptFiles.has(path)) return "file";
  if (mode !== "navigate") return "leave";
  // Both work from what is on the phone, and the network may be too slow to wait for.
  if (path === "/field" || path === "/desk/sheet") return "shell";
  return path === "/" || path === "/sign-in" ? "network-else-shell" : "network-else-offline";
}
