/** What the decision when to try next stands on. All times are milliseconds on one clock. */
export interface DrainFacts {
  /** Is there anything to send or fetch. */
  pending: boolean;
  /** The server said that nobody is signed in. */
  signedOut: boolean;
  /** When something new was saved, or null. */
  savedAt: number | null;
  /** When something happened that may have brought the network back (visible, online, a wake, a sign-in), or null. */
  stirredAt: number | null;
  /** When the last attempt ended, or null before the first. */
  triedAt: number | null;
  /** How many attempts in a row have failed. */
  failures: number;
  /** The server's own wish to be left alone until then, or null. */
  notBefore: number | null;
  /** From 0 to 1: where in the spread this phone tries, so that a yard full of phones does not knock at once. */
  spread: number;
}

/** New marks are gathered this long before they go. */
export const GATHER_MS = 1_500;
/** The shortest time between attempts, whatever stirs. */
export const SPACING_MS = 1_000;
/** The longest wait between attempts that fail. */
export const LONGEST_MS = 60_000;

/**
 * When to try next, or null for not until something changes. What the browser says of the network is a hint to try
 * sooner, never a reason not to.
 */
export function nextTry(facts: DrainFacts): number | null {
  const { pending, signedOut, savedAt, stirredAt, triedAt, failures, spread } = facts;
  if (!pending) return null;
  const stirred = stirredAt !== null && (triedAt === null || stirredAt > triedAt);
  if (signedOut && !stirred) return null;
  if (triedAt === null) return Math.max(stirredAt ?? savedAt ?? 0, facts.notBefore ?? 0);
  const spaced = Math.max(triedAt + SPACING_MS, facts.notBefore ?? 0);
  if (stirred) return Math.max(spaced, stirredAt);
  if (failures > 0) return Math.max(spaced, triedAt + backOff(failures, spread));
  return Math.max(spaced, (savedAt ?? triedAt) + GATHER_MS);
}

function backOff(failures: number, spread: number): number {
  const doubled = SPACING_MS * 2 ** Math.min(failures, 16);
  return Math.min(LONGEST_MS, doubled) * (0.5 + spread / 2);
}
