import type { Envelope } from "@/lib/domain/field";

/** What one envelope brings for one walk. */
export interface WalkBatch {
  walk: string;
  /** As received, ordered by sequence number; equal numbers stay in the order in which they came. */
  entries: Envelope["entries"];
  seals: Envelope["seals"];
}

/** Sorts an envelope out by walk, in the order in which the walks are first named. */
export function batchesOf({ entries, seals }: Envelope): WalkBatch[] {
  const batches = new Map<string, WalkBatch>();
  const batchFor = (walk: string): WalkBatch => {
    const batch = batches.get(walk) ?? { walk, entries: [], seals: [] };
    batches.set(walk, batch);
    return batch;
  };
  for (const entry of entries) batchFor(entry.walk).entries.push(entry);
  for (const seal of seals) batchFor(seal.walk).seals.push(seal);
  for (const batch of batches.values()) batch.entries.sort((a, b) => a.seq - b.seq);
  return [...batches.values()];
}
