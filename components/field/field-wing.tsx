"use client";

import { useEffect } from "react";
import { PromptScreen } from "@/components/lamps/prompt-screen";
import { addressOf, LAMPS, useSearch } from "./address";
import { letGo, theField, useSyncView } from "./browser-field";
import { registerWorker } from "./register-worker";
import { followTaps } from "./settling";
import { RigsScreen } from "./rigs-screen";
import { PaperScreen } from "./paper-screen";
import { WalkScreen } from "./walk-screen";

/** The field wing: everything that works with no network, on one static page. */
export function FieldWing() {
  const sync = useSyncView();
  const { walk, at, paper, prompt } = addressOf(useSearch());

  useEffect(() => {
    void registerWorker();
    return theField().start();
  }, []);
  useEffect(() => followTaps(), []);
  useEffect(() => letGo(walk), [walk]);

  if (walk) return <WalkScreen key={walk} sync={sync} walk={walk} at={at} />;
  if (paper) return <PaperScreen sync={sync} rig={paper} />;
  if (prompt === LAMPS) return <PromptScreen />;
  return <RigsScreen sync={sync} />;
}
