import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { recentText } from "@/lib/client/time-words";
import { useNowMs } from "./now";
import type { LastWalk } from "./rig-state";
import { useStoredWalk } from "./stored-walk";
import { VerdictMark } from "./verdict-mark";
import { WalkStrip } from "./walk-strip";

/** What the last walk of a rig came to, and its tape where this phone has it. */
export function LastVerdict({ last }: { last: LastWalk | null }) {
  const nowMs = useNowMs();
  if (!last) return <p className="text-soft">{fieldWords.rigs.never}</p>;
  return (
    <div>
      <p className="flex flex-wrap items-center gap-x-2.5">
        <VerdictMark verdict={last.verdict} />
        <span className={`text-xl font-extrabold ${last.verdict === "hold" ? "text-hold" : ""}`}>
          {fieldWords.verdict[last.verdict]}
        </span>
        <span className="text-soft">{fieldWords.rigs.last(last.purpose, recentText(last.at, nowMs))}</span>
      </p>
      {last.kept && <KeptStrip walk={last.kept} />}
    </div>
  );
}

/** The small strip of a walk on this phone; its place is kept while it is read. */
export function KeptStrip({ walk }: { walk: KeptWalk }) {
  const stored = useStoredWalk(walk);
  return <div className="mt-2 h-4">{stored && <WalkStrip view={stored} size="small" />}</div>;
}
