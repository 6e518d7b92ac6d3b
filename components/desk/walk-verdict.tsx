import type { WalkReading } from "@/lib/domain/history";
import { stripWords, verdictSentence, walkWords } from "@/lib/domain/messages/desk";
import { deference, verdictWords } from "@/lib/domain/messages/walk";
import type { ReadWalk } from "@/lib/domain/walk-reading";
import { Strip } from "../tape/strip";

type WalkVerdictProps = { reading: WalkReading; read: ReadWalk; took: string };

/** What a walk came to: the verdict, its strip of tape, the sentence, and the holds by name. */
export function WalkVerdict({ reading, read, took }: WalkVerdictProps) {
  const { verdict } = reading.walk;
  const stations = read.stations.map(({ key, title, checks }) => ({
    key,
    title,
    segments: checks.map(({ segment }) => segment),
  }));
  const holds = read.stations.flatMap(({ checks }) => checks.filter(({ segment }) => segment === "hold"));
  const counts = { lookedAt: read.lookedAt, asked: read.asked, holds: holds.length };
  return (
    <section aria-label={verdictWords[verdict]} className="mt-6">
      <h2 className={`text-[2.25rem] leading-none font-extrabold ${verdict === "hold" ? "text-hold" : ""}`}>
        {verdictWords[verdict]}
      </h2>
      <div className="mt-4 mb-4 max-w-3xl">
        <Strip stations={stations} label={stripWords(stations)} />
      </div>
      <div className="max-w-prose space-y-2">
        <p>{verdictSentence(counts, took)}</p>
        {holds.length > 0 && (
          <ul className="border-y-hair border-rule" aria-label={walkWords.holds}>
            {holds.map(({ check }) => (
              <li key={check.key} className="not-first:border-t not-first:border-rule">
                <a
                  href={`#${check.key}`}
                  className="flex min-h-11 items-center gap-3 py-1 font-semibold hover:underline"
                >
                  <span aria-hidden="true" className="tape flex w-4 shrink-0">
                    <span className="tape-seg tape-hold h-6" />
                  </span>
                  {check.ask}
                </a>
              </li>
            ))}
          </ul>
        )}
        {reading.closedAs && <p className="font-semibold">{walkWords.closedAs(reading.closedAs)}</p>}
        {reading.walk.state === "open" && (
          <p>
            <span className="font-semibold">{walkWords.stillOpen(reading.entries.length)}.</span>{" "}
            {walkWords.stillOpenMore}
          </p>
        )}
        <p className="text-base text-soft">{deference}</p>
      </div>
    </section>
  );
}
