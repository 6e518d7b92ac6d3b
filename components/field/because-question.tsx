import { useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Marking } from "./marking";
import { Question } from "./question";
import { fixedBecause } from "./walk-plan";

const words = fieldWords.because;

/** Why a hold that was marked fault is good now: a mis-tap, or what was done about it. */
export function BecauseQuestion({ marking }: { marking: Marking }) {
  if (marking.asking === "what") return <WhatWasDone marking={marking} />;
  return (
    <Question id="because" title={words.title}>
      <div className="acts-two">
        <Button
          className="min-h-primary text-xl"
          onClick={() => marking.mark("good", { because: "mis-tap" })}
        >
          {words.misTap}
        </Button>
        <Button className="min-h-primary text-xl" onClick={() => marking.ask("what")}>
          {words.fixed}
        </Button>
        <Button variant="quiet" className="col-span-full" onClick={() => marking.ask(null)}>
          {words.cancel}
        </Button>
      </div>
    </Question>
  );
}

function WhatWasDone({ marking }: { marking: Marking }) {
  const [text, setText] = useState("");
  const [empty, setEmpty] = useState(false);
  const save = (event: FormEvent) => {
    event.preventDefault();
    const because = fixedBecause(text);
    setEmpty(because === null);
    if (because) void marking.mark("good", { because });
  };
  return (
    <Question id="what" title={words.what}>
      <form onSubmit={save} noValidate className="flex flex-col gap-2.5">
        <div className="flex flex-wrap gap-2.5">
          {words.quick.map((quick) => (
            <Button
              key={quick}
              className="min-w-25 flex-1"
              onClick={() => marking.mark("good", { because: fixedBecause(quick)! })}
            >
              {quick}
            </Button>
          ))}
        </div>
        <TextField
          size="field"
          label={words.own}
          value={text}
          maxLength={200}
          error={empty ? words.empty : undefined}
          onChange={(event) => setText(event.target.value)}
        />
        <div className="acts-two">
          <Button variant="quiet" onClick={() => marking.ask("why")}>
            {words.back}
          </Button>
          <Button type="submit">{words.save}</Button>
        </div>
      </form>
    </Question>
  );
}
