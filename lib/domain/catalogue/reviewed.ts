import type { Purpose } from "../entry";
import type { Check, StationKey } from "../revision";

/** One check of the catalogue held against a sheet: on its list or not, and why. */
export interface Reviewed {
  /** The catalogue's own name for it; checks that take each other's place share a `check.key`. */
  id: string;
  station: StationKey;
  check: Check;
  listed: boolean;
  /** What on the sheet puts it on the list or keeps it off. */
  reason: string;
  /** The kinds of walk that have it, whether it is on this list or not. */
  walks: Purpose[];
}
