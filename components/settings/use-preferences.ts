import { useSyncExternalStore } from "react";
import { preferences, subscribePreferences } from "@/lib/client/preference-store";
import { defaultPreferences, type Preferences } from "@/lib/client/preferences";

/** What this browser's person has chosen; the defaults while a page is prerendered. */
export function usePreferences(): Preferences {
  return useSyncExternalStore(subscribePreferences, preferences, () => defaultPreferences);
}
