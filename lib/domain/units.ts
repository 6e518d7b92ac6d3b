/** How a person counts: US customary, or the SI units of everyday. */
export type UnitSystem = "us" | "si";

/** What a person measures at a rig. */
export type Quantity = "pressure" | "length" | "voltage";

type Unit = {
  /** As it is kept and written, and as it is shown after a figure. */
  unit: string;
  /** How many of the kept unit one of these is. */
  inKept: number;
  /** How many decimals a figure in it is shown with. */
  decimals: number;
};

// Exact by definition or as given: NIST Special Publication 811 (2008), appendix B.8: inch = 25.4 mm (exact);
// psi = 6.894757 kPa, here with the digits that follow from lbf = 0.45359237 kg x 9.80665 m/s2 over (25.4 mm)2.
const units: Record<Quantity, Record<UnitSystem, Unit>> = {
  pressure: {
    us: { unit: "psi", inKept: 6.894757293168361, decimals: 0 },
    si: { unit: "kPa", inKept: 1, decimals: 0 },
  },
  length: {
    us: { unit: "in", inKept: 25.4, decimals: 2 },
    si: { unit: "mm", inKept: 1, decimals: 0 },
  },
  voltage: {
    us: { unit: "V", inKept: 1, decimals: 2 },
    si: { unit: "V", inKept: 1, decimals: 2 },
  },
};

/** A figure with its unit. */
export type Figure = { value: number; unit: string };

/** A mark's `measured`: the value in its kept unit, and what was entered where that is another. */
export type Measured = Figure & { quantity: Quantity; entered?: Figure };

/** The unit that a person enters and reads a quantity in. */
export function unitFor(quantity: Quantity, system: UnitSystem): string {
  return units[quantity][system].unit;
}

/** A kept value in a person's unit, rounded as it is shown. */
export function toEntered(quantity: Quantity, kept: number, system: UnitSystem): Figure {
  const { unit, inKept, decimals } = units[quantity][system];
  return { value: rounded(kept / inKept, decimals), unit };
}

/** What a person entered, as it is recorded; entries hold at most six decimals. */
export function fromEntered(quantity: Quantity, entered: number, system: UnitSystem): Measured {
  const { unit, inKept } = units[quantity][system];
  const value = rounded(entered * inKept, 6);
  const kept = { quantity, value, unit: unitFor(quantity, "si") };
  return unit === kept.unit ? kept : { ...kept, entered: { value: rounded(entered, 6), unit } };
}

function rounded(value: number, decimals: number): number {
  // Adding 0 turns -0 into 0.
  return Number(value.toFixed(decimals)) + 0;
}
