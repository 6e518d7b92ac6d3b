import { get, promisifyRequest, type UseStore } from "idb-keyval";
import { compareMarks, readMarks, type Lost, type Marks } from "./store-marks";
import { storeTroubleOf, type StoreTrouble } from "./store-trouble";
import type { Sync } from "./sync";
import { WalkShelf } from "./walk-shelf";

const BIRTH = ["birth"];
const MARKS_KEY = "hookfast-marks";

/** A place outside of the store where a few words can be kept. */
export interface Outside {
  read: () => string | null;
  write: (text: string) => void;
  /** Calls back when another tab has written; returns what ends that. */
  follow: (changed: () => void) => () => void;
}

/** The browser's localStorage, which is cleared less often than a database. Where it is refused nothing is kept. */
export function browserOutside(): Outside {
  return {
    read() {
      try {
        return localStorage.getItem(MARKS_KEY);
      } catch {
        return null;
      }
    },
    write(text) {
      try {
        localStorage.setItem(MARKS_KEY, text);
      } catch {
        // Full or refused: what this page remembers by itself is what is left.
      }
    },
    follow(changed) {
      const heard = (event: StorageEvent) => event.key === MARKS_KEY && changed();
      window.addEventListener("storage", heard);
      return () => window.removeEventListener("storage", heard);
    },
  };
}

/** What is wrong with the phone's store now, and what was lost of it and not yet read about. */
export interface GuardView {
  trouble: StoreTrouble | null;
  lost: Lost | null;
}

/** Watches the phone's store: each failure is told at once, and a store that was emptied is betrayed by its marks. */
export class StoreGuard {
  /** The store, watched; everything reads and writes through it. */
  readonly store: UseStore;
  private readonly shelf: WalkShelf;
  private readonly listeners = new Set<() => void>();
  private current: GuardView = { trouble: null, lost: null };
  /** The marks as this page knows them, for when what is outside was cleared as well. */
  private remembered: Marks | null = null;
  private checking: Promise<void> | null = null;
  private again = false;

  constructor(
    store: UseStore,
    private readonly outside: Outside,
  ) {
    this.store = async (mode, work) => {
      try {
        const result = await store(mode, work);
        this.worked(mode);
        return result;
      } catch (error) {
        this.failed(error);
        throw error;
      }
    };
    this.shelf = new WalkShelf(this.store);
  }

  view = (): GuardView => this.current;

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Checks now and whenever the walks were read anew; what it returns ends that. */
  follow(sync: Pick<Sync, "view" | "subscribe">): () => void {
    let { walks } = sync.view();
    const unfollow = this.outside.follow(() => this.show({ lost: this.marks()?.lost ?? null }));
    const unsubscribe = sync.subscribe(() => {
      if (sync.view().walks === walks) return;
      ({ walks } = sync.view());
      void this.check();
    });
    void this.check();
    return () => {
      unfollow();
      unsubscribe();
    };
  }

  /** Holds the store against its marks. One check at a time; one that is asked for meanwhile follows. */
  check(): Promise<void> {
    if (this.checking) this.again = true;
    this.checking ??= this.run().finally(() => {
      this.checking = null;
      if (this.again) {
        this.again = false;
        return this.check();
      }
    });
    return this.checking;
  }

  /** Someone has read what was lost. */
  dismiss(): void {
    const marks = this.marks();
    if (marks) this.keep({ ...marks, lost: undefined });
  }

  private async run(): Promise<void> {
    // First the marks, then the store: another tab may save between the two, and the store must not seem behind.
    const marks = this.marks();
    try {
      const birth = await this.birth();
      this.keep(compareMarks(marks, birth, await this.shelf.walks()));
    } catch {
      // The store would not answer, which `failed` has heard of.
    }
  }

  private marks(): Marks | null {
    return readMarks(this.outside.read()) ?? this.remembered;
  }

  private keep(marks: Marks): void {
    this.remembered = marks;
    this.outside.write(JSON.stringify(marks));
    this.show({ lost: marks.lost ?? null });
  }

  /** The store's own id; made where there is none, the first of two tabs deciding. */
  private async birth(): Promise<string> {
    const known = await get<string>(BIRTH, this.store);
    if (known !== undefined) return known;
    return this.store("readwrite", async (shelf) => {
      const first: string | undefined = await promisifyRequest(shelf.get(BIRTH));
      const birth = first ?? crypto.randomUUID();
      if (first === undefined) await promisifyRequest(shelf.add(birth, BIRTH));
      return birth;
    });
  }

  private worked(mode: IDBTransactionMode): void {
    // A full store can still be read.
    if (this.current.trouble === "full" && mode === "readonly") return;
    if (this.current.trouble) this.show({ trouble: null });
  }

  private failed(error: unknown): void {
    const trouble = storeTroubleOf(error);
    // What is gone is found by the marks, and stays told after the next write has worked.
    if (trouble === "vanished") void this.check();
    else if (trouble) this.show({ trouble });
  }

  private show(change: Partial<GuardView>): void {
    const next = { ...this.current, ...change };
    if (
      next.trouble === this.current.trouble &&
      JSON.stringify(next.lost) === JSON.stringify(this.current.lost)
    )
      return;
    this.current = next;
    for (const listener of this.listeners) listener();
  }
}
