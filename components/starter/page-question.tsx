import { useState } from "react";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { starterWords } from "@/lib/domain/messages/account";
import { STARTER, typedWords } from "@/lib/domain/starter";
import type { Draft } from "./draft";
import { OwnWords } from "./own-words";
import { QuestionHeading, type HeadingRef } from "./question-heading";

const words = starterWords.page;

type PageQuestionProps = { heading: HeadingRef; draft: Draft; onAnswer: (answered: Partial<Draft>) => void };

/** The page of the car's own manual and the end state that it names, in the words of whoever read it. */
export function PageQuestion({ heading, draft, onAnswer }: PageQuestionProps) {
  const [page, setPage] = useState(draft.page);
  const [endState, setEndState] = useState(draft.endState);
  const [asked, setAsked] = useState(false);
  const noPage = typedWords(page, STARTER.page) === "";
  const noEndState = typedWords(endState, STARTER.endState) === "";
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setAsked(true);
        if (!noPage && !noEndState) onAnswer({ page, endState });
      }}
    >
      <div>
        <QuestionHeading heading={heading}>{words.ask}</QuestionHeading>
        <p className="px-4 pt-1 text-soft">{words.lead}</p>
      </div>
      <TextField
        className="px-4"
        size="field"
        label={words.page}
        value={page}
        maxLength={STARTER.page}
        autoComplete="off"
        error={asked && noPage ? words.pageMissing : undefined}
        onChange={(event) => setPage(event.target.value)}
      />
      <OwnWords
        label={words.endState}
        hint={words.endStateHint}
        value={endState}
        maxLength={STARTER.endState}
        error={asked && noEndState ? words.endStateMissing : undefined}
        onChange={setEndState}
      />
      <div className="grid px-3">
        <Button type="submit" variant="good">
          {starterWords.next}
        </Button>
      </div>
    </form>
  );
}
