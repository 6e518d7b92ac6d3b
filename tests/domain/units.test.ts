import { describe, expect, test } from "vitest";
import { fromEntered, toEntered, unitFor, type Quantity, type UnitSystem } from "@/lib/domain/units";

// Factors: NIST Special Publication 811 (2008), appendix B.8.
test.each<[Quantity, UnitSystem, number, object]>([
  [
    "pressure",
    "us",
    80,
    { quantity: "pressure", value: 551.580583, unit: "kPa", entered: { value: 80, unit: "psi" } },
  ],
  ["pressure", "si", 550, { quantity: "pressure", value: 550, unit: "kPa" }],
  ["length", "us", 1.5, { quantity: "length", value: 38.1, unit: "mm", entered: { value: 1.5, unit: "in" } }],
  ["length", "si", 38, { quantity: "length", value: 38, unit: "mm" }],
  ["voltage", "us", 12.64, { quantity: "voltage", value: 12.64, unit: "V" }],
  ["voltage", "si", 12.64, { quantity: "voltage", value: 12.64, unit: "V" }],
])("%s entered in %s: %d", (quantity, system, entered, measured) => {
  expect(fromEntered(quantity, entered, system)).toEqual(measured);
});

describe("what was kept, as a person reads it", () => {
  test.each<[Quantity, number, UnitSystem, object]>([
    ["pressure", 551.580583, "us", { value: 80, unit: "psi" }],
    ["pressure", 551.580583, "si", { value: 552, unit: "kPa" }],
    ["length", 38.1, "us", { value: 1.5, unit: "in" }],
    ["length", 38.1, "si", { value: 38, unit: "mm" }],
    ["voltage", 12.644, "us", { value: 12.64, unit: "V" }],
    ["pressure", -0.0001, "us", { value: 0, unit: "psi" }],
  ])("%s %d in %s", (quantity, kept, system, figure) => {
    expect(toEntered(quantity, kept, system)).toEqual(figure);
  });

  test("whole psi come back as they were entered", () => {
    for (let psi = 0; psi <= 150; psi += 1) {
      expect(toEntered("pressure", fromEntered("pressure", psi, "us").value, "us").value).toBe(psi);
    }
  });
});

test("a recorded figure has at most six decimals, whatever was typed", () => {
  const { value, entered } = fromEntered("length", 1 / 3, "us");
  expect([value, entered!.value]).toEqual([8.466667, 0.333333]);
});

test("the units by system", () => {
  expect(
    (["pressure", "length", "voltage"] as const).map((q) => [unitFor(q, "us"), unitFor(q, "si")]),
  ).toEqual([
    ["psi", "kPa"],
    ["in", "mm"],
    ["V", "V"],
  ]);
});
