"use client";

import { thingWords as words } from "@/lib/domain/messages/things";
import type { SheetDifference } from "@/lib/domain/sheet/compare";
import { sideWords } from "@/lib/domain/sheet/reading";
import { usePreferences } from "../settings/use-preferences";

const grid =
  "grid grid-cols-1 gap-x-4 @md:grid-cols-[minmax(0,4fr)_minmax(0,3fr)_minmax(0,3fr)] print:grid-cols-[minmax(0,4fr)_minmax(0,3fr)_minmax(0,3fr)]";

/** What was written down differently of a thing, field by field, in the reader's units. */
export function ThingChanges({ changes }: { changes: readonly SheetDifference[] }) {
  const { units } = usePreferences();
  return (
    <table role="table" className="mt-1 block">
      <caption className="sr-only">{words.history}</caption>
      <thead role="rowgroup" className="sr-only @md:not-sr-only @md:block print:not-sr-only print:block">
        <tr role="row" className={grid}>
          {[words.field, words.before, words.after].map((head) => (
            <th
              key={head}
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
        {changes.map((change) => (
          <tr key={change.pointer} role="row" className={`${grid} border-t border-rule py-1.5`}>
            <th role="rowheader" scope="row" className="text-left font-normal text-soft">
              {change.where.at(-1)}
            </th>
            <td role="cell" className="min-w-0">
              <span className="text-soft @md:hidden print:hidden">{words.before}: </span>
              {sideWords(change, change.before, units)}
            </td>
            <td role="cell" className="min-w-0 font-semibold">
              <span className="font-normal text-soft @md:hidden print:hidden">{words.after}: </span>
              {sideWords(change, change.after, units)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
