import { useRef } from "react";
import { DrawingSheet } from "@/components/drawings/drawing-sheet";
import { Button } from "@/components/ui/button";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { cabinMarks } from "@/lib/domain/interruption";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { moveTo } from "./address";
import { useArrival, useScreenTitle } from "./screen-title";
import { useSettled } from "./settling";
import { StopButton } from "./stop-button";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { WalkFrame } from "./walk-frame";
import { WalkHead } from "./walk-head";
import { WalkStrip } from "./walk-strip";
import { WalkTimer } from "./walk-timer";

const words = walkingWords.car;

type CarQuestionProps = { recorder: Recorder; view: WalkView; walk: KeptWalk };

/** Before the last look: whether the cabin may have changed since it was marked. */
export function CarQuestion({ recorder, view, walk }: CarQuestionProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  const settled = useSettled("car");
  const { take, error } = useTaking(settled);
  useScreenTitle(fieldWords.walk.title(walk.purpose, walk.rigName));
  useArrival(heading, "car");

  const answer = (entered: boolean) =>
    take(async () => {
      const again = entered ? cabinMarks(view.document, [...view.replay.marks.keys()]) : [];
      await recorder.resume(again, entered ? "entered" : "untouched");
      moveTo({ walk: walk.id });
    });

  return (
    <WalkFrame
      head={
        <WalkHead
          walk={walk}
          figure={<WalkTimer elapsedMs={recorder.elapsedMs} />}
          control={<StopButton walk={walk.id} />}
        />
      }
      strip={<WalkStrip view={view} />}
      where={<p className="px-4 py-1.5 text-base font-extrabold">{words.title}</p>}
      picture={<DrawingSheet part="cabin" drawn="place" />}
      words={
        <>
          <h2
            ref={heading}
            tabIndex={-1}
            className="px-4 pt-3.5 text-[1.5625rem] leading-[1.18] font-extrabold tracking-[-0.01em] outline-none md:text-[2rem]"
          >
            {words.question}
          </h2>
          <p className="px-4 pt-1 text-soft md:text-xl">{words.why}</p>
        </>
      }
      acts={
        <div className="flex flex-col gap-2.5">
          <SaveTrouble error={error} held={recorder.held} />
          <div className="acts-two">
            <Button variant="good" className="text-[1.875rem]" onClick={() => answer(false)}>
              {words.nobody}
            </Button>
            <Button className="min-h-primary" hint={words.someoneHint} onClick={() => answer(true)}>
              {words.someone}
            </Button>
          </div>
        </div>
      }
    />
  );
}
