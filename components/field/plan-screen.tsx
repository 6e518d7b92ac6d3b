import { useRef } from "react";
import { RigPlan } from "@/components/drawings/rig-plan";
import { Strip } from "@/components/tape/strip";
import { Button } from "@/components/ui/button";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { moveTo } from "./address";
import { FieldFrame } from "./field-frame";
import { useArrival, useScreenTitle } from "./screen-title";
import { isSecondTap } from "./settling";
import { WalkHead } from "./walk-head";
import { WalkTimer } from "./walk-timer";
import { nextStep, stripOf, type Step } from "./walk-plan";

const words = walkingWords.plan;

type PlanScreenProps = { recorder: Recorder; view: WalkView; walk: KeptWalk; steps: readonly Step[] };

/** The rig from above and its stations in walking order; a tap on one goes there. */
export function PlanScreen({ recorder, view, walk, steps }: PlanScreenProps) {
  const { marks } = view.replay;
  const now = nextStep(steps, marks, null) ?? steps.at(-1)!;
  const stations = stripOf(steps, marks, now.check.key);
  const heading = useRef<HTMLHeadingElement>(null);
  useScreenTitle(fieldWords.walk.title(walk.purpose, walk.rigName));
  useArrival(heading, "plan");
  const show = (step: Step) => !isSecondTap() && moveTo({ walk: walk.id, at: step.check.key });

  return (
    <FieldFrame>
      <WalkHead walk={walk} figure={<WalkTimer elapsedMs={recorder.elapsedMs} />} />
      <h2 ref={heading} tabIndex={-1} className="px-4 pt-2 text-2xl font-extrabold outline-none">
        {words.title}
      </h2>
      <div aria-hidden="true" className="px-4 py-3 *:h-auto *:w-full">
        <RigPlan station={now.station.key} />
      </div>
      <ol className="border-t-hair border-rule">
        {stations.map((station) => {
          const here = steps.filter((step) => `${step.station.key}-${step.place}` === station.key).at(0)!;
          const at = steps.indexOf(here);
          const own = steps.slice(at, at + station.segments.length);
          const done = own.filter(({ check }) => marks.has(check.key)).length;
          const first = own.find(({ check }) => !marks.has(check.key)) ?? here;
          const current = own.includes(now);
          return (
            <li key={station.key} className="border-b-hair border-rule">
              <button
                type="button"
                aria-current={current ? "step" : undefined}
                onClick={() => show(first)}
                className="flex min-h-field w-full flex-wrap items-center justify-between gap-x-3 gap-y-1 px-4 py-2 text-left active:bg-shade"
              >
                <span className="font-extrabold">
                  {here.station.title}
                  {current && <span className="block text-base font-normal text-soft">{words.here}</span>}
                </span>
                <span className="w-28">
                  <Strip stations={[station]} label={words.state(done, own.length)} size="small" />
                </span>
              </button>
            </li>
          );
        })}
      </ol>
      <div className="px-3 pt-3">
        <Button className="w-full" onClick={() => show(now)}>
          {words.back}
        </Button>
      </div>
    </FieldFrame>
  );
}
