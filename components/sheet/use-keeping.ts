import { useEffect, useState, useSyncExternalStore } from "react";
import { DraftKeeper, type KeepingState } from "@/lib/client/sheet-draft";
import { sheetStore } from "./browser-sheet";

/** Keeps a draft on this phone, and writes what waits before the page is left or hidden. */
export function useKeeper(): { keeper: DraftKeeper; keeping: KeepingState } {
  const [keeper] = useState(() => new DraftKeeper((mode, work) => sheetStore()(mode, work)));
  useEffect(() => {
    const flush = () => void keeper.flush();
    const hidden = () => document.visibilityState === "hidden" && flush();
    window.addEventListener("pagehide", flush);
    document.addEventListener("visibilitychange", hidden);
    return () => {
      window.removeEventListener("pagehide", flush);
      document.removeEventListener("visibilitychange", hidden);
      flush();
    };
  }, [keeper]);
  return { keeper, keeping: useSyncExternalStore(keeper.subscribe, keeper.view, keeper.view) };
}
