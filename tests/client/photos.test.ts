import "fake-indexeddb/auto";
import { createHash, randomBytes } from "node:crypto";
import { beforeEach, describe, expect, test, vi } from "vitest";
import { deviceFor } from "@/lib/client/device";
import { deliver, deliverable, photoCounts } from "@/lib/client/photo-delivery";
import { PhotoSending } from "@/lib/client/photo-sending";
import { PhotoShelf, type KeptPhoto } from "@/lib/client/photo-shelf";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { MovedOn, WalkShelf, type KeptWalk } from "@/lib/client/walk-shelf";
import { Problem, problemDocument, type ProblemCode } from "@/lib/domain/problem";
import { rig } from "../support/rig";

const member = "00000000-0000-4000-8000-0000000000ff";
const hookUp = { member, purpose: "hook-up", depth: "full" } as const;

function picture(size = 3_000) {
  const bytes = new Uint8Array(randomBytes(size)).buffer;
  const sha256 = createHash("sha256").update(new Uint8Array(bytes)).digest("hex");
  return { bytes, mime: "image/jpeg" as const, sha256 };
}

let stores = 0;
async function phone() {
  const store = openStore(`photos-${(stores += 1)}`);
  const ground = {
    shelf: new WalkShelf(store),
    clock: () => ({ wallMs: 1_000, monoMs: 1_000, monoEpoch: "test" }),
    device: await deviceFor(store, member),
  };
  const recorder = await Recorder.open(ground, rig, hookUp);
  return { store, ground, recorder, shelf: ground.shelf, photos: new PhotoShelf(store) };
}

const keys = (store: ReturnType<typeof openStore>, prefix: string) =>
  store("readonly", (shelf) => {
    const asked = shelf.getAllKeys(IDBKeyRange.bound([prefix], [prefix, []]));
    return new Promise<IDBValidKey[]>((done) => (asked.onsuccess = () => done(asked.result)));
  });

describe("a photograph kept on a phone", () => {
  test("stands beside its entry, by its digest, and counts nothing in the verdict", async () => {
    const { recorder, shelf, photos } = await phone();
    const one = picture();
    await recorder.mark("pin", "fault");
    await recorder.photo("pin", one);
    await recorder.photo(undefined, one);
    const { walk, replay } = recorder.view();
    const links = await shelf.links(walk.id);
    expect(links.map(({ entry }) => [entry.type, entry.body]).slice(2)).toEqual([
      ["photo", { check: "pin", sha256: one.sha256, bytes: 3_000, mime: "image/jpeg" }],
      ["photo", { sha256: one.sha256, bytes: 3_000, mime: "image/jpeg" }],
    ]);
    expect(replay.counts).toEqual({ marks: 1, faults: 1 });
    expect(replay.photos).toHaveLength(2);
    expect(await photos.all()).toEqual([
      { walk: walk.id, seq: 2, check: "pin", sha256: one.sha256, mime: "image/jpeg", state: "kept" },
      { walk: walk.id, seq: 3, check: null, sha256: one.sha256, mime: "image/jpeg", state: "kept" },
    ]);
    expect(new Uint8Array((await photos.bytes(one.sha256))!)).toEqual(new Uint8Array(one.bytes));
  });

  test("twice keeps one copy", async () => {
    const { recorder, store } = await phone();
    const one = picture();
    for (const check of ["pin", "cables", undefined]) await recorder.photo(check, one);
    expect(await keys(store, "photo")).toEqual([["photo", one.sha256]]);
    expect(await keys(store, "photo-of")).toHaveLength(3);
  });

  test("is all or nothing with its entry: another tab moved on, so neither is kept", async () => {
    const { recorder, ground, store } = await phone();
    const other = (await Recorder.takeUp(ground, recorder.view().walk.id))!;
    await other.mark("pin", "good");
    await expect(recorder.photo("pin", picture())).rejects.toThrow(MovedOn);
    expect(await keys(store, "photo")).toEqual([]);
    expect(await keys(store, "photo-of")).toEqual([]);
  });

  test("is all or nothing with its entry: bytes that cannot be stored leave no entry", async () => {
    const { recorder, shelf, store } = await phone();
    const full = new DOMException("", "QuotaExceededError");
    const put = vi.spyOn(IDBObjectStore.prototype, "put").mockImplementation(() => {
      throw full;
    });
    await expect(recorder.photo("pin", picture())).rejects.toBe(full);
    put.mockRestore();
    expect(await shelf.links(recorder.view().walk.id)).toHaveLength(1);
    expect(await keys(store, "photo-of")).toEqual([]);
    await recorder.mark("pin", "good");
    await recorder.close();
    expect(recorder.view().walk.seal).not.toBeNull();
  });

  test("comes too late for a walk that is closed", async () => {
    const { recorder, store } = await phone();
    await Promise.all([recorder.close(), expect(recorder.photo("pin", picture())).rejects.toThrow("closed")]);
    expect(await keys(store, "photo")).toEqual([]);
    expect(recorder.view().walk.length).toBe(2);
  });
});

const kept = (over: Partial<KeptPhoto> = {}): KeptPhoto => ({
  ...{ walk: "w", seq: 3, check: null, sha256: "ab", mime: "image/jpeg", state: "kept" },
  ...over,
});

describe("which may go", () => {
  const walk = (over: object) =>
    ({ id: "w", seal: {}, acknowledged: 5, length: 5, refused: null, ...over }) as KeptWalk;
  test.each<[string, Partial<KeptPhoto>, object | null, boolean]>([
    ["of a closed walk that the server stores", {}, {}, true],
    ["the server stores only part of it so far", {}, { length: 6 }, false],
    ["refused, and its entry is the last one stored", { seq: 4 }, { length: 9, refused: "fork" }, true],
    ["refused, and its entry is the first one not stored", { seq: 5 }, { length: 9, refused: "fork" }, false],
    ["the walk is still being made", {}, { seal: null }, false],
    ["the server stores none of it", {}, { acknowledged: 0 }, false],
    ["the server took none of it", {}, { acknowledged: 0, refused: "unknown-rig" }, false],
    ["it is there already", { state: "sent" }, {}, false],
    ["its bytes are gone", { state: "lost" }, {}, false],
    ["of a walk of someone else's", {}, null, false],
  ])("%s", (_, photo, about, goes) => {
    expect(deliverable([kept(photo)], about ? [walk(about)] : [])).toHaveLength(goes ? 1 : 0);
  });

  test("counted by state", () => {
    const states = ["kept", "sent", "kept", "lost"] as const;
    expect(photoCounts(states.map((state) => kept({ state })))).toEqual({ kept: 2, sent: 1, lost: 1 });
    expect(photoCounts([])).toEqual({ kept: 0, sent: 0, lost: 0 });
  });
});

const refuse = (code: ProblemCode) =>
  Response.json(problemDocument(new Problem(code)), { status: new Problem(code).status });
const have = () => Response.json({ have: true });
const place = (sha256: string) => () =>
  Response.json({
    put: {
      url: `/api/photos/${sha256}?signed`,
      method: "PUT",
      headers: { "content-type": "image/jpeg" },
      expiresAt: "2026-05-01T08:00:00.000Z",
    },
  });
const gone = () => Promise.reject(new TypeError("Failed to fetch"));
const empty = () => new Response(null, { status: 204 });

describe("one photograph is delivered", () => {
  async function given(...answers: (() => Response | Promise<Response>)[]) {
    const { recorder, photos, store } = await phone();
    const one = picture();
    await recorder.photo("pin", one);
    const asked: string[] = [];
    const bodies: unknown[] = [];
    const fetch = async (path: string, { method, body }: RequestInit) => {
      asked.push(`${method} ${path.replace(one.sha256, "…")}`);
      bodies.push(body);
      return answers.shift()!();
    };
    const go = async () => deliver(photos, (await photos.all())[0]!, fetch);
    const state = async () => (await photos.all())[0]!.state;
    return { go, state, asked, bodies, one, store, answers };
  }

  test("ask, send, ask again: only the server's word makes it sent", async () => {
    const { go, state, asked, bodies, one, answers } = await given();
    answers.push(place(one.sha256), empty, have);
    expect(await go()).toMatchObject({ kind: "answered" });
    expect(asked).toEqual(["POST /api/photos/…", "PUT /api/photos/…?signed", "POST /api/photos/…"]);
    expect(new Uint8Array(bodies[1] as ArrayBuffer)).toEqual(new Uint8Array(one.bytes));
    expect(await state()).toBe("sent");
  });

  test("one that the server has is not sent again", async () => {
    const { go, state, asked } = await given(have);
    await go();
    expect(asked).toEqual(["POST /api/photos/…"]);
    expect(await state()).toBe("sent");
  });

  test.each<[string, (sha256: string) => (() => Response | Promise<Response>)[], string]>([
    ["no answer", () => [gone], "unreached"],
    ["a sign-in portal's page", () => [() => new Response("<!doctype html>")], "unreached"],
    ["signed out", () => [() => refuse("signed-out")], "refused"],
    ["its entry is not known", () => [() => refuse("not-found")], "refused"],
    ["cut off while it goes", (sha256) => [place(sha256), gone], "unreached"],
    ["the link ran out", (sha256) => [place(sha256), () => refuse("bad-link")], "unreached"],
    ["sent, but the server has it not", (sha256) => [place(sha256), empty, place(sha256)], "unreached"],
    ["sent, and no answer after that", (sha256) => [place(sha256), empty, gone], "unreached"],
  ])("%s: it stays kept", async (_, answersFor, kind) => {
    const { go, state, one, answers } = await given();
    answers.push(...answersFor(one.sha256));
    expect(await go()).toMatchObject({ kind });
    expect(answers).toEqual([]);
    expect(await state()).toBe("kept");
  });

  test.each([
    ["gone", undefined],
    ["changed", new ArrayBuffer(3_000)],
  ])("bytes that are %s: nobody is asked, and it is lost", async (_, found) => {
    const { go, state, asked, one, store } = await given();
    const key = ["photo", one.sha256];
    await store("readwrite", (shelf) => void (found ? shelf.put(found, key) : shelf.delete(key)));
    expect(await go()).toMatchObject({ kind: "answered" });
    expect(asked).toEqual([]);
    expect(await state()).toBe("lost");
  });
});

describe("when photographs go", () => {
  beforeEach(() => {
    vi.useFakeTimers({ toFake: ["setTimeout", "clearTimeout", "Date"], now: 0 });
    return () => void vi.useRealTimers();
  });

  async function pass(ms: number): Promise<void> {
    for (let left = ms; left > 0; left -= 250) {
      await vi.advanceTimersByTimeAsync(Math.min(250, left));
      for (let turn = 0; turn < 30; turn += 1) await new Promise((resolve) => setImmediate(resolve));
    }
  }

  /** A sending over a shelf with photographs of these names, and a server that answers each as told. */
  async function sending(names: string[], reply: (name: string) => Response | Promise<Response>) {
    const { recorder, photos } = await phone();
    const byDigest = new Map<string, string>();
    for (const name of names) {
      const one = picture();
      byDigest.set(one.sha256, name);
      await recorder.photo(undefined, one);
    }
    /** When each was asked for, counted from the first: what the store takes is no simulated time. */
    const asked: [number, string][] = [];
    let firstAt: number | null = null;
    let doubts = 0;
    const waiting = async () => (await photos.all()).filter(({ state }) => state === "kept");
    const tried: PhotoSending = new PhotoSending({
      shelf: photos,
      nowMs: () => Date.now(),
      spread: 1,
      fetch: async (path) => {
        const name = byDigest.get(path.slice("/api/photos/".length))!;
        firstAt ??= Date.now();
        asked.push([Date.now() - firstAt, name]);
        return reply(name);
      },
      alone: async (work) => {
        await work();
        return true;
      },
      changed: async () => tried.plan(await waiting()),
      doubted: () => (doubts += 1),
    });
    tried.plan(await waiting());
    return { tried, asked, waiting, doubts: () => doubts };
  }

  test("at once, one after the other, and then no more", async () => {
    const { asked, waiting } = await sending(["a", "b", "c"], have);
    await pass(120_000);
    expect(asked).toEqual([
      [0, "a"],
      [0, "b"],
      [0, "c"],
    ]);
    expect(await waiting()).toEqual([]);
  });

  test("with the server gone, ever more slowly, and one at a time", async () => {
    let there = false;
    const { asked, waiting } = await sending(["a", "b"], () => (there ? have() : gone()));
    await pass(15_000);
    expect(asked).toEqual([
      [0, "a"],
      [2_000, "b"],
      [6_000, "a"],
      [14_000, "b"],
    ]);
    there = true;
    await pass(60_000);
    expect(await waiting()).toEqual([]);
  });

  test("one that never gets through does not hold up the others", async () => {
    const { waiting } = await sending(["bad", "b", "c"], (name) => (name === "bad" ? gone() : have()));
    await pass(10_000);
    expect(await waiting()).toHaveLength(1);
  });

  test("what stands against one does not stand against the next, and who is signed in is asked", async () => {
    const { asked, waiting, doubts } = await sending(["bad", "b"], (name) =>
      name === "bad" ? refuse("not-found") : have(),
    );
    await pass(1_000);
    expect(asked.map(([, name]) => name)).toEqual(["bad", "b"]);
    expect(await waiting()).toHaveLength(1);
    expect(doubts()).toBe(1);
  });

  test("signed out: nothing more is tried until something stirs", async () => {
    let signedIn = false;
    const { tried, asked, waiting } = await sending(["a", "b"], () =>
      signedIn ? have() : refuse("signed-out"),
    );
    await pass(120_000);
    expect(asked).toHaveLength(1);
    signedIn = true;
    tried.stir();
    tried.plan(await waiting());
    await pass(1_000);
    expect(await waiting()).toEqual([]);
  });
});
