import { useRef, useState } from "react";
import { Button, buttonClass } from "@/components/ui/button";
import { goTo, moveTo, NEW_RIG } from "@/components/field/address";
import { theField } from "@/components/field/browser-field";
import { useArrival, useScreenTitle } from "@/components/field/screen-title";
import { useSettled } from "@/components/field/settling";
import { WingLink } from "@/components/field/wing-link";
import { Strip } from "@/components/tape/strip";
import { keepRig, TooManyRigs } from "@/lib/client/local-rigs";
import { localWords, starterWords as words } from "@/lib/domain/messages/account";
import { starterDocument } from "@/lib/domain/starter";
import { ChoiceQuestion } from "./choice-question";
import { answersOf, emptyDraft, placeOf, questionAfter, questionBefore, stripOf } from "./draft";
import type { Draft, Question } from "./draft";
import { NameQuestion } from "./name-question";
import { PageQuestion } from "./page-question";

/** Makes a rig on the phone without an account: one question at a time, kept in one transaction at the end. */
export function NewRig() {
  const [question, setQuestion] = useState<Question>("hitch");
  const [draft, setDraft] = useState(emptyDraft);
  const [trouble, setTrouble] = useState<string | null>(null);
  const saving = useRef(false);
  const heading = useRef<HTMLHeadingElement>(null);
  const settled = useSettled(question);
  useScreenTitle(words.title);
  useArrival(heading, question);

  const show = (next: Question) => {
    setQuestion(next);
    window.scrollTo(0, 0);
  };
  const goOn = (answered: Partial<Draft>) => {
    if (!settled()) return;
    const after = { ...draft, ...answered };
    setDraft(after);
    const next = questionAfter(question, after);
    if (next) show(next);
    else void save(after);
  };
  const save = async (finished: Draft) => {
    const answers = answersOf(finished);
    if (!answers || saving.current) return;
    saving.current = true;
    setTrouble(null);
    try {
      const { sync } = theField();
      const document = starterDocument(answers);
      await keepRig(sync.shelf.store, { name: answers.name, document, madeAt: new Date().toISOString() });
      await sync.saved();
      moveTo({});
    } catch (error) {
      setTrouble(error instanceof TooManyRigs ? localWords.full : words.name.notSaved);
    }
    saving.current = false;
  };
  const before = questionBefore(question, draft);
  const { place, total } = placeOf(question);

  return (
    <main className="mx-auto flex min-h-dvh w-full max-w-[40rem] flex-col">
      <header className="flex flex-wrap items-baseline justify-between gap-x-4 px-4 pt-4 pb-2.5">
        <h1 className="text-[1.375rem] leading-[1.1] font-extrabold">{words.title}</h1>
        <p className="tabular">{words.place(place, total)}</p>
      </header>
      <div className="px-4 pb-3">
        <Strip stations={stripOf(question)} label={words.strip(place, total)} />
      </div>
      <div className="flex flex-1 flex-col border-t-hair border-rule pt-4">
        {question === "page" ? (
          <PageQuestion heading={heading} draft={draft} onAnswer={goOn} />
        ) : question === "name" ? (
          <NameQuestion heading={heading} name={draft.name} trouble={trouble} onAnswer={goOn} />
        ) : (
          <ChoiceQuestion heading={heading} question={question} chosen={draft[question]} onAnswer={goOn} />
        )}
      </div>
      {question === "hitch" && <p className="px-4 pt-4 text-base text-soft">{words.plain}</p>}
      <div className="grid grid-cols-[repeat(auto-fit,minmax(min(100%,8rem),1fr))] gap-2.5 px-3 pt-6 pb-[max(1rem,env(safe-area-inset-bottom))]">
        <Button variant="quiet" disabled={!before} onClick={() => before && settled() && show(before)}>
          {words.back}
        </Button>
        <WingLink className={buttonClass("quiet")}>{words.leave}</WingLink>
      </div>
    </main>
  );
}

/** Opens {@link NewRig}. */
export function startNewRig(): void {
  goTo({ at: NEW_RIG });
}
