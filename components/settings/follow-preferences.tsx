"use client";

import { useEffect } from "react";
import { followInstallOffer } from "@/lib/client/install";
import { followPreferences } from "@/lib/client/preference-store";

/** Beside every page: the choices of other tabs and the light show here too, and the offer to install is kept. */
export function FollowPreferences() {
  useEffect(() => followPreferences(), []);
  useEffect(() => followInstallOffer(), []);
  return null;
}
