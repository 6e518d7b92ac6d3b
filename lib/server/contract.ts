import "server-only";
import type * as z from "zod/mini";
import type { Action } from "@/lib/domain/permissions";
import type { ProblemCode } from "@/lib/domain/problem";

type Shape = z.ZodMiniType;

/** What a status brings: JSON of a shape, text of a media type, bytes within a media range, or nothing (`null`). */
export type AnswerKind = { json: Shape } | { media: string } | { bytes: `${string}/*` } | null;

/**
 * A route as declared once: its handler, its checks and its entry in the OpenAPI document all come from this.
 * A path's `{id}` is a UUID, its `{sha256}` a digest and its `{token}` an invitation's; anything else there is 404.
 */
export interface Contract {
  method: "GET" | "POST" | "PUT" | "DELETE";
  path: `/api/${string}`;
  summary: string;
  /** Answers without a session. */
  public?: true;
  /** What the member's role must allow. */
  action?: Action;
  query?: Shape;
  body?: {
    shape: Shape;
    /** The most bytes. */
    limit: number;
    /** Whether JSON of allowed size still holds more than can be taken at once; says what the most is. */
    tooMany?: (raw: unknown) => string | null;
  };
  /** A body of bytes, which the handler counts and checks while it streams. */
  upload?: {
    media: readonly string[];
    /** The most bytes. */
    limit: number;
  };
  answers: Record<number, AnswerKind>;
  /** Problems besides those that the pipeline itself can answer with. */
  problems?: readonly ProblemCode[];
  /** Seconds for which an answer may be kept; not at all where absent. */
  cacheS?: number;
}

/** Declares a route, keeping its exact type. */
export function contract<const C extends Contract>(declared: C): C {
  return declared;
}

/** Every problem that a route can answer with. */
export function problemCodes(route: Contract): ProblemCode[] {
  const codes: ProblemCode[] = [];
  if (route.method !== "GET") codes.push("foreign-origin");
  if (!route.public) codes.push("signed-out");
  if (route.action) codes.push("role-refused");
  if (route.body) codes.push("not-json", "too-large");
  if (route.upload) codes.push("too-large", "wrong-media", "wrong-content");
  if (route.body || route.query) codes.push("wrong-shape");
  if (route.path.includes("{")) codes.push("not-found");
  return [...codes, ...(route.problems ?? []), "unavailable", "internal"];
}
