import type { ListDifference } from "@/lib/domain/catalogue/differences";
import { besideWords as words } from "@/lib/domain/messages/review";
import type { Check } from "@/lib/domain/revision";
import { memberWords } from "./review-member";

type Side = { name: string; checks: ReadonlyMap<string, Check> };
type ReviewDiffersProps = { difference: ListDifference; sides: readonly [Side, Side] };

const grid =
  "grid grid-cols-1 gap-x-4 @3xl:grid-cols-[8rem_minmax(0,1fr)_minmax(0,1fr)] print:grid-cols-[8rem_minmax(0,1fr)_minmax(0,1fr)]";

/** One check that both lists have: what differs in it, in words, side by side. */
export function ReviewDiffers({ difference: { key, ask, members = [], walks }, sides }: ReviewDiffersProps) {
  const rows = members.map((member) => ({
    label: words.members[member] ?? member,
    says: sides.map(({ checks }) => memberWords(checks.get(key)!, member, checks)),
  }));
  if (walks && walks.removed.length + walks.added.length > 0) {
    const only = [walks.removed, walks.added];
    rows.push({
      label: words.walks,
      says: only.map((some) => (some.length > 0 ? words.besides(some) : words.noBesides)),
    });
  }
  return (
    <section className="border-b border-rule py-4 text-base break-inside-avoid">
      <h4 className="text-[1.125rem] leading-snug font-extrabold">{ask}</h4>
      {rows.length > 0 && (
        <table role="table" className="mt-1 block">
          <caption className="sr-only">{words.what}</caption>
          <thead
            role="rowgroup"
            className="sr-only @3xl:not-sr-only @3xl:block print:not-sr-only print:block"
          >
            <tr role="row" className={grid}>
              {[words.what, ...sides.map(({ name }) => name)].map((head, at) => (
                <th
                  key={at}
                  role="columnheader"
                  scope="col"
                  className="py-1 text-left text-sm font-semibold text-soft"
                >
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody role="rowgroup" className="block">
            {rows.map(({ label, says }) => (
              <tr key={label} role="row" className={`${grid} border-t border-rule py-1.5`}>
                <th role="rowheader" scope="row" className="text-left font-normal text-soft">
                  {label}
                </th>
                {says.map((text, at) => (
                  <td key={at} role="cell" className="min-w-0">
                    <span className="block text-sm text-soft @3xl:hidden print:hidden">
                      {sides[at]!.name}
                    </span>
                    {text}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      )}
      {walks && walks.moved.length > 0 && <p className="mt-1">{words.moved(walks.moved)}</p>}
    </section>
  );
}
