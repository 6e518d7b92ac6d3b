import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { signals } from "@/lib/domain/entry";
import { holdChoicesMs, nextChangeMs, scriptAt, startMomentMs, usualHoldMs } from "@/lib/domain/lamp-script";
import { clipNote, clipTime } from "@/lib/domain/messages/lamp-script";

const at = (time: string) => Date.parse(`2026-11-30T${time}Z`);
const start = at("10:32:30");
const hold = 8_000;

describe("when two phones start", () => {
  test.each([
    ["10:32:00.000", "10:32:30"],
    ["10:32:00.001", "10:32:30"],
    ["10:32:24.999", "10:32:30"],
    ["10:32:25.000", "10:32:30"],
    ["10:32:25.001", "10:33:00"],
    ["10:32:30.000", "10:33:00"],
    ["10:32:54.999", "10:33:00"],
    ["10:32:55.001", "10:33:30"],
    ["10:59:58.000", "11:00:30"],
    ["23:59:20.000", "23:59:30"],
  ])("tapped at %s they start at %s", (tapped, starts) => {
    expect(startMomentMs(at(tapped))).toBe(at(starts));
  });

  test("always a half minute of the clock, from 5 s to just under 35 s away", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 4e12 }), (nowMs) => {
        const startMs = startMomentMs(nowMs);
        expect(startMs % 30_000).toBe(0);
        expect(startMs - nowMs).toBeGreaterThanOrEqual(5_000);
        expect(startMs - nowMs).toBeLessThan(35_000);
      }),
    );
  });
});

describe("what is asked for", () => {
  test("the usual hold is one of the choices", () => {
    expect(holdChoicesMs).toEqual([6_000, 8_000, 12_000]);
    expect(usualHoldMs).toBe(8_000);
  });

  test.each([
    ["10:32:25.000", { phase: "waiting", startsInMs: 5_000 }],
    ["10:32:29.999", { phase: "waiting", startsInMs: 1 }],
    ["10:32:30.000", { phase: "signal", signal: "tail", next: "left", leftMs: 8_000, place: 1, total: 7 }],
    ["10:32:37.999", { phase: "signal", signal: "tail", next: "left", leftMs: 1, place: 1, total: 7 }],
    ["10:32:38.000", { phase: "signal", signal: "left", next: "right", leftMs: 8_000, place: 2, total: 7 }],
    [
      "10:33:13.000",
      { phase: "signal", signal: "stop-left", next: "stop-right", leftMs: 5_000, place: 6, total: 7 },
    ],
    ["10:33:25.999", { phase: "signal", signal: "stop-right", next: null, leftMs: 1, place: 7, total: 7 }],
    ["10:33:26.000", { phase: "done" }],
    ["11:00:00.000", { phase: "done" }],
  ])("at %s of a script from 10:32:30", (time, expected) => {
    expect(scriptAt(start, at(time), signals, hold)).toEqual(expected);
  });

  test("with nothing to ask for it is over when it would begin", () => {
    expect(scriptAt(start, start - 1, [], hold)).toEqual({ phase: "waiting", startsInMs: 1 });
    expect(scriptAt(start, start, [], hold)).toEqual({ phase: "done" });
  });

  const someSignals = fc.subarray([...signals], { minLength: 1 });
  const someHold = fc.constantFrom(...holdChoicesMs);

  test("one phase after the other, the signals in order, each for exactly its time", () => {
    fc.assert(
      fc.property(someSignals, someHold, (open, holdMs) => {
        const seen: (readonly [string, number])[] = [];
        let nowMs = start - 2_500;
        // From change to change, as a screen follows it: what is skipped between would show as a wrong length.
        for (let step = 0; step < 200; step += 1) {
          const moment = scriptAt(start, nowMs, open, holdMs);
          const waitMs = nextChangeMs(moment);
          const name = moment.phase === "signal" ? moment.signal : moment.phase;
          const before = seen.at(-1);
          if (before?.[0] === name) seen[seen.length - 1] = [name, before[1] + (waitMs ?? 0)];
          else seen.push([name, waitMs ?? 0]);
          if (waitMs === null) break;
          nowMs += waitMs;
        }
        expect(seen).toEqual([["waiting", 2_500], ...open.map((signal) => [signal, holdMs]), ["done", 0]]);
      }),
    );
  });

  test("at any moment the place, the signal, the next one and the time left belong together", () => {
    fc.assert(
      fc.property(someSignals, someHold, fc.integer({ min: 0, max: 90_000 }), (open, holdMs, afterMs) => {
        const index = open.findIndex((_, each) => afterMs < (each + 1) * holdMs);
        const expected = {
          phase: "signal",
          signal: open[index],
          next: open[index + 1] ?? null,
          leftMs: (index + 1) * holdMs - afterMs,
          place: index + 1,
          total: open.length,
        };
        const moment = scriptAt(start, start + afterMs, open, holdMs);
        expect(moment).toEqual(index < 0 ? { phase: "done" } : expected);
      }),
    );
  });

  test("two clocks a second apart are never more than one signal apart, and that for a second only", () => {
    const placeAt = (nowMs: number, holdMs: number) => {
      const moment = scriptAt(start, nowMs, signals, holdMs);
      return moment.phase === "waiting" ? 0 : moment.phase === "done" ? signals.length + 1 : moment.place;
    };
    for (const holdMs of holdChoicesMs) {
      let apartMs = 0;
      for (let nowMs = start - 3_000; nowMs <= start + 90_000; nowMs += 100) {
        const gap = placeAt(nowMs + 1_000, holdMs) - placeAt(nowMs, holdMs);
        expect(gap === 0 || gap === 1).toBe(true);
        if (gap === 1) apartMs += 100;
      }
      // Once at the start, and at the end of each signal.
      expect(apartMs).toBe((signals.length + 1) * 1_000);
    }
  });
});

describe("what a clip says in a note", () => {
  test("each marked signal with its place in the clip, in the order of the test", () => {
    expect(clipNote({ left: 12.9, tail: 4.2, "stop-right": 83 })).toBe(
      "From a filmed clip: tail 0:04, left 0:12, stop with right 1:23",
    );
  });

  test("the very beginning of a clip is a place in it; no signal at all is no note", () => {
    expect(clipNote({ tail: 0 })).toBe("From a filmed clip: tail 0:00");
    expect(clipNote({})).toBeNull();
  });

  test.each([
    [0, "0:00"],
    [59.99, "0:59"],
    [60, "1:00"],
    [725, "12:05"],
  ])("%s s is %s", (seconds, text) => expect(clipTime(seconds)).toBe(text));
});
