import type { KeptWalk } from "@/lib/client/walk-shelf";
import type { Depth, Purpose, Verdict } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import type { OrganisationKind } from "@/lib/domain/member";

const daily: readonly Purpose[] = ["hook-up", "re-check", "unhook"];

const purposesOf: Record<OrganisationKind, readonly Purpose[]> = {
  household: daily,
  shop: [...daily, "delivery"],
  fleet: ["yard-out", "yard-in", ...daily],
};

/** The walks that make sense for an organisation of this kind, the usual one first. */
export function purposesFor(kind: OrganisationKind): readonly Purpose[] {
  return purposesOf[kind];
}

/** The last verdict on a rig that this phone knows of; `kept` where the walk itself is on this phone. */
export interface LastWalk {
  id: string;
  purpose: Purpose;
  verdict: Verdict;
  at: string;
  kept: KeptWalk | null;
}

/** The newer of the last walk that the server told of and the last one closed on this phone. */
export function lastWalkOf(
  rig: Pick<BundleRig, "id" | "lastWalk">,
  walks: readonly KeptWalk[],
): LastWalk | null {
  const told = rig.lastWalk && {
    ...rig.lastWalk,
    kept: walks.find((walk) => walk.id === rig.lastWalk?.id) ?? null,
  };
  const newest = walks.find((walk) => walk.rig === rig.id && walk.verdict !== null);
  if (!newest || (told && (told.id === newest.id || told.at >= newest.openedAt))) return told;
  return lastOfWalk(newest);
}

/** A closed walk as the last one of its rig. */
export function lastOfWalk(kept: KeptWalk): LastWalk | null {
  const { id, purpose, verdict, openedAt } = kept;
  return verdict && { id, purpose, verdict, at: openedAt, kept };
}

/** The walks of a rig that are open on this phone, newest first. */
export function openWalksOf(rig: string, walks: readonly KeptWalk[]): KeptWalk[] {
  return walks.filter((walk) => walk.rig === rig && walk.seal === null);
}

/** After so long away even a practised person takes the full list again. Our own rule. */
const LONG_GAP_MS = 30 * 24 * 60 * 60_000;

/**
 * How far the next walk of a rig goes unless someone says otherwise: as far as the last one on this phone, but in full
 * after a long gap, after a walk that did not end in "no hold", and for a list that is new.
 */
export function usualDepth(rig: BundleRig, walks: readonly KeptWalk[], nowMs: number): Depth {
  const last = walks.find((walk) => walk.rig === rig.id && walk.verdict !== null);
  const recent = last !== undefined && nowMs - Date.parse(last.openedAt) < LONG_GAP_MS;
  const same = last?.verdict === "no-hold" && last.revision === rig.revision.digest;
  return recent && same ? last.depth : "full";
}
