import { useSyncExternalStore } from "react";
import { Field, type HeldWalk } from "@/lib/client/field";
import type { HeldRecord } from "@/lib/client/record-export";
import type { SyncView } from "@/lib/client/sync";
import type { WalkPlan } from "@/lib/client/recorder";
import type { BundleRig } from "@/lib/domain/field";
import { walkingWords } from "@/lib/domain/messages/walking";

let field: Field | null = null;

/** The one Field of this page, made when it is first asked for; never while prerendering. */
export function theField(): Field {
  return (field ??= new Field());
}

const unread: SyncView = {
  ready: false,
  storeRefused: false,
  bundle: null,
  local: null,
  walks: [],
  photos: [],
  signedOut: false,
  roleRefused: false,
  reached: null,
};

/** What the phone's store and its dealings with the server come to, as they change. */
export function useSyncView(): SyncView {
  return useSyncExternalStore(
    (listener) => theField().sync.subscribe(listener),
    () => theField().sync.view(),
    () => unread,
  );
}

type Held = HeldWalk | "elsewhere" | null;

/** The walk that this tab records. It outlives the screen, because letting go and taking up again is not instant. */
let held: { walk: string; hold: Promise<Held> } | null = null;

/** Starts a walk and holds it. Resolves to its id once it is saved on this phone. */
export async function startWalk(rig: BundleRig, plan: WalkPlan): Promise<string> {
  letGo();
  const opened = await theField().open(rig, plan);
  const walk = opened.recorder.view().walk.id;
  held = { walk, hold: Promise.resolve(opened) };
  return walk;
}

/** Starts to enter a card that was filled in by hand; `when` is what the card says of its time, or nothing. */
export async function startPaperWalk(rig: BundleRig, plan: WalkPlan, when: string): Promise<string> {
  const walk = await startWalk(rig, { ...plan, source: "paper" });
  const { noteOf, noteUnknown } = walkingWords.paper;
  const hold = await held?.hold;
  if (hold && hold !== "elsewhere") {
    await hold.recorder.note(when ? noteOf(when.replace("T", " ")) : noteUnknown);
  }
  return walk;
}

/** Takes up a walk of this phone, or answers with the hold that this tab has on it. */
export function takeUp(member: string, walk: string): Promise<Held> {
  if (held?.walk === walk) return held.hold;
  letGo();
  const hold = theField().takeUp(member, walk);
  held = { walk, hold };
  void hold.then(
    (outcome) => (outcome === null || outcome === "elsewhere") && forget(walk),
    () => forget(walk),
  );
  return hold;
}

/** What this tab holds in memory of the walk that it records, for when the store cannot be read; null without one. */
export async function heldRecord(): Promise<(() => HeldRecord) | null> {
  const outcome = await held?.hold.catch(() => null);
  return outcome && outcome !== "elsewhere" ? outcome.recorder.held : null;
}

/** Lets go of the walk that this tab records, unless it is this one. */
export function letGo(unless: string | null = null): void {
  if (!held || held.walk === unless) return;
  void held.hold.then((outcome) => outcome && outcome !== "elsewhere" && outcome.release()).catch(() => {});
  held = null;
}

function forget(walk: string): void {
  if (held?.walk === walk) held = null;
}
