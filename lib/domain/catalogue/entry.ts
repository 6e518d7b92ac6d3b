import type { Check, Effect, Origin, StationKey } from "../revision";
import type { When } from "./conditions";
import type { Facts } from "./facts";

/** A check's own words and drawing on one rig. */
export type Words = Pick<Check, "part" | "ask" | "how" | "why" | "mend"> &
  Partial<
    Pick<
      Check,
      "kind" | "side" | "drawn" | "caution" | "who" | "touches" | "measure" | "lamps" | "figures" | "ruled"
    >
  > & { origin: Origin };

/**
 * One check of the catalogue. `id` is its own name; entries that take each other's place share a `key`, and their
 * conditions leave exactly one of them on a list, or none.
 */
export interface Entry {
  id: string;
  key: string;
  station: StationKey;
  effect: Effect;
  when: readonly When[];
  words: (facts: Facts) => Words;
}

/** Sentences one after the other; what is false or empty is left out. */
export function text(...sentences: (string | false | null | undefined)[]): string {
  return sentences.filter(Boolean).join(" ");
}
