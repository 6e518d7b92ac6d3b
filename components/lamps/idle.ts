import { useState } from "react";
import type { Marking } from "@/components/field/marking";
import { useSettled } from "@/components/field/settling";
import { idleStep, type IdleSeen } from "@/lib/domain/brake-idle";
import { brakeIdleWords } from "@/lib/domain/messages/lamps";

/** The answers about an idle brake so far; the one that decides it saves the mark. */
export function useIdle(marking: Marking) {
  const [said, setSaid] = useState<IdleSeen[]>([]);
  const seen: IdleSeen = Object.assign({}, ...said);
  const settled = useSettled(String(said.length));
  return {
    seen,
    say(answer: IdleSeen) {
      if (!settled()) return;
      const step = idleStep({ ...seen, ...answer });
      if ("ask" in step) return setSaid([...said, answer]);
      void marking.mark(step.outcome, { note: brakeIdleWords.notes[step.how] });
    },
    back() {
      if (said.length === 0) marking.back();
      else if (settled()) setSaid(said.slice(0, -1));
    },
  };
}
