import { purposes, type Depth, type Purpose } from "../entry";
import { stationKeys, type Check, type RevisionDocument, type StationKey } from "../revision";

const titles: Record<StationKey, string> = {
  "coach-tail": "Coach tail",
  "car-nose": "Car nose",
  "cables-and-cord": "Cables and cord",
  "car-cabin": "Car cabin",
  pull: "Pull",
  "car-tail": "Car tail",
  "last-look": "Last look",
};

/** What a document is put together from: the checks at each station, and those of each walk in walking order. */
interface Composed {
  sheet: RevisionDocument["sheet"];
  catalogue: string;
  checks: Record<StationKey, Check[]>;
  walks: Record<Purpose, Check[]>;
}

/** A revision document. A short walk takes the holds of the full one. */
export function documentOf({ sheet, catalogue, checks, walks }: Composed): RevisionDocument {
  const depths = (list: Check[]): Record<Depth, string[]> => ({
    full: list.map(({ key }) => key),
    short: list.filter(({ effect }) => effect === "hold").map(({ key }) => key),
  });
  return {
    v: 1,
    sheet,
    catalogue,
    list: { stations: stationKeys.map((key) => ({ key, title: titles[key], checks: checks[key] })) },
    walks: Object.fromEntries(
      purposes.map((purpose) => [purpose, depths(walks[purpose])]),
    ) as RevisionDocument["walks"],
  };
}
