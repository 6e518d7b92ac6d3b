import { bodyOf, type Entry, type MarkBody, type OpenBody, type Verdict } from "./entry";
import { checksOf, type RevisionDocument } from "./revision";

/** The mark that counts for a check, and when it was made. */
export interface CountingMark extends MarkBody {
  at: string;
  elapsedMs: number;
}

/** What a walk's entries add up to. */
export interface Replay {
  open: OpenBody | null;
  /** The last mark of each check of the revision that no later `resume` voided. */
  marks: ReadonlyMap<string, CountingMark>;
  closed: boolean;
  verdict: Verdict;
  /** `marks`: checks with a counting mark. `faults`: those last marked fault. */
  counts: { marks: number; faults: number };
  /** Active walking time at the last entry, in milliseconds. */
  elapsedMs: number;
}

/**
 * Replays a walk's entries, in order, against the revision it was made on. Pure: phone, server and anyone who holds
 * the record come to the same verdict. Unknown entry types and checks that the revision lacks are passed over.
 */
export function replay(document: RevisionDocument, entries: Iterable<Entry>): Replay {
  const checks = checksOf(document);
  const marks = new Map<string, CountingMark>();
  let open: OpenBody | null = null;
  let closed = false;
  let elapsedMs = 0;
  for (const entry of entries) {
    elapsedMs = entry.elapsedMs;
    open ??= bodyOf(entry, "open");
    closed ||= entry.type === "close";
    for (const key of bodyOf(entry, "resume")?.again ?? []) marks.delete(key);
    const mark = bodyOf(entry, "mark");
    if (mark && checks.has(mark.check)) marks.set(mark.check, { ...mark, at: entry.at, elapsedMs });
  }
  const faults = [...marks.values()].filter((mark) => mark.outcome === "fault").length;
  return {
    open,
    marks,
    closed,
    verdict: verdictOf(document, open, marks),
    counts: { marks: marks.size, faults },
    elapsedMs,
  };
}

/**
 * The verdict by the marks alone: a hold check at fault, or absent where it may not be, holds; else a check of this
 * walk that is unmarked or was not seen leaves it unfinished; else no hold was marked.
 */
export function verdictOf(
  document: RevisionDocument,
  open: Pick<OpenBody, "purpose" | "depth"> | null,
  marks: ReadonlyMap<string, Pick<MarkBody, "outcome">>,
): Verdict {
  for (const [key, check] of checksOf(document)) {
    const outcome = marks.get(key)?.outcome;
    const holds = outcome === "fault" || (outcome === "absent" && !check.mayBeAbsent);
    if (holds && check.effect === "hold") return "hold";
  }
  if (!open) return "unfinished";
  const seen = document.walks[open.purpose][open.depth].every((key) => {
    const outcome = marks.get(key)?.outcome;
    return outcome !== undefined && outcome !== "unseen";
  });
  return seen ? "no-hold" : "unfinished";
}
