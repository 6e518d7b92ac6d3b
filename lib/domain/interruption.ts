import type { Depth, Entry, Purpose } from "./entry";
import { checksOf, keysAtStation, walkChecks, type Check, type RevisionDocument } from "./revision";

/** How long a walk may lie still with the phone away before it counts as left. Our own rule: no figure is published. */
export const LEFT_MS = 10 * 60_000;

/** How many marks are asked again when a walk goes on. */
const ASKED_AGAIN = 2;

/**
 * Why a walk does not simply go on: someone paused it, or it was left (the page was gone, or the phone was away too
 * long). `awayMs` is null where the clocks cannot tell.
 */
export interface Interruption {
  kind: "paused" | "left";
  awayMs: number | null;
}

/**
 * Whether a walk that is taken up, or looked at again, was interrupted.
 * @param last its last entry
 * @param marked whether any check has a mark
 * @param returned `load` on a new page; else how long the page was out of sight, in milliseconds
 * @param wallMs the wall clock now
 */
export function interruptionOf(
  last: Pick<Entry, "type" | "at">,
  marked: boolean,
  returned: "load" | number,
  wallMs: number,
): Interruption | null {
  const sinceMs = wallMs - Date.parse(last.at);
  const awayMs = sinceMs >= 0 ? sinceMs : null;
  if (last.type === "pause") return { kind: "paused", awayMs };
  if (!marked || last.type === "close") return null;
  if (returned !== "load" && returned < LEFT_MS) return null;
  return { kind: "left", awayMs };
}

/**
 * The checks to ask again when an interrupted walk goes on: the two marked last, the one that was about to be asked
 * being asked anyway, and all of the cabin where someone may have been in the car.
 * @param markedInOrder keys with a counting mark, the one marked first at the front
 */
export function againAfterBreak(
  document: RevisionDocument,
  markedInOrder: readonly string[],
  carEntered: boolean,
): string[] {
  const again = new Set(markedInOrder.slice(-ASKED_AGAIN));
  if (carEntered) for (const key of cabinMarks(document, markedInOrder)) again.add(key);
  return inListOrder(document, again);
}

/**
 * The checks to ask again after a fault was mended: the check itself, what mending it can change, what was undone to
 * secure the car for it, and the holds of the last look. What cannot have changed keeps its mark.
 * @param mended keys of the checks that were mended
 * @param marked keys with a counting mark
 */
export function againAfterMending(
  document: RevisionDocument,
  mended: readonly string[],
  marked: readonly string[],
): string[] {
  const checks = checksOf(document);
  const touched = mended.flatMap((key) => checks.get(key)?.touches ?? []);
  // Whoever mends between the vehicles sets the brake and the chocks first, as the screen says: both come off again.
  const secured = [...checks.values()].filter(provesRelease).map(({ key }) => key);
  const lastLook = keysAtStation(document, "last-look").filter((key) => checks.get(key)?.effect === "hold");
  const again = [...mended, ...touched, ...secured, ...lastLook].filter((key) => marked.includes(key));
  return inListOrder(document, again);
}

/**
 * The checks to ask again when a fault was mended on the spot, in the middle of a walk: what mending it can change.
 * @param marked keys with a counting mark
 */
export function touchedByMending(
  document: RevisionDocument,
  mended: string,
  marked: readonly string[],
): string[] {
  const touched = checksOf(document).get(mended)?.touches ?? [];
  return inListOrder(
    document,
    touched.filter((key) => key !== mended && marked.includes(key)),
  );
}

/** A check that shows the car free to roll: its brake off and chocks out, or its wheels turning. */
function provesRelease({ part, drawn }: Pick<Check, "part" | "drawn">): boolean {
  return part === "parking-brake" || (part === "wheels" && drawn !== "standing");
}

/** The marked checks that are made in the car's cabin. */
export function cabinMarks(document: RevisionDocument, marked: readonly string[]): string[] {
  const cabin = new Set(keysAtStation(document, "car-cabin"));
  return marked.filter((key) => cabin.has(key));
}

/**
 * Whether this is the moment to ask if anyone has been in the car: the cabin is marked, nobody has answered since, and
 * the check to come belongs to the last look.
 */
export function asksAboutCar(
  document: RevisionDocument,
  walk: { purpose: Purpose; depth: Depth },
  marked: readonly string[],
  answered: boolean,
  next: string | null,
): boolean {
  if (answered || cabinMarks(document, marked).length === 0) return false;
  return walkChecks(document, walk.purpose, walk.depth).some(
    ({ station, check }) => check.key === next && station.key === "last-look",
  );
}

function inListOrder(document: RevisionDocument, keys: Iterable<string>): string[] {
  const wanted = new Set(keys);
  return [...checksOf(document).keys()].filter((key) => wanted.has(key));
}
