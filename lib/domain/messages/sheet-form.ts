import type { SectionKey } from "../sheet/draft-sections";
import type { Field } from "../sheet/field";

const plural = (count: number, one: string, many = `${one}s`) => `${count} ${count === 1 ? one : many}`;

const sections: Record<SectionKey, string> = {
  rig: "Rig",
  coach: "Coach",
  car: "Car",
  bar: "Tow bar and coupling",
  plate: "Base plate and cables",
  lines: "Cord, charge line and air",
  brake: "Brake and breakaway",
  wiring: "Wiring",
  manual: "The car’s own manual",
  look: "Look it over",
};

const number = "This is not a number. Enter the figure alone, or choose Not known.";
const unreadable: Record<Field["kind"], string> = {
  mass: number,
  length: number,
  speed: number,
  distance: number,
  pressure: number,
  count: "This is not a whole number. Enter the figure alone, or choose Not known.",
  year: "This is not a year. Enter four digits, or choose Not known.",
  text: "This cannot be kept here. Enter other words.",
  choice: "This is none of the answers here. Choose one.",
  "yes-no": "This is neither yes nor no. Choose one.",
  date: "This is not a date. Enter it again, or choose Not known.",
  photo: "This photograph cannot be kept here. Take it again.",
};

/** Every sentence of the form that fills a rig sheet in; what a field is called stands with the field's own words. */
export const sheetFormWords = {
  title: "Rig sheet",
  newTitle: "New rig",
  editing: (name: string) => `Rig sheet, ${name}`,
  unnamed: "Rig without a name",
  sections,
  name: {
    label: "Name of the rig",
    where: "What the people who walk it call it: a unit number, a nickname, the bay that it stands in.",
  },
  notes: {
    label: "Notes",
    where: "What someone who works on this rig ought to know and no field asks for.",
  },
  contents: "Sections of the sheet",
  place: (at: number, of: number) => `${at} of ${of}`,
  progress: (filled: number, of: number) => `${filled} of ${of}`,
  progressAloud: (filled: number, of: number) => `${filled} of ${of} filled in or not known`,
  wrong: (count: number) => `${count} to mend`,
  strip: (done: number, of: number) => `${done} of ${of} sections filled in`,
  previous: "Previous",
  next: "Next",
  more: "More, for limits and geometry",
  moreCount: (filled: number, of: number) => `${filled} of ${of}`,
  notKnown: "Not known",
  notKnownAloud: (label: string) => `Not known: ${label}`,
  clear: "Clear",
  clearAloud: (label: string) => `Clear: ${label}`,
  choose: "Not filled in",
  unitAloud: (label: string) => `Unit of ${label}`,
  same: (figure: string) => `That is ${figure}.`,
  yes: "Yes",
  no: "No",
  look: "Unusual: ",
  absent: "Not on this rig.",
  unreadable,
  faults: {
    "cannot be negative": "This cannot be negative.",
    "has nothing in it": "There is nothing in it. Enter words, or choose Not known.",
    "not a date": "This is not a date. Enter it again, or choose Not known.",
    "before 1900": "This is before 1900. Look at the year again.",
    "after 2100": "This is after 2100. Look at the year again.",
    "A rig has a name.": "A rig has a name. Give it one in the first section.",
    "the entered value is another one": "The figure and its unit do not belong together. Enter it again.",
  } as Record<string, string>,

  // Keeping
  kept: (at: string) => `Saved on this phone, ${at}`,
  keeping: "Saving on this phone",
  notKept:
    "This phone did not save the last change. What you see is in this page only: export the draft before you leave it.",
  untouched: "Nothing changed yet.",
  openingTitle: "Opening the sheet",
  draftFrom: (at: string) => `Going on with your draft of ${at}.`,
  throwAway: "Throw the draft away",
  throwAwaySure: "Throw away every change since the last save?",
  throwAwayYes: "Throw away",
  throwAwayNo: "Keep it",
  offline:
    "Hookfast cannot be reached. Fill in what you can see: it stays on this phone, to be saved in coverage.",
  notHereTitle: "This rig is not on this phone",
  notHere: "Open it once where Hookfast can be reached. Rigs of the field wing open without it.",
  goneTitle: "There is no such rig",
  gone: "It may be another organization’s, or the address is incomplete.",
  readOnlyTitle: "You can read this sheet, not change it",
  roleRefused: "Installers and managers change rig sheets. Ask one of yours.",
  keptByOther:
    "You built this rig and someone else keeps it now. Its keeper’s installers and managers change its sheet.",
  noSheet:
    "This rig’s list was written by hand, without a sheet. What you fill in here becomes its first sheet, and the list follows from it from then on.",
  otherDraftTitle: "Someone else began a draft of this rig on this phone",
  otherDraft: "Going on with it makes it yours. Starting over leaves nothing of it.",
  otherDraftTake: "Go on with it",
  otherDraftDrop: "Start over",
  draftsTitle: "Drafts on this phone",
  draftsLead: "Sheets that were begun here and not saved yet.",
  draftsNone: "No draft waits here. Begin with a new rig, or open a rig and choose Edit.",
  draftLine: (at: string, isNew: boolean) => `${isNew ? "new rig" : "changes"}, ${at}`,
  newRig: "New rig",
  rigs: "Rigs",

  // Taking over
  importTitle: "Files",
  importLead: "A sheet that was exported fills this draft. What is in the draft now is replaced.",
  importButton: "Import a sheet",
  exportButton: "Export this draft",
  imported: (name: string) => `The draft is now what ${name} says.`,
  importUndo: "Undo the import",
  importNewer: (version: number) =>
    `This sheet is of version ${version}, written by a newer Hookfast. Nothing was taken. Bring Hookfast up to date, then import it again.`,
  importUnreadable: "That file is not JSON, so it is not a sheet. Nothing was taken.",
  importWrong: "That file is not a sheet as it stands. Nothing was taken:",
  bookTitle: (part: string) => `${part} from the book`,
  bookLead: "One that was written down before brings its history along.",
  bookLabel: (part: string) => `Take one that is in the book: ${part}`,
  bookPick: "Choose one",
  bookFailed: "That one could not be fetched. Try again.",
  replaced: "Another one takes its place",
  replacedHint: "Empties these fields and begins a history of its own.",

  // Wiring
  socketLead:
    "What each contact does by a tester with a bulb, one signal at a time. A color is not a measurement.",
  socketFill: (count: number) => `Add its ${count} contacts`,
  contactAdd: "Add a contact",
  segmentsLead:
    "A segment is a run between two places where the wires are joined or plugged. Each wire has a function at either end; they are measured, not read off a color.",
  segmentAdd: "Add a segment",
  segmentBetween: (from: string, to: string) => `${from} to ${to}`,
  up: "Move toward the coach",
  down: "Move toward the lamps",
  remove: "Remove",
  removeAloud: (what: string) => `Remove ${what}`,
  moveAloud: (how: string, what: string) => `${how}: ${what}`,
  conductorsNone: "No wires yet.",
  conductorAdd: "Add a wire",
  wiresOfSocket: (count: number) => `The socket’s ${count}, as measured there`,
  wiresOfSegment: (count: number, segment: number) => `The ${count} of segment ${segment}, as they end there`,
  copyFar: "Measured the same at the far end: copy where it is empty",
  splicesLead: "Where wires are joined within this segment, and how.",
  spliceAdd: "Add a splice",
  groundsLead: "Each point, and every device that hangs on it. The brake unit too.",
  groundAdd: "Add a ground point",
  changes: (color: string, near: string, far: string) =>
    `${color} does “${near}” at the near end and “${far}” at the far end, under one color. Put a tag that says so at both ends.`,
  unnamedWire: "This wire",

  // The car's own manual
  manualCaution:
    "Nothing here is Hookfast’s own. Only the owner’s manual of this very car says how it may be towed: this year, trim, engine and gearbox. Two people should read the page, apart from each other, and agree on what it says.",
  manualHurts: "A step left out or of another car can ruin a gearbox, or leave a car that rolls away.",
  forbidden:
    "The rig is ruled out: its list holds at the first station and says that the manual forbids it. Another car, or another way to carry this one, is between you, its maker and a licensed shop.",
  notRecorded:
    "The list holds at the cabin until someone has read the manual and written down what it says. That is not the same as a manual that forbids it.",

  // Look it over
  errorsTitle: "Cannot be saved yet",
  errorsLead: "These fields cannot be as they are:",
  missingTitle: "The list waits for these",
  missingLead:
    "Empty is taken: the list then asks more than it may have to. Look for them while you are at the rig.",
  missingNone: "Everything that the list hangs on is filled in or not known.",
  ruledOutTitle: "Do not tow",
  ruledOutLead: "This sheet rules the rig out. The list holds at its first station and says why:",
  warningsTitle: "Look at these again",
  warningsLead: "They are taken as they stand, and hardly ever so:",
  listTitle: "The list that comes out",
  listCount: (short: number, full: number) => `Hook-up: ${plural(short, "check")} short, ${full} full.`,
  listOthers: (recheck: number, unhook: number) => `Re-check ${recheck}, unhook ${unhook}.`,
  listWaits: "The list is composed once nothing above keeps the sheet from being saved.",
  saveTitle: "Save",
  saveLead: "Saving makes a new revision. Walks that were made keep the one they were made against.",
  save: "Save the sheet",
  saving: "Saving",
  unreached:
    "Hookfast cannot be reached. The sheet is kept on this phone: come back to this page in coverage and save it.",
  signedOut: "You are signed out. The draft is kept on this phone: sign in, then save it.",
  signIn: "Sign in",
  refused: "The server turned this down:",
  unchanged: "Nothing differs from what was saved last.",
  staleTitle: "Someone else has saved this rig meanwhile",
  staleLead: (number: number, by: string | null) =>
    `There is a revision ${number}${by ? ` by ${by}` : ""} that your draft does not know of. Nothing of it is lost, and nothing of yours.`,
  theirs: "What they changed, taken into your draft",
  mine: "What you changed, kept",
  conflicts: "Changed by both: choose",
  takeMine: "Yours",
  takeTheirs: "Theirs",
  emptied: "emptied",
  saveMerged: "Save over the new revision",
  chooseFirst: "Choose at each of these first.",
  lines: (count: number) => plural(count, "row"),
  photoKept: "The photograph is kept on this phone, and sent once the sheet is saved.",
  photoGone: "Remove the photograph",
  photoAlt: "The manual’s page",
} as const;
