import { PlainError } from "./environment";

type Task = () => Promise<void>;

const tasks: Task[] = [];
let stopping: Promise<void> | undefined;

/** What has to be stopped or undone when this process ends; the last one added goes first. */
export function atShutdown(task: Task): void {
  tasks.push(task);
}

/** Stops everything once, however often it is asked: a terminal and npm both pass on a Ctrl-C. */
function shutDown(): Promise<void> {
  stopping ??= (async () => {
    for (let task = tasks.pop(); task; task = tasks.pop())
      await task().catch((error) => console.error(error));
  })();
  return stopping;
}

/** From now on a signal stops everything and ends this process with `code`. */
function shutDownOnSignal(code: number): void {
  const stop = () => void shutDown().then(() => process.exit(code));
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"] as const) process.on(signal, stop);
  // A parent that was killed outright sends no signal: being handed to another one is the only sign of it.
  const parent = Number(process.env.HOOKFAST_PARENT);
  if (parent === process.ppid) setInterval(() => process.ppid !== parent && stop(), 500).unref();
}

/** Runs a script, stops what it started and ends this process with the script's exit code. */
export async function runScript(script: () => Promise<number>, codeOnSignal: number): Promise<void> {
  shutDownOnSignal(codeOnSignal);
  let code = 1;
  try {
    code = await script();
  } catch (error) {
    if (!stopping) console.error(error instanceof PlainError ? error.message : error);
  }
  // After a signal the handler ends the process with its own code.
  if (stopping) return;
  await shutDown();
  process.exit(code);
}
