import { useState } from "react";
import { Button, buttonClass } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { SyncView } from "@/lib/client/sync";
import type { Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { goTo } from "./address";
import { startPaperWalk } from "./browser-field";
import { FieldFrame, LargeTitle } from "./field-frame";
import { PaperCard } from "./paper-card";
import { purposesFor } from "./rig-state";
import { useScreenTitle } from "./screen-title";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { ReadingWalk } from "./walk-notes";
import { WingLink } from "./wing-link";

const words = walkingWords.paper;

/** A rig's cards: to be printed for a phone that may be dead, and to be entered when it is not. */
export function PaperScreen({ sync, rig: id }: { sync: SyncView; rig: string }) {
  const [chosen, setChosen] = useState<{ purpose: Purpose; act: "print" | "enter" } | null>(null);
  useScreenTitle(words.title);
  const rig = sync.bundle?.rigs.find((each) => each.id === id);
  if (!sync.bundle || !rig) return <ReadingWalk />;
  const { member } = sync.bundle;
  const back = () => setChosen(null);
  if (chosen?.act === "print") return <PaperCard rig={rig} purpose={chosen.purpose} onBack={back} />;
  if (chosen) return <PaperStart rig={rig} member={member.id} purpose={chosen.purpose} onBack={back} />;
  return (
    <FieldFrame>
      <LargeTitle>{words.title}</LargeTitle>
      <p className="px-4 pb-4">{words.lead}</p>
      <ul className="border-t-hair border-rule">
        {purposesFor(member.organisation.kind).map((purpose) => (
          <li key={purpose} className="acts-two border-b-hair border-rule px-3 py-2.5">
            <Button onClick={() => setChosen({ purpose, act: "print" })}>{words.print(purpose)}</Button>
            <Button onClick={() => setChosen({ purpose, act: "enter" })}>{words.enter(purpose)}</Button>
          </li>
        ))}
      </ul>
      <div className="px-3 pt-3">
        <WingLink className={`${buttonClass("quiet")} w-full`}>{words.back}</WingLink>
      </div>
    </FieldFrame>
  );
}

type PaperStartProps = { rig: BundleRig; member: string; purpose: Purpose; onBack: () => void };

/** When a card was filled in; then its marks are entered one by one. */
function PaperStart({ rig, member, purpose, onBack }: PaperStartProps) {
  const [when, setWhen] = useState("");
  const { take, error } = useTaking();
  const start = () =>
    take(async () => goTo({ walk: await startPaperWalk(rig, { member, purpose, depth: "full" }, when) }));
  return (
    <FieldFrame>
      <LargeTitle>{words.enter(purpose)}</LargeTitle>
      <div className="flex flex-col gap-4 px-4 md:max-w-xl">
        <TextField
          size="field"
          type="datetime-local"
          label={words.when}
          hint={words.whenHint}
          value={when}
          onChange={(event) => setWhen(event.target.value)}
        />
        <SaveTrouble error={error} />
        <div className="acts-two">
          <Button variant="good" onClick={start}>
            {words.start}
          </Button>
          <Button variant="quiet" onClick={onBack}>
            {words.back}
          </Button>
        </div>
      </div>
    </FieldFrame>
  );
}
