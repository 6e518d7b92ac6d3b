"use client";

import Link from "next/link";
import { revisionsWords } from "@/lib/domain/messages/rigs";
import { thingWords as words } from "@/lib/domain/messages/things";
import type { ThingReading } from "@/lib/domain/rigs";
import { thingDifferences } from "@/lib/domain/sheet/compare";
import { Instant } from "../desk/instant";
import { ThingChanges } from "./thing-changes";

type Row = ThingReading["history"][number];
type ThingHistoryProps = { kind: string; history: readonly Row[] };

/** A thing's history, newest first: on which rig, since when, by whom, and what was written down differently. */
export function ThingHistory({ kind, history }: ThingHistoryProps) {
  return (
    <section className="@container min-w-0">
      <h2 className="text-xl leading-tight font-extrabold">{words.history}</h2>
      <p className="text-base text-soft">{words.historySub}</p>
      <ol className="mt-3 border-t-hair border-ink">
        {history.map((row, at) => (
          <li
            key={`${row.rig.id} ${row.revision.number}`}
            className="border-b border-rule py-3 text-base break-inside-avoid"
          >
            <p className="flex flex-wrap items-baseline gap-x-3">
              <Instant at={row.revision.createdAt} />
              <span>
                <Link
                  href={`/desk/rig?id=${row.rig.id}&revision=${row.revision.digest}`}
                  prefetch={false}
                  className="-my-2.5 inline-block py-2.5 font-semibold underline decoration-1 underline-offset-4"
                >
                  {row.rig.name}, {words.revision(row.revision.number)}
                </Link>
              </span>
              <span className="text-soft">{row.revision.by?.name ?? revisionsWords.byNobody}</span>
            </p>
            <Happened kind={kind} row={row} older={history.slice(at + 1)} />
          </li>
        ))}
      </ol>
    </section>
  );
}

function Happened({ kind, row, older }: { kind: string; row: Row; older: readonly Row[] }) {
  if (row.state === null) return <p className="mt-1 font-semibold">{words.taken}</p>;
  const before = older.find(({ state }) => state !== null);
  if (!before) return <p className="mt-1">{words.first}</p>;
  const here = older.find(({ rig }) => rig.id === row.rig.id);
  const came = !here || here.state === null;
  const changes = thingDifferences(kind, before.state!, row.state);
  return (
    <>
      {came && <p className="mt-1 font-semibold">{words.came(row.rig.name)}</p>}
      {changes.length > 0 ? (
        <ThingChanges changes={changes} />
      ) : (
        <p className="mt-1 text-soft">{words.same}</p>
      )}
    </>
  );
}
