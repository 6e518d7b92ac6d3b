import { useRef } from "react";
import { Button, buttonClass } from "@/components/ui/button";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { CALL_OFF, goTo, moveTo } from "./address";
import { useArrival, useScreenTitle } from "./screen-title";
import { BottomBar } from "./bottom-bar";
import { isSecondTap } from "./settling";
import { StepList } from "./step-list";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { VerdictMark } from "./verdict-mark";
import { WalkHead } from "./walk-head";
import { nextStep, tallyOf, type Step } from "./walk-plan";
import { WalkStrip } from "./walk-strip";
import { WalkTimer } from "./walk-timer";
import { WingLink } from "./wing-link";

const words = fieldWords.closing;

type ClosingScreenProps = { recorder: Recorder; view: WalkView; walk: KeptWalk; steps: readonly Step[] };

/** The end of a walk, or a stop on the way: what was looked at, what is left, and the signature or a pause. */
export function ClosingScreen({ recorder, view, walk, steps }: ClosingScreenProps) {
  const { marks, verdict } = view.replay;
  const tally = tallyOf(view.document, steps, marks);
  const heading = useRef<HTMLHeadingElement>(null);
  const { take, error } = useTaking();
  useScreenTitle(fieldWords.walk.title(walk.purpose, walk.rigName));
  useArrival(heading, "closing");

  const show = (step: Step) => !isSecondTap() && moveTo({ walk: walk.id, at: step.check.key });
  const close = () =>
    take(async () => {
      await recorder.close();
      moveTo({ walk: walk.id });
    });
  const pause = () =>
    take(async () => {
      await recorder.pause();
      goTo({});
    });
  const onward = nextStep(steps, marks, null);

  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-[76rem] flex-col md:grid md:grid-cols-[minmax(0,7fr)_minmax(21rem,5fr)] md:grid-rows-[auto_auto_minmax(0,1fr)] md:gap-x-8">
      <div className="md:col-start-2">
        <WalkHead walk={walk} figure={<WalkTimer elapsedMs={recorder.elapsedMs} />} />
      </div>
      <div className="px-4 pb-3 md:col-start-2 md:row-start-2">
        <WalkStrip view={view} />
      </div>
      <div className="pb-4 md:col-start-1 md:row-span-3 md:row-start-1">
        <h2
          ref={heading}
          tabIndex={-1}
          className="border-t-hair border-rule px-4 pt-5 text-[2.5rem] leading-none font-extrabold tracking-[-0.01em] outline-none md:border-0"
        >
          {words.lookedAt(tally.lookedAt, tally.total)}
        </h2>
        <p className="flex items-center gap-2 px-4 pt-2 pb-4 text-xl">
          <VerdictMark verdict={verdict} />
          {words.asItStands(verdict)}
        </p>
        <Left title={words.unmarked} steps={tally.unmarked} marks={marks} onStep={show} />
        <Left title={words.unseen} steps={tally.unseen} marks={marks} onStep={show} />
        {tally.unmarked.length === 0 && <p className="px-4 pt-3 text-soft">{words.allMarked}</p>}
      </div>
      <BottomBar
        height="tall"
        className="acts-two px-3 md:col-start-2 md:row-start-3 md:self-end md:border-0"
      >
        {error !== null && (
          <div className="col-span-full">
            <SaveTrouble error={error} held={recorder.held} />
          </div>
        )}
        {onward ? (
          <Button variant="good" className="col-span-full" onClick={() => show(onward)}>
            {words.goOn}
          </Button>
        ) : (
          <Button
            variant="good"
            hint={words.final(verdict)}
            className="col-span-full text-[1.75rem]"
            onClick={close}
          >
            {words.closeAndSign}
          </Button>
        )}
        {walk.source !== "paper" && (
          <Button hint={words.pauseHint} onClick={pause}>
            {words.pause}
          </Button>
        )}
        {onward ? (
          <Button onClick={() => moveTo({ walk: walk.id, at: CALL_OFF })}>{words.callOff}</Button>
        ) : (
          <Button variant="quiet" onClick={() => show(steps.at(-1)!)}>
            {words.lastCheck}
          </Button>
        )}
        <WingLink className={`${buttonClass("quiet")} col-span-full`}>{words.leave}</WingLink>
      </BottomBar>
    </main>
  );
}

type LeftProps = Pick<Parameters<typeof StepList>[0], "steps" | "marks" | "onStep"> & { title: string };

function Left({ title, steps, marks, onStep }: LeftProps) {
  if (steps.length === 0) return null;
  return (
    <section>
      <h3 className="px-4 pt-3 pb-1.5 font-extrabold">{title}</h3>
      <StepList steps={steps} marks={marks} note={(step) => step.station.title} onStep={onStep} />
    </section>
  );
}
