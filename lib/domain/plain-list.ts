import { purposes, type Depth, type Purpose } from "./entry";
import { stationKeys, type Check, type RevisionDocument, type StationKey } from "./revision";

const titles: Record<StationKey, string> = {
  "coach-tail": "Coach tail",
  "car-nose": "Car nose",
  "cables-and-cord": "Cables and cord",
  "car-cabin": "Car cabin",
  pull: "Pull",
  "car-tail": "Car tail",
  "last-look": "Last look",
};

/** A list by hand: the checks at each station, and which of them each kind of walk takes, in walking order. */
export interface PlainList {
  sheet: RevisionDocument["sheet"];
  /** Where the checks come from. */
  catalogue: string;
  checks: Record<StationKey, Check[]>;
  walks: Record<Purpose, Check[]>;
}

/** The revision document of a list by hand. A short walk takes the holds of the full one. */
export function plainDocument({ sheet, catalogue, checks, walks }: PlainList): RevisionDocument {
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
