import { plainText } from "../json";
import { fieldsShown, isFilled, partIn, parts, partShows, type Part } from "./draft-sections";
import type { Fields } from "./field";
import { gearKeys } from "./gear";
import type { Sheet } from "./sheet";
import { conductorFields, contactFields, groundFields, segmentFields, spliceFields } from "./wiring";

/**
 * A sheet as someone types it: where a sheet has nothing a draft may have an empty text, and a figure that does not read
 * as one stays the text that was typed. A draft is never sent; {@link sheetOf} and {@link finished} make sheets of it.
 */
export type Draft = Record<string, unknown>;

/** The sheet that a draft amounts to, row for row, so that an error's place is the same in both. It may be wrong. */
export function sheetOf(draft: Draft): Sheet {
  return { v: 1, name: "", ...(withoutBlanks(draft) as object) } as Sheet;
}

function withoutBlanks(value: unknown): unknown {
  if (Array.isArray(value)) return value.map((each) => withoutBlanks(each) ?? {});
  if (value === null || typeof value !== "object") return value;
  const kept = Object.entries(value)
    .filter(([, each]) => isFilled(each))
    .map(([key, each]) => [key, withoutBlanks(each)] as const);
  return Object.fromEntries(kept);
}

/**
 * The sheet that is saved: without what is not on this rig, without empty rows, each coach, car and piece of gear with
 * an id.
 * @param newId makes an id for a thing that has none
 */
export function finished(draft: Draft, newId: () => string): Sheet {
  const sheet = sheetOf(draft);
  const thing = (part: Part) => finishedPart(sheet, part, newId);
  const gear = gearKeys.flatMap((key) => {
    const piece = partShows(sheet, key) ? thing(parts[key]) : null;
    return piece ? [[key, piece] as const] : [];
  });
  const members = {
    ...(sheet.notes !== undefined && { notes: sheet.notes }),
    coach: thing(parts.coach),
    car: thing(parts.car),
    gear: gear.length > 0 ? Object.fromEntries(gear) : null,
    wiring: finishedWiring(sheet),
    procedure: thing(parts.procedure),
  };
  const filled = Object.entries(members).filter(([key, value]) => key === "notes" || value !== null);
  return { v: 1, name: plainText(sheet.name), ...Object.fromEntries(filled) } as Sheet;
}

function finishedPart(sheet: Sheet, part: Part, newId: () => string): Record<string, unknown> | null {
  const values = partIn(sheet, part) ?? {};
  const { first, more } = fieldsShown(sheet, part);
  const kept = [...first, ...more].filter((key) => isFilled(values[key])).map((key) => [key, values[key]]);
  if (kept.length === 0) return null;
  const missing = values.there === false || values.there === null;
  const id = part.thing && !missing ? { id: values.id ?? newId() } : {};
  return { ...id, ...Object.fromEntries(kept) };
}

function finishedWiring(sheet: Sheet): Record<string, unknown> | null {
  const { socket, segments, grounds } = sheet.wiring ?? {};
  const lists = {
    socket: rows(socket),
    segments: rows(
      segments?.map(({ conductors, splices, ...segment }) => ({
        ...segment,
        ...some({ conductors: rows(conductors), splices: rows(splices) }),
      })),
    ),
    grounds: rows(grounds),
  };
  const all = { ...finishedPart(sheet, parts.wiring, () => ""), ...some(lists) };
  return Object.keys(all).length > 0 ? all : null;
}

const rows = <T extends object>(list: T[] | undefined) =>
  (list ?? []).filter((row) => Object.keys(row).length > 0);
const some = (lists: Record<string, unknown[]>) =>
  Object.fromEntries(Object.entries(lists).filter(([, list]) => list.length > 0));

/** A row of a list with nothing in it yet. Its fields are there all the same: one that is missing could not be emptied. */
export function blankRow(fields: Fields): Draft {
  return Object.fromEntries(Object.keys(fields).map((key) => [key, ""]));
}

/** A draft as the form takes it up, with every row whole. */
export function withBlanks(draft: Draft): Draft {
  const wiring = (draft.wiring ?? {}) as Record<string, Draft[] | undefined>;
  const whole = (rows: unknown, fields: Fields) =>
    ((rows ?? []) as Draft[]).map((row) => ({ ...blankRow(fields), ...row }));
  return {
    ...draft,
    wiring: {
      ...wiring,
      socket: whole(wiring.socket, contactFields),
      grounds: whole(wiring.grounds, groundFields),
      segments: whole(wiring.segments, segmentFields).map((segment: Draft) => ({
        ...segment,
        conductors: whole(segment.conductors, conductorFields),
        splices: whole(segment.splices, spliceFields),
      })),
    },
  };
}

/**
 * A sheet out of a file as a draft of a rig: the file says how things are and never which ones they are, so the ids
 * stay those of the draft.
 */
export function imported(sheet: Sheet, draft: Draft): Draft {
  const taken = withoutIds(sheet) as unknown as Draft;
  const mine = sheetOf(draft);
  for (const part of Object.values(parts)) {
    const id = part.thing && partIn(mine, part)?.id;
    const values = partIn(taken as unknown as Sheet, part);
    if (id && values) values.id = id;
  }
  return taken;
}

/** A sheet without the ids of its things: what it says, of whichever coach, car and gear. */
export function withoutIds(sheet: Sheet): Sheet {
  const copy = JSON.parse(JSON.stringify(sheet)) as Sheet;
  for (const part of Object.values(parts)) {
    if (part.thing) delete partIn(copy, part)?.id;
  }
  return copy;
}
