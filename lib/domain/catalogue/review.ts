import { checksOf } from "./checks";
import { factsOf } from "./facts";
import { walksWith } from "./order";
import type { Reviewed } from "./reviewed";
import type { Sheet } from "../sheet/sheet";

/** Every check of the catalogue held against a sheet: on its list or not, and the reason. */
export function review(sheet: Sheet): Reviewed[] {
  return checksOf(factsOf(sheet)).map((one) => ({ ...one, walks: walksWith(one.check.key) }));
}
