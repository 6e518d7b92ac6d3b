import { expect, test } from "vitest";
import type { Purpose, Verdict } from "@/lib/domain/entry";
import { canGoStale, STALE_AFTER_MS, stalenessOf } from "@/lib/domain/standing";

const at = "2026-11-30T10:00:00.000Z";
const later = Date.parse(at) + STALE_AFTER_MS;

test.each<[Purpose, Verdict, string | null, number, "left" | "old" | null]>([
  ["hook-up", "no-hold", null, later, null],
  ["hook-up", "no-hold", null, later + 1, "old"],
  ["hook-up", "no-hold", at, Date.parse(at), "left"],
  ["hook-up", "no-hold", at, later + 1, "left"],
  ["re-check", "no-hold", null, later + 1, "old"],
  ["yard-out", "no-hold", null, later + 1, "old"],
  ["delivery", "no-hold", null, later + 1, "old"],
  ["unhook", "no-hold", null, later + 1, null],
  ["yard-in", "no-hold", at, later + 1, null],
  ["hook-up", "hold", at, later + 1, null],
  ["hook-up", "unfinished", at, later + 1, null],
])("%s, %s, left %s", (purpose, verdict, leftAt, nowMs, expected) => {
  expect(stalenessOf({ purpose, verdict, at }, leftAt, nowMs)).toBe(expected);
  if (expected) expect(canGoStale({ purpose, verdict })).toBe(true);
});
