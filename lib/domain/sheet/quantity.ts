import * as z from "zod/mini";
import type { UnitSystem } from "../units";

/** What a sheet measures. Each has one member in SI, with the unit in its name. */
export const quantityKinds = ["mass", "length", "speed", "distance", "pressure"] as const;
export type QuantityKind = (typeof quantityKinds)[number];

/** The SI member of each kind. */
export const siMember = {
  mass: "massKg",
  length: "lengthM",
  speed: "speedMps",
  distance: "distanceM",
  pressure: "pressurePa",
} as const satisfies Record<QuantityKind, string>;

/** The unit that a value was typed in and the SI value of one of it. */
interface Unit {
  unit: string;
  si: number;
}

// NIST Special Publication 811 (2008), appendix B.8: pound = 0.453 592 37 kg, inch = 0.0254 m, foot = 0.3048 m,
// mile = 1609.344 m (all exact), psi = 6894.757 Pa, here with the digits that follow from pound-force and inch.
const POUND = 0.45359237;
const MILE = 1609.344;

/** The units that each kind can be typed in, a person's usual one first. */
export const unitsOf: Record<QuantityKind, Record<UnitSystem, readonly Unit[]>> = {
  mass: { us: [{ unit: "lb", si: POUND }], si: [{ unit: "kg", si: 1 }] },
  length: {
    us: [
      { unit: "in", si: 0.0254 },
      { unit: "ft", si: 0.3048 },
    ],
    si: [
      { unit: "cm", si: 0.01 },
      { unit: "m", si: 1 },
      { unit: "mm", si: 0.001 },
    ],
  },
  speed: { us: [{ unit: "mph", si: MILE / 3600 }], si: [{ unit: "km/h", si: 1 / 3.6 }] },
  distance: { us: [{ unit: "mi", si: MILE }], si: [{ unit: "km", si: 1000 }] },
  pressure: { us: [{ unit: "psi", si: 6894.757293168361 }], si: [{ unit: "kPa", si: 1000 }] },
};

/** All units of a kind, those of a person's own system first. */
export function unitsFor(kind: QuantityKind, system: UnitSystem): string[] {
  const own = unitsOf[kind][system];
  const other = unitsOf[kind][system === "us" ? "si" : "us"];
  return [...own, ...other].map(({ unit }) => unit);
}

/** A quantity of a sheet: in SI as it is computed with, beside the value that someone typed in, which is kept. */
export type QuantityOf<K extends QuantityKind> = K extends QuantityKind
  ? { [M in (typeof siMember)[K]]: number } & { entered: { value: number; unit: string } }
  : never;

/** What someone typed as a sheet holds it, null where the unit is not one of the kind's. */
export function quantityOf<K extends QuantityKind>(
  kind: K,
  value: number,
  unit: string,
): QuantityOf<K> | null {
  const factor = factorOf(kind, unit);
  if (factor === null) return null;
  const entered = { value: rounded(value), unit };
  return { [siMember[kind]]: rounded(entered.value * factor), entered } as QuantityOf<K>;
}

/** The SI value of a quantity. */
export function siOf<K extends QuantityKind>(kind: K, quantity: QuantityOf<K>): number {
  return (quantity as unknown as Record<string, number>)[siMember[kind]]!;
}

/** A quantity in the first unit of a person's system, or as it was entered where that is in their system already. */
export function shownIn<K extends QuantityKind>(
  kind: K,
  quantity: QuantityOf<K>,
  system: UnitSystem,
): { value: number; unit: string } {
  const own = unitsOf[kind][system];
  if (own.some(({ unit }) => unit === quantity.entered.unit)) return quantity.entered;
  const { unit, si } = own[0]!;
  const value = siOf(kind, quantity) / si;
  return { value: Number(value.toPrecision(4)), unit };
}

/** The shape of a quantity: not negative, and both of its values say the same. */
export function quantityShape<K extends QuantityKind>(kind: K): z.ZodMiniType<QuantityOf<K>> {
  const member = siMember[kind];
  const shape = z.strictObject({
    [member]: z.number().check(z.nonnegative("cannot be negative")),
    entered: z.strictObject({
      value: z.number().check(z.nonnegative("cannot be negative")),
      unit: z.enum(unitsFor(kind, "us") as [string, ...string[]]),
    }),
  });
  return shape.check(
    z.refine((quantity) => saysTheSame(kind, quantity as QuantityOf<K>), "the entered value is another one"),
  ) as unknown as z.ZodMiniType<QuantityOf<K>>;
}

function saysTheSame<K extends QuantityKind>(kind: K, quantity: QuantityOf<K>): boolean {
  const { value, unit } = quantity.entered;
  const factor = factorOf(kind, unit);
  const si = siOf(kind, quantity);
  return factor !== null && Math.abs(si - value * factor) <= Math.max(1e-6, Math.abs(si) * 1e-6);
}

function factorOf(kind: QuantityKind, unit: string): number | null {
  const all = [...unitsOf[kind].us, ...unitsOf[kind].si];
  return all.find((one) => one.unit === unit)?.si ?? null;
}

// A record holds six decimals at the most. Adding 0 turns -0 into 0.
function rounded(value: number): number {
  return Math.round(value * 1e6) / 1e6 + 0;
}
