import { sha256Hex } from "./digest";
import { bodyOf, type Entry, type Link } from "./entry";
import { canonicalText } from "./json";

/** When an entry was made: wall clock, monotonic clock within its epoch, and active walking time. */
export type Stamp = Pick<Entry, "at" | "elapsedMs" | "monoMs" | "monoEpoch">;

/**
 * What a clock says now. `monoMs` counts within `monoEpoch` (a page load or wake) and never runs back there;
 * `epochMonoMs` is where the epoch began.
 */
export interface ClockReading {
  wallMs: number;
  monoMs: number;
  monoEpoch: string;
  epochMonoMs?: number;
}

/**
 * Stamps the next entry of a walk. Active time goes on from the last entry while its epoch lasts; in a new epoch it
 * goes on from the moment the walk was taken up again, so that time with the phone dead is not walking time, and
 * nothing counts after a pause.
 * @param last the walk's last entry, or null for the first
 * @param takenUpMonoMs the monotonic time at which this page opened, took up or resumed the walk
 */
export function stamp(
  now: ClockReading,
  last: (Stamp & Partial<Pick<Entry, "type">>) | null,
  takenUpMonoMs: number,
): Stamp {
  const inEpoch = last?.monoEpoch === now.monoEpoch;
  const sinceMs = inEpoch ? last.monoMs : Math.max(takenUpMonoMs, now.epochMonoMs ?? 0);
  const activeMs = last?.type === "pause" ? 0 : Math.max(0, Math.round(now.monoMs - sinceMs));
  return {
    at: new Date(now.wallMs).toISOString(),
    elapsedMs: (last?.elapsedMs ?? 0) + activeMs,
    monoMs: Math.round(now.monoMs),
    monoEpoch: now.monoEpoch,
  };
}

/** How far the two clocks may drift apart between entries before one of them is taken to have jumped. */
const DRIFT_MS = 2_000;

/**
 * How far each clock moved since the last entry, where they disagree by more than a drift: someone, or the network,
 * set the wall clock. Across epochs only a wall clock that ran backwards shows.
 */
export function clockJump(now: ClockReading, last: Stamp): { wallMs: number; monoMs: number } | null {
  const wallMs = now.wallMs - Date.parse(last.at);
  if (last.monoEpoch !== now.monoEpoch) return wallMs < -DRIFT_MS ? { wallMs, monoMs: 0 } : null;
  const monoMs = Math.round(now.monoMs - last.monoMs);
  return Math.abs(wallMs - monoMs) > DRIFT_MS ? { wallMs, monoMs } : null;
}

/**
 * The next link of a walk's chain.
 * @param head the last link, or the revision's digest where the walk begins
 */
export function nextLink(
  walk: string,
  head: Pick<Link, "entry" | "digest"> | { revision: string },
  type: string,
  body: Entry["body"],
  when: Stamp,
): Link {
  const begins = "revision" in head;
  const entry: Entry = {
    v: 1,
    walk,
    seq: begins ? 0 : head.entry.seq + 1,
    type,
    ...when,
    body,
    prev: begins ? head.revision : head.digest,
  };
  const text = canonicalText(entry);
  return { entry, text, digest: sha256Hex(text) };
}

/** Where a chain stands: what the next entry must follow. */
export interface Head {
  stored: number;
  /** Digest of the last entry, null before the first. */
  digest: string | null;
  closed: boolean;
  sealed: boolean;
}

/** Why a link cannot follow a head. */
export type ChainFault = "invalid" | "sealed" | "gap" | "broken-chain";

/**
 * Whether a link that is not stored yet may follow: `open` is the first entry and only that, nothing follows `close`,
 * the sequence has no gap and `prev` is the digest before it (of the revision, for the first).
 * @returns null when it may
 */
export function chainFault(head: Head, link: Link): ChainFault | null {
  const { entry } = link;
  if ((entry.seq === 0) !== (entry.type === "open")) return "invalid";
  if (head.sealed) return "sealed";
  if (head.closed) return "invalid";
  if (entry.seq !== head.stored) return "gap";
  const expected = head.digest ?? bodyOf(entry, "open")?.revision;
  return entry.prev === expected ? null : "broken-chain";
}
