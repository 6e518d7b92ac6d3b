import { useEffect, useRef, useState, type FormEvent } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Marking } from "./marking";
import { fixedBecause } from "./walk-plan";

const words = fieldWords.because;

/** Why a hold that was marked fault is good now: a mis-tap, or what was done about it. */
export function BecauseQuestion({ marking }: { marking: Marking }) {
  const fixed = marking.asking === "what";
  const [text, setText] = useState("");
  const [empty, setEmpty] = useState(false);
  const heading = useRef<HTMLParagraphElement>(null);
  useEffect(() => heading.current?.focus(), [fixed]);

  const save = (event: FormEvent) => {
    event.preventDefault();
    const because = fixedBecause(text);
    setEmpty(because === null);
    if (because) void marking.mark("good", { because });
  };

  return (
    <section aria-labelledby="because-title" className="flex flex-col gap-2.5">
      <p id="because-title" ref={heading} tabIndex={-1} className="px-1 text-xl leading-snug font-extrabold">
        {fixed ? words.what : words.title}
      </p>
      {fixed ? (
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
          <div className="flex flex-wrap gap-2.5">
            <Button variant="quiet" className="min-w-25 flex-1" onClick={() => marking.ask("why")}>
              {words.back}
            </Button>
            <Button type="submit" className="min-w-[min(100%,10.5rem)] flex-2">
              {words.save}
            </Button>
          </div>
        </form>
      ) : (
        <div className="flex flex-wrap gap-2.5">
          <Button
            className="min-h-primary min-w-[min(100%,9rem)] flex-1 text-xl"
            onClick={() => marking.mark("good", { because: "mis-tap" })}
          >
            {words.misTap}
          </Button>
          <Button
            className="min-h-primary min-w-[min(100%,9rem)] flex-1 text-xl"
            onClick={() => marking.ask("what")}
          >
            {words.fixed}
          </Button>
          <Button variant="quiet" className="basis-full" onClick={() => marking.ask(null)}>
            {words.cancel}
          </Button>
        </div>
      )}
    </section>
  );
}
