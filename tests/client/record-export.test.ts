import "fake-indexeddb/auto";
import { expect, test, vi } from "vitest";
import { deviceFor } from "@/lib/client/device";
import { exportAll, exportHeld, exportWalk, handOver } from "@/lib/client/record-export";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { WalkShelf } from "@/lib/client/walk-shelf";
import { digestOf, sha256Hex } from "@/lib/domain/digest";
import { sealMessage, verifies } from "@/lib/domain/signature";
import { revision, rig } from "../support/rig";

const member = "00000000-0000-4000-8000-0000000000ff";
let stores = 0;

async function phone() {
  const shelf = new WalkShelf(openStore(`export-${(stores += 1)}`));
  const now = { wallMs: Date.UTC(2026, 4, 1, 12), monoMs: 0, monoEpoch: "e" };
  const ground = { shelf, clock: () => now, device: await deviceFor(shelf.store, member) };
  const walk = async (purpose: "hook-up" | "unhook", close: boolean) => {
    now.wallMs += 60_000;
    const recorder = await Recorder.open(ground, rig, { member, purpose, depth: "full" });
    await recorder.mark("pin", "good");
    if (close) await recorder.close();
    return recorder;
  };
  return { shelf, walk };
}

type Line = Record<string, unknown> & { prev?: string };
const linesOf = (text: string) => text.split("\n").slice(0, -1);
const parsed = (text: string) => linesOf(text).map((line) => JSON.parse(line) as Line);

/** Each line follows from the one before, by the file alone. */
function expectRecord(text: string): void {
  const [first, ...rest] = linesOf(text);
  let prev = digestOf((JSON.parse(first!) as { revision: unknown }).revision);
  expect(prev).toBe(revision);
  for (const line of rest) {
    const entry = JSON.parse(line) as Line;
    if (!("prev" in entry)) continue;
    expect(entry.prev).toBe(prev);
    prev = sha256Hex(line);
  }
}

test("an open walk: revision and entries, no seal", async () => {
  const { shelf, walk } = await phone();
  const recorder = await walk("hook-up", false);
  const file = (await exportWalk(shelf, recorder.view().walk))!;
  expect(file.name).toMatch(/^hookfast-hook-up-2026-05-01\.ndjson$/);
  expect(parsed(file.text).map((line) => line.type ?? Object.keys(line)[0])).toEqual([
    "revision",
    "open",
    "mark",
  ]);
  expectRecord(file.text);
  expect(exportHeld(recorder.held())).toEqual(file);
});

test("closed and not received: the seal line has the signature and key, and no receipt", async () => {
  const { shelf, walk } = await phone();
  const recorder = await walk("hook-up", true);
  const { text } = (await exportWalk(shelf, recorder.view().walk))!;
  expectRecord(text);
  const last = parsed(text).at(-1)!;
  expect(Object.keys(last).sort()).toEqual(["alg", "device", "seal", "signature"]);
  expect(last.seal).toBe(sha256Hex(linesOf(text).at(-2)!));
  expect(
    verifies(
      last.device as never,
      last.alg as never,
      sealMessage(last.seal as string),
      last.signature as string,
    ),
  ).toBe(true);
});

test("received: the receipt stands in it as it came", async () => {
  const { shelf, walk } = await phone();
  const recorder = await walk("hook-up", true);
  const receipt = { v: 1, walk: recorder.view().walk.id } as never;
  const kept = (await shelf.amend(recorder.view().walk.id, () => ({ receipt })))!;
  expect(parsed((await exportWalk(shelf, kept))!.text).at(-1)!.receipt).toEqual(receipt);
});

test("a phone that lost the key says nothing of a device", async () => {
  const { shelf, walk } = await phone();
  const recorder = await walk("hook-up", true);
  await shelf.store("readwrite", (kept) => void kept.delete(["device", member]));
  const lost = parsed((await exportWalk(shelf, recorder.view().walk))!.text).at(-1)!;
  await deviceFor(shelf.store, member);
  const another = parsed((await exportWalk(shelf, recorder.view().walk))!.text).at(-1)!;
  expect(["device" in lost, "device" in another]).toEqual([false, false]);
});

test("everything: one record after the other, oldest first, each by itself a record", async () => {
  const { shelf, walk } = await phone();
  expect(await exportAll(shelf, 0)).toBeNull();
  const walks = [await walk("hook-up", true), await walk("unhook", false)];
  const { name, text } = (await exportAll(shelf, Date.UTC(2026, 4, 2, 12)))!;
  expect(name).toBe("hookfast-all-2026-05-02.ndjson");
  const records = text.split(/^(?=\{"revision")/m);
  expect(records).toEqual(walks.map((each) => exportHeld(each.held()).text));
});

test("a walk whose list is not here is no file", async () => {
  const { shelf, walk } = await phone();
  const recorder = await walk("hook-up", false);
  await shelf.store("readwrite", (kept) => void kept.delete(["revision", revision]));
  expect(await exportWalk(shelf, recorder.view().walk)).toBeNull();
});

test.each([
  ["takes the file", true, null, "shared", 0],
  ["takes it, and the person turns it away", true, "AbortError", "dismissed", 0],
  ["takes it and then fails", true, "NotAllowedError", "downloaded", 1],
  ["does not take such files", false, null, "downloaded", 1],
])("a share sheet that %s", async (_, takes, failure, outcome, downloads) => {
  const click = vi.fn();
  const share = vi.fn(async () => {
    if (failure) throw new DOMException("", failure);
  });
  vi.stubGlobal("navigator", { canShare: () => takes, share });
  vi.stubGlobal("document", { createElement: () => ({ click }) });
  vi.useFakeTimers();
  expect(await handOver({ name: "a.ndjson", text: "{}\n" })).toBe(outcome);
  expect(click).toHaveBeenCalledTimes(downloads);
  vi.runAllTimers();
  vi.useRealTimers();
  vi.unstubAllGlobals();
});
