import { useEffect } from "react";
import { keepAwake } from "@/lib/client/wake";

/** Keeps the screen on while active, and never while the page is out of sight. */
export function useWakeLock(active: boolean): void {
  useEffect(() => (active ? keepAwake() : undefined), [active]);
}
