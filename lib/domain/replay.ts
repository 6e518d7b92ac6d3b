import { bodyOf, type Entry, type MarkBody, type OpenBody, type PhotoBody, type Verdict } from "./entry";
import { checksOf, keysAtStation, type RevisionDocument } from "./revision";

/** The mark that counts for a check, and when it was made. */
export interface CountingMark extends MarkBody {
  at: string;
  elapsedMs: number;
}

/** What a walk's entries add up to. */
export interface Replay {
  open: OpenBody | null;
  /** The last mark of each check of the revision that no later `resume` voided, the one marked last at the end. */
  marks: ReadonlyMap<string, CountingMark>;
  closed: boolean;
  verdict: Verdict;
  /** `marks`: checks with a counting mark. `faults`: those last marked fault. */
  counts: { marks: number; faults: number };
  /** Active walking time at the last entry, in milliseconds. */
  elapsedMs: number;
  /**
   * Checks last seen at fault, with that mark, whatever was voided or not seen since: calling a hold among them good
   * needs a reason.
   */
  faulted: ReadonlyMap<string, MarkBody>;
  /** Someone said that nobody has been in the car since the cabin was marked, and nothing but the last look came since. */
  carUntouched: boolean;
  photos: readonly PhotoBody[];
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
  const faulted = new Map<string, MarkBody>();
  const photos: PhotoBody[] = [];
  const lastLook = new Set(keysAtStation(document, "last-look"));
  let carUntouched = false;
  for (const entry of entries) {
    elapsedMs = entry.elapsedMs;
    open ??= bodyOf(entry, "open");
    closed ||= entry.type === "close";
    const resume = bodyOf(entry, "resume");
    for (const key of resume?.again ?? []) marks.delete(key);
    if (resume && "car" in resume) carUntouched = resume.car === "untouched";
    const photo = bodyOf(entry, "photo");
    if (photo) photos.push(photo);
    const mark = bodyOf(entry, "mark");
    if (!mark || !checks.has(mark.check)) continue;
    marks.delete(mark.check);
    marks.set(mark.check, { ...mark, at: entry.at, elapsedMs });
    if (mark.outcome === "fault") faulted.set(mark.check, mark);
    if (mark.outcome === "good" || mark.outcome === "absent") faulted.delete(mark.check);
    // The answer is about this moment: it holds while the last look goes on, not over further work on the rig.
    if (!lastLook.has(mark.check)) carUntouched = false;
  }
  const faults = [...marks.values()].filter((mark) => mark.outcome === "fault").length;
  return {
    open,
    marks,
    closed,
    verdict: verdictOf(document, open, marks),
    counts: { marks: marks.size, faults },
    elapsedMs,
    faulted,
    carUntouched,
    photos,
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
