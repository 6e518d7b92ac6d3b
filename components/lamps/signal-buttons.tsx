import { Button } from "@/components/ui/button";
import type { Check } from "@/lib/domain/revision";
import { fieldWords } from "@/lib/domain/messages/field";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";
import type { Board } from "./board";

const third = "min-w-23 flex-1";

type SignalButtonsProps = { check: Check; board: Board; first: boolean; onOdd: () => void };

/** The answers to one signal. */
export function SignalButtons({ check, board, first, onOdd }: SignalButtonsProps) {
  return (
    <div className="flex flex-col gap-2.5">
      <div className="by-hand flex flex-wrap gap-2.5">
        <Button
          variant="good"
          hint={fieldWords.walk.asDrawn}
          className="min-w-[min(100%,10.5rem)] flex-[2_1_0.625rem] text-[1.875rem]"
          onClick={board.asDrawn}
        >
          {fieldWords.walk.good}
        </Button>
        <Button
          variant={check.effect === "hold" ? "fault-hold" : "fault-fix"}
          className="min-w-25 flex-1"
          onClick={onOdd}
        >
          {words.odd}
        </Button>
      </div>
      <div className="by-hand flex flex-wrap gap-2.5">
        <Button variant="quiet" className={third} disabled={first} onClick={board.back}>
          {fieldWords.walk.backOne}
        </Button>
        <Button variant="quiet" className={third} onClick={board.unseen}>
          {fieldWords.outcome.unseen}
        </Button>
        <Button variant="quiet" className={third} onClick={() => board.show("whole")}>
          {words.again}
        </Button>
      </div>
    </div>
  );
}
