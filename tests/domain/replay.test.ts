import { describe, expect, test } from "vitest";
import type { Depth, Entry, Outcome, Purpose, Verdict } from "@/lib/domain/entry";
import { replay } from "@/lib/domain/replay";
import { document } from "../support/rig";

type Step = [string, Outcome] | { resume: string[] } | { type: string };

/** Entries of a walk, ten seconds apart. */
function entries(steps: Step[], purpose: Purpose = "hook-up", depth: Depth = "full"): Entry[] {
  const open = { rig: "r", revision: "0".repeat(64), purpose, depth, device: "d", member: "m", app: "test" };
  const all: [string, Entry["body"]][] = [
    ["open", open],
    ...steps.map((step): [string, Entry["body"]] => {
      if (Array.isArray(step)) return ["mark", { check: step[0], outcome: step[1] }];
      return "resume" in step ? ["resume", { again: step.resume }] : [step.type, {}];
    }),
  ];
  return all.map(([type, body], seq) => ({
    v: 1,
    walk: "017f22e2-79b0-7cc3-98c4-dc0c0c07398f",
    seq,
    type,
    at: new Date(seq * 10_000).toISOString(),
    elapsedMs: seq * 10_000,
    monoMs: seq * 10_000,
    monoEpoch: "test",
    body,
    prev: "0".repeat(64),
  }));
}

// `pin` and `cables` hold, `air` holds and may be absent, `jacket` is a fix and may be absent, `tires` is a fix.
const good: Step[] = ["pin", "cables", "air", "jacket", "tires"].map((key) => [key, "good"]);
const but = (key: string, outcome: Outcome): Step[] => [...good, [key, outcome]];

describe("verdict", () => {
  test.each<[string, Step[], Verdict, { marks: number; faults: number }]>([
    ["nothing marked", [], "unfinished", { marks: 0, faults: 0 }],
    ["all good", good, "no-hold", { marks: 5, faults: 0 }],
    ["one unmarked", good.slice(1), "unfinished", { marks: 4, faults: 0 }],
    ["a fix unmarked", good.slice(0, 4), "unfinished", { marks: 4, faults: 0 }],
    ["a hold at fault", but("pin", "fault"), "hold", { marks: 5, faults: 1 }],
    ["a hold at fault, the rest unmarked", [["pin", "fault"]], "hold", { marks: 1, faults: 1 }],
    ["a hold absent that may not be", but("cables", "absent"), "hold", { marks: 5, faults: 0 }],
    ["a hold absent that may be", but("air", "absent"), "no-hold", { marks: 5, faults: 0 }],
    ["a hold at fault that may be absent", but("air", "fault"), "hold", { marks: 5, faults: 1 }],
    ["a hold unseen", but("pin", "unseen"), "unfinished", { marks: 5, faults: 0 }],
    ["a fix at fault", but("tires", "fault"), "no-hold", { marks: 5, faults: 1 }],
    ["a fix absent that may not be", but("tires", "absent"), "no-hold", { marks: 5, faults: 0 }],
    ["a fix unseen", but("jacket", "unseen"), "unfinished", { marks: 5, faults: 0 }],
    [
      "a hold before unfinished",
      [
        ["cables", "fault"],
        ["pin", "unseen"],
      ],
      "hold",
      { marks: 2, faults: 1 },
    ],
    ["the last mark counts: good", [["pin", "fault"], ...good], "no-hold", { marks: 5, faults: 0 }],
    ["the last mark counts: fault", but("pin", "fault"), "hold", { marks: 5, faults: 1 }],
    ["resume voids earlier marks", [...good, { resume: ["pin"] }], "unfinished", { marks: 4, faults: 0 }],
    ["and a fault too", [...but("pin", "fault"), { resume: ["pin"] }], "unfinished", { marks: 4, faults: 0 }],
    [
      "marked again after",
      [...good, { resume: ["pin"] }, ["pin", "good"]],
      "no-hold",
      { marks: 5, faults: 0 },
    ],
    ["a check that is nowhere", but("paint", "fault"), "no-hold", { marks: 5, faults: 0 }],
    ["a name that objects inherit", but("constructor", "fault"), "no-hold", { marks: 5, faults: 0 }],
    [
      "entries of unknown types",
      [{ type: "smell" }, ...good, { type: "close2" }],
      "no-hold",
      { marks: 5, faults: 0 },
    ],
    ["closed early", [["pin", "good"], { type: "close" }], "unfinished", { marks: 1, faults: 0 }],
  ])("%s", (_, steps, verdict, counts) => {
    expect(replay(document, entries(steps))).toMatchObject({ verdict, counts });
  });

  test("a short walk asks for its own checks, and marks on others count", () => {
    const short = good.slice(0, 3);
    expect(replay(document, entries(short, "hook-up", "short")).verdict).toBe("no-hold");
    expect(replay(document, entries([["pin", "good"]], "unhook", "full")).verdict).toBe("no-hold");
    expect(
      replay(
        document,
        entries(
          [
            ["pin", "good"],
            ["cables", "fault"],
          ],
          "unhook",
        ),
      ).verdict,
    ).toBe("hold");
  });

  test("without an `open` there is nothing to finish", () => {
    expect(replay(document, [])).toMatchObject({
      open: null,
      closed: false,
      verdict: "unfinished",
      elapsedMs: 0,
    });
  });
});

test("says when each counting mark was made, how long the walk took and whether it is closed", () => {
  const read = replay(document, entries([["pin", "fault"], ["pin", "good"], { type: "close" }]));
  expect(read.marks.get("pin")).toMatchObject({
    outcome: "good",
    at: "1970-01-01T00:00:20.000Z",
    elapsedMs: 20_000,
  });
  expect(read).toMatchObject({ closed: true, elapsedMs: 30_000 });
});
