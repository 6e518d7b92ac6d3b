import { quantityOf, type QuantityKind, type QuantityOf } from "@/lib/domain/sheet/quantity";

function typed<K extends QuantityKind>(kind: K, unit: string) {
  return (value: number): QuantityOf<K> => {
    const quantity = quantityOf(kind, value, unit);
    if (!quantity) throw new Error(`no such unit of ${kind}: ${unit}`);
    return quantity;
  };
}

export const pounds = typed("mass", "lb");
export const inches = typed("length", "in");
export const feet = typed("length", "ft");
export const milesPerHour = typed("speed", "mph");
export const psi = typed("pressure", "psi");

/** The id of a thing of the demo: a coach, a car or a piece of gear. */
export function thingId(rig: number, thing: number): string {
  return `d3300000-0000-4000-8000-000000${rig}${String(thing).padStart(4, "0")}`;
}
