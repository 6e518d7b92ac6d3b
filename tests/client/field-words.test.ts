import { describe, expect, test } from "vitest";
import { addressOf, hrefOf } from "@/components/field/address";
import { lastWalkOf, openWalksOf, purposesFor } from "@/components/field/rig-state";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";

test.each([
  [{}, "/field"],
  [{ walk: "w" }, "/field?walk=w"],
  [{ walk: "w", at: "arm left&" }, "/field?walk=w&at=arm+left%26"],
])("an address and its path: %j", (address, href) => {
  expect(hrefOf(address)).toBe(href);
});

test("a query string reads back as the address it was made from", () => {
  const nowhere = { walk: null, at: null, paper: null, prompt: null, settings: null };
  for (const address of [
    {},
    { walk: "w", at: "arm left&" },
    { paper: "r" },
    { settings: "1" },
    { prompt: "lamps" },
  ]) {
    const { search } = new URL(hrefOf(address), "http://x");
    expect(addressOf(search)).toEqual({ ...nowhere, ...address });
  }
  expect(addressOf("?walk=&paper=")).toEqual(nowhere);
});

describe("a rig as this phone knows it", () => {
  const kept = (id: string, openedAt: string, over: Partial<KeptWalk> = {}) =>
    ({ id, rig: "r", purpose: "hook-up", openedAt, seal: {}, verdict: "hold", ...over }) as KeptWalk;
  const told = (id: string, at: string) => ({
    id,
    at,
    purpose: "unhook" as const,
    verdict: "no-hold" as const,
  });

  test.each<[string, ReturnType<typeof told> | null, KeptWalk[], string | null, boolean]>([
    ["none", null, [], null, false],
    ["told only", told("t", "2026-03-01"), [], "t", false],
    ["kept only", null, [kept("k", "2026-03-01")], "k", true],
    ["kept is newer", told("t", "2026-03-01"), [kept("k", "2026-03-02")], "k", true],
    ["told is newer", told("t", "2026-03-03"), [kept("k", "2026-03-02")], "t", false],
    ["the same walk", told("k", "2026-03-02"), [kept("k", "2026-03-02")], "k", true],
    [
      "open ones have no verdict yet",
      null,
      [kept("k", "2026-03-02", { verdict: null, seal: null })],
      null,
      false,
    ],
    ["another rig's walk", null, [kept("k", "2026-03-02", { rig: "other" })], null, false],
  ])("last walk: %s", (_, lastWalk, walks, id, isKept) => {
    const last = lastWalkOf({ id: "r", lastWalk }, walks);
    expect([last?.id ?? null, Boolean(last?.kept)]).toEqual([id, isKept]);
  });

  test("the walks that are open on it", () => {
    const open = kept("o", "2026-03-02", { seal: null, verdict: null });
    expect(openWalksOf("r", [open, kept("k", "2026-03-01")])).toEqual([open]);
  });

  test("each kind of organization has its walks, the usual one first", () => {
    expect(purposesFor("household")).toEqual(["hook-up", "re-check", "unhook"]);
    expect(purposesFor("shop")).toEqual(["hook-up", "re-check", "unhook", "delivery"]);
    expect(purposesFor("fleet")).toEqual(["yard-out", "yard-in", "hook-up", "re-check", "unhook"]);
  });
});

test("the verdict in one sentence", () => {
  const { sentence } = fieldWords.result;
  const record = "This is a record of what you saw, not a statement that the rig is fit for the road.";
  expect(sentence("no-hold", 0, 17, 17, 462_900)).toBe(
    `No hold marked. 17 of 17 looked at, 7 min 42 s. ${record}`,
  );
  expect(sentence("hold", 2, 16, 17, 42_000)).toBe(
    `Do not tow: two holds. 16 of 17 looked at, 42 s. ${record}`,
  );
  expect(sentence("unfinished", 0, 1, 17, 3_900_000)).toBe(
    `Unfinished. 1 of 17 looked at, 1 h 5 min. ${record}`,
  );
});

test("no sentence claims what a record cannot", () => {
  const said: string[] = [];
  const collect = (value: unknown): void => {
    if (typeof value === "string") said.push(value);
    else if (typeof value === "function") said.push(String(value));
    else if (value && typeof value === "object") Object.values(value).forEach(collect);
  };
  collect(fieldWords);
  expect(said.length).toBeGreaterThan(80);
  const claims = /\b(safe(ly)?|legal(ly)?|pass(ed|es)?|certified|compliant|roadworthy)\b/i;
  expect(said.filter((text) => claims.test(text))).toEqual([]);
});
