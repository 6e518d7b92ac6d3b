import "fake-indexeddb/auto";
import { beforeEach, describe, expect, test, vi } from "vitest";
import { deviceFor } from "@/lib/client/device";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { StoreGuard, type Outside } from "@/lib/client/store-guard";
import { compareMarks, readMarks, type Marks } from "@/lib/client/store-marks";
import { storeTroubleOf, type StoreTrouble } from "@/lib/client/store-trouble";
import { MovedOn, WalkGone, WalkShelf, type KeptWalk } from "@/lib/client/walk-shelf";
import { rig } from "../support/rig";

const member = "00000000-0000-4000-8000-0000000000ff";
const openedAt = "2026-05-01T08:00:00.000Z";

test.each<[unknown, StoreTrouble | null]>([
  [new DOMException("", "QuotaExceededError"), "full"],
  [new DOMException("The operation is insecure.", "SecurityError"), "refused"],
  [new DOMException("", "InvalidStateError"), "refused"],
  [new DOMException("", "NotFoundError"), "vanished"],
  [new WalkGone(), "vanished"],
  [new MovedOn(), null],
  [new DOMException("Connection to Indexed Database server lost.", "UnknownError"), "unknown"],
  [new TypeError("x"), "unknown"],
  ["constructor", "unknown"],
])("%s is %s", (error, trouble) => {
  expect(storeTroubleOf(error)).toBe(trouble);
});

test("a browser without a database refuses", () => {
  vi.stubGlobal("indexedDB", undefined);
  expect(storeTroubleOf(new TypeError("x"))).toBe("refused");
  vi.unstubAllGlobals();
});

describe("the store held against its marks", () => {
  const walk = (id: string, length: number, received = false) =>
    ({
      id,
      length,
      purpose: "hook-up",
      rigName: "Meadow rig",
      openedAt,
      receipt: received ? {} : null,
    }) as KeptWalk;
  const mark = (length: number) => ({ length, purpose: "hook-up" as const, rigName: "Meadow rig", openedAt });
  const marks = (over: Partial<Marks> = {}): Marks => ({
    birth: "b",
    count: 2,
    walks: { open: mark(5) },
    ...over,
  });

  test.each<[string, Marks | null, string, KeptWalk[], Marks["lost"]]>([
    ["no marks yet", null, "b", [walk("open", 5)], undefined],
    ["the same", marks(), "b", [walk("open", 5), walk("r", 9, true)], undefined],
    ["grown meanwhile", marks(), "b", [walk("open", 8), walk("r", 9, true)], undefined],
    ["received meanwhile", marks(), "b", [walk("open", 8, true), walk("r", 9, true)], undefined],
    ["emptied", marks(), "new", [], { walks: { open: { ...mark(5), left: 0 } }, received: 1 }],
    ["cut short", marks(), "b", [walk("open", 3)], { walks: { open: { ...mark(5), left: 3 } }, received: 0 }],
    ["emptied, all received", marks({ walks: {} }), "new", [], { walks: {}, received: 2 }],
    ["emptied before any walk", marks({ walks: {}, count: 0 }), "new", [], undefined],
    [
      "not yet read about",
      marks({ walks: {}, count: 0, lost: { walks: { gone: { ...mark(5), left: 0 } }, received: 3 } }),
      "b",
      [walk("other", 2)],
      { walks: { gone: { ...mark(5), left: 0 } }, received: 3 },
    ],
    [
      "back after all",
      marks({ walks: {}, count: 0, lost: { walks: { gone: { ...mark(5), left: 0 } }, received: 0 } }),
      "b",
      [walk("gone", 5)],
      undefined,
    ],
  ])("%s", (_, before, birth, walks, lost) => {
    const after = compareMarks(before, birth, walks);
    expect(after.lost).toEqual(lost);
    expect(readMarks(JSON.stringify(after))).toEqual(after);
  });

  test("only what was not received is marked", () => {
    expect(compareMarks(null, "b", [walk("open", 5), walk("r", 9, true)])).toEqual({
      birth: "b",
      count: 2,
      walks: { open: mark(5) },
    });
  });

  test.each([null, "", "{", "[]", '{"birth":1}'])("marks that read %j are none", (kept) => {
    expect(readMarks(kept)).toBeNull();
  });
});

describe("a guarded store", () => {
  let names = 0;
  let name = "";
  beforeEach(() => void (name = `guard-${(names += 1)}`));

  function outside(): Outside & { kept: string | null } {
    return {
      kept: null,
      read() {
        return this.kept;
      },
      write(text: string) {
        this.kept = text;
      },
      follow: () => () => {},
    };
  }

  const clock = () => ({ wallMs: Date.parse(openedAt), monoMs: 0, monoEpoch: "e" });
  async function startWalk(guard: StoreGuard) {
    const ground = { shelf: new WalkShelf(guard.store), clock, device: await deviceFor(guard.store, member) };
    return Recorder.open(ground, rig, { member, purpose: "hook-up", depth: "full" });
  }
  const emptied = () =>
    new Promise((done, failed) => {
      const request = indexedDB.deleteDatabase(name);
      request.onsuccess = done;
      request.onerror = failed;
    });

  test("a store that was emptied between two visits is told at the next start, until it is read", async () => {
    const kept = outside();
    const first = new StoreGuard(openStore(name), kept);
    await first.check();
    const recorder = await startWalk(first);
    await recorder.mark("pin", "good");
    await first.check();
    expect(first.view()).toEqual({ trouble: null, lost: null });
    const { id } = recorder.view().walk;
    const lost = {
      walks: { [id]: { length: 2, left: 0, purpose: "hook-up", rigName: "Test rig", openedAt } },
      received: 0,
    };

    await emptied();
    const next = new StoreGuard(openStore(name), kept);
    await next.check();
    expect(next.view().lost).toEqual(lost);
    const later = new StoreGuard(openStore(name), kept);
    await later.check();
    expect(later.view().lost).toEqual(lost);
    later.dismiss();
    expect(later.view().lost).toBeNull();
    const last = new StoreGuard(openStore(name), kept);
    await last.check();
    expect(last.view().lost).toBeNull();
  });

  test("emptied under a running walk: the mark fails, and what is lost is told by itself", async () => {
    const guard = new StoreGuard(
      openStore(name, () => void guard.check()),
      outside(),
    );
    await guard.check();
    const recorder = await startWalk(guard);
    await guard.check();
    await emptied();
    await vi.waitFor(() => expect(Object.keys(guard.view().lost!.walks)).toEqual([recorder.view().walk.id]));
    const failure = await recorder.mark("pin", "good").catch((error: unknown) => error);
    expect(storeTroubleOf(failure)).toBe("vanished");
    expect(recorder.held().links.length).toBe(1);
  });

  test("what is outside cleared as well: this page still remembers", async () => {
    const kept = outside();
    const guard = new StoreGuard(openStore(name), kept);
    await startWalk(guard);
    await guard.check();
    kept.kept = null;
    await emptied();
    await guard.check();
    expect(Object.keys(guard.view().lost!.walks).length).toBe(1);
  });

  test("two tabs that save in turn raise no alarm", async () => {
    const kept = outside();
    const [one, two] = [new StoreGuard(openStore(name), kept), new StoreGuard(openStore(name), kept)];
    const recorder = await startWalk(one);
    for (const key of ["pin", "cables", "air"]) {
      await Promise.all([recorder.mark(key, "good"), one.check(), two.check()]);
    }
    await Promise.all([one.check(), two.check()]);
    expect([one.view().lost, two.view().lost]).toEqual([null, null]);
    expect(Object.values(readMarks(kept.kept)!.walks)[0]!.length).toBe(4);
  });

  test("a full store is told, also while it can be read, until a write works again", async () => {
    const guard = new StoreGuard(openStore(name), outside());
    await guard.check();
    const told: (StoreTrouble | null)[] = [];
    guard.subscribe(() => told.push(guard.view().trouble));
    const full = () => Promise.reject(new DOMException("", "QuotaExceededError"));
    await expect(guard.store("readwrite", full)).rejects.toThrow();
    await guard.check();
    expect(told).toEqual(["full"]);
    await guard.store("readwrite", (shelf) => void shelf.put(1, ["x"]));
    expect(told).toEqual(["full", null]);
  });

  test("a refused store is told, and another tab's write is no trouble", async () => {
    const refusing = new StoreGuard(() => Promise.reject(new DOMException("", "SecurityError")), outside());
    await refusing.check();
    expect(refusing.view()).toEqual({ trouble: "refused", lost: null });
    const guard = new StoreGuard(openStore(name), outside());
    await expect(guard.store("readwrite", () => Promise.reject(new MovedOn()))).rejects.toThrow();
    expect(guard.view().trouble).toBeNull();
  });
});
