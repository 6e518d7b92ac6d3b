import type { MarkBody, Outcome, Purpose, Verdict } from "../entry";
import type { Role } from "../member";
import type { Check } from "../revision";
import type { Segment } from "../walk-reading";
import { outcomeWords, purposeWords, verdictWords } from "./walk";

export const roleWords: Record<Role, string> = {
  driver: "driver",
  installer: "installer",
  manager: "manager",
  auditor: "auditor",
};

const segmentWords: Record<Segment, string> = {
  todo: "not marked",
  good: "good",
  hold: "do not tow",
  fix: "fix soon",
  unseen: "couldn’t see",
  absent: "not on this rig",
};

/** A mark in words, with what it does where that is not plain from the outcome. */
export function markWords(check: Pick<Check, "effect">, outcome: Outcome, segment: Segment): string {
  if (outcome === "fault") return check.effect === "hold" ? "Fault: do not tow" : "Fault: fix soon";
  return outcome === "absent" && segment === "hold" ? "Not there: do not tow" : outcomeWords[outcome];
}

const signalWords: Record<string, string> = {
  tail: "Tail",
  left: "Left turn",
  right: "Right turn",
  stop: "Stop",
  hazard: "Hazard",
  "stop-left": "Stop with left turn",
  "stop-right": "Stop with right turn",
};

/** What was seen at the lamps: “Stop: left lamp steady, right lamp dark.” */
export function seenWords(seen: NonNullable<MarkBody["seen"]>): string {
  const signals = Object.entries(seen).map(([signal, lamps]) => {
    const states = Object.entries(lamps ?? {}).map(([lamp, state]) => `${lamp} lamp ${state}`);
    return `${signalWords[signal]}: ${states.join(", ")}.`;
  });
  return signals.join(" ");
}

/** The strip of a walk in words, for someone who cannot see it. */
export function stripWords(stations: readonly { title: string; segments: readonly Segment[] }[]): string {
  const parts = stations.map(
    ({ title, segments }) => `${title}: ${segments.map((segment) => segmentWords[segment]).join(", ")}`,
  );
  return `${parts.join("; ")}.`;
}

/** What a walk came to beside its verdict, and that it is no more than that. */
export function verdictSentence(
  counts: { lookedAt: number; asked: number; holds: number },
  took: string,
): string {
  const holds = counts.holds > 0 ? `${plural(counts.holds, "hold")}. ` : "";
  const looked = `${counts.lookedAt} of ${counts.asked} looked at, ${took}.`;
  const record = "This is a record of what someone saw, not a statement that the rig is fit for the road.";
  return `${holds}${looked} ${record}`;
}

/** “1 fault”, “no faults”, “3 entries”. */
export function plural(count: number, one: string, many = `${one}s`): string {
  return `${count === 0 ? "no" : count} ${count === 1 ? one : many}`;
}

export const deskWords = {
  brand: "Hookfast",
  menu: "Menu",
  nav: "Desk",
  skip: "Skip to the content",
  history: "History",
  people: "People",
  field: "Field wing",
  signOut: "Sign out",
  signingOut: "Signing out",
  signOutFailed: "Could not sign out: Hookfast cannot be reached. You are still signed in.",
  who: (role: Role, organisation: string) => `${roleWords[role]}, ${organisation}`,
  sendingToSignIn: "You are signed out. Going to the sign-in page.",
  signIn: "Sign in",
  again: "Try again",
} as const;

export const troubleWords = {
  unreachedTitle: "Hookfast cannot be reached from here",
  unreached:
    "The desk reads from the server, and the server does not answer. Walks are recorded on the phone all the same and stay on the phone until they are received.",
  refusedTitle: "The server turned this down",
  brokenTitle: "The server could not answer",
  staleTitle: "Not up to date",
  stale: (since: string) => `Hookfast cannot be reached. What you see was read at ${since}.`,
} as const;

export const historyWords = {
  title: "History",
  own: "Your walks, newest first.",
  all: (organisation: string) => `Every walk that ${organisation} may read, newest first.`,
  caption: "Walks, newest first",
  columns: {
    opened: "Opened",
    walk: "Walk",
    rig: "Rig",
    by: "By",
    marks: "Marks",
    faults: "Faults",
    state: "Received",
    verdict: "Verdict",
  },
  received: "received",
  stillOpen: "still open",
  marks: (marks: number, faults: number) => `${plural(marks, "mark")}, ${plural(faults, "fault")}`,
  fetching: "Fetching the walks",
  older: "Older walks",
  fetchingOlder: "Fetching older walks",
  shown: (count: number) => `${plural(count, "walk")} shown.`,
  allShown: (count: number) => `${plural(count, "walk")} shown. There are no older ones.`,
  emptyTitle: "No walks yet",
  emptyWalker:
    "A walk appears here when the server has received it. Open Hookfast on your phone, walk a rig, and come back into coverage.",
  emptyReader: "A walk appears here when a driver has made it and the server has received it.",
  toField: "Walk a rig",
  nameless: "name not known",
} as const;

export const walkWords = {
  title: (purpose: Purpose, rig: string) => `${purposeWords[purpose]}, ${rig}`,
  plainTitle: "One walk",
  fetching: "Fetching the walk",
  back: "History",
  by: "By",
  opened: "Opened",
  received: "Received",
  depth: "Depth",
  time: "Walking time",
  rigSheet: "Rig sheet",
  paper: "Copied from a paper list",
  untimed: "untimed",
  closedAs: (verdict: Verdict) =>
    `Closed on the phone as “${verdictWords[verdict]}”. The server’s replay of the same entries differs and is what you see.`,
  stillOpen: (entries: number) => `Still open, ${plural(entries, "entry", "entries")} so far`,
  stillOpenMore:
    "The phone has not closed and signed this walk, or has not been in coverage since. The verdict can still change.",
  holds: "Holds",
  stations: "What was seen",
  stationsSub: "Times count walking time from the start of the walk.",
  earlier: "before",
  notMarked: "Not marked",
  notAsked: "not asked for on this walk",
  because: (because: string) => (because === "mis-tap" ? "corrected a mis-tap" : because),
  remarks: "Notes",
  timeTitle: "Where the time went",
  timeSub: (total: string) => `${total} of walking, a bar a check.`,
  clockAhead: (by: string) =>
    `The phone’s clock was ahead: by it, entries were made at least ${by} after the server received them. The phone’s times below are as the phone gave them.`,
  clockApart: (by: string) =>
    `Received at least ${by} after the phone says its entries were made. There was no signal, or the phone’s clock was behind; the record alone does not say which.`,
  sealTitle: "Signed and received",
  signedWith: (alg: string) => `Signed on a phone (${alg})`,
  otherKey: "Signed by another key of the same member, not by that of the device that made the walk.",
  seal: "Digest that was signed",
  deviceKey: "Key of the device, thumbprint",
  serverKey: "Receipt’s key, thumbprint",
  entries: "Entries",
  record: "Download the record",
  recordHint:
    "The rig sheet, every entry as received, and the signatures: open text that standard tools can check.",
  goneTitle: "There is no such walk here",
  gone: "It may belong to someone else, or the link may be cut short.",
  toHistory: "Go to the history",
} as const;
