import { Button } from "@/components/ui/button";
import type { Check } from "@/lib/domain/revision";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Marking } from "./marking";

const words = fieldWords.walk;
const third = "min-w-23 flex-1";

type MarkButtonsProps = {
  check: Check;
  first: boolean;
  marking: Marking;
};

/** The four answers to a check and the way back, where the thumb is. */
export function MarkButtons({ check, first, marking }: MarkButtonsProps) {
  const holds = check.effect === "hold";
  const asDrawn = check.drawn !== "place";
  return (
    <div className="flex flex-col gap-2.5">
      {/* Good takes two columns of the row below and the gap between them; with large text each takes a row. */}
      <div className="by-hand flex flex-wrap gap-2.5">
        {/* What the sheet rules out, nobody can see good at the rig. */}
        {!check.ruled && (
          <Button
            variant="good"
            hint={asDrawn ? words.asDrawn : undefined}
            className="min-w-[min(100%,10.5rem)] flex-[2_1_0.625rem] text-[1.875rem]"
            onClick={() => marking.mark("good")}
          >
            {words.good}
          </Button>
        )}
        <Button
          variant={holds ? "fault-hold" : "fault-fix"}
          className="min-w-25 flex-1"
          onClick={() => marking.mark("fault")}
        >
          {words.fault} <span className="sr-only">{holds ? words.faultHold : words.faultFix}</span>
        </Button>
      </div>
      <div className="by-hand flex flex-wrap gap-2.5">
        <Button variant="quiet" className={third} disabled={first} onClick={marking.back}>
          {words.backOne}
        </Button>
        <Button variant="quiet" className={third} onClick={() => marking.mark("unseen")}>
          {fieldWords.outcome.unseen}
        </Button>
        {!check.ruled && (
          <Button variant="quiet" className={third} onClick={() => marking.mark("absent")}>
            {fieldWords.outcome.absent}
          </Button>
        )}
      </div>
    </div>
  );
}
