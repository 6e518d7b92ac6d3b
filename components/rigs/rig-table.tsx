import Link from "next/link";
import { rigsWords as words } from "@/lib/domain/messages/rigs";
import type { RigRow, ThingRow } from "@/lib/domain/rigs";
import { Instant } from "../desk/instant";

// Rows are grids, as in the history: one link stretched over each, the same cells on fewer lines where there is room.
const grid =
  "grid gap-x-4 px-2 @4xl:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)_minmax(0,1fr)_8.5rem_minmax(0,1.3fr)] @4xl:items-baseline";
const heads = Object.values(words.columns);

type RigTableProps = { rows: readonly RigRow[]; things: readonly ThingRow[] };

/** Rigs as rows, each one link to its rig. */
export function RigTable({ rows, things }: RigTableProps) {
  return (
    <table role="table" className="block text-base">
      <caption className="sr-only">{words.caption}</caption>
      <thead role="rowgroup" className="sr-only @4xl:not-sr-only @4xl:block">
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
      <tbody role="rowgroup" className="block @max-4xl:border-t-hair @max-4xl:border-ink">
        {rows.map((rig) => (
          <Row key={rig.id} rig={rig} vehicles={vehiclesOf(rig.id, things)} />
        ))}
      </tbody>
    </table>
  );
}

function Row({ rig, vehicles }: { rig: RigRow; vehicles: string }) {
  return (
    <tr role="row" className={`${grid} relative border-b border-rule py-3 hover:bg-shade`}>
      <td role="cell">
        <Link
          href={`/desk/rig?id=${rig.id}`}
          prefetch={false}
          className="font-semibold underline decoration-1 underline-offset-4 after:absolute after:inset-0"
        >
          {rig.name}
        </Link>
      </td>
      <td role="cell">{vehicles}</td>
      <td role="cell" className="@max-4xl:text-soft">
        <span className="@4xl:sr-only">{words.columns.keeper.toLowerCase()} </span>
        {rig.keeper.name}
      </td>
      <td role="cell" className="@max-4xl:text-soft">
        <span className="@4xl:block">{words.revision(rig.revision.number)}</span>{" "}
        <Instant at={rig.revision.createdAt} />
      </td>
      <td role="cell">
        <State rig={rig} />
      </td>
    </tr>
  );
}

function State({ rig: { ruledOut, newerList } }: { rig: RigRow }) {
  return (
    <>
      {ruledOut.length > 0 && (
        <>
          <p className="font-extrabold text-hold">{words.doNotTow}</p>
          <ul>
            {ruledOut.map((reason) => (
              <li key={reason}>{reason}</li>
            ))}
          </ul>
        </>
      )}
      {newerList && <p className="font-semibold">{words.newerList}</p>}
    </>
  );
}

function vehiclesOf(rig: string, things: readonly ThingRow[]): string {
  const label = (kind: string) =>
    things.find((thing) => thing.kind === kind && thing.rigs.some(({ id }) => id === rig))?.label;
  const [coach, car] = [label("coach"), label("car")];
  if (!coach && !car) return words.noVehicles;
  return words.vehicles(coach ?? words.noVehicles, car ?? words.noVehicles);
}
