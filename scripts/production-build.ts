import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import path from "node:path";
import { PlainError, root } from "./environment";
import { exclusively } from "./exclusively";
import { writePageHashes } from "./page-hashes";
import { exitCode, startProgram } from "./processes";
import { sourceDigest } from "./source-digest";

/** Builds unless the last finished build was made from exactly these sources. */
export async function buildIfOlder(): Promise<void> {
  await exclusively(`build ${distDir()}`, async () => {
    const stamp = stampFile();
    if (!existsSync(stamp) || readFileSync(stamp, "utf8") !== sourceDigest()) await buildNow();
    publishWorker(distDir());
  });
}

/** The whole production build: Next's own, then the pages' script hashes, then the service worker. */
export async function build(): Promise<void> {
  await exclusively(`build ${distDir()}`, async () => {
    await buildNow();
    publishWorker(distDir());
  });
}

async function buildNow(): Promise<void> {
  // Taken before: what is edited while the build runs makes it old again. Next clears the stamp of the last build.
  const digest = sourceDigest();
  // Without a database in sight nothing can be read from one while pages are prerendered.
  const env: NodeJS.ProcessEnv = { ...process.env, NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" };
  delete env.DATABASE_URL;
  const next = startProgram(process.execPath, ["node_modules/next/dist/bin/next", "build"], { env });
  if ((await exitCode(next)) !== 0) throw new PlainError("The build failed; Next says why above.");
  writePageHashes(distDir());
  // Loaded only now: the bundler's packages would slow down every start that has nothing to build.
  const { bundleWorker } = await import("./worker-bundle");
  await bundleWorker(distDir());
  writeFileSync(stampFile(), digest);
}

/**
 * Puts a build's worker where browsers ask for it. It names the files of one build, and a checkout may hold several
 * builds (the tests have their own), so the one about to be served comes last.
 */
export function publishWorker(dist: string): void {
  const worker = readFileSync(path.join(dist, "sw.js"));
  const target = path.join(root, "public", "sw.js");
  if (existsSync(target) && readFileSync(target).equals(worker)) return;
  // Renamed into place: a server that runs must never send half of it.
  writeFileSync(`${target}.new`, worker);
  renameSync(`${target}.new`, target);
}

function distDir(): string {
  return path.resolve(root, process.env.NEXT_DIST_DIR || ".next");
}

function stampFile(): string {
  return path.join(distDir(), "hookfast-sources");
}
