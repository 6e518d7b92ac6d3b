import { useMemo } from "react";
import { compose } from "@/lib/domain/catalogue/compose";
import { listDifferences } from "@/lib/domain/catalogue/differences";
import { besideWords as words } from "@/lib/domain/messages/review";
import { checksOf } from "@/lib/domain/revision";
import type { Named } from "./review-beside";
import { ReviewDiffers } from "./review-differs";
import { ReviewOnly } from "./review-only";

type ReviewDifferencesProps = { one: Named; other: Named };

/** Two rigs' lists side by side: what only one has, and what both have in other words. */
export function ReviewDifferences({ one, other }: ReviewDifferencesProps) {
  const { left, right, differences } = useMemo(() => {
    const [before, after] = [compose(one.sheet), compose(other.sheet)];
    return {
      left: checksOf(before),
      right: checksOf(after),
      differences: listDifferences(before, after),
    };
  }, [one.sheet, other.sheet]);
  const having = (change: string) => differences.filter((difference) => difference.change === change);
  const changed = having("changed");
  return (
    <>
      <h2 className="text-xl leading-tight font-extrabold">{words.title(one.name, other.name)}</h2>
      {differences.length === 0 && <p className="mt-3 text-base">{words.same}</p>}
      <div className="mt-4 grid grid-cols-1 gap-x-10 gap-y-6 @3xl:grid-cols-2 print:grid-cols-2">
        <ReviewOnly on={one} off={other} keys={having("removed").map(({ key }) => key)} />
        <ReviewOnly on={other} off={one} keys={having("added").map(({ key }) => key)} />
      </div>
      {changed.length > 0 && (
        <section className="mt-8">
          <h3 className="border-b-hair border-ink pb-1 text-lg leading-tight font-extrabold">
            {words.both} <span className="tabular text-base font-normal text-soft">{changed.length}</span>
          </h3>
          {changed.map((difference) => (
            <ReviewDiffers
              key={difference.key}
              difference={difference}
              sides={[
                { name: one.name, checks: left },
                { name: other.name, checks: right },
              ]}
            />
          ))}
        </section>
      )}
    </>
  );
}
