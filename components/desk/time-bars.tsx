import { clockText } from "@/lib/client/time-words";
import { walkWords } from "@/lib/domain/messages/desk";
import type { ReadStation, Segment } from "@/lib/domain/walk-reading";

type TimeBarsProps = { stations: readonly ReadStation[]; total: string };

/** Walking time by station, a bar a check, all to one scale. */
export function TimeBars({ stations, total }: TimeBarsProps) {
  const longestMs = Math.max(...stations.map(({ tookMs }) => tookMs), 1);
  return (
    <section className="@container">
      <h2 className="text-xl leading-tight font-extrabold">{walkWords.timeTitle}</h2>
      <p className="text-base text-soft">{walkWords.timeSub(total)}</p>
      <ul className="mt-3">
        {stations.map((station) => (
          <li
            key={station.key}
            className="grid grid-cols-[minmax(0,1fr)_auto] items-center @xs:grid-cols-[8.5rem_minmax(0,1fr)_3rem] gap-x-2.5 py-1.5 text-base"
          >
            <span className="leading-tight">{station.title}</span>
            <Bars station={station} longestMs={longestMs} />
            <span className="tabular text-right text-[0.9375rem]">
              {station.tookMs > 0 && clockText(station.tookMs)}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}

const fills: Partial<Record<Segment, string>> = { hold: "fill-hold", unseen: "fill-none stroke-ink" };

function Bars({ station, longestMs }: { station: ReadStation; longestMs: number }) {
  const percent = (ms: number) => (ms / longestMs) * 100;
  const bars = station.checks
    .filter(({ tookMs }) => tookMs > 0)
    .map(({ check, segment, tookMs }, at, all) => {
      const beforeMs = all.slice(0, at).reduce((total, bar) => total + bar.tookMs, 0);
      return { key: check.key, segment, x: percent(beforeMs), width: percent(tookMs) };
    });
  return (
    <svg
      aria-hidden="true"
      width="100%"
      height="22"
      className="block overflow-visible @max-xs:order-last @max-xs:col-span-2"
    >
      {bars.map(({ key, segment, x, width }) => (
        // The gap between two bars is the paper-colored edge of each: percentages and pixels do not mix in an x.
        <rect
          key={key}
          x={`${x}%`}
          y="0"
          width={`${width}%`}
          height="22"
          strokeWidth="2"
          strokeDasharray={segment === "unseen" ? "2 2" : undefined}
          className={fills[segment] ?? "fill-ink stroke-paper"}
        />
      ))}
    </svg>
  );
}
