import { fieldWords } from "@/lib/domain/messages/field";
import { CLOSING, moveTo } from "./address";

/** The way out of the checks: to stop, pause, or close the walk. */
export function StopButton({ walk }: { walk: string }) {
  return (
    <button
      type="button"
      className="-my-6 min-h-field px-4 leading-none underline decoration-2 underline-offset-4"
      onClick={() => moveTo({ walk, at: CLOSING })}
    >
      {fieldWords.walk.stop}
    </button>
  );
}
