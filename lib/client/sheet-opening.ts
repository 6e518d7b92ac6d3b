import type { UseStore } from "idb-keyval";
import type { Bundle } from "../domain/field";
import type { Member } from "../domain/member";
import { may } from "../domain/permissions";
import { sheetIn, type Sheet } from "../domain/sheet/sheet";
import type { Answer } from "./api";
import { keptBundle } from "./bundle";
import { keptDraft, type KeptDraft } from "./sheet-draft";
import { readRig } from "./sheet-saving";
import { whoAmI } from "./session";

/** What came of opening a sheet for writing. */
export type Opened =
  | {
      kind: "open";
      /** What the form begins with: the draft on this phone, or the sheet that was saved last. */
      start: KeptDraft;
      /** Whether it is a draft that was begun before, and whether by someone else. */
      draft: "none" | "mine" | "foreign";
      reached: boolean;
      /** Whether its list was written by hand, so that there is no sheet to begin with. */
      sheetless: boolean;
    }
  | { kind: "may-not"; why: "role" | "keeper" }
  | { kind: "gone" }
  | { kind: "not-here" };

/** Where a sheet can come from, and who asks. */
export interface Ground {
  store: UseStore;
  nowIso: () => string;
  /** How long the server may take before what is on this phone serves, in milliseconds. */
  patienceMs?: number;
  who?: typeof whoAmI;
  rig?: typeof readRig;
}

const PATIENCE_MS = 4_000;

/**
 * Opens a rig's sheet: a draft on this phone goes first, then what the server has, then what the field wing keeps.
 * @param isNew whether the rig does not exist yet
 */
export async function openSheet(rig: string, isNew: boolean, ground: Ground): Promise<Opened> {
  const { store, nowIso, patienceMs = PATIENCE_MS, who = whoAmI, rig: read = readRig } = ground;
  const [draft, bundle] = await Promise.all([keptDraft(store, rig), keptBundle(store)]);
  const [asked, reading] = await Promise.all([
    within(patienceMs, who()),
    isNew ? null : within(patienceMs, read(rig)),
  ]);
  const member = asked.kind === "answered" ? asked.value.member : memberOf(bundle);
  if (member && !may(member.role, "rigs.write")) return { kind: "may-not", why: "role" };
  if (reading?.kind === "answered" && !reading.value.mayWrite) return { kind: "may-not", why: "keeper" };
  if (reading?.kind === "refused" && reading.problem.status === 404) return { kind: "gone" };
  const reached = asked.kind === "answered" && reading?.kind !== "unreached";
  if (draft) {
    const foreign = draft.member !== null && member !== null && draft.member !== member.id;
    return { kind: "open", start: draft, draft: foreign ? "foreign" : "mine", reached, sheetless: false };
  }
  const begun = { rig, member: member?.id ?? null, at: nowIso() };
  const open = (base: string | null, baseSheet: Sheet | null, name: string): Opened => ({
    kind: "open",
    start: { ...begun, base, baseSheet, draft: { ...(baseSheet ?? { v: 1, name }) } },
    draft: "none",
    reached,
    sheetless: base !== null && baseSheet === null,
  });
  if (isNew) return open(null, null, "");
  if (reading?.kind === "answered") {
    const { revision, document, name } = reading.value;
    return open(revision.digest, sheetIn(document), name);
  }
  const kept = bundle?.rigs.find(({ id }) => id === rig);
  if (!kept) return { kind: "not-here" };
  return open(kept.revision.digest, sheetIn(kept.revision.document), kept.name);
}

function memberOf(bundle: Bundle | null): Member | null {
  return bundle?.member ?? null;
}

function within<T>(ms: number, answer: Promise<Answer<T>>): Promise<Answer<T>> {
  const late = new Promise<Answer<T>>((done) => setTimeout(() => done({ kind: "unreached" }), ms));
  return Promise.race([answer, late]);
}
