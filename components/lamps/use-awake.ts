import { useEffect } from "react";

/** Keeps the screen on while something runs on it that nobody touches; where the browser cannot, nothing is said. */
export function useAwake(running: boolean): void {
  useEffect(() => {
    if (!running || !("wakeLock" in navigator)) return;
    let lock: WakeLockSentinel | undefined;
    let over = false;
    const hold = async () => {
      if (document.visibilityState !== "visible") return;
      const held = await navigator.wakeLock.request("screen").catch(() => undefined);
      if (over) return void held?.release();
      lock = held;
    };
    void hold();
    // The browser lets go whenever the page is out of sight.
    document.addEventListener("visibilitychange", hold);
    return () => {
      over = true;
      document.removeEventListener("visibilitychange", hold);
      void lock?.release();
    };
  }, [running]);
}
