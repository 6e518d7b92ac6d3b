import type { Verdict } from "@/lib/domain/entry";

const segment = { hold: "hold", unfinished: "todo" } as const;

/** A verdict as one segment of tape beside its words; none for "no hold", which would look like an empty box. */
export function VerdictMark({ verdict }: { verdict: Verdict }) {
  if (verdict === "no-hold") return null;
  return (
    <span aria-hidden="true" className="tape inline-flex h-6.5 w-4 shrink-0">
      <span className={`tape-seg tape-${segment[verdict]}`} />
    </span>
  );
}
