import type { Transaction } from "sequelize";
import { canonicalText } from "@/lib/domain/json";
import type { Member } from "@/lib/domain/member";
import { sheetReadingWords as say } from "@/lib/domain/messages/sheet-reading";
import { Problem } from "@/lib/domain/problem";
import type { Saved } from "@/lib/domain/rigs";
import { tables } from "../database";
import { claimThings } from "../things/recording";
import { inTransaction } from "../transaction";
import { revisionsOf } from "./reading";
import { inBody, receivedSheet } from "./received-sheet";
import { revisionRow } from "./revision-row";
import { composed, storeRevision } from "./store-revision";

type Outcome = { status: 200 | 201; json: Saved } | Problem;

/**
 * Makes a rig of its first sheet. Its id is the sender's: the same id with the same sheet again is 200 with the revision
 * that it made the first time, whatever came after it; with another sheet it is `id-taken`.
 * @param raw the request's `sheet` as received
 */
export async function rigMade(
  member: Member,
  id: string,
  raw: unknown,
  now: Date = new Date(),
): Promise<Outcome> {
  const sheet = receivedSheet(raw);
  if (sheet instanceof Problem) return sheet;
  const revision = composed(sheet);
  const { id: organisationId, kind } = member.organisation;
  return inTransaction(async (transaction): Promise<Outcome> => {
    const { Rig } = tables();
    const author = { member, now, transaction };
    const rig = await lockedRig(id, transaction);
    if (rig) {
      const first = rig.keeperId === organisationId ? await firstRevision(id, transaction) : null;
      if (!first || sheetText(first.document) !== canonicalText(sheet)) {
        return new Problem("id-taken", { errors: [{ pointer: "/id", detail: say.taken }] });
      }
      return { status: 200, json: await saved(id, first.number, transaction) };
    }
    const faults = await claimThings(author, id, sheet);
    if (faults.length > 0) return new Problem("wrong-shape", { errors: inBody(faults) });
    await Rig.create(
      {
        id,
        name: sheet.name,
        keeperId: organisationId,
        builderId: kind === "shop" ? organisationId : null,
        createdAt: now,
      },
      { transaction },
    );
    await storeRevision(author, id, 1, revision);
    return { status: 201, json: await saved(id, 1, transaction) };
  });
}

/**
 * Saves a sheet as a rig's next revision. One that changes nothing is 200, so that sending again after a lost answer is
 * harmless; one over a revision that is not the latest any more is `stale-base`.
 * @param base digest of the revision that the sheet was made over
 * @param raw the request's `sheet` as received
 */
export async function revisionSaved(
  member: Member,
  id: string,
  base: string,
  raw: unknown,
  now: Date = new Date(),
): Promise<Outcome> {
  const sheet = receivedSheet(raw);
  if (sheet instanceof Problem) return sheet;
  const revision = composed(sheet);
  return inTransaction(async (transaction): Promise<Outcome> => {
    const { Rig } = tables();
    const author = { member, now, transaction };
    const rig = await lockedRig(id, transaction);
    const organisationId = member.organisation.id;
    if (!rig || ![rig.keeperId, rig.builderId].includes(organisationId)) return new Problem("not-found");
    if (rig.keeperId !== organisationId) return new Problem("role-refused", { detail: say.keeperOnly });
    const latest = await latestRevision(id, transaction);
    const digest = latest.digest.toString("hex");
    if (digest === revision.digest) {
      return { status: 200, json: await saved(id, latest.number, transaction) };
    }
    if (digest !== base) return new Problem("stale-base");
    const number = latest.number + 1;
    const faults = await claimThings(author, id, sheet);
    if (faults.length > 0) return new Problem("wrong-shape", { errors: inBody(faults) });
    await storeRevision(author, id, number, revision);
    if (rig.name !== sheet.name) await Rig.update({ name: sheet.name }, { where: { id }, transaction });
    return { status: 201, json: await saved(id, number, transaction) };
  });
}

// Held until the transaction ends, so that two who save at once do so one after the other.
async function lockedRig(id: string, transaction: Transaction) {
  return tables().Rig.findOne({
    where: { id },
    attributes: ["name", "keeperId", "builderId"],
    raw: true,
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
}

async function firstRevision(rigId: string, transaction: Transaction) {
  return tables().Revision.findOne({
    where: { rigId, number: 1 },
    attributes: ["number", "document"],
    raw: true,
    transaction,
  });
}

async function latestRevision(rigId: string, transaction: Transaction) {
  return tables().Revision.findOne({
    where: { rigId },
    attributes: ["number", "digest"],
    order: [["number", "DESC"]],
    raw: true,
    transaction,
    rejectOnEmpty: true,
  });
}

function sheetText(document: Buffer): string {
  return canonicalText((JSON.parse(document.toString("utf8")) as { sheet: unknown }).sheet);
}

async function saved(rigId: string, number: number, transaction: Transaction): Promise<Saved> {
  const [revision] = await revisionsOf(rigId, { number, transaction });
  return { rig: rigId, revision: revisionRow(revision!) };
}
