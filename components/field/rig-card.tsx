import { useId, useRef, useState } from "react";
import { buttonClass } from "@/components/ui/button";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import type { Depth, Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import type { Member } from "@/lib/domain/member";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { stalenessOf } from "@/lib/domain/standing";
import { goTo } from "./address";
import { startWalk } from "./browser-field";
import { GoOn } from "./go-on";
import { LastVerdict } from "./last-verdict";
import { useNowMs } from "./now";
import { OpenFindings } from "./open-findings";
import { RigPicture } from "./rig-picture";
import { RigStarts } from "./rig-starts";
import { RuledNotice } from "./ruled-notice";
import { lastWalkOf, openWalksOf, purposesFor, usualDepth } from "./rig-state";
import { Stale } from "./stale";
import { SaveTrouble } from "./save-trouble";
import { WingLink } from "./wing-link";

const words = fieldWords.rigs;

type RigCardProps = {
  rig: BundleRig;
  member: Member;
  walks: readonly KeptWalk[];
  /** The only rig: there is room to show it on a phone too. */
  alone: boolean;
};

/** A rig: how it stood last, and the walks that can be made of it. */
export function RigCard({ rig, member, walks, alone }: RigCardProps) {
  const title = useId();
  const starting = useRef(false);
  const [failed, setFailed] = useState<unknown>(null);
  const nowMs = useNowMs();
  const [chosen, setChosen] = useState<Depth | null>(null);
  const depth = chosen ?? usualDepth(rig, walks, nowMs);
  const open = openWalksOf(rig.id, walks);
  const last = lastWalkOf(rig, walks);
  const left = last !== null && stalenessOf(last, last.kept?.leftAt ?? null, nowMs) === "left";
  const purposes = purposesFor(member.organisation.kind);

  const start = async (purpose: Purpose) => {
    if (starting.current) return;
    starting.current = true;
    try {
      goTo({ walk: await startWalk(rig, { member: member.id, purpose, depth }) });
    } catch (error) {
      setFailed(error);
    }
    starting.current = false;
  };

  return (
    <section aria-labelledby={title} className="@container border-t-[3px] border-ink">
      <div className="grid gap-x-8 gap-y-3.5 px-4 py-4 @2xl:grid-cols-2 @2xl:py-6">
        <div className="flex min-w-0 flex-col gap-2.5">
          <h2 id={title} className="text-[1.75rem] leading-[1.1] font-extrabold tracking-[-0.01em]">
            {rig.name}
          </h2>
          <RuledNotice document={rig.revision.document} />
          {/* While a walk is open, what an earlier one came to would speak against it. */}
          {open.length === 0 && (
            <>
              <LastVerdict last={last} />
              <div className="-mx-4">
                <Stale last={last} kept={last?.kept ?? null} />
              </div>
            </>
          )}
          <OpenFindings rig={rig} />
          <div className={`mt-auto max-w-md pt-4 @2xl:block ${alone ? "" : "hidden"}`}>
            <RigPicture />
          </div>
        </div>
        <div className="-mx-1 flex flex-col gap-2.5">
          <SaveTrouble error={failed} />
          {open.map((walk) => (
            <GoOn key={walk.id} walk={walk} />
          ))}
          {open.length > 0 && <p className="px-1 pt-1 text-base text-soft">{words.another}</p>}
          <RigStarts
            rig={rig}
            purposes={left ? ["re-check", ...purposes.filter((each) => each !== "re-check")] : purposes}
            main={open.length === 0}
            depth={depth}
            onDepth={setChosen}
            onStart={start}
          />
          <WingLink paper={rig.id} className={buttonClass("quiet")}>
            {walkingWords.paper.open} <span className="sr-only">{words.ofRig(rig.name)}</span>
          </WingLink>
        </div>
      </div>
    </section>
  );
}
