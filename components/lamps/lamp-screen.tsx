import { useState } from "react";
import { useCallouts } from "@/components/field/callouts";
import { CheckFrame, type CheckScreenProps } from "@/components/field/check-frame";
import { CheckQuestion } from "@/components/field/check-question";
import { MarkButtons } from "@/components/field/mark-buttons";
import { useMarking } from "@/components/field/marking";
import { Question } from "@/components/field/question";
import { LampsDrawing } from "@/components/drawings/lamps";
import { Button } from "@/components/ui/button";
import type { Signal } from "@/lib/domain/entry";
import { expectedOf, type LampPair } from "@/lib/domain/lamp-board";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";
import { signals } from "@/lib/domain/entry";
import { useBoard } from "./board";
import { OddLamp } from "./odd-lamp";
import { SignalButtons } from "./signal-buttons";
import { SignalWords } from "./signal-words";

/** The lamp board: one signal after the other, each lamp as it should answer, good as drawn or odd. */
export function LampScreen(props: CheckScreenProps) {
  const { recorder, view, steps, step } = props;
  const { check, place } = step;
  const mark = view.replay.marks.get(check.key);
  const marking = useMarking(recorder, steps, step);
  const callouts = useCallouts(check, marking, mark?.note);
  const board = useBoard(check, marking, mark?.seen ?? {}, mark?.note);
  const { signal } = board;
  const expected = expectedOf(check, signal);
  const [odd, setOdd] = useState<{ signal: Signal; pair: LampPair } | null>(null);
  const pair = board.view === "odd" && odd?.signal === signal ? odd.pair : expected;
  const asking = marking.asking !== null;

  const acts = () => {
    if (asking)
      return <CheckQuestion recorder={recorder} check={check} callouts={callouts} marking={marking} />;
    if (board.view === "odd") {
      return (
        <OddLamp
          expected={expected}
          pair={pair}
          onPair={(next) => setOdd({ signal, pair: next })}
          onSave={() => board.odd(pair)}
          onBack={board.back}
        />
      );
    }
    if (board.view === "whole") {
      return (
        <Question id="whole" title={words.wholeTitle}>
          <MarkButtons check={check} first={place === 1} marking={marking} />
          <Button variant="quiet" onClick={board.back}>
            {words.wholeBack}
          </Button>
        </Question>
      );
    }
    return <SignalButtons check={check} board={board} first={place === 1 && board.place === 1} />;
  };

  return (
    <CheckFrame
      {...props}
      marking={marking}
      count={words.place(board.place, signals.length)}
      announce={words.announce(signal, expected.left, expected.right)}
      picture={
        <div className="relative min-h-44 flex-1">
          <div className="absolute inset-0 flex justify-center *:h-full *:w-auto *:max-w-full">
            <LampsDrawing {...pair} separate={check.lamps?.layout === "separate" ? signal : undefined} />
          </div>
        </div>
      }
      says={<SignalWords check={check} board={board} quiet={asking} />}
      acts={acts()}
    />
  );
}
