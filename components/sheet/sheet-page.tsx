"use client";

import { useQuery } from "@tanstack/react-query";
import { useSearchParams } from "next/navigation";
import { useEffect, useState } from "react";
import { DeskHeading } from "@/components/desk/desk-heading";
import { registerWorker } from "@/components/field/register-worker";
import { Button } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { Notice } from "@/components/ui/notice";
import { Skeleton } from "@/components/ui/skeleton";
import { whoQuery } from "@/lib/client/desk-queries";
import { dropDraft } from "@/lib/client/sheet-draft";
import { openSheet, type Opened } from "@/lib/client/sheet-opening";
import { sendSheetPhotos } from "@/lib/client/sheet-photo";
import { recentText } from "@/lib/client/time-words";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { UUID } from "@/lib/domain/uuid";
import { sheetStore } from "./browser-sheet";
import { DraftsList } from "./drafts-list";
import { SheetForm } from "./sheet-form";

/** The form of one rig's sheet by the id in the query string; without an id, the drafts on this phone. */
export function SheetPage() {
  const params = useSearchParams();
  const isNew = params.has("new");
  const rig = params.get("new") ?? params.get("rig");
  useEffect(() => {
    void registerWorker();
    void sendSheetPhotos(sheetStore()).catch(() => {});
  }, []);
  if (rig === null) return <DraftsList />;
  if (!UUID.test(rig)) return <Nothing title={words.goneTitle}>{words.gone}</Nothing>;
  return <OneSheet key={rig} rig={rig.toLowerCase()} isNew={isNew} />;
}

function OneSheet({ rig, isNew }: { rig: string; isNew: boolean }) {
  const [opened, setOpened] = useState<Opened | null>(null);
  const [round, setRound] = useState(0);
  const { data: member } = useQuery(whoQuery);
  useEffect(() => {
    let current = true;
    const nowIso = () => new Date().toISOString();
    void openSheet(rig, isNew, { store: sheetStore(), nowIso }).then((came) => current && setOpened(came));
    return () => void (current = false);
  }, [rig, isNew, round]);
  const reopen = () => {
    setOpened(null);
    setRound((now) => now + 1);
  };
  const startOver = () => void dropDraft(sheetStore(), rig).then(reopen);

  if (opened === null) {
    return (
      <>
        <DeskHeading title={isNew ? words.newTitle : words.title} />
        <Skeleton label={words.openingTitle} rows={6} />
      </>
    );
  }
  if (opened.kind === "may-not") {
    return (
      <Nothing title={words.readOnlyTitle}>
        {opened.why === "role" ? words.roleRefused : words.keptByOther}
      </Nothing>
    );
  }
  if (opened.kind === "gone") return <Nothing title={words.goneTitle}>{words.gone}</Nothing>;
  if (opened.kind === "not-here") return <Nothing title={words.notHereTitle}>{words.notHere}</Nothing>;
  const { start, draft, reached, sheetless } = opened;
  if (draft === "foreign") {
    return (
      <>
        <DeskHeading title={words.otherDraftTitle} sub={words.otherDraft} />
        <div className="flex flex-wrap gap-3">
          <Button size="desk" className="min-h-13" onClick={() => setOpened({ ...opened, draft: "mine" })}>
            {words.otherDraftTake}
          </Button>
          <Button size="desk" className="min-h-13" onClick={startOver}>
            {words.otherDraftDrop}
          </Button>
        </div>
      </>
    );
  }
  return (
    <>
      <div className="mb-4 flex flex-col gap-2 empty:hidden">
        {!reached && <Notice tone="plain">{words.offline}</Notice>}
        {sheetless && <Notice tone="plain">{words.noSheet}</Notice>}
        {draft === "mine" && <DraftNote at={start.at} onThrowAway={startOver} />}
      </div>
      <SheetForm key={round} start={start} isNew={isNew} member={member?.id ?? start.member} />
    </>
  );
}

function DraftNote({ at, onThrowAway }: { at: string; onThrowAway: () => void }) {
  const [asked, setAsked] = useState(false);
  const [now] = useState(() => Date.now());
  const link = "min-h-11 px-1 font-semibold underline underline-offset-4";
  return (
    <Notice tone="plain">
      {asked ? words.throwAwaySure : words.draftFrom(recentText(at, now))}
      <span className="ml-2 inline-flex flex-wrap gap-x-4">
        {asked ? (
          <>
            <button type="button" className={link} onClick={onThrowAway}>
              {words.throwAwayYes}
            </button>
            <button type="button" className={link} onClick={() => setAsked(false)}>
              {words.throwAwayNo}
            </button>
          </>
        ) : (
          <button type="button" className={link} onClick={() => setAsked(true)}>
            {words.throwAway}
          </button>
        )}
      </span>
    </Notice>
  );
}

function Nothing({ title, children }: { title: string; children: string }) {
  return (
    <>
      <DeskHeading title={words.title} />
      <EmptyState
        title={title}
        action={
          <a href="/desk/rigs" className="min-h-11 font-semibold underline underline-offset-4">
            {words.rigs}
          </a>
        }
      >
        {children}
      </EmptyState>
    </>
  );
}
