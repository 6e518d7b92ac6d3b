import { expect, test, vi } from "vitest";
import { installSituation } from "@/lib/client/install";
import { askToKeep, keepingState } from "@/lib/client/persistence";
import { bytesText } from "@/lib/domain/messages/settings";

test.each([
  [true, true, true, "installed"],
  [true, false, false, "installed"],
  [false, true, false, "own-store"],
  [false, true, true, "own-store"],
  [false, false, true, "offered"],
  [false, false, false, "plain"],
])("standalone %s, home screen %s, offered %s: %s", (standalone, homeScreen, offered, situation) => {
  expect(installSituation({ standalone, homeScreen, offered })).toBe(situation);
});

const refuse = () => Promise.reject(new TypeError("insecure"));

test.each([
  ["no such thing", undefined, { promised: null, usedBytes: null, roomBytes: null }],
  [
    "all of it",
    { persisted: async () => true, estimate: async () => ({ usage: 5, quota: 9 }) },
    { promised: true, usedBytes: 5, roomBytes: 9 },
  ],
  [
    "only refusals",
    { persisted: refuse, estimate: refuse },
    { promised: null, usedBytes: null, roomBytes: null },
  ],
  ["an empty estimate", { estimate: async () => ({}) }, { promised: null, usedBytes: null, roomBytes: null }],
])("how a browser keeps things, with %s", async (_, storage, state) => {
  expect(await keepingState(storage)).toEqual(state);
});

test("the browser is asked once and not again after it promised", async () => {
  const persist = vi.fn(async () => true);
  expect(await askToKeep({ persist, persisted: async () => false })).toBe(true);
  expect(await askToKeep({ persist, persisted: async () => true })).toBe(true);
  expect(persist).toHaveBeenCalledTimes(1);
  expect(await askToKeep({ persist: async () => false })).toBe(false);
  expect(await askToKeep({ persist: refuse })).toBeNull();
  expect(await askToKeep(undefined)).toBeNull();
});

test.each([
  [0, "1 kB"],
  [123_456, "123 kB"],
  [3_000_000, "3 MB"],
  [3_240_000, "3.2 MB"],
  [52_400_000, "52 MB"],
  [5_230_000_000, "5.2 GB"],
])("%d bytes read %s", (bytes, text) => {
  expect(bytesText(bytes)).toBe(text);
});
