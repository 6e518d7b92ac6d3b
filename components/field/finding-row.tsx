import { oddLines } from "@/components/lamps/odd-lines";
import { PartDrawing } from "@/components/drawings/part-drawing";
import type { MarkBody } from "@/lib/domain/entry";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import type { Check } from "@/lib/domain/revision";
import { KeptPhotos } from "./check-photos";

const words = walkingWords.held;

type FindingRowProps = { walk: string; check: Check; absent?: boolean; mark: MarkBody | undefined };

/** A fault with its part, what was seen, how it is put right and who may do that. */
export function FindingRow({ walk, check, absent = false, mark }: FindingRowProps) {
  return (
    <li className="grid grid-cols-[min(5.5rem,25vw)_minmax(0,1fr)] gap-x-3.5 border-b-hair border-rule px-4 py-3.5 md:grid-cols-[8rem_minmax(0,1fr)]">
      <div aria-hidden="true">
        <PartDrawing part={check.part} side={check.side} drawn={check.drawn} size="small" />
      </div>
      <div>
        <h4 className="text-xl leading-tight font-extrabold">{check.ask}</h4>
        {mark?.note && <p className="mt-1 font-semibold">{mark.note}</p>}
        {oddLines(check, mark?.seen ?? {}).map((line) => (
          <p key={line} className="mt-1 font-semibold">
            {line}
          </p>
        ))}
        <div className="mt-2 empty:hidden">
          <KeptPhotos walk={walk} check={check.key} />
        </div>
        <p className="mt-1 text-[1.0625rem] text-soft">
          {absent ? fieldWords.result.markedAbsent : check.mend}
        </p>
        {!absent && (
          <p className="mt-1 text-[1.0625rem] text-soft">
            <span className="font-semibold text-ink">{words.who}:</span> {check.who ?? words.whoUsual}
          </p>
        )}
      </div>
    </li>
  );
}
