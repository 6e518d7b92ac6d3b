import { describe, expect, test } from "vitest";
import type { Entry } from "@/lib/domain/entry";
import {
  againAfterBreak,
  againAfterMending,
  asksAboutCar,
  interruptionOf,
  LEFT_MS,
  touchedByMending,
  type Interruption,
} from "@/lib/domain/interruption";
import type { RevisionDocument } from "@/lib/domain/revision";
import { compose } from "@/lib/domain/catalogue/compose";
import { householdSheet } from "@/seeders/demo/sheets/household";

const householdRig = compose(householdSheet);

const MINUTE_MS = 60_000;
const at = "2026-11-30T10:00:00.000Z";
const nowMs = (minutes: number) => Date.parse(at) + minutes * MINUTE_MS;

describe("whether a walk was interrupted", () => {
  test.each<[string, string, boolean, "load" | number, number, Interruption | null]>([
    ["a new page, nothing marked", "open", false, "load", 5, null],
    ["a new page, something marked", "mark", true, "load", 5, { kind: "left", awayMs: 5 * MINUTE_MS }],
    ["a new page, at once", "mark", true, "load", 0, { kind: "left", awayMs: 0 }],
    ["a pause", "pause", true, 0, 5, { kind: "paused", awayMs: 5 * MINUTE_MS }],
    [
      "a pause before anything was marked",
      "pause",
      false,
      "load",
      5,
      { kind: "paused", awayMs: 5 * MINUTE_MS },
    ],
    ["in the pocket for a moment", "mark", true, 40_000, 1, null],
    ["out of sight just under the limit", "mark", true, LEFT_MS - 1, 10, null],
    ["out of sight for the limit", "mark", true, LEFT_MS, 10, { kind: "left", awayMs: 10 * MINUTE_MS }],
    ["the clock was set back meanwhile", "mark", true, "load", -60, { kind: "left", awayMs: null }],
    ["a closed walk", "close", true, "load", 5, null],
  ])("%s", (_, type, marked, returned, minutes, expected) => {
    expect(interruptionOf({ type, at } as Entry, marked, returned, nowMs(minutes))).toEqual(expected);
  });
});

const hookUp = householdRig.walks["hook-up"].full;
const upTo = (key: string) => hookUp.slice(0, hookUp.indexOf(key) + 1);

describe("what is asked again", () => {
  test("the two that were marked last, wherever they are", () => {
    expect(againAfterBreak(householdRig, [], false)).toEqual([]);
    expect(againAfterBreak(householdRig, hookUp.slice(0, 1), false)).toEqual(hookUp.slice(0, 1));
    expect(againAfterBreak(householdRig, hookUp.slice(0, 5), false)).toEqual(hookUp.slice(3, 5));
    expect(againAfterBreak(householdRig, ["lamps", "arm-left", "cables"], false)).toEqual([
      "arm-left",
      "cables",
    ]);
  });

  test("all of the cabin where someone may have been in the car", () => {
    const again = againAfterBreak(householdRig, upTo("lamps"), true);
    expect(again).toEqual(expect.arrayContaining(["end-state", "brake-ready"]));
    expect(againAfterBreak(householdRig, ["receiver-pins"], true)).toEqual(["receiver-pins"]);
  });

  test("after mending: the check, what it touches, the holds of the last look; never what has no mark", () => {
    const document = {
      ...householdRig,
      list: {
        stations: householdRig.list.stations.map((station) => ({
          ...station,
          checks: station.checks.map((check) =>
            check.key === "arm-left" ? { ...check, touches: ["cables", "bar-stowed"] } : check,
          ),
        })),
      },
    } as RevisionDocument;
    // Chocks and wheels, because the car was secured for the mending.
    expect(againAfterMending(document, ["arm-left"], hookUp)).toEqual([
      "arm-left",
      "cables",
      "chocks-out",
      "wheels-roll",
      "joints",
      "jacks-up",
    ]);
    expect(touchedByMending(document, "arm-left", hookUp)).toEqual(["cables"]);
    expect(touchedByMending(document, "arm-left", ["arm-left"])).toEqual([]);
    expect(againAfterMending(document, ["arm-left"], ["arm-left", "tires"])).toEqual(["arm-left"]);
  });
});

test.each<[string, string[], boolean, string | null, boolean]>([
  ["at the first of the last look", upTo("lamps"), false, "joints", true],
  ["once it is answered", upTo("lamps"), true, "joints", false],
  ["with no mark in the cabin", ["receiver-pins"], false, "joints", false],
  ["before the last look", upTo("wheels-roll"), false, "lamps", false],
  ["with nothing left", hookUp, false, null, false],
])("whether the car is asked about: %s", (_, marked, answered, next, expected) => {
  const walk = { purpose: "hook-up", depth: "full" } as const;
  expect(asksAboutCar(householdRig, walk, marked, answered, next)).toBe(expected);
});
