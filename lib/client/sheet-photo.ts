import { del, get, promisifyRequest, set, type UseStore } from "idb-keyval";
import { bytesDigest } from "../domain/digest";
import type { SheetPhoto } from "../domain/sheet/field";
import type { Fetch } from "./api";
import { sendPhoto } from "./photo-delivery";
import type { PhotoBytes } from "./photo-shelf";

// The bytes lie where those of the walks lie, by their digest; the row says that they wait for a sheet to be saved.
const bytesKey = (sha256: string) => ["photo", sha256];
const waitingKey = (sha256: string) => ["sheet-photo", sha256];

/** Keeps a photograph for a sheet on this phone, until the server has it. */
export async function keepSheetPhoto(store: UseStore, { bytes, mime }: PhotoBytes): Promise<SheetPhoto> {
  const sha256 = bytesDigest(new Uint8Array(bytes));
  await store("readwrite", async (shelf) => {
    shelf.put(bytes, bytesKey(sha256));
    await promisifyRequest(shelf.put(false, waitingKey(sha256)));
  });
  return { sha256, bytes: bytes.byteLength, mime };
}

/** A photograph's bytes, or null where they are not on this phone. */
export async function sheetPhotoBytes(store: UseStore, sha256: string): Promise<ArrayBuffer | null> {
  return (await get<ArrayBuffer>(bytesKey(sha256), store)) ?? null;
}

/** Notes that the sheet which names a photograph was saved, so that the server takes it from now on. */
export async function sheetPhotoSaved(store: UseStore, sha256: string): Promise<void> {
  if ((await get(waitingKey(sha256), store)) !== undefined) await set(waitingKey(sha256), true, store);
}

/** Sends the photographs whose sheets are saved; what cannot go now goes the next time. */
export async function sendSheetPhotos(store: UseStore, fetch?: Fetch): Promise<void> {
  const range = IDBKeyRange.bound(["sheet-photo"], ["sheet-photo", []]);
  const [keys, saved] = await store("readonly", async (shelf) => {
    const keys = promisifyRequest(shelf.getAllKeys(range));
    return [await keys, await promisifyRequest<unknown[]>(shelf.getAll(range))] as const;
  });
  for (const [at, key] of keys.entries()) {
    if (saved[at] !== true) continue;
    const sha256 = (key as [string, string])[1];
    const bytes = await sheetPhotoBytes(store, sha256);
    const answer = bytes && (await sendPhoto(sha256, bytes, fetch));
    // The bytes stay: without network the form shows the page from here.
    if (!bytes || answer?.kind === "answered") await del(key, store);
  }
}
