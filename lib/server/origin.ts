import "server-only";
import { settings } from "./settings";

const READING = new Set(["GET", "HEAD", "OPTIONS"]);

/**
 * Whether a request that changes something comes from elsewhere than Hookfast's own pages. A browser says where from
 * in `Origin` or `Sec-Fetch-Site`; each that is present must agree, and one has to be.
 */
export function isForeign(request: Request): boolean {
  if (READING.has(request.method)) return false;
  const origin = request.headers.get("origin");
  const site = request.headers.get("sec-fetch-site");
  if (origin === null && site === null) return true;
  return (origin !== null && origin !== settings.ORIGIN) || (site !== null && site !== "same-origin");
}
