import { useEffect, useState } from "react";
import { waiting, type Waiting } from "@/lib/client/sign-up";
import { openStore } from "@/lib/client/store";
import { WalkShelf } from "@/lib/client/walk-shelf";

/** What was made on this phone without an account; null where nothing was, or it cannot be read. */
export function useWaiting(): Waiting | null {
  const [found, setFound] = useState<Waiting | null>(null);
  useEffect(() => {
    let here = true;
    const shelf = new WalkShelf(openStore());
    waiting(shelf.store, () => shelf.walks()).then(
      (outcome) => here && setFound(outcome),
      () => {},
    );
    return () => {
      here = false;
    };
  }, []);
  return found;
}
