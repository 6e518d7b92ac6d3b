import { createHash } from "node:crypto";
import net from "node:net";
import { setTimeout as sleep } from "node:timers/promises";

/**
 * Runs a task while no other process of this machine runs one under the same name. The lock is a name in Linux's
 * abstract socket space: the kernel frees it with its holder, so there is no stale lock to judge.
 */
export async function exclusively<Result>(name: string, task: () => Promise<Result>): Promise<Result> {
  const address = `\0hookfast-${createHash("sha256").update(name).digest("hex").slice(0, 32)}`;
  let lock = await take(address);
  while (!lock) {
    await sleep(50);
    lock = await take(address);
  }
  const held = lock;
  try {
    return await task();
  } finally {
    await new Promise((done) => held.close(done));
  }
}

function take(address: string): Promise<net.Server | undefined> {
  return new Promise((resolve, reject) => {
    const server = net.createServer();
    server.once("error", (error: NodeJS.ErrnoException) =>
      error.code === "EADDRINUSE" ? resolve(undefined) : reject(error),
    );
    server.listen(address, () => resolve(server));
  });
}
