import type { Transaction } from "sequelize";
import { bodyOf, type Link } from "@/lib/domain/entry";
import type { Seal } from "@/lib/domain/field";
import { canonicalText } from "@/lib/domain/json";
import { replay } from "@/lib/domain/replay";
import { tables } from "../database";
import { signReceipt } from "../server-key";
import type { Ground } from "./ground";
import type { Sender } from "./sender";
import { revisionDocument, storedEntries, type StoredWalk } from "./stored-walk";

/** What one transaction writes with. */
export interface Pen {
  sender: Sender;
  /** When the batch came. */
  now: Date;
  transaction: Transaction;
}

/** Stores entries that follow the head (one at least), and what the walk adds up to with them. */
export async function appendEntries(
  { sender, now, transaction }: Pen,
  stored: StoredWalk | null,
  ground: Ground,
  links: readonly Link[],
): Promise<void> {
  const { Walk, Entry, PhotoEntry } = tables();
  const { entry: last, digest } = links.at(-1)!;
  const walkId = last.walk;
  const earlier = stored ? await storedEntries(walkId, transaction) : [];
  const entries = [...earlier, ...links.map(({ entry }) => entry)];
  const { open, closed, verdict, counts, elapsedMs } = replay(
    await revisionDocument(ground.revisionId, transaction),
    entries,
  );
  const close = bodyOf(last, "close");
  const standing = {
    closed,
    verdict,
    closedAs: close && close.verdict !== verdict ? close.verdict : null,
    ...counts,
    entries: entries.length,
    elapsedMs,
    head: Buffer.from(digest, "hex"),
  };
  if (stored) {
    await Walk.update(standing, { where: { id: walkId }, transaction });
  } else {
    const openedAt = new Date(entries[0]!.at);
    await Walk.create(
      {
        id: walkId,
        ...ground,
        memberId: sender.member.id,
        organisationId: sender.member.organisation.id,
        deviceId: sender.device,
        purpose: open!.purpose,
        depth: open!.depth,
        source: open!.source ?? null,
        openedAt,
        receivedAt: now,
        sortAt: openedAt < now ? openedAt : now,
        state: "open",
        ...standing,
        sealedAt: null,
        sealAlg: null,
        sealSignature: null,
        sealDeviceId: null,
        receipt: null,
      },
      { transaction },
    );
  }
  const rows = links.map((link) => ({ walkId, ...bytesOf(link), receivedAt: now }));
  await Entry.bulkCreate(rows, { transaction });
  await PhotoEntry.bulkCreate(links.flatMap(photoOf), { transaction });
}

/** What is looked up of a photograph that an entry names, beside the entry itself. */
function photoOf({ entry }: Link) {
  const photo = bodyOf(entry, "photo");
  if (!photo) return [];
  const { check = null, sha256, bytes, mime } = photo;
  return [{ walkId: entry.walk, seq: entry.seq, check, sha256: Buffer.from(sha256, "hex"), bytes, mime }];
}

/** Keeps a second content for a stored sequence number apart. The same one again changes nothing. */
export async function keepFork({ sender, now, transaction }: Pen, link: Link): Promise<void> {
  const { Fork } = tables();
  const row = {
    walkId: link.entry.walk,
    ...bytesOf(link),
    deviceId: sender.device,
    memberId: sender.member.id,
    receivedAt: now,
  };
  await Fork.bulkCreate([row], { ignoreDuplicates: true, transaction });
}

/** Seals a closed walk: stores who signed it, and the receipt that the phone is answered with from now on. */
export async function sealWalk(
  { sender, now, transaction }: Pen,
  stored: Pick<StoredWalk, "id" | "entries" | "verdict">,
  { seal, alg, signature }: Seal,
): Promise<void> {
  const { Walk } = tables();
  const receipt = signReceipt({
    walk: stored.id,
    seal,
    entries: stored.entries,
    verdict: stored.verdict,
    receivedAt: now.toISOString(),
  });
  await Walk.update(
    {
      state: "sealed",
      sealedAt: now,
      sealAlg: alg,
      sealSignature: signature,
      sealDeviceId: sender.device,
      receipt: canonicalText(receipt),
    },
    { where: { id: stored.id }, transaction },
  );
}

function bytesOf({ entry, text, digest }: Link): { seq: number; digest: Buffer; bytes: Buffer } {
  return { seq: entry.seq, digest: Buffer.from(digest, "hex"), bytes: Buffer.from(text, "utf8") };
}
