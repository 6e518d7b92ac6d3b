"use client";

import { useMutation, useQueryClient } from "@tanstack/react-query";
import { isRefusal, Refused } from "@/lib/client/desk-queries";
import { reviseRig } from "@/lib/client/rig-queries";
import { compose } from "@/lib/domain/catalogue/compose";
import { newerListWords as words } from "@/lib/domain/messages/rigs";
import type { RigReading } from "@/lib/domain/rigs";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { Button } from "../ui/button";
import { ListChanges } from "./list-changes";

type NewerListProps = {
  reading: RigReading;
  sheet: Sheet;
  /** Told what came of taking it; the rig is read again, and this goes with the revision that it was about. */
  onOutcome: (says: string) => void;
};

/** What today's catalogue would make of the same sheet, offered as a revision to whoever may save one. */
export function NewerList({ reading, sheet, onOutcome }: NewerListProps) {
  const queries = useQueryClient();
  const { mutate, isPending, error } = useMutation({
    networkMode: "always",
    mutationFn: () => reviseRig(reading.id, reading.revision.digest, sheet),
    onSuccess: async ({ revision }) => {
      await queries.invalidateQueries();
      onOutcome(words.taken(revision.number));
    },
    onError: async (refusal) => {
      if (!isRefusal(refusal, "stale-base")) return;
      await queries.invalidateQueries();
      onOutcome(words.stale);
    },
  });
  return (
    <section className="@container mt-6 border-2 border-ink p-4 print:hidden">
      <h2 className="text-xl leading-tight font-extrabold">{words.title}</h2>
      <p className="mt-1 max-w-prose text-base">{words.lead}</p>
      <ListChanges before={reading.document} after={compose(sheet)} />
      <p className="mt-3 max-w-prose text-base text-soft">{words.walks}</p>
      {reading.mayWrite ? (
        <Button
          variant="good"
          size="desk"
          className="mt-3"
          aria-disabled={isPending || undefined}
          onClick={() => !isPending && mutate()}
        >
          {isPending ? words.taking : words.take}
        </Button>
      ) : (
        <p className="mt-2 text-base font-semibold">{words.reader}</p>
      )}
      <p role="alert" className="mt-2 text-base font-semibold empty:hidden">
        {error && !isRefusal(error, "stale-base") && sayOf(error)}
      </p>
    </section>
  );
}

function sayOf(error: Error): string {
  return error instanceof Refused ? error.problem.title : words.failed;
}
