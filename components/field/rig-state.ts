import type { KeptWalk } from "@/lib/client/walk-shelf";
import type { Purpose, Verdict } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import type { OrganisationKind } from "@/lib/domain/member";

const daily: readonly Purpose[] = ["hook-up", "re-check", "unhook"];

const purposesOf: Record<OrganisationKind, readonly Purpose[]> = {
  household: daily,
  shop: [...daily, "delivery"],
  fleet: [...daily, "yard-out", "yard-in"],
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
  const { id, purpose, verdict, openedAt } = newest;
  return { id, purpose, verdict: verdict!, at: openedAt, kept: newest };
}

/** The walks of a rig that are open on this phone, newest first. */
export function openWalksOf(rig: string, walks: readonly KeptWalk[]): KeptWalk[] {
  return walks.filter((walk) => walk.rig === rig && walk.seal === null);
}
