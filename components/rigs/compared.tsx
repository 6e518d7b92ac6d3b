"use client";

import { useQuery } from "@tanstack/react-query";
import { useRouter } from "next/navigation";
import { revisionQuery } from "@/lib/client/rig-queries";
import { deskWords } from "@/lib/domain/messages/desk";
import { revisionsWords as words } from "@/lib/domain/messages/rigs";
import type { RevisionReading, RigReading } from "@/lib/domain/rigs";
import { sheetDifferences } from "@/lib/domain/sheet/compare";
import { sheetIn } from "@/lib/domain/sheet/sheet";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { Fetched } from "./fetched";
import { ListChanges } from "./list-changes";
import { RevisionChoice } from "./revision-choice";
import { SheetChanges } from "./sheet-changes";

type ComparedProps = { rig: RigReading; from: string; to: string };

/** Two revisions of a rig held against each other: what changed on the sheet, and what that did to the list. */
export function Compared({ rig, from, to }: ComparedProps) {
  const router = useRouter();
  const earlier = useQuery(revisionQuery(rig.id, from));
  const later = useQuery(revisionQuery(rig.id, to));
  const numberOf = (digest: string) => rig.revisions.find((row) => row.digest === digest)!.number;
  const title = words.comparing(numberOf(to), numberOf(from));
  const choose = (pair: { from?: string; to?: string }) => {
    const query = new URLSearchParams({ id: rig.id, from, to, ...pair });
    router.replace(`/desk/rig?${query}`, { scroll: false });
  };
  return (
    <>
      <title>{`${title}, ${rig.name} · ${deskWords.brand}`}</title>
      <DeskHeading
        over={<BackLink href={`/desk/rig?id=${rig.id}`} label={rig.name} />}
        title={title}
        sub={rig.name}
      />
      <div className="grid grid-cols-1 gap-x-6 gap-y-3 @lg:grid-cols-2 print:hidden">
        <RevisionChoice
          label={words.earlierOf}
          rows={rig.revisions}
          value={from}
          onChoose={(digest) => choose({ from: digest })}
        />
        <RevisionChoice
          label={words.laterOf}
          rows={rig.revisions}
          value={to}
          onChoose={(digest) => choose({ to: digest })}
        />
      </div>
      <Fetched query={earlier} label={words.fetching} rows={4}>
        {(before) => (
          <Fetched query={later} label={words.fetching} rows={4}>
            {(after) => <Changes before={before} after={after} />}
          </Fetched>
        )}
      </Fetched>
    </>
  );
}

function Changes({ before, after }: { before: RevisionReading; after: RevisionReading }) {
  const [was, is] = [sheetIn(before.document), sheetIn(after.document)];
  return (
    <>
      <section className="mt-6">
        <h2 className="text-xl leading-tight font-extrabold">{words.sheetChanges}</h2>
        {was && is ? (
          <SheetChanges differences={sheetDifferences(was, is)} />
        ) : (
          <p className="mt-2 text-base">{words.noSheet}</p>
        )}
      </section>
      <section className="mt-8">
        <h2 className="text-xl leading-tight font-extrabold">{words.listChanges}</h2>
        <ListChanges before={before.document} after={after.document} />
      </section>
    </>
  );
}
