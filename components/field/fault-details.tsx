import { useState, type FormEvent } from "react";
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
import { plainText } from "./walk-plan";

const words = walkingWords.details;

type FaultDetailsProps = { recorder: Recorder; check: Check; callouts: Callouts; marking: Marking };

/** After a fault is saved: what is wrong, by touch or in words. None of it is needed to go on. */
export function FaultDetails({ recorder, check, callouts, marking }: FaultDetailsProps) {
  const called = callouts.all.length > 0;
  const [text, setText] = useState(callouts.own);
  const keep = (event: FormEvent) => {
    event.preventDefault();
    void callouts.say(plainText(text));
  };
  const goOn = async () => {
    if (plainText(text) !== callouts.own) await callouts.say(plainText(text));
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
      <form onSubmit={keep} className="flex flex-col gap-2.5 pt-2">
        <TextField
          size="field"
          label={words.own}
          hint={words.ownHint}
          value={text}
          maxLength={500}
          enterKeyHint="done"
          onChange={(event) => setText(event.target.value)}
        />
        {plainText(text) !== callouts.own && <Button type="submit">{words.keep}</Button>}
      </form>
      <CheckPhotos recorder={recorder} check={check.key} />
      <div className="acts-two">
        <Button variant="quiet" onClick={() => marking.mark("good", { because: "mis-tap" })}>
          {words.misTap}
        </Button>
        {check.effect === "hold" && (
          <Button variant="quiet" onClick={() => marking.ask("what")}>
            {words.mended}
          </Button>
        )}
      </div>
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
