import type { Recorder, WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { CLOSING, moveTo } from "./address";
import { CallOff } from "./call-off";
import { FieldFrame } from "./field-frame";
import { useScreenTitle } from "./screen-title";
import { WalkHead } from "./walk-head";
import { WalkStrip } from "./walk-strip";
import { WalkTimer } from "./walk-timer";

type CallOffScreenProps = { recorder: Recorder; view: WalkView; walk: KeptWalk };

/** A walk that is called off: why, and then it is closed as it stands. */
export function CallOffScreen({ recorder, view, walk }: CallOffScreenProps) {
  useScreenTitle(fieldWords.walk.title(walk.purpose, walk.rigName));
  return (
    <FieldFrame>
      <WalkHead walk={walk} figure={<WalkTimer elapsedMs={recorder.elapsedMs} />} />
      <div className="px-4 pb-4">
        <WalkStrip view={view} />
      </div>
      <div className="border-t-hair border-rule px-3 pt-4 md:max-w-2xl">
        <CallOff recorder={recorder} walk={walk.id} onBack={() => moveTo({ walk: walk.id, at: CLOSING })} />
      </div>
    </FieldFrame>
  );
}
