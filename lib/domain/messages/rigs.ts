import type { Effect, Origin } from "../revision";
import { plural } from "./desk";
import { gearNames } from "./sheet-gear";
import { sheetReadingWords } from "./sheet-reading";
import { deference } from "./walk";

const DO_NOT_TOW = "Do not tow";

/** What a thing is called by its kind: a coach, a car or a piece of gear. */
export function kindWords(kind: string): string {
  if (kind === "coach" || kind === "car") return sheetReadingWords[kind];
  return gearNames[kind as keyof typeof gearNames] ?? kind;
}

/** Where a check comes from, as a mark before the words. */
export const originWords: Record<Origin["kind"], string> = {
  rule: "Rule",
  "vehicle-manual": "Vehicle maker’s manual",
  "equipment-manual": "Gear maker’s manual",
  practice: "Common practice",
};

export const effectWords: Record<Effect, string> = { hold: DO_NOT_TOW, fix: "Fix soon" };

export const rigsWords = {
  nav: "Rigs",
  title: "Rigs",
  sub: "What your organization keeps, or has built for someone.",
  caption: "Rigs",
  fetching: "Fetching the rigs",
  drafts: "Drafts on this phone",
  newRig: "New rig",
  emptyTitle: "No rigs yet",
  emptyWriter:
    "A rig begins with what is on its plates. It can be filled in beside the vehicles, on a phone.",
  emptyReader: "A rig appears here when an installer or a manager has entered its sheet.",
  columns: { rig: "Rig", vehicles: "Coach and car", keeper: "Kept by", revision: "Revision", state: "Sheet" },
  vehicles: (coach: string, car: string) => `${coach} with ${car}`,
  noVehicles: "not written down",
  revision: (number: number) => `Revision ${number}`,
  doNotTow: DO_NOT_TOW,
  newerList: "Newer list waiting",
} as const;

export const rigWords = {
  plainTitle: "One rig",
  fetching: "Fetching the rig",
  back: "Rigs",
  goneTitle: "There is no such rig here",
  gone: "It may belong to someone else, or the link may be cut short.",
  toRigs: "Go to the rigs",
  sub: (revision: number, keeper: string, builder: string | null) =>
    `Revision ${revision}, kept by ${keeper}${builder === null || builder === keeper ? "" : `, built by ${builder}`}`,
  edit: "Edit the sheet",
  export: "Export as a file",
  print: "Print",
  walks: "Walks",
  exported: (name: string) => `Saved as ${name}.`,
  exportFailed: "The file could not be made. Try again.",
  ruledOut: DO_NOT_TOW,
  ruledOutWhy: "What is on the sheet rules this rig out:",
  ruledOutThen:
    "The list holds at its first station until the sheet says otherwise. The makers’ ratings and manuals decide, and a licensed shop.",
  sheet: "Sheet",
  sheetSub: "As it was read off the vehicles and their plates.",
  noSheet:
    "This revision is from before there were sheets: its list was written by hand. Enter the sheet to have the list follow from it.",
  notOnRig: "Not on this rig",
  nothingKnown: "Nothing written down yet.",
  notKnown: (labels: readonly string[]) => `Looked for and not known: ${labels.join(", ")}.`,
  gaps: (count: number) => `${plural(count, "field")} that nobody has looked for yet`,
  si: (si: string) => `${si} as computed`,
  manualCaution:
    "Only the manual of this very car says how it is towed. Two people read the page, and read it again when the car changes.",
  photo: "Page of the manual, photographed",
  list: "List",
  listSub: (catalogue: string) => `Follows from the sheet, by the catalogue “${catalogue}”.`,
  listByHand: (catalogue: string) => `Written by hand: “${catalogue}”.`,
  listHeads: { walk: "Walk", full: "Full", short: "Short" },
  checks: (count: number) => plural(count, "check"),
  review: "Every check, in or out and why",
  printed: (digest: string) =>
    `Rig sheet ${digest}. What someone wrote down of these vehicles, not a statement that they are fit for the road. ${deference}`,
} as const;

export const wiringReadingWords = {
  title: (from: string, to: string) => `${from} to ${to}`,
  untitledEnd: "not written down",
  heads: {
    color: "Color",
    near: (end: string) => `At ${end}`,
    far: (end: string) => `At ${end}`,
    tag: "Tag",
  },
  nearEnd: "the near end",
  farEnd: "the far end",
  noColor: "no color written down",
  thisWire: "this wire",
  segmentsSub: "What each wire does was measured at both ends; its color does not say.",
  changes: (color: string, near: string, nearEnd: string, far: string, farEnd: string) =>
    `One color, two functions: ${color} is “${near}” at ${nearEnd} and “${far}” at ${farEnd}.`,
  tagWanted: "Tag it at both ends with what it does there.",
  tagged: "Tagged at both ends",
  untagged: "No tag",
  tagUnknown: "Not known",
  tagNeeded: "Wants a tag",
} as const;

export const revisionsWords = {
  title: "Revisions",
  sub: "Newest first. A walk always shows the one it was made against.",
  row: (number: number) => `Revision ${number}`,
  byNobody: "made by a phone or the demo",
  latestRow: (number: number) => `Revision ${number}, the latest`,
  changed: "What changed",
  changedIn: (number: number) => `What changed in revision ${number}`,
  earlierOf: "The earlier",
  laterOf: "The later",
  comparing: (one: number, other: number) => `Revision ${one} against ${other}`,
  fetching: "Fetching the revision",
  sheetChanges: "On the sheet",
  listChanges: "On the list",
  nothingOnSheet: "The sheets say the same.",
  nothingOnList: "The lists are the same.",
  noSheet: "One of the two is from before there were sheets, so only the lists are compared.",
  old: (number: number, latest: number) =>
    `This is revision ${number} as it was. The latest is revision ${latest}.`,
  toLatest: "See the latest",
  asItWas: "Sheet as it was",
  before: "Before",
  after: "After",
} as const;

export const newerListWords = {
  title: "A newer list is waiting",
  lead: "The catalogue has changed since this revision was made. With the same sheet it would make this list:",
  take: "Take the newer list as a new revision",
  taking: "Taking the newer list",
  reader: "Whoever keeps the rig can take it as a new revision.",
  walks: "Walks that are already made keep the list they were made against.",
  taken: (number: number) => `Revision ${number} has the newer list.`,
  failed: "The newer list was not taken: Hookfast cannot be reached. Nothing has changed.",
  stale:
    "Someone has saved a newer revision of this rig meanwhile. This page shows it now: look again at what would change.",
} as const;

export const listChangeWords = {
  added: "Comes on",
  removed: "Goes off",
  changed: "Changes",
  onlyIn: (rig: string) => `Only on ${rig}`,
  differs: "Differs",
  members: {
    ask: "Question",
    how: "How to look",
    why: "Why",
    mend: "What mends it",
    effect: "Effect",
    caution: "Caution",
    who: "Who may mend it",
    listed: "Why it is on the list",
    origin: "Where it comes from",
    kind: "Kind of check",
    part: "Drawing",
    side: "Side",
    drawn: "As drawn",
    mayBeAbsent: "May be marked as not on this rig",
    touches: "What mending it touches",
    measure: "What is measured",
    lamps: "Lamps",
    figures: "Figures",
  } as Record<string, string>,
  walksAdded: (names: string) => `Now also asked in: ${names}`,
  walksRemoved: (names: string) => `No longer asked in: ${names}`,
  walksMoved: (names: string) => `Another place in the order of: ${names}`,
} as const;
