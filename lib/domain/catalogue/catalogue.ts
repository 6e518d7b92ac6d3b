import { brakeReady } from "./brake";
import { cabin } from "./cabin";
import { cablesAndCord } from "./cables-and-cord";
import { carNose } from "./car-nose";
import { carTail } from "./car-tail";
import { coachTail } from "./coach-tail";
import type { Entry } from "./entry";
import { lastLook } from "./last-look";
import { pull } from "./pull";
import { ruledOutEntries } from "./ruled-out";
import { unhook } from "./unhook";

/** The name and version of the catalogue: other checks, words or orders are another version. */
export const CATALOGUE = "hookfast 1";

/** Every check that there is. Within a station a list keeps this order. */
export const entries: readonly Entry[] = [
  ...ruledOutEntries,
  ...coachTail,
  ...carNose,
  ...cablesAndCord,
  ...cabin,
  ...brakeReady,
  ...pull,
  ...carTail,
  ...lastLook,
  ...unhook,
];
