import { Button } from "@/components/ui/button";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { CALL_OFF, goTo } from "./address";
import { KeptStrip } from "./last-verdict";
import { useStoredWalk } from "./stored-walk";
import { VerdictMark } from "./verdict-mark";
import { nextStep, stepsOf } from "./walk-plan";

const words = fieldWords.rigs;

/** The way back into an open walk, at the check it waits at. */
export function GoOn({ walk }: { walk: KeptWalk }) {
  const stored = useStoredWalk(walk);
  const steps = stored ? stepsOf(stored.document, walk) : [];
  const next = stored && nextStep(steps, stored.replay.marks, null);
  const holds = stored?.replay.verdict === "hold";
  return (
    <div className="grid grid-cols-1 gap-2.5">
      <div className="px-1">
        {holds && (
          <p className="flex items-center gap-2.5 font-extrabold text-hold">
            <VerdictMark verdict="hold" />
            {fieldWords.closing.asItStands("hold")}
          </p>
        )}
        <KeptStrip walk={walk} />
      </div>
      <Button variant="good" onClick={() => goTo({ walk: walk.id })}>
        {words.goOn(walk.purpose, stored && { place: next?.place ?? null, total: steps.length })}
      </Button>
      <Button variant="quiet" onClick={() => goTo({ walk: walk.id, at: CALL_OFF })}>
        {words.callOff}
      </Button>
    </div>
  );
}
