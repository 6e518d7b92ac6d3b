import type { Purpose } from "../entry";
import { purposeWords } from "./walk";

const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);

/** The settings of one browser. */
export const settingsWords = {
  title: "Settings",
  lead: "They hold for this browser and show at once.",
  back: "Back to rigs",
  link: "Settings",
  sample: {
    title: "How it looks",
    strip: "Sample of a walk: 4 of 9 looked at, one hold, one to fix soon",
    good: "Good",
    goodHint: "as drawn",
    fault: "Fault",
    others: ["Back one", "Couldn’t see"],
  },
  look: {
    title: "Day and night",
    choices: {
      device: { label: "As the phone is set" },
      day: { label: "Day" },
      night: { label: "Night" },
      light: { label: "By the light here", hint: "The phone’s light sensor decides." },
    },
  },
  text: {
    title: "Size of text",
    choices: {
      "100": { label: "Usual" },
      "125": { label: "Larger, 125%" },
      "150": { label: "Large, 150%" },
      "200": { label: "Largest, 200%" },
    },
  },
  hand: {
    title: "The hand that holds the phone",
    lead: "In the left hand, the buttons under a check change sides.",
    choices: {
      right: { label: "Right" },
      left: { label: "Left" },
    },
  },
  sound: {
    title: "Sound",
    lead: "A tone when a mark is saved, another for a fault. The screen says the same in words.",
    none: "This browser cannot sound a tone. The screen says everything in words.",
    try: "Hear and feel it",
    choices: { on: { label: "On" }, off: { label: "Off" } },
  },
  vibration: {
    title: "Vibration",
    none: "This browser cannot make the phone vibrate.",
    choices: { on: { label: "On" }, off: { label: "Off" } },
  },
  units: {
    title: "Units",
    choices: {
      us: { label: "Pounds, inches, psi" },
      si: { label: "Kilograms, millimeters, kPa" },
    },
  },
  storage: {
    title: "What is kept on this phone",
    promised: "This browser keeps it until you clear it yourself.",
    notPromised:
      "This browser may clear it when the phone runs short of space or when you stay away for weeks.",
    unknown: "This browser does not say whether it keeps it.",
    used: (used: string, room: string | null) =>
      room ? `${used} used, about ${room} free for it.` : `${used} used.`,
    ask: "Ask the browser to keep it",
    asking: "Asking the browser",
    declined: "The browser does not promise it. Installing Hookfast is what helps most.",
    walks: (count: number, unreceived: number) => {
      if (count === 0) return "No walks on this phone yet.";
      const all = count === 1 ? "1 walk is here" : `${count} walks are here`;
      if (unreceived === 0) return `${all}, received by the server as well.`;
      return `${all}. ${unreceived === 1 ? "1 has" : `${unreceived} have`} not been received by the server and ${unreceived === 1 ? "is" : "are"} nowhere else.`;
    },
    exportAll: "Export everything on this phone",
    exportHint: "One file with each walk’s record, made without a signal.",
  },
  version: {
    title: "Version",
    now: (app: string) => lower(app).replace(/^hookfast/, "Hookfast"),
    current: "A new version is offered here when there is one. It never changes by itself during a walk.",
    waiting: "A new version is on this phone. It can be used when no walk is open.",
  },
} as const;

/** A new version that is ready. */
export const updateWords = {
  title: "A new version is ready",
  text: "It is on this phone already, and your walks stay as they are.",
  take: "Use it now",
  taking: "Changing over",
  notNow: "A walk is open on this phone now. The new version is offered again when it is closed.",
} as const;

/** Handing a record to a person as a file. */
export const exportWords = {
  one: "Export to a file",
  busy: "Writing the file",
  downloaded: (name: string) => `Handed to the browser’s downloads: ${name}`,
  shared: "Handed over.",
  nothing: "There is no walk on this phone to write.",
  failed: "The file was not written: this phone’s storage cannot be read.",
} as const;

type Said = { title: string; text: string };

/** What is wrong with the phone's store, and what to do. */
export const storeWords = {
  full: {
    title: "This phone’s storage is full",
    text: "What you do now is not saved. What was saved before is still here. Make room by removing downloads or apps that you do not need, then tap again.",
  },
  refused: {
    title: "This browser does not let Hookfast keep anything",
    text: "Nothing can be saved here. Private windows and blocked site data do this. Open Hookfast in an ordinary window, or allow it to store data.",
  },
  vanished: {
    title: "What was kept on this phone is gone",
    text: "The browser’s storage was cleared while the walk was open. This page still holds the walk up to its last saved mark: export it to a file before you close the page, then start the walk again.",
  },
  unknown: {
    title: "This phone’s storage does not answer",
    text: "The last step was not saved. Tap again. If it stays so, close other apps or restart the phone; what was saved before stays.",
  },
} as const satisfies Record<string, Said>;

/** What a cleared store took with it. */
export const lostWords = {
  title: (count: number, cutShort: boolean) => {
    const which =
      count === 1 ? "1 walk that had not been received is" : `${count} walks that had not been received are`;
    return `${which} no longer ${cutShort ? "whole " : ""}on this phone`;
  },
  titleReceived: "What was kept on this phone was cleared",
  cleared: "This browser’s storage was cleared.",
  received: (count: number) =>
    count === 1
      ? "1 received walk went too; it is at the desk."
      : `${count} received walks went too; they are at the desk.`,
  walk: (purpose: Purpose, rig: string, when: string) => `${purposeWords[purpose]}, ${rig}, ${when}`,
  left: (left: number, length: number) => `, its first ${left} of ${length} entries are here`,
  held: (count: number) =>
    `This page still holds ${count === 1 ? "it" : "one of them"}. Export it before you close the page.`,
  kept: "What keeps walks: install Hookfast on the home screen, let the browser store data, and sign in so that they are sent.",
  settings: "Storage and installing",
  read: "I have read this",
} as const;

/** Installing, told before someone signs in. */
export const installWords = {
  title: "Before you sign in: install it",
  titleSettings: "Installing",
  why: "On this phone the installed app keeps its own storage. It does not see what this browser keeps, and walks made here stay here.",
  steps: [
    "Tap Share, the square with an arrow.",
    "Tap Add to Home Screen.",
    "Open Hookfast from the home screen and sign in there.",
  ],
  stepsTitle: "Three steps",
  picture: "The Share sign: a square with an arrow upward",
  plain:
    "A browser may clear what a site keeps when the phone runs short of space. What is installed is kept longer. Your browser’s menu has Install or Add to Home Screen.",
  offered:
    "A browser may clear what a site keeps when the phone runs short of space. What is installed is kept longer.",
  button: "Install Hookfast",
  done: "This is the installed app. It opens with no signal, and what it keeps is kept longer than in a browser’s tab.",
} as const;

const KILO = 1000;

/** Bytes as a person reads them: “3 MB”, “1.2 GB”. */
export function bytesText(bytes: number): string {
  if (bytes < KILO ** 2) return `${Math.max(1, Math.round(bytes / KILO))} kB`;
  const [size, unit] = bytes < KILO ** 3 ? [KILO ** 2, "MB"] : [KILO ** 3, "GB"];
  const figure = bytes / size;
  return `${figure < 10 ? Number(figure.toFixed(1)) : Math.round(figure)} ${unit}`;
}
