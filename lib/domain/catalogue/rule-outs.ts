import { ruleOutWords as say } from "../messages/catalogue-rule-outs";
import type { Quantity } from "../messages/catalogue-figures";
import { figure, inUnitOf } from "../messages/catalogue-figures";
import { siOf, type QuantityOf } from "../sheet/quantity";
import type { Coach, Gear, Sheet } from "../sheet/sheet";
import { manualOf } from "./manual";

/** Why a sheet rules its rig out. `code` stays the same from version to version; `says` is the sentence. */
export interface RuleOut {
  code: string;
  says: string;
}

type Mass = QuantityOf<"mass">;

/**
 * Everything on a sheet that rules the rig out: what the manual says, a missing brake, and makers' figures that the
 * car goes beyond. Only what is known is compared: a figure that is missing rules nothing out and allows nothing.
 */
export function ruledOut(sheet: Sheet): RuleOut[] {
  return [...byManual(sheet), ...byBrake(sheet), ...byRatings(sheet), ...byGcwr(sheet), ...byLevel(sheet)];
}

function byManual(sheet: Sheet): RuleOut[] {
  const { says } = manualOf(sheet);
  if (says === "forbidden") return [{ code: "manual-forbids", says: say.manualForbids }];
  return says === "not-recorded" ? [{ code: "manual-not-recorded", says: say.manualNotRecorded }] : [];
}

function byBrake({ coach, car, gear }: Sheet): RuleOut[] {
  if (gear?.brake?.family !== "none") return [];
  const limit = coach?.towLimitUnbraked;
  const weight = car?.loaded ?? car?.curb;
  const beside = limit && weight ? ` ${say.unbraked(figure(limit), figure(weight))}` : "";
  return [{ code: "no-brake", says: say.noBrake + beside }];
}

/** What the car weighs as far as the sheet knows, and the words for it. */
function weightOf({ car }: Sheet): { mass: Mass; words: string } | null {
  if (car?.loaded) return { mass: car.loaded, words: say.loaded(figure(car.loaded)) };
  return car?.curb ? { mass: car.curb, words: say.curb(figure(car.curb)) } : null;
}

function byRatings(sheet: Sheet): RuleOut[] {
  const weight = weightOf(sheet);
  if (!weight) return [];
  const over = ratingsOf(sheet.gear ?? {}, sheet.coach ?? {}).filter(
    ({ rating, pieces }) => rating && kg(weight.mass) > kg(rating) * pieces + ROUNDING,
  );
  return over.map(({ code, name, rating, pieces }) => ({
    code,
    says: say.over(weight.words, name, pieces === 1 ? figure(rating!) : say.each(pieces, figure(rating!))),
  }));
}

interface Rated {
  code: string;
  name: string;
  rating: Mass | null | undefined;
  pieces: number;
}

/** Everything that the car's weight hangs on, with its maker's rating. */
function ratingsOf(gear: Gear, coach: Coach): Rated[] {
  const drop = gear.dropReceiver?.there === false ? null : gear.dropReceiver?.rating;
  const { cables } = gear;
  const one = (code: keyof typeof say.rated, rating: Rated["rating"], pieces = 1): Rated => ({
    code,
    name: say.rated[code],
    rating,
    pieces,
  });
  return [
    one("over-receiver", coach.receiverRating),
    one("over-tow-limit", coach.towLimitBraked),
    one("over-drop-receiver", drop),
    one("over-coupler", gear.towBar?.coupling === "direct" ? null : gear.coupler?.rating),
    one("over-tow-bar", gear.towBar?.rating),
    one("over-base-plate", gear.basePlate?.rating),
    // Combined strength is the mildest reading of the rules (FMCSA guidance to 49 CFR 393.70(d)); some want each.
    one("over-cables", cables?.count ? cables.rating : null, cables?.count ?? 1),
  ];
}

function byGcwr(sheet: Sheet): RuleOut[] {
  const { gcwr, frontAxleLoaded, rearAxleLoaded, tagAxleLoaded, tagAxleRating } = sheet.coach ?? {};
  const weight = weightOf(sheet);
  const tagMissing = tagAxleRating && !tagAxleLoaded;
  if (!weight || !gcwr || !frontAxleLoaded || !rearAxleLoaded || tagMissing) return [];
  const coachKg = kg(frontAxleLoaded) + kg(rearAxleLoaded) + (tagAxleLoaded ? kg(tagAxleLoaded) : 0);
  const leftKg = kg(gcwr) - coachKg;
  if (kg(weight.mass) <= leftKg + ROUNDING) return [];
  const [weighs, leaves] = [inUnitOf(gcwr, coachKg), inUnitOf(gcwr, Math.max(0, leftKg))];
  return [{ code: "over-gcwr", says: say.gcwr(figure(gcwr), weighs, leaves, weight.words) }];
}

/**
 * The bar's slope against its own maker's limit. A ball or a hook adds a height that no sheet has, so only a bar that
 * goes straight into the receiver is compared.
 */
function byLevel({ coach, car, gear }: Sheet): RuleOut[] {
  const { towBar, dropReceiver } = gear ?? {};
  const [high, low, limit] = [coach?.receiverHeight, car?.basePlateHeight, towBar?.slopeLimit];
  const drop = dropOf(dropReceiver);
  if (towBar?.coupling !== "direct" || !high || !low || !limit || drop === null) return [];
  const offM = Math.abs(m(high) - drop - m(low));
  if (offM <= m(limit) + ROUNDING) return [];
  return [{ code: "out-of-level", says: say.level(inUnitOf(limit, offM), figure(limit)) }];
}

/** How far the drop receiver takes the bar down, in meters; null where that is not known. */
function dropOf(drop: Gear["dropReceiver"]): number | null {
  if (drop?.there === false) return 0;
  if (!drop?.there || !drop.offset || !drop.direction) return null;
  return drop.direction === "drop" ? m(drop.offset) : -m(drop.offset);
}

// Sums of pounds in kilograms differ in their last digits.
const ROUNDING = 1e-4;
const kg = (mass: Mass) => siOf("mass", mass);
const m = (length: Extract<Quantity, { lengthM: number }>) => siOf("length", length);
