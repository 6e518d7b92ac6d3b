import { spawn } from "node:child_process";
import { once } from "node:events";
import { randomUUID } from "node:crypto";
import { expect, it } from "vitest";
import { exclusively } from "@/scripts/exclusively";

it("lets one task in at a time, in this process too", async () => {
  const name = randomUUID();
  let inside = 0;
  let most = 0;
  const task = async () => {
    most = Math.max(most, (inside += 1));
    await new Promise((done) => setTimeout(done, 20));
    inside -= 1;
  };
  await Promise.all([1, 2, 3].map(() => exclusively(name, task)));
  expect(most).toBe(1);
});

it("frees the lock when the task fails", async () => {
  const name = randomUUID();
  await expect(exclusively(name, () => Promise.reject(new Error("no")))).rejects.toThrow("no");
  expect(await exclusively(name, async () => "in")).toBe("in");
});

it("frees the lock of a process that was killed", async () => {
  const name = randomUUID();
  const script = `import { exclusively } from "./scripts/exclusively.ts";
    await exclusively(${JSON.stringify(name)}, () => new Promise(() => { console.log("held"); setInterval(() => {}, 1000); }));`;
  const holder = spawn(process.execPath, ["--import", "tsx", "--input-type=module", "-e", script]);
  await once(holder.stdout, "data");
  const waiting = exclusively(name, async () => "in");
  holder.kill("SIGKILL");
  expect(await waiting).toBe("in");
});
