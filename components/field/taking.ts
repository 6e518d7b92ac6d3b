import { useState } from "react";
import { feel } from "@/lib/client/feel";
import { isSecondTap } from "./settling";

/** Something that is saved by one tap: at most one at a time, none by a second tap, and a refusal is said. */
export interface Taking {
  take: (work: () => Promise<unknown>) => void;
  /** What the store said when it did not keep something; null where there is nothing to say. */
  error: unknown;
}

/** Runs what a button saves, one thing at a time. */
export function useTaking(settled: () => boolean = () => !isSecondTap()): Taking {
  const [busy, setBusy] = useState(false);
  const [error, setError] = useState<unknown>(null);
  return {
    take(work) {
      if (busy || !settled()) return;
      setBusy(true);
      work()
        .then(
          () => setError(null),
          (thrown: unknown) => {
            feel("trouble");
            setError(thrown);
          },
        )
        .finally(() => setBusy(false));
    },
    error,
  };
}
