import { deference } from "./walk";
import type { Role } from "../member";
import { problems, type ProblemCode } from "../problem";
import { roleWords } from "./desk";

export const signInWords = {
  title: "Sign in",
  lead: "Recording goes on without this. Signing in sends your walks, and opens the desk.",
  email: "Email address",
  password: "Password",
  show: "Show password",
  hide: "Hide password",
  submit: "Sign in",
  submitting: "Signing in",
  already: (name: string) => `You are signed in as ${name}.`,
  who: (role: Role, organisation: string) => `${roleWords[role]}, ${organisation}`,
  goOn: "Go on",
  signOut: "Sign out",
  other: "Sign in as someone else",
  home: "Hookfast",
  unreached:
    "Hookfast cannot be reached from here. Nothing was sent that you need to undo; try again in coverage.",
  signOutUnreached: "Hookfast cannot be reached from here, so you are still signed in.",
  wait: (duration: string) => `Too many failed attempts. Try again in ${duration}.`,
  emailMissing: "Enter your email address.",
} as const;

/** What a refused sign-in is told. */
export function refusalSentence(code: ProblemCode, wait: string | null): string {
  return code === "too-many-attempts" && wait ? signInWords.wait(wait) : problems[code].title;
}

export const frontWords = {
  title: "Hookfast",
  lead: "The walk-around for a car towed flat behind a motorhome.",
  job: "An installer records how a rig is built. Hookfast works out its walk-around list, and the owner walks that list at the campsite with no signal. A fleet can show what was looked at, when and by whom.",
  ways: "Ways in",
  field: "Walk a rig",
  fieldHint: "On the phone, signal or not",
  desk: "Desk",
  deskHint: "History and records, for the office",
  signIn: "Sign in",
  signInHint: "To send walks and to read them",
  drawing: {
    title: "A coach’s tail, the tow bar and a car behind it",
    description:
      "Seen from the side. Seven numbers mark where you stand, in walking order: 1 coach tail, 2 car nose, 3 cables and cord, 4 car cabin, 5 pull, 6 car tail, 7 last look.",
  },
  stationsTitle: "Seven places to stand, in walking order",
  stations: ["Coach tail", "Car nose", "Cables and cord", "Car cabin", "Pull", "Car tail", "Last look"],
  deference: `A record says what someone saw, not that a rig is fit for the road. ${deference}`,
} as const;

export const lostWords = {
  title: "There is nothing at this address",
  text: "The link may be old or cut short.",
  front: "Front page",
  field: "Walk a rig",
  desk: "Desk",
} as const;

export const brokenWords = {
  title: "This page stopped working",
  text: "Something went wrong in it. What was saved on this phone is still there.",
  again: "Try again",
  front: "Front page",
} as const;
