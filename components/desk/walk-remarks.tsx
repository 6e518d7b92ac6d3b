import { clockText } from "@/lib/client/time-words";
import { walkWords } from "@/lib/domain/messages/desk";
import type { Remark } from "@/lib/domain/walk-reading";

/** Notes that belong to the walk and not to one check. */
export function WalkRemarks({ remarks }: { remarks: readonly Remark[] }) {
  if (remarks.length === 0) return null;
  return (
    <section className="mt-6">
      <h2 className="text-xl leading-tight font-extrabold">{walkWords.remarks}</h2>
      <ul className="mt-2 border-t-hair border-ink">
        {remarks.map((remark) => (
          <li
            key={remark.seq}
            className="flex items-baseline justify-between gap-4 border-b border-rule py-2.5 text-base"
          >
            <p>{remark.text}</p>
            <span className="tabular text-[0.9375rem] text-soft">{clockText(remark.elapsedMs)}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}
