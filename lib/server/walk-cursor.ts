import "server-only";
import * as z from "zod/mini";
import { uuidShape } from "@/lib/domain/shapes";

/** Where a page of walks ends: the last row's place in the order. */
export interface WalkPlace {
  sortAt: Date;
  id: string;
}

// The years that a DATETIME column holds.
const placeShape = z.tuple([z.int().check(z.gte(0), z.lte(Date.UTC(9999, 11, 31))), uuidShape]);

/** An opaque `after` for the page that follows this place. */
export function cursorOf({ sortAt, id }: WalkPlace): string {
  return Buffer.from(JSON.stringify([sortAt.getTime(), id])).toString("base64url");
}

/** The place that a cursor stands for, or null where it is not one of ours. */
export function placeOf(cursor: string): WalkPlace | null {
  try {
    const [sortAtMs, id] = placeShape.parse(JSON.parse(Buffer.from(cursor, "base64url").toString("utf8")));
    const place = { sortAt: new Date(sortAtMs), id };
    return cursorOf(place) === cursor ? place : null;
  } catch {
    return null;
  }
}
