import type { Field } from "./field";
import type { FieldWords } from "../messages/sheet-vehicles";
import { sectionOf, type SectionKey } from "./draft-sections";
import type { Fields } from "./field";
import { outline, pointerTo, type ListOutline } from "./outline";

/** Where a pointer into a sheet leads: the field itself, what kind it is, and how a person finds it in the form. */
export interface Place {
  /** To the field, where the pointer led into its value. */
  pointer: string;
  field: Field | null;
  section: SectionKey;
  /** “Coach: GCWR”, “Wiring, segment 2: Gauge, AWG”. */
  words: string;
}

type Table = { fields: Fields; words: Record<string, FieldWords>; lists: readonly ListOutline[] };

/** Reads a pointer into a sheet. One that leads nowhere is said as it stands. */
export function placeOf(pointer: string): Place {
  const steps = pointer.split("/").slice(1);
  const part =
    outline.find(({ path }) => path.length > 0 && path.every((step, at) => steps[at] === step)) ??
    outline[0]!;
  return (
    within(steps, part.path.length, part, part.title, sectionOf(pointer)) ?? {
      pointer,
      field: null,
      section: sectionOf(pointer),
      words: pointer,
    }
  );
}

function within(steps: string[], at: number, table: Table, over: string, section: SectionKey): Place | null {
  const name = steps[at];
  const whole = (words: string, length: number): Place => ({
    pointer: pointerTo(steps.slice(0, length)),
    field: null,
    section,
    words,
  });
  if (name === undefined) return at > 0 ? whole(over, at) : null;
  const list = table.lists.find(({ key }) => key === name);
  if (list) {
    const row = steps[at + 1];
    if (row === undefined) return whole(`${over}, ${list.title}`, at + 1);
    return within(steps, at + 2, list, `${over}, ${list.item(Number(row) + 1)}`, section);
  }
  const field = table.fields[name];
  if (!field) return null;
  return { ...whole(`${over}: ${table.words[name]!.label}`, at + 1), field };
}
