import { useEffect, useRef } from "react";
import { Notice } from "@/components/ui/notice";
import { Button } from "@/components/ui/button";
import type { MarkBody } from "@/lib/domain/entry";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import type { Check } from "@/lib/domain/revision";
import type { Marking } from "./marking";
import { segmentOf } from "@/lib/domain/walk-reading";
import { WhyListed } from "./why-listed";

type CheckWordsProps = {
  check: Check;
  mark: MarkBody | undefined;
  /** The fault that was marked before and is not answered yet. */
  before?: MarkBody;
  /** The marks stand on a card and are only copied. */
  copying?: boolean;
  marking: Marking;
};

/** What a check asks, how to look, what can happen, and the mark that it has already. */
export function CheckWords({ check, mark, before, copying = false, marking }: CheckWordsProps) {
  // While a question stands below, the focus is there.
  const asking = marking.asking !== null;
  const ask = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    if (!asking) ask.current?.focus({ preventScroll: true });
  }, [check.key, asking]);
  return (
    <div className="flex flex-col">
      <WhyListed check={check} off={asking}>
        <h2
          ref={ask}
          tabIndex={-1}
          className="px-4 pt-3.5 text-[1.5625rem] leading-[1.18] font-extrabold tracking-[-0.01em] outline-none md:text-[2rem]"
        >
          {check.ask}
        </h2>
        {!asking && (
          <p className="px-4 pt-1 text-soft md:text-xl">{copying ? walkingWords.paper.copy : check.how}</p>
        )}
      </WhyListed>
      {!mark && before && !asking && (
        <p className="px-4 pt-2 font-semibold">
          {before.note ? walkingWords.details.before(before.note) : walkingWords.details.beforeBare}
        </p>
      )}
      {mark && !asking && (
        <div className="flex flex-wrap items-center gap-x-3 px-4 pt-2">
          <span aria-hidden="true" className="tape flex h-6.5 w-4">
            <span className={`tape-seg tape-${segmentOf(check, mark.outcome)}`} />
          </span>
          <p className="min-w-0 flex-[1_1_12rem] font-semibold">
            {fieldWords.walk.marked(mark.outcome)}
            {mark.note && <span className="block text-base font-normal text-soft">{mark.note}</span>}
            {mark.measured && <Reading {...(mark.measured.entered ?? mark.measured)} />}
          </p>
          {mark.outcome === "fault" && (
            <Button variant="quiet" onClick={() => marking.ask("details")}>
              {walkingWords.details.more}
            </Button>
          )}
          <Button variant="quiet" className="ml-auto" onClick={marking.skip}>
            {fieldWords.walk.keep}
          </Button>
        </div>
      )}
      {check.caution && !asking && !copying && (
        <div className="pt-3">
          <Notice>{check.caution}</Notice>
        </div>
      )}
    </div>
  );
}

function Reading({ value, unit }: { value: number; unit: string }) {
  return (
    <span className="block text-base font-normal text-soft">
      {walkingWords.measure.read(String(value), unit)}
    </span>
  );
}
