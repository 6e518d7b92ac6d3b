import { describe, expect, test } from "vitest";
import { clockText, durationText, inFours, momentText, recentText } from "@/lib/client/time-words";

const HOUR = 3_600_000;

describe("times as the screens write them", () => {
  test.each([
    [0, "00:00"],
    [999, "00:00"],
    [192_400, "03:12"],
    [HOUR - 1, "59:59"],
    [HOUR + 192_000, "1:03:12"],
    [26 * HOUR, "26:00:00"],
  ])("a running time of %d ms is %s", (ms, text) => {
    expect(clockText(ms)).toBe(text);
  });

  test.each([
    [0, "0 s"],
    [999, "0 s"],
    [1_000, "1 s"],
    [462_000, "7 min 42 s"],
    [480_000, "8 min"],
    [3 * HOUR + 5_000, "3 h"],
    [24 * HOUR, "1 day"],
    [51 * HOUR, "2 days 3 h"],
  ])("a length of %d ms is %s", (ms, text) => {
    expect(durationText(ms)).toBe(text);
  });

  test("a moment says its year only when it is not this one", () => {
    const now = new Date(2026, 4, 2);
    expect(momentText(new Date(2026, 0, 9, 8, 5).toISOString(), now)).toBe("Jan\u00a09, 08:05");
    expect(momentText(new Date(2025, 11, 31, 23, 59).toISOString(), now)).toBe(
      "Dec\u00a031,\u00a02025, 23:59",
    );
  });

  test.each([
    ["2026-03-05T00:09", "00:09"],
    ["2026-03-04T23:59", "yesterday 23:59"],
    ["2026-03-03T09:14", "Mar\u00a03, 09:14"],
    ["2025-12-31T09:14", "Dec\u00a031,\u00a02025, 09:14"],
    // A clock that ran ahead.
    ["2026-03-06T09:14", "Mar\u00a06, 09:14"],
  ])("shortly after midnight on March 5, %s is %s", (at, text) => {
    expect(recentText(new Date(at).toISOString(), new Date("2026-03-05T00:10"))).toBe(text);
  });

  test("digests fall into fours, the rest at the end", () => {
    expect(inFours("abcdefghij")).toEqual(["abcd", "efgh", "ij"]);
  });
});
