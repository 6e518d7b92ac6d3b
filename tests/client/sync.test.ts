import "fake-indexeddb/auto";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { Sync } from "@/lib/client/sync";
import { deviceFor } from "@/lib/client/device";
import type { Bundle } from "@/lib/domain/field";
import { Problem, problemDocument, type ProblemCode } from "@/lib/domain/problem";
import { rig } from "../support/rig";

const member = "00000000-0000-4000-8000-0000000000ff";
const bundle: Bundle = {
  generatedAt: "2026-05-01T08:00:00.000Z",
  member: {
    id: member,
    name: "A driver",
    email: "driver@test.example",
    role: "driver",
    organisation: { id: "00000000-0000-4000-8000-0000000000fe", name: "A household", kind: "household" },
  },
  rigs: [rig],
  keys: [],
};

function refuse(code: ProblemCode, headers: Record<string, string> = {}): Response {
  const problem = new Problem(code);
  return Response.json(problemDocument(problem), { status: problem.status, headers });
}

type Reply = () => Response | Promise<Response>;
const gone: Reply = () => Promise.reject(new TypeError("Failed to fetch"));

/** A server that answers each path as told and remembers when it was asked (ms since the start) and with what. */
function server(nowMs: () => number, replies: Record<string, Reply>) {
  const asked: [number, string, string][] = [];
  const fetch = async (path: string, init: RequestInit) => {
    asked.push([nowMs(), path, String(init.body)]);
    return replies[path]!();
  };
  return { asked, fetch };
}

let stores = 0;
beforeEach(() => void vi.useFakeTimers({ toFake: ["setTimeout", "clearTimeout", "Date"], now: 0 }));
afterEach(() => void vi.useRealTimers());

/** How many attempts are under way: simulated time stands still while they read and write the store. */
let underWay = 0;

/** Lets simulated time pass in steps small enough that what the store does in between is done in between. */
async function pass(ms: number): Promise<void> {
  for (let left = ms; left > 0; left -= 250) {
    await vi.advanceTimersByTimeAsync(Math.min(250, left));
    for (let turn = 0; turn < 40 || underWay > 0; turn += 1)
      await new Promise((resolve) => setImmediate(resolve));
  }
}

function phone(replies: Record<string, Reply>) {
  const store = openStore(`sync-${(stores += 1)}`);
  const nowMs = () => Date.now();
  const { asked, fetch } = server(nowMs, replies);
  const sync = new Sync({
    store,
    nowMs,
    spread: 1,
    label: "a phone",
    fetch,
    alone: async (work) => {
      underWay += 1;
      await work().finally(() => (underWay -= 1));
      return true;
    },
  });
  return { sync, asked, store, replies };
}

async function walk(sync: Sync) {
  const clock = () => ({ wallMs: Date.now(), monoMs: Date.now(), monoEpoch: "test" });
  const device = await deviceFor(sync.shelf.store, member);
  const recorder = await Recorder.open({ shelf: sync.shelf, clock, device }, rig, {
    member,
    purpose: "hook-up",
    depth: "full",
  });
  recorder.subscribe(() => void sync.saved());
  await sync.saved();
  return recorder;
}

describe("a phone and its server", () => {
  test("fetches its bundle and registers its device by itself, then rests", async () => {
    const { sync, asked } = phone({
      "/api/field/bundle": () => Response.json(bundle),
      "/api/devices": () => Response.json({}, { status: 201 }),
    });
    await sync.start();
    await pass(60_000);
    expect(asked.map(([, path]) => path)).toEqual(["/api/field/bundle", "/api/devices"]);
    expect(sync.view()).toMatchObject({ ready: true, bundle, signedOut: false, reached: true });
  });

  test("with the server gone it keeps trying, ever more slowly, and is there when the server is", async () => {
    const { sync, asked, replies } = phone({
      "/api/field/bundle": gone,
      "/api/devices": () => Response.json({}),
    });
    await sync.start();
    await pass(16_000);
    expect(asked.map(([at]) => at)).toEqual([0, 2_000, 6_000, 14_000]);
    expect(sync.view()).toMatchObject({ bundle: null, reached: false });
    replies["/api/field/bundle"] = () => Response.json(bundle);
    await pass(16_000);
    expect(sync.view().bundle).toEqual(bundle);
  });

  test("a campground's sign-in page in place of the answer is not an answer", async () => {
    const { sync } = phone({ "/api/field/bundle": () => new Response("<!doctype html>Welcome") });
    await sync.start();
    await pass(1_000);
    expect(sync.view()).toMatchObject({ bundle: null, reached: false, signedOut: false });
  });

  test("a bundle whose list is not what its digest says is not taken", async () => {
    const forged = structuredClone(bundle);
    forged.rigs[0]!.revision.document.catalogue = "another";
    const { sync } = phone({ "/api/field/bundle": () => Response.json(forged) });
    await sync.start();
    await pass(1_000);
    expect(sync.view().bundle).toBeNull();
  });

  test("with the database down it waits as long as it is asked to", async () => {
    const { sync, asked } = phone({
      "/api/field/bundle": () => refuse("unavailable", { "retry-after": "30" }),
    });
    await sync.start();
    await pass(29_000);
    expect(asked).toHaveLength(1);
    await pass(2_000);
    expect(asked).toHaveLength(2);
  });

  test("signed out: recording goes on, sending waits for a sign-in, and nothing is lost", async () => {
    const { sync, asked, replies } = phone({
      "/api/field/bundle": () => Response.json(bundle),
      "/api/devices": () => Response.json({}),
      "/api/field/entries": () => refuse("signed-out"),
    });
    await sync.start();
    await pass(1_000);
    const recorder = await walk(sync);
    await pass(5_000);
    expect(sync.view().signedOut).toBe(true);
    const before = asked.length;
    await recorder.mark("pin", "good");
    await recorder.close();
    await pass(120_000);
    expect(asked).toHaveLength(before);
    expect(sync.view().walks).toMatchObject([{ length: 3, acknowledged: 0, receipt: null }]);

    replies["/api/field/entries"] = () => Response.json({ walks: {}, refused: [] });
    sync.stir();
    await pass(1_000);
    const envelope = JSON.parse(asked.at(-1)![2]) as { entries: { type: string }[]; seals: unknown[] };
    expect(envelope.entries.map((entry) => entry.type)).toEqual(["open", "mark", "close"]);
    expect(envelope.seals).toEqual([recorder.view().walk.seal]);
    sync.stop();
  });
});
