import { spawn, type ChildProcess, type SpawnOptions } from "node:child_process";
import { readFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { root } from "./environment";
import { atShutdown } from "./shutdown";

/** A process that cannot be mistaken for a later one with the same number. */
export type Identity = { pid: number; started: string };

/** What the kernel says of a process; nothing when there is none. */
function stat(pid: number): { state: string; group: string; started: string } | undefined {
  try {
    // The name in parentheses may hold blanks: count from the last parenthesis.
    const fields = readFileSync(`/proc/${pid}/stat`, "utf8").split(") ").at(-1)?.split(" ") ?? [];
    return { state: fields[0] ?? "", group: fields[2] ?? "", started: fields[19] ?? "" };
  } catch {
    return undefined;
  }
}

/** The identity of a live process. */
export function identify(pid: number): Identity | undefined {
  const found = stat(pid);
  return found && found.state !== "Z" ? { pid, started: found.started } : undefined;
}

/** Whether that very process still runs. */
export function isAlive(identity: Identity): boolean {
  return identify(identity.pid)?.started === identity.started;
}

function isGroupLeader(pid: number): boolean {
  return stat(pid)?.group === String(pid);
}

/** The words a process was started with. */
export function commandLine(pid: number): string[] {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8").split("\0");
  } catch {
    return [];
  }
}

/** Asks a process to end and waits; after `graceMs` it is ended outright, unless that is never. */
export async function stopProcess(identity: Identity, graceMs: number | "never"): Promise<void> {
  const began = Date.now();
  send(identity, "SIGTERM");
  while (isAlive(identity)) {
    if (graceMs !== "never" && Date.now() - began > graceMs) send(identity, "SIGKILL");
    await sleep(20);
  }
  // One turn more, so that a child of ours is reaped and leaves no trace in the process table.
  await sleep(5);
}

function send(identity: Identity, signal: NodeJS.Signals): void {
  if (!isAlive(identity)) return;
  try {
    // A program of ours leads a group: what it started itself has to go with it.
    process.kill(isGroupLeader(identity.pid) ? -identity.pid : identity.pid, signal);
  } catch {
    // It ended between the question and the signal.
  }
}

/**
 * Starts a program that ends with this process at the latest. It leads a process group, so that a terminal's
 * Ctrl-C reaches only us and things are stopped in order.
 */
export function startProgram(file: string, words: string[], options: SpawnOptions = {}): ChildProcess {
  const child = spawn(file, words, { cwd: root, detached: true, stdio: "inherit", ...options });
  const identity = child.pid ? identify(child.pid) : undefined;
  if (identity) atShutdown(() => stopProcess(identity, 10_000));
  return child;
}

/** Starts a server that may outlive this process, with a log file of its own. */
export function startServer(file: string, words: string[]): Identity | undefined {
  const child = spawn(file, words, { cwd: root, detached: true, stdio: "ignore" });
  child.once("error", () => undefined);
  child.unref();
  return child.pid ? identify(child.pid) : undefined;
}

/** Resolves with the exit code; an end by signal or a program that cannot start counts as 1. */
export function exitCode(child: ChildProcess): Promise<number> {
  return new Promise((resolve) => {
    child.once("error", () => resolve(1));
    child.once("exit", (code) => resolve(code ?? 1));
  });
}

/** Runs a program to its end and hands back its exit code and what it printed. */
export async function runProgram(
  file: string,
  words: string[],
  options: SpawnOptions = {},
): Promise<{ code: number; output: string }> {
  const child = startProgram(file, words, { ...options, stdio: ["ignore", "pipe", "pipe"] });
  let output = "";
  child.stdout?.on("data", (chunk) => (output += chunk));
  child.stderr?.on("data", (chunk) => (output += chunk));
  return await new Promise((resolve) => {
    child.once("error", (error) => resolve({ code: 1, output: error.message }));
    child.once("close", (code) => resolve({ code: code ?? 1, output }));
  });
}
