import type { ThingKind } from "../sheet/things";
import { gearNames } from "./sheet-gear";

/** What each kind of thing is called, where nobody has described it. */
export const thingNames: Record<ThingKind, string> = { coach: "Coach", car: "Car", ...gearNames };
