import * as z from "zod/mini";
import { plainText } from "../json";
import { quantityShape, type QuantityKind, type QuantityOf } from "./quantity";

/**
 * What kind of thing stands in a field. A sheet is declared once, as tables of fields: its shape, the form, the
 * reading, the comparison and the JSON Schema all follow from them.
 */
export type Field =
  | { kind: QuantityKind }
  | { kind: "text"; most: number; lines?: true }
  | { kind: "choice"; of: readonly string[] }
  | { kind: "yes-no" }
  | { kind: "year" }
  | { kind: "date" }
  | { kind: "count"; most: number }
  | { kind: "photo" };

/** A photograph that a sheet names: the digest of its bytes, their number and their media type. */
export interface SheetPhoto {
  sha256: string;
  bytes: number;
  mime: string;
}

export type Fields = Record<string, Field>;

/** What a field holds when it is known. */
export type ValueOf<F extends Field> = F extends { kind: "choice"; of: readonly (infer Option)[] }
  ? Option
  : F extends { kind: "text" | "date" }
    ? string
    : F extends { kind: "yes-no" }
      ? boolean
      : F extends { kind: "year" | "count" }
        ? number
        : F extends { kind: "photo" }
          ? SheetPhoto
          : F extends { kind: infer K extends QuantityKind }
            ? QuantityOf<K>
            : never;

/** What a table of fields holds. Absent: nobody has looked yet. Null: looked for, and not known. */
export type ValuesOf<T extends Fields> = { [K in keyof T]?: ValueOf<T[K]> | null };

const shapes = {
  text: ({ most }: { most: number }) =>
    z
      .string()
      .check(z.minLength(1, "has nothing in it"))
      .check(z.maxLength(most, `longer than ${most} characters`))
      .check(z.refine((text) => plainText(text) !== "", "has nothing in it")),
  choice: ({ of }: { of: readonly string[] }) => z.enum(of as [string, ...string[]]),
  "yes-no": () => z.boolean(),
  year: () => z.int().check(z.gte(1900, "before 1900"), z.lte(2100, "after 2100")),
  date: () => z.iso.date("not a date"),
  count: ({ most }: { most: number }) =>
    z.int().check(z.gte(0, "cannot be negative"), z.lte(most, `more than ${most}`)),
  photo: () =>
    z.strictObject({
      sha256: z.string().check(z.regex(/^[0-9a-f]{64}$/, "not a digest")),
      bytes: z.int().check(z.gte(1)),
      mime: z.string().check(z.maxLength(100)),
    }),
};

/** The shape of one field's known value. */
export function fieldShape(field: Field): z.ZodMiniType {
  const make = (shapes as unknown as Record<string, (field: Field) => z.ZodMiniType>)[field.kind];
  return make ? make(field) : quantityShape(field.kind as QuantityKind);
}

/** The members of an object of these fields: each may be absent, or null where it is not known. */
export function fieldShapes<T extends Fields>(fields: T): { [K in keyof T]: z.ZodMiniType<ValuesOf<T>[K]> } {
  return Object.fromEntries(
    Object.entries(fields).map(([key, field]) => [key, z.optional(z.nullable(fieldShape(field)))]),
  ) as unknown as { [K in keyof T]: z.ZodMiniType<ValuesOf<T>[K]> };
}

/** Declares a table of fields, keeping its exact type. */
export function fields<const T extends Fields>(declared: T): T {
  return declared;
}
