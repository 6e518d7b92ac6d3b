import { ENVELOPE, envelopeAnswerShape, type EnvelopeAnswer, type RefusalCode } from "../domain/field";
import type { Link } from "../domain/entry";
import { receiptHolds } from "../domain/receipt";
import type { PublicKey } from "../domain/signature";
import { call, type Answer, type Fetch } from "./api";
import type { KeptWalk, WalkShelf } from "./walk-shelf";

/** Room for the envelope's own words beside the entries. */
const MOST_CHARS = ENVELOPE.bytes - 64 * 1024;

/** Refusals that say where the two sides stand rather than that the walk cannot be taken. */
const PASSING: ReadonlySet<RefusalCode> = new Set(["foreign-device", "gap", "incomplete"]);

/** A walk has something to send while its receipt is missing and nothing is known to stand in its way. */
export function isUnsent(walk: KeptWalk): boolean {
  return (
    walk.refused === null && walk.receipt === null && (walk.acknowledged < walk.length || walk.seal !== null)
  );
}

/**
 * Sends what one envelope holds of a device's unsent walks, oldest first, and takes in the answer. Sending again what
 * the server has is harmless, so an answer that was lost costs only the repeat.
 * @param keys the pinned server keys; without them no receipt is believed
 * @returns the answer, or null when there was nothing to send
 */
export async function drainOnce(
  shelf: WalkShelf,
  device: string,
  keys: readonly PublicKey[],
  fetch?: Fetch,
): Promise<Answer<EnvelopeAnswer> | null> {
  const walks = (await shelf.walks()).filter((walk) => walk.device === device && isUnsent(walk)).reverse();
  const parcel = await pack(shelf, device, walks);
  if (!parcel) return null;
  const answer = await call(envelopeAnswerShape, "POST", "/api/field/entries", parcel.body, fetch);
  if (answer.kind === "answered") {
    for (const id of parcel.walks) await takeIn(shelf, id, answer.value, keys);
  }
  return answer;
}

async function pack(shelf: WalkShelf, device: string, walks: KeptWalk[]) {
  const entries: string[] = [];
  const seals: string[] = [];
  const named: string[] = [];
  let chars = 0;
  for (const walk of walks) {
    const links = await shelf.links(walk.id, walk.acknowledged, ENVELOPE.entries - entries.length);
    const fitting = links.filter((link) => (chars += bytesAtMost(link)) < MOST_CHARS);
    entries.push(...fitting.map((link) => link.text));
    named.push(walk.id);
    const whole = walk.acknowledged + fitting.length === walk.length;
    if (walk.seal && whole) seals.push(JSON.stringify(walk.seal));
    if (!whole || entries.length === ENVELOPE.entries || seals.length === ENVELOPE.seals) break;
  }
  if (named.length === 0) return null;
  const body = `{"device":"${device}","entries":[${entries.join()}],"seals":[${seals.join()}]}`;
  return { body, walks: named };
}

/** UTF-8 takes at most three bytes for a UTF-16 unit. */
function bytesAtMost(link: Link): number {
  return link.text.length * 3;
}

async function takeIn(
  shelf: WalkShelf,
  id: string,
  answer: EnvelopeAnswer,
  keys: readonly PublicKey[],
): Promise<void> {
  const state = answer.walks[id];
  const refusal = answer.refused.find((row) => row.walk === id);
  const last = state && state.stored > 0 ? (await shelf.links(id, state.stored - 1, 1))[0] : undefined;
  await shelf.amend(id, (walk) => {
    const refused = refusal && !PASSING.has(refusal.code) ? refusal.code : null;
    if (!state) return { refused: refused ?? walk.refused };
    // The server holds another chain under this id, or a longer one: it must not be written over from here.
    if (state.stored > 0 && last?.digest !== state.digest) return { refused: refused ?? "fork" };
    const believed = state.receipt && walk.seal && receiptHolds(state.receipt, walk.seal.seal, keys);
    const whole = believed && state.receipt!.entries === walk.length && state.receipt!.walk === id;
    return { acknowledged: state.stored, refused, receipt: whole ? state.receipt : walk.receipt };
  });
}
