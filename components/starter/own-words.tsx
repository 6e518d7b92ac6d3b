import { useId } from "react";

type OwnWordsProps = {
  label: string;
  hint: string;
  error: string | undefined;
  value: string;
  maxLength: number;
  onChange: (value: string) => void;
};

/** A few lines in someone's own words. */
export function OwnWords({ label, hint, error, value, maxLength, onChange }: OwnWordsProps) {
  const id = useId();
  return (
    <div className="flex flex-col gap-1 px-4">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      <textarea
        id={id}
        rows={3}
        value={value}
        maxLength={maxLength}
        aria-invalid={error ? true : undefined}
        aria-describedby={`${id}-note`}
        onChange={(event) => onChange(event.target.value)}
        className={`w-full min-w-0 rounded-[3px] border-2 bg-paper px-3 py-2 text-xl text-ink ${error ? "border-l-8 border-ink" : "border-edge"}`}
      />
      <p
        id={`${id}-note`}
        role={error ? "alert" : undefined}
        className={error ? "font-semibold" : "text-base text-soft"}
      >
        {error ?? hint}
      </p>
    </div>
  );
}
