import { purposes, type Depth, type Purpose } from "@/lib/domain/entry";
import { stationKeys, type Check, type RevisionDocument, type StationKey } from "@/lib/domain/revision";

const titles: Record<StationKey, string> = {
  "coach-tail": "Coach tail",
  "car-nose": "Car nose",
  "cables-and-cord": "Cables and cord",
  "car-cabin": "Car cabin",
  pull: "Pull",
  "car-tail": "Car tail",
  "last-look": "Last look",
};

/** A hand-written list: the checks at each station, and which of them each kind of walk takes, in walking order. */
export interface HandWritten {
  sheet: RevisionDocument["sheet"];
  checks: Record<StationKey, Check[]>;
  walks: Record<Purpose, Check[]>;
}

/** The revision document of a hand-written list. A short walk takes the holds of the full one. */
export function revisionDocument({ sheet, checks, walks }: HandWritten): RevisionDocument {
  const depths = (list: Check[]): Record<Depth, string[]> => ({
    full: list.map(({ key }) => key),
    short: list.filter(({ effect }) => effect === "hold").map(({ key }) => key),
  });
  return {
    v: 1,
    sheet,
    catalogue: "hand-written 1",
    list: { stations: stationKeys.map((key) => ({ key, title: titles[key], checks: checks[key] })) },
    walks: Object.fromEntries(
      purposes.map((purpose) => [purpose, depths(walks[purpose])]),
    ) as RevisionDocument["walks"],
  };
}
