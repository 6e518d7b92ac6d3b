import { type InputHTMLAttributes, type ReactNode, type Ref, useId } from "react";

type TextFieldProps = Omit<InputHTMLAttributes<HTMLInputElement>, "size"> & {
  label: ReactNode;
  hint?: ReactNode;
  /** Takes the place of the hint and marks the input as invalid. */
  error?: ReactNode;
  size?: "field" | "desk";
  /** What the figure is counted in, set after the input. */
  unit?: ReactNode;
  ref?: Ref<HTMLInputElement>;
};

/** One labelled line of input with its hint and its error. */
export function TextField({
  label,
  hint,
  error,
  unit,
  size = "desk",
  id,
  className,
  ...rest
}: TextFieldProps) {
  const own = useId();
  const inputId = id ?? own;
  const noteId = `${inputId}-note`;
  const note = error ?? hint;
  const height = size === "field" ? "min-h-field text-2xl" : "min-h-12 text-lg";
  const edge = error ? "border-ink border-l-8" : "border-edge";
  return (
    <div className={`flex flex-col gap-1 ${className ?? ""}`}>
      <label htmlFor={inputId} className="font-semibold">
        {label}
      </label>
      <div className="flex items-center gap-2">
        <input
          {...rest}
          id={inputId}
          aria-invalid={error ? true : undefined}
          aria-describedby={note ? noteId : undefined}
          className={`w-full min-w-0 rounded-[3px] border-2 bg-paper px-3 py-2 text-ink ${height} ${edge}`}
        />
        {unit && <span className="tabular shrink-0">{unit}</span>}
      </div>
      {note && (
        <p
          id={noteId}
          role={error ? "alert" : undefined}
          className={error ? "font-semibold" : "text-base text-soft"}
        >
          {note}
        </p>
      )}
    </div>
  );
}
