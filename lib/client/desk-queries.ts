import { infiniteQueryOptions, QueryCache, QueryClient, queryOptions } from "@tanstack/react-query";
import type * as z from "zod/mini";
import { walkPageShape, walkReadingShape } from "../domain/history";
import type { ProblemDocument } from "../domain/problem";
import { UUID } from "../domain/uuid";
import { call, type Answer } from "./api";
import { whoAmI } from "./session";

/** The server answered, and the answer was no. */
export class Refused extends Error {
  constructor(readonly problem: ProblemDocument) {
    super(problem.title);
  }
}

/** Nothing that came back was the server's. */
export class Unreached extends Error {}

/** Whether an error says that this code was the answer. */
export function isRefusal(error: unknown, code: ProblemDocument["code"]): boolean {
  return error instanceof Refused && error.problem.code === code;
}

/** An answer's value; throws {@link Refused} or {@link Unreached} where there is none. */
export function valueOf<T>(answer: Answer<T>): T {
  if (answer.kind === "answered") return answer.value;
  throw answer.kind === "refused" ? new Refused(answer.problem) : new Unreached();
}

/** Reads from one of our own routes; throws `Refused` or `Unreached`. */
export async function read<T>(shape: z.ZodMiniType<T>, path: string): Promise<T> {
  return valueOf(await call(shape, "GET", path));
}

/** Sends to one of our own routes; throws `Refused` or `Unreached`. */
export async function send<T>(shape: z.ZodMiniType<T>, path: string, body: unknown): Promise<T> {
  return valueOf(await call(shape, "POST", path, body));
}

export const whoQuery = queryOptions({
  queryKey: ["session"],
  queryFn: async () => valueOf(await whoAmI()).member,
  staleTime: 5 * 60_000,
});

export const historyQuery = infiniteQueryOptions({
  queryKey: ["walks"],
  queryFn: ({ pageParam }) =>
    read(
      walkPageShape,
      pageParam === null ? "/api/walks" : `/api/walks?after=${encodeURIComponent(pageParam)}`,
    ),
  initialPageParam: null as string | null,
  getNextPageParam: (page) => page.next,
});

/** One walk read back; an id that cannot be one is not asked for. */
export function walkQuery(id: string) {
  return queryOptions({
    queryKey: ["walk", id],
    queryFn: () => read(walkReadingShape, `/api/walks/${id}`),
    enabled: UUID.test(id),
  });
}

/**
 * The desk's one cache. Requests go out whatever the browser believes about the network.
 * @param signedOut called when any answer says that the session has ended
 */
export function deskClient(signedOut: () => void): QueryClient {
  return new QueryClient({
    queryCache: new QueryCache({ onError: (error) => isRefusal(error, "signed-out") && signedOut() }),
    defaultOptions: {
      queries: {
        networkMode: "always",
        staleTime: 30_000,
        retry: (failures, error) =>
          failures < 1 && (error instanceof Unreached || isRefusal(error, "unavailable")),
        retryDelay: 1_500,
      },
    },
  });
}
