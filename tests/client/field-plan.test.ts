import { describe, expect, test } from "vitest";
import {
  fixedBecause,
  needsReason,
  nextStep,
  stepBefore,
  stepsOf,
  stripOf,
  tallyOf,
  type Marks,
} from "@/components/field/walk-plan";
import type { Outcome } from "@/lib/domain/entry";
import { checksOf } from "@/lib/domain/revision";
import { document } from "../support/rig";

// The list of the test rig, in walking order: pin, cables, air, jacket, tires.
const steps = stepsOf(document, { purpose: "hook-up", depth: "full" });
const marked = (made: Record<string, Outcome>): Marks =>
  new Map(Object.entries(made).map(([key, outcome]) => [key, { outcome }]));
const keys = (found: readonly { check: { key: string } }[]) => found.map(({ check }) => check.key);

test("a walk's steps are in walking order, with their place and station", () => {
  expect(steps.map(({ check, place, station }) => [check.key, place, station.key])).toEqual([
    ["pin", 1, "car-nose"],
    ["cables", 2, "cables-and-cord"],
    ["air", 3, "cables-and-cord"],
    ["jacket", 4, "cables-and-cord"],
    ["tires", 5, "last-look"],
  ]);
  expect(keys(stepsOf(document, { purpose: "hook-up", depth: "short" }))).toEqual(["pin", "cables", "air"]);
});

describe("what is asked next", () => {
  test.each<[string, Record<string, Outcome>, string | null, string | null]>([
    ["a new walk begins at the first", {}, null, "pin"],
    ["the next in order", { pin: "good" }, "pin", "cables"],
    ["marked ones are passed over", { pin: "good", cables: "good" }, "pin", "air"],
    ["couldn't see is a mark", { pin: "good", cables: "unseen" }, "pin", "air"],
    ["after the last, what was left before it", { cables: "good", tires: "good" }, "tires", "pin"],
    [
      "going back and marking again goes on where the walk was",
      { pin: "fault", cables: "good" },
      "pin",
      "air",
    ],
    ["nothing", { pin: "good", cables: "good", air: "absent", jacket: "fault", tires: "good" }, "pin", null],
    ["an unknown place begins at the first", {}, "no such check", "pin"],
  ])("%s", (_, made, after, expected) => {
    expect(nextStep(steps, marked(made), after)?.check.key ?? null).toBe(expected);
  });

  test.each<[string, [string, Outcome][], string, string | null]>([
    [
      "the check marked last, to mark it anew",
      [
        ["pin", "good"],
        ["cables", "good"],
      ],
      "air",
      "cables",
    ],
    [
      "marked last wherever it stands",
      [
        ["cables", "good"],
        ["pin", "good"],
      ],
      "air",
      "pin",
    ],
    [
      "from the one marked last, the one before in order",
      [
        ["pin", "good"],
        ["cables", "good"],
      ],
      "cables",
      "pin",
    ],
    ["with nothing marked, the one before in order", [], "cables", "pin"],
    ["no further than the first", [], "pin", null],
    ["nothing before an unknown check", [], "no such check", null],
  ])("one back: %s", (_, made, from, expected) => {
    const marks = new Map(made.map(([key, outcome]) => [key, { outcome }]));
    expect(stepBefore(steps, marks, from)?.check.key ?? null).toBe(expected);
  });
});

test("the strip has a segment a check, those of one station together", () => {
  const made = marked({ pin: "fault", cables: "absent", air: "absent", jacket: "fault" });
  expect(stripOf(steps, made, "tires")).toMatchObject([
    { segments: ["hold"] },
    // Absent holds where the check may not be absent.
    { segments: ["hold", "absent", "fix"] },
    { segments: ["now"] },
  ]);
  expect(stripOf(steps, marked({ pin: "unseen" }), null)).toMatchObject([
    { segments: ["unseen"] },
    { segments: ["todo", "todo", "todo"] },
    { segments: ["todo"] },
  ]);
});

describe("what the marks come to", () => {
  test.each<[Record<string, Outcome>, number, string[], string[], string[], string[]]>([
    [{}, 0, ["pin", "cables", "air", "jacket", "tires"], [], [], []],
    [{ pin: "good", cables: "good", air: "absent", jacket: "good", tires: "good" }, 5, [], [], [], []],
    [
      { pin: "fault", cables: "unseen", jacket: "fault" },
      2,
      ["air", "tires"],
      ["cables"],
      ["pin"],
      ["jacket"],
    ],
    [{ cables: "absent" }, 1, ["pin", "air", "jacket", "tires"], [], ["cables"], []],
    // A fix check that is not there is no fault.
    [{ tires: "absent" }, 1, ["pin", "cables", "air", "jacket"], [], [], []],
  ])("%j", (made, lookedAt, unmarked, unseen, holds, fixes) => {
    const tally = tallyOf(document, steps, marked(made));
    expect({
      lookedAt: tally.lookedAt,
      unmarked: keys(tally.unmarked),
      unseen: keys(tally.unseen),
      holds: keys(tally.holds),
      fixes: tally.fixes.map(({ key }) => key),
    }).toEqual({ lookedAt, unmarked, unseen, holds, fixes });
  });

  test("a hold that the walk did not ask for counts, but not among what was looked at", () => {
    const unhook = stepsOf(document, { purpose: "unhook", depth: "full" });
    const tally = tallyOf(document, unhook, marked({ cables: "fault" }));
    expect([tally.lookedAt, tally.total, keys(tally.holds)]).toEqual([0, 1, ["cables"]]);
  });
});

test("only a hold last seen at fault needs a reason to become good", () => {
  const checks = checksOf(document);
  expect(needsReason(checks.get("pin")!, new Set(["pin"]))).toBe(true);
  expect(needsReason(checks.get("pin")!, new Set(["cables"]))).toBe(false);
  expect(needsReason(checks.get("tires")!, new Set(["tires"]))).toBe(false);
});

test.each([
  ["new clip fitted", "fixed: new clip fitted"],
  ["  new \n clip ", "fixed: new clip"],
  ["", null],
  [" \n\t", null],
  ["clip \ud83d", "fixed: clip"],
  ["clip 😀", "fixed: clip 😀"],
])("what was done is kept as words the record may hold: %j", (said, because) => {
  expect(fixedBecause(said)).toBe(because);
});
