import type { FieldWords } from "../messages/sheet-vehicles";
import type { Fields } from "./field";
import type { GearKey } from "./gear";
import { at, outline, type ListOutline } from "./outline";
import { procedureFields } from "./procedure";
import type { Sheet } from "./sheet";

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
  title: string;
  /** Where it stands in a sheet. */
  path: readonly string[];
  fields: Fields;
  words: Record<string, FieldWords>;
  first: readonly string[];
  /** Whether it has a history of its own, and so an id. */
  thing: boolean;
  lists: readonly ListOutline[];
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
  brake: ["family", "proportional", "manualApply", "monitor", "boosterMode", "poweredFrom"],
  breakaway: ["there", "anchor", "switchAt", "battery"],
  wiring: ["style", "converter", "converterAt", "stopFeedRelay"],
  lightBar: ["heldBy", "power"],
  procedure: Object.keys(procedureFields),
};

/** The parts of a sheet that the form asks field by field. */
export const parts = Object.fromEntries(
  outline.flatMap((part) => {
    const key = part.path.at(-1) as PartKey | undefined;
    return key ? [[key, { ...part, key, first: first[key] } satisfies Part]] : [];
  }),
) as unknown as Record<PartKey, Part>;

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

/** What a sheet, or a draft of one, holds of a part. */
export function partIn(sheet: Sheet, { path }: Pick<Part, "path">): Record<string, unknown> | undefined {
  return at(sheet, path);
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

/** A manual that forbids it has its title and page too; what was written down before stays to be seen, and kept. */
function shownOfManual(says: unknown, key: string, value: unknown): boolean {
  if (key === "says" || says === "how") return true;
  return isFilled(value) || (says === "forbidden" && ["manual", "page", "photo"].includes(key));
}

function fieldShows(sheet: Sheet, part: Part, key: string): boolean {
  const values = partIn(sheet, part) ?? {};
  if (part.key === "procedure") return shownOfManual(values.says, key, values[key]);
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
