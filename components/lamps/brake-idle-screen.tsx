import { useState } from "react";
import { useCallouts } from "@/components/field/callouts";
import { CheckFrame, type CheckScreenProps } from "@/components/field/check-frame";
import { CheckPicture } from "@/components/field/check-picture";
import { CheckQuestion } from "@/components/field/check-question";
import { CheckWords } from "@/components/field/check-words";
import { MarkButtons } from "@/components/field/mark-buttons";
import { useMarking } from "@/components/field/marking";
import { Question } from "@/components/field/question";
import { Button } from "@/components/ui/button";
import { idleStep, type IdleSeen } from "@/lib/domain/brake-idle";
import { fieldWords } from "@/lib/domain/messages/field";
import { brakeIdleWords as words } from "@/lib/domain/messages/lamps";
import { useIdle } from "./idle";

/** Whether the brake unit is idle: shown by the stop lamps where they can show it, otherwise by what stands for it. */
export function BrakeIdleScreen(props: CheckScreenProps) {
  const { recorder, view, steps, step } = props;
  const { check, place } = step;
  const mark = view.replay.marks.get(check.key);
  const marking = useMarking(recorder, steps, step);
  const callouts = useCallouts(check, marking, mark?.note);
  const [whole, setWhole] = useState(false);
  const asking = marking.asking !== null;
  return (
    <CheckFrame
      {...props}
      marking={marking}
      picture={
        <CheckPicture check={check} marked={callouts.chosen} onTouch={callouts.touch} asking={asking} />
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
        ) : whole ? (
          <MarkButtons check={check} first={place === 1} marking={marking} />
        ) : (
          <IdleQuestion marking={marking} first={place === 1} onWhole={() => setWhole(true)} />
        )
      }
    />
  );
}

type IdleQuestionProps = { marking: Parameters<typeof useIdle>[0]; first: boolean; onWhole: () => void };

/** One question at a time; the last answer saves the mark with what it stands on. */
function IdleQuestion({ marking, first, onWhole }: IdleQuestionProps) {
  const { seen, say, back } = useIdle(marking);
  const step = idleStep(seen);
  if (!("ask" in step)) return null;
  const { ask } = step;
  const question = words[ask];
  const answers: { label: string; value: IdleSeen; good: boolean }[] = {
    lit: [
      { label: words.lit.yes, value: { lit: "yes" as const }, good: true },
      { label: words.lit.no, value: { lit: "no" as const }, good: false },
    ],
    dark: twoOf(words.dark, "dark"),
    pedal: twoOf(words.pedal, "pedalUp"),
    idle: twoOf(words.idle, "unitIdle"),
  }[ask];
  return (
    <Question id="idle" title={question.title} appearance={ask}>
      <p className="px-1 text-base text-soft">{question.how}</p>
      <div className="acts-two">
        {answers.map(({ label, value, good }) => (
          <Button
            key={label}
            variant={good ? "good" : "plain"}
            className="min-h-primary text-xl"
            onClick={() => say(value)}
          >
            {label}
          </Button>
        ))}
      </div>
      <div className="acts-three">
        <Button variant="quiet" disabled={first && ask === "lit"} onClick={back}>
          {fieldWords.walk.backOne}
        </Button>
        {ask === "lit" && (
          <Button variant="quiet" onClick={() => say({ lit: "unknown" })}>
            {words.lit.unknown}
          </Button>
        )}
        <Button variant="quiet" onClick={onWhole}>
          {words.whole}
        </Button>
      </div>
    </Question>
  );
}

function twoOf({ yes, no }: { yes: string; no: string }, key: "dark" | "pedalUp" | "unitIdle") {
  return [
    { label: yes, value: { [key]: true }, good: true },
    { label: no, value: { [key]: false }, good: false },
  ];
}
