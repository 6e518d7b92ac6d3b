import * as z from "zod/mini";
import { UUID } from "./uuid";

// Zod compiles its parsers with `Function` unless told not to, which a Content-Security-Policy refuses.
z.config({ jitless: true });

/** Lower-case hex SHA-256. */
export const digestShape = z.string().check(z.regex(/^[0-9a-f]{64}$/, "64 lower-case hex digits"));

/** A lower-case UUID of any version. */
export const uuidShape = z.string().check(z.regex(UUID, "a lower-case UUID"));

/** A UUID of any version in either case, as some phones write theirs; compare and keep it in lower case. */
export const deviceIdShape = z.string().check(z.regex(new RegExp(UUID, "i"), "a UUID"));

/** A whole number from 0 to 2^53-1. */
export const countShape = z.int().check(z.nonnegative());

/** An RFC 3339 instant in UTC with milliseconds that a calendar has, from 1970 on. */
export const instantShape = z
  .string()
  .check(z.regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/, "RFC 3339, UTC, with milliseconds"))
  .check(z.refine(isInstant, "no such instant"));

function isInstant(text: string): boolean {
  const ms = Date.parse(text);
  return ms >= 0 && new Date(ms).toISOString() === text;
}
