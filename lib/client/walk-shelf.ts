import { get, promisifyRequest, type UseStore } from "idb-keyval";
import type { Depth, Entry, Link, Purpose, Verdict } from "../domain/entry";
import type { RefusalCode, Seal } from "../domain/field";
import type { Receipt } from "../domain/receipt";
import type { RevisionDocument } from "../domain/revision";

/** A walk as the phone keeps it, beside its entries. */
export interface KeptWalk {
  id: string;
  rig: string;
  rigName: string;
  revision: string;
  purpose: Purpose;
  depth: Depth;
  member: string;
  device: string;
  /** Entered from a card that was filled in by hand; untimed. */
  source?: "paper";
  openedAt: string;
  /** How many entries there are here, and the digest of the last. */
  length: number;
  head: string;
  /** How many of them the server has said it stores. */
  acknowledged: number;
  /** Set when the walk is closed; final. */
  seal: Seal | null;
  verdict: Verdict | null;
  /** When someone said that the rig was left, or its car entered, after this walk. */
  leftAt?: string;
  /** Set when a receipt was verified against a pinned server key. */
  receipt: Receipt | null;
  /** Why the server would not take it, if it said so. */
  refused: RefusalCode | null;
}

/** Writes to the shelf within the transaction that writes the link. */
export type Beside = (shelf: IDBObjectStore, link: Link) => void;

/** Someone else wrote to this walk since it was read: another tab holds it. */
export class MovedOn extends Error {
  override name = "MovedOn";
}

/** The walk is not on this phone any more: the store was emptied under this page. */
export class WalkGone extends MovedOn {
  override name = "WalkGone";
}

const walkKey = (id: string) => ["walk", id];
const entryKey = (id: string, seq: number) => ["entry", id, seq];
const revisionKey = (digest: string) => ["revision", digest];
/** Arrays sort after every number and string, so this bound takes in all that begins with the prefix. */
const under = (...prefix: string[]) => IDBKeyRange.bound(prefix, [...prefix, []]);

/** Reads and writes of walks on the phone, each one strict transaction. */
export class WalkShelf {
  constructor(readonly store: UseStore) {}

  /** Begins a walk: its row, its `open` entry and the revision it is made against, all or nothing. */
  async begin(walk: KeptWalk, open: Link, document: RevisionDocument): Promise<void> {
    await this.store("readwrite", async (shelf) => {
      shelf.put(document, revisionKey(walk.revision));
      shelf.add(walk, walkKey(walk.id));
      await promisifyRequest(shelf.add(kept(open), entryKey(walk.id, 0)));
    });
  }

  /**
   * Appends one link. The head is read again inside the transaction and entries are only ever added.
   * @param change what else changes on the walk's row with it
   * @param beside writes what belongs to the link, all or nothing with it
   * @throws MovedOn when the walk no longer ends where the link begins, WalkGone when it is not there
   */
  async append(link: Link, change: Partial<KeptWalk> = {}, beside?: Beside): Promise<KeptWalk> {
    const { walk: id, seq, prev } = link.entry;
    return this.store("readwrite", async (shelf) => {
      const walk: KeptWalk | undefined = await promisifyRequest(shelf.get(walkKey(id)));
      if (!walk) throw new WalkGone();
      if (walk.length !== seq || walk.head !== prev) throw new MovedOn();
      const after = { ...walk, ...change, length: seq + 1, head: link.digest };
      shelf.add(kept(link), entryKey(id, seq));
      beside?.(shelf, link);
      await promisifyRequest(shelf.put(after, walkKey(id)));
      return after;
    });
  }

  /** Changes a walk's row from what it is now; the entries are never touched. */
  async amend(id: string, change: (walk: KeptWalk) => Partial<KeptWalk>): Promise<KeptWalk | null> {
    return this.store("readwrite", async (shelf) => {
      const walk: KeptWalk | undefined = await promisifyRequest(shelf.get(walkKey(id)));
      if (!walk) return null;
      const after = { ...walk, ...change(walk) };
      await promisifyRequest(shelf.put(after, walkKey(id)));
      return after;
    });
  }

  /** Every walk on this phone, newest first. */
  async walks(): Promise<KeptWalk[]> {
    const all: KeptWalk[] = await this.store("readonly", (shelf) =>
      promisifyRequest(shelf.getAll(under("walk"))),
    );
    return all.sort((a, b) => (a.openedAt < b.openedAt ? 1 : -1));
  }

  async walk(id: string): Promise<KeptWalk | null> {
    return (await get<KeptWalk>(walkKey(id), this.store)) ?? null;
  }

  /**
   * A walk's entries in order.
   * @param from the first sequence number wanted
   * @param most how many at the most
   */
  async links(id: string, from = 0, most = Number.MAX_SAFE_INTEGER): Promise<Link[]> {
    const range = IDBKeyRange.bound(entryKey(id, from), ["entry", id, []]);
    const rows: KeptLink[] = await this.store("readonly", (shelf) =>
      promisifyRequest(shelf.getAll(range, Math.min(most, 2 ** 32 - 1))),
    );
    return rows.map((row) => ({ ...row, entry: JSON.parse(row.text) as Entry }));
  }

  async document(revision: string): Promise<RevisionDocument | null> {
    return (await get<RevisionDocument>(revisionKey(revision), this.store)) ?? null;
  }
}

type KeptLink = Pick<Link, "text" | "digest">;

function kept({ text, digest }: Link): KeptLink {
  return { text, digest };
}
