import { sheetFormWords as say } from "../messages/sheet-form";
import { conductorWords, spliceWords } from "../messages/sheet-wiring";
import type { FieldWords } from "../messages/sheet-vehicles";
import { isGear } from "./draft";
import { parts, sectionOf, wiringLists, type PartKey, type SectionKey } from "./draft-sections";
import type { Field, Fields } from "./field";
import { conductorFields, spliceFields } from "./wiring";

/** Where a pointer into a sheet leads: the field itself, what kind it is, and how a person finds it in the form. */
export interface Place {
  /** To the field, where the pointer led into its value. */
  pointer: string;
  kind: Field["kind"] | null;
  section: SectionKey;
  /** “Coach: GCWR”, “Wiring, segment 2: Gauge, AWG”. */
  words: string;
}

type Table = { fields: Fields; words: Record<string, FieldWords> };

const innerLists: Record<string, Table> = {
  conductors: { fields: conductorFields, words: conductorWords },
  splices: { fields: spliceFields, words: spliceWords },
};

/** Reads a pointer into a sheet. One that leads nowhere is said as it stands. */
export function placeOf(pointer: string): Place {
  const steps = pointer.split("/").slice(1);
  const section = sectionOf(pointer);
  const [top = ""] = steps;
  if (top === "name" || top === "notes") {
    return { pointer: `/${top}`, kind: "text", section, words: say[top].label };
  }
  const gear = top === "gear";
  const key = (gear ? steps[1] : top) as PartKey;
  if (!(key in parts) || isGear(key) !== gear) return { pointer, kind: null, section, words: pointer };
  return within(steps, gear ? 2 : 1, parts[key], say.parts[key], section);
}

function within(steps: string[], at: number, table: Table, over: string, section: SectionKey): Place {
  const name = steps[at];
  const to = (length: number) => `/${steps.slice(0, length).join("/")}`;
  if (name === undefined) return { pointer: to(at), kind: null, section, words: over };
  const list = listOf(name);
  if (list && !(name in table.fields)) {
    const row = steps[at + 1];
    const called = `${over}, ${say.rows[name as keyof typeof say.rows]}`;
    if (row === undefined) return { pointer: to(at + 1), kind: null, section, words: called };
    return within(steps, at + 2, list, `${called} ${Number(row) + 1}`, section);
  }
  const field = table.fields[name];
  const label = table.words[name]?.label ?? (name === "id" ? say.id : name);
  return { pointer: to(at + 1), kind: field?.kind ?? null, section, words: `${over}: ${label}` };
}

function listOf(name: string): Table | undefined {
  return innerLists[name] ?? (wiringLists as Record<string, Table>)[name];
}
