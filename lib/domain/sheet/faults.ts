import { sheetFaultWords as say } from "../messages/sheet-faults";
import type { FieldError } from "../problem";
import { siOf, type QuantityOf } from "./quantity";
import type { Sheet } from "./sheet";

type Mass = QuantityOf<"mass"> | null | undefined;
type Length = QuantityOf<"length"> | null | undefined;

const kg = (mass: Mass) => (mass ? siOf("mass", mass) : null);
const m = (length: Length) => (length ? siOf("length", length) : null);

/** Both known and the first less than the second. */
function less(a: number | null, b: number | null): boolean {
  return a !== null && b !== null && a < b - 1e-6;
}

/** What cannot be so on any vehicle: a sheet with such a thing is refused, with the field named. */
export function impossible({ coach = {}, car = {}, wiring = {} }: Sheet): FieldError[] {
  const found: [boolean, string, string][] = [
    [less(kg(coach.gcwr), kg(coach.gvwr)), "/coach/gcwr", say.gcwrBelowGvwr],
    [less(m(coach.length), m(coach.wheelbase)), "/coach/wheelbase", say.wheelbaseOverLength],
    [less(m(car.length), m(car.wheelbase)), "/car/wheelbase", say.wheelbaseOverLength],
    [kg(coach.gvwr) === 0, "/coach/gvwr", say.zero],
    [kg(coach.gcwr) === 0, "/coach/gcwr", say.zero],
    [kg(car.curb) === 0, "/car/curb", say.zero],
    [kg(car.loaded) === 0, "/car/loaded", say.zero],
  ];
  (wiring.segments ?? []).forEach(({ gaugeAwg }, at) =>
    found.push([gaugeAwg === 0, `/wiring/segments/${at}/gaugeAwg`, say.zero]),
  );
  return found.flatMap(([is, pointer, detail]) => (is ? [{ pointer, detail }] : []));
}

/** What is taken but hardly ever so: worth a second look at the plate. */
export function unusual({ coach = {}, car = {}, gear = {} }: Sheet): FieldError[] {
  const axles = sum(kg(coach.frontAxleRating), kg(coach.rearAxleRating));
  const found: [boolean, string, string][] = [
    [less(kg(car.loaded), kg(car.curb)), "/car/loaded", say.loadedBelowCurb],
    [less(kg(coach.frontAxleRating), kg(coach.frontAxleLoaded)), "/coach/frontAxleLoaded", say.axleOver],
    [less(kg(coach.rearAxleRating), kg(coach.rearAxleLoaded)), "/coach/rearAxleLoaded", say.axleOver],
    [less(kg(coach.tagAxleRating), kg(coach.tagAxleLoaded)), "/coach/tagAxleLoaded", say.axleOver],
    [!coach.tagAxleRating && less(axles, kg(coach.gvwr)), "/coach/gvwr", say.gvwrOverAxles],
    [less(kg(coach.towLimitBraked), kg(coach.towLimitUnbraked)), "/coach/towLimitUnbraked", say.unbrakedOver],
    [outside(kg(car.curb), 500, 4000), "/car/curb", say.carWeight],
    [outside(kg(coach.gvwr), 2500, 30000), "/coach/gvwr", say.coachWeight],
    [outside(m(coach.receiverHeight), 0.25, 0.9), "/coach/receiverHeight", say.height],
    [outside(m(car.basePlateHeight), 0.2, 0.9), "/car/basePlateHeight", say.height],
    [
      gear.cables?.count !== undefined && gear.cables.count !== null && gear.cables.count !== 2,
      "/gear/cables/count",
      say.twoCables,
    ],
  ];
  return found.flatMap(([is, pointer, detail]) => (is ? [{ pointer, detail }] : []));
}

function sum(a: number | null, b: number | null): number | null {
  return a === null || b === null ? null : a + b;
}

function outside(value: number | null, least: number, most: number): boolean {
  return value !== null && (value < least || value > most);
}
