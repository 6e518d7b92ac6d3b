import fc from "fast-check";
import { expect, test } from "vitest";
import { outcomes, type Entry, type Outcome } from "@/lib/domain/entry";
import { replay } from "@/lib/domain/replay";
import { document } from "../support/rig";

const keys = ["pin", "cables", "air", "jacket", "tires"];

/** What happens to one check: a mark (an undo is a later one), or its being asked again. */
type Act = { check: string; outcome: Outcome | "again" };

function entry(seq: number, type: string, body: Entry["body"]): Entry {
  const at = new Date(seq * 1000).toISOString();
  const prev = "0".repeat(64);
  return { v: 1, walk: "w", seq, type, at, elapsedMs: seq, monoMs: seq, monoEpoch: "e", body, prev };
}

function entries(acts: readonly Act[]): Entry[] {
  const open = {
    rig: "r",
    revision: "0".repeat(64),
    purpose: "hook-up",
    depth: "full",
    device: "d",
    member: "m",
    app: "a",
  };
  return [
    entry(0, "open", open),
    ...acts.map(({ check, outcome }, at) =>
      outcome === "again"
        ? entry(at + 1, "resume", { again: [check] })
        : entry(at + 1, "mark", { check, outcome }),
    ),
  ];
}

/** The state that people see, without when things were marked. */
function state(acts: readonly Entry[]) {
  const { marks, verdict, counts, faulted } = replay(document, acts);
  return {
    marks: keys.map((key) => marks.get(key)?.outcome ?? null),
    faulted: keys.filter((key) => faulted.has(key)),
    verdict,
    counts,
  };
}

const acts = fc.array(
  fc.record({ check: fc.constantFrom(...keys), outcome: fc.constantFrom(...outcomes, "again" as const) }),
  { maxLength: 40 },
);

/** The same acts in another order, each check's own among themselves as they were. */
function shuffled(all: readonly Act[], order: readonly number[]): Act[] {
  const queues = new Map(keys.map((key) => [key, all.filter(({ check }) => check === key)]));
  const turns = all
    .map(({ check }, at) => ({ check, by: order[at % order.length]! }))
    .sort((a, b) => a.by - b.by);
  return turns.map(({ check }) => queues.get(check)!.shift()!);
}

test("any order of marks, undos and re-asks that keeps each check's own order gives one state", () => {
  fc.assert(
    fc.property(acts, fc.array(fc.integer(), { minLength: 1, maxLength: 40 }), (all, order) => {
      expect(state(entries(shuffled(all, order)))).toEqual(state(entries(all)));
    }),
  );
});

test("asking several again at once is the same as asking each", () => {
  fc.assert(
    fc.property(acts, fc.subarray(keys), (all, again) => {
      const before = entries(all);
      const together = [...before, entry(before.length, "resume", { again })];
      const each = [
        ...before,
        ...again.map((key, at) => entry(before.length + at, "resume", { again: [key] })),
      ];
      expect(state(together)).toEqual(state(each));
    }),
  );
});

test("pauses, notes, photographs, set clocks and unknown entries change no state", () => {
  const idle = fc.constantFrom<[string, Entry["body"]]>(
    ["pause", {}],
    ["note", { text: "rain" }],
    ["disturbed", { wallMs: -3_600_000, monoMs: 5 }],
    ["photo", { sha256: "0".repeat(64), bytes: 1, mime: "image/jpeg" }],
    ["resume", { again: [], car: "untouched" }],
    ["smell", { of: "brakes" }],
  );
  fc.assert(
    fc.property(acts, fc.array(fc.tuple(idle, fc.nat(40)), { maxLength: 10 }), (all, idles) => {
      const plain = entries(all);
      const mixed = [...plain];
      for (const [[type, body], at] of idles) {
        mixed.splice(1 + (at % mixed.length), 0, entry(0, type, body));
      }
      expect(state(mixed)).toEqual(state(plain));
    }),
  );
});

test("a hold that was ever at fault is never good without having been marked good or absent since", () => {
  fc.assert(
    fc.property(acts, (all) => {
      const { faulted, marks } = replay(document, entries(all));
      for (const key of faulted.keys()) expect(marks.get(key)?.outcome).not.toBe("good");
    }),
  );
});
