/** A quantity in SI as it is computed with, beside the value that was typed in. */
type Entered<Name extends string> = Record<Name, number> & { entered: { value: number; unit: string } };

function quantity<Name extends string>(name: Name, factor: number, unit: string) {
  return (value: number): Entered<Name> =>
    ({ [name]: round(value * factor), entered: { value, unit } }) as Entered<Name>;
}

// A record holds six decimals at the most.
function round(value: number): number {
  return Math.round(value * 1e6) / 1e6;
}

export const pounds = quantity("massKg", 0.45359237, "lb");
export const inches = quantity("lengthM", 0.0254, "in");
export const feet = quantity("lengthM", 0.3048, "ft");
export const milesPerHour = quantity("speedMps", 0.44704, "mph");
