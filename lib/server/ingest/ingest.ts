import type { Envelope, EnvelopeAnswer, WalkState } from "@/lib/domain/field";
import type { Member } from "@/lib/domain/member";
import type { Receipt } from "@/lib/domain/receipt";
import { deviceKey } from "../devices";
import { maySeeWalk } from "../walk-visibility";
import { batchesOf } from "./batch";
import type { StoredWalk } from "./stored-walk";
import { takeWalk } from "./take-walk";

/**
 * Takes an envelope of entries and seals from a member's device, walk by walk. Sending the same again is harmless:
 * what is stored stays stored, and the answer says where each walk stands.
 * @param envelope of the envelope's shape, its elements exactly as received: digests are taken of them
 * @param now when the envelope came
 */
export async function ingest(
  member: Member,
  envelope: Envelope,
  now: Date = new Date(),
): Promise<EnvelopeAnswer> {
  const device = envelope.device.toLowerCase();
  const sender = { member, device, key: await deviceKey(device, member.id) };
  const walks = new Map<string, WalkState>();
  const refused: EnvelopeAnswer["refused"] = [];
  for (const batch of batchesOf(envelope)) {
    const taken = await takeWalk(sender, batch, now);
    if (taken.refused) refused.push(taken.refused);
    if (!taken.stored || (await maySeeWalk(member, taken.stored)))
      walks.set(batch.walk, stateOf(taken.stored));
  }
  return { walks: Object.fromEntries(walks), refused };
}

function stateOf(stored: StoredWalk | null): WalkState {
  if (!stored) return { stored: 0, digest: null, state: "open", verdict: "unfinished", receipt: null };
  return {
    stored: stored.entries,
    digest: stored.head.toString("hex"),
    state: stored.state,
    verdict: stored.verdict,
    receipt: stored.receipt === null ? null : (JSON.parse(stored.receipt) as Receipt),
  };
}
