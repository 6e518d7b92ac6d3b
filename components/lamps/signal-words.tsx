import { useEffect, useRef } from "react";
import { WhyListed } from "@/components/field/why-listed";
import type { Seen } from "@/lib/domain/lamp-board";
import type { Check } from "@/lib/domain/revision";
import { lampBoardWords as words } from "@/lib/domain/messages/lamps";
import type { Board } from "./board";
import { oddLines } from "./odd-lines";

type SignalWordsProps = {
  check: Check;
  board: Board;
  /** What the check's mark has so far. */
  seen: Seen;
  /** A question stands below, and has the focus. */
  quiet: boolean;
  /** A script goes from signal to signal. */
  running: boolean;
};

/** The signal in a big word, what the driver does for it, and what comes next. */
export function SignalWords({ check, board, seen, quiet, running }: SignalWordsProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  const { signal, next, view } = board;
  useEffect(() => {
    if (!quiet && view === "signal") heading.current?.focus({ preventScroll: true });
  }, [signal, quiet, view]);
  return (
    <div className="flex flex-col">
      <WhyListed check={check} off={quiet || running || view !== "signal"}>
        <div className="px-4">
          <h2
            ref={heading}
            tabIndex={-1}
            className="pt-3.5 text-[1.875rem] leading-[1.1] font-extrabold tracking-[-0.01em] outline-none md:text-[2.5rem]"
          >
            {quiet ? check.ask : words.signal[signal]}
          </h2>
          {quiet &&
            oddLines(check, seen).map((line) => (
              <p key={line} className="pt-1 font-semibold">
                {line}
              </p>
            ))}
          {!quiet && (
            <>
              <p className="pt-1 text-soft md:text-xl">{words.driver[signal]}</p>
              {(!running || board.answered) && (
                <p className="pt-1 text-base text-soft">{running ? words.answered : words.next(next)}</p>
              )}
              {check.lamps?.layout === "separate" && (
                <p className="pt-1 text-base text-soft">{words.separate}</p>
              )}
            </>
          )}
        </div>
      </WhyListed>
    </div>
  );
}
