import { useEffect, useState, useSyncExternalStore } from "react";
import type { HeldWalk } from "@/lib/client/field";
import type { Recorder } from "@/lib/client/recorder";
import type { SyncView } from "@/lib/client/sync";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { takeUp } from "./browser-field";
import { CallOffScreen } from "./call-off-screen";
import { CarQuestion } from "./car-question";
import { BrakeIdleScreen } from "@/components/lamps/brake-idle-screen";
import { LampScreen } from "@/components/lamps/lamp-screen";
import type { CheckScreenProps } from "./check-frame";
import { CheckScreen } from "./check-screen";
import { ClosingScreen } from "./closing-screen";
import { ElsewhereScreen } from "./elsewhere-screen";
import { HeldScreen } from "./held-screen";
import { PlanScreen } from "./plan-screen";
import { ResumeScreen } from "./resume-screen";
import { useStoredWalk } from "./stored-walk";
import { VerdictScreen } from "./verdict-screen";
import { useWakeLock } from "./wake-lock";
import { MissingWalk, ReadingWalk, StoreRefused } from "./walk-notes";
import { placeIn, stepsOf } from "./walk-plan";

type WalkScreenProps = { sync: SyncView; walk: string; at: string | null };

/** One walk: recorded here, read while another tab records it, or closed. */
export function WalkScreen({ sync, walk: id, at }: WalkScreenProps) {
  const walk = sync.walks.find((kept) => kept.id === id);
  const [tries, setTries] = useState(0);
  const hold = useHold(sync.bundle?.member.id, walk?.seal === null ? id : null, tries);
  const stored = useStoredWalk(walk);

  if (sync.storeRefused) return <StoreRefused />;
  if (!sync.ready) return <ReadingWalk />;
  if (!walk || hold === null) return <MissingWalk />;
  if (typeof hold === "object") return <LiveWalk recorder={hold.recorder} walk={walk} sync={sync} at={at} />;
  if (stored && walk.seal) return <VerdictScreen view={stored} walk={walk} sync={sync} />;
  if (stored && hold === "elsewhere") {
    return <ElsewhereScreen view={stored} walk={walk} onTakeUp={() => setTries((before) => before + 1)} />;
  }
  return <ReadingWalk />;
}

/** Takes up an open walk once; undefined until that is decided. */
function useHold(member: string | undefined, walk: string | null, tries: number) {
  const [hold, setHold] = useState<HeldWalk | "elsewhere" | null>();
  useEffect(() => {
    if (!member || !walk) return;
    let current = true;
    takeUp(member, walk).then(
      (outcome) => current && setHold(outcome),
      () => current && setHold(null),
    );
    return () => {
      current = false;
    };
  }, [member, walk, tries]);
  return hold;
}

type LiveWalkProps = { recorder: Recorder; walk: KeptWalk; sync: SyncView; at: string | null };

function LiveWalk({ recorder, walk, sync, at }: LiveWalkProps) {
  const view = useSyncExternalStore(recorder.subscribe, recorder.view);
  const steps = stepsOf(view.document, view.walk);
  const props = { recorder, view, walk, steps };
  useLeaving(recorder);
  useWakeLock(view.walk.seal === null);
  const place = placeIn(view, steps, at);
  switch (place.kind) {
    case "closed":
      return <VerdictScreen view={view} walk={walk} sync={sync} />;
    case "call-off":
      return <CallOffScreen recorder={recorder} view={view} walk={walk} />;
    case "interrupted":
      return <ResumeScreen {...props} interruption={place.interruption} />;
    case "plan":
      return <PlanScreen {...props} />;
    case "car":
      return <CarQuestion recorder={recorder} view={view} walk={walk} />;
    case "held":
      return <HeldScreen {...props} />;
    case "closing":
      return <ClosingScreen {...props} />;
    case "check":
      return <CheckOfKind {...props} step={place.step} />;
  }
}

/** A check in the way that its kind is looked at. */
function CheckOfKind(props: CheckScreenProps) {
  switch (props.step.check.kind) {
    case "lamps":
      return <LampScreen key={props.step.check.key} {...props} />;
    case "brake-idle":
      return <BrakeIdleScreen key={props.step.check.key} {...props} />;
    case "look":
      return <CheckScreen {...props} />;
  }
}

/** A page that comes back into sight after long is a walk that was left. */
function useLeaving(recorder: Recorder): void {
  useEffect(() => {
    let hiddenAtMs: number | null = null;
    const follow = () => {
      if (document.visibilityState === "hidden") hiddenAtMs = Date.now();
      else if (hiddenAtMs !== null) recorder.returned(Math.max(0, Date.now() - hiddenAtMs));
    };
    document.addEventListener("visibilitychange", follow);
    return () => document.removeEventListener("visibilitychange", follow);
  }, [recorder]);
}
