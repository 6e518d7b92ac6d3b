import type { Transaction } from "sequelize";
import type { Refusal } from "@/lib/domain/field";
import { inTransaction } from "../transaction";
import type { WalkBatch } from "./batch";
import { foundGround } from "./ground";
import { judgeEntries } from "./judge-entries";
import { judgeSeals } from "./judge-seals";
import type { Sender } from "./sender";
import { appendEntries, keepFork, sealWalk } from "./store-walk";
import { lockWalk, storedDigests, type StoredWalk } from "./stored-walk";

/** Where a walk stands after its batch, and the one thing that was not taken. */
export interface Taken {
  stored: StoredWalk | null;
  refused: Refusal | null;
}

/**
 * Takes what came for one walk, in one transaction: everything up to the first entry or seal that is refused is
 * stored, the rest is not.
 */
export async function takeWalk(sender: Sender, batch: WalkBatch, now: Date): Promise<Taken> {
  return inTransaction((transaction) => takeLocked(sender, batch, now, transaction));
}

async function takeLocked(
  sender: Sender,
  batch: WalkBatch,
  now: Date,
  transaction: Transaction,
): Promise<Taken> {
  const { walk } = batch;
  const pen = { sender, now, transaction };
  const stored = await lockWalk(walk, transaction);
  const before = stored?.entries ?? 0;
  const again = batch.entries.map(({ seq }) => seq).filter((seq) => seq < before);
  const judged = await judgeEntries(
    sender,
    {
      stored,
      digests: await storedDigests(walk, again, transaction),
      findGround: (open) => foundGround(sender, open, stored, transaction),
    },
    batch,
  );
  if (judged.links.length > 0) await appendEntries(pen, stored, judged.ground!, judged.links);
  if (judged.fork) await keepFork(pen, judged.fork);
  if (judged.refused) return taken(walk, judged.refused, transaction);

  const { seal, refused } = judgeSeals(sender, stored, judged.head, batch.seals);
  if (seal) await sealWalk(pen, (await lockWalk(walk, transaction))!, seal);
  return taken(walk, refused && { seq: null, ...refused }, transaction);
}

async function taken(
  walk: string,
  refused: Omit<Refusal, "walk"> | null,
  transaction: Transaction,
): Promise<Taken> {
  return { stored: await lockWalk(walk, transaction), refused: refused && { walk, ...refused } };
}
