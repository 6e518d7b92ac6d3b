import type { Outcome, Purpose, Verdict } from "../entry";
import type { RefusalCode } from "../field";
import { deference, outcomeWords as outcome, purposeWords as purpose, verdictWords as verdict } from "./walk";

/** Why the server would not take a walk. */
const refused: Record<RefusalCode, string> = {
  invalid: "The server cannot read an entry of it.",
  version: "It was recorded in a version that the server does not know.",
  "foreign-device": "The server does not know this phone as yours.",
  "not-yours": "It belongs to another member.",
  "unknown-rig": "The server does not know this rig as yours.",
  "unknown-revision": "The server does not know the rig sheet that it was made on.",
  fork: "The server holds a different record under the same number.",
  sealed: "The server has it as closed already.",
  gap: "An entry in the middle of it is missing.",
  "broken-chain": "An entry of it does not follow from the one before.",
  incomplete: "Its last entry is missing.",
  "bad-signature": "Its signature does not match this phone’s key.",
};

const small = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine"];
const inWords = (count: number) => small[count] ?? String(count);
const opening = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);
const counted = (count: number, one: string, many: string) => `${inWords(count)} ${count === 1 ? one : many}`;

/** "42 s", "7 min 42 s", "1 h 5 min". */
function spell(elapsedMs: number): string {
  const seconds = Math.floor(elapsedMs / 1000);
  const minutes = Math.floor(seconds / 60);
  if (minutes >= 60) return `${Math.floor(minutes / 60)} h ${minutes % 60} min`;
  return minutes > 0 ? `${minutes} min ${seconds % 60} s` : `${seconds} s`;
}

/** Where a walk waits: at the check in this place, or at none because all are marked. */
type Progress = { place: number | null; total: number };
const reached = ({ place, total }: Progress) =>
  place === null ? `all ${total} marked` : `${place} of ${total}`;

const notStatement = "This is a record of what you saw, not a statement that the rig is fit for the road.";

/** Every sentence of the field wing. */
export const fieldWords = {
  purpose,
  verdict,
  outcome,
  product: "Hookfast",
  documentTitle: (screen: string) => `${screen} · Hookfast`,

  rigs: {
    title: "Rigs",
    reading: "Reading what is kept on this phone",
    who: (name: string, organisation: string) => `${name}, ${organisation}`,
    desk: "Desk",
    prompter: "Lamp prompter for the driver’s phone",
    signIn: "Sign in",
    never: "No walk yet",
    ruled: "Do not tow",
    last: (kind: Purpose, when: string) => `${lower(purpose[kind])}, ${when}`,
    start: (kind: Purpose) => purpose[kind],
    checks: (count: number) => (count === 1 ? "1 check" : `${count} checks`),
    ofRig: (name: string) => `(${name})`,
    goOn: (kind: Purpose, at: Progress | null) =>
      `Go on: ${lower(purpose[kind])}${at ? `, ${reached(at)}` : ""}`,
    callOff: "Call it off…",
    another: "Or start another walk",
    openFinding: (since: string, ask: string) => `Do not tow: open finding since ${since}. ${ask}`,
    openFix: (since: string, ask: string) => `Fix soon: open finding since ${since}. ${ask}`,
  },

  none: {
    unreachedTitle: "Nothing on this phone yet",
    unreached: "Sign in once with a signal. After that this page opens and records with none.",
    trying: "No answer from the server so far. This page keeps trying by itself.",
    fetching: "Fetching your rigs",
    signedOutTitle: "Sign in once",
    signedOut: "Your rigs come to this phone after you sign in. From then on this page works with no signal.",
    noRigsTitle: "No rigs yet",
    noRigs: "Your organization keeps no rig so far. A rig shows here when its sheet is issued.",
    auditorTitle: "Your role reads walks and does not make them",
    auditor: "What was looked at, when and by whom is at the desk.",
    toDesk: "Go to the desk",
  },

  notes: {
    signedOutTitle: "Signed out",
    signedOut: "Recording goes on; walks go to the server after you sign in.",
    auditorKept:
      "Whoever is signed in now may not record. What was recorded on this phone earlier stays here and goes to the " +
      "server after that member signs in.",
    storeTitle: "This browser will not keep anything",
    store:
      "A walk could not be saved here, so none is started. Private windows and blocked site data do this. Open this " +
      "page in an ordinary window, or allow it to store data.",
    storeSlow: "The phone’s storage has not answered yet.",
  },

  kept: {
    title: "Walks on this phone",
    none: "Walks that you make stay here, also with no signal.",
    open: (at: Progress | null) => `Open${at ? `, ${reached(at)}` : ""}`,
    saved: "saved on this phone",
    received: "received",
    receivedAt: (when: string) => `received ${when}`,
    refused: (code: RefusalCode) => `not taken by the server: ${lower(refused[code])}`,
    line: (kind: Purpose, rig: string) => `${lower(purpose[kind])}, ${rig}`,
  },

  walk: {
    taking: "Reading the walk",
    title: (kind: Purpose, rig: string) => `${purpose[kind]}, ${rig}`,
    missingTitle: "This walk is not on this phone",
    missing: "It may have been made on another phone, or by another member.",
    elsewhereTitle: "Another tab records this walk",
    elsewhere: "Here it can only be read. Go on in that tab, or close it and take the walk up here.",
    takeUp: "Take it up here",
    back: "Back to rigs",
    place: (place: number, total: number) => `${place} of ${total}`,
    timer: "Walking time",
    stop: "Stop…",
    good: "Good",
    asDrawn: "as drawn",
    fault: "Fault",
    faultHold: "(do not tow)",
    faultFix: "(fix soon)",
    backOne: "Back one",
    keep: "Leave it, go on",
    marked: (kind: Outcome) => `Marked: ${lower(outcome[kind])}`,
    announce: (saved: Outcome | null, station: string, place: number, total: number) =>
      `${saved ? `${outcome[saved]}, saved. ` : ""}${station}, ${place} of ${total}.`,
    caution: "Caution",
    movedOn: "Not saved. Another tab wrote to this walk. Reload this page and go on from there.",
    strip: (parts: { total: number; lookedAt: number; holds: number; fixes: number }) =>
      [
        `${parts.lookedAt} of ${parts.total} looked at`,
        ...(parts.holds > 0 ? [counted(parts.holds, "hold", "holds")] : []),
        ...(parts.fixes > 0 ? [`${inWords(parts.fixes)} to fix soon`] : []),
      ].join(", "),
  },

  because: {
    title: "This was marked fault. Why is it good now?",
    misTap: "It was a mis-tap",
    fixed: "It was fixed",
    what: "What was done?",
    quick: ["put in place", "part replaced", "closed or locked"],
    own: "Or in a few words",
    save: "Save as good",
    empty: "Say in a few words what was done.",
    cancel: "Leave it as fault",
    back: "Back",
  },

  closing: {
    lookedAt: (done: number, total: number) => `${done} of ${total} looked at`,
    allMarked: "Every check of this walk has a mark.",
    unmarked: "Not marked yet",
    unseen: "Couldn’t see",
    asItStands: (kind: Verdict) => `As it stands: ${verdict[kind]}`,
    closeAndSign: "Close and sign",
    final: (kind: Verdict) =>
      kind === "unfinished" ? "unfinished; nothing can be added after" : "nothing can be added after",
    goOn: "Go on with the walk",
    pause: "Pause",
    pauseHint: "time stands still",
    callOff: "Call it off…",
    lastCheck: "Back to the last check",
    leave: "Back to rigs, the walk stays open",
  },

  result: {
    secure:
      "Secure the car first: parking brake on, wheels chocked. Nobody between the vehicles while either can move.",
    band: (holds: number, done: number, total: number) =>
      `${holds > 0 ? `${opening(counted(holds, "hold", "holds"))}. ` : ""}${done} of ${total} looked at.`,
    holds: "What holds it",
    fixes: "Fix soon",
    notSeen: "Not seen",
    mended: "Marked fault on this walk, good at its end",
    unfinished: "Not every check was seen. Look at what is missing before towing.",
    markedAbsent:
      "Marked as not on this rig, but its list asks for it. Look again, or have the rig sheet corrected.",
    leftOut: "Not marked",
    sentence: (kind: Verdict, holds: number, done: number, total: number, elapsedMs: number | null) =>
      [
        kind === "hold" ? `${verdict.hold}: ${counted(holds, "hold", "holds")}.` : `${verdict[kind]}.`,
        `${done} of ${total} looked at, ${elapsedMs === null ? "from paper, untimed" : spell(elapsedMs)}.`,
        notStatement,
      ].join(" "),
    deference,
    custody: "Where this record is",
    saved: "saved on this phone",
    byItself: "goes to the server by itself when there is a signal",
    signInFirst: "goes to the server after you sign in",
    received: (when: string) => `received ${when}`,
    refusedTitle: "not taken by the server",
    refused: (code: RefusalCode) => `${refused[code]} It stays on this phone.`,
  },

  offline: {
    title: "This page needs the network",
    body: "There is no answer just now. Rigs and walks on this phone open without one.",
    toField: "Go to rigs",
  },
} as const;
