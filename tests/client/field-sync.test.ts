import "fake-indexeddb/auto";
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { openStore } from "@/lib/client/store";
import { Sync } from "@/lib/client/sync";
import { Problem, problemDocument, type ProblemCode } from "@/lib/domain/problem";

beforeEach(() => void vi.useFakeTimers({ toFake: ["setTimeout", "clearTimeout", "Date"], now: 0 }));
afterEach(() => void vi.useRealTimers());

async function pass(ms: number): Promise<void> {
  for (let left = ms; left > 0; left -= 250) {
    await vi.advanceTimersByTimeAsync(250);
    for (let turn = 0; turn < 20; turn += 1) await new Promise((resolve) => setImmediate(resolve));
  }
}

function phone(store: ReturnType<typeof openStore>, code: ProblemCode) {
  const fetch = vi.fn(async () =>
    Response.json(problemDocument(new Problem(code)), { status: new Problem(code).status }),
  );
  const sync = new Sync({
    store,
    nowMs: () => Date.now(),
    spread: 1,
    label: "a phone",
    fetch,
    alone: async (work) => {
      await work();
      return true;
    },
  });
  return { sync, fetch };
}

test("a role that makes no walks is told apart from signed out, and asked about once", async () => {
  const { sync, fetch } = phone(openStore("field-sync-role"), "role-refused");
  await sync.start();
  await pass(120_000);
  expect(sync.view()).toMatchObject({ ready: true, bundle: null, signedOut: false, roleRefused: true });
  expect(fetch).toHaveBeenCalledTimes(1);
  sync.stir();
  await pass(2_000);
  expect(fetch).toHaveBeenCalledTimes(2);
  sync.stop();
});

test("a store that cannot be read says so at once, and neither rejects nor stops the attempts", async () => {
  let refuses = true;
  const working = openStore("field-sync-store");
  const store: typeof working = (mode, work) =>
    refuses ? Promise.reject(new DOMException("no", "SecurityError")) : working(mode, work);
  const { sync, fetch } = phone(store, "unavailable");
  await sync.start();
  expect(sync.view()).toMatchObject({ ready: false, storeRefused: true });
  await pass(5_000);
  expect(fetch.mock.calls.length).toBeGreaterThan(1);
  refuses = false;
  await sync.read();
  expect(sync.view()).toMatchObject({ ready: true, storeRefused: false });
  sync.stop();
});
