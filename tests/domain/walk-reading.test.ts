import { describe, expect, test } from "vitest";
import { nextLink } from "@/lib/domain/chain";
import type { Entry, Outcome } from "@/lib/domain/entry";
import { clockRemark, readWalk, segmentOf, type Segment } from "@/lib/domain/walk-reading";
import { document, revision, rig } from "../support/rig";

const WALK = "0193a1b2-0000-7000-8000-000000000001";
const START_MS = Date.UTC(2026, 4, 2, 15, 0, 0);

type Step = [type: string, body: Entry["body"], elapsedMs: number];

/** A full hook-up, unless told otherwise: an `open` at 0 ms and these steps after it. */
function walk(steps: readonly Step[], open: Record<string, unknown> = {}): Entry[] {
  const opened: Step = [
    "open",
    {
      rig: rig.id,
      revision,
      purpose: "hook-up",
      depth: "full",
      device: "d",
      member: "m",
      app: "test",
      ...open,
    },
    0,
  ];
  let head: Parameters<typeof nextLink>[1] = { revision };
  return [opened, ...steps].map(([type, body, elapsedMs]) => {
    const at = new Date(START_MS + elapsedMs).toISOString();
    const link = nextLink(WALK, head, type, body, { at, elapsedMs, monoMs: elapsedMs, monoEpoch: "e" });
    head = link;
    return link.entry;
  });
}

const mark = (check: string, outcome: Outcome, elapsedMs: number, more = {}): Step => [
  "mark",
  { check, outcome, ...more },
  elapsedMs,
];

/** Every check as “key segment”, in the order in which it is read. */
const segments = (entries: readonly Entry[]) =>
  readWalk(document, entries).stations.flatMap(({ checks }) =>
    checks.map(({ check, segment }) => `${check.key} ${segment}`),
  );

describe("the segment of tape for a check", () => {
  const hold = { effect: "hold", mayBeAbsent: false } as const;
  const spare = { effect: "hold", mayBeAbsent: true } as const;
  const fix = { effect: "fix", mayBeAbsent: false } as const;
  const table: [string, Parameters<typeof segmentOf>[0], Outcome | undefined, Segment][] = [
    ["no mark", hold, undefined, "todo"],
    ["good", hold, "good", "good"],
    ["a fault on a hold", hold, "fault", "hold"],
    ["a fault on a fix", fix, "fault", "fix"],
    ["a hold that must be there and is not", hold, "absent", "hold"],
    ["a hold that may be absent", spare, "absent", "absent"],
    ["a fix that is absent", fix, "absent", "absent"],
    ["not seen", hold, "unseen", "unseen"],
  ];
  test.each(table)("%s", (_, check, outcome, expected) => {
    expect(segmentOf(check, outcome)).toBe(expected);
  });
});

describe("which checks are read back, and in which order", () => {
  test("nothing marked: every check that the walk asks for, stations without one left out", () => {
    expect(segments(walk([]))).toEqual(["pin todo", "cables todo", "air todo", "jacket todo", "tires todo"]);
    expect(readWalk(document, walk([])).stations.map(({ key }) => key)).toEqual([
      "car-nose",
      "cables-and-cord",
      "last-look",
    ]);
  });

  test("no entries at all: nothing to read", () => {
    expect(readWalk(document, [])).toEqual({ stations: [], asked: 0, lookedAt: 0, remarks: [] });
  });

  test("a short walk leaves out what it does not ask for", () => {
    expect(segments(walk([], { depth: "short" }))).toEqual(["pin todo", "cables todo", "air todo"]);
  });

  test("a mark on a check that the walk does not ask for is shown and told apart, and is not counted", () => {
    const read = readWalk(document, walk([mark("tires", "fault", 5_000)], { purpose: "unhook" }));
    expect(
      read.stations.flatMap(({ checks }) => checks.map(({ check, asked }) => [check.key, asked])),
    ).toEqual([
      ["pin", true],
      ["tires", false],
    ]);
    expect([read.lookedAt, read.asked]).toEqual([0, 1]);
  });

  test("a check that the revision lacks and an entry of an unknown type are left out", () => {
    expect(
      segments(walk([mark("flux", "fault", 10), ["hum", { check: "pin" }, 20]], { purpose: "unhook" })),
    ).toEqual(["pin todo"]);
  });

  test("stations stand in the order in which the walk first comes to them", () => {
    const turned = {
      ...document,
      walks: { ...document.walks, unhook: { full: ["tires", "cables", "pin", "air"], short: ["pin"] } },
    };
    const entries = walk([], { purpose: "unhook" });
    expect(readWalk(turned, entries).stations.map(({ key }) => key)).toEqual([
      "last-look",
      "cables-and-cord",
      "car-nose",
    ]);
  });

  test("a station's checks stand as the walk takes them, the ones it does not ask for last", () => {
    const turned = {
      ...document,
      walks: { ...document.walks, unhook: { full: ["jacket", "cables"], short: ["cables"] } },
    };
    const entries = walk([mark("air", "good", 10)], { purpose: "unhook" });
    const [station] = readWalk(turned, entries).stations;
    expect(station!.checks.map(({ check }) => check.key)).toEqual(["jacket", "cables", "air"]);
  });
});

describe("marks and what stood before them", () => {
  const pin = (entries: readonly Entry[]) => readWalk(document, entries).stations[0]!.checks[0]!;

  test("the last mark counts; the ones before it stay, oldest first", () => {
    const read = pin(
      walk([
        mark("pin", "fault", 4_000, { note: "clip missing" }),
        mark("pin", "unseen", 9_000),
        mark("pin", "good", 30_000, { because: "fixed: new clip" }),
      ]),
    );
    expect(read.mark).toEqual({
      check: "pin",
      outcome: "good",
      because: "fixed: new clip",
      seq: 3,
      at: "2026-05-02T15:00:30.000Z",
      elapsedMs: 30_000,
      tookMs: 21_000,
    });
    expect(read.earlier.map(({ outcome, tookMs, note }) => [outcome, tookMs, note])).toEqual([
      ["fault", 4_000, "clip missing"],
      ["unseen", 5_000, undefined],
    ]);
    expect([read.segment, read.tookMs]).toEqual(["good", 30_000]);
  });

  test.each<[string, Step[], number, number]>([
    [
      "the same with what is wrong",
      [mark("pin", "fault", 4_000), mark("pin", "fault", 9_000, { note: "clip" })],
      0,
      9_000,
    ],
    [
      "a lamp board, signal by signal",
      [
        mark("pin", "unseen", 2_000, { seen: { tail: { left: "steady" } } }),
        mark("pin", "good", 5_000, { seen: { tail: { left: "steady" }, stop: { left: "steady" } } }),
      ],
      0,
      5_000,
    ],
    [
      "a lamp that was said to do something else",
      [
        mark("pin", "fault", 2_000, { seen: { tail: { left: "dark" } } }),
        mark("pin", "good", 5_000, { seen: { tail: { left: "steady" } } }),
      ],
      1,
      5_000,
    ],
    ["could not see, then good", [mark("pin", "unseen", 2_000), mark("pin", "good", 5_000)], 1, 5_000],
    ["the same again, nothing added", [mark("pin", "good", 2_000), mark("pin", "good", 5_000)], 1, 5_000],
  ])(
    "a mark that only goes on takes the other's place, a changed mind does not: %s",
    (_, steps, earlier, tookMs) => {
      const { checks } = readWalk(document, walk(steps)).stations[0]!;
      expect(checks[0]).toMatchObject({ tookMs, earlier: { length: earlier } });
    },
  );

  test("a resume voids a mark: none stands, the voided one is kept", () => {
    const read = pin(walk([mark("pin", "good", 4_000), ["resume", { again: ["pin", "cables"] }, 5_000]]));
    expect([read.mark, read.segment, read.earlier.length]).toEqual([null, "todo", 1]);
  });

  test("a mark after a resume counts again", () => {
    const read = pin(
      walk([mark("pin", "fault", 1), ["resume", { again: ["pin"] }, 2], mark("pin", "good", 3)]),
    );
    expect([read.segment, read.earlier.map(({ outcome }) => outcome)]).toEqual(["good", ["fault"]]);
  });

  test("time goes to the check whose mark ends it, and adds up by station", () => {
    const { stations } = readWalk(
      document,
      walk([
        mark("pin", "good", 10_000),
        mark("cables", "good", 25_000),
        ["note", { text: "Rain." }, 26_000],
        mark("air", "absent", 30_000),
      ]),
    );
    expect(stations.map(({ tookMs }) => tookMs)).toEqual([10_000, 19_000, 0]);
  });

  test("a walking time that runs backward gives no negative time", () => {
    const { stations } = readWalk(
      document,
      walk([mark("pin", "good", 10_000), mark("cables", "good", 4_000)]),
    );
    expect(stations[1]!.tookMs).toBe(0);
  });

  test("unseen and unmarked are not looked at; absent is", () => {
    const read = readWalk(
      document,
      walk([
        mark("pin", "unseen", 1),
        mark("cables", "good", 2),
        mark("air", "absent", 3),
        mark("tires", "fault", 4),
      ]),
    );
    expect([read.lookedAt, read.asked]).toEqual([3, 5]);
  });

  test("notes are kept in order; one without text is not a note", () => {
    const { remarks } = readWalk(
      document,
      walk([
        ["note", { text: "Rain." }, 10],
        ["note", { text: 7 }, 20],
      ]),
    );
    expect(remarks).toEqual([{ seq: 1, elapsedMs: 10, text: "Rain." }]);
  });
});

describe("what the two clocks say", () => {
  const arrival = (lagMs: number, atMs = START_MS) => ({
    entry: { at: new Date(atMs).toISOString() },
    receivedAt: new Date(atMs + lagMs).toISOString(),
  });
  const MIN = 60_000;
  const table: [string, number[], ReturnType<typeof clockRemark>][] = [
    ["no entries", [], null],
    ["received at once", [200, 300], null],
    ["a quick entry beside late ones", [50 * MIN, 2 * MIN], null],
    ["within a second the other way", [-999], null],
    ["opened after it was received", [-1_000], { kind: "ahead", byMs: 1_000 }],
    ["the worst of several", [5 * MIN, -3 * MIN, -10 * MIN], { kind: "ahead", byMs: 10 * MIN }],
    ["just under five minutes", [5 * MIN - 1], null],
    ["all of five minutes late", [5 * MIN, 9 * MIN], { kind: "apart", byMs: 5 * MIN }],
    ["ten days ahead", [-10 * 24 * 60 * MIN], { kind: "ahead", byMs: 10 * 24 * 60 * MIN }],
  ];
  test.each(table)("%s", (_, lags, expected) => {
    expect(clockRemark(lags.map((lagMs, at) => arrival(lagMs, START_MS + at * 1_000)))).toEqual(expected);
  });
});
