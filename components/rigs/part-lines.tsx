import { rigWords as words } from "@/lib/domain/messages/rigs";
import type { Line, ReadPart } from "@/lib/domain/sheet/reading";
import { Value } from "./value";

/** The fields of a part: known ones as rows, those not known named, those that nobody has looked for folded away. */
export function PartLines({ part: { known, unknown, gaps, lists } }: { part: ReadPart }) {
  const hasItems = lists.some(({ items }) => items.length > 0);
  const shown = known.filter(({ field }) => field.kind !== "photo");
  return (
    <div className="text-base">
      {shown.length > 0 && (
        <dl className="grid grid-cols-1 gap-x-8 @xl:grid-cols-2 print:grid-cols-2">
          {shown.map((line) => (
            <Row key={line.pointer} line={line} />
          ))}
        </dl>
      )}
      {shown.length + unknown.length === 0 && !hasItems && (
        <p className="pt-2 text-soft">{words.nothingKnown}</p>
      )}
      {unknown.length > 0 && (
        <p className="border-b border-rule py-1.5 italic">{words.notKnown(labels(unknown))}</p>
      )}
      {gaps.length > 0 && (
        <details className="print:hidden">
          <summary className="inline-flex min-h-11 items-center text-soft underline decoration-1 underline-offset-4">
            {words.gaps(gaps.length)}
          </summary>
          <p className="pb-2 text-soft">{labels(gaps).join(", ")}</p>
        </details>
      )}
    </div>
  );
}

function Row({ line: { label, field, value } }: { line: Line }) {
  const long = field.kind === "text" && field.lines;
  return (
    <div
      className={`grid grid-cols-1 items-baseline gap-x-3 border-b border-rule py-1.5 @2xs:grid-cols-[minmax(0,1fr)_minmax(0,1fr)] ${long ? "@xl:col-span-2 print:col-span-2" : ""}`}
    >
      <dt className="text-soft">{label}</dt>
      <dd className="font-semibold">
        <Value field={field} value={value} />
      </dd>
    </div>
  );
}

const labels = (lines: readonly Line[]) => lines.map(({ label }) => label);
