import type { Depth, Outcome, Purpose, Verdict } from "../entry";

/** The words of a walk that every screen shares. */
export const purposeWords: Record<Purpose, string> = {
  "hook-up": "Hook-up",
  "re-check": "Re-check",
  unhook: "Unhook",
  delivery: "Delivery",
  "yard-out": "Yard out",
  "yard-in": "Yard in",
};

export const depthWords: Record<Depth, string> = { full: "full walk", short: "short walk" };

export const verdictWords: Record<Verdict, string> = {
  "no-hold": "No hold marked",
  hold: "Do not tow",
  unfinished: "Unfinished",
};

export const outcomeWords: Record<Outcome, string> = {
  good: "Good",
  fault: "Fault",
  absent: "Not on this rig",
  unseen: "Couldn’t see",
};

/** What comes before anything that a record says. */
export const deference = "Local towing law, the makers’ ratings and manuals, and a licensed shop come first.";
