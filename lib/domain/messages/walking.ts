import { purposeWords as purpose } from "./walk";
import type { Purpose } from "../entry";

const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);
const secureFirst =
  "Secure the car first: parking brake on, wheels chocked. Nobody between the vehicles while either can move.";

/** What is said while a walk is made, beside the checks themselves. */
export const walkingWords = {
  secureFirst,

  details: {
    title: "Saved as fault. What is not as drawn?",
    titlePlace: "Saved as fault. What is wrong?",
    hold: "Do not tow until this is mended.",
    mended: "Mended on the spot",
    own: "In a few words",
    ownHint: "Not needed. Kept as you type.",
    before: (note: string) => `It was marked fault before: ${note}`,
    beforeBare: "It was marked fault before.",
    goOn: "Go on",
    misTap: "Mis-tap: it is good",
    more: "Say what is wrong",
    noteOf: (labels: readonly string[], own: string) =>
      [labels.length > 0 ? `Not as drawn: ${labels.join("; ")}` : "", own].filter(Boolean).join(". "),
  },

  measure: {
    keypad: "Digits",
    point: "Decimal point",
    erase: "Erase",
    save: "Save and go on",
    skip: "Go on without",
    entered: (value: string, unit: string) => `${value === "" ? "—" : value} ${unit}`,
    read: (value: string, unit: string) => `Read: ${value} ${unit}`,
    empty: "Tap what the gauge reads, or go on without.",
  },

  resume: {
    paused: (away: string | null) => (away ? `Paused ${away} ago` : "Paused"),
    left: (away: string | null) => (away ? `Left ${away} ago` : "This walk was left"),
    clocks: "The phone’s clock was set meanwhile, so how long is not known.",
    nextUp: (place: number, total: number, ask: string) => `It waits at ${place} of ${total}: ${ask}`,
    again: "Asked again, since a step is easily missed here:",
    car: "Has anyone been in the car since the cabin was marked?",
    nobody: "Nobody has",
    nobodyHint: "go on",
    someone: "Someone, or not sure",
    someoneHint: "the cabin is asked again",
    goOn: "Go on",
    onlyPhone: "Only the phone was away: ask nothing again",
    callOff: "Call it off…",
  },

  car: {
    title: "Before the last look",
    question: "Has anyone been in the car since the cabin was marked?",
    why: "A start to charge, a bag off the seat: that is how a car ends up back in park, or with its column locked.",
    nobody: "Nobody has",
    someone: "Someone, or not sure",
    someoneHint: "the cabin is asked again",
  },

  stop: {
    why: "Why is it called off?",
    whyNote: "The walk is closed and signed as it stands, with this reason in it.",
    reasons: ["not towing today", "needs a part", "needs a shop", "weather or light", "called away"],
    own: "In a few words",
    save: "Call it off and sign",
    back: "Back",
    empty: "Choose or write a reason.",
    noteOf: (reason: string) => `called off: ${reason}`,
  },

  held: {
    title: "What holds it",
    who: "Who may",
    whoUsual: "You, by the maker’s manual; a licensed shop where it is not plain.",
    again: "Fixed, look again",
    againHint: "and what it touches",
    againList: (count: number) =>
      `${count === 1 ? "One check is" : `${count} checks are`} asked again; the others cannot have changed.`,
    callOff: "Call it off…",
    walkAgain: "Fixed: walk it again",
    walkAgainHint: "a new walk, every hold of the list",
  },

  stale: {
    left: "The rig was left, or the car entered",
    stands: "This stands while someone stays with the rig and nobody is in the car.",
    leftTitle: (when: string) => `Stale since ${when}: the rig was left or the car entered`,
    leftAdvice: "Walk a re-check before towing, and the cabin too if anyone was in the car.",
    oldTitle: "Stale: hours have passed since",
    oldAdvice: "It says how the rig was then. Walk again before towing.",
  },

  depth: {
    legend: "How far",
    full: (count: number) => `Full list, ${count}`,
    short: (count: number) => `Holds only, ${count}`,
  },

  paper: {
    open: "Paper cards",
    title: "Paper cards",
    lead: "For a phone that may be dead or left behind. Print a card, walk by it, and enter it here later: it is kept as a walk from paper, without times.",
    print: (kind: Purpose) => `Print: ${lower(purpose[kind])}`,
    enter: (kind: Purpose) => `Enter: ${lower(purpose[kind])}`,
    toPrinter: "Print this card",
    back: "Back",
    when: "When was it walked?",
    whenHint: "As written on the card. Leave it empty if it is not.",
    start: "Enter the marks",
    untimed: "from paper",
    copy: "Copy the mark from the card.",
    noteOf: (when: string) => `Walked on paper, ${when}.`,
    noteUnknown: "Walked on paper, when was not written.",
    cardTitle: (kind: Purpose, rig: string) => `${purpose[kind]}: ${rig}`,
    rule: "Mark each check as you look at it. If you are interrupted, do the last two again. If anyone was in the car, do the cabin again.",
    columns: { good: "Good", fault: "Fault", absent: "Not on rig", unseen: "Couldn’t see" },
    hold: "do not tow",
    fix: "fix soon",
    date: "Date and time",
    who: "Walked by",
    noted: "What was wrong",
    revision: (digest: string) => `List ${digest}`,
    notStatement:
      "A record of what you saw, not a statement that the rig is fit for the road. Local towing law, the makers’ ratings and manuals, and a licensed shop come first.",
    heldBy: (kind: string) => `Any fault marked “${kind}”: ${lower(secureFirst)}`,
  },

  plan: {
    title: "Where you are",
    open: "Show the stations",
    here: "you are here",
    state: (done: number, total: number) => `${done} of ${total} marked`,
    back: "Back to the check",
  },
} as const;
