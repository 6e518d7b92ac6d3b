import { unitsOf, type QuantityKind, type QuantityOf } from "../sheet/quantity";

export type Quantity = QuantityOf<QuantityKind>;

/** A quantity as it was entered: "5,000 lb". */
export function figure({ entered: { value, unit } }: Quantity): string {
  return `${grouped(value)} ${unit}`;
}

/** An SI value in the unit that another of its kind was entered in, a weight to the whole, a length to a tenth. */
export function inUnitOf(like: QuantityOf<"mass"> | QuantityOf<"length">, si: number): string {
  const { unit } = like.entered;
  const [kind, digits] = "massKg" in like ? (["mass", 1] as const) : (["length", 10] as const);
  const of = [...unitsOf[kind].us, ...unitsOf[kind].si].find((one) => one.unit === unit)!.si;
  return `${grouped(Math.round((si / of) * digits) / digits)} ${unit}`;
}

// By hand: what a runtime's own formatting does is its own affair, and a list's digest hangs on it.
function grouped(value: number): string {
  const [whole = "", decimals] = String(value).split(".");
  const thousands = whole.replace(/\B(?=(\d{3})+$)/g, ",");
  return decimals ? `${thousands}.${decimals}` : thousands;
}
