import type { RevisionDocument } from "@/lib/domain/revision";
import { longCoachRig, shortCoachRig } from "./fleet-rigs";
import { householdRig } from "./household-rig";
import { organisationIds } from "./people";
import { shopRig } from "./shop-rig";

interface DemoRig {
  id: string;
  revisionId: string;
  name: string;
  keeperId: string;
  builderId: string | null;
  document: RevisionDocument;
}

const { household, shop, fleet } = organisationIds;
const id = (tail: string) => `d3300000-0000-4000-8000-0000000000${tail}`;

/** The demo's rigs; the sheet names them as their keepers do. */
export const rigs = {
  household: demoRig("21", householdRig, household, shop),
  shop: demoRig("22", shopRig, shop, shop),
  longCoach: demoRig("23", longCoachRig, fleet, shop),
  shortCoach: demoRig("24", shortCoachRig, fleet, null),
};

export type DemoRigKey = keyof typeof rigs;

function demoRig(
  tail: string,
  document: RevisionDocument,
  keeperId: string,
  builderId: string | null,
): DemoRig {
  const { name } = document.sheet as { name: string };
  return { id: id(tail), revisionId: id(`${tail.replace("2", "3")}`), name, keeperId, builderId, document };
}
