import type { ReactNode } from "react";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Marking } from "./marking";
import { useScreenTitle } from "./screen-title";
import { StopButton } from "./stop-button";
import { SaveTrouble } from "./save-trouble";
import { WalkFrame } from "./walk-frame";
import { WalkHead } from "./walk-head";
import type { Step } from "./walk-plan";
import { WalkPlace } from "./walk-place";
import { WalkStrip } from "./walk-strip";
import { WalkTimer } from "./walk-timer";

const words = fieldWords.walk;

/** What every kind of check has to show and to mark with. */
export type CheckScreenProps = {
  recorder: Recorder;
  view: WalkView;
  walk: KeptWalk;
  steps: readonly Step[];
  step: Step;
};

type CheckFrameProps = CheckScreenProps & {
  marking: Marking;
  /** Where in the check one is, in place of which check of how many. */
  count?: string;
  /** Read out when something else shows within the check. */
  announce?: string;
  picture: ReactNode;
  says: ReactNode;
  acts: ReactNode;
};

/** What stands around every check: the walk, its tape, where one is, and what was saved or not. */
export function CheckFrame({ recorder, view, walk, steps, step, marking, ...parts }: CheckFrameProps) {
  const { check, station, place } = step;
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
      where={<WalkPlace walk={walk.id} step={step} total={steps.length} count={parts.count} />}
      picture={parts.picture}
      words={parts.says}
      acts={
        <>
          <p role="status" className="sr-only">
            {[words.announce(marking.saved, station.title, place, steps.length), parts.announce]
              .filter(Boolean)
              .join(" ")}
          </p>
          <SaveTrouble error={marking.error} held={recorder.held} />
          {parts.acts}
        </>
      }
    />
  );
}
