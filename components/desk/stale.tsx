import { clockTimeText } from "@/lib/client/time-words";
import { deskWords, troubleWords } from "@/lib/domain/messages/desk";
import { Button } from "../ui/button";
import { Notice } from "../ui/notice";

/** Says that what is shown was read a while ago. */
export function Stale({ since, retry }: { since: number; retry: () => void }) {
  return (
    <div className="mb-4">
      <Notice tone="plain" live>
        <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 text-base">
          <p>
            <span className="font-extrabold">{troubleWords.staleTitle}.</span>{" "}
            {troubleWords.stale(clockTimeText(since))}
          </p>
          <Button size="desk" onClick={retry}>
            {deskWords.again}
          </Button>
        </div>
      </Notice>
    </div>
  );
}
