import * as z from "zod/mini";
import { purposes } from "../domain/entry";
import type { KeptWalk } from "./walk-shelf";

/** What is remembered outside of the store of a walk whose loss would be a loss: open, or closed and not received. */
const markShape = z.object({
  /** How many entries it had. */
  length: z.number(),
  purpose: z.enum(purposes),
  rigName: z.string(),
  openedAt: z.string(),
});
export type WalkMark = z.infer<typeof markShape>;

const lostShape = z.object({
  /** By walk; `left` counts the entries that are still here. */
  walks: z.record(z.string(), z.extend(markShape, { left: z.number() })),
  /** How many received walks went with them; the server has those. */
  received: z.number(),
});
export type Lost = z.infer<typeof lostShape>;

const marksShape = z.object({
  /** The store's own id, written into it when it was made. */
  birth: z.string(),
  /** How many walks were in it. */
  count: z.number(),
  walks: z.record(z.string(), markShape),
  /** What was found to be gone, until someone has read it. */
  lost: z.optional(lostShape),
});
export type Marks = z.infer<typeof marksShape>;

/** Reads marks as they were kept; null where there are none, or none that can be read. */
export function readMarks(kept: string | null): Marks | null {
  try {
    const read = marksShape.safeParse(JSON.parse(kept ?? "null"));
    return read.success ? read.data : null;
  } catch {
    return null;
  }
}

/**
 * Holds the store against what was remembered of it. The marks must have been read before the store was: a store is
 * never behind its marks unless something is gone.
 * @returns the marks from now on, with what is missing in `lost`
 */
export function compareMarks(marks: Marks | null, birth: string, walks: readonly KeptWalk[]): Marks {
  const here = new Map(walks.map((walk) => [walk.id, walk]));
  const left = (id: string) => here.get(id)?.length ?? 0;
  const missing = Object.entries({ ...marks?.lost?.walks, ...marks?.walks })
    .filter(([id, mark]) => left(id) < mark.length)
    .map(([id, { length, purpose, rigName, openedAt }]) => {
      return [id, { length, purpose, rigName, openedAt, left: left(id) }] as const;
    });
  const emptied = marks !== null && marks.birth !== birth;
  const gone = emptied ? Math.max(0, marks.count - Object.keys(marks.walks).length - walks.length) : 0;
  const received = (marks?.lost?.received ?? 0) + gone;
  const unreceived = walks.filter((walk) => walk.receipt === null);
  return {
    birth,
    count: walks.length,
    walks: Object.fromEntries(unreceived.map((walk) => [walk.id, markOf(walk)])),
    ...((missing.length > 0 || received > 0) && { lost: { walks: Object.fromEntries(missing), received } }),
  };
}

function markOf({ length, purpose, rigName, openedAt }: KeptWalk): WalkMark {
  return { length, purpose, rigName, openedAt };
}
