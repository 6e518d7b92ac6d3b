import Link from "next/link";
import { revisionsWords as words } from "@/lib/domain/messages/rigs";
import type { RevisionRow, RigReading } from "@/lib/domain/rigs";
import { Instant } from "../desk/instant";

/** The revisions of a rig, newest first, each to be read as it was and held against the one before it. */
export function Revisions({ reading: { id, revision, revisions } }: { reading: RigReading }) {
  return (
    <section className="print:mt-6 print:break-inside-avoid">
      <h2 className="text-xl leading-tight font-extrabold">{words.title}</h2>
      <p className="text-base text-soft">{words.sub}</p>
      <ol className="mt-3 border-t border-rule text-base">
        {revisions.map((row, at) => (
          <Row
            key={row.number}
            rig={id}
            row={row}
            before={revisions[at + 1]}
            latest={row.number === revision.number}
          />
        ))}
      </ol>
    </section>
  );
}

const link = "inline-flex min-h-11 items-center font-semibold underline decoration-1 underline-offset-4";

type RowProps = { rig: string; row: RevisionRow; before: RevisionRow | undefined; latest: boolean };

function Row({ rig, row, before, latest }: RowProps) {
  return (
    <li className="border-b border-rule py-1.5">
      <p className="flex flex-wrap items-baseline justify-between gap-x-4">
        {latest ? (
          <span className="flex min-h-11 items-center font-semibold">{words.latestRow(row.number)}</span>
        ) : (
          <Link href={`/desk/rig?id=${rig}&revision=${row.digest}`} prefetch={false} className={link}>
            {words.row(row.number)}
          </Link>
        )}
        {before && (
          <Link
            href={`/desk/rig?id=${rig}&from=${before.digest}&to=${row.digest}`}
            prefetch={false}
            aria-label={words.changedIn(row.number)}
            className={`${link} print:hidden`}
          >
            {words.changed}
          </Link>
        )}
      </p>
      <p className="text-soft">
        {row.by?.name ?? words.byNobody}, <Instant at={row.createdAt} />
      </p>
    </li>
  );
}
