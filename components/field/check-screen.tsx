import { PartDrawing } from "@/components/drawings/part-drawing";
import { RigPlan } from "@/components/drawings/rig-plan";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { CLOSING, moveTo } from "./address";
import { BecauseQuestion } from "./because-question";
import { CheckWords } from "./check-words";
import { MarkButtons } from "./mark-buttons";
import { useMarking } from "./marking";
import { useScreenTitle } from "./screen-title";
import { Trouble } from "./trouble";
import { WalkFrame } from "./walk-frame";
import { WalkHead } from "./walk-head";
import type { Step } from "./walk-plan";
import { WalkStrip } from "./walk-strip";
import { WalkTimer } from "./walk-timer";

const words = fieldWords.walk;

type CheckScreenProps = {
  recorder: Recorder;
  view: WalkView;
  walk: KeptWalk;
  steps: readonly Step[];
  step: Step;
};

/** One check at a time: the part as it should be, what is asked of it, and the answers. */
export function CheckScreen({ recorder, view, walk, steps, step }: CheckScreenProps) {
  const { check, station, place } = step;
  const asDrawn = check.drawn !== "place";
  const marking = useMarking(recorder, steps, step);
  useScreenTitle(words.title(walk.purpose, walk.rigName));
  return (
    <WalkFrame
      head={
        <WalkHead
          walk={walk}
          figure={<WalkTimer elapsedMs={recorder.elapsedMs} />}
          control={
            <button
              type="button"
              className="-my-6 min-h-field px-4 leading-none underline decoration-2 underline-offset-4"
              onClick={() => moveTo({ walk: walk.id, at: CLOSING })}
            >
              {words.close}
            </button>
          }
        />
      }
      strip={<WalkStrip view={view} now={check.key} />}
      where={
        <div className="flex flex-wrap items-center justify-between gap-x-2.5 px-4 py-1.5 text-base">
          <p className="min-w-0 font-extrabold">{station.title}</p>
          <RigPlan station={station.key} />
          <p className="tabular">{words.place(place, steps.length)}</p>
        </div>
      }
      picture={
        <div
          className={`absolute inset-0 flex justify-center *:h-full *:w-auto *:max-w-full ${asDrawn ? "" : "[&_.dr-callout]:hidden"}`}
        >
          <PartDrawing part={check.part} side={check.side} drawn={check.drawn} />
        </div>
      }
      words={
        <CheckWords
          check={check}
          mark={view.replay.marks.get(check.key)?.outcome}
          asking={marking.asking !== null}
          onKeep={marking.skip}
        />
      }
      acts={
        <>
          <p role="status" className="sr-only">
            {words.announce(marking.saved, station.title, place, steps.length)}
          </p>
          {marking.trouble && <Trouble>{marking.trouble}</Trouble>}
          {marking.asking ? (
            <BecauseQuestion marking={marking} />
          ) : (
            <MarkButtons check={check} asDrawn={asDrawn} first={place === 1} marking={marking} />
          )}
        </>
      }
    />
  );
}
