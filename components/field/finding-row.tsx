import { PartDrawing } from "@/components/drawings/part-drawing";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Check } from "@/lib/domain/revision";

type FindingRowProps = { check: Check; absent?: boolean };

/** A fault with its part, what was asked of it and how it is put right. */
export function FindingRow({ check, absent = false }: FindingRowProps) {
  return (
    <li className="grid grid-cols-[min(5.5rem,25vw)_minmax(0,1fr)] gap-x-3.5 border-b-hair border-rule px-4 py-3.5 md:grid-cols-[8rem_minmax(0,1fr)]">
      <div aria-hidden="true">
        <PartDrawing part={check.part} side={check.side} drawn={check.drawn} size="small" />
      </div>
      <div>
        <h4 className="text-xl leading-tight font-extrabold">{check.ask}</h4>
        <p className="mt-1 text-[1.0625rem] text-soft">
          {absent ? fieldWords.result.markedAbsent : check.mend}
        </p>
      </div>
    </li>
  );
}
