import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";

/** What `proxy.ts` reads: the scripts of each page, and those of the error pages, which any address may show. */
export type PageHashes = { pages: Record<string, string[]>; anywhere: string[] };

/**
 * Writes the hashes of all inline scripts in a build's prerendered documents. They are kept by page: the union of
 * all would be a header of many kilobytes that common servers in front refuse.
 */
export function writePageHashes(distDir: string): void {
  const hashes: PageHashes = { pages: {}, anywhere: [] };
  for (const { address, html } of prerendered(distDir)) {
    if (address) hashes.pages[address] = scriptHashes(html);
    else hashes.anywhere = [...new Set([...hashes.anywhere, ...scriptHashes(html)])];
  }
  writeFileSync(path.join(distDir, "csp.json"), JSON.stringify(hashes));
}

/** The content hashes, as Content-Security-Policy spells them, of the inline scripts in a document. */
export function scriptHashes(html: string): string[] {
  const inline = [...html.matchAll(/<script\b([^>]*)>([\s\S]*?)<\/script>/g)].filter(
    ([, attributes = ""]) => !/\ssrc=/.test(attributes),
  );
  return [...new Set(inline.map(([, , text = ""]) => hashOf(text)))];
}

function hashOf(text: string): string {
  return `sha256-${createHash("sha256").update(text).digest("base64")}`;
}

/** Every prerendered document with the address it answers at; an error page has none. */
function prerendered(distDir: string): { address: string | undefined; html: string }[] {
  return ["app", "pages"].flatMap((folder) => {
    const base = path.join(distDir, "server", folder);
    const files = existsSync(base) ? readdirSync(base, { recursive: true, encoding: "utf8" }) : [];
    return files
      .filter((file) => file.endsWith(".html"))
      .map((file) => ({ address: addressOf(file), html: readFileSync(path.join(base, file), "utf8") }));
  });
}

function addressOf(file: string): string | undefined {
  const name = file.slice(0, -".html".length);
  if (name.startsWith("_") || name === "404" || name === "500") return undefined;
  return name === "index" ? "/" : `/${name}`;
}
