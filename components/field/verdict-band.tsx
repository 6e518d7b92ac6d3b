import type { RefObject } from "react";
import type { Verdict } from "@/lib/domain/entry";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Tally } from "./walk-plan";

type VerdictBandProps = { verdict: Verdict; tally: Tally; heading: RefObject<HTMLHeadingElement | null> };

const looks: Record<Verdict, string> = {
  hold: "hold-band text-paper",
  "no-hold": "border-y-[3px] border-ink",
  unfinished: "unlit border-y-[3px] border-ink",
};

const measures: Record<Verdict, string> = {
  // Clear of the diagonal tape.
  hold: "max-w-[68%]",
  "no-hold": "",
  // Clear of the hatching.
  unfinished: "w-fit bg-paper px-2 py-1",
};

/** The verdict, large. Red and the diagonal tape are for "do not tow" alone. */
export function VerdictBand({ verdict, tally, heading }: VerdictBandProps) {
  const words = (
    <>
      <h2
        ref={heading}
        tabIndex={-1}
        className="text-[2.5rem] leading-none font-extrabold tracking-[-0.01em] outline-none md:text-[3.25rem]"
      >
        {fieldWords.verdict[verdict]}
      </h2>
      <p className="mt-2">{fieldWords.result.band(tally.holds.length, tally.lookedAt, tally.total)}</p>
    </>
  );
  return (
    <div className={`forced-color-adjust-none px-4 py-5 md:py-7 ${looks[verdict]}`}>
      <div className={measures[verdict]}>{words}</div>
    </div>
  );
}
