import { useRef } from "react";
import { Button } from "@/components/ui/button";
import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { againAfterMending } from "@/lib/domain/interruption";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { CALL_OFF, moveTo } from "./address";
import { BottomBar } from "./bottom-bar";
import { Findings } from "./findings";
import { useArrival, useScreenTitle } from "./screen-title";
import { useSettled } from "./settling";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { VerdictBand } from "./verdict-band";
import { WalkHead } from "./walk-head";
import { WalkTimer } from "./walk-timer";
import { tallyOf, type Step } from "./walk-plan";
import { WalkStrip } from "./walk-strip";
import { WingLink } from "./wing-link";
import { buttonClass } from "@/components/ui/button";

const words = walkingWords.held;

type HeldScreenProps = { recorder: Recorder; view: WalkView; walk: KeptWalk; steps: readonly Step[] };

/** Every check is marked and the rig is held: what to do first, what holds it, and the way on after it is mended. */
export function HeldScreen({ recorder, view, walk, steps }: HeldScreenProps) {
  const { marks } = view.replay;
  const tally = tallyOf(view.document, steps, marks);
  const held = tally.holds.map(({ check }) => check.key);
  const again = againAfterMending(view.document, held, [...marks.keys()]);
  const heading = useRef<HTMLHeadingElement>(null);
  const settled = useSettled("held");
  const { take, error } = useTaking(settled);
  useScreenTitle(fieldWords.verdict.hold);
  useArrival(heading, "held");

  const lookAgain = () =>
    take(async () => {
      await recorder.resume(again);
      moveTo({ walk: walk.id });
    });

  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-[76rem] flex-col">
      <WalkHead walk={walk} figure={<WalkTimer elapsedMs={recorder.elapsedMs} />} />
      <div className="px-4 pb-2.5">
        <WalkStrip view={view} />
      </div>
      <VerdictBand verdict="hold" tally={tally} heading={heading} />
      <p className="border-b-hair border-rule px-4 py-3.5 text-xl leading-[1.3] font-semibold">
        {walkingWords.secureFirst}
      </p>
      <Findings walk={walk.id} tally={tally} marks={marks} />
      <p className="px-4 py-4 text-[0.9375rem] text-soft">{fieldWords.result.deference}</p>
      <BottomBar height="tall" className="flex flex-col gap-2.5 px-3">
        <SaveTrouble error={error} held={recorder.held} />
        <p className="px-1 text-base text-soft">{words.againList(again.length)}</p>
        <div className="acts-two">
          <Button variant="good" hint={words.againHint} onClick={lookAgain}>
            {words.again}
          </Button>
          <Button className="min-h-primary" onClick={() => moveTo({ walk: walk.id, at: CALL_OFF })}>
            {words.callOff}
          </Button>
        </div>
        <WingLink className={buttonClass("quiet")}>{fieldWords.closing.leave}</WingLink>
      </BottomBar>
    </main>
  );
}
