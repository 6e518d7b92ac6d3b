import type { Verdict } from "@/lib/domain/entry";
import { verdictWords } from "@/lib/domain/messages/walk";

/** A verdict in words; red and bold only where it means do not tow. */
export function VerdictText({ verdict }: { verdict: Verdict }) {
  return (
    <span className={verdict === "hold" ? "font-extrabold text-hold" : undefined}>
      {verdictWords[verdict]}
    </span>
  );
}
