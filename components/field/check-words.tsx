import { useEffect, useRef } from "react";
import { Notice } from "@/components/ui/notice";
import { Button } from "@/components/ui/button";
import type { Outcome } from "@/lib/domain/entry";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Check } from "@/lib/domain/revision";
import { segmentOf } from "@/lib/domain/walk-reading";

type CheckWordsProps = {
  check: Check;
  mark: Outcome | undefined;
  /** While a question stands below, the focus is there. */
  asking: boolean;
  onKeep: () => void;
};

/** What a check asks, how to look, what can happen, and the mark that it has already. */
export function CheckWords({ check, mark, asking, onKeep }: CheckWordsProps) {
  const ask = useRef<HTMLHeadingElement>(null);
  useEffect(() => {
    if (!asking) ask.current?.focus({ preventScroll: true });
  }, [check.key, asking]);
  return (
    <div className="flex flex-col">
      <h2
        ref={ask}
        tabIndex={-1}
        className="px-4 pt-3.5 text-[1.5625rem] leading-[1.18] font-extrabold tracking-[-0.01em] outline-none md:text-[2rem]"
      >
        {check.ask}
      </h2>
      <p className="px-4 pt-1 text-soft md:text-xl">{check.how}</p>
      {mark && !asking && (
        <div className="flex flex-wrap items-center gap-x-3 px-4 pt-2">
          <span aria-hidden="true" className="tape flex h-6.5 w-4">
            <span className={`tape-seg tape-${segmentOf(check, mark)}`} />
          </span>
          <p className="font-semibold">{fieldWords.walk.marked(mark)}</p>
          <Button variant="quiet" className="ml-auto" onClick={onKeep}>
            {fieldWords.walk.keep}
          </Button>
        </div>
      )}
      {check.why && (
        <p className="mx-4 mt-5 hidden border-t-hair border-rule pt-4 text-soft md:block">{check.why}</p>
      )}
      {check.caution && (
        <div className="pt-3">
          <Notice>{check.caution}</Notice>
        </div>
      )}
    </div>
  );
}
