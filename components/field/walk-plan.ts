import type { SegmentState, StripStation } from "@/components/tape/strip";
import type { WalkView } from "@/lib/client/recorder";
import type { Depth, MarkBody, Purpose } from "@/lib/domain/entry";
import { asksAboutCar, type Interruption } from "@/lib/domain/interruption";
import { plainText } from "@/lib/domain/json";
import { checksOf, walkChecks, type Check, type RevisionDocument } from "@/lib/domain/revision";
import { segmentOf } from "@/lib/domain/walk-reading";
import { CALL_OFF, CLOSING, PLAN } from "./address";

/** The counting marks of a walk, by check. */
export type Marks = ReadonlyMap<string, Pick<MarkBody, "outcome">>;

/** One check of a walk at its place in walking order, counted from 1. */
export type Step = ReturnType<typeof walkChecks>[number] & { place: number };

/** The checks of a walk in walking order. */
export function stepsOf(document: RevisionDocument, walk: { purpose: Purpose; depth: Depth }): Step[] {
  return walkChecks(document, walk.purpose, walk.depth).map((step, at) => ({ ...step, place: at + 1 }));
}

/**
 * The next check to ask: the first without a mark after this one, else the first without a mark at all.
 * @param after the check that was just marked, or null to begin at the first
 * @returns null when every check has a mark
 */
export function nextStep(steps: readonly Step[], marks: Marks, after: string | null): Step | null {
  const from = steps.findIndex(({ check }) => check.key === after) + 1;
  const ahead = [...steps.slice(from), ...steps.slice(0, from)];
  return ahead.find(({ check }) => !marks.has(check.key)) ?? null;
}

/** Where in an open walk someone is: what shows, and why. */
export type Place =
  | { kind: "closed" | "call-off" | "plan" | "car" | "held" | "closing" }
  | { kind: "interrupted"; interruption: Interruption }
  | { kind: "check"; step: Step };

/**
 * Decides what a walk shows. An interruption comes before everything but calling the walk off; the question about the
 * car before the last look; the held rig once every check has its mark.
 * @param at what the address says
 */
export function placeIn(view: WalkView, steps: readonly Step[], at: string | null): Place {
  const { document, walk, replay, interruption } = view;
  if (walk.seal) return { kind: "closed" };
  if (at === CALL_OFF) return { kind: "call-off" };
  if (interruption) return { kind: "interrupted", interruption };
  if (at === PLAN) return { kind: "plan" };
  const { marks, verdict, carUntouched } = replay;
  const next = nextStep(steps, marks, null);
  const wanted = at === CLOSING ? null : (steps.find(({ check }) => check.key === at) ?? next);
  if (!wanted) return { kind: !next && verdict === "hold" ? "held" : "closing" };
  const { key } = wanted.check;
  const fresh = !marks.has(key);
  if (fresh && asksAboutCar(document, walk, [...marks.keys()], carUntouched, key)) return { kind: "car" };
  return { kind: "check", step: wanted };
}

/** What "back one" leads to: the check marked last, so that it can be marked anew, else the one before in walking order. */
export function stepBefore(steps: readonly Step[], marks: Marks, check: string): Step | null {
  const last = [...marks.keys()].at(-1);
  const undone = last === check ? undefined : steps.find((step) => step.check.key === last);
  return undone ?? steps[steps.findIndex((step) => step.check.key === check) - 1] ?? null;
}

/** A walk as tape: its checks in walking order, those at one station in a row together. */
export function stripOf(steps: readonly Step[], marks: Marks, now: string | null): StripStation[] {
  const stations: { key: string; at: string; segments: SegmentState[] }[] = [];
  for (const { station, check, place } of steps) {
    const state = check.key === now ? "now" : segmentOf(check, marks.get(check.key)?.outcome);
    const last = stations.at(-1);
    if (last?.at === station.key) last.segments.push(state);
    else stations.push({ key: `${station.key}-${place}`, at: station.key, segments: [state] });
  }
  return stations;
}

/** What a walk's marks come to, for the sentences about it. */
export interface Tally {
  total: number;
  /** Checks of this walk marked good, fault or not on this rig. */
  lookedAt: number;
  unmarked: Step[];
  unseen: Step[];
  /** Every check of the revision whose mark holds the rig, whether this walk asks for it or not. */
  holds: { check: Check; absent: boolean }[];
  fixes: Check[];
}

/** Counts and lists what a walk's marks come to. */
export function tallyOf(document: RevisionDocument, steps: readonly Step[], marks: Marks): Tally {
  const marked = [...checksOf(document).values()].map((check) => {
    const outcome = marks.get(check.key)?.outcome;
    return { check, absent: outcome === "absent", segment: segmentOf(check, outcome) };
  });
  const outcome = (step: Step) => marks.get(step.check.key)?.outcome;
  const unmarked = steps.filter((step) => outcome(step) === undefined);
  const unseen = steps.filter((step) => outcome(step) === "unseen");
  return {
    total: steps.length,
    lookedAt: steps.length - unmarked.length - unseen.length,
    unmarked,
    unseen,
    holds: marked.filter(({ segment }) => segment === "hold").map(({ check, absent }) => ({ check, absent })),
    fixes: marked.filter(({ segment }) => segment === "fix").map(({ check }) => check),
  };
}

/** Whether calling this check good needs a reason: it was last seen to be why the rig must not be towed. */
export function needsReason(check: Check, faulted: { has(key: string): boolean }): boolean {
  return check.effect === "hold" && faulted.has(check.key);
}

/**
 * The `because` of a check that was put right.
 * @returns null where nothing was said
 */
export function fixedBecause(text: string): string | null {
  const said = plainText(text);
  return said === "" ? null : `fixed: ${said}`;
}
