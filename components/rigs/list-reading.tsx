import { effectWords, rigWords as words } from "@/lib/domain/messages/rigs";
import type { RevisionDocument } from "@/lib/domain/revision";

type ListReadingProps = { document: RevisionDocument; title: string };

/** A revision's list as it is: station by station, what is asked and what a fault does. */
export function ListReading({ document, title }: ListReadingProps) {
  const stations = document.list.stations.filter(({ checks }) => checks.length > 0);
  return (
    <section aria-label={title}>
      {stations.map((station) => (
        <details key={station.key} className="border-b border-rule first:border-t">
          <summary className="flex min-h-11 flex-wrap items-center justify-between gap-x-3 text-base">
            <span className="font-semibold underline decoration-1 underline-offset-4">{station.title}</span>
            <span className="text-soft">{words.checks(station.checks.length)}</span>
          </summary>
          <ol className="pb-2 text-base">
            {station.checks.map((check) => (
              <li key={check.key} className="border-t border-rule py-1.5">
                {check.ask}{" "}
                <span className={check.effect === "hold" ? "font-extrabold text-hold" : "font-semibold"}>
                  {effectWords[check.effect]}
                </span>
              </li>
            ))}
          </ol>
        </details>
      ))}
    </section>
  );
}
