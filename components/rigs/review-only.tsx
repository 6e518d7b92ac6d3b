import { useMemo } from "react";
import { review } from "@/lib/domain/catalogue/review";
import { besideWords as words, reviewWords } from "@/lib/domain/messages/review";
import type { Named } from "./review-beside";

type ReviewOnlyProps = { on: Named; off: Named; keys: readonly string[] };

/** The checks that one rig's list has and the other's has not, each with the reason on either side. */
export function ReviewOnly({ on, off, keys }: ReviewOnlyProps) {
  const [has, lacks] = useMemo(() => [review(on.sheet), review(off.sheet)], [on.sheet, off.sheet]);
  const rows = has.filter(({ listed, check }) => listed && keys.includes(check.key));
  return (
    <section className="min-w-0">
      <h3 className="border-b-hair border-ink pb-1 text-lg leading-tight font-extrabold">
        {words.only(on.name)} <span className="tabular text-base font-normal text-soft">{rows.length}</span>
      </h3>
      {rows.length === 0 && <p className="py-2 text-base text-soft">{words.nothingOnly}</p>}
      <ul className="text-base">
        {rows.map(({ id, check, reason }) => (
          <li key={id} className="flex flex-col gap-1 border-b border-rule py-3 break-inside-avoid">
            <h4 className="font-extrabold">{check.ask}</h4>
            <p>
              <strong className="font-semibold">{on.name}:</strong> {reason}
            </p>
            <p>
              <strong className="font-semibold">{off.name}:</strong>{" "}
              {lacks.find((one) => one.id === id)?.reason ?? words.notSaid}
            </p>
            <p className="text-soft">{reviewWords.effect[check.effect]}.</p>
          </li>
        ))}
      </ul>
    </section>
  );
}
