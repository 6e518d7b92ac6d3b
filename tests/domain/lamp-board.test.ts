import { describe, expect, test } from "vitest";
import { signals, type LampState, type Outcome, type Signal } from "@/lib/domain/entry";
import { boardOutcome, expectedOf, openSignals, separateLook, type Seen } from "@/lib/domain/lamp-board";

const combined = { lamps: { layout: "combined" } } as const;

// The table of expected results in trade.md 2.3, column "combined coach, combined car" (trade).
test.each<[Signal, LampState, LampState]>([
  ["tail", "steady", "steady"],
  ["left", "flashing", "dark"],
  ["right", "dark", "flashing"],
  ["stop", "steady", "steady"],
  ["hazard", "flashing", "flashing"],
  ["stop-left", "flashing", "steady"],
  ["stop-right", "steady", "flashing"],
])("%s: left %s, right %s", (signal, left, right) => {
  expect(expectedOf(combined, signal)).toEqual({ left, right });
});

test("a rig that differs when it is known to be right carries its own", () => {
  const own = { lamps: { layout: "separate", expected: { hazard: { right: "steady" } } } } as const;
  expect(expectedOf(own, "hazard")).toEqual({ left: "flashing", right: "steady" });
  expect(expectedOf(own, "stop")).toEqual({ left: "steady", right: "steady" });
});

// The column "2-to-3 output to amber car": stop with left is red steady while the left amber flashes (worked out).
test.each<[Signal, LampState, { turn: LampState; stop: LampState }]>([
  ["left", "flashing", { turn: "flashing", stop: "dark" }],
  ["stop", "steady", { turn: "dark", stop: "steady" }],
  ["stop-left", "flashing", { turn: "flashing", stop: "steady" }],
  ["stop-left", "steady", { turn: "dark", stop: "steady" }],
  ["tail", "dim", { turn: "dark", stop: "dim" }],
  ["left", "dark", { turn: "dark", stop: "dark" }],
])("two lamps a side, %s %s", (signal, state, look) => {
  expect(separateLook(signal, state)).toEqual(look);
});

const all = Object.fromEntries(signals.map((signal) => [signal, expectedOf(combined, signal)])) as Seen;
const without = (signal: Signal) =>
  Object.fromEntries(Object.entries(all).filter(([each]) => each !== signal)) as Seen;

describe("what a board comes to", () => {
  test.each<[string, Seen, Outcome, Signal[]]>([
    ["nothing seen", {}, "unseen", [...signals]],
    ["all seven as drawn", all, "good", []],
    ["one not seen", without("hazard"), "unseen", ["hazard"]],
    ["one lamp odd", { ...all, stop: { left: "steady", right: "dark" } }, "fault", []],
    [
      "one odd and others not seen",
      { "stop-left": { left: "steady", right: "steady" } },
      "fault",
      signals.filter((signal) => signal !== "stop-left"),
    ],
    ["half of a signal seen is not as drawn", { ...all, tail: { left: "steady" } }, "fault", []],
  ])("%s", (_, seen, outcome, open) => {
    expect(boardOutcome(combined, seen)).toBe(outcome);
    expect(openSignals(seen)).toEqual(open);
  });
});
