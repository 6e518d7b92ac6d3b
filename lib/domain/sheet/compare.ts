import { canonicalText } from "../json";
import type { FieldWords } from "../messages/sheet-vehicles";
import { sheetReadingWords as say } from "../messages/sheet-reading";
import type { Field, Fields } from "./field";
import { at, outline, pointerTo, type ListOutline, type PartOutline } from "./outline";
import type { Sheet } from "./sheet";

/** One difference between two sheets. An absent side has nothing there; null means looked for and not known. */
export interface SheetDifference {
  pointer: string;
  /** Part, item and field, in words. */
  where: string[];
  /** What kind of value stands there. */
  field?: Field;
  /** In place of a field: the list of an item that one side has whole and the other has not. */
  list?: ListOutline;
  before?: unknown;
  after?: unknown;
}

type Values = Record<string, unknown> | undefined;
type Path = readonly (string | number)[];

/**
 * What differs between two sheets, field by field in reading order. The items of a list are compared by their
 * position; one that only one side has is a single difference.
 */
export function sheetDifferences(before: Sheet, after: Sheet): SheetDifference[] {
  return outline.flatMap((part) => inPart(part, part.path, at(before, part.path), at(after, part.path)));
}

/** What differs in one thing between two of its states; `kind` is `coach`, `car` or a gear's key. */
export function thingDifferences(kind: string, before: Values, after: Values): SheetDifference[] {
  const part = outline.find(({ thing, path }) => thing && path.at(-1) === kind);
  return part ? inPart(part, [], before, after) : [];
}

function inPart(
  { title, thing, fields, words, lists }: PartOutline,
  path: Path,
  before: Values,
  after: Values,
) {
  const own = inFields(fields, words, path, [title], before, after);
  const inLists = lists.flatMap((one) => inList(one, path, [title], before, after));
  const id = thing ? inFields(idField, idWords, path, [title], before, after) : [];
  return [...id, ...own, ...inLists];
}

// Which coach this is differs where another one took its place, or where it was entered in the book since.
const idField: Fields = { id: { kind: "text", most: 36 } };
const idWords = { id: { label: say.identity, where: "" } };

function inFields(
  fields: Fields,
  words: Record<string, FieldWords>,
  path: Path,
  where: string[],
  before: Values,
  after: Values,
): SheetDifference[] {
  return Object.entries(fields).flatMap(([key, field]) => {
    const sides = { ...side("before", before?.[key]), ...side("after", after?.[key]) };
    if (same(before?.[key], after?.[key])) return [];
    return [{ pointer: pointerTo([...path, key]), where: [...where, words[key]!.label], field, ...sides }];
  });
}

function inList(list: ListOutline, path: Path, where: string[], before: Values, after: Values) {
  const [was, is] = [itemsOf(before?.[list.key]), itemsOf(after?.[list.key])];
  const places = Array.from({ length: Math.max(was.length, is.length) }, (_, index) => index);
  return places.flatMap((index): SheetDifference[] => {
    const item = { path: [...path, list.key, index], where: [...where, list.item(index + 1)] };
    const [old, now] = [was[index], is[index]];
    if (!old || !now) {
      const sides = { ...side("before", old), ...side("after", now) };
      return [{ pointer: pointerTo(item.path), where: item.where, list, ...sides }];
    }
    return [
      ...inFields(list.fields, list.words, item.path, item.where, old, now),
      ...list.lists.flatMap((inner) => inList(inner, item.path, item.where, old, now)),
    ];
  });
}

function itemsOf(value: unknown): Record<string, unknown>[] {
  return (value as Record<string, unknown>[] | undefined) ?? [];
}

function side<N extends "before" | "after">(name: N, value: unknown): { [M in N]?: unknown } {
  return value === undefined ? {} : ({ [name]: value } as { [M in N]?: unknown });
}

function same(one: unknown, other: unknown): boolean {
  if (one === undefined || other === undefined) return one === other;
  return canonicalText(one) === canonicalText(other);
}
