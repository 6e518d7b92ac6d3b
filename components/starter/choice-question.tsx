import { PartDrawing } from "@/components/drawings/part-drawing";
import { Button } from "@/components/ui/button";
import { starterWords } from "@/lib/domain/messages/account";
import type { PartKey } from "@/lib/domain/revision";
import type { Choice, Draft } from "./draft";
import { QuestionHeading, type HeadingRef } from "./question-heading";

const pictures: Record<Choice, PartKey> = {
  hitch: "receiver",
  brake: "brake",
  airLine: "cord",
  lamps: "lamps",
  manual: "cabin",
};

type ChoiceQuestionProps = {
  heading: HeadingRef;
  question: Choice;
  /** The answer that was given before, when someone has gone back. */
  chosen: string | undefined;
  onAnswer: (answered: Partial<Draft>) => void;
};

/** A question that is answered by one tap. */
export function ChoiceQuestion({ heading, question, chosen, onAnswer }: ChoiceQuestionProps) {
  const { ask, choices } = starterWords[question];
  return (
    <>
      <QuestionHeading heading={heading}>{ask}</QuestionHeading>
      {/* Only where there is room: it is no answer, and its words stand in the question. */}
      <div aria-hidden="true" className="relative min-h-0 flex-1 overflow-hidden [&_.dr-callout]:hidden">
        <div className="absolute inset-0 flex justify-center py-3 *:h-full *:w-auto *:max-w-full">
          <PartDrawing part={pictures[question]} drawn="place" />
        </div>
      </div>
      <ul className="mt-4 flex flex-col gap-2.5 px-3">
        {Object.entries<{ label: string; hint?: string }>(choices).map(([value, { label, hint }]) => (
          <li key={value} className="grid">
            <Button
              variant={value === chosen ? "good" : "plain"}
              aria-pressed={value === chosen}
              hint={hint}
              className="min-h-22"
              onClick={() => onAnswer({ [question]: value })}
            >
              <span className="text-[1.375rem] leading-tight font-extrabold">{label}</span>
            </Button>
          </li>
        ))}
      </ul>
    </>
  );
}
