import "server-only";
import type { InferAttributes } from "sequelize";
import type { Entry } from "@/lib/domain/entry";
import type { WalkReading } from "@/lib/domain/history";
import type { Member } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import type { Receipt } from "@/lib/domain/receipt";
import { recordFile } from "@/lib/domain/record-file";
import type { RevisionDocument } from "@/lib/domain/revision";
import type { PublicKey } from "@/lib/domain/signature";
import type { Revision } from "@/models/revision";
import type { Walk } from "@/models/walk";
import { tables } from "./database";
import { photosOf } from "./photos/reading";
import { walkRow } from "./walk-row";
import { maySeeWalk } from "./walk-visibility";

type StoredWalk = InferAttributes<Walk> & {
  rig: { name: string };
  member: { name: string };
  revision: Pick<Revision, "digest" | "document">;
  sealDevice: { publicKey: string | null };
};

/** One walk read back. What is not there and what the member may not see are the same `not-found`. */
export async function walkReading(member: Member, id: string): Promise<WalkReading | Problem> {
  const walk = await visibleWalk(member, id);
  if (!walk) return new Problem("not-found");
  const { Entry } = tables();
  const entries = await Entry.findAll({
    where: { walkId: id },
    attributes: ["digest", "receivedAt", "bytes"],
    order: ["seq"],
    raw: true,
  });
  return {
    walk: walkRow({
      ...walk,
      rig: walk.rigId,
      member: walk.memberId,
      revision: walk.revision.digest,
    }),
    names: { rig: walk.rig.name, member: walk.member.name },
    depth: walk.depth,
    device: walk.deviceId,
    elapsedMs: walk.elapsedMs,
    document: JSON.parse(walk.revision.document.toString("utf8")) as RevisionDocument,
    entries: entries.map(({ digest, receivedAt, bytes }) => ({
      digest: digest.toString("hex"),
      receivedAt: receivedAt.toISOString(),
      entry: JSON.parse(bytes.toString("utf8")) as Entry,
    })),
    photos: await photosOf(walk),
    closedAs: walk.closedAs,
    seal: sealOf(walk),
  };
}

/** A walk's record file, or `not-found` as above. */
export async function walkRecord(member: Member, id: string): Promise<string | Problem> {
  const walk = await visibleWalk(member, id);
  if (!walk) return new Problem("not-found");
  const { Entry } = tables();
  const entries = await Entry.findAll({
    where: { walkId: id },
    attributes: ["bytes"],
    order: ["seq"],
    raw: true,
  });
  const seal = sealOf(walk);
  return recordFile(
    walk.revision.document.toString("utf8"),
    entries.map(({ bytes }) => bytes.toString("utf8")),
    seal && {
      seal: seal.seal,
      alg: seal.alg,
      signature: seal.signature,
      device: JSON.parse(walk.sealDevice.publicKey!) as PublicKey,
      receipt: seal.receipt,
    },
  );
}

function sealOf({ head, sealAlg, sealSignature, sealDeviceId, receipt }: StoredWalk): WalkReading["seal"] {
  if (receipt === null) return null;
  return {
    seal: head.toString("hex"),
    alg: sealAlg!,
    signature: sealSignature!,
    device: sealDeviceId!,
    receipt: JSON.parse(receipt) as Receipt,
  };
}

async function visibleWalk(member: Member, id: string): Promise<StoredWalk | null> {
  const { Walk, Rig, Member, Revision, Device } = tables();
  const walk = (await Walk.findByPk(id, {
    include: [
      { model: Rig, as: "rig", attributes: ["name"] },
      { model: Member, as: "member", attributes: ["name"] },
      { model: Revision, as: "revision", attributes: ["digest", "document"] },
      { model: Device, as: "sealDevice", attributes: ["publicKey"] },
    ],
    raw: true,
    nest: true,
  })) as unknown as StoredWalk | null;
  return walk && (await maySeeWalk(member, walk)) ? walk : null;
}
