import { get, promisifyRequest, type UseStore } from "idb-keyval";
import { bodyOf, type Link } from "../domain/entry";
import type { PhotoMime } from "../domain/photo";

/** A photograph as taken: what is kept of it, and nothing that could be found out from the file it came in. */
export interface PhotoBytes {
  bytes: ArrayBuffer;
  mime: PhotoMime;
}

/**
 * A photograph that an entry on this phone names. `kept` waits here to be sent, `sent` is with the server too, of a
 * `lost` one the bytes are gone or are not what they were.
 */
export interface KeptPhoto {
  walk: string;
  seq: number;
  check: string | null;
  sha256: string;
  mime: PhotoMime;
  state: "kept" | "sent" | "lost";
}

const rowKey = ({ walk, seq }: Pick<KeptPhoto, "walk" | "seq">) => ["photo-of", walk, seq];
const bytesKey = (sha256: string) => ["photo", sha256];

/**
 * Writes a photograph beside its entry, in the transaction that writes the entry. Its bytes go by their digest, so one
 * that was there already is kept once.
 */
export function keepPhoto(shelf: IDBObjectStore, { entry }: Link, { bytes, mime }: PhotoBytes): void {
  const { check = null, sha256 } = bodyOf(entry, "photo")!;
  const row: KeptPhoto = { walk: entry.walk, seq: entry.seq, check, sha256, mime, state: "kept" };
  shelf.add(row, rowKey(row));
  shelf.put(bytes, bytesKey(sha256));
}

/** Reads the phone's photographs, and notes what became of them. */
export class PhotoShelf {
  constructor(private readonly store: UseStore) {}

  /** Every photograph that a walk on this phone names, without the bytes, oldest first. */
  async all(): Promise<KeptPhoto[]> {
    const range = IDBKeyRange.bound(["photo-of"], ["photo-of", []]);
    // A walk's id begins with the time at which it was opened, so the keys are in order of time.
    return this.store("readonly", (shelf) => promisifyRequest(shelf.getAll(range)));
  }

  /** A photograph's bytes, or null where they are gone. */
  async bytes(sha256: string): Promise<ArrayBuffer | null> {
    return (await get<ArrayBuffer>(bytesKey(sha256), this.store)) ?? null;
  }

  async setState(photo: KeptPhoto, state: KeptPhoto["state"]): Promise<void> {
    await this.store("readwrite", (shelf) => promisifyRequest(shelf.put({ ...photo, state }, rowKey(photo))));
  }
}
