import { Button } from "@/components/ui/button";
import { recentText } from "@/lib/client/time-words";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { walkingWords } from "@/lib/domain/messages/walking";
import { canGoStale, stalenessOf } from "@/lib/domain/standing";
import { theField } from "./browser-field";
import { useNowMs } from "./now";
import type { LastWalk } from "./rig-state";
import { useTaking } from "./taking";

const words = walkingWords.stale;

/** Whether the last verdict still stands, and the way to say that it does not: the rig was left, or the car entered. */
export function Stale({ last, kept }: { last: LastWalk | null; kept: KeptWalk | null }) {
  const nowMs = useNowMs();
  const { take } = useTaking();
  if (!last || !canGoStale(last)) return null;
  const stale = stalenessOf(last, kept?.leftAt ?? null, nowMs);
  if (stale) {
    return (
      <div className="unlit border-y-[3px] border-ink px-4 py-3">
        <p className="w-fit bg-paper px-1 font-extrabold">
          {stale === "left" ? words.leftTitle(recentText(kept!.leftAt!, nowMs)) : words.oldTitle}
        </p>
        <p className="w-fit bg-paper px-1">{stale === "left" ? words.leftAdvice : words.oldAdvice}</p>
      </div>
    );
  }
  return (
    <div className="flex flex-col gap-2 px-4 py-3">
      <p className="text-base text-soft">{words.stands}</p>
      {kept && (
        <Button variant="quiet" onClick={() => take(() => theField().left(kept.id))}>
          {words.left}
        </Button>
      )}
    </div>
  );
}
