import "server-only";
import type * as z from "zod/mini";
import { Problem, problemDocument } from "@/lib/domain/problem";
import type { AnswerKind, Contract } from "./contract";

interface Extras {
  headers?: Record<string, string>;
  /** `Set-Cookie` values. */
  cookies?: string[];
}

type Content<K extends AnswerKind> = K extends { json: infer S extends z.ZodMiniType }
  ? { json: z.output<S> }
  : K extends { media: string }
    ? { text: string }
    : K extends { bytes: string }
      ? { bytes: Uint8Array<ArrayBuffer>; media: string }
      : object;

/** What a handler may answer by its contract. */
export type Reply<C extends Contract> = {
  [S in keyof C["answers"] & number]: { status: S } & Content<C["answers"][S]> & Extras;
}[keyof C["answers"] & number];

type Bodies = { json: unknown; text: string; bytes: Uint8Array<ArrayBuffer>; media: string };

/** No browser may take an answer for anything but what it is declared as. */
const asDeclared = { "x-content-type-options": "nosniff" };

/** The response for a reply. */
export function replyResponse(route: Contract, reply: { status: number } & Extras): Response {
  const { json, text, bytes, media } = reply as Partial<Bodies>;
  const kind = route.answers[reply.status] ?? null;
  const headers = new Headers({ "cache-control": cacheControl(route), ...asDeclared, ...reply.headers });
  if (kind)
    headers.set("content-type", "json" in kind ? "application/json" : "media" in kind ? kind.media : media!);
  for (const cookie of reply.cookies ?? []) headers.append("set-cookie", cookie);
  const body = kind === null ? null : "json" in kind ? JSON.stringify(json) : "media" in kind ? text : bytes;
  return new Response(body, { status: reply.status, headers });
}

/** The response for a problem: an RFC 9457 document. */
export function problemResponse(problem: Problem): Response {
  const { retryAfterS } = problem.extra;
  return new Response(JSON.stringify(problemDocument(problem)), {
    status: problem.status,
    headers: {
      "content-type": "application/problem+json",
      "cache-control": "no-store",
      ...asDeclared,
      ...(retryAfterS !== undefined && { "retry-after": String(retryAfterS) }),
    },
  });
}

function cacheControl({ cacheS }: Contract): string {
  return cacheS === undefined ? "no-store" : `public, max-age=${cacheS}`;
}
