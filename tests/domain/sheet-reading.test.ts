import { describe, expect, test } from "vitest";
import type { Field } from "@/lib/domain/sheet/field";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import { itemWords, readParts, siWords, valueWords } from "@/lib/domain/sheet/reading";
import { outline } from "@/lib/domain/sheet/outline";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import type { UnitSystem } from "@/lib/domain/units";
import { fullSheet } from "../support/sheets";

const mass: Field = { kind: "mass" };
const length: Field = { kind: "length" };

describe("valueWords", () => {
  const cases: [Field, unknown, UnitSystem, string][] = [
    [mass, undefined, "us", "Nobody has looked yet"],
    [mass, null, "us", "Not known"],
    [mass, quantityOf("mass", 26000, "lb"), "us", "26,000\u00a0lb"],
    [mass, "26,", "us", "26,"],
    // NIST SP 811: 1 lb = 0.453 592 37 kg (exact), so 26,000 lb = 11,793.401 62 kg; four digits are shown.
    [mass, quantityOf("mass", 26000, "lb"), "si", "11,790\u00a0kg, entered as 26,000\u00a0lb"],
    // 1 in = 0.0254 m (exact), so 55.9 cm = 22.007 874… in.
    [length, quantityOf("length", 55.9, "cm"), "us", "22.01\u00a0in, entered as 55.9\u00a0cm"],
    [length, quantityOf("length", 38.4, "ft"), "us", "38.4\u00a0ft"],
    [{ kind: "speed" }, quantityOf("speed", 65, "mph"), "us", "65\u00a0mph"],
    // 1 mi = 1.609 344 km (exact).
    [{ kind: "distance" }, quantityOf("distance", 200, "mi"), "si", "321.9\u00a0km, entered as 200\u00a0mi"],
    [{ kind: "pressure" }, quantityOf("pressure", 33, "psi"), "us", "33\u00a0psi"],
    [{ kind: "choice", of: ["direct", "ball"] }, "ball", "us", "Coupler on a ball"],
    [{ kind: "yes-no" }, true, "us", "Yes"],
    [{ kind: "yes-no" }, false, "us", "No"],
    [{ kind: "year" }, 2021, "us", "2021"],
    [{ kind: "count", most: 4 }, 0, "us", "0"],
    [{ kind: "date" }, "2026-03-02", "us", "Mar\u00a02, 2026"],
    [{ kind: "text", most: 80 }, "rear engine", "us", "rear engine"],
    [{ kind: "photo" }, { sha256: "", bytes: 240_001, mime: "image/jpeg" }, "us", "Photograph, 235 kB"],
  ];
  test.each(cases)("%j %j in %s units", (field, value, units, words) => {
    expect(valueWords(field, value, units)).toBe(words);
  });

  test.each(["us", "si"] as const)("every field of a full sheet has words in %s units", (units) => {
    const lines = readParts(fullSheet()).flatMap(({ known }) => known);
    expect(lines).toHaveLength(outline.reduce((count, { fields }) => count + Object.keys(fields).length, 0));
    for (const { pointer, field, value } of lines) {
      expect(valueWords(field, value, units), pointer).toMatch(/\S/);
      expect(valueWords(field, value, units), pointer).not.toMatch(/undefined|NaN|\[object/);
    }
  });
});

test("siWords gives a quantity as it is computed with, and nothing for anything else", () => {
  expect(siWords(mass, quantityOf("mass", 26000, "lb"))).toBe("11,793.40162\u00a0kg");
  expect(siWords({ kind: "pressure" }, quantityOf("pressure", 1, "kPa"))).toBe("1,000\u00a0Pa");
  expect(siWords(mass, null)).toBeNull();
  expect(siWords(mass, undefined)).toBeNull();
  expect(siWords({ kind: "year" }, 2021)).toBeNull();
});

describe("readParts", () => {
  const sheet: Sheet = {
    v: 1,
    name: "Rig",
    coach: { id: "0193a000-0000-7000-8000-000000000001", jacks: false, gvwr: null },
    gear: { airLine: { there: false }, chargeLine: { there: true }, dropReceiver: { there: null } },
    wiring: { segments: [{ from: "socket", conductors: [{ color: "green", near: "right" }] }] },
  };
  const parts = readParts(sheet);
  const part = (key: string) => parts.find((one) => one.key === key)!;

  test("tells apart what is known, not known and not looked for", () => {
    const { known, unknown, gaps } = part("coach");
    expect(known.map(({ pointer, value }) => [pointer, value])).toEqual([["/coach/jacks", false]]);
    expect(unknown.map(({ pointer }) => pointer)).toEqual(["/coach/gvwr"]);
    expect(gaps.map(({ pointer }) => pointer)).toContain("/coach/gcwr");
    expect(known.length + unknown.length + gaps.length).toBe(
      Object.keys(outline.find(({ path }) => path[0] === "coach")!.fields).length,
    );
  });

  test.each([
    ["airLine", false],
    ["chargeLine", true],
    ["dropReceiver", true],
    ["towBar", true],
    ["coach", true],
  ])("%s is there: %s", (key, there) => {
    expect(part(key).there).toBe(there);
  });

  test("has the parts of a sheet in the outline's order, the rig first and the manual last", () => {
    expect(parts.map(({ title }) => title)).toEqual(outline.map(({ title }) => title));
    expect(parts[0]!.key).toBe("rig");
    expect(parts.at(-1)!.key).toBe("procedure");
  });

  test("has the wiring's lists, and words for an item with what hangs below it", () => {
    const [socket, segments] = part("wiring").lists;
    expect(socket!.items).toEqual([]);
    expect(itemWords(segments!.outline, segments!.items[0]!, "us")).toBe(
      "From: socket. Wire 1. Color: green. Does, at the near end: Right turn.",
    );
  });
});
