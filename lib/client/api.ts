import type * as z from "zod/mini";
import { problemShape, type ProblemDocument } from "../domain/problem";

/** What came of a request: an answer, a refusal with its code, or nothing that the server is known to have said. */
export type Answer<T> =
  | { kind: "answered"; value: T }
  | { kind: "refused"; problem: ProblemDocument; retryAfterS: number | null }
  | { kind: "unreached" };

/** How requests leave: the browser's fetch, or a stand-in. */
export type Fetch = (path: string, init: RequestInit) => Promise<Response>;

const PATIENCE_MS = 20_000;

/**
 * Calls one of our own routes. A page from a campground's sign-in portal, a proxy's error or anything else that is
 * not of the expected shape counts as not reached.
 * @param shape of the answer; the value returned is the JSON as received, so that it digests the same
 * @param body sent as JSON; a string is taken to be JSON already
 */
export async function call<T>(
  shape: z.ZodMiniType<T> | null,
  method: "GET" | "POST" | "DELETE",
  path: string,
  body?: unknown,
  fetch: Fetch = globalThis.fetch.bind(globalThis),
): Promise<Answer<T>> {
  try {
    const response = await fetch(path, {
      method,
      ...(body !== undefined && {
        body: typeof body === "string" ? body : JSON.stringify(body),
        headers: { "content-type": "application/json" },
      }),
      credentials: "same-origin",
      redirect: "error",
      cache: "no-store",
      signal: AbortSignal.timeout(PATIENCE_MS),
    });
    if (response.ok && shape === null) return { kind: "answered", value: undefined as T };
    const json: unknown = await response.json();
    if (!response.ok) return refusal(response, json);
    return shape!.safeParse(json).success ? { kind: "answered", value: json as T } : { kind: "unreached" };
  } catch {
    return { kind: "unreached" };
  }
}

function refusal(response: Response, json: unknown): Answer<never> {
  const problem = problemShape.safeParse(json);
  if (!problem.success) return { kind: "unreached" };
  const seconds = Number(response.headers.get("retry-after") ?? NaN);
  return { kind: "refused", problem: problem.data, retryAfterS: Number.isFinite(seconds) ? seconds : null };
}
