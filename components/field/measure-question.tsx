import { useState } from "react";
import { Button } from "@/components/ui/button";
import { walkingWords } from "@/lib/domain/messages/walking";
import type { Measure } from "@/lib/domain/revision";
import type { Marking } from "./marking";
import { usePreferences } from "@/components/settings/use-preferences";
import { fromEntered, unitFor } from "@/lib/domain/units";
import { Question } from "./question";

const words = walkingWords.measure;
const digits = ["1", "2", "3", "4", "5", "6", "7", "8", "9", ".", "0"];
const LONGEST = 7;

/** What a gauge reads, tapped on large keys in the person's own units. */
export function MeasureQuestion({ measure, marking }: { measure: Measure; marking: Marking }) {
  const [text, setText] = useState("");
  const [empty, setEmpty] = useState(false);
  const { units } = usePreferences();
  const unit = unitFor(measure.quantity, units);
  const press = (key: string) => {
    setEmpty(false);
    setText((now) => (now.length >= LONGEST || (key === "." && now.includes(".")) ? now : now + key));
  };
  const save = async () => {
    const value = Number(text);
    if (text === "" || !Number.isFinite(value)) return setEmpty(true);
    await marking.amend({ measured: fromEntered(measure.quantity, value, units) });
    marking.skip();
  };
  return (
    <Question id="measure" title={measure.ask}>
      <p aria-live="polite" className="tabular px-1 text-[2rem] leading-none font-semibold">
        {words.entered(text, unit)}
      </p>
      {measure.beside && <p className="px-1 text-base text-soft">{measure.beside}</p>}
      {empty && <p className="px-1 font-semibold">{words.empty}</p>}
      <div role="group" aria-label={words.keypad} className="grid grid-cols-3 gap-2">
        {digits.map((key) => (
          <Button
            key={key}
            aria-label={key === "." ? words.point : undefined}
            className="tabular text-2xl"
            onClick={() => press(key)}
          >
            {key}
          </Button>
        ))}
        <Button aria-label={words.erase} onClick={() => setText((now) => now.slice(0, -1))}>
          ←
        </Button>
      </div>
      <div className="acts-two">
        <Button variant="good" onClick={save}>
          {words.save}
        </Button>
        <Button variant="quiet" onClick={marking.skip}>
          {words.skip}
        </Button>
      </div>
    </Question>
  );
}
