import type { Head } from "@/lib/domain/chain";
import { sealShape, type Seal } from "@/lib/domain/field";
import { findJsonFault, pointerStep, type JsonFault } from "@/lib/domain/json";
import { refusalDetails as details, type RefusalReason } from "@/lib/domain/messages/refusals";
import { sealMessage, verifies } from "@/lib/domain/signature";
import type { Sender } from "./sender";
import type { StoredWalk } from "./stored-walk";

/** The seal to store, if the walk is not sealed yet, and the first seal that is refused. */
export interface JudgedSeals {
  seal: Seal | null;
  refused: RefusalReason | null;
}

/**
 * Judges the seals that came for one walk, in order; the first that is refused ends it. A seal may come from any of
 * the member's devices: a phone that lost its key seals by a new one. One that seals the sealed walk again is welcome.
 * @param head the walk's head with everything stored that came with the seals
 */
export function judgeSeals(
  sender: Sender,
  stored: StoredWalk | null,
  head: Head,
  seals: readonly unknown[],
): JudgedSeals {
  const judged: JudgedSeals = { seal: null, refused: null };
  for (const raw of seals) {
    const seal = readSeal(raw);
    if (seal.read === null) return { ...judged, refused: seal.refused };
    const refused = sealReason(sender, stored, head, seal.read);
    if (refused) return { ...judged, refused };
    if (!head.sealed) judged.seal ??= seal.read;
  }
  return judged;
}

function readSeal(raw: unknown): { read: Seal } | { read: null; refused: RefusalReason } {
  const invalid = (fault: JsonFault) =>
    ({ read: null, refused: { code: "invalid", detail: details.fault(fault) } }) as const;
  const fault = findJsonFault(raw);
  if (fault) return invalid(fault);
  const parsed = sealShape.safeParse(raw);
  if (parsed.success) return { read: parsed.data };
  const { path, message } = parsed.error.issues[0]!;
  return invalid({ pointer: path.map((step) => pointerStep(String(step))).join(""), detail: message });
}

function sealReason(
  { member, key }: Sender,
  stored: StoredWalk | null,
  head: Head,
  { seal, alg, signature }: Seal,
): RefusalReason | null {
  if (!key) return { code: "foreign-device", detail: details.unregistered };
  if (stored && stored.memberId !== member.id) return { code: "not-yours", detail: details["not-yours"] };
  if (head.digest === null) return { code: "incomplete", detail: details["nothing-stored"] };
  if (!head.closed) return { code: "incomplete", detail: details["not-closed"] };
  if (seal !== head.digest) return { code: "incomplete", detail: details["not-the-head"](head.digest) };
  if (verifies(key, alg, sealMessage(seal), signature)) return null;
  return { code: "bad-signature", detail: details["bad-signature"] };
}
