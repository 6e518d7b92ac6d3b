import { plainText } from "@/lib/domain/json";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { Field } from "@/lib/domain/sheet/field";
import type { InputProps } from "./field-line";
import { inputLook, NotKnown } from "./not-known";

type TypedInputProps = InputProps & { field: Extract<Field, { kind: "text" | "year" | "count" | "date" }> };

/** Words, a year, a count or a date, typed in. A count that is none stays the text that was typed. */
export function TypedInput({ field, ...input }: TypedInputProps) {
  const { id, label, value, onChange, describedBy, invalid, required } = input;
  const notKnown = value === null;
  const counts = field.kind === "count" || field.kind === "year";
  const shared = {
    id,
    value: notKnown ? "" : String(value),
    disabled: notKnown,
    placeholder: notKnown ? words.notKnown : undefined,
    "aria-invalid": invalid || undefined,
    "aria-describedby": describedBy,
    className: inputLook(invalid),
    autoComplete: "off",
  };
  const typed = (text: string) => onChange(counts ? countOf(text) : text);
  // Only when it is left: a space between two words is typed before the second one.
  const left = (text: string) =>
    field.kind === "text" && tidy(text, field) !== text && onChange(tidy(text, field));
  return (
    <NotKnown label={label} value={value} onChange={onChange} never={required}>
      {field.kind === "text" && field.lines ? (
        <textarea
          {...shared}
          rows={4}
          maxLength={field.most}
          onChange={({ target }) => typed(target.value)}
          onBlur={({ target }) => left(target.value)}
        />
      ) : (
        <input
          {...shared}
          type={field.kind === "date" ? "date" : "text"}
          inputMode={counts ? "numeric" : undefined}
          maxLength={field.kind === "text" ? field.most : undefined}
          onChange={({ target }) => typed(target.value)}
          onBlur={({ target }) => left(target.value)}
        />
      )}
    </NotKnown>
  );
}

function countOf(text: string): number | string {
  const plain = text.trim();
  return /^-?\d{1,15}$/.test(plain) ? Number(plain) : plain;
}

function tidy(text: string, { lines }: { lines?: true }): string {
  return lines ? text.split("\n").map(plainText).join("\n").trim() : plainText(text);
}
