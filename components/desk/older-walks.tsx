import { historyWords, troubleWords } from "@/lib/domain/messages/desk";
import { Button } from "../ui/button";

type OlderWalksProps = { shown: number; more: boolean; busy: boolean; failed: boolean; fetch: () => void };

/** The foot of the history: how much of it is here, and the rest on demand. */
export function OlderWalks({ shown, more, busy, failed, fetch }: OlderWalksProps) {
  return (
    <div className="flex flex-wrap items-center gap-x-5 gap-y-2 px-2 py-4">
      {more && (
        <Button size="desk" onClick={() => !busy && fetch()} aria-disabled={busy || undefined}>
          {busy ? historyWords.fetchingOlder : historyWords.older}
        </Button>
      )}
      <p role="status" className="text-base text-soft">
        {more ? historyWords.shown(shown) : historyWords.allShown(shown)}
      </p>
      {failed && (
        <p role="alert" className="text-base font-semibold">
          {troubleWords.unreachedTitle}
        </p>
      )}
    </div>
  );
}
