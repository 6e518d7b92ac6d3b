import { compose } from "@/lib/domain/catalogue/compose";
import type { RevisionDocument } from "@/lib/domain/revision";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { organisationIds } from "./people";
import { householdSheet } from "./sheets/household";
import { longCoachSheet } from "./sheets/long-coach";
import { shopSheet } from "./sheets/shop";
import { shortCoachSheet } from "./sheets/short-coach";

interface DemoRig {
  id: string;
  name: string;
  keeperId: string;
  builderId: string | null;
  sheet: Sheet;
  document: RevisionDocument;
}

const { household, shop, fleet } = organisationIds;
const id = (tail: string) => `d3300000-0000-4000-8000-0000000000${tail}`;

/** The demo's rigs; the sheet names them as their keepers do. */
export const rigs = {
  household: demoRig("21", householdSheet, household, shop),
  shop: demoRig("22", shopSheet, shop, shop),
  longCoach: demoRig("23", longCoachSheet, fleet, shop),
  shortCoach: demoRig("24", shortCoachSheet, fleet, null),
};

export type DemoRigKey = keyof typeof rigs;

function demoRig(tail: string, sheet: Sheet, keeperId: string, builderId: string | null): DemoRig {
  return { id: id(tail), name: sheet.name, keeperId, builderId, sheet, document: compose(sheet) };
}
