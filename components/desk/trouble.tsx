"use client";

import { isRefusal, Refused } from "@/lib/client/desk-queries";
import { deskWords, troubleWords } from "@/lib/domain/messages/desk";
import { Button } from "../ui/button";
import { Notice } from "../ui/notice";

type TroubleProps = { error: Error; retry: () => void; busy: boolean };

/** Why there is nothing to read, and the one thing to do about it. */
export function Trouble({ error, retry, busy }: TroubleProps) {
  if (isRefusal(error, "signed-out")) {
    return (
      <p role="status" className="py-4">
        {deskWords.sendingToSignIn}
      </p>
    );
  }
  const refused = error instanceof Refused ? error.problem : null;
  const title = refused && (refused.status < 500 ? troubleWords.refusedTitle : troubleWords.brokenTitle);
  return (
    <Notice tone="plain" live title={title ?? troubleWords.unreachedTitle}>
      <p className="max-w-prose">{refused?.title ?? troubleWords.unreached}</p>
      <Button size="desk" className="mt-4" onClick={retry} aria-disabled={busy || undefined}>
        {deskWords.again}
      </Button>
    </Notice>
  );
}
