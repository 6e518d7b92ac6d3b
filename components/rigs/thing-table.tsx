import Link from "next/link";
import { kindWords } from "@/lib/domain/messages/rigs";
import { thingsWords as words } from "@/lib/domain/messages/things";
import type { ThingRow } from "@/lib/domain/rigs";
import { gearKeys } from "@/lib/domain/sheet/gear";

const grid =
  "grid gap-x-4 px-2 @2xl:grid-cols-[minmax(0,2fr)_minmax(0,4fr)_minmax(0,3fr)] @2xl:items-baseline";
const heads = Object.values(words.columns);
const kinds: readonly string[] = ["coach", "car", ...gearKeys];

/** Coaches, cars and gear as rows, in the order of a sheet, each one link to its history. */
export function ThingTable({ rows }: { rows: readonly ThingRow[] }) {
  const inOrder = rows.toSorted((one, other) => kinds.indexOf(one.kind) - kinds.indexOf(other.kind));
  return (
    <table role="table" className="block text-base">
      <caption className="sr-only">{words.caption}</caption>
      <thead role="rowgroup" className="sr-only @2xl:not-sr-only @2xl:block">
        <tr role="row" className={`${grid} border-b-hair border-ink`}>
          {heads.map((head) => (
            <th
              key={head}
              role="columnheader"
              scope="col"
              className="py-2 text-left text-sm font-semibold text-soft"
            >
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="block @max-2xl:border-t-hair @max-2xl:border-ink">
        {inOrder.map((thing) => (
          <Row key={thing.id} thing={thing} />
        ))}
      </tbody>
    </table>
  );
}

function Row({ thing: { id, kind, label, rigs } }: { thing: ThingRow }) {
  return (
    <tr role="row" className={`${grid} relative min-h-desk border-b border-rule py-2.5 hover:bg-shade`}>
      <td role="cell" className="text-soft">
        {kindWords(kind)}
      </td>
      <td role="cell">
        <Link
          href={`/desk/thing?id=${id}`}
          prefetch={false}
          className="font-semibold underline decoration-1 underline-offset-4 after:absolute after:inset-0"
        >
          {label}
        </Link>
      </td>
      <td role="cell" className={rigs.length > 0 ? "" : "text-soft italic"}>
        {rigs.length > 0 ? rigs.map(({ name }) => name).join(", ") : words.noRig}
      </td>
    </tr>
  );
}
