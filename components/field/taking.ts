import { useState } from "react";
import { MovedOn } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { isSecondTap } from "./settling";

/** Something that is saved by one tap: at most one at a time, none by a second tap, and a refusal is said. */
export interface Taking {
  take: (work: () => Promise<unknown>) => void;
  trouble: string | null;
}

/** Runs what a button saves, one thing at a time. */
export function useTaking(settled: () => boolean = () => !isSecondTap()): Taking {
  const [busy, setBusy] = useState(false);
  const [trouble, setTrouble] = useState<string | null>(null);
  return {
    take(work) {
      if (busy || !settled()) return;
      setBusy(true);
      work()
        .then(
          () => setTrouble(null),
          (error) => setTrouble(troubleOf(error)),
        )
        .finally(() => setBusy(false));
    },
    trouble,
  };
}

/** What to say when the phone did not keep something. */
export function troubleOf(error: unknown): string {
  const { movedOn, notSaved } = fieldWords.walk;
  return error instanceof MovedOn ? movedOn : notSaved;
}
