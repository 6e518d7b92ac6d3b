import { canonicalText } from "../json";
import { partIn, parts, type Part } from "./draft-sections";
import { pointerTo } from "./outline";
import { SHEET_VERSION, type Sheet } from "./sheet";

/** A field that both people changed, each to something else. Undefined where one of them emptied it. */
export interface Conflict {
  pointer: string;
  mine: unknown;
  theirs: unknown;
}

/** Two people's sheets over the one that both began with. */
export interface Merged {
  /** With every change of either; where they conflict, theirs until someone has chosen. */
  sheet: Sheet;
  /** Where only the other one changed something. */
  fromThem: string[];
  /** Where only this one did. */
  fromMe: string[];
  conflicts: Conflict[];
}

/** Merges field by field; a list of the wiring counts as one field, because its rows mean something only together. */
export function mergeSheets(base: Sheet, mine: Sheet, theirs: Sheet): Merged {
  const [before, ours, others] = [leaves(base), leaves(mine), leaves(theirs)];
  const merged: Merged = { sheet: fromLeaves(new Map()), fromThem: [], fromMe: [], conflicts: [] };
  const result = new Map<string, unknown>();
  for (const pointer of new Set([...before.keys(), ...ours.keys(), ...others.keys()])) {
    const [was, mineNow, theirsNow] = [before, ours, others].map((each) => each.get(pointer));
    const iChanged = !same(was, mineNow);
    const theyChanged = !same(was, theirsNow) && !same(mineNow, theirsNow);
    // An id says nothing that a person could choose by: what was saved first keeps its own.
    const takesTheirs = theyChanged && (!iChanged || pointer.endsWith("/id"));
    if (takesTheirs) merged.fromThem.push(pointer);
    else if (theyChanged) merged.conflicts.push({ pointer, mine: mineNow, theirs: theirsNow });
    else if (iChanged) merged.fromMe.push(pointer);
    result.set(pointer, theyChanged ? theirsNow : mineNow);
  }
  const told = (pointers: string[]) => pointers.filter((pointer) => !pointer.endsWith("/id"));
  return {
    ...merged,
    sheet: fromLeaves(result),
    fromThem: told(merged.fromThem),
    fromMe: told(merged.fromMe),
  };
}

/** The sheet with one field chosen; undefined empties it. */
export function withField(sheet: Sheet, pointer: string, value: unknown): Sheet {
  return fromLeaves(leaves(sheet).set(pointer, value));
}

function same(one: unknown, other: unknown): boolean {
  if (one === undefined || other === undefined) return one === other;
  return canonicalText(one) === canonicalText(other);
}

function leaves(sheet: Sheet): Map<string, unknown> {
  const found = new Map<string, unknown>([["/name", sheet.name]]);
  if (sheet.notes !== undefined) found.set("/notes", sheet.notes);
  for (const part of Object.values(parts)) {
    const values = partIn(sheet, part) ?? {};
    for (const key of keysOf(part))
      if (values[key] !== undefined) found.set(pointerTo([...part.path, key]), values[key]);
  }
  return found;
}

function keysOf({ fields, lists }: Part): string[] {
  return ["id", ...Object.keys(fields), ...lists.map(({ key }) => key)];
}

function fromLeaves(found: ReadonlyMap<string, unknown>): Sheet {
  const sheet: Record<string, unknown> = { v: SHEET_VERSION, name: "" };
  for (const [pointer, value] of found) {
    if (value === undefined) continue;
    const steps = pointer.split("/").slice(1);
    const last = steps.pop()!;
    let at = sheet;
    for (const step of steps) at = (at[step] ??= {}) as Record<string, unknown>;
    at[last] = value;
  }
  return sheet as unknown as Sheet;
}
