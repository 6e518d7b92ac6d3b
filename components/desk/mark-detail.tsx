import type { MarkBody } from "@/lib/domain/entry";
import { seenWords, walkWords } from "@/lib/domain/messages/desk";

/** What was said beside a mark: measured, seen at the lamps, the reason for a correction, a note. */
export function MarkDetail({ mark: { measured, seen, because, note } }: { mark: MarkBody }) {
  const entered = measured?.entered ?? measured;
  const lines = [
    measured && entered && `${measured.quantity}: ${entered.value} ${entered.unit}`,
    seen && seenWords(seen),
    because && walkWords.because(because),
    note,
  ].filter((line) => !!line);
  if (lines.length === 0) return null;
  return (
    <div className="col-start-2 -col-end-1 mt-0.5 text-base text-soft">
      {lines.map((line) => (
        <p key={line}>{line}</p>
      ))}
    </div>
  );
}
