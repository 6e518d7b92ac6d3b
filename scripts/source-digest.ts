import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";
import { root } from "./environment";

// tsconfig.json stays out: a build rewrites it.
const sources = [
  ..."app components fonts lib models public service-worker".split(" "),
  ..."instrumentation.ts next.config.mjs package-lock.json postcss.config.mjs proxy.ts tailwind.config.ts".split(
    " ",
  ),
  ..."page-hashes production-build worker-bundle".split(" ").map((name) => `scripts/${name}.ts`),
];

/** A digest of everything a build is made from. Contents, not dates: a checkout gives files new dates. */
export function sourceDigest(): string {
  const hash = createHash("sha256");
  for (const file of sources.flatMap(filesUnder)) {
    hash
      .update(`${file}\0`)
      .update(readFileSync(path.join(root, file)))
      .update("\0");
  }
  return hash.digest("hex");
}

function filesUnder(entry: string): string[] {
  const full = path.join(root, entry);
  // The worker is a result of the build.
  if (!existsSync(full) || entry.startsWith("public/sw.js")) return [];
  if (!statSync(full).isDirectory()) return [entry];
  return readdirSync(full)
    .sort()
    .flatMap((name) => filesUnder(`${entry}/${name}`));
}
