"use client";

import { QueryClientProvider } from "@tanstack/react-query";
import { useEffect, useState, type ReactNode } from "react";
import { deskClient } from "@/lib/client/desk-queries";
import { reloadWhenRestored, signInPath } from "@/lib/client/session";
import { DeskFrame } from "./desk-frame";

/** The desk around its pages: one cache for all of them, and the way to the sign-in page when a session has ended. */
export function DeskRoom({ children }: { children: ReactNode }) {
  const [client] = useState(() => deskClient(() => window.location.replace(signInPath(window.location))));
  useEffect(reloadWhenRestored, []);
  return (
    <QueryClientProvider client={client}>
      <DeskFrame>{children}</DeskFrame>
    </QueryClientProvider>
  );
}
