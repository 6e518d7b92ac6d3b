import { bytesDigest } from "../domain/digest";
import { photoAnswerShape, type PhotoPut } from "../domain/photo";
import { call, type Answer, type Fetch } from "./api";
import type { KeptPhoto, PhotoShelf } from "./photo-shelf";
import type { KeptWalk } from "./walk-shelf";

/** A weak signal takes its time over a photograph. */
const PATIENCE_MS = 120_000;

/**
 * The photographs that may go: those of closed walks that the server stores whole, or as far as it will; until then the
 * walk has the signal to itself. The entry that names a photograph has to be among what is stored.
 */
export function deliverable(photos: readonly KeptPhoto[], walks: readonly KeptWalk[]): KeptPhoto[] {
  const over = walks.filter(
    ({ seal, acknowledged, length, refused }) =>
      seal !== null && (acknowledged === length || refused !== null),
  );
  const stored = new Map(over.map(({ id, acknowledged }) => [id, acknowledged]));
  return photos.filter(({ walk, seq, state }) => state === "kept" && seq < (stored.get(walk) ?? 0));
}

/** How many photographs are in each state. */
export function photoCounts(photos: readonly KeptPhoto[]): Record<KeptPhoto["state"], number> {
  const counts = { kept: 0, sent: 0, lost: 0 };
  for (const { state } of photos) counts[state] += 1;
  return counts;
}

/**
 * Sends one photograph, unless the server has it, and notes what came of it. Only the server's word that it has the
 * bytes makes it sent, so an answer that was lost costs a question and nothing else.
 */
export async function deliver(
  shelf: PhotoShelf,
  photo: KeptPhoto,
  fetch: Fetch = globalThis.fetch.bind(globalThis),
): Promise<Answer<unknown>> {
  const bytes = await shelf.bytes(photo.sha256);
  if (!bytes || bytesDigest(new Uint8Array(bytes)) !== photo.sha256) {
    await shelf.setState(photo, "lost");
    return { kind: "answered", value: null };
  }
  const answer = await sendPhoto(photo.sha256, bytes, fetch);
  if (answer.kind !== "answered") return answer;
  await shelf.setState(photo, "sent");
  return answer;
}

/** Sends a photograph's bytes, unless the server has them. Answered means that it says so. */
export async function sendPhoto(
  sha256: string,
  bytes: ArrayBuffer,
  fetch: Fetch = globalThis.fetch.bind(globalThis),
): Promise<Answer<unknown>> {
  const ask = () => call(photoAnswerShape, "POST", `/api/photos/${sha256}`, undefined, fetch);
  let answer = await ask();
  if (answer.kind === "answered" && "put" in answer.value) {
    if (!(await put(answer.value.put, bytes, fetch))) return { kind: "unreached" };
    answer = await ask();
  }
  return answer.kind === "answered" && "put" in answer.value ? { kind: "unreached" } : answer;
}

async function put({ url, method, headers }: PhotoPut, body: ArrayBuffer, fetch: Fetch): Promise<boolean> {
  try {
    const signal = AbortSignal.timeout(PATIENCE_MS);
    const answer = await fetch(url, {
      method,
      headers,
      body,
      credentials: "same-origin",
      redirect: "error",
      cache: "no-store",
      signal,
    });
    return answer.ok;
  } catch {
    return false;
  }
}
