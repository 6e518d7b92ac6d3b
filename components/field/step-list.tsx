import type { Outcome } from "@/lib/domain/entry";
import { segmentOf } from "@/lib/domain/walk-reading";
import type { Marks, Step } from "./walk-plan";

type StepListProps = {
  steps: readonly Step[];
  marks: Marks;
  /** What a row says under its ask. */
  note: (step: Step, outcome: Outcome | undefined) => string;
  /** Where a touch on a row leads; rows are plain text without it. */
  onStep?: (step: Step) => void;
};

/** Checks as rows, each with its segment of tape. */
export function StepList({ steps, marks, note, onStep }: StepListProps) {
  return (
    <ul className="border-t-hair border-rule">
      {steps.map((step) => {
        const { check } = step;
        const outcome = marks.get(check.key)?.outcome;
        const row = (
          <>
            <span aria-hidden="true" className="tape flex h-6.5 w-4 shrink-0">
              <span className={`tape-seg tape-${segmentOf(check, outcome)}`} />
            </span>
            <span className="min-w-0 flex-1">
              <span className="block leading-snug font-semibold">{check.ask}</span>
              <span className="block text-base text-soft">{note(step, outcome)}</span>
            </span>
            <span className="tabular text-base text-soft">{step.place}</span>
          </>
        );
        const look = "flex min-h-field w-full items-center gap-3 px-4 py-2 text-left";
        return (
          <li key={check.key} className="border-b-hair border-rule">
            {onStep ? (
              <button type="button" onClick={() => onStep(step)} className={`${look} active:bg-shade`}>
                {row}
              </button>
            ) : (
              <div className={look}>{row}</div>
            )}
          </li>
        );
      })}
    </ul>
  );
}
