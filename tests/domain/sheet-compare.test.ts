import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { canonicalText } from "@/lib/domain/json";
import { sheetDifferences, thingDifferences } from "@/lib/domain/sheet/compare";
import { outline } from "@/lib/domain/sheet/outline";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import { readSheet, sheetShape, type Sheet } from "@/lib/domain/sheet/sheet";
import { sideWords } from "@/lib/domain/sheet/reading";
import { anySheet, fullSheet } from "../support/sheets";

const pounds = (value: number) => quantityOf("mass", value, "lb");
const base: Sheet = { v: 1, name: "Rig" };

/** The differences as someone reads them: where, before and after. */
function read(before: Partial<Sheet>, after: Partial<Sheet>) {
  return sheetDifferences({ ...base, ...before }, { ...base, ...after }).map((difference) => [
    difference.pointer,
    difference.where.join(", "),
    sideWords(difference, difference.before, "us"),
    sideWords(difference, difference.after, "us"),
  ]);
}

describe("sheetDifferences", () => {
  const id = "0193a000-0000-7000-8000-000000000001";
  const cases: [string, Partial<Sheet>, Partial<Sheet>, string[][]][] = [
    ["nothing", { coach: { gvwr: pounds(26000) } }, { coach: { gvwr: pounds(26000) } }, []],
    ["the name", {}, { name: "Unit 14" }, [["/name", "Rig, Name", "Rig", "Unit 14"]]],
    [
      "a weight",
      { coach: { gvwr: pounds(26000) } },
      { coach: { gvwr: pounds(24000) } },
      [["/coach/gvwr", "Coach, GVWR", "26,000\u00a0lb", "24,000\u00a0lb"]],
    ],
    [
      "the unit in which the same weight was entered",
      { car: { curb: quantityOf("mass", 1000, "kg") } },
      { car: { curb: { massKg: 1000, entered: { value: 2204.622622, unit: "lb" } } } },
      [["/car/curb", "Car, Curb weight", "2,205\u00a0lb, entered as 1,000\u00a0kg", "2,204.622622\u00a0lb"]],
    ],
    [
      "looked for and not known, where nobody had looked",
      {},
      { gear: { towBar: { rating: null } } },
      [["/gear/towBar/rating", "Tow bar, Rating", "Nobody has looked yet", "Not known"]],
    ],
    [
      "another piece in its place",
      { gear: { cord: { serial: "A" } } },
      { gear: { cord: { id, serial: "B" } } },
      [
        ["/gear/cord/id", "Cord, Which one it is", "Not in the book", "Book number 0193a000"],
        ["/gear/cord/serial", "Cord, Serial number", "A", "B"],
      ],
    ],
    [
      "one wire of one segment",
      { wiring: { segments: [{}, { conductors: [{ color: "green", near: "right", far: "right" }] }] } },
      { wiring: { segments: [{}, { conductors: [{ color: "green", near: "right", far: "stop" }] }] } },
      [
        [
          "/wiring/segments/1/conductors/0/far",
          "Wiring, Segment 2, Wire 1, Does, at the far end",
          "Right turn",
          "Stop",
        ],
      ],
    ],
    [
      "a segment more",
      { wiring: { segments: [{ from: "socket" }] } },
      {
        wiring: { segments: [{ from: "socket" }, { from: "plug", splices: [{ at: "sill", kind: "tap" }] }] },
      },
      [
        [
          "/wiring/segments/1",
          "Wiring, Segment 2",
          "Not there",
          "From: plug. Splice 1. Place: sill. Kind: Displacement tap.",
        ],
      ],
    ],
    [
      "a ground point less",
      { wiring: { grounds: [{ at: "left frame rail", devices: "lamps" }] } },
      {},
      [
        [
          "/wiring/grounds/0",
          "Wiring, Ground point 1",
          "Ground point: left frame rail. What hangs on it: lamps.",
          "Not there",
        ],
      ],
    ],
    [
      "what the manual says",
      { procedure: { says: "not-recorded" } },
      { procedure: { says: "how", bar: "before" } },
      [
        [
          "/procedure/says",
          "The car’s own manual, What the car’s own manual says",
          "Not written down yet",
          "It says how",
        ],
        [
          "/procedure/bar",
          "The car’s own manual, Its steps come",
          "Nobody has looked yet",
          "Before the bar is on",
        ],
      ],
    ],
  ];
  test.each(cases)("tells %s", (_, before, after, differences) => {
    expect(read(before, after)).toEqual(differences);
  });

  test("has a side only where there is something", () => {
    const [difference] = sheetDifferences(base, { ...base, notes: null });
    expect(difference).toEqual({
      pointer: "/notes",
      where: ["Rig", "Notes"],
      field: { kind: "text", most: 1000, lines: true },
      after: null,
    });
  });

  test("comes in reading order", () => {
    const pointers = sheetDifferences(base, fullSheet()).map(({ pointer }) => pointer.split("/")[1]!);
    const parts = pointers.filter((part, at) => part !== pointers[at - 1]);
    expect(parts).toEqual(["name", "notes", "coach", "car", "gear", "wiring", "procedure"]);
  });
});

test("the outline has every member of the sheet's shape", () => {
  const sheet = fullSheet();
  expect(readSheet(sheet)).toMatchObject({ kind: "sheet" });
  expect(sheetShape.safeParse({ ...sheet, more: 1 }).success).toBe(false);
  const jsonMembers = (value: object) => Object.keys(value).sort();
  const shape = (sheetShape as unknown as { def: { shape: Record<string, unknown> } }).def.shape;
  expect(jsonMembers(sheet)).toEqual(jsonMembers(shape));
  for (const { path, fields } of outline) {
    expect(Object.keys(fields).length, path.join("/")).toBeGreaterThan(0);
  }
});

describe("as properties", () => {
  test("a sheet does not differ from itself", () => {
    fc.assert(fc.property(anySheet, (sheet) => sheetDifferences(sheet, structuredClone(sheet)).length === 0));
  });

  test("the differences, made in the one sheet, make it the other", () => {
    fc.assert(
      fc.property(anySheet, anySheet, (before, after) => {
        const made = structuredClone(before) as unknown as Record<string, unknown>;
        // Backward, so that the items of a list that are to go are taken from its end.
        for (const difference of sheetDifferences(before, after).reverse()) {
          set(made, difference.pointer.slice(1).split("/"), difference.after);
        }
        expect(canonicalText(bare(made))).toBe(canonicalText(bare(after)));
      }),
    );
  });

  test("both ways round there are as many", () => {
    fc.assert(
      fc.property(anySheet, anySheet, (one, other) => {
        const [there, back] = [sheetDifferences(one, other), sheetDifferences(other, one)];
        expect(back.map(({ pointer }) => pointer)).toEqual(there.map(({ pointer }) => pointer));
        expect(back.map(({ before }) => before)).toEqual(there.map(({ after }) => after));
      }),
    );
  });
});

describe("thingDifferences", () => {
  test("compares two states of one piece", () => {
    const [difference, ...more] = thingDifferences("brake", { family: "air" }, { family: "surge" });
    expect(more).toEqual([]);
    expect(difference).toMatchObject({
      pointer: "/family",
      where: ["Supplemental brake", "What kind it is"],
      before: "air",
      after: "surge",
    });
  });

  test.each(["coach", "car", "lightBar"])("knows a %s", (kind) => {
    expect(thingDifferences(kind, { description: "one" }, { description: "other" })).toHaveLength(1);
  });

  test("has nothing to say of a kind that it does not know", () => {
    expect(thingDifferences("wiring", { style: "bulbs" }, { style: "diodes" })).toEqual([]);
  });
});

function set(target: Record<string, unknown>, steps: string[], value: unknown): void {
  const [step, ...rest] = steps as [string, ...string[]];
  if (rest.length > 0) {
    const inner = (target[step] ??= /^\d+$/.test(rest[0]!) ? [] : {});
    set(inner as Record<string, unknown>, rest, value);
  } else if (value !== undefined) target[step] = value;
  else if (Array.isArray(target)) target.splice(Number(step), 1);
  else delete target[step];
}

/** A value without its empty objects and lists. */
function bare(value: unknown): unknown {
  if (typeof value !== "object" || value === null) return value;
  if (Array.isArray(value)) return value.map((item) => bare(item) ?? {});
  const members = Object.entries(value)
    .map(([key, member]) => [key, bare(member)] as const)
    .filter(([, member]) => member !== undefined);
  if (members.every(([, member]) => Array.isArray(member) && member.length === 0)) return undefined;
  return Object.fromEntries(members.filter(([, m]) => !(Array.isArray(m) && m.length === 0)));
}
