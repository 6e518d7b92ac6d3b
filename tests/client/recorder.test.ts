import "fake-indexeddb/auto";
import { describe, expect, test } from "vitest";
import { deviceFor } from "@/lib/client/device";
import { Recorder, type Ground } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { MovedOn, WalkShelf } from "@/lib/client/walk-shelf";
import { chainFault, type ClockReading, type Head } from "@/lib/domain/chain";
import { readEntry, type Link } from "@/lib/domain/entry";
import { sealMessage, verifies } from "@/lib/domain/signature";
import { revision, rig } from "../support/rig";

const member = "00000000-0000-4000-8000-0000000000ff";
const hookUp = { member, purpose: "hook-up", depth: "full" } as const;

let stores = 0;
async function ground(now: ClockReading): Promise<Ground> {
  const store = openStore(`recorder-${(stores += 1)}`);
  return { shelf: new WalkShelf(store), clock: () => now, device: await deviceFor(store, member) };
}

function clock(): ClockReading {
  return { wallMs: Date.UTC(2026, 4, 1, 8), monoMs: 1_000.4, monoEpoch: "first load" };
}

/** Every link may follow the one before, by the rules that the server goes by. */
function expectChain(links: Link[]): void {
  let head: Head = { stored: 0, digest: null, closed: false, sealed: false };
  for (const link of links) {
    expect(readEntry(link.entry)).toEqual(link);
    expect(chainFault(head, link)).toBeNull();
    head = {
      stored: head.stored + 1,
      digest: link.digest,
      closed: link.entry.type === "close",
      sealed: false,
    };
  }
}

describe("a walk recorded on a phone", () => {
  test("is a chain from the revision to a signed close", async () => {
    const now = clock();
    const at = await ground(now);
    const recorder = await Recorder.open(at, rig, hookUp);
    for (const key of ["pin", "cables", "air", "jacket", "tires"]) {
      now.wallMs += 5_000;
      now.monoMs += 5_000;
      await recorder.mark(key, key === "air" ? "absent" : "good");
    }
    await recorder.close();
    await recorder.close();

    const { walk } = recorder.view();
    const links = await at.shelf.links(walk.id);
    expectChain(links);
    expect(links.map(({ entry }) => [entry.type, entry.elapsedMs])).toEqual([
      ["open", 0],
      ["mark", 5_000],
      ["mark", 10_000],
      ["mark", 15_000],
      ["mark", 20_000],
      ["mark", 25_000],
      ["close", 25_000],
    ]);
    expect(links[0]!.entry).toMatchObject({ prev: revision, at: "2026-05-01T08:00:00.000Z", monoMs: 1_000 });
    expect(links.at(-1)!.entry.body).toEqual({ verdict: "no-hold", marks: 5, faults: 0 });
    const { seal } = walk;
    expect(seal!.seal).toBe(links.at(-1)!.digest);
    expect(verifies(at.device.publicKey, seal!.alg, sealMessage(seal!.seal), seal!.signature)).toBe(true);
    expect(await at.shelf.walk(walk.id)).toEqual(walk);
  });

  test("keeps the order of marks that are asked for at once", async () => {
    const at = await ground(clock());
    const recorder = await Recorder.open(at, rig, hookUp);
    await Promise.all([recorder.mark("pin", "fault"), recorder.mark("cables", "good"), recorder.close()]);
    const links = await at.shelf.links(recorder.view().walk.id);
    expectChain(links);
    expect(links.map(({ entry }) => entry.body.check ?? entry.type)).toEqual([
      "open",
      "pin",
      "cables",
      "close",
    ]);
    expect(recorder.view().walk.verdict).toBe("hold");
  });

  test("time with the phone dead, and time before going on, is not walking time", async () => {
    const now = clock();
    const pass = (ms: number) => Object.assign(now, { wallMs: now.wallMs + ms, monoMs: now.monoMs + ms });
    const at = await ground(now);
    const before = await Recorder.open(at, rig, hookUp);
    pass(60_000);
    await before.mark("pin", "good");

    Object.assign(now, { wallMs: now.wallMs + 3_600_000, monoMs: 200, monoEpoch: "second load" });
    const after = (await Recorder.takeUp(at, before.view().walk.id))!;
    expect(after.view()).toMatchObject({
      replay: before.view().replay,
      interruption: { kind: "left", awayMs: 3_600_000 },
    });
    pass(4_000);
    expect(after.elapsedMs()).toBe(60_000);
    await after.resume(["pin"]);
    expect(after.view()).toMatchObject({ interruption: null, replay: { counts: { marks: 0 } } });
    pass(3_000);
    await after.mark("cables", "good");
    pass(2_000);
    expect(after.elapsedMs()).toBe(65_000);
    const links = await at.shelf.links(after.view().walk.id);
    expect(links.map(({ entry }) => [entry.type, entry.elapsedMs, entry.monoEpoch])).toEqual([
      ["open", 0, expect.any(String)],
      ["mark", 60_000, expect.any(String)],
      ["resume", 60_000, "second load"],
      ["mark", 63_000, "second load"],
    ]);
  });

  test("a pause stops the time until the walk is resumed", async () => {
    const now = clock();
    const pass = (ms: number) => Object.assign(now, { wallMs: now.wallMs + ms, monoMs: now.monoMs + ms });
    const recorder = await Recorder.open(await ground(now), rig, hookUp);
    pass(10_000);
    await recorder.pause();
    expect(recorder.view().interruption).toEqual({ kind: "paused", awayMs: 0 });
    pass(600_000);
    expect(recorder.elapsedMs()).toBe(10_000);
    await recorder.resume([]);
    pass(5_000);
    expect(recorder.elapsedMs()).toBe(15_000);
  });

  test("a clock that was set is recorded before the mark", async () => {
    const now = clock();
    const at = await ground(now);
    const recorder = await Recorder.open(at, rig, hookUp);
    Object.assign(now, { wallMs: now.wallMs - 3_590_000, monoMs: now.monoMs + 10_000 });
    await recorder.mark("pin", "good");
    const links = await at.shelf.links(recorder.view().walk.id);
    expect(links.map(({ entry }) => [entry.type, entry.body])).toEqual([
      ["open", expect.anything()],
      ["disturbed", { wallMs: -3_590_000, monoMs: 10_000 }],
      ["mark", { check: "pin", outcome: "good" }],
    ]);
    expect(recorder.view().replay.elapsedMs).toBe(10_000);
  });

  test("a walk from paper keeps no time", async () => {
    const now = clock();
    const at = await ground(now);
    const recorder = await Recorder.open(at, rig, { ...hookUp, source: "paper" });
    Object.assign(now, { wallMs: now.wallMs + 60_000, monoMs: now.monoMs + 60_000 });
    await recorder.mark("pin", "good");
    expect(recorder.elapsedMs()).toBe(0);
    expect(recorder.view().replay).toMatchObject({ elapsedMs: 0, open: { source: "paper" } });
  });

  test("a second writer cannot write over the first", async () => {
    const at = await ground(clock());
    const first = await Recorder.open(at, rig, hookUp);
    const second = (await Recorder.takeUp(at, first.view().walk.id))!;
    await first.mark("pin", "fault");
    await expect(second.mark("pin", "good")).rejects.toThrow(MovedOn);
    expect(second.view().replay.marks.size).toBe(0);
    const marks = (await at.shelf.links(first.view().walk.id)).map(({ entry }) => entry.body.outcome);
    expect(marks).toEqual([undefined, "fault"]);
  });

  test("a write that failed leaves nothing half done and does not hold up the next", async () => {
    const at = await ground(clock());
    const { store } = at.shelf;
    let full = false;
    const shelf = new WalkShelf((mode, work) =>
      store(mode, async (shelf) => {
        const result = await work(shelf);
        if (full && mode === "readwrite") throw new DOMException("", "QuotaExceededError");
        return result;
      }),
    );
    const recorder = await Recorder.open({ ...at, shelf }, rig, hookUp);
    full = true;
    await expect(recorder.mark("pin", "good")).rejects.toMatchObject({ name: "QuotaExceededError" });
    expect(await shelf.links(recorder.view().walk.id)).toHaveLength(1);
    full = false;
    await recorder.mark("pin", "fault");
    const { walk, replay } = recorder.view();
    expect(walk.length).toBe(2);
    expect(replay.marks.get("pin")?.outcome).toBe("fault");
    expectChain(await shelf.links(walk.id));
  });

  test("more than ten entries come back in order", async () => {
    const at = await ground(clock());
    const recorder = await Recorder.open(at, rig, hookUp);
    for (let i = 0; i < 12; i += 1)
      await recorder.mark("pin", i % 2 ? "good" : "fault", { because: "mis-tap" });
    const { id } = recorder.view().walk;
    expect((await at.shelf.links(id)).map(({ entry }) => entry.seq)).toEqual(
      Array.from({ length: 13 }, (_, i) => i),
    );
    expect((await at.shelf.links(id, 9, 2)).map(({ entry }) => entry.seq)).toEqual([9, 10]);
  });
});
