import { useState } from "react";
import { Trouble } from "@/components/field/trouble";
import { Button } from "@/components/ui/button";
import { TextField } from "@/components/ui/text-field";
import { starterWords } from "@/lib/domain/messages/account";
import { STARTER, typedWords } from "@/lib/domain/starter";
import type { Draft } from "./draft";
import { QuestionHeading, type HeadingRef } from "./question-heading";

const words = starterWords.name;

type NameQuestionProps = {
  heading: HeadingRef;
  name: string;
  /** Why the rig was not kept. */
  trouble: string | null;
  onAnswer: (answered: Partial<Draft>) => void;
};

/** The last question: a name, which has a usual one, and the button that keeps the rig. */
export function NameQuestion({ heading, name: before, trouble, onAnswer }: NameQuestionProps) {
  const [name, setName] = useState(before);
  const [asked, setAsked] = useState(false);
  const missing = typedWords(name, STARTER.name) === "";
  return (
    <form
      noValidate
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        setAsked(true);
        if (!missing) onAnswer({ name });
      }}
    >
      <QuestionHeading heading={heading}>{words.ask}</QuestionHeading>
      <TextField
        className="px-4"
        size="field"
        label={words.label}
        value={name}
        maxLength={STARTER.name}
        autoComplete="off"
        error={asked && missing ? words.missing : undefined}
        onChange={(event) => setName(event.target.value)}
      />
      {trouble && <Trouble>{trouble}</Trouble>}
      <div className="grid px-3">
        <Button type="submit" variant="good" hint={words.saveHint}>
          {words.save}
        </Button>
      </div>
    </form>
  );
}
