import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import type { Recorder } from "@/lib/client/recorder";
import { walkingWords } from "@/lib/domain/messages/walking";
import { moveTo } from "./address";
import { Question } from "./question";
import { useSettled } from "./settling";
import { useTaking } from "./taking";
import { SaveTrouble } from "./save-trouble";
import { plainText } from "@/lib/domain/json";

const words = walkingWords.stop;

/** Why a walk is called off; it is then closed and signed as it stands. */
export function CallOff({
  recorder,
  walk,
  onBack,
}: {
  recorder: Recorder;
  walk: string;
  onBack: () => void;
}) {
  const [text, setText] = useState("");
  const [empty, setEmpty] = useState(false);
  const settled = useSettled("call-off");
  const { take, error } = useTaking(settled);

  const callOff = (reason: string) =>
    take(async () => {
      if (recorder.view().interruption) await recorder.resume([]);
      await recorder.note(words.noteOf(reason));
      await recorder.close();
      moveTo({ walk });
    });
  const save = (event: FormEvent) => {
    event.preventDefault();
    const reason = plainText(text);
    setEmpty(reason === "");
    if (reason !== "") callOff(reason);
  };

  return (
    <Question id="call-off" title={words.why}>
      <p className="px-1 text-base text-soft">{words.whyNote}</p>
      <SaveTrouble error={error} held={recorder.held} />
      <div className="acts-two">
        {words.reasons.map((reason) => (
          <Button key={reason} onClick={() => callOff(reason)}>
            {reason}
          </Button>
        ))}
      </div>
      <form onSubmit={save} noValidate className="flex flex-col gap-2.5">
        <TextField
          size="field"
          label={words.own}
          value={text}
          maxLength={200}
          error={empty ? words.empty : undefined}
          onChange={(event) => setText(event.target.value)}
        />
        <div className="acts-two">
          <Button variant="quiet" onClick={onBack}>
            {words.back}
          </Button>
          <Button type="submit">{words.save}</Button>
        </div>
      </form>
    </Question>
  );
}
