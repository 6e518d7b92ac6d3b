import Link from "next/link";
import { deskWords } from "@/lib/domain/messages/desk";
import { revisionsWords as words, rigWords } from "@/lib/domain/messages/rigs";
import type { RevisionReading, RigReading } from "@/lib/domain/rigs";
import { sheetIn } from "@/lib/domain/sheet/sheet";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { Instant } from "../desk/instant";
import { buttonClass } from "../ui/button";
import { Notice } from "../ui/notice";
import { ListCounts } from "./list-counts";
import { ListReading } from "./list-reading";
import { SheetView } from "./sheet-view";

type OldRevisionProps = { rig: RigReading; revision: RevisionReading };

/** A revision that is not the latest, as it was: to be read, not to be written. */
export function OldRevision({ rig, revision }: OldRevisionProps) {
  const sheet = sheetIn(revision.document);
  const title = `${sheet?.name ?? rig.name}, ${words.row(revision.number).toLowerCase()}`;
  return (
    <div className="workshop-sheet">
      <title>{`${title} · ${deskWords.brand}`}</title>
      <DeskHeading
        over={<BackLink href={`/desk/rig?id=${rig.id}`} label={rig.name} />}
        title={title}
        sub={
          <>
            {revision.by?.name ?? words.byNobody}, <Instant at={revision.createdAt} />
          </>
        }
      />
      <Notice tone="plain">
        <p>{words.old(revision.number, rig.revision.number)}</p>
        <Link
          href={`/desk/rig?id=${rig.id}`}
          prefetch={false}
          className={`${buttonClass("plain", "desk")} mt-3 print:hidden`}
        >
          {words.toLatest}
        </Link>
      </Notice>
      <div className="mt-6 grid grid-cols-1 gap-x-10 gap-y-8 @4xl:grid-cols-[minmax(0,1fr)_19rem] print:block">
        <div className="@container min-w-0">
          <SheetView sheet={sheet} />
        </div>
        <div className="@container flex min-w-0 flex-col gap-8">
          <ListCounts document={revision.document} />
          <ListReading document={revision.document} title={rigWords.list} />
        </div>
      </div>
    </div>
  );
}
