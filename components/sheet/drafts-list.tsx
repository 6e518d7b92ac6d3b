import Link from "next/link";
import { useEffect, useState } from "react";
import { DeskHeading } from "@/components/desk/desk-heading";
import { buttonClass } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { keptDrafts, type KeptDraft } from "@/lib/client/sheet-draft";
import { recentText } from "@/lib/client/time-words";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { sheetOf } from "@/lib/domain/sheet/draft";
import { sheetStore } from "./browser-sheet";

/** The sheets that were begun on this phone and not saved yet, and the way to a new one. */
export function DraftsList() {
  const [found, setFound] = useState<{ drafts: KeptDraft[]; now: number; fresh: string } | null>(null);
  useEffect(() => {
    const show = (drafts: KeptDraft[]) => setFound({ drafts, now: Date.now(), fresh: crypto.randomUUID() });
    keptDrafts(sheetStore()).then(show, () => show([]));
  }, []);
  if (!found) return <DeskHeading title={words.draftsTitle} sub={words.draftsLead} />;
  const { drafts, now, fresh } = found;
  const begin = (
    <Link
      href={`/desk/sheet?new=${fresh}`}
      prefetch={false}
      className={`${buttonClass("plain", "desk")} min-h-13`}
    >
      {words.newRig}
    </Link>
  );
  return (
    <>
      <DeskHeading title={words.draftsTitle} sub={words.draftsLead} />
      {drafts.length === 0 ? (
        <EmptyState title={words.draftsNone} action={begin} />
      ) : (
        <>
          <ul className="mb-4 border-b border-rule">
            {drafts.map(({ rig, base, draft, at }) => (
              <li key={rig} className="border-t border-rule">
                <Link
                  href={`/desk/sheet?${base === null ? "new" : "rig"}=${rig}`}
                  prefetch={false}
                  className="flex min-h-13 flex-wrap items-center justify-between gap-x-4 py-1"
                >
                  <span className="font-semibold underline underline-offset-4">
                    {sheetOf(draft).name || words.unnamed}
                  </span>
                  <span className="tabular text-base text-soft">
                    {words.draftLine(recentText(at, now), base === null)}
                  </span>
                </Link>
              </li>
            ))}
          </ul>
          {begin}
        </>
      )}
    </>
  );
}
