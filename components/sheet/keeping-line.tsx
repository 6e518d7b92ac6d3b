import { clockTimeText } from "@/lib/client/time-words";
import type { KeepingState } from "@/lib/client/sheet-draft";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";

/** Whether the draft is on this phone. Only a failure is read aloud: the rest would talk over the typing. */
export function KeepingLine({ keeping: { state, at } }: { keeping: KeepingState }) {
  if (state === "failed") {
    return (
      <span role="alert" className="font-semibold text-ink">
        {words.notKept}
      </span>
    );
  }
  if (at === null) return state === "idle" ? words.untouched : words.keeping;
  return words.kept(clockTimeText(Date.parse(at)));
}
