import type { ReactNode } from "react";
import { fieldWords } from "@/lib/domain/messages/field";
import type { Replay } from "@/lib/domain/replay";
import { FindingRow } from "./finding-row";
import type { Tally } from "./walk-plan";

const words = fieldWords.result;

type FindingsProps = { walk: string; tally: Tally; marks: Replay["marks"] };

/** What holds the rig and what is to be fixed soon, each with what was seen and what mends it. */
export function Findings({ walk, tally, marks }: FindingsProps) {
  return (
    <>
      {tally.holds.length > 0 && (
        <Rows title={words.holds} quiet>
          {tally.holds.map(({ check, absent }) => (
            <FindingRow
              key={check.key}
              walk={walk}
              check={check}
              absent={absent}
              mark={marks.get(check.key)}
            />
          ))}
        </Rows>
      )}
      {tally.fixes.length > 0 && (
        <Rows title={words.fixes}>
          {tally.fixes.map((check) => (
            <FindingRow key={check.key} walk={walk} check={check} mark={marks.get(check.key)} />
          ))}
        </Rows>
      )}
    </>
  );
}

function Rows({ title, quiet = false, children }: { title: string; quiet?: boolean; children: ReactNode }) {
  return (
    <section>
      <h3 className={quiet ? "sr-only" : "px-4 pt-4 pb-1 font-extrabold"}>{title}</h3>
      <ul>{children}</ul>
    </section>
  );
}
