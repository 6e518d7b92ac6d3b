import { describe, expect, test } from "vitest";
import { GATHER_MS, LONGEST_MS, nextTry, SPACING_MS, type DrainFacts } from "@/lib/client/drain-timing";

const calm: DrainFacts = {
  pending: true,
  signedOut: false,
  savedAt: null,
  stirredAt: null,
  triedAt: null,
  failures: 0,
  notBefore: null,
  spread: 1,
};

describe("when the phone tries next", () => {
  const timelines: [string, Partial<DrainFacts>, number | null][] = [
    ["nothing to send: never", { pending: false, stirredAt: 500 }, null],
    ["the app was opened: at once", { stirredAt: 500 }, 500],
    [
      "a mark was saved after a good attempt: gathered",
      { triedAt: 1_000, savedAt: 9_000 },
      9_000 + GATHER_MS,
    ],
    [
      "a mark was saved during the attempt: gathered and spaced",
      { triedAt: 1_000, savedAt: 900 },
      900 + GATHER_MS,
    ],
    [
      "a mark was saved long before the attempt ended: spaced",
      { triedAt: 9_000, savedAt: 10 },
      9_000 + SPACING_MS,
    ],
    ["one failure", { triedAt: 1_000, failures: 1 }, 3_000],
    ["three failures", { triedAt: 1_000, failures: 3 }, 9_000],
    ["many failures: never longer than the longest", { triedAt: 1_000, failures: 60 }, 1_000 + LONGEST_MS],
    ["a phone early in the spread waits half", { triedAt: 1_000, failures: 3, spread: 0 }, 5_000],
    [
      "marks saved meanwhile do not hurry a failing phone",
      { triedAt: 1_000, failures: 3, savedAt: 1_500 },
      9_000,
    ],
    ["a stir after the failure: at once", { triedAt: 1_000, failures: 6, stirredAt: 4_000 }, 4_000],
    ["a stir right after the failure: spaced", { triedAt: 1_000, failures: 6, stirredAt: 1_100 }, 2_000],
    ["a stir before the failure is spent", { triedAt: 1_000, failures: 1, stirredAt: 900 }, 3_000],
    ["signed out: not until something stirs", { triedAt: 1_000, signedOut: true, savedAt: 2_000 }, null],
    ["signed out, then a stir", { triedAt: 1_000, signedOut: true, stirredAt: 5_000 }, 5_000],
    ["the server asked for rest", { triedAt: 1_000, failures: 1, notBefore: 30_000 }, 30_000],
    [
      "the server asked for rest and something stirs",
      { triedAt: 1_000, stirredAt: 2_000, notBefore: 30_000 },
      30_000,
    ],
  ];
  test.each(timelines)("%s", (_, facts, expected) => {
    expect(nextTry({ ...calm, ...facts })).toBe(expected);
  });
});
