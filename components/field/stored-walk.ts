import { useEffect, useState } from "react";
import type { WalkView } from "@/lib/client/recorder";
import type { KeptWalk } from "@/lib/client/walk-shelf";
import { replay } from "@/lib/domain/replay";
import { theField } from "./browser-field";

async function readStored(kept: KeptWalk): Promise<WalkView | null> {
  const { shelf } = theField().sync;
  const [document, links] = await Promise.all([shelf.document(kept.revision), shelf.links(kept.id)]);
  if (!document) return null;
  return {
    walk: kept,
    interruption: null,
    document,
    replay: replay(
      document,
      links.map((link) => link.entry),
    ),
  };
}

/** A walk on this phone as its entries have it, read without recording it and read again when it grew; null until then. */
export function useStoredWalk(kept: KeptWalk | undefined): WalkView | null {
  const [stored, setStored] = useState<WalkView | null>(null);
  const head = kept?.head;
  useEffect(() => {
    if (!kept) return;
    let current = true;
    readStored(kept).then(
      (view) => current && setStored(view),
      () => {},
    );
    return () => {
      current = false;
    };
    // The entries change only with the head; the row beside them changes more often.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [kept?.id, head]);
  return stored?.walk.id === kept?.id ? stored : null;
}
