import { del, get, promisifyRequest, set, type UseStore } from "idb-keyval";
import type { Draft } from "../domain/sheet/draft";
import type { Sheet } from "../domain/sheet/sheet";

/** A sheet that was begun on this phone and not saved yet. */
export interface KeptDraft {
  rig: string;
  /** Digest and sheet of the revision that it was begun over; both null for a new rig or a list without a sheet. */
  base: string | null;
  baseSheet: Sheet | null;
  draft: Draft;
  /** Whose it is; null where nobody was known to be signed in. */
  member: string | null;
  /** When it was last written, RFC 3339. */
  at: string;
}

const key = (rig: string) => ["draft", rig];

/** The draft of a rig on this phone, or null. */
export async function keptDraft(store: UseStore, rig: string): Promise<KeptDraft | null> {
  return (await get<KeptDraft>(key(rig), store)) ?? null;
}

/** Every draft on this phone, the latest first. */
export async function keptDrafts(store: UseStore): Promise<KeptDraft[]> {
  const range = IDBKeyRange.bound(["draft"], ["draft", []]);
  const all: KeptDraft[] = await store("readonly", (shelf) => promisifyRequest(shelf.getAll(range)));
  return all.sort((one, other) => other.at.localeCompare(one.at));
}

/** Lets go of a draft: it was saved, or thrown away. */
export async function dropDraft(store: UseStore, rig: string): Promise<void> {
  await del(key(rig), store);
}

/** How far keeping is: `at` the last write that is on the disk. */
export interface KeepingState {
  state: "idle" | "waiting" | "kept" | "failed";
  at: string | null;
}

const PAUSE_MS = 300;

/** Writes a draft to this phone as it changes: a moment after the last change, at once when asked, one at a time. */
export class DraftKeeper {
  private current: KeepingState = { state: "idle", at: null };
  private readonly listeners = new Set<() => void>();
  private timer: ReturnType<typeof setTimeout> | null = null;
  private pending: (() => KeptDraft) | null = null;
  private writing: Promise<void> = Promise.resolve();

  constructor(
    private readonly store: UseStore,
    private readonly pauseMs = PAUSE_MS,
  ) {}

  view = (): KeepingState => this.current;

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Something changed; what is to be written is asked for when it is written. */
  changed(read: () => KeptDraft): void {
    this.pending = read;
    if (this.timer) clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.flush(), this.pauseMs);
    if (this.current.state !== "failed") this.show({ ...this.current, state: "waiting" });
  }

  /** Writes what waits. Resolves when it is on the disk, or could not be put there, which the state says. */
  flush(): Promise<void> {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
    const read = this.pending;
    this.pending = null;
    if (read) this.writing = this.writing.then(() => this.write(read()));
    return this.writing;
  }

  /** Forgets what waits: the draft is gone for good. */
  stop(): void {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
    this.pending = null;
  }

  private async write(draft: KeptDraft): Promise<void> {
    try {
      await set(key(draft.rig), draft, this.store);
      this.show({ state: this.pending ? "waiting" : "kept", at: draft.at });
    } catch {
      this.show({ ...this.current, state: "failed" });
    }
  }

  private show(next: KeepingState): void {
    this.current = next;
    for (const listener of this.listeners) listener();
  }
}
