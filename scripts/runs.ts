import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { identify, isAlive, stopProcess, type Identity } from "./processes";

/** A start, dev or test that uses a data directory, with the servers that must not outlive it. */
type Run = { self: Identity; children: Identity[] };

const own = { children: [] as Identity[] };

/** Writes down that this process uses the data directory, after ending what runs that were killed left behind. */
export async function enterRun(dataDir: string): Promise<void> {
  for (const [file, run] of readRuns(dataDir)) {
    if (isAlive(run.self)) continue;
    for (const child of run.children) if (isAlive(child)) await stopProcess(child, 10_000);
    rmSync(file, { force: true });
  }
  save(dataDir);
}

/** Adds a server that a later run has to stop if this process is killed. */
export function noteServer(dataDir: string, pid: number | undefined): void {
  const identity = pid ? identify(pid) : undefined;
  if (identity) own.children.push(identity);
  save(dataDir);
}

/** Takes this process off the list and says whether another one still uses the data directory. */
export function leaveRun(dataDir: string): { othersRemain: boolean } {
  rmSync(fileOf(dataDir, process.pid), { force: true });
  return { othersRemain: readRuns(dataDir).some(([, run]) => isAlive(run.self)) };
}

function save(dataDir: string): void {
  mkdirSync(path.join(dataDir, "runs"), { recursive: true });
  const self = identify(process.pid);
  writeFileSync(fileOf(dataDir, process.pid), JSON.stringify({ self, children: own.children }));
}

function fileOf(dataDir: string, pid: number): string {
  return path.join(dataDir, "runs", `${pid}.json`);
}

function readRuns(dataDir: string): [file: string, run: Run][] {
  const folder = path.join(dataDir, "runs");
  mkdirSync(folder, { recursive: true });
  return readdirSync(folder).flatMap((name): [string, Run][] => {
    const file = path.join(folder, name);
    try {
      return [[file, JSON.parse(readFileSync(file, "utf8")) as Run]];
    } catch {
      // Cut short by the end of its writer.
      rmSync(file, { force: true });
      return [];
    }
  });
}
