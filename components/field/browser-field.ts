import { useSyncExternalStore } from "react";
import { Field, type HeldWalk } from "@/lib/client/field";
import type { SyncView } from "@/lib/client/sync";
import type { Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";

let field: Field | null = null;

/** The one Field of this page, made when it is first asked for; never while prerendering. */
export function theField(): Field {
  return (field ??= new Field());
}

const unread: SyncView = {
  ready: false,
  storeRefused: false,
  bundle: null,
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
export async function startWalk(rig: BundleRig, member: string, purpose: Purpose): Promise<string> {
  letGo();
  const opened = await theField().open(rig, member, purpose, "full");
  const walk = opened.recorder.view().walk.id;
  held = { walk, hold: Promise.resolve(opened) };
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

/** Lets go of the walk that this tab records, unless it is this one. */
export function letGo(unless: string | null = null): void {
  if (!held || held.walk === unless) return;
  void held.hold.then((outcome) => outcome && outcome !== "elsewhere" && outcome.release()).catch(() => {});
  held = null;
}

function forget(walk: string): void {
  if (held?.walk === walk) held = null;
}
