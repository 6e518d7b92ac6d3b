import type { ReactNode } from "react";
import { clockText } from "@/lib/client/time-words";
import { bodyOf } from "@/lib/domain/entry";
import type { WalkReading } from "@/lib/domain/history";
import { walkWords } from "@/lib/domain/messages/desk";
import { depthWords } from "@/lib/domain/messages/walk";
import { Instant } from "./instant";

/** Who, when and how long, ruled off in boxes as the title block of a drawing is. */
export function TitleBlock({ reading }: { reading: WalkReading }) {
  const { walk, names, depth, elapsedMs, entries } = reading;
  const paper = entries[0] && bodyOf(entries[0].entry, "open")?.source === "paper";
  return (
    <dl className="grid border-t-hair border-l-hair border-ink text-base @2xs:grid-cols-2 @xl:flex @xl:flex-wrap">
      <Box label={walkWords.by} wide>
        {names.member}
      </Box>
      <Box label={walkWords.opened}>
        <Instant at={walk.openedAt} />
      </Box>
      <Box label={walkWords.received}>
        <Instant at={walk.receivedAt} />
      </Box>
      <Box label={walkWords.time}>
        <span className="tabular text-[0.9375em]">{paper ? walkWords.untimed : clockText(elapsedMs)}</span>
      </Box>
      <Box label={walkWords.depth}>
        {paper ? `${depthWords[depth]}, ${walkWords.paper}` : depthWords[depth]}
      </Box>
    </dl>
  );
}

function Box({ label, wide, children }: { label: string; wide?: boolean; children: ReactNode }) {
  return (
    <div
      className={`min-w-0 flex-auto border-r-hair border-b-hair border-ink px-3 pt-1 pb-1.5 @xl:min-w-32 ${wide ? "@2xs:@max-xl:col-span-2" : ""}`}
    >
      <dt className="text-sm text-soft">{label}</dt>
      <dd className="font-semibold">{children}</dd>
    </div>
  );
}
