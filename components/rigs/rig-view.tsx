"use client";

import { useState } from "react";
import { deskWords } from "@/lib/domain/messages/desk";
import { rigWords as words } from "@/lib/domain/messages/rigs";
import type { RigReading } from "@/lib/domain/rigs";
import { sheetIn } from "@/lib/domain/sheet/sheet";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { ListCounts } from "./list-counts";
import { ListReading } from "./list-reading";
import { NewerList } from "./newer-list";
import { Revisions } from "./revisions";
import { RigActions } from "./rig-actions";
import { RuledOut } from "./ruled-out";
import { SheetView } from "./sheet-view";

/** One rig: what rules it out, its sheet read back, the list that follows, and its revisions. */
export function RigView({ reading }: { reading: RigReading }) {
  const [outcome, setOutcome] = useState("");
  const sheet = sheetIn(reading.document);
  const { name, keeper, builder, revision } = reading;
  return (
    <div className="workshop-sheet">
      <title>{`${name} · ${deskWords.brand}`}</title>
      <DeskHeading
        over={<BackLink href="/desk/rigs" label={words.back} />}
        title={name}
        sub={words.sub(revision.number, keeper.name, builder?.name ?? null)}
      />
      <RigActions reading={reading} sheet={sheet} />
      <p role="status" className="mt-4 font-semibold empty:hidden print:hidden">
        {outcome}
      </p>
      <RuledOut reasons={reading.ruledOut} />
      {sheet && reading.newerList && (
        <NewerList key={revision.digest} reading={reading} sheet={sheet} onOutcome={setOutcome} />
      )}
      <div className="mt-6 grid grid-cols-1 gap-x-10 gap-y-8 @4xl:grid-cols-[minmax(0,1fr)_19rem] print:block">
        <div className="@container min-w-0">
          <SheetView sheet={sheet} />
        </div>
        <div className="@container flex min-w-0 flex-col gap-8 print:mt-6 print:block">
          <ListCounts document={reading.document} rig={reading.id} />
          {!sheet && <ListReading document={reading.document} title={words.list} />}
          <Revisions reading={reading} />
        </div>
      </div>
      <p className="mt-6 hidden border-t border-rule pt-2 text-sm print:block">
        {words.printed(revision.digest.slice(0, 12))}
      </p>
    </div>
  );
}
