import { QueryTypes, type Transaction } from "sequelize";
import { compose } from "@/lib/domain/catalogue/compose";
import { ruledOut } from "@/lib/domain/catalogue/rule-outs";
import { digestOf } from "@/lib/domain/digest";
import type { Member } from "@/lib/domain/member";
import { may } from "@/lib/domain/permissions";
import { Problem } from "@/lib/domain/problem";
import type { RevisionDocument } from "@/lib/domain/revision";
import type { RevisionReading, RigReading, RigRow } from "@/lib/domain/rigs";
import { sheetIn } from "@/lib/domain/sheet/sheet";
import { database } from "../database";
import { REVISION_COLUMNS, revisionRow, type ListedRevision } from "./revision-row";

/** The most rigs in a list. */
const MOST_RIGS = 200;

type StoredRig = ListedRevision & {
  id: string;
  name: string;
  keeperId: string;
  keeperName: string;
  builderId: string | null;
  builderName: string | null;
  document: Buffer;
};

const RIG_COLUMNS = `r.id, r.name, r.keeper_id AS keeperId, k.name AS keeperName,
  r.builder_id AS builderId, b.name AS builderName, ${REVISION_COLUMNS}, v.document`;

const WITH_LATEST = `JOIN organisations k ON k.id = r.keeper_id
  LEFT JOIN organisations b ON b.id = r.builder_id
  JOIN revisions v ON v.rig_id = r.id AND v.number = (SELECT MAX(number) FROM revisions WHERE rig_id = r.id)
  LEFT JOIN members m ON m.id = v.member_id`;

/** The statement for the rigs that an organisation keeps or built: two look-ups, since one with OR could use no index. */
export const RIG_LIST = `SELECT ${RIG_COLUMNS} FROM (
    SELECT id FROM rigs WHERE keeper_id = :organisation
    UNION SELECT id FROM rigs WHERE builder_id = :organisation) AS seen
  JOIN rigs r ON r.id = seen.id ${WITH_LATEST}
  ORDER BY r.name, r.id LIMIT ${MOST_RIGS}`;

const ONE_RIG = `SELECT ${RIG_COLUMNS} FROM rigs r ${WITH_LATEST}
  WHERE r.id = :id AND :organisation IN (r.keeper_id, r.builder_id)`;

/** The rigs that the member's organisation keeps or built, by name. */
export async function rigList(member: Member): Promise<RigRow[]> {
  const rigs = await database().query<StoredRig>(RIG_LIST, {
    type: QueryTypes.SELECT,
    replacements: { organisation: member.organisation.id },
  });
  return rigs.map((rig) => rigRow(member, rig, documentOf(rig)));
}

/** One rig with its history. What is not there and what the member may not see are the same `not-found`. */
export async function rigReading(member: Member, id: string): Promise<RigReading | Problem> {
  const [rig] = await database().query<StoredRig>(ONE_RIG, {
    type: QueryTypes.SELECT,
    replacements: { id, organisation: member.organisation.id },
  });
  if (!rig) return new Problem("not-found");
  const document = documentOf(rig);
  const revisions = await revisionsOf(id);
  return { ...rigRow(member, rig, document), document, revisions: revisions.map(revisionRow) };
}

/** One revision of a rig, or `not-found` as above. */
export async function revisionReading(
  member: Member,
  id: string,
  digest: string,
): Promise<RevisionReading | Problem> {
  const [revision] = await database().query<ListedRevision & { document: Buffer }>(
    `SELECT ${REVISION_COLUMNS}, v.document FROM rigs r
      JOIN revisions v ON v.rig_id = r.id
      LEFT JOIN members m ON m.id = v.member_id
      WHERE r.id = :id AND :organisation IN (r.keeper_id, r.builder_id) AND v.digest = :digest
      ORDER BY v.number DESC LIMIT 1`,
    {
      type: QueryTypes.SELECT,
      replacements: { id, organisation: member.organisation.id, digest: Buffer.from(digest, "hex") },
    },
  );
  if (!revision) return new Problem("not-found");
  return { ...revisionRow(revision), rig: id, document: documentOf(revision) };
}

/** A rig's revisions, newest first; the one with a number where it is given. */
export async function revisionsOf(
  rigId: string,
  wanted: { number?: number; transaction?: Transaction } = {},
): Promise<ListedRevision[]> {
  const { number = null, transaction } = wanted;
  return database().query<ListedRevision>(
    `SELECT ${REVISION_COLUMNS} FROM revisions v LEFT JOIN members m ON m.id = v.member_id
      WHERE v.rig_id = :rigId ${number === null ? "" : "AND v.number = :number"}
      ORDER BY v.number DESC`,
    { type: QueryTypes.SELECT, replacements: { rigId, number }, transaction },
  );
}

function documentOf({ document }: { document: Buffer }): RevisionDocument {
  return JSON.parse(document.toString("utf8")) as RevisionDocument;
}

function rigRow({ role, organisation }: Member, rig: StoredRig, document: RevisionDocument): RigRow {
  const { id, name, keeperId, keeperName, builderId, builderName } = rig;
  const sheet = sheetIn(document);
  return {
    id,
    name,
    keeper: { id: keeperId, name: keeperName },
    builder: builderId === null ? null : { id: builderId, name: builderName! },
    mayWrite: keeperId === organisation.id && may(role, "rigs.write"),
    revision: revisionRow(rig),
    ruledOut: sheet ? ruledOut(sheet).map(({ says }) => says) : [],
    newerList: sheet !== null && digestOf(compose(sheet)) !== rig.digest.toString("hex"),
  };
}
