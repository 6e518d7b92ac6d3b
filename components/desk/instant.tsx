"use client";

import { useState } from "react";
import { fullMomentText, momentText } from "@/lib/client/time-words";

/** A moment in the reader's time zone; the whole of it for whoever asks. Never in a prerendered document. */
export function Instant({ at }: { at: string }) {
  const [now] = useState(() => new Date());
  return (
    <time dateTime={at} title={fullMomentText(at)} className="tabular text-[0.9375em]">
      {momentText(at, now)}
    </time>
  );
}
