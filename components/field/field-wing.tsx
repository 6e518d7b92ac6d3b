"use client";

import { useEffect } from "react";
import { SettingsScreen } from "@/components/settings/settings-screen";
import { StoreNotices } from "@/components/settings/store-notices";
import { addressOf, useSearch } from "./address";
import { letGo, theField, useSyncView } from "./browser-field";
import { registerWorker } from "./register-worker";
import { followTaps } from "./settling";
import { RigsScreen } from "./rigs-screen";
import { WalkScreen } from "./walk-screen";

/** The field wing: everything that works with no network, on one static page. */
export function FieldWing() {
  const sync = useSyncView();
  const { walk, at, settings } = addressOf(useSearch());

  useEffect(() => {
    void registerWorker();
    return theField().start();
  }, []);
  useEffect(() => followTaps(), []);
  useEffect(() => letGo(walk), [walk]);

  return (
    <>
      <StoreNotices told={walk !== null || (sync.storeRefused && !settings)} />
      {walk && <WalkScreen key={walk} sync={sync} walk={walk} at={at} />}
      {!walk && (settings ? <SettingsScreen sync={sync} /> : <RigsScreen sync={sync} />)}
    </>
  );
}
