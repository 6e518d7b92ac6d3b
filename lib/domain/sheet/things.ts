import { pointerStep } from "../json";
import { thingNames } from "../messages/things";
import { gearKeys, type GearKey } from "./gear";
import type { Sheet } from "./sheet";

export type ThingKind = "coach" | "car" | GearKey;

/** What a sheet says of a thing, without its id. */
export type ThingState = Record<string, unknown>;

/** A coach, a car or a piece of gear as a sheet has it, and where in the sheet it stands. */
export interface SheetThing {
  id: string;
  kind: ThingKind;
  pointer: string;
  state: ThingState;
}

/**
 * The things of a sheet that have an id, and by it a history of their own. A piece that is not on the rig is none,
 * whatever else still stands in its place.
 */
export function thingsIn({ coach, car, gear = {} }: Sheet): SheetThing[] {
  const places: [ThingKind, string, ThingState | undefined][] = [
    ["coach", "/coach", coach],
    ["car", "/car", car],
    ...gearKeys.map((key): [ThingKind, string, ThingState | undefined] => [
      key,
      `/gear${pointerStep(key)}`,
      gear[key],
    ]),
  ];
  return places.flatMap(([kind, pointer, thing]) => {
    if (thing === undefined || thing.there === false || thing.family === "none") return [];
    const { id, ...state } = thing;
    return typeof id === "string" ? [{ id, kind, pointer, state }] : [];
  });
}

/** What someone would know a thing by: its year and description, and its number. */
export function thingLabel(kind: ThingKind, state: ThingState): string {
  const text = (key: string) => (typeof state[key] === "string" ? state[key] : null);
  const year = typeof state.year === "number" ? `${state.year} ` : "";
  const described = text("description") ?? text("makerModelTrim") ?? thingNames[kind];
  const number = text("serial") ?? text("identity");
  return `${year}${described}${number ? `, ${number}` : ""}`;
}
