import { Button, buttonClass } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { clockText } from "@/lib/client/time-words";
import { FieldFrame } from "./field-frame";
import { useScreenTitle } from "./screen-title";
import { StepList } from "./step-list";
import { WalkHead } from "./walk-head";
import { stepsOf } from "./walk-plan";
import { WalkStrip } from "./walk-strip";
import { WingLink } from "./wing-link";

const words = fieldWords.walk;

type ElsewhereScreenProps = { view: WalkView; walk: KeptWalk; onTakeUp: () => void };

/** A walk that another tab records: to be read, not to be marked. */
export function ElsewhereScreen({ view, walk, onTakeUp }: ElsewhereScreenProps) {
  useScreenTitle(words.elsewhereTitle);
  return (
    <FieldFrame>
      <WalkHead walk={walk} figure={clockText(view.replay.elapsedMs)} />
      <div className="px-4 pb-3">
        <WalkStrip view={view} />
      </div>
      <Notice tone="plain" title={words.elsewhereTitle}>
        {words.elsewhere}
      </Notice>
      <div className="grid grid-cols-2 gap-2.5 px-3 py-3 md:max-w-xl">
        <Button onClick={onTakeUp}>{words.takeUp}</Button>
        <WingLink className={buttonClass("quiet")}>{words.back}</WingLink>
      </div>
      <StepList
        steps={stepsOf(view.document, walk)}
        marks={view.replay.marks}
        note={({ station }, outcome) =>
          outcome ? `${station.title}. ${fieldWords.outcome[outcome]}` : station.title
        }
      />
    </FieldFrame>
  );
}
