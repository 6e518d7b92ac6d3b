import * as z from "zod/mini";

/** Every way a request can be turned down: its HTTP status and the sentence that a person reads. */
export const problems = {
  "foreign-origin": { status: 403, title: "This request did not come from Hookfast's own pages." },
  "signed-out": { status: 401, title: "Sign in first." },
  "wrong-credentials": { status: 401, title: "That address and password do not belong together." },
  "role-refused": { status: 403, title: "Your role cannot do this." },
  "not-json": { status: 400, title: "The request is not JSON." },
  "too-large": { status: 413, title: "The request is larger than can be taken at once." },
  "wrong-shape": { status: 422, title: "The request is not of the expected shape." },
  "not-found": { status: 404, title: "There is nothing here." },
  "device-taken": { status: 409, title: "That device id belongs to another key or member." },
  "address-taken": { status: 409, title: "There is an account with that address already." },
  "id-taken": { status: 409, title: "An id in this request belongs to something that exists already." },
  "stale-base": { status: 409, title: "Someone else has saved this rig meanwhile." },
  "newer-schema": { status: 422, title: "This sheet was written by a newer Hookfast." },
  "impossible-sheet": { status: 422, title: "Something on this sheet cannot be so." },
  "too-many-attempts": { status: 429, title: "Too many failed attempts. Wait, then try again." },
  "bad-link": {
    status: 403,
    title: "This address for a photograph has run out or was changed. Ask for it again.",
  },
  "wrong-media": { status: 415, title: "A photograph is taken as JPEG, WebP or PNG." },
  "wrong-content": { status: 422, title: "What came is not the photograph that was recorded." },
  unavailable: { status: 503, title: "The database does not answer. Try again shortly." },
  internal: { status: 500, title: "Something went wrong on the server." },
} as const;

export type ProblemCode = keyof typeof problems;

/** One thing wrong with a request, at an RFC 6901 pointer into its body (or the query's member name). */
export interface FieldError {
  pointer: string;
  detail: string;
}

/** A refusal as a value: what a handler returns when the outcome is an expected one. */
export class Problem {
  constructor(
    readonly code: ProblemCode,
    readonly extra: { detail?: string; errors?: FieldError[]; retryAfterS?: number } = {},
  ) {}

  get status(): (typeof problems)[ProblemCode]["status"] {
    return problems[this.code].status;
  }
}

/** An RFC 9457 problem document with Hookfast's stable `code`. */
export const problemShape = z.object({
  type: z.literal("about:blank"),
  title: z.string(),
  status: z.int(),
  code: z.enum(Object.keys(problems) as [ProblemCode, ...ProblemCode[]]),
  detail: z.optional(z.string()),
  errors: z.optional(z.array(z.object({ pointer: z.string(), detail: z.string() }))),
});
export type ProblemDocument = z.infer<typeof problemShape>;

/** The document for a problem, as it goes over the wire. */
export function problemDocument({ code, extra }: Problem): ProblemDocument {
  const { detail, errors } = extra;
  return {
    type: "about:blank",
    title: problems[code].title,
    status: problems[code].status,
    code,
    ...(detail && { detail }),
    ...(errors && { errors }),
  };
}
