import { useRef } from "react";
import { Button, buttonClass } from "@/components/ui/button";
import type { WalkView } from "@/lib/client/recorder";
import type { SyncView } from "@/lib/client/sync";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { clockText } from "@/lib/client/time-words";
import { goTo } from "./address";
import { BottomBar } from "./bottom-bar";
import { startWalk } from "./browser-field";
import { Custody } from "./custody";
import { Findings } from "./findings";
import { Mended } from "./mended";
import { OpenFindings } from "./open-findings";
import { lastOfWalk } from "./rig-state";
import { useArrival, useScreenTitle } from "./screen-title";
import { RuledNotice } from "./ruled-notice";
import { Stale } from "./stale";
import { StepList } from "./step-list";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { VerdictBand } from "./verdict-band";
import { WalkHead } from "./walk-head";
import { stepsOf, tallyOf } from "./walk-plan";
import { WalkStrip } from "./walk-strip";
import { WingLink } from "./wing-link";

const words = fieldWords.result;

type VerdictScreenProps = { view: WalkView; walk: KeptWalk; sync: SyncView };

/** A closed walk: its verdict, what to do about it, and where the record is. */
export function VerdictScreen({ view, walk, sync }: VerdictScreenProps) {
  const { marks, verdict, elapsedMs } = view.replay;
  const tally = tallyOf(view.document, stepsOf(view.document, walk), marks);
  const { holds, unmarked, unseen, lookedAt, total } = tally;
  const rig = sync.bundle?.rigs.find(({ id }) => id === walk.rig);
  const heading = useRef<HTMLHeadingElement>(null);
  const { take, error } = useTaking();
  const walkAgain = () =>
    take(async () => {
      if (!rig) return;
      const plan = { member: walk.member, purpose: walk.purpose, depth: "short" } as const;
      goTo({ walk: await startWalk(rig, plan) });
    });
  useScreenTitle(fieldWords.verdict[verdict]);
  useArrival(heading, "verdict");
  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-[76rem] flex-col">
      <WalkHead walk={walk} figure={clockText(elapsedMs)} />
      <div className="px-4 pb-2.5">
        <WalkStrip view={view} />
      </div>
      <VerdictBand verdict={verdict} tally={tally} heading={heading} />
      <div className="flex flex-1 flex-col md:grid md:grid-cols-[minmax(0,7fr)_minmax(21rem,5fr)] md:grid-rows-[auto_1fr] md:gap-x-8">
        <div className="md:row-span-2">
          {verdict === "hold" && (
            <p className="border-b-hair border-rule px-4 py-3.5 text-xl leading-[1.3] font-semibold">
              {words.secure}
            </p>
          )}
          <Findings walk={walk.id} tally={tally} marks={marks} />
          <Mended document={view.document} marks={marks} />
          {unmarked.length + unseen.length > 0 && (
            <section>
              <h3 className="px-4 pt-4 pb-1.5 font-extrabold">{words.notSeen}</h3>
              <StepList
                steps={[...unseen, ...unmarked]}
                marks={marks}
                note={(_, outcome) => (outcome ? fieldWords.outcome[outcome] : words.leftOut)}
              />
            </section>
          )}
        </div>
        <div>
          <div className="px-4 pt-3 empty:hidden">
            <RuledNotice document={rig?.revision.document ?? view.document} />
          </div>
          {rig && rig.openFindings.length > 0 && (
            <div className="px-4 py-3">
              <OpenFindings rig={rig} />
            </div>
          )}
          <p className="px-4 py-4">
            {words.sentence(
              verdict,
              holds.length,
              lookedAt,
              total,
              walk.source === "paper" ? null : elapsedMs,
            )}
          </p>
          {verdict === "unfinished" && <p className="px-4 pb-4 font-semibold">{words.unfinished}</p>}
          <Stale last={lastOfWalk(walk)} kept={walk} />
          <p className="px-4 pb-4 text-[0.9375rem] text-soft">{words.deference}</p>
        </div>
        <BottomBar
          height="low"
          className="flex flex-wrap items-center gap-x-4 gap-y-3 px-4 md:mt-0 md:self-start"
        >
          {error !== null && (
            <div className="basis-full">
              <SaveTrouble error={error} />
            </div>
          )}
          <div className="min-w-0 flex-[1_1_13rem]">
            <Custody walk={walk} signedOut={sync.signedOut} />
          </div>
          {verdict === "hold" && rig && (
            <Button hint={walkingWords.held.walkAgainHint} className="flex-1" onClick={walkAgain}>
              {walkingWords.held.walkAgain}
            </Button>
          )}
          <WingLink className={`${buttonClass("plain")} min-w-29`}>{fieldWords.walk.back}</WingLink>
        </BottomBar>
      </div>
    </main>
  );
}
