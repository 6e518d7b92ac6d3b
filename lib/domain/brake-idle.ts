import type { Outcome } from "./entry";

/** What was seen of a brake unit that should be idle. Unanswered is undefined. */
export interface IdleSeen {
  /** Whether the car's stop lamps lit with the pedal pressed, in this same state of key, battery and fuse. */
  lit?: "yes" | "no" | "unknown";
  /** Whether they are dark with the pedal let go. */
  dark?: boolean;
  pedalUp?: boolean;
  unitIdle?: boolean;
}

/** What to ask next, or what the answers come to; `how` says what the outcome stands on. */
export type IdleStep =
  | { ask: "lit" | "dark" | "pedal" | "idle" }
  | { outcome: Extract<Outcome, "good" | "fault">; how: "lamps" | "looks" | "lit" | "pedal" | "idle" };

/**
 * Whether the brake is idle. Dark stop lamps show it only where they lit with the pedal pressed in this same state: a
 * disconnected battery, a cut feed or a dead bulb shows nothing. Elsewhere the pedal fully up with unit and monitor idle
 * stand for it, and the wheels are felt at the first stop.
 */
export function idleStep({ lit, dark, pedalUp, unitIdle }: IdleSeen): IdleStep {
  if (lit === undefined) return { ask: "lit" };
  if (lit === "yes") {
    if (dark === undefined) return { ask: "dark" };
    return dark ? { outcome: "good", how: "lamps" } : { outcome: "fault", how: "lit" };
  }
  if (pedalUp === undefined) return { ask: "pedal" };
  if (!pedalUp) return { outcome: "fault", how: "pedal" };
  if (unitIdle === undefined) return { ask: "idle" };
  return unitIdle ? { outcome: "good", how: "looks" } : { outcome: "fault", how: "idle" };
}
