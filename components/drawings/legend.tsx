import type { CalledOut } from "@/lib/domain/callouts";
import { type CalloutLetter, legendWords } from "@/lib/domain/messages/drawings";
import type { Shown } from "./shown";

type LegendProps = Shown & {
  callouts: readonly CalledOut[];
  where: "beside" | "below";
  onCallout?: (letter: CalloutLetter) => void;
};

/**
 * What the letters on a drawing stand for, in text that grows with the person's own size. It stands in for the labels
 * on the drawing wherever those are too small to read, and is not there otherwise.
 */
export function Legend({ callouts, where, marked, effect, figures, onCallout }: LegendProps) {
  return (
    <ul aria-label={legendWords.list} className={`dr-legend dr-legend-${where}`}>
      {callouts.map(({ letter, text }) => {
        const isMarked = marked?.includes(letter) ?? false;
        return (
          <li
            key={letter}
            onClick={onCallout && (() => onCallout(letter))}
            className={`dr-legend-row ${isMarked ? `dr-marked dr-marked-${effect ?? "fix"}` : ""}`}
          >
            <span className="dr-legend-letter">{letter}</span>
            <span className="dr-legend-text">
              {text}
              {isMarked && <span className="sr-only">, {legendWords.marked}</span>}
              {figures?.[letter] && <span className="dr-legend-figure">{figures[letter]}</span>}
            </span>
          </li>
        );
      })}
    </ul>
  );
}
