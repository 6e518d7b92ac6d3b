import { memo, type ReactNode } from "react";
import { useController } from "react-hook-form";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { FieldWords } from "@/lib/domain/messages/sheet-vehicles";
import type { Field } from "@/lib/domain/sheet/field";
import { ChoiceInput } from "./choice-input";
import { PhotoInput } from "./photo-input";
import { fieldId } from "./places";
import { QuantityInput } from "./quantity-input";
import { TypedInput } from "./typed-input";
import { useWarning } from "./warnings";

/** What every kind of input is given. An empty text is nothing yet, null is not known. */
export interface InputProps {
  id: string;
  label: string;
  value: unknown;
  onChange: (value: unknown) => void;
  /** The ids of what is said about it. */
  describedBy: string | undefined;
  invalid: boolean;
  /** Not known is no answer. */
  required: boolean;
}

type FieldLineProps = {
  name: string;
  field: Field;
  words: FieldWords;
  /** In a row of a list: where to find it is said once, above the rows. */
  compact?: boolean;
  required?: boolean;
};

/** One field of the sheet: what it is called, where on the vehicle it is found, its input, and what is wrong with it. */
export const FieldLine = memo(function FieldLine({
  name,
  field,
  words: of,
  compact = false,
  required = false,
}: FieldLineProps) {
  const { field: control, fieldState } = useController({ name });
  const warning = useWarning(name);
  const id = fieldId(name);
  const error = fieldState.error?.message;
  const notes = [!compact && `${id}-where`, (error || warning) && `${id}-note`].filter(Boolean).join(" ");
  const input: InputProps = {
    id,
    label: of.label,
    value: control.value === undefined ? "" : control.value,
    onChange: control.onChange,
    describedBy: notes || undefined,
    invalid: error !== undefined,
    required,
  };
  return (
    <div className={compact ? "min-w-0" : "border-b border-rule py-4"}>
      <div className="flex items-start justify-between gap-3">
        {labels(field, id, of.label)}
        {hasButtons(field, compact) && (
          <Clear label={of.label} shown={input.value !== ""} onClear={() => control.onChange("")} />
        )}
      </div>
      {!compact && (
        <p id={`${id}-where`} className="mb-2 max-w-prose text-base leading-snug text-soft">
          {of.where}
        </p>
      )}
      {inputFor(field, input, compact)}
      {(error || warning) && (
        <p
          id={`${id}-note`}
          className={`mt-2 border-l-8 pl-3 leading-snug ${error ? "border-ink font-semibold" : "border-now"}`}
        >
          {!error && <span className="font-semibold">{words.look}</span>}
          {error ?? warning}
        </p>
      )}
    </div>
  );
});

function labels({ kind }: Field, id: string, label: string): ReactNode {
  const look = "block leading-snug font-semibold";
  // Radio buttons and photographs are groups, which are named rather than labelled.
  return kind === "yes-no" || kind === "choice" || kind === "photo" ? (
    <p id={`${id}-label`} className={look}>
      {label}
    </p>
  ) : (
    <label htmlFor={id} className={look}>
      {label}
    </label>
  );
}

function hasButtons(field: Field, compact: boolean): boolean {
  return field.kind === "yes-no" || (field.kind === "choice" && !compact && field.of.length <= 4);
}

type ClearProps = { label: string; shown: boolean; onClear: () => void };

/** Takes an answer back. Its place stays where there is none, so that nothing jumps under a thumb. */
function Clear({ label, shown, onClear }: ClearProps) {
  return (
    <button
      type="button"
      aria-label={words.clearAloud(label)}
      onClick={onClear}
      className={`-my-2.5 min-h-11 shrink-0 px-2 text-base underline underline-offset-4 ${shown ? "" : "invisible"}`}
    >
      {words.clear}
    </button>
  );
}

function inputFor(field: Field, input: InputProps, compact: boolean): ReactNode {
  switch (field.kind) {
    case "text":
    case "year":
    case "count":
    case "date":
      return <TypedInput {...input} field={field} />;
    case "choice":
      return <ChoiceInput {...input} options={field.of} asList={!hasButtons(field, compact)} />;
    case "yes-no":
      return <ChoiceInput {...input} options={null} asList={false} />;
    case "photo":
      return <PhotoInput {...input} />;
    default:
      return <QuantityInput {...input} kind={field.kind} />;
  }
}
