"use client";

import { useEffect } from "react";
import { PromptScreen } from "@/components/lamps/prompt-screen";
import { SettingsScreen } from "@/components/settings/settings-screen";
import { StoreNotices } from "@/components/settings/store-notices";
import { NewRig } from "@/components/starter/new-rig";
import type { SyncView } from "@/lib/client/sync";
import { addressOf, LAMPS, NEW_RIG, useSearch, type Address } from "./address";
import { letGo, theField, useSyncView } from "./browser-field";
import { registerWorker } from "./register-worker";
import { followTaps } from "./settling";
import { RigsScreen } from "./rigs-screen";
import { PaperScreen } from "./paper-screen";
import { WalkScreen } from "./walk-screen";

/** The field wing: everything that works with no network, on one static page. */
export function FieldWing() {
  const sync = useSyncView();
  const address = addressOf(useSearch());
  const { walk, settings } = address;

  useEffect(() => {
    void registerWorker();
    return theField().start();
  }, []);
  useEffect(() => followTaps(), []);
  useEffect(() => letGo(walk), [walk]);

  return (
    <>
      <StoreNotices told={walk !== null || (sync.storeRefused && !settings)} />
      <Screen sync={sync} address={address} />
    </>
  );
}

/** The one screen that an address says. */
function Screen({ sync, address }: { sync: SyncView; address: Address }) {
  const { walk, at, paper, prompt, settings } = address;
  if (walk) return <WalkScreen key={walk} sync={sync} walk={walk} at={at} />;
  if (paper) return <PaperScreen sync={sync} rig={paper} />;
  if (prompt === LAMPS) return <PromptScreen />;
  if (settings) return <SettingsScreen sync={sync} />;
  if (at === NEW_RIG) return <NewRig />;
  return <RigsScreen sync={sync} />;
}
