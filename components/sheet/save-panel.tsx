import { Button, buttonClass } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { signInPath } from "@/lib/client/session";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { problems } from "@/lib/domain/problem";
import { PlaceLinks } from "./place-links";
import type { SectionBodyProps } from "./section-body";
import { StalePanel } from "./stale-panel";
import { useSaving } from "./use-saving";

/** The button that saves, and what came of it. */
export function SavePanel(props: Omit<SectionBodyProps, "section">) {
  const { saving, save, saveMerged } = useSaving(props);
  const busy = saving.is === "saving";
  if (saving.is === "stale") return <StalePanel stale={saving.stale} onSave={saveMerged} />;
  return (
    <div className="mt-3 flex flex-col gap-4">
      <Button
        variant="good"
        size="desk"
        onClick={() => void save()}
        aria-disabled={busy || undefined}
        className="min-h-14 text-lg"
      >
        {busy ? words.saving : words.save}
      </Button>
      <div role="status">
        {saving.is === "faulty" && props.faults.length > 0 && (
          <Notice tone="plain" title={words.errorsTitle}>
            <PlaceLinks errors={props.faults} onGo={props.onGo} />
          </Notice>
        )}
        {saving.is === "unreached" && <p className="font-semibold">{words.unreached}</p>}
        {saving.is === "signed-out" && (
          <>
            <p className="mb-2 font-semibold">{words.signedOut}</p>
            <a href={signInPath(window.location)} className={buttonClass("plain", "desk")}>
              {words.signIn}
            </a>
          </>
        )}
        {saving.is === "refused" && (
          <Notice tone="plain" title={words.refused}>
            <p>{problems[saving.problem.code].title}</p>
            <PlaceLinks errors={saving.errors} onGo={props.onGo} />
          </Notice>
        )}
      </div>
    </div>
  );
}
