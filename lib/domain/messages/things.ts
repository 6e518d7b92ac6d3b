import type { ThingKind } from "../sheet/things";
import { gearNames } from "./sheet-gear";

/** What each kind of thing is called, where nobody has described it. */
export const thingNames: Record<ThingKind, string> = { coach: "Coach", car: "Car", ...gearNames };

export const thingsWords = {
  nav: "Gear",
  title: "Coaches, cars and gear",
  sub: "Each with a history of its own, which outlives the rig it is on.",
  caption: "Coaches, cars and gear",
  fetching: "Fetching coaches, cars and gear",
  emptyTitle: "Nothing in the book yet",
  empty: "A coach, a car or a piece of gear appears here when a rig’s sheet has it.",
  columns: { kind: "Kind", label: "What it is", rigs: "On" },
  noRig: "on no rig now",
} as const;

export const thingWords = {
  plainTitle: "One thing",
  fetching: "Fetching its history",
  back: "Gear",
  goneTitle: "There is no such thing in the book",
  gone: "It may belong to someone else, or the link may be cut short.",
  toThings: "Go to coaches, cars and gear",
  on: "On",
  now: "As it was last written down",
  history: "History",
  historySub: "Newest first: on which rig, since when, and what was written down differently.",
  revision: (number: number) => `revision ${number}`,
  first: "First written down.",
  taken: "No longer on this rig.",
  came: (rig: string) => `Came onto ${rig}.`,
  same: "Nothing else of it was written down differently.",
  field: "Field",
  before: "Before",
  after: "After",
} as const;
