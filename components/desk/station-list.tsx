import { walkWords } from "@/lib/domain/messages/desk";
import type { WalkPhoto } from "@/lib/domain/photo";
import type { ReadStation } from "@/lib/domain/walk-reading";
import { CheckRow } from "./check-row";

type StationListProps = {
  stations: readonly ReadStation[];
  photos: ReadonlyMap<string | null, readonly WalkPhoto[]>;
};

/** What was seen, station by station in walking order. */
export function StationList({ stations, photos }: StationListProps) {
  return (
    <section className="@container">
      <h2 className="text-xl leading-tight font-extrabold">{walkWords.stations}</h2>
      <p className="text-base text-soft">{walkWords.stationsSub}</p>
      {stations.map((station) => (
        <section key={station.key} className="mt-4">
          <h3 className="border-b-hair border-ink pb-1 text-base font-semibold text-soft">{station.title}</h3>
          <ul>
            {station.checks.map((check) => (
              <CheckRow key={check.check.key} read={check} photos={photos.get(check.check.key)} />
            ))}
          </ul>
        </section>
      ))}
    </section>
  );
}
