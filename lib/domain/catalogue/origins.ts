import type { Origin } from "../revision";
import type { Facts } from "./facts";

// Citations as in the table of published values; what binds commercial vehicles only is a benchmark and says so.

export const practice: Origin = { kind: "practice", says: "Common practice, no published source." };

const benchmark = (says: string): Origin => ({
  kind: "rule",
  says: `${says} It binds commercial vehicles; here it is a benchmark.`,
});

export const couplingRule = benchmark(
  "49 CFR 392.7(a): before driving, the driver is satisfied of coupling devices, brakes, steering, lamps and tires.",
);
export const trackingRule = benchmark(
  "49 CFR 393.70(a): a towed vehicle stays within 3 inches either side of the towing vehicle’s path.",
);
export const nextDriverRule = benchmark(
  "49 CFR 396.13: the next driver is satisfied, and reads and signs the last report.",
);
export const treadRule = benchmark(
  "49 CFR 393.75, as quoted elsewhere: tread of 2/32 inch, 4/32 inch at a bus’s or truck’s front wheels.",
);
export const reCheckRule = benchmark(
  "49 CFR 392.9, as quoted elsewhere: a load is looked at within the first 50 miles, then every 3 hours or 150 miles.",
);
export const cablesRule: Origin = {
  kind: "rule",
  says: "WAC 204-70-070 (Washington): two chains or cables, crossed, with no more slack than turning needs, not on the ball or a removable mount. Other places have rules of their own.",
};
export const breakawayRule: Origin = {
  kind: "rule",
  says: "D.C. Mun. Regs 18-721 and S.D.C.L. 32-18-17, written for trailers over 3,000 lb: the brakes come on promptly and stay on for 15 minutes. Other places have rules of their own.",
};

/** The manual of the maker of a piece of gear: it is the last word for that piece. */
export function makersManual(piece: string): Origin {
  return { kind: "equipment-manual", says: `Manuals of ${piece} ask for this; the one of yours decides.` };
}

/** The owner's manual of this very car, by its page where that is recorded. */
export function carsManual({ manual, sheet }: Facts): Origin {
  const name = sheet.procedure?.manual ?? "This car’s owner’s manual";
  return {
    kind: "vehicle-manual",
    says: manual.says === "how" ? `${name}, page ${manual.page}.` : `${name}.`,
  };
}
