import type { Transaction } from "sequelize";
import type { OpenBody } from "@/lib/domain/entry";
import { refusalDetails as details, type RefusalReason } from "@/lib/domain/messages/refusals";
import { UUID } from "@/lib/domain/uuid";
import { tables } from "../database";
import type { Sender } from "./sender";
import type { StoredWalk } from "./stored-walk";

/** What a walk stands on: a rig, and the revision of its sheet and list. */
export interface Ground {
  rigId: string;
  revisionId: string;
}

/**
 * Finds the rig and revision that an `open` names. A member sees the rigs that the organisation keeps or built; a
 * walk that is stored already may go on with its rig whoever keeps that now.
 */
export async function foundGround(
  { member }: Sender,
  open: OpenBody,
  stored: StoredWalk | null,
  transaction: Transaction,
): Promise<Ground | RefusalReason> {
  const { Rig, Revision } = tables();
  // Text that is no UUID would not even compare with the ascii column.
  const rig = UUID.test(open.rig)
    ? await Rig.findByPk(open.rig, { attributes: ["id", "keeperId", "builderId"], raw: true, transaction })
    : null;
  const theirs = [rig?.keeperId, rig?.builderId].includes(member.organisation.id);
  if (!rig || !(theirs || stored?.rigId === rig.id)) {
    return { code: "unknown-rig", detail: details["unknown-rig"] };
  }
  const revision = await Revision.findOne({
    where: { rigId: rig.id, digest: Buffer.from(open.revision, "hex") },
    attributes: ["id"],
    raw: true,
    transaction,
  });
  if (!revision) return { code: "unknown-revision", detail: details["unknown-revision"] };
  return { rigId: rig.id, revisionId: revision.id };
}
