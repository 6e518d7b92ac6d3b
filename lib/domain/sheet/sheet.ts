import * as z from "zod/mini";
import { findJsonFault } from "../json";
import type { FieldError } from "../problem";
import { uuidShape } from "../shapes";
import { fieldShapes, type ValuesOf } from "./field";
import { gearFields, gearKeys, type GearKey } from "./gear";
import { procedureFields } from "./procedure";
import { carFields, coachFields } from "./vehicles";
import { wiringShape, type Wiring } from "./wiring";

/** The newest sheet that this version reads and writes. */
export const SHEET_VERSION = 1;

/** The most characters of a rig's name. */
export const RIG_NAME = 60;

/** A coach, a car or a piece of gear: a thing with a history of its own, which outlives the rig. */
export type Thing<T> = { id?: string } & T;

export type Coach = Thing<ValuesOf<typeof coachFields>>;
export type Car = Thing<ValuesOf<typeof carFields>>;
export type Gear = { [K in GearKey]?: Thing<ValuesOf<(typeof gearFields)[K]>> };
export type Procedure = ValuesOf<typeof procedureFields>;

/** How a rig is built: what someone read off the vehicles and their plates. */
export interface Sheet {
  v: typeof SHEET_VERSION;
  name: string;
  notes?: string | null;
  coach?: Coach;
  car?: Car;
  gear?: Gear;
  wiring?: Wiring;
  procedure?: Procedure;
}

function thing(fields: Parameters<typeof fieldShapes>[0]) {
  return z.optional(z.strictObject({ id: z.optional(uuidShape), ...fieldShapes(fields) }));
}

/** The shape of a sheet: members that it does not know are refused, so that a typing error does not vanish. */
export const sheetShape = z.strictObject({
  v: z.literal(SHEET_VERSION),
  name: z
    .string()
    .check(z.minLength(1, "A rig has a name."))
    .check(z.maxLength(RIG_NAME, `longer than ${RIG_NAME} characters`)),
  notes: z.optional(z.nullable(z.string().check(z.maxLength(1000, "longer than 1000 characters")))),
  coach: thing(coachFields),
  car: thing(carFields),
  gear: z.optional(z.strictObject(Object.fromEntries(gearKeys.map((key) => [key, thing(gearFields[key])])))),
  wiring: z.optional(wiringShape),
  procedure: z.optional(z.strictObject(fieldShapes(procedureFields))),
}) as unknown as z.ZodMiniType<Sheet>;

/** What came of reading a sheet: the sheet, or everything that keeps it from being one. */
export type ReadSheet =
  | { kind: "sheet"; sheet: Sheet }
  | { kind: "newer"; version: number }
  | { kind: "wrong"; errors: FieldError[] };

/** Reads a sheet from JSON of any origin: an import, a request, a draft, a revision. */
export function readSheet(raw: unknown): ReadSheet {
  const version = (raw as { v?: unknown } | null | undefined)?.v;
  if (typeof version === "number" && Number.isInteger(version) && version > SHEET_VERSION)
    return { kind: "newer", version };
  const fault = findJsonFault(raw);
  if (fault) return { kind: "wrong", errors: [fault] };
  const parsed = sheetShape.safeParse(raw);
  // As received: reading never changes a sheet.
  if (parsed.success) return { kind: "sheet", sheet: raw as Sheet };
  const errors = parsed.error.issues.map((issue) => ({
    pointer: issue.path.map((step) => `/${String(step)}`).join(""),
    detail: issue.code === "unrecognized_keys" ? `not known: ${issue.keys.join(", ")}` : issue.message,
  }));
  return { kind: "wrong", errors };
}

/** The sheet of a revision; null for a list from before there were sheets. */
export function sheetIn(document: { sheet: unknown }): Sheet | null {
  const read = readSheet(document.sheet);
  return read.kind === "sheet" ? read.sheet : null;
}

/** Whether a piece of gear is on a rig as far as its sheet says: yes, no, or nobody knows. */
export function isThere(gear: Gear | undefined, key: GearKey): boolean | null {
  const piece = gear?.[key] as { there?: boolean | null } | undefined;
  return piece?.there ?? null;
}
