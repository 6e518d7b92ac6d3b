import "fake-indexeddb/auto";
import { set } from "idb-keyval";
import { afterEach, beforeEach, describe, expect, it, test, vi } from "vitest";
import { DraftKeeper, dropDraft, keptDraft, keptDrafts, type KeptDraft } from "@/lib/client/sheet-draft";
import { openSheet, type Ground } from "@/lib/client/sheet-opening";
import { keepSheetPhoto, sendSheetPhotos, sheetPhotoBytes, sheetPhotoSaved } from "@/lib/client/sheet-photo";
import { openStore } from "@/lib/client/store";
import type { Role } from "@/lib/domain/member";
import { Problem, problemDocument } from "@/lib/domain/problem";
import type { RigReading } from "@/lib/domain/rigs";
import { document, rig, revision } from "../support/rig";

let stores = 0;
const freshStore = () => openStore(`sheets-${(stores += 1)}`);
const draft = (over: Partial<KeptDraft> = {}): KeptDraft => ({
  rig: rig.id,
  base: revision,
  baseSheet: null,
  draft: { name: "Lot 7" },
  member: "m",
  at: "2026-05-01T08:00:00.000Z",
  ...over,
});

describe("keeping", () => {
  beforeEach(() => void vi.useFakeTimers({ toFake: ["setTimeout", "clearTimeout"] }));
  afterEach(() => void vi.useRealTimers());

  it("writes once, a moment after the last change, what is there then", async () => {
    const store = freshStore();
    const keeper = new DraftKeeper(store);
    let name = "L";
    const changed = () => keeper.changed(() => draft({ draft: { name } }));
    changed();
    vi.advanceTimersByTime(299);
    name = "Lot 7";
    changed();
    vi.advanceTimersByTime(299);
    expect(keeper.view().state).toBe("waiting");
    expect(await keptDraft(store, rig.id)).toBeNull();
    vi.advanceTimersByTime(1);
    await keeper.flush();
    expect((await keptDraft(store, rig.id))?.draft).toEqual({ name: "Lot 7" });
    expect(keeper.view()).toEqual({ state: "kept", at: "2026-05-01T08:00:00.000Z" });
  });

  it("writes at once when the page is left", async () => {
    const store = freshStore();
    const keeper = new DraftKeeper(store);
    keeper.changed(() => draft());
    await keeper.flush();
    expect(await keptDraft(store, rig.id)).toEqual(draft());
  });

  it("says when it could not, and so until it could", async () => {
    let broken = true;
    const store = freshStore();
    const keeper = new DraftKeeper((mode, work) =>
      broken ? Promise.reject(new Error("full")) : store(mode, work),
    );
    keeper.changed(() => draft());
    await keeper.flush();
    expect(keeper.view().state).toBe("failed");
    keeper.changed(() => draft());
    expect(keeper.view().state).toBe("failed");
    broken = false;
    await keeper.flush();
    expect(keeper.view().state).toBe("kept");
  });

  it("writes nothing any more once the draft is gone", async () => {
    const store = freshStore();
    const keeper = new DraftKeeper(store);
    keeper.changed(() => draft());
    keeper.stop();
    vi.advanceTimersByTime(1000);
    await keeper.flush();
    expect(await keptDraft(store, rig.id)).toBeNull();
  });

  it("lists what was begun here, the latest first", async () => {
    const store = freshStore();
    for (const [id, at] of [
      ["a", "2026-05-01"],
      ["b", "2026-05-03"],
      ["c", "2026-05-02"],
    ] as const) {
      const keeper = new DraftKeeper(store);
      keeper.changed(() => draft({ rig: id, at }));
      await keeper.flush();
    }
    await dropDraft(store, "c");
    expect((await keptDrafts(store)).map((each) => each.rig)).toEqual(["b", "a"]);
  });
});

describe("opening", () => {
  const organisation = { id: "00000000-0000-4000-8000-0000000000f0", name: "a shop", kind: "shop" as const };
  const member = (role: Role, id = "m") => ({ id, name: "Ada", email: "a@test.example", role, organisation });
  const unreached = async () => ({ kind: "unreached" as const });
  const sheet = { v: 1 as const, name: "Lot 7", coach: { jacks: true } };
  const reading = (over: Partial<RigReading> = {}) =>
    ({
      id: rig.id,
      name: "Lot 7",
      mayWrite: true,
      revision: { digest: "d".repeat(64), number: 2 },
      document: { ...document, sheet },
      ...over,
    }) as RigReading;
  const ground = (store: Ground["store"], over: Partial<Ground> = {}): Ground => ({
    store,
    nowIso: () => "2026-05-02T08:00:00.000Z",
    who: async () => ({ kind: "answered", value: { member: member("installer") } }),
    rig: async () => ({ kind: "answered", value: reading() }),
    ...over,
  });
  const bundle = (role: Role = "manager") => ({
    generatedAt: "2026-05-01T08:00:00.000Z",
    member: member(role),
    rigs: [{ ...rig, revision: { ...rig.revision, document: { ...document, sheet } } }],
    keys: [],
  });

  it("begins with what the server has", async () => {
    const opened = await openSheet(rig.id, false, ground(freshStore()));
    expect(opened).toEqual({
      kind: "open",
      draft: "none",
      reached: true,
      sheetless: false,
      start: {
        rig: rig.id,
        base: "d".repeat(64),
        baseSheet: sheet,
        draft: sheet,
        member: "m",
        at: "2026-05-02T08:00:00.000Z",
      },
    });
  });

  it("begins with the draft where there is one", async () => {
    const store = freshStore();
    await set(["draft", rig.id], draft(), store);
    expect(await openSheet(rig.id, false, ground(store))).toMatchObject({ draft: "mine", start: draft() });
    await set(["draft", rig.id], draft({ member: "someone else" }), store);
    expect(await openSheet(rig.id, false, ground(store))).toMatchObject({ draft: "foreign" });
  });

  it("begins with what the field wing keeps where the server cannot be reached", async () => {
    const store = freshStore();
    await set(["bundle"], bundle(), store);
    const away = ground(store, { who: unreached, rig: unreached });
    expect(await openSheet(rig.id, false, away)).toMatchObject({
      kind: "open",
      reached: false,
      start: { base: revision, draft: sheet },
    });
  });

  it("does not wait longer for the server than it is patient", async () => {
    const store = freshStore();
    await set(["bundle"], bundle(), store);
    const silent = () => new Promise<never>(() => {});
    const slow = ground(store, { who: silent, rig: silent, patienceMs: 5 });
    expect(await openSheet(rig.id, false, slow)).toMatchObject({ kind: "open", reached: false });
  });

  it("begins empty for a new rig, with no network too", async () => {
    const opened = await openSheet(rig.id, true, ground(freshStore(), { who: unreached }));
    expect(opened).toMatchObject({ kind: "open", reached: false, start: { base: null, draft: { v: 1 } } });
  });

  it("says so where a list has no sheet", async () => {
    const old = ground(freshStore(), {
      rig: async () => ({
        kind: "answered",
        value: reading({ document: { ...document, sheet: { old: 1 } } }),
      }),
    });
    expect(await openSheet(rig.id, false, old)).toMatchObject({
      sheetless: true,
      start: { base: "d".repeat(64), baseSheet: null, draft: { v: 1, name: "Lot 7" } },
    });
  });

  test.each<[string, Partial<Ground>, unknown]>([
    [
      "a role that may not",
      { who: async () => ({ kind: "answered", value: { member: member("driver") } }) },
      { kind: "may-not", why: "role" },
    ],
    [
      "a rig that someone else keeps",
      { rig: async () => ({ kind: "answered", value: reading({ mayWrite: false }) }) },
      { kind: "may-not", why: "keeper" },
    ],
    [
      "no such rig",
      {
        rig: async () => ({
          kind: "refused",
          problem: problemDocument(new Problem("not-found")),
          retryAfterS: null,
        }),
      },
      { kind: "gone" },
    ],
    ["a rig that is not on this phone", { rig: unreached }, { kind: "not-here" }],
  ])("does not open for %s", async (_, over, expected) => {
    expect(await openSheet(rig.id, false, ground(freshStore(), over))).toEqual(expected);
  });

  it("knows by the bundle who may not, with no network", async () => {
    const store = freshStore();
    await set(["bundle"], bundle("driver"), store);
    const away = ground(store, { who: unreached, rig: unreached });
    expect(await openSheet(rig.id, false, away)).toEqual({ kind: "may-not", why: "role" });
  });
});

describe("the manual's photograph", () => {
  const bytes = new TextEncoder().encode("a page").buffer as ArrayBuffer;
  const answers = (...replies: unknown[]) => {
    const asked: string[] = [];
    const fetch = async (path: string, init: RequestInit) => {
      asked.push(`${init.method} ${path}`);
      return Response.json(replies.shift());
    };
    return { asked, fetch };
  };
  const put = { url: "/put", method: "PUT", headers: {}, expiresAt: "2026-05-01T08:00:00.000Z" };

  it("waits for its sheet, goes then, and goes once", async () => {
    const store = freshStore();
    const photo = await keepSheetPhoto(store, { bytes, mime: "image/jpeg" });
    expect(photo).toMatchObject({ bytes: 6, mime: "image/jpeg" });
    const { asked, fetch } = answers({ put }, {}, { have: true });
    await sendSheetPhotos(store, fetch);
    expect(asked).toEqual([]);
    await sheetPhotoSaved(store, photo.sha256);
    await sendSheetPhotos(store, fetch);
    const ask = `POST /api/photos/${photo.sha256}`;
    expect(asked).toEqual([ask, "PUT /put", ask]);
    await sendSheetPhotos(store, fetch);
    expect(asked).toHaveLength(3);
    expect(await sheetPhotoBytes(store, photo.sha256)).toEqual(bytes);
  });

  it("stays to be sent where it did not arrive", async () => {
    const store = freshStore();
    const { sha256 } = await keepSheetPhoto(store, { bytes, mime: "image/jpeg" });
    await sheetPhotoSaved(store, sha256);
    await sendSheetPhotos(store, () => Promise.reject(new Error("no network")));
    const { asked, fetch } = answers({ have: true });
    await sendSheetPhotos(store, fetch);
    expect(asked).toHaveLength(1);
  });
});
