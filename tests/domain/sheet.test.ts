import * as fc from "fast-check";
import { describe, expect, test } from "vitest";
import { findJsonFault } from "@/lib/domain/json";
import { sheetFaultWords } from "@/lib/domain/messages/sheet-faults";
import { impossible, unusual } from "@/lib/domain/sheet/faults";
import {
  quantityKinds,
  quantityOf,
  quantityShape,
  shownIn,
  siOf,
  unitsFor,
} from "@/lib/domain/sheet/quantity";
import { isThere, readSheet, type Sheet } from "@/lib/domain/sheet/sheet";
import { changing, wiresAt } from "@/lib/domain/sheet/wiring";
import { feet, inches, pounds } from "@/seeders/demo/quantities";
import { householdSheet } from "@/seeders/demo/sheets/household";
import { longCoachSheet } from "@/seeders/demo/sheets/long-coach";
import { shopSheet } from "@/seeders/demo/sheets/shop";
import { shortCoachSheet } from "@/seeders/demo/sheets/short-coach";

const demo = { householdSheet, shopSheet, longCoachSheet, shortCoachSheet };
const bare: Sheet = { v: 1, name: "Bare" };

describe("a quantity keeps what was typed beside SI", () => {
  // NIST Special Publication 811 (2008), appendix B.8: lb, in, ft, mile and km/h exact; psi to its seven digits.
  test.each([
    ["mass", 1, "lb", 0.453592],
    ["mass", 22000, "lb", 9979.03214],
    ["length", 1, "in", 0.0254],
    ["length", 32.5, "ft", 9.906],
    ["length", 54, "cm", 0.54],
    ["speed", 65, "mph", 29.0576],
    ["speed", 100, "km/h", 27.777778],
    ["distance", 500, "mi", 804672],
    ["pressure", 33, "psi", 227526.990675],
  ] as const)("%s: %d %s is %d in SI", (kind, value, unit, si) => {
    const quantity = quantityOf(kind, value, unit)!;
    expect(siOf(kind, quantity)).toBe(si);
    expect(quantity.entered).toEqual({ value, unit });
    expect(quantityShape(kind).safeParse(quantity).success).toBe(true);
  });

  test("whatever is typed in any unit can be recorded, and is taken back by its own shape", () => {
    const typed = fc.record({
      kind: fc.constantFrom(...quantityKinds),
      value: fc.double({ min: 0, max: 1e6, noNaN: true }),
      nth: fc.nat(),
    });
    fc.assert(
      fc.property(typed, ({ kind, value, nth }) => {
        const units = unitsFor(kind, "us");
        const quantity = quantityOf(kind, value, units[nth % units.length]!)!;
        expect(findJsonFault(quantity)).toBeNull();
        expect(quantityShape(kind).safeParse(quantity).error).toBeUndefined();
      }),
    );
  });

  test("a unit of another kind is none", () => expect(quantityOf("mass", 1, "in")).toBeNull());

  test("two values that do not say the same, and a negative one, are refused", () => {
    const shape = quantityShape("mass");
    expect(shape.safeParse({ massKg: 1000, entered: { value: 1000, unit: "lb" } }).success).toBe(false);
    expect(shape.safeParse({ massKg: -1, entered: { value: -1, unit: "kg" } }).success).toBe(false);
    expect(shape.safeParse({ massKg: 1 }).success).toBe(false);
  });

  test("it is shown as it was typed to whoever counts so, and in their own first unit to others", () => {
    expect(shownIn("length", feet(32.5), "us")).toEqual({ value: 32.5, unit: "ft" });
    expect(shownIn("length", inches(21.5), "si")).toEqual({ value: 54.61, unit: "cm" });
    expect(shownIn("mass", pounds(22000), "si")).toEqual({ value: 9979, unit: "kg" });
  });
});

describe("reading a sheet", () => {
  test.each(Object.entries(demo))("the demo's %s reads, with nothing impossible or unusual", (_, sheet) => {
    expect(readSheet(sheet)).toEqual({ kind: "sheet", sheet });
    expect([impossible(sheet), unusual(sheet)]).toEqual([[], []]);
  });

  test("not known and not looked for are both read, and stay apart", () => {
    const sheet = { ...bare, coach: { gvwr: null }, gear: { airLine: { there: null } } };
    expect(readSheet(sheet)).toEqual({ kind: "sheet", sheet });
    expect(isThere(sheet.gear, "airLine")).toBeNull();
    expect(isThere({ airLine: { there: false } }, "airLine")).toBe(false);
  });

  test("a newer version is told from a wrong sheet", () => {
    expect(readSheet({ v: 2, name: "From ahead", anything: {} })).toEqual({ kind: "newer", version: 2 });
    expect(readSheet({ v: 0, name: "From before" }).kind).toBe("wrong");
  });

  test.each([
    ["no object", "x", ""],
    ["no name", { v: 1, name: "" }, "/name"],
    ["a member that nobody knows", { ...bare, coach: { gvw: pounds(1) } }, "/coach"],
    ["a weight without its unit", { ...bare, coach: { gvwr: 22000 } }, "/coach/gvwr"],
    ["a negative weight", { ...bare, car: { curb: quantityOf("mass", -1, "lb") } }, "/car/curb/massKg"],
    ["an option that is none", { ...bare, gear: { towBar: { coupling: "rope" } } }, "/gear/towBar/coupling"],
    ["a month that no year has", { ...bare, coach: { weighedOn: "2025-13-01" } }, "/coach/weighedOn"],
    ["half a character", { ...bare, notes: "\ud83d" }, "/notes"],
    ["words of nothing", { ...bare, car: { description: "   " } }, "/car/description"],
    ["an id that is none", { ...bare, car: { id: "7" } }, "/car/id"],
    ["too many segments", { ...bare, wiring: { segments: Array(25).fill({}) } }, "/wiring/segments"],
    [
      "a splice of no kind",
      { ...bare, wiring: { segments: [{ splices: [{ kind: "tape" }] }] } },
      "/wiring/segments/0/splices/0/kind",
    ],
  ])("%s is refused, with the place", (_, raw, pointer) => {
    const read = readSheet(raw);
    expect(read.kind).toBe("wrong");
    expect(read.kind === "wrong" && read.errors[0]?.pointer).toBe(pointer);
  });
});

describe("what cannot be so is named by its field", () => {
  const coach = { gvwr: pounds(22000), gcwr: pounds(26000), length: feet(32), wheelbase: inches(228) };
  test.each<[string, Sheet, string, string]>([
    [
      "GCWR below GVWR",
      { ...bare, coach: { ...coach, gcwr: pounds(21999) } },
      "/coach/gcwr",
      sheetFaultWords.gcwrBelowGvwr,
    ],
    [
      "a wheelbase longer than the coach",
      { ...bare, coach: { ...coach, length: feet(18) } },
      "/coach/wheelbase",
      sheetFaultWords.wheelbaseOverLength,
    ],
    ["a car that weighs nothing", { ...bare, car: { curb: pounds(0) } }, "/car/curb", sheetFaultWords.zero],
    [
      "wire of gauge 0",
      { ...bare, wiring: { segments: [{}, { gaugeAwg: 0 }] } },
      "/wiring/segments/1/gaugeAwg",
      sheetFaultWords.zero,
    ],
  ])("%s", (_, sheet, pointer, detail) => expect(impossible(sheet)).toEqual([{ pointer, detail }]));

  test("equal is possible, and what is not known is not judged", () => {
    expect(impossible({ ...bare, coach: { ...coach, gcwr: pounds(22000) } })).toEqual([]);
    expect(impossible({ ...bare, coach: { ...coach, gcwr: null } })).toEqual([]);
  });
});

describe("what is hardly ever so is taken, with a word", () => {
  test.each<[string, Sheet, string, string]>([
    [
      "loaded below curb",
      { ...bare, car: { curb: pounds(3000), loaded: pounds(2900) } },
      "/car/loaded",
      sheetFaultWords.loadedBelowCurb,
    ],
    [
      "an axle over its rating",
      { ...bare, coach: { frontAxleRating: pounds(8000), frontAxleLoaded: pounds(8001) } },
      "/coach/frontAxleLoaded",
      sheetFaultWords.axleOver,
    ],
    [
      "GVWR over the axles",
      {
        ...bare,
        coach: { gvwr: pounds(20000), frontAxleRating: pounds(7000), rearAxleRating: pounds(12000) },
      },
      "/coach/gvwr",
      sheetFaultWords.gvwrOverAxles,
    ],
    [
      "more without brakes than with",
      { ...bare, coach: { towLimitBraked: pounds(1000), towLimitUnbraked: pounds(5000) } },
      "/coach/towLimitUnbraked",
      sheetFaultWords.unbrakedOver,
    ],
    [
      "kilograms typed as pounds",
      { ...bare, car: { curb: pounds(900) } },
      "/car/curb",
      sheetFaultWords.carWeight,
    ],
    [
      "one cable",
      { ...bare, gear: { cables: { count: 1 } } },
      "/gear/cables/count",
      sheetFaultWords.twoCables,
    ],
  ])("%s", (_, sheet, pointer, detail) => {
    expect(impossible(sheet)).toEqual([]);
    expect(unusual(sheet)).toEqual([{ pointer, detail }]);
  });
});

test("a conductor that does one thing at one end and another at the other is found", () => {
  const right = longCoachSheet.wiring!.segments![2]!;
  expect(changing(right).map(({ color }) => color)).toEqual(["yellow", "green"]);
  expect(changing(householdSheet.wiring!.segments![0]!)).toEqual([]);
  expect(
    changing({
      conductors: [
        { color: "red", near: "stop" },
        { near: null, far: "tail" },
      ],
    }),
  ).toEqual([]);
});

test("a segment's wires begin as the socket was measured, or as the segment before it ends", () => {
  const wiring = longCoachSheet.wiring!;
  expect(wiresAt(wiring, 0).map(({ near }) => near)).toEqual([
    "ground",
    "stop",
    "tail",
    "charge",
    "left",
    "right",
  ]);
  const changed = {
    segments: [{ conductors: [{ color: "red", near: "stop", far: "left" }, { near: "tail" }] }],
  };
  expect(wiresAt(changed as typeof wiring, 1)).toEqual([{ color: "red", near: "left" }]);
  expect(wiresAt({}, 0)).toEqual([]);
  expect(wiresAt({}, 3)).toEqual([]);
});
