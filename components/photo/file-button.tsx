import type { ChangeEvent } from "react";
import { buttonClass } from "../ui/button";

type FileButtonProps = {
  label: string;
  /** Opens the camera at the back where there is one. */
  camera?: boolean;
  busy: boolean;
  onFile: (file: File) => void;
};

/** A button of field size over a file input: the input keeps the keyboard and the screen reader, the label the look. */
export function FileButton({ label, camera = false, busy, onFile }: FileButtonProps) {
  const picked = ({ target }: ChangeEvent<HTMLInputElement>) => {
    const file = target.files?.[0];
    // Else the same file could not be chosen a second time.
    target.value = "";
    if (file && !busy) onFile(file);
  };
  return (
    <label className="relative flex min-w-0 flex-[1_1_10rem] cursor-pointer">
      {/* Disabled it would lose the focus while it works; a file picked meanwhile is passed over instead. */}
      <input
        type="file"
        accept="image/*"
        {...(camera && { capture: "environment" as const })}
        onChange={picked}
        aria-disabled={busy || undefined}
        className="peer sr-only"
      />
      <span
        className={`${buttonClass("plain")} w-full active:bg-shade peer-focus-visible:outline-4 peer-focus-visible:outline-offset-2 peer-focus-visible:outline-now peer-focus-visible:shadow-[0_0_0_2px_var(--paper),0_0_0_8px_var(--ink)] peer-aria-disabled:border-dashed peer-aria-disabled:border-edge peer-aria-disabled:text-soft`}
      >
        {label}
      </span>
    </label>
  );
}
