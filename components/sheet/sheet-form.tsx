import { useEffect, useRef, useState } from "react";
import { FormProvider, useForm, useWatch, type FieldValues } from "react-hook-form";
import { DeskHeading } from "@/components/desk/desk-heading";
import type { KeptDraft } from "@/lib/client/sheet-draft";
import { sheetResolver } from "@/lib/client/sheet-resolver";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { sheetOf, withBlanks, type Draft } from "@/lib/domain/sheet/draft";
import { draftErrors, draftWarnings } from "@/lib/domain/sheet/draft-check";
import { progressOf, sectionKeys } from "@/lib/domain/sheet/draft-sections";
import { Contents } from "./contents";
import { DraftDeskContext } from "./draft-context";
import { KeepingLine } from "./keeping-line";
import { SectionBody } from "./section-body";
import { SectionSteps } from "./section-steps";
import { SheetPrint } from "./sheet-print";
import { useKeeper } from "./use-keeping";
import { useSection } from "./use-section";
import { Warnings } from "./warnings";

const AFTER_TAP_MS = 250;

type SheetFormProps = {
  start: KeptDraft;
  isNew: boolean;
  /** Whose draft this is from now on. */
  member: string | null;
};

/** The form of a sheet: one state, checked by the one shape, kept on this phone as it changes. */
export function SheetForm({ start, isNew, member }: SheetFormProps) {
  const [base, setBase] = useState({ base: start.base, baseSheet: start.baseSheet });
  const form = useForm<FieldValues>({ defaultValues: withBlanks(start.draft), resolver: sheetResolver });
  const values = useWatch({ control: form.control }) as Draft;
  const { keeper, keeping } = useKeeper();
  const { section, go, heading } = useSection();
  const [faults, setFaults] = useState(() => draftErrors(start.draft));
  const [warnings, setWarnings] = useState(() => draftWarnings(start.draft));
  const [generation, setGeneration] = useState(0);

  const check = () => {
    setFaults(draftErrors(form.getValues()));
    setWarnings(draftWarnings(form.getValues()));
    return form.trigger();
  };
  // Not while the tap that took the focus away is still on the glass: what is said of a field moves those below it.
  const soon = useRef<ReturnType<typeof setTimeout>>(undefined);
  const checkSoon = () => {
    clearTimeout(soon.current);
    soon.current = setTimeout(() => void check(), AFTER_TAP_MS);
  };
  useEffect(() => () => clearTimeout(soon.current), []);
  const read = (): KeptDraft => ({
    rig: start.rig,
    ...base,
    draft: form.getValues(),
    member,
    at: new Date().toISOString(),
  });
  const [begun] = useState(() => JSON.stringify(form.getValues()));
  const changed = useRef(false);
  useEffect(() => {
    changed.current ||= JSON.stringify(values) !== begun;
    if (changed.current) keeper.changed(read);
    // Only what was typed, or another base, makes it another draft.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [values, base]);
  // A draft that was begun before may hold what cannot be so, which is said at once.
  useEffect(() => {
    if (form.getValues("name")) void form.trigger();
  }, [form, generation]);

  const replace = (draft: Draft) => {
    form.reset(withBlanks(draft));
    setFaults(draftErrors(draft));
    setWarnings(draftWarnings(draft));
    setGeneration((now) => now + 1);
  };
  const sheet = sheetOf(values);
  const at = sectionKeys.indexOf(section);
  const { filled, of } = progressOf(sheet, section);
  return (
    <FormProvider {...form}>
      <DraftDeskContext value={{ rig: start.rig, isNew, sheet, generation, replace }}>
        <Warnings value={warnings}>
          <DeskHeading
            title={sheet.name ? words.editing(sheet.name) : isNew ? words.newTitle : words.title}
            sub={<KeepingLine keeping={keeping} />}
          />
          <SheetPrint />
          <div className="print:hidden @4xl:grid @4xl:grid-cols-[17rem_minmax(0,1fr)] @4xl:gap-8">
            <div className="hidden @4xl:sticky @4xl:top-4 @4xl:block @4xl:self-start">
              <Contents section={section} faults={faults} onGo={go} />
            </div>
            <form
              noValidate
              onSubmit={(event) => event.preventDefault()}
              onBlur={() => {
                checkSoon();
                void keeper.flush();
              }}
            >
              <details key={section} className="mb-4 border-y-hair border-rule @4xl:hidden">
                <summary className="flex min-h-13 flex-wrap items-center justify-between gap-x-3 font-semibold">
                  <span className="underline decoration-2 underline-offset-4">{words.contents}</span>
                  <span className="tabular">{words.place(at + 1, sectionKeys.length)}</span>
                </summary>
                <div className="pl-2.5">
                  <Contents section={section} faults={faults} onGo={go} />
                </div>
              </details>
              <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-4">
                <h2
                  ref={heading}
                  tabIndex={-1}
                  className="text-2xl leading-tight font-extrabold outline-none"
                >
                  {words.sections[section]}
                </h2>
                {of > 0 && <p className="tabular text-soft">{words.progress(filled, of)}</p>}
              </div>
              <SectionBody
                key={section}
                section={section}
                base={base}
                faults={faults}
                warnings={warnings}
                keeper={keeper}
                onCheck={check}
                onGo={go}
                onBase={setBase}
              />
              <SectionSteps at={at} onGo={go} />
            </form>
          </div>
        </Warnings>
      </DraftDeskContext>
    </FormProvider>
  );
}
