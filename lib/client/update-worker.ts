import type { Workbox } from "workbox-window";

const CHECK_MS = 60 * 60_000;

/** A new version of the worker: whether one waits, and taking it. */
export class Updates {
  private readonly listeners = new Set<() => void>();
  private waits = false;
  /** Another tab took the new version, and this one kept its page. */
  private behind = false;

  /**
   * @param worker about to be registered
   * @param covered whether a worker covers this page already
   * @param mayReload whether this tab shows nothing that a new page would lose; asked when a new version has taken over
   */
  constructor(
    private readonly worker: Pick<Workbox, "addEventListener" | "messageSkipWaiting" | "update">,
    covered: boolean,
    mayReload: () => boolean,
    private readonly reload: () => void,
  ) {
    let before = covered;
    worker.addEventListener("waiting", () => this.show(true));
    worker.addEventListener("controlling", () => {
      // The very first worker covers the page as it is.
      const updated = before;
      before = true;
      if (!updated) return;
      if (mayReload()) return reload();
      // A tab in a walk keeps its page: all that it needs is in memory by now.
      this.behind = true;
      this.show(true);
    });
  }

  waiting = (): boolean => this.waits;

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** The person wants it now: the waiting worker takes over, and the pages that may reload do. */
  take(): void {
    if (this.behind) this.reload();
    else this.worker.messageSkipWaiting();
  }

  /** An installed app may stay open for weeks: looks for a new version when it is seen again, once an hour at most. */
  followPage(page: Pick<Document, "visibilityState" | "addEventListener">, nowMs: () => number): void {
    let checkedAt = nowMs();
    page.addEventListener("visibilitychange", () => {
      if (page.visibilityState !== "visible" || nowMs() - checkedAt < CHECK_MS) return;
      checkedAt = nowMs();
      // Offline there is nothing to look at.
      void this.worker.update().catch(() => {});
    });
  }

  private show(waits: boolean): void {
    this.waits = waits;
    for (const listener of this.listeners) listener();
  }
}
