import { useEffect, useEffectEvent, useState } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { Recorder } from "@/lib/client/recorder";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";
import { walkingWords } from "@/lib/domain/messages/walking";
import type { Check } from "@/lib/domain/revision";
import { CheckPhotos } from "./check-photos";
import type { Callouts } from "./callouts";
import type { Marking } from "./marking";
import { Question } from "./question";
import { plainText } from "@/lib/domain/json";

const words = walkingWords.details;

/** How long the typing rests before the words are kept. */
const PAUSE_MS = 700;

type FaultDetailsProps = {
  recorder: Recorder;
  check: Check;
  callouts: Callouts;
  marking: Marking;
  onMended?: () => void;
};

/** After a fault is saved: what is wrong, by touch or in words. None of it is needed to go on. */
export function FaultDetails({ recorder, check, callouts, marking, onMended }: FaultDetailsProps) {
  const called = callouts.all.length > 0;
  const [text, setText] = useState(callouts.own);
  const said = plainText(text);
  const { own, say } = callouts;
  const keep = useEffectEvent(() => void say(said));
  useEffect(() => {
    if (said === own) return;
    const timer = setTimeout(keep, PAUSE_MS);
    return () => clearTimeout(timer);
  }, [said, own]);
  const goOn = async () => {
    if (said !== own) await say(said);
    marking.skip();
  };
  return (
    <Question id="details" title={called ? words.title : words.titlePlace}>
      {check.effect === "hold" && <p className="px-1 font-extrabold text-hold">{words.hold}</p>}
      {called && (
        <div className="acts-two">
          {callouts.all.map(({ letter, text: label }) => (
            <Callout key={letter} letter={letter} label={label} callouts={callouts} />
          ))}
        </div>
      )}
      <Button variant="good" onClick={goOn}>
        {words.goOn}
      </Button>
      <div className="pt-2">
        <TextField
          size="field"
          label={words.own}
          hint={words.ownHint}
          value={text}
          maxLength={500}
          enterKeyHint="done"
          onChange={(event) => setText(event.target.value)}
        />
      </div>
      <CheckPhotos recorder={recorder} check={check.key} />
      {!check.ruled && (
        <div className="acts-two">
          <Button variant="quiet" onClick={() => marking.mark("good", { because: "mis-tap" })}>
            {words.misTap}
          </Button>
          {check.effect === "hold" && (
            <Button variant="quiet" onClick={onMended ?? (() => marking.ask("what"))}>
              {words.mended}
            </Button>
          )}
        </div>
      )}
    </Question>
  );
}

type CalloutProps = { letter: CalloutLetter; label: string; callouts: Callouts };

function Callout({ letter, label, callouts }: CalloutProps) {
  const chosen = callouts.chosen.includes(letter);
  return (
    <button
      type="button"
      aria-pressed={chosen}
      onClick={() => callouts.touch(letter)}
      className={`flex min-h-field items-center gap-3 rounded-[3px] border-2 px-3 py-2 text-left text-[1.0625rem] leading-tight font-semibold ${
        chosen ? "border-ink bg-ink text-paper" : "border-edge active:bg-shade"
      }`}
    >
      <span
        aria-hidden="true"
        className="tabular flex size-9 shrink-0 items-center justify-center rounded-full border-2 border-current"
      >
        {letter}
      </span>
      {label}
    </button>
  );
}
