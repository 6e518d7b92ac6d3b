import type { ReactNode } from "react";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { recentText } from "@/lib/client/time-words";
import { useNowMs } from "./now";

type WalkHeadProps = {
  walk: KeptWalk;
  /** The running time, or the time the walk took. */
  figure: ReactNode;
  /** Stands beside the name of the walk. */
  control?: ReactNode;
};

/** The top of every screen of a walk: which rig and walk, how long, and where the record is now. */
export function WalkHead({ walk, figure, control }: WalkHeadProps) {
  const nowMs = useNowMs();
  return (
    <header className="flex flex-wrap items-end justify-end gap-x-3 gap-y-1 px-4 pt-3 pb-2.5">
      <div className="min-w-[9rem] flex-1">
        <p className="truncate text-[0.9375rem] text-soft">{walk.rigName}</p>
        <div className="flex items-center justify-between">
          <h1 className="text-[1.375rem] leading-[1.1] font-extrabold">{fieldWords.purpose[walk.purpose]}</h1>
          {control}
        </div>
      </div>
      <div className="text-right">
        {walk.source === "paper" ? (
          <p className="leading-none font-semibold">{walkingWords.paper.untimed}</p>
        ) : (
          <p className="tabular text-[1.625rem] leading-none font-semibold">{figure}</p>
        )}
        <p role="status" className="text-sm text-soft">
          {stateWords(walk, nowMs)}
        </p>
      </div>
    </header>
  );
}

function stateWords({ receipt }: KeptWalk, nowMs: number): string {
  return receipt ? fieldWords.kept.receivedAt(recentText(receipt.receivedAt, nowMs)) : fieldWords.kept.saved;
}
