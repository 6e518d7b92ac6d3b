import { useId } from "react";

type Option = { label: string; hint?: string };

type ChoiceProps<K extends string> = {
  title: string;
  lead?: string;
  options: Partial<Record<K, Option>>;
  value: K;
  onChoose: (value: K) => void;
};

/** One question with its answers, each large enough for a glove; the answer takes effect when it is touched. */
export function Choice<K extends string>({ title, lead, options, value, onChoose }: ChoiceProps<K>) {
  const name = useId();
  return (
    <fieldset className="min-w-0">
      <legend className="pb-2 text-xl leading-tight font-extrabold">{title}</legend>
      {lead && <p className="-mt-1 pb-2 text-base text-soft">{lead}</p>}
      <div className="grid grid-cols-[repeat(auto-fit,minmax(min(100%,10rem),1fr))] gap-2.5">
        {(Object.entries(options) as [K, Option][]).map(([key, { label, hint }]) => (
          <label
            key={key}
            className="group relative flex min-h-field items-center gap-[min(0.75rem,3%)] rounded-[3px] border-2 border-edge px-[min(0.875rem,4%)] py-2 leading-tight font-semibold has-checked:border-ink has-checked:bg-ink has-checked:text-paper"
          >
            {/* It lies over its label, so that the whole field shows the focus and takes the touch. */}
            <input
              type="radio"
              name={name}
              className="absolute -inset-0.5 cursor-pointer appearance-none rounded-[3px]"
              checked={key === value}
              onChange={() => onChoose(key)}
            />
            <span
              aria-hidden="true"
              className="grid aspect-square w-[min(1.5rem,12%)] shrink-0 place-items-center rounded-full border-2 border-current"
            >
              <span className="hidden size-[50%] rounded-full bg-current group-has-checked:block" />
            </span>
            <span className="min-w-0">
              {label}
              {hint && <span className="mt-0.5 block text-base font-normal">{hint}</span>}
            </span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
