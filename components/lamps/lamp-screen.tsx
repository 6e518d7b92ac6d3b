import { useState } from "react";
import { useCallouts } from "@/components/field/callouts";
import { CheckFrame, type CheckScreenProps } from "@/components/field/check-frame";
import { CheckQuestion } from "@/components/field/check-question";
import { MarkButtons } from "@/components/field/mark-buttons";
import { useMarking } from "@/components/field/marking";
import { Question } from "@/components/field/question";
import { Button } from "@/components/ui/button";
import { signals, type Signal } from "@/lib/domain/entry";
import { expectedOf, type LampPair } from "@/lib/domain/lamp-board";
import { clipNote } from "@/lib/domain/messages/lamp-script";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";
import { useBoard } from "./board";
import { ClipMarker } from "./clip-marker";
import { LampPicture } from "./lamp-picture";
import { OddLamp } from "./odd-lamp";
import { SignalActs } from "./signal-acts";
import { SignalWords } from "./signal-words";
import { useWay } from "./way";
import { WayQuestion } from "./way-question";

/** The lamp board: one signal after the other, each lamp as it should answer, good as drawn or odd. */
export function LampScreen(props: CheckScreenProps) {
  const { recorder, view, steps, step } = props;
  const { check, place } = step;
  const mark = view.replay.marks.get(check.key);
  const marking = useMarking(recorder, steps, step);
  const callouts = useCallouts(check, marking, mark?.note);
  const way = useWay();
  const note = (way.clip && clipNote(way.clip.moments)) ?? mark?.note;
  const board = useBoard(check, marking, mark?.seen ?? {}, note, way.following);
  const { signal } = board;
  const expected = expectedOf(check, signal);
  const [odd, setOdd] = useState<{ signal: Signal; pair: LampPair } | null>(null);
  const pair = board.view === "odd" && odd?.signal === signal ? odd.pair : expected;
  const asking = marking.asking !== null;
  const filming = way.way === "clip" && !way.clip && !asking;
  const first = place === 1 && board.place === 1;

  const acts = () => {
    if (asking)
      return (
        <CheckQuestion
          recorder={recorder}
          check={check}
          callouts={callouts}
          marking={marking}
          onMended={board.retest}
        />
      );
    if (filming) return <ClipMarker onDone={way.setClip} onBack={() => way.choose("plain")} />;
    switch (board.view) {
      case "how":
        return (
          <WayQuestion
            onWay={(next) => {
              way.choose(next);
              board.back();
            }}
          />
        );
      case "odd":
        return (
          <OddLamp
            expected={expected}
            pair={pair}
            onPair={(next) => setOdd({ signal, pair: next })}
            onSave={() => board.odd(pair)}
            onBack={board.back}
          />
        );
      case "whole":
        return (
          <Question id="whole" title={words.wholeTitle}>
            <MarkButtons check={check} first={first} marking={marking} />
            <Button variant="quiet" onClick={board.back}>
              {words.wholeBack}
            </Button>
          </Question>
        );
      case "signal":
        return (
          <SignalActs
            check={check}
            board={board}
            first={first}
            way={way}
            onOdd={() => {
              // Saying what is odd takes longer than a signal is held.
              way.script.stop();
              board.show("odd");
            }}
          />
        );
    }
  };

  return (
    <CheckFrame
      {...props}
      marking={marking}
      count={words.place(board.place, signals.length)}
      announce={words.announce(signal, expected.left, expected.right)}
      picture={
        !filming && (
          <LampPicture
            pair={pair}
            signal={signal}
            separate={check.lamps?.layout === "separate"}
            arms={way.way === "arms" && board.view === "signal"}
            clip={way.clip}
          />
        )
      }
      says={
        !filming && (
          <SignalWords
            check={check}
            board={board}
            seen={mark?.seen ?? {}}
            quiet={asking}
            running={way.following !== null}
          />
        )
      }
      acts={acts()}
    />
  );
}
