import { expect, test } from "vitest";
import { idleStep, type IdleSeen, type IdleStep } from "@/lib/domain/brake-idle";

// The rule of trade.md 1.2, step 16: lamps out prove idle only where they lit in this same state (equipment manual;
// the case of a disconnected battery is worked out there).
test.each<[IdleSeen, IdleStep]>([
  [{}, { ask: "lit" }],
  [{ lit: "yes" }, { ask: "dark" }],
  [
    { lit: "yes", dark: true },
    { outcome: "good", how: "lamps" },
  ],
  [
    { lit: "yes", dark: false },
    { outcome: "fault", how: "lit" },
  ],
  // What is said of the pedal cannot outweigh lamps that are lit.
  [
    { lit: "yes", dark: false, pedalUp: true, unitIdle: true },
    { outcome: "fault", how: "lit" },
  ],
  [{ lit: "no" }, { ask: "pedal" }],
  // Dark lamps that never lit prove nothing.
  [{ lit: "no", dark: true }, { ask: "pedal" }],
  [{ lit: "unknown", dark: true }, { ask: "pedal" }],
  [
    { lit: "no", pedalUp: false },
    { outcome: "fault", how: "pedal" },
  ],
  [{ lit: "no", pedalUp: true }, { ask: "idle" }],
  [
    { lit: "unknown", pedalUp: true, unitIdle: true },
    { outcome: "good", how: "looks" },
  ],
  [
    { lit: "no", pedalUp: true, unitIdle: true },
    { outcome: "good", how: "looks" },
  ],
  [
    { lit: "no", pedalUp: true, unitIdle: false },
    { outcome: "fault", how: "idle" },
  ],
])("%j", (seen, expected) => {
  expect(idleStep(seen)).toEqual(expected);
});
