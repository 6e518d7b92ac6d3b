import { sheetReadingWords as say } from "../messages/sheet-reading";
import { optionWords } from "../messages/sheet-wiring";
import type { UnitSystem } from "../units";
import type { SheetDifference } from "./compare";
import type { Field, SheetPhoto } from "./field";
import { at, outline, pointerTo, type ListOutline, type PartOutline } from "./outline";
import { quantityKinds, shownIn, siMember, siOf, type QuantityKind, type QuantityOf } from "./quantity";
import type { Sheet } from "./sheet";

/** One field of a sheet as it is read: an undefined value has not been looked for, null is not known. */
export interface Line {
  pointer: string;
  label: string;
  field: Field;
  value: unknown;
}

/** A list of a sheet's part with what it is called and the words for one item of it. */
export interface ReadList {
  outline: ListOutline;
  items: Record<string, unknown>[];
}

/** A part of a sheet as it is read. `there` is false where the sheet says that this rig has no such piece. */
export interface ReadPart {
  key: string;
  title: string;
  there: boolean;
  known: Line[];
  unknown: Line[];
  gaps: Line[];
  lists: ReadList[];
}

/** A sheet part by part in reading order: what is written down, what is not known, what nobody has looked for. */
export function readParts(sheet: Sheet): ReadPart[] {
  return outline.map((part) => readPart(part, part.path, at(sheet, part.path)));
}

/** One coach, car or piece of gear by itself, as a sheet said of it; `kind` is `coach`, `car` or a gear's key. */
export function readThing(kind: string, state: Record<string, unknown>): ReadPart | null {
  const part = outline.find(({ thing, path }) => thing && path.at(-1) === kind);
  return part ? readPart(part, [], state) : null;
}

function readPart(
  { path, title, fields, words, lists }: PartOutline,
  within: readonly string[],
  values: Record<string, unknown> | undefined,
): ReadPart {
  const lines = Object.entries(fields).map(([key, field]) => ({
    pointer: pointerTo([...within, key]),
    label: words[key]!.label,
    field,
    value: values?.[key],
  }));
  return {
    key: path.at(-1) ?? "rig",
    title,
    there: values?.there !== false,
    known: lines.filter(({ value }) => value !== undefined && value !== null),
    unknown: lines.filter(({ value }) => value === null),
    gaps: lines.filter(({ value }) => value === undefined),
    lists: lists.map((one) => ({ outline: one, items: (values?.[one.key] as ReadList["items"]) ?? [] })),
  };
}

/** A value in words: quantities in the units of the reader, and as they were entered where that is another one. */
export function valueWords(field: Field, value: unknown, units: UnitSystem): string {
  if (value === undefined) return say.notLooked;
  if (value === null) return say.notKnown;
  if (isQuantity(field)) return quantityWords(field.kind, value as QuantityOf<QuantityKind>, units);
  switch (field.kind) {
    case "choice":
      return optionWords[value as string] ?? String(value);
    case "yes-no":
      return value ? say.yes : say.no;
    case "date":
      return dateWords(value as string);
    case "photo":
      return say.photograph(Math.ceil((value as SheetPhoto).bytes / 1024));
    default:
      return String(value);
  }
}

/** One side of a difference in words. */
export function sideWords(
  { pointer, field, list }: SheetDifference,
  value: unknown,
  units: UnitSystem,
): string {
  if (list) return value ? itemWords(list, value as Record<string, unknown>, units) : say.notThere;
  if (pointer.endsWith("/id")) return value ? say.numbered(value as string) : say.notNumbered;
  return valueWords(field!, value, units);
}

/** The SI value of a quantity in words, for whoever asks; null for anything else. */
export function siWords(field: Field, value: unknown): string | null {
  if (!isQuantity(field) || value === null || typeof value !== "object") return null;
  const unit = { massKg: "kg", lengthM: "m", speedMps: "m/s", distanceM: "m", pressurePa: "Pa" };
  const si = siOf(field.kind, value as QuantityOf<QuantityKind>);
  return figureWords(si, unit[siMember[field.kind]]);
}

/** An item of a list in one line: “From: Coach’s socket. To: Cord plug.” */
export function itemWords(list: ListOutline, item: Record<string, unknown>, units: UnitSystem): string {
  const own = Object.entries(list.fields).flatMap(([key, field]) =>
    item[key] === undefined ? [] : [`${list.words[key]!.label}: ${valueWords(field, item[key], units)}.`],
  );
  const inner = list.lists.flatMap((one) =>
    ((item[one.key] as Record<string, unknown>[] | undefined) ?? []).map(
      (each, index) => `${one.item(index + 1)}. ${itemWords(one, each, units)}`,
    ),
  );
  return [...own, ...inner].join(" ");
}

function isQuantity(field: Field): field is { kind: QuantityKind } {
  return (quantityKinds as readonly string[]).includes(field.kind);
}

function quantityWords(kind: QuantityKind, quantity: QuantityOf<QuantityKind>, units: UnitSystem): string {
  // A draft holds what was typed until it reads as a figure.
  if (typeof quantity !== "object") return String(quantity);
  const shown = shownIn(kind, quantity as never, units);
  const { entered } = quantity;
  const words = figureWords(shown.value, shown.unit);
  return shown.unit === entered.unit ? words : say.enteredAs(words, figureWords(entered.value, entered.unit));
}

const FIGURE = new Intl.NumberFormat("en-US", { maximumFractionDigits: 6 });

function figureWords(value: number, unit: string): string {
  return `${FIGURE.format(value)}\u00a0${unit}`;
}

// By hand: a date of a sheet has no time zone to be read in.
function dateWords(date: string): string {
  const [year, month, day] = date.split("-").map(Number);
  return `${say.months[month! - 1]}\u00a0${day}, ${year}`;
}
