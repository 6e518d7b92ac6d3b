import type { UseStore } from "idb-keyval";
import { openStore } from "@/lib/client/store";

let store: UseStore | null = null;

/** This phone's own store, opened when it is first asked for; never while prerendering. */
export function sheetStore(): UseStore {
  return (store ??= openStore());
}
