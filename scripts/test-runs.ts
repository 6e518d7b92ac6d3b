import { existsSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { runProgram } from "./processes";
import type { Outcome } from "./test";
import { testEnvironment, testFolder } from "./test-machine";

/** The tests of one place by Vitest, counted from its own report. */
export async function runVitest(place: string, words: string[]): Promise<Outcome> {
  const report = path.join(testFolder, `${place}.json`);
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const file = "node_modules/vitest/vitest.mjs";
  return await counted(report, [file, "run", "--project", place, ...reporters, ...words], {}, (found) => ({
    passed: found.numPassedTests ?? 0,
    failed: found.numFailedTests ?? 0,
  }));
}

/** The tests of the whole product in Chromium by Playwright, counted from its own report. */
export async function runPlaywright(words: string[]): Promise<Outcome> {
  const report = path.join(testFolder, "e2e.json");
  const command = ["node_modules/@playwright/test/cli.js", "test", "--reporter=list,json", ...words];
  return await counted(report, command, { PLAYWRIGHT_JSON_OUTPUT_FILE: report }, ({ stats }) => ({
    passed: (stats?.expected ?? 0) + (stats?.flaky ?? 0),
    failed: stats?.unexpected ?? 0,
    again: stats?.flaky ?? 0,
  }));
}

type Report = {
  numPassedTests?: number;
  numFailedTests?: number;
  stats?: { expected: number; unexpected: number; flaky: number };
};

async function counted(
  report: string,
  words: string[],
  env: Record<string, string>,
  read: (report: Report) => { passed: number; failed: number; again?: number },
): Promise<Outcome> {
  rmSync(report, { force: true });
  const { code, output } = await runProgram(process.execPath, words, {
    env: { ...testEnvironment(), ...env },
  });
  const { passed, failed, again } = read(
    existsSync(report) ? (JSON.parse(readFileSync(report, "utf8")) as Report) : {},
  );
  const none = passed + failed === 0 ? "\nNo test ran.\n" : "";
  // A file that cannot be loaded, or an error between tests, has no test to its name.
  const silent = failed === 0 && (code !== 0 || none !== "") ? 1 : 0;
  return { passed, failed: failed + silent, output: output + none, again };
}
