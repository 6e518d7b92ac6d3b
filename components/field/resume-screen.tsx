import { useRef } from "react";
import { Button } from "@/components/ui/button";
import { durationText } from "@/lib/client/time-words";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { againAfterBreak, cabinMarks, type Interruption } from "@/lib/domain/interruption";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { CALL_OFF, moveTo } from "./address";
import { BottomBar } from "./bottom-bar";
import { FieldFrame } from "./field-frame";
import { useArrival, useScreenTitle } from "./screen-title";
import { useSettled } from "./settling";
import { StepList } from "./step-list";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { WalkHead } from "./walk-head";
import { WalkTimer } from "./walk-timer";
import { nextStep, type Step } from "./walk-plan";
import { WalkStrip } from "./walk-strip";

const words = walkingWords.resume;

/** So short that the person may well not have been away at all. */
const MOMENT_MS = 2 * 60_000;
const SAYABLE_MS = 2_000;

type ResumeScreenProps = {
  recorder: Recorder;
  view: WalkView;
  walk: KeptWalk;
  steps: readonly Step[];
  interruption: Interruption;
};

/** A walk that was paused or left: what is asked again, whether the car was entered, and on. */
export function ResumeScreen({ recorder, view, walk, steps, interruption }: ResumeScreenProps) {
  const { marks } = view.replay;
  const keys = [...marks.keys()];
  const again = againAfterBreak(view.document, keys, false);
  const cabin = cabinMarks(view.document, keys).length > 0;
  const { kind, awayMs } = interruption;
  const away = awayMs === null || awayMs < SAYABLE_MS ? null : durationText(awayMs);
  const next = nextStep(steps, marks, null);
  const heading = useRef<HTMLHeadingElement>(null);
  const settled = useSettled("resume");
  const { take, error } = useTaking(settled);
  useScreenTitle(fieldWords.walk.title(walk.purpose, walk.rigName));
  useArrival(heading, "resume");

  const goOn = (entered?: boolean) =>
    take(async () => {
      const keep = againAfterBreak(view.document, keys, entered === true);
      await recorder.resume(keep, entered === undefined ? undefined : entered ? "entered" : "untouched");
      moveTo({ walk: walk.id });
    });
  const onlyPhone = () =>
    take(async () => {
      await recorder.resume([]);
      moveTo({ walk: walk.id });
    });

  return (
    <FieldFrame>
      <WalkHead walk={walk} figure={<WalkTimer elapsedMs={recorder.elapsedMs} />} />
      <div className="px-4 pb-3">
        <WalkStrip view={view} now={next?.check.key} />
      </div>
      <h2
        ref={heading}
        tabIndex={-1}
        className="border-t-hair border-rule px-4 pt-5 text-[2.25rem] leading-none font-extrabold tracking-[-0.01em] outline-none"
      >
        {words[kind](away)}
      </h2>
      {awayMs === null && <p className="px-4 pt-2">{words.clocks}</p>}
      {next && (
        <p className="px-4 pt-2 pb-4 text-xl">{words.nextUp(next.place, steps.length, next.check.ask)}</p>
      )}
      {again.length > 0 && (
        <>
          <h3 className="px-4 pb-1.5 font-extrabold">{words.again}</h3>
          <StepList
            steps={steps.filter(({ check }) => again.includes(check.key))}
            marks={marks}
            note={(step) => step.station.title}
          />
        </>
      )}
      <BottomBar height="tall" className="flex flex-col gap-2.5 px-3">
        <SaveTrouble error={error} held={recorder.held} />
        {cabin && <p className="px-1 text-xl leading-snug font-extrabold">{words.car}</p>}
        <div className="acts-two">
          {cabin ? (
            <>
              <Button variant="good" hint={words.nobodyHint} onClick={() => goOn(false)}>
                {words.nobody}
              </Button>
              <Button className="min-h-primary" hint={words.someoneHint} onClick={() => goOn(true)}>
                {words.someone}
              </Button>
            </>
          ) : (
            <Button variant="good" className="col-span-full" onClick={() => goOn()}>
              {words.goOn}
            </Button>
          )}
        </div>
        <div className="acts-two">
          {kind === "left" && awayMs !== null && awayMs < MOMENT_MS && (
            <Button variant="quiet" onClick={onlyPhone}>
              {words.onlyPhone}
            </Button>
          )}
          <Button variant="quiet" onClick={() => moveTo({ walk: walk.id, at: CALL_OFF })}>
            {words.callOff}
          </Button>
        </div>
      </BottomBar>
    </FieldFrame>
  );
}
