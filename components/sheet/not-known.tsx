import { useRef, type ReactNode } from "react";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";

type NotKnownProps = {
  label: string;
  value: unknown;
  onChange: (value: unknown) => void;
  /** Leaves the toggle out. */
  never?: boolean;
  children: ReactNode;
};

/** An input with the toggle that says: looked for, and not known. A second tap brings back what stood there. */
export function NotKnown({ label, value, onChange, never = false, children }: NotKnownProps) {
  const before = useRef<unknown>("");
  const pressed = value === null;
  const toggle = () => {
    if (!pressed) before.current = value;
    onChange(pressed ? before.current : null);
  };
  return (
    <div className="flex flex-wrap gap-2">
      <div className="flex min-w-0 flex-[1_1_10rem] gap-2">{children}</div>
      {!never && (
        <button
          type="button"
          aria-pressed={pressed}
          aria-label={words.notKnownAloud(label)}
          onClick={toggle}
          className="min-h-13 shrink-0 rounded-[3px] border-2 border-dashed border-edge px-3 text-base font-semibold aria-pressed:border-solid aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper"
        >
          {words.notKnown}
        </button>
      )}
    </div>
  );
}

/** The look of what is typed into. */
export function inputLook(invalid: boolean): string {
  const edge = invalid ? "border-ink border-l-8" : "border-edge";
  return `min-h-13 w-full min-w-0 rounded-[3px] border-2 bg-paper px-3 py-2 text-lg text-ink placeholder:text-soft disabled:border-dashed disabled:bg-shade ${edge}`;
}
