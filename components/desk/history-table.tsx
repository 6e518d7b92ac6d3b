import Link from "next/link";
import type { WalkRow } from "@/lib/domain/history";
import { historyWords } from "@/lib/domain/messages/desk";
import { purposeWords } from "@/lib/domain/messages/walk";
import { Instant } from "./instant";
import { VerdictText } from "./verdict";

// Rows are grids at every width: a table row cannot be relied on to hold the link that is stretched over it, and where there is
// no room the same cells stand on two or three lines. Roles are spelled out because a grid row is no row by itself.
const grid =
  "grid gap-x-3 px-2 @4xl:grid-cols-[8rem_5rem_minmax(0,1.25fr)_minmax(0,1fr)_3rem_4.25rem_8rem_8rem] @4xl:items-baseline";

const { columns } = historyWords;
const heads = [
  columns.opened,
  columns.walk,
  columns.rig,
  columns.by,
  columns.marks,
  columns.faults,
  columns.state,
  columns.verdict,
];

const figures: readonly string[] = [columns.marks, columns.faults];

type HistoryTableProps = { rows: readonly WalkRow[]; names: Readonly<Record<string, string>> };

/** The walks as rows, each one link to its walk. */
export function HistoryTable({ rows, names }: HistoryTableProps) {
  return (
    <table role="table" className="block text-base">
      <caption className="sr-only">{historyWords.caption}</caption>
      <thead role="rowgroup" className="sr-only @4xl:not-sr-only @4xl:block">
        <tr role="row" className={`${grid} border-b-hair border-ink`}>
          {heads.map((head) => (
            <th
              key={head}
              role="columnheader"
              scope="col"
              className={`py-2 text-sm font-semibold text-soft ${figures.includes(head) ? "text-right" : "text-left"} ${head === columns.faults ? "pr-4" : ""}`}
            >
              {head}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="block @max-4xl:border-t-hair @max-4xl:border-ink">
        {rows.map((row) => (
          <HistoryRow key={row.id} row={row} names={names} />
        ))}
      </tbody>
    </table>
  );
}

function HistoryRow({ row, names }: { row: WalkRow; names: HistoryTableProps["names"] }) {
  const rig = names[row.rig] ?? historyWords.nameless;
  const by = names[row.member] ?? historyWords.nameless;
  return (
    <tr
      role="row"
      className={`${grid} relative @xs:grid-cols-[minmax(0,1fr)_auto] border-b border-rule py-3 hover:bg-shade @xl:grid-cols-[9.5rem_minmax(0,1fr)_auto] @4xl:py-2.5`}
    >
      <td
        role="cell"
        className="@max-4xl:order-2 @xs:@max-4xl:text-right @max-4xl:text-soft @xl:@max-4xl:order-3"
      >
        <Instant at={row.openedAt} />
      </td>
      <td
        role="cell"
        className="@max-4xl:order-3 @max-4xl:leading-snug @xs:@max-xl:col-span-2 @max-xl:mt-1 @xl:@max-4xl:order-2"
      >
        <Link
          href={`/desk/walk?id=${row.id}`}
          prefetch={false}
          className="font-semibold underline decoration-1 underline-offset-4 after:absolute after:inset-0"
        >
          {purposeWords[row.purpose]}
          <span className="@4xl:sr-only">, {rig}</span>
        </Link>
      </td>
      <td role="cell" className="@max-4xl:sr-only">
        {rig}
      </td>
      <td
        role="cell"
        className="@max-4xl:order-5 @max-4xl:text-soft @xs:@max-xl:col-span-2 @xl:@max-4xl:col-start-2"
      >
        {by}
        <span aria-hidden="true" className="@4xl:hidden">
          , {historyWords.marks(row.counts.marks, row.counts.faults)}
        </span>
      </td>
      <td role="cell" className="@max-4xl:sr-only @4xl:text-right">
        <span className="tabular text-[0.9375em]">{row.counts.marks}</span>
      </td>
      <td role="cell" className="@max-4xl:sr-only @4xl:pr-4 @4xl:text-right">
        <span className="tabular text-[0.9375em]">{row.counts.faults}</span>
      </td>
      <td
        role="cell"
        className="@max-4xl:order-6 @max-4xl:text-soft @xs:@max-xl:col-span-2 @xl:@max-4xl:text-right"
      >
        {row.state === "open" ? (
          historyWords.stillOpen
        ) : (
          <>
            <span className="@4xl:sr-only">{historyWords.received} </span>
            <Instant at={row.receivedAt} />
          </>
        )}
      </td>
      <td role="cell" className="@max-4xl:order-1 @max-4xl:font-extrabold">
        <VerdictText verdict={row.verdict} />
      </td>
    </tr>
  );
}
