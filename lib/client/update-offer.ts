import type { KeptWalk } from "./walk-shelf";

/** What decides whether a new version is offered. */
export interface OfferFacts {
  /** A new version is on the phone and waits. */
  waiting: boolean;
  /** A walk on this phone is not closed. */
  openWalkHere: boolean;
  /** A tab of this browser, this one or another, records a walk that is not known to be closed. */
  heldElsewhere: boolean;
}

/**
 * Whether a new version may be offered. Taking it drops the files of the old one under every tab, so never while a
 * walk is open anywhere on this phone.
 */
export function mayOffer({ waiting, openWalkHere, heldElsewhere }: OfferFacts): boolean {
  return waiting && !openWalkHere && !heldElsewhere;
}

/** As `Field` names the lock of the tab that records a walk. */
const WALK_LOCK = "hookfast-walk-";

/** Gathers the facts from the walks of this phone and the locks of this browser. */
export async function offerFacts(
  waiting: boolean,
  walks: readonly Pick<KeptWalk, "id" | "seal">[],
  locks: Pick<LockManager, "query"> = navigator.locks,
): Promise<OfferFacts> {
  const closed = new Set(walks.filter((walk) => walk.seal).map((walk) => WALK_LOCK + walk.id));
  const { held = [] } = await locks.query();
  return {
    waiting,
    openWalkHere: closed.size < walks.length,
    heldElsewhere: held.some(({ name = "" }) => name.startsWith(WALK_LOCK) && !closed.has(name)),
  };
}
