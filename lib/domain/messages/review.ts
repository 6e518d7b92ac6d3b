import { purposes, type Purpose } from "../entry";
import type { DrawnState, Effect } from "../revision";
import { plural } from "./desk";
import { purposeWords } from "./walk";

export const reviewWords = {
  title: "Every check and why",
  of: (rig: string) => `Every check, ${rig}`,
  sub: "Every check of the catalogue held against this sheet: on the list or not, and why.",
  back: "The rig",
  fetching: "Fetching the rig",
  goneTitle: "There is no such rig here",
  gone: "It may belong to someone else, or the link may be cut short.",
  toRigs: "Go to the rigs",
  noSheet:
    "This revision is from before there were sheets, so there is nothing to hold the catalogue against.",
  newer: (revision: number) =>
    `The catalogue has changed since revision ${revision} was made. This page follows today’s; walks keep the list they were made against.`,
  filters: "Which checks are shown",
  show: "On the list",
  shows: { all: "In and out", in: "In", out: "Out" },
  walk: "Walk",
  anyWalk: "Any walk",
  holds: "Holds only",
  shown: (listed: number, out: number) => `${plural(listed, "check")} in, ${out} out.`,
  nothing: "No check is like that.",
  in: "In",
  out: "Out",
  print: "Print",
  labels: {
    how: "How to look",
    why: "Why",
    mend: "What mends it",
    who: "Who may",
    caution: "Caution",
    origin: "Comes from",
  },
  effect: { hold: "A fault here: do not tow", fix: "A fault here: fix soon" } satisfies Record<
    Effect,
    string
  >,
  mayBeAbsent: "May be marked as not on this rig",
  walks: (some: readonly Purpose[]) =>
    some.length === purposes.length
      ? "every walk"
      : some.map((one) => purposeWords[one].toLowerCase()).join(", "),
  place: (place: number, of: number) => `${place} of ${of}`,
} as const;

export const besideWords = {
  with: "Compare with another rig",
  none: "No other rig",
  title: (one: string, other: string) => `${one} beside ${other}`,
  sub: "What is on one list and not on the other, and what is put differently. Both lists by today’s catalogue.",
  fetching: "Fetching the other rig",
  goneOther: "The other rig is not here. Choose one above.",
  noSheet: "The other rig’s revision is from before there were sheets, so its list cannot be compared.",
  same: "The two lists are the same.",
  only: (rig: string) => `Only on the list of ${rig}`,
  nothingOnly: "Nothing.",
  both: "On both, put differently",
  what: "What differs",
  notSaid: "nothing",
  members: {
    ask: "Question",
    how: "How to look",
    why: "Why",
    mend: "What mends it",
    who: "Who may mend it",
    caution: "Caution",
    effect: "A fault",
    listed: "Why it is listed",
    origin: "Comes from",
    kind: "Kind",
    part: "Drawing",
    side: "Side",
    drawn: "As drawn",
    mayBeAbsent: "May be absent",
    touches: "Mending touches",
    measure: "Measured",
    lamps: "Lamps",
    figures: "Figures",
  } as Record<string, string>,
  walks: "Walks that have it",
  moved: (walks: readonly Purpose[]) =>
    `At another place in ${walks.map((one) => purposeWords[one].toLowerCase()).join(", ")}.`,
  kinds: { look: "one look", lamps: "lamp by lamp", "brake-idle": "the brake at rest" },
  sides: { left: "left", right: "right" },
  drawing: (part: string) => part.replaceAll("-", " "),
  layouts: {
    combined: "one red lamp a side for stop and turn",
    separate: "a turn lamp of its own beside each stop lamp",
  },
  drawn: {
    off: "with cord and lanyard off",
    standing: "at rest",
    joints: "only the joints",
    tires: "only the tires",
    installed: "without a box at the pedal",
    place: "only where to look",
  } satisfies Record<DrawnState, string>,
  asUsual: "as usual",
  yes: "yes",
  no: "no",
  besides: (some: readonly Purpose[]) =>
    `also ${some.map((one) => purposeWords[one].toLowerCase()).join(", ")}`,
  noBesides: "no others",
} as const;

export const listedWords = {
  question: "Why is this on my list?",
  listed: "On this list",
  origin: "Comes from",
} as const;
