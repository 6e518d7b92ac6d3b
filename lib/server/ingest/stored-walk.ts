import { Op, type InferAttributes, type Transaction } from "sequelize";
import type { Entry } from "@/lib/domain/entry";
import type { RevisionDocument } from "@/lib/domain/revision";
import type { Walk } from "@/models/walk";
import { tables } from "../database";

const columns = [
  "id",
  "rigId",
  "revisionId",
  "memberId",
  "organisationId",
  "deviceId",
  "entries",
  "head",
  "state",
  "closed",
  "verdict",
  "receipt",
] as const;

/** What the server has of a walk, as far as taking more of it needs to know. */
export type StoredWalk = Pick<InferAttributes<Walk>, (typeof columns)[number]>;

/** Reads a walk and holds it until the transaction ends, so that two batches cannot both follow the same head. */
export async function lockWalk(id: string, transaction: Transaction): Promise<StoredWalk | null> {
  const { Walk } = tables();
  return Walk.findOne({
    where: { id },
    attributes: [...columns],
    raw: true,
    transaction,
    lock: transaction.LOCK.UPDATE,
  });
}

/** The digests stored at these sequence numbers, in hex. */
export async function storedDigests(
  walkId: string,
  seqs: number[],
  transaction: Transaction,
): Promise<Map<number, string>> {
  if (seqs.length === 0) return new Map();
  const { Entry } = tables();
  const rows = await Entry.findAll({
    where: { walkId, seq: { [Op.in]: seqs } },
    attributes: ["seq", "digest"],
    raw: true,
    transaction,
  });
  return new Map(rows.map(({ seq, digest }) => [seq, digest.toString("hex")]));
}

/** Every stored entry of a walk, in order. */
export async function storedEntries(walkId: string, transaction: Transaction): Promise<Entry[]> {
  const { Entry } = tables();
  const rows = await Entry.findAll({
    where: { walkId },
    attributes: ["bytes"],
    order: ["seq"],
    raw: true,
    transaction,
  });
  return rows.map(({ bytes }) => JSON.parse(bytes.toString("utf8")) as Entry);
}

/** A revision's document. */
export async function revisionDocument(id: string, transaction: Transaction): Promise<RevisionDocument> {
  const { Revision } = tables();
  const row = await Revision.findByPk(id, {
    attributes: ["document"],
    raw: true,
    transaction,
    rejectOnEmpty: true,
  });
  return JSON.parse(row.document.toString("utf8")) as RevisionDocument;
}
