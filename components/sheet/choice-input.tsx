import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { optionWords } from "@/lib/domain/messages/sheet-wiring";
import type { InputProps } from "./field-line";
import { inputLook } from "./not-known";

type ChoiceInputProps = InputProps & {
  /** The answers; null asks for yes or no. */
  options: readonly string[] | null;
  /** A list to pick from, where buttons would take too much room. */
  asList: boolean;
};

const NOT_KNOWN = "?";

/** One of several answers, or not known. */
export function ChoiceInput({ options, asList, ...input }: ChoiceInputProps) {
  const answers: { key: string; label: string; value: unknown }[] = [
    ...(options
      ? options.map((option) => ({ key: option, label: optionWords[option] ?? option, value: option }))
      : [
          { key: "yes", label: words.yes, value: true },
          { key: "no", label: words.no, value: false },
        ]),
    { key: NOT_KNOWN, label: words.notKnown, value: null },
  ];
  const props = { ...input, answers };
  return asList ? <List {...props} /> : <Buttons {...props} />;
}

type AnswersProps = InputProps & { answers: { key: string; label: string; value: unknown }[] };

function List({ id, value, onChange, describedBy, invalid, answers }: AnswersProps) {
  const chosen = answers.find((answer) => answer.value === value);
  return (
    <select
      id={id}
      aria-labelledby={`${id}-label`}
      aria-describedby={describedBy}
      aria-invalid={invalid || undefined}
      value={chosen?.key ?? ""}
      onChange={({ target }) => {
        const picked = answers.find((answer) => answer.key === target.value);
        onChange(picked ? picked.value : "");
      }}
      className={`${inputLook(invalid)} ${chosen ? "" : "text-soft"}`}
    >
      <option value="">{words.choose}</option>
      {answers.map(({ key, label }) => (
        <option key={key} value={key}>
          {label}
        </option>
      ))}
    </select>
  );
}

/** As many answers beside each other as leave their words whole. */
function columnsFor(answers: AnswersProps["answers"]): string {
  if (answers.length > 3) return "grid-cols-[repeat(auto-fill,minmax(min(100%,10rem),1fr))]";
  const short = answers.every(({ key, label }) => key === NOT_KNOWN || label.length <= 5);
  return short
    ? "grid-cols-[repeat(auto-fit,minmax(min(100%,6.5rem),1fr))]"
    : "grid-cols-[repeat(auto-fit,minmax(min(100%,9rem),1fr))]";
}

function Buttons({ id, value, onChange, describedBy, invalid, answers }: AnswersProps) {
  return (
    <div
      id={id}
      tabIndex={-1}
      role="radiogroup"
      aria-labelledby={`${id}-label`}
      aria-describedby={describedBy}
      className={`grid gap-2 outline-none ${columnsFor(answers)} ${invalid ? "border-l-8 border-ink pl-2" : ""}`}
    >
      {answers.map(({ key, label: answer, value: means }) => (
        <label
          key={key}
          className={`group relative flex min-h-13 items-center gap-2 rounded-[3px] border-2 border-edge px-2.5 py-1.5 text-base leading-tight font-semibold has-checked:border-solid has-checked:border-ink has-checked:bg-ink has-checked:text-paper ${key === NOT_KNOWN ? "border-dashed" : ""}`}
        >
          {/* It lies over its label, so that the whole button shows the focus and takes the touch. */}
          <input
            type="radio"
            name={id}
            className="absolute -inset-0.5 cursor-pointer appearance-none rounded-[3px]"
            checked={means === value}
            onChange={() => onChange(means)}
          />
          <span
            aria-hidden="true"
            className="grid size-4.5 shrink-0 place-items-center rounded-full border-2 border-current"
          >
            <span className="hidden size-2 rounded-full bg-current group-has-checked:block" />
          </span>
          <span className="min-w-0">{answer}</span>
        </label>
      ))}
    </div>
  );
}
