import type { BrakeFamily, Coupling } from "../sheet/gear";
import type { WiringStyle } from "../sheet/wiring";
import { deference } from "./walk";

/** What is wrong with one line of a sign-up. */
export const signUpErrors = {
  name: "Enter your name.",
  household: "Enter a name for the household.",
  email: "Enter your email address.",
  emailForm: "An email address has a name, an @ and a place.",
  passwordShort: "Use 15 characters or more. A few words with spaces will do.",
  long: "This is too long.",
  rig: "A rig has a name.",
  rigs: "At most five rigs.",
  twice: "The same rig twice.",
} as const;

const counted = (count: number, one: string, many: string) => (count === 1 ? `1 ${one}` : `${count} ${many}`);

export const signUpWords = {
  title: "Sign up",
  lead: "An account keeps your rigs and walks with Hookfast, beside what is on the phone.",
  name: "Your name",
  nameHint: "It stands beside the walks that you make.",
  household: "Household",
  householdHint: "What stands over your rigs, such as Maple Loop.",
  email: "Email address",
  password: "New password",
  passwordHint: "15 characters or more. A few words with spaces will do.",
  show: "Show password",
  hide: "Hide password",
  submit: "Sign up",
  submitting: "Signing up",
  bring: {
    title: "Goes with your account from this phone",
    walks: (count: number) => (count === 0 ? "no walk yet" : counted(count, "walk", "walks")),
    then: "The walks are sent after you have signed up. What was recorded stays as it was signed.",
  },
  other: "Sign up someone else",
  have: "Have an account?",
  signIn: "Sign in",
  unreached:
    "Hookfast cannot be reached from here. What is on this phone stays on it; try again in coverage. If this was sent " +
    "after all, sign in.",
  storeSilent: "This phone’s storage did not answer, so nothing was sent. Try again.",
  addressTaken: "There is an account with that address already. Sign in with it, or use another address.",
  idTaken:
    "An account with what is on this phone exists already. Sign in with its address, and the walks go there by themselves.",
  wait: (duration: string | null) =>
    duration ? `Too many attempts. Try again in ${duration}.` : "Too many attempts. Wait, then try again.",
} as const;

/** On the sign-in and front pages: the way to an account, and without one. */
export const noAccountWords = {
  question: "No account yet?",
  signUp: "Sign up",
  stays:
    "Rigs and walks made on this phone without an account stay on this phone when you sign in. They go along only when " +
    "you sign up.",
  start: "Start without an account",
  startHint: "Answer six questions and walk the list that comes of them. Everything stays on this phone.",
} as const;

/** The wing on a phone without an account. */
export const localWords = {
  member: "This phone",
  organisation: "no account",
  title: "On this phone only",
  kept: "Kept on this phone only. Sign up and it is kept with your account.",
  lost: "A phone that is lost, or a browser that is cleared, takes along what only it has.",
  beside:
    "Made without an account, so it stays on this phone and does not go to the account that is signed in. Sign up with " +
    "another address, and it goes with that account.",
  signUp: "Sign up",
  signIn: "Sign in",
  another: "Make another rig",
  full: "A phone without an account keeps at most five rigs.",
  plain: `This is a plain list from a few answers. ${deference}`,
  signUpFirst: "goes to the server after you sign up",
} as const;

type Choice = { label: string; hint?: string };

/** Making a rig on the phone, one question at a time. */
export const starterWords = {
  title: "New rig",
  place: (place: number, total: number) => `${place} of ${total}`,
  strip: (place: number, total: number) => `Question ${place} of ${total}`,
  back: "Back one",
  leave: "Back to rigs",
  plain:
    "A plain list comes of these answers. The makers’ manuals of the coach, the car and the gear come first, wherever they say more or something else.",
  next: "Go on",
  hitch: {
    ask: "How does the tow bar meet the coach?",
    choices: {
      direct: { label: "Into the receiver", hint: "The bar’s own shank, held by a pin" },
      ball: { label: "On a ball", hint: "A coupler with a latch" },
      pintle: { label: "On a pintle hook", hint: "A ring on a hook with a latch" },
    } satisfies Record<Coupling, Choice>,
  },
  brake: {
    ask: "What brakes the car while it is towed?",
    choices: {
      portable: { label: "A portable box", hint: "It stands at the pedal" },
      "installed-vacuum": { label: "Built in, electric", hint: "With a vacuum of its own" },
      air: { label: "Built in, on the coach’s air" },
      hydraulic: { label: "A line of fluid from the coach" },
      surge: { label: "In the tow bar", hint: "By its push or by a cable" },
      none: { label: "Nothing yet", hint: "The list then says: do not tow" },
    } satisfies Record<BrakeFamily, Choice>,
  },
  airLine: {
    ask: "Does an air line run from the coach to the car?",
    choices: { yes: { label: "Yes" }, no: { label: "No" } } satisfies Record<"yes" | "no", Choice>,
  },
  lamps: {
    ask: "What shines at the car’s tail?",
    choices: {
      diodes: { label: "The car’s own lamps", hint: "Wired in through diodes" },
      bulbs: { label: "Separate bulbs", hint: "Put into the car’s lamp housings" },
      "light-bar": { label: "A light bar", hint: "Set on the car’s tail and taken off again" },
      "trailer-plug": { label: "Lamps on a trailer plug", hint: "Plugged into a socket on the car" },
    } satisfies Record<WiringStyle, Choice>,
  },
  manual: {
    ask: "What does the car’s own manual say about towing it on all four wheels?",
    choices: {
      how: { label: "It says how", hint: "You have the page" },
      forbidden: { label: "It forbids it", hint: "The list then says: do not tow" },
      "not-recorded": { label: "Not looked up yet", hint: "The list holds until it is" },
    } satisfies Record<"how" | "forbidden" | "not-recorded", Choice>,
  },
  page: {
    ask: "What the manual’s page says",
    lead: "From the owner’s manual of exactly this car. Manuals contradict each other, so nothing is filled in for you.",
    page: "Page",
    pageMissing: "Enter the page, or go back and say that it was not looked up yet.",
    endState: "How the cabin is left, in the manual’s words or yours",
    endStateHint: "What one sees when its last step is done.",
    endStateMissing: "Say what one sees when the page’s last step is done.",
  },
  name: {
    ask: "What do you call this rig?",
    label: "Name",
    usual: "Our rig",
    missing: "Give the rig a name.",
    save: "Keep this rig",
    saveHint: "on this phone",
    saving: "Keeping it",
    notSaved: "Not kept. This phone did not save the rig. Try again; if it stays so, free some space.",
  },
} as const;
