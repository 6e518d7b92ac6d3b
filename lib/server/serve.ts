import "server-only";
import type * as z from "zod/mini";
import { TOKEN } from "@/lib/domain/invitation";
import type { Member } from "@/lib/domain/member";
import { may } from "@/lib/domain/permissions";
import { Problem } from "@/lib/domain/problem";
import { UUID } from "@/lib/domain/uuid";
import { readJson } from "./body";
import type { Contract } from "./contract";
import { problemOf } from "./failure";
import { bodyErrors, queryErrors } from "./field-errors";
import { isForeign } from "./origin";
import { problemResponse, replyResponse, type Reply } from "./reply";
import { signedIn, type SignedIn } from "./session";

type Parsed<S> = S extends z.ZodMiniType ? z.output<S> : undefined;

/** What a handler works with: everything in it has been checked by the contract. */
export interface Call<C extends Contract> {
  request: Request;
  /** Public routes do not ask who is there. */
  session: C extends { public: true } ? null : SignedIn;
  member: C extends { public: true } ? null : Member;
  /** The path's `{id}`, a UUID; empty where the path has none. */
  id: string;
  /** The path's `{sha256}`, a digest; empty where the path has none. */
  sha256: string;
  /** The path's `{token}`, as an invitation's link has it; empty where the path has none. */
  token: string;
  query: Parsed<C["query"]>;
  body: C extends { body: { shape: infer S } } ? Parsed<S> : undefined;
  /** The body as it was received, untouched by any schema: what digests are taken of. */
  raw: unknown;
}

/** What may stand in a path's places. */
const places = { id: UUID, sha256: /^[0-9a-f]{64}$/, token: TOKEN };

interface RouteContext {
  params: Promise<unknown>;
}

/**
 * Makes a route handler of a contract: origin, session, role, parse, then `handle` finds the thing, does and responds.
 * What `handle` throws is answered with 503 (the database is away) or 500.
 */
export function serve<const C extends Contract>(
  route: C,
  handle: (call: Call<C>) => Promise<Reply<C> | Problem>,
): (request: Request, context?: RouteContext) => Promise<Response> {
  return async (request, context) => {
    let session: SignedIn | null = null;
    const answer = async (): Promise<Response> => {
      if (isForeign(request)) return problemResponse(new Problem("foreign-origin"));
      session = route.public ? null : await signedIn(request);
      const call = await checked(route, request, session, await context?.params);
      const outcome = call instanceof Problem ? call : await handle(call as unknown as Call<C>);
      return outcome instanceof Problem ? problemResponse(outcome) : replyResponse(route, outcome);
    };
    const response = await answer().catch((thrown: unknown) => problemResponse(problemOf(thrown)));
    const renewal = (session as SignedIn | null)?.renewal;
    // A handler that sets the cookie itself knows better: it has signed someone in or out.
    if (renewal && !response.headers.has("set-cookie")) response.headers.append("set-cookie", renewal);
    return response;
  };
}

async function checked(
  route: Contract,
  request: Request,
  session: SignedIn | null,
  params: unknown,
): Promise<Record<string, unknown> | Problem> {
  if (!session && !route.public) return new Problem("signed-out");
  if (route.action && !(session && may(session.member.role, route.action)))
    return new Problem("role-refused");
  const query = parsedQuery(route, request);
  if (query instanceof Problem) return query;
  const body = await parsedBody(route, request);
  if (body instanceof Problem) return body;
  const place = placesIn(route, params);
  if (place instanceof Problem) return place;
  return { request, session, member: session?.member ?? null, ...place, query, ...body };
}

function placesIn({ path }: Contract, params: unknown): Record<keyof typeof places, string> | Problem {
  const { id = "", sha256 = "", token = "" } = (params ?? {}) as Partial<Record<keyof typeof places, string>>;
  const found = { id, sha256, token };
  const wrong = (Object.keys(places) as (keyof typeof places)[]).some(
    (name) => path.includes(`{${name}}`) && !places[name].test(found[name]),
  );
  return wrong ? new Problem("not-found") : found;
}

function parsedQuery({ query }: Contract, request: Request): unknown {
  if (!query) return undefined;
  const { searchParams } = new URL(request.url);
  const twice = [...searchParams.keys()].find((name, index, names) => names.indexOf(name) !== index);
  if (twice !== undefined) {
    return new Problem("wrong-shape", { errors: [{ pointer: twice, detail: "given more than once" }] });
  }
  const parsed = query.safeParse(Object.fromEntries(searchParams));
  return parsed.success ? parsed.data : new Problem("wrong-shape", { errors: queryErrors(parsed.error) });
}

async function parsedBody(
  { body }: Contract,
  request: Request,
): Promise<{ body: unknown; raw: unknown } | Problem> {
  if (!body) return { body: undefined, raw: undefined };
  const read = await readJson(request, body.limit);
  if (read instanceof Problem) return read;
  const most = body.tooMany?.(read.raw);
  if (most) return new Problem("too-large", { detail: most });
  const parsed = body.shape.safeParse(read.raw);
  if (!parsed.success) return new Problem("wrong-shape", { errors: bodyErrors(parsed.error) });
  return { body: parsed.data, raw: read.raw };
}
