import { useId } from "react";
import { holdChoicesMs, type HoldMs } from "@/lib/domain/lamp-script";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";

const words = lampScriptWords.bar;

type HoldChoiceProps = { hold: number; onHold: (hold: HoldMs) => void };

/** How long each signal is held: the same on both phones. */
export function HoldChoice({ hold, onHold }: HoldChoiceProps) {
  const name = useId();
  return (
    <fieldset className="flex flex-wrap">
      <legend className="pb-1.5 text-[1.0625rem] font-semibold">{words.hold}</legend>
      {holdChoicesMs.map((each) => (
        <label
          key={each}
          className="flex min-h-field flex-1 items-center justify-center border-2 border-edge px-1 text-center text-xl whitespace-nowrap leading-tight font-semibold not-last:-mr-0.5 first-of-type:rounded-l-[3px] last-of-type:rounded-r-[3px] has-checked:border-ink has-checked:bg-ink has-checked:text-paper has-focus-visible:relative has-focus-visible:outline-4 has-focus-visible:outline-offset-2 has-focus-visible:outline-now"
        >
          <input
            type="radio"
            name={name}
            className="sr-only"
            aria-label={words.spokenSeconds(each / 1000)}
            checked={hold === each}
            onChange={() => onHold(each)}
          />
          {words.seconds(each / 1000)}
        </label>
      ))}
    </fieldset>
  );
}
