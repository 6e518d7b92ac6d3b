import { originWords } from "@/lib/domain/messages/rigs";
import type { Origin } from "@/lib/domain/revision";

/** Where a check comes from: marked as rule, manual or common practice, then which. */
export function OriginLine({ origin: { kind, says } }: { origin: Origin }) {
  return (
    <>
      <span className="mr-1.5 inline-block border-hair border-ink px-1.5 text-[0.9375em] leading-snug font-semibold">
        {originWords[kind]}
      </span>
      {says}
    </>
  );
}
