import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { BecauseQuestion } from "./because-question";
import { useCallouts } from "./callouts";
import { CheckPicture } from "./check-picture";
import { CheckWords } from "./check-words";
import { FaultDetails } from "./fault-details";
import { MarkButtons } from "./mark-buttons";
import { useMarking } from "./marking";
import { MeasureQuestion } from "./measure-question";
import { useScreenTitle } from "./screen-title";
import { StopButton } from "./stop-button";
import { Trouble } from "./trouble";
import { WalkFrame } from "./walk-frame";
import { WalkHead } from "./walk-head";
import type { Step } from "./walk-plan";
import { WalkPlace } from "./walk-place";
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
  const mark = view.replay.marks.get(check.key);
  const marking = useMarking(recorder, steps, step);
  const callouts = useCallouts(check, marking, mark?.note);
  useScreenTitle(words.title(walk.purpose, walk.rigName));
  return (
    <WalkFrame
      head={
        <WalkHead
          walk={walk}
          figure={<WalkTimer elapsedMs={recorder.elapsedMs} />}
          control={<StopButton walk={walk.id} />}
        />
      }
      strip={<WalkStrip view={view} now={check.key} />}
      where={<WalkPlace walk={walk.id} step={step} total={steps.length} />}
      picture={
        <CheckPicture
          check={check}
          marked={callouts.chosen}
          onTouch={callouts.touch}
          asking={marking.asking !== null}
        />
      }
      words={
        <CheckWords
          check={check}
          mark={mark}
          asking={marking.asking !== null}
          onKeep={marking.skip}
          onDetails={() => marking.ask("details")}
        />
      }
      acts={
        <>
          <p role="status" className="sr-only">
            {words.announce(marking.saved, station.title, place, steps.length)}
          </p>
          {marking.trouble && <Trouble>{marking.trouble}</Trouble>}
          {marking.asking === null && (
            <MarkButtons check={check} asDrawn={asDrawn} first={place === 1} marking={marking} />
          )}
          {(marking.asking === "why" || marking.asking === "what") && <BecauseQuestion marking={marking} />}
          {marking.asking === "details" && (
            <FaultDetails check={check} asDrawn={asDrawn} callouts={callouts} marking={marking} />
          )}
          {marking.asking === "measure" && check.measure && (
            <MeasureQuestion measure={check.measure} marking={marking} />
          )}
        </>
      }
    />
  );
}
