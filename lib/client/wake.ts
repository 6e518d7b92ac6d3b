/** What keeping the screen on stands on; a browser's own by default. */
export interface WakeGround {
  page: Pick<Document, "visibilityState" | "addEventListener" | "removeEventListener">;
  lock?: Pick<WakeLock, "request">;
}

/**
 * Keeps the screen on while the page is in sight, until what it returns is called. The browser lets a lock go when
 * the page is out of sight, so it is asked for again on return. Where it is refused (no such thing, a low battery)
 * the walk goes on with a screen that dims; nothing is lost by that.
 */
export function keepAwake(ground: WakeGround = { page: document, lock: navigator.wakeLock }): () => void {
  const { page, lock } = ground;
  let wanted = true;
  let held: WakeLockSentinel | null = null;
  let asking = false;

  const ask = async () => {
    if (!wanted || asking || page.visibilityState !== "visible" || (held && !held.released)) return;
    asking = true;
    try {
      held = (await lock?.request("screen")) ?? null;
    } catch {
      held = null;
    }
    asking = false;
    if (!wanted) void held?.release().catch(() => {});
  };
  const shown = () => void ask();
  page.addEventListener("visibilitychange", shown);
  void ask();
  return () => {
    wanted = false;
    page.removeEventListener("visibilitychange", shown);
    void held?.release().catch(() => {});
  };
}
