import { gearNames, gearWords } from "../messages/sheet-gear";
import { sheetReadingWords as say } from "../messages/sheet-reading";
import { carWords, coachWords, type FieldWords } from "../messages/sheet-vehicles";
import {
  conductorWords,
  contactWords,
  groundWords,
  procedureWords,
  segmentWords,
  spliceWords,
  wiringWords,
} from "../messages/sheet-wiring";
import { fields, type Fields } from "./field";
import { gearFields, gearKeys } from "./gear";
import { procedureFields } from "./procedure";
import { RIG_NAME } from "./sheet";
import { carFields, coachFields } from "./vehicles";
import {
  conductorFields,
  contactFields,
  groundFields,
  segmentFields,
  spliceFields,
  wiringFields,
} from "./wiring";

/** A list within a part: what it and each of its items are called, and what an item holds. */
export interface ListOutline {
  key: string;
  title: string;
  item: (number: number) => string;
  fields: Fields;
  words: Record<string, FieldWords>;
  lists: readonly ListOutline[];
}

/** A part of a sheet: where it stands in it (an empty path is the sheet itself) and what it holds. */
export interface PartOutline {
  path: readonly string[];
  title: string;
  /** Whether it is a thing with a history of its own. */
  thing: boolean;
  fields: Fields;
  words: Record<string, FieldWords>;
  lists: readonly ListOutline[];
}

const rigFields = fields({
  name: { kind: "text", most: RIG_NAME },
  notes: { kind: "text", most: 1000, lines: true },
});
const rigWords = { name: { label: say.name, where: "" }, notes: { label: say.notes, where: "" } };

const list = (
  key: string,
  title: string,
  item: ListOutline["item"],
  fields: Fields,
  words: ListOutline["words"],
  lists: readonly ListOutline[] = [],
): ListOutline => ({ key, title, item, fields, words, lists });

const wiringLists = [
  list("socket", say.socket, say.contact, contactFields, contactWords),
  list("segments", say.segments, say.segment, segmentFields, segmentWords, [
    list("conductors", say.conductors, say.conductor, conductorFields, conductorWords),
    list("splices", say.splices, say.splice, spliceFields, spliceWords),
  ]),
  list("grounds", say.grounds, say.ground, groundFields, groundWords),
];

const thing = { thing: true, lists: [] } as const;
const plain = { thing: false, lists: [] } as const;

/** All that a sheet can hold, in the order in which it is read. Reading and comparing both follow it. */
export const outline: readonly PartOutline[] = [
  { ...plain, path: [], title: say.rig, fields: rigFields, words: rigWords },
  { ...thing, path: ["coach"], title: say.coach, fields: coachFields, words: coachWords },
  { ...thing, path: ["car"], title: say.car, fields: carFields, words: carWords },
  ...gearKeys.map((key) => ({
    ...thing,
    path: ["gear", key],
    title: gearNames[key],
    fields: gearFields[key] as Fields,
    words: gearWords[key] as Record<string, FieldWords>,
  })),
  {
    ...plain,
    path: ["wiring"],
    title: say.wiring,
    fields: wiringFields,
    words: wiringWords,
    lists: wiringLists,
  },
  { ...plain, path: ["procedure"], title: say.procedure, fields: procedureFields, words: procedureWords },
];

/** What a sheet has at a path, undefined where it has nothing. */
export function at(value: unknown, path: readonly string[]): Record<string, unknown> | undefined {
  let here = value;
  for (const step of path) here = (here as Record<string, unknown> | undefined)?.[step];
  return here as Record<string, unknown> | undefined;
}

/** A path as a JSON pointer; no member of a sheet needs escaping. */
export function pointerTo(path: readonly (string | number)[]): string {
  return path.map((step) => `/${step}`).join("");
}
