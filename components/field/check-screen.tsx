import { useCallouts } from "./callouts";
import { CheckFrame, type CheckScreenProps } from "./check-frame";
import { CheckPicture } from "./check-picture";
import { CheckQuestion } from "./check-question";
import { CheckWords } from "./check-words";
import { MarkButtons } from "./mark-buttons";
import { useMarking } from "./marking";

/** One check at a time: the part as it should be, what is asked of it, and the answers. */
export function CheckScreen(props: CheckScreenProps) {
  const { recorder, view, steps, step } = props;
  const { check, place } = step;
  const mark = view.replay.marks.get(check.key);
  const marking = useMarking(recorder, steps, step);
  const callouts = useCallouts(check, marking, mark?.note);
  const asking = marking.asking !== null;
  return (
    <CheckFrame
      {...props}
      marking={marking}
      picture={
        marking.asking !== "measure" && (
          <CheckPicture check={check} marked={callouts.chosen} onTouch={callouts.touch} asking={asking} />
        )
      }
      says={
        <CheckWords
          check={check}
          mark={mark}
          before={view.replay.faulted.get(check.key)}
          copying={view.walk.source === "paper"}
          marking={marking}
        />
      }
      acts={
        asking ? (
          <CheckQuestion recorder={recorder} check={check} callouts={callouts} marking={marking} />
        ) : (
          <MarkButtons check={check} first={place === 1} marking={marking} />
        )
      }
    />
  );
}
