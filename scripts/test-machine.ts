import path from "node:path";
import { createConnection } from "mariadb";
import { root } from "./environment";
import { ensureProgram } from "./machine";
import { joinDataDirectory, provideServer } from "./mariadb";
import { identify, runProgram } from "./processes";
import { atShutdown } from "./shutdown";

/** Where the tests keep their database server, build, keys and reports. */
export const testFolder = path.join(root, ".data", "test");

const set: Record<string, string> = { DATA_DIR: testFolder, NEXT_DIST_DIR: ".data/test/next" };

/** What every stage runs with: the caller's environment without any setting of the product but the tests' own. */
export function testEnvironment(): NodeJS.ProcessEnv {
  const settings = [
    "PORT",
    "HOST",
    "ORIGIN",
    "DATABASE_URL",
    "KEYS_DIR",
    "PHOTOS_DIR",
    "DEMO",
    "NODE_ENV",
    "HOOKFAST_PARENT",
  ];
  const kept = Object.entries(process.env).filter(
    ([name]) => !settings.includes(name) && !name.startsWith("npm_"),
  );
  return { ...Object.fromEntries(kept), ...set } as NodeJS.ProcessEnv;
}

/**
 * Sets up what the chosen stages need. What cannot be set up fails its stages and no other: the answer says, for a
 * stage, why it cannot run.
 */
export async function prepareTests(stages: string[]): Promise<(stage: string) => string | undefined> {
  const broken = new Map<string, string>();
  const attempt = async (needing: string[], task: () => Promise<void>) => {
    if (!needing.some((stage) => stages.includes(stage))) return;
    await task().catch((error: Error) => needing.forEach((stage) => broken.set(stage, error.message)));
  };
  await attempt(["server", "e2e"], startDatabase);
  await attempt(["e2e"], async () => {
    set.CHROMIUM = await ensureProgram("chromium", "chromium");
  });
  return (stage) => broken.get(stage);
}

async function startDatabase(): Promise<void> {
  await joinDataDirectory(testFolder);
  const server = new URL(await provideServer(testFolder, false));
  const name = `hookfast_run_${process.pid}`;
  const administration = await createConnection(server.href);
  await dropLeftovers(administration);
  await administration.query(`CREATE DATABASE ${name}`);
  atShutdown(async () => {
    await administration.query(`DROP DATABASE ${name}`);
    await administration.end();
  });
  server.pathname = "";
  set.TEST_DATABASE_SERVER = server.href;
  set.DATABASE_URL = `${server.href}/${name}`;
  set.KEYS_DIR = path.join(testFolder, "keys");
  const words = ["--conditions=react-server", "--import", "tsx", "scripts/prepare.ts"];
  const { code, output } = await runProgram(process.execPath, words, { env: testEnvironment() });
  if (code !== 0) throw new Error(output);
}

/** Databases end in the number of the process that made them; a run that was killed could not drop its own. */
async function dropLeftovers(administration: { query(text: string): Promise<unknown> }): Promise<void> {
  const rows = (await administration.query("SHOW DATABASES LIKE 'hookfast\\_%'")) as Record<string, string>[];
  for (const name of rows.flatMap((row) => Object.values(row))) {
    const pid = Number(name.split("_").at(-1));
    if (!identify(pid)) await administration.query(`DROP DATABASE ${name}`);
  }
}
