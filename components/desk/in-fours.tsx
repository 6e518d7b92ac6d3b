import { inFours } from "@/lib/client/time-words";

/** A digest in groups of four. The groups stand apart by margin, not by spaces, so that it is copied whole. */
export function InFours({ text }: { text: string }) {
  return (
    <span className="tabular flex flex-wrap gap-x-[0.6em] text-sm">
      {inFours(text).map((group, at) => (
        <span key={at}>{group}</span>
      ))}
    </span>
  );
}
