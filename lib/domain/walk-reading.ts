import { bodyOf, type Entry, type MarkBody, type Outcome } from "./entry";
import { walkChecks, type Check, type RevisionDocument, type StationKey } from "./revision";

/** How a check shows on a strip of tape. */
export type Segment = "todo" | "good" | "hold" | "fix" | "unseen" | "absent";

/** One mark as it was made; `tookMs` is the walking time since the entry before it. */
export interface ReadMark extends MarkBody {
  seq: number;
  at: string;
  elapsedMs: number;
  tookMs: number;
}

/** A check with the mark that counts, and those that stood before it, oldest first. */
export interface ReadCheck {
  check: Check;
  /** Whether this walk asks for it; a mark on another check of the revision counts all the same. */
  asked: boolean;
  mark: ReadMark | null;
  earlier: ReadMark[];
  segment: Segment;
  tookMs: number;
}

export interface ReadStation {
  key: StationKey;
  title: string;
  checks: ReadCheck[];
  tookMs: number;
}

/** Words that were left beside the checks. */
export interface Remark {
  seq: number;
  elapsedMs: number;
  text: string;
}

/** A walk's entries, set out the way someone reads them back. */
export interface ReadWalk {
  /** In the order in which this walk first comes to them, without the stations at which nothing was asked or marked. */
  stations: ReadStation[];
  /** Checks of this walk, and how many of them were looked at: marked, and not as unseen. */
  asked: number;
  lookedAt: number;
  remarks: Remark[];
}

/**
 * Sets a walk's entries out by station and check. Only what the entries say: the verdict comes from `replay`.
 * @param entries in order
 */
export function readWalk(document: RevisionDocument, entries: readonly Entry[]): ReadWalk {
  const open = entries[0] ? bodyOf(entries[0], "open") : null;
  const asked = open ? walkChecks(document, open.purpose, open.depth).map(({ check }) => check.key) : [];
  const marks = marksByCheck(entries);
  const stations = document.list.stations.map(({ key, title, checks }) => {
    const read = inWalkingOrder(checks, asked, ({ key }) => [key])
      .map((check) => readCheck(check, asked.includes(check.key), marks.get(check.key)))
      .filter((check) => check.asked || check.mark || check.earlier.length > 0);
    return { key, title, checks: read, tookMs: sum(read) };
  });
  const inOrder = inWalkingOrder(stations, asked, ({ checks }) => checks.map(({ check }) => check.key));
  const counted = stations.flatMap((station) => station.checks).filter((check) => check.asked);
  return {
    stations: inOrder.filter((station) => station.checks.length > 0),
    asked: counted.length,
    lookedAt: counted.filter(({ mark }) => mark && mark.outcome !== "unseen").length,
    remarks: entries.flatMap(remarkOf),
  };
}

/** The segment of tape for a check with this outcome: what a verdict would hold for is a hold here too. */
export function segmentOf(check: Pick<Check, "effect" | "mayBeAbsent">, outcome?: Outcome): Segment {
  if (!outcome) return "todo";
  if (outcome === "fault") return check.effect;
  if (outcome === "absent" && !check.mayBeAbsent && check.effect === "hold") return "hold";
  return outcome;
}

type Marks = { standing: ReadMark | null; earlier: ReadMark[] };

function marksByCheck(entries: readonly Entry[]): Map<string, Marks> {
  const marks = new Map<string, Marks>();
  let beforeMs = 0;
  for (const entry of entries) {
    for (const key of bodyOf(entry, "resume")?.again ?? []) {
      const voided = marks.get(key);
      if (voided) marks.set(key, { standing: null, earlier: past(voided) });
    }
    const mark = bodyOf(entry, "mark");
    if (mark) {
      const { seq, at, elapsedMs } = entry;
      const standing = { ...mark, seq, at, elapsedMs, tookMs: Math.max(0, elapsedMs - beforeMs) };
      const before = marks.get(mark.check);
      if (before?.standing && goesOn(before.standing, mark)) {
        const tookMs = before.standing.tookMs + standing.tookMs;
        marks.set(mark.check, { standing: { ...standing, tookMs }, earlier: before.earlier });
      } else {
        marks.set(mark.check, { standing, earlier: past(before) });
      }
    }
    beforeMs = entry.elapsedMs;
  }
  return marks;
}

/**
 * Whether a mark only goes on from the one before: more was said of the same outcome, or one more signal was seen on a
 * lamp board. Such a mark takes the other's place; a changed mind stands beside it.
 */
function goesOn(before: MarkBody, after: MarkBody): boolean {
  const signals = Object.entries(before.seen ?? {});
  const keepsSeen = signals.every(
    ([signal, pair]) =>
      JSON.stringify(after.seen?.[signal as keyof typeof after.seen]) === JSON.stringify(pair),
  );
  if (before.outcome === "unseen" && signals.length > 0) return keepsSeen;
  const saysMore =
    after.note !== before.note ||
    (after.measured !== undefined && before.measured === undefined) ||
    Object.keys(after.seen ?? {}).length > signals.length;
  return before.outcome === after.outcome && keepsSeen && saysMore;
}

function past(marks: Marks | undefined): ReadMark[] {
  return marks ? [...marks.earlier, ...(marks.standing ? [marks.standing] : [])] : [];
}

function readCheck(check: Check, asked: boolean, marks?: Marks): ReadCheck {
  const { standing: mark, earlier } = marks ?? { standing: null, earlier: [] };
  const segment = segmentOf(check, mark?.outcome);
  return { check, asked, mark, earlier, segment, tookMs: sum([...earlier, ...(mark ? [mark] : [])]) };
}

/** Things by the first of their checks that this walk takes, then those without one as the list has them. */
function inWalkingOrder<T>(
  things: readonly T[],
  asked: readonly string[],
  keysOf: (thing: T) => string[],
): T[] {
  const places = new Map(asked.map((key, place) => [key, place]));
  const first = (thing: T) =>
    Math.min(...keysOf(thing).map((key) => places.get(key) ?? asked.length), asked.length);
  return [...things].sort((one, other) => first(one) - first(other));
}

function remarkOf(entry: Entry): Remark[] {
  const text = entry.type === "note" ? entry.body.text : null;
  return typeof text === "string" ? [{ seq: entry.seq, elapsedMs: entry.elapsedMs, text }] : [];
}

function sum(parts: readonly { tookMs: number }[]): number {
  return parts.reduce((total, { tookMs }) => total + tookMs, 0);
}

/** An entry's own time beside the time at which the server had it. */
export type Arrival = { receivedAt: string; entry: Pick<Entry, "at"> };

/**
 * What the two clocks say of each other. `ahead`: an entry says it was made after it was received, so the phone's
 * clock was ahead by at least this much. `apart`: even the quickest entry came this much later than it says; no
 * signal, or a clock that was behind, and the record alone cannot tell which.
 */
export type ClockRemark = { kind: "ahead" | "apart"; byMs: number };

const NOTABLE_AHEAD_MS = 1_000;
const NOTABLE_APART_MS = 5 * 60_000;

/** The one thing worth saying about a walk's clock, if there is one. */
export function clockRemark(arrivals: readonly Arrival[]): ClockRemark | null {
  if (arrivals.length === 0) return null;
  const lags = arrivals.map(({ receivedAt, entry }) => Date.parse(receivedAt) - Date.parse(entry.at));
  const least = Math.min(...lags);
  if (least <= -NOTABLE_AHEAD_MS) return { kind: "ahead", byMs: -least };
  return least >= NOTABLE_APART_MS ? { kind: "apart", byMs: least } : null;
}
