import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { NextResponse, type NextRequest } from "next/server";
import { settings } from "@/lib/server/settings";
import type { PageHashes } from "@/scripts/page-hashes";

// Headers only. Nothing here decides who may see what: that is done beside the data.

export const config = { matcher: ["/((?!api/|_next/static/|_next/image).*)"] };

const inDevelopment = process.env.NODE_ENV === "development";
const loopback = new Set(["127.0.0.1", "localhost", "[::1]"]);

/** Sends a page asked under another name of this machine to its own address, and gives every page its headers. */
export function proxy(request: NextRequest): NextResponse {
  const { pathname, search, port, hostname } = request.nextUrl;
  if (isPageUnderOtherName(request, pathname)) {
    const target = `${settings.ORIGIN}${pathname}${search}`;
    return new NextResponse(null, {
      status: 307,
      headers: { location: asNextLeavesIt(target, hostname, port) },
    });
  }
  const response = NextResponse.next();
  for (const [name, value] of Object.entries(headersFor(pathname))) response.headers.set(name, value);
  return response;
}

/** A browser keeps cookies and storage by name, so `localhost` must not open a second, empty Hookfast. */
function isPageUnderOtherName(request: NextRequest, pathname: string): boolean {
  const origin = new URL(settings.ORIGIN);
  const asked = request.headers.get("host") ?? "";
  if (asked === origin.host || !loopback.has(origin.hostname) || !URL.canParse(`http://${asked}`))
    return false;
  const isPage = !pathname.split("/").at(-1)?.includes(".");
  return (
    isPage && ["GET", "HEAD"].includes(request.method) && loopback.has(new URL(`http://${asked}`).hostname)
  );
}

/**
 * Next cuts the origin off a redirect that seems to stay on this server, which would send the browser back to the
 * name it came from. It does so twice: first taking all loopback names for one, then comparing with the host and port
 * it listens on. So the origin is written once more, as `//host`, for each time it will be cut.
 */
function asNextLeavesIt(target: string, hostname: string, port: string): string {
  const { origin, host, port: targetPort } = new URL(target);
  if (!loopback.has(hostname) || port !== targetPort) return target;
  const listening = settings.HOST.includes(":") ? `[${settings.HOST}]` : settings.HOST;
  const times = host === `${listening}:${settings.PORT}` ? 2 : 1;
  return `${origin}${`//${host}`.repeat(times)}${target.slice(origin.length)}`;
}

function headersFor(pathname: string): Record<string, string> {
  const overHttps = settings.ORIGIN.startsWith("https:");
  return {
    "Content-Security-Policy": contentPolicy(pathname),
    "X-Content-Type-Options": "nosniff",
    "Referrer-Policy": "same-origin",
    "Permissions-Policy": permissions,
    "Cross-Origin-Opener-Policy": "same-origin",
    ...(overHttps ? { "Strict-Transport-Security": "max-age=31536000" } : {}),
  };
}

const switchedOff =
  "accelerometer autoplay display-capture geolocation gyroscope magnetometer microphone midi payment";
const permissions = [
  "camera=(self)",
  // A walk keeps the screen on.
  "screen-wake-lock=(self)",
  ...`${switchedOff} hid serial usb xr-spatial-tracking`.split(" ").map((feature) => `${feature}=()`),
].join(", ");

function contentPolicy(pathname: string): string {
  // Reloading in development evaluates code, inlines styles and talks over a socket.
  const inline = inDevelopment
    ? ["'unsafe-inline'", "'unsafe-eval'"]
    : hashesFor(pathname).map((hash) => `'${hash}'`);
  return [
    "default-src 'self'",
    ["script-src 'self'", ...inline].join(" "),
    inDevelopment ? "style-src 'self' 'unsafe-inline'" : "style-src 'self'",
    "img-src 'self' data: blob:",
    // A filmed clip plays from the phone it was filmed with.
    "media-src 'self' blob:",
    "font-src 'self'",
    inDevelopment ? "connect-src 'self' ws:" : "connect-src 'self'",
    "worker-src 'self'",
    "manifest-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

let hashes: PageHashes | undefined;

function hashesFor(pathname: string): string[] {
  hashes ??= readHashes();
  return [...new Set([...(hashes.pages[pathname] ?? []), ...hashes.anywhere])];
}

function readHashes(): PageHashes {
  const file = path.resolve(/* turbopackIgnore: true */ process.cwd(), settings.NEXT_DIST_DIR, "csp.json");
  if (!existsSync(file)) throw new Error("This build lacks its script hashes: make it with npm run build.");
  return JSON.parse(readFileSync(file, "utf8")) as PageHashes;
}
