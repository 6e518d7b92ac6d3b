import { existsSync, mkdirSync, writeFileSync } from "node:fs";
import path from "node:path";
import { root } from "./environment";
import { runProgram } from "./processes";
import { publishWorker } from "./production-build";
import { atShutdown } from "./shutdown";
import type { Outcome } from "./test";
import { testEnvironment, testFolder } from "./test-machine";

/** Prettier over everything that is ours. */
export function format(): Promise<Outcome> {
  return check(["node_modules/prettier/bin/prettier.cjs", "--check", "--log-level=warn", "."]);
}

/** ESLint, which also guards the fence between the rooms; a warning is a finding too. */
export function lint(): Promise<Outcome> {
  return check(["node_modules/eslint/bin/eslint.js", "--max-warnings=0", "."]);
}

/** The types of one runtime, by its tsconfig. */
export async function checkTypes(room: string): Promise<Outcome> {
  if (room !== ".") return await tsc(room);
  // Next's own declarations, of the routes as they are now, are part of the whole.
  const routes = await check(["node_modules/next/dist/bin/next", "typegen"]);
  return routes.failed > 0 ? routes : await tsc(writeWholeConfig());
}

function tsc(project: string): Promise<Outcome> {
  return check(["node_modules/typescript/bin/tsc", "--noEmit", "--pretty", "false", "-p", project]);
}

/** The root's tsconfig without what earlier builds left in `.next`: it may name pages that are gone. */
function writeWholeConfig(): string {
  const up = path.relative(testFolder, root);
  const file = path.join(testFolder, "tsconfig.json");
  const compilerOptions = { incremental: false, rootDir: up };
  const include = ["next-env.d.ts", "**/*.ts", "**/*.tsx"].map((pattern) => `${up}/${pattern}`);
  const exclude = ["node_modules", ".data", ".next", "service-worker"].map((name) => `${up}/${name}`);
  mkdirSync(testFolder, { recursive: true });
  writeFileSync(file, JSON.stringify({ extends: `${up}/tsconfig.json`, compilerOptions, include, exclude }));
  return file;
}

/** A production build of its own, so that a running `npm start` keeps its files and gets its worker back. */
export function buildForTests(): Promise<Outcome> {
  const usual = path.join(root, ".next");
  atShutdown(async () => {
    if (existsSync(path.join(usual, "sw.js"))) publishWorker(usual);
  });
  return check(["--conditions=react-server", "--import", "tsx", "scripts/build.ts", "--if-older"]);
}

async function check(words: string[]): Promise<Outcome> {
  const { code, output } = await runProgram(process.execPath, words, { env: testEnvironment() });
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, output };
}
