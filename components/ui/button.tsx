import type { ButtonHTMLAttributes, ReactNode, Ref } from "react";

export type ButtonVariant = "good" | "fault-hold" | "fault-fix" | "quiet" | "plain";
export type ButtonSize = "field" | "desk";

const base =
  "relative inline-flex min-w-0 flex-col items-center justify-center rounded-[3px] border-2 text-center font-semibold " +
  "no-underline select-none disabled:border-dashed disabled:border-edge disabled:bg-transparent disabled:text-soft " +
  "aria-disabled:border-dashed aria-disabled:border-edge aria-disabled:bg-transparent aria-disabled:text-soft";

const looks: Record<ButtonVariant, string> = {
  good: "border-ink bg-ink text-paper font-extrabold active:bg-soft",
  "fault-hold": "notch-hold overflow-hidden border-hold text-hold font-extrabold active:bg-shade",
  "fault-fix": "notch-fix overflow-hidden border-ink text-ink font-extrabold active:bg-shade",
  quiet: "border-edge text-ink active:bg-shade",
  plain: "border-ink text-ink active:bg-shade",
};

const sizes: Record<ButtonSize, Record<"large" | "small", string>> = {
  field: {
    large: "min-h-primary px-2.5 py-2 text-2xl leading-tight",
    small: "min-h-field px-2.5 py-2 text-[1.0625rem] leading-tight",
  },
  desk: { large: "min-h-desk px-4 py-2 text-base", small: "min-h-desk px-4 py-2 text-base" },
};

/** The classes of a button, for a link that should look like one. */
export function buttonClass(variant: ButtonVariant = "plain", size: ButtonSize = "field"): string {
  const grade = variant === "quiet" || variant === "plain" ? "small" : "large";
  return `${base} ${looks[variant]} ${sizes[size][grade]}`;
}

type ButtonProps = ButtonHTMLAttributes<HTMLButtonElement> & {
  variant?: ButtonVariant;
  size?: ButtonSize;
  /** A second, smaller line under the label. */
  hint?: ReactNode;
  ref?: Ref<HTMLButtonElement>;
};

/** A button. Red belongs to "fault-hold" alone: a fault that means do not tow. */
export function Button({ variant, size, hint, className, children, type = "button", ...rest }: ButtonProps) {
  return (
    <button {...rest} type={type} className={`${buttonClass(variant, size)} ${className ?? ""}`}>
      <span>{children}</span>
      {hint && <span className="mt-1 text-base leading-tight font-normal">{hint}</span>}
    </button>
  );
}
