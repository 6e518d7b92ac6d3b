import type { Role } from "../member";
import { roleWords } from "./desk";

/** What each role is for, where someone chooses one. */
const roleHints: Record<Role, string> = {
  driver: "Walks the rigs and reads their own walks",
  installer: "Fills in rig sheets and walks the rigs",
  manager: "All of it, and invites others",
  auditor: "Reads everything and changes nothing",
};

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** A role as an answer to choose. */
export const roleOption = (role: Role) => ({ label: capital(roleWords[role]), hint: roleHints[role] });

export const peopleWords = {
  title: "People",
  sub: (organisation: string) => `Who belongs to ${organisation}, and who is invited.`,
  fetching: "Fetching the people",
  members: "Members",
  you: "you",
  notYours: "Only managers see who belongs here and invite others.",
  invite: "Invite someone",
  as: "As what?",
  make: "Make a link",
  making: "Making a link",
  link: "Link",
  linkHint: (until: string) =>
    `Good once, until ${until}. Send it to the one you invite yourself: whoever has it can use it, and it is not shown again.`,
  copy: "Copy the link",
  copied: "The link is copied.",
  notCopied: "This browser did not let it be copied. It is marked: copy it by hand.",
  open: "Open invitations",
  none: "None is open.",
  row: (role: Role, by: string) => `${capital(roleWords[role])}, invited by ${by}`,
  until: "good until",
  withdraw: "Withdraw",
  withdrawThis: (role: Role, until: string) =>
    `Withdraw the ${roleWords[role]}’s invitation, good until ${until}`,
  failed: "That did not come about. Try again in coverage.",
  role: (role: Role) => capital(roleWords[role]),
} as const;

export const joinWords = {
  title: "Join",
  looking: "Looking at the invitation",
  lead: (by: string, organisation: string, role: Role) =>
    `${by} invites you to ${organisation}, as ${roleWords[role]}.`,
  submit: "Join",
  submitting: "Joining",
  goneTitle: "This invitation is not open",
  gone: "It was used, was withdrawn, has run out, or the link was cut short. Ask whoever sent it for a new one.",
  unreachedTitle: "Hookfast cannot be reached from here",
  unreached: "The invitation stays open meanwhile. Try again in coverage.",
  again: "Try again",
} as const;
