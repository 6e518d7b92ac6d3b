import type { MarkBody } from "@/lib/domain/entry";
import type { Measure } from "@/lib/domain/revision";

/** The unit in which this person reads such a value. */
export function unitFor({ unit }: Measure): string {
  return unit;
}

/** What was tapped, as the mark keeps it: in the check's unit, with what was entered beside it; null where it is no number. */
export function measuredOf(measure: Measure, text: string, unit: string): MarkBody["measured"] | null {
  const value = Number(text);
  if (text === "" || !Number.isFinite(value)) return null;
  return { quantity: measure.quantity, value, unit: measure.unit, entered: { value, unit } };
}
