import {
  contactWords,
  groundWords,
  procedureWords,
  segmentWords,
  wiringWords,
} from "../messages/sheet-wiring";
import { gearWords } from "../messages/sheet-gear";
import { carWords, coachWords, type FieldWords } from "../messages/sheet-vehicles";
import type { Fields } from "./field";
import { gearFields, gearKeys, type GearKey } from "./gear";
import { procedureFields } from "./procedure";
import type { Sheet } from "./sheet";
import { carFields, coachFields } from "./vehicles";
import { contactFields, groundFields, segmentFields, wiringFields } from "./wiring";

/** What the form asks in turn, in walking order; `look` is where it is looked over and saved. */
export const sectionKeys = [
  "rig",
  "coach",
  "car",
  "bar",
  "plate",
  "lines",
  "brake",
  "wiring",
  "manual",
  "look",
] as const;
export type SectionKey = (typeof sectionKeys)[number];

export type PartKey = "coach" | "car" | GearKey | "wiring" | "procedure";

/** One thing of the sheet with its fields: those that the list hangs on first, the rest for limits and geometry. */
export interface Part {
  key: PartKey;
  /** Where it stands in a sheet, as the form names it. */
  path: string;
  fields: Fields;
  words: Record<string, FieldWords>;
  first: readonly string[];
  /** Whether it has a history of its own, and so an id. */
  thing: boolean;
}

// What the list, the limits that rule a rig out, and someone who has to know the thing again go by.
const first: Record<PartKey, readonly string[]> = {
  coach: [
    "description",
    "gvwr",
    "gcwr",
    "receiverRating",
    "brakes",
    "suspension",
    "jacks",
    "signals",
    "engineBrakeLightsStopLamps",
    "socketType",
  ],
  car: [
    "year",
    "description",
    "makerModelTrim",
    "gearbox",
    "drive",
    "transferCase",
    "loaded",
    "lampType",
    "lampSignals",
    "stopLampsWhileTowing",
    "parkingBrake",
    "booster",
    "adjustablePedals",
    "airSuspension",
  ],
  dropReceiver: ["there", "direction", "offset", "rating"],
  towBar: ["coupling", "stowsOn", "armEnds", "selfAligning", "rating"],
  coupler: ["rating", "ballSize"],
  basePlate: ["arms", "rating"],
  shortCables: ["there", "rating"],
  cables: ["count", "rating"],
  cord: ["shape", "carEnd"],
  chargeLine: ["there", "plug", "fuseAmps"],
  airLine: ["there"],
  brake: ["family", "manualApply", "monitor", "boosterMode", "poweredFrom"],
  breakaway: ["there", "anchor", "switchAt", "battery"],
  wiring: ["style", "converter", "converterAt", "stopFeedRelay"],
  lightBar: ["heldBy", "power"],
  procedure: Object.keys(procedureFields),
};

const gearPart = (key: GearKey): Part => ({
  key,
  path: `gear.${key}`,
  fields: gearFields[key],
  words: gearWords[key],
  first: first[key],
  thing: true,
});

export const parts: Record<PartKey, Part> = {
  coach: {
    key: "coach",
    path: "coach",
    fields: coachFields,
    words: coachWords,
    first: first.coach,
    thing: true,
  },
  car: { key: "car", path: "car", fields: carFields, words: carWords, first: first.car, thing: true },
  ...(Object.fromEntries(gearKeys.map((key) => [key, gearPart(key)])) as Record<GearKey, Part>),
  wiring: {
    key: "wiring",
    path: "wiring",
    fields: wiringFields,
    words: wiringWords,
    first: first.wiring,
    thing: false,
  },
  procedure: {
    key: "procedure",
    path: "procedure",
    fields: procedureFields,
    words: procedureWords,
    first: first.procedure,
    thing: false,
  },
};

/** The parts of each section. */
export const sectionParts: Record<SectionKey, readonly PartKey[]> = {
  rig: [],
  coach: ["coach"],
  car: ["car"],
  bar: ["dropReceiver", "towBar", "coupler"],
  plate: ["basePlate", "shortCables", "cables"],
  lines: ["cord", "chargeLine", "airLine"],
  brake: ["brake", "breakaway"],
  wiring: ["wiring", "lightBar"],
  manual: ["procedure"],
  look: [],
};

/** The lists of the wiring, with the fields of one row. */
export const wiringLists = {
  socket: { fields: contactFields, words: contactWords },
  segments: { fields: segmentFields, words: segmentWords },
  grounds: { fields: groundFields, words: groundWords },
} as const;

type Loose = Record<string, unknown> | undefined;

/** What a sheet, or a draft of one, holds of a part. */
export function partIn(sheet: Sheet, { key }: Pick<Part, "key">): Loose {
  if (key in gearFields) return (sheet.gear as Record<string, Loose> | undefined)?.[key];
  return sheet[key as "coach"] as Loose;
}

/** Whether a value has been entered, not known included. */
export function isFilled(value: unknown): boolean {
  return value !== undefined && value !== "";
}

/** Whether a part belongs on this rig as far as its sheet says so. */
export function partShows(sheet: Sheet, key: PartKey): boolean {
  const coupling = sheet.gear?.towBar?.coupling;
  if (key === "coupler") return coupling === "ball" || coupling === "pintle";
  if (key === "shortCables") return sheet.gear?.basePlate?.arms === "removable";
  return key !== "lightBar" || sheet.wiring?.style === "light-bar";
}

/** The fields of a part that mean something on this rig, in the order in which they are asked. */
export function fieldsShown(sheet: Sheet, part: Part): { first: string[]; more: string[] } {
  const rest = Object.keys(part.fields).filter((key) => !part.first.includes(key));
  const shows = (key: string) => fieldShows(sheet, part, key);
  return { first: part.first.filter(shows), more: rest.filter(shows) };
}

function fieldShows(sheet: Sheet, part: Part, key: string): boolean {
  const values = partIn(sheet, part) ?? {};
  if (part.key === "procedure") return key === "says" || values.says === "how";
  if (key === "converterAt") return values.converter !== "none" && isFilled(values.converter);
  if (key === "ballSize") return sheet.gear?.towBar?.coupling === "ball";
  if (!("there" in part.fields) || key === "there" || values.there === true) return true;
  // Someone wrote down what it is before they said that it is there.
  return values.there !== false && Object.keys(part.fields).some((each) => isFilled(values[each]));
}

/** How far a section is: fields that mean something here, and those of them that are filled in or not known. */
export function progressOf(sheet: Sheet, section: SectionKey): { filled: number; of: number } {
  if (section === "rig") return { filled: sheet.name ? 1 : 0, of: 1 };
  const shown = sectionParts[section]
    .filter((key) => partShows(sheet, key))
    .flatMap((key) => {
      const { first, more } = fieldsShown(sheet, parts[key]);
      return [...first, ...more].map((field) => isFilled(partIn(sheet, parts[key])?.[field]));
    });
  return { filled: shown.filter(Boolean).length, of: shown.length };
}

/** The section in which a pointer into a sheet is asked. */
export function sectionOf(pointer: string): SectionKey {
  const [, top, second] = pointer.split("/");
  const key = top === "gear" ? second : top;
  return sectionKeys.find((section) => (sectionParts[section] as readonly string[]).includes(key!)) ?? "rig";
}
