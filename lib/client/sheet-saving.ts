import {
  rigReadingShape,
  savedShape,
  thingListShape,
  thingReadingShape,
  type RigReading,
  type Saved,
} from "../domain/rigs";
import type { Sheet } from "../domain/sheet/sheet";
import { call, type Answer, type Fetch } from "./api";

/** One rig with its latest revision. */
export function readRig(rig: string, fetch?: Fetch): Promise<Answer<RigReading>> {
  return call(rigReadingShape, "GET", `/api/rigs/${rig}`, undefined, fetch);
}

/** Saves a sheet as a new revision over `base`, or as the first one of a new rig where that is null. */
export function saveSheet(
  rig: string,
  base: string | null,
  sheet: Sheet,
  fetch?: Fetch,
): Promise<Answer<Saved>> {
  return base === null
    ? call(savedShape, "POST", "/api/rigs", { id: rig, sheet }, fetch)
    : call(savedShape, "POST", `/api/rigs/${rig}/revisions`, { base, sheet }, fetch);
}

/** The coaches, cars and pieces of gear that were written down before. */
export function readThings(fetch?: Fetch) {
  return call(thingListShape, "GET", "/api/things", undefined, fetch);
}

/** One of them, with its history. */
export function readThing(id: string, fetch?: Fetch) {
  return call(thingReadingShape, "GET", `/api/things/${id}`, undefined, fetch);
}
