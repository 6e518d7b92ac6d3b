import { armEnds, brakeFamilies, couplings } from "@/lib/domain/sheet/gear";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import type { Procedure, Sheet } from "@/lib/domain/sheet/sheet";
import { wiringStyles } from "@/lib/domain/sheet/wiring";

const known = [true, false, null] as const;

/** What the manual says, as a sheet has it. */
const procedures: (Procedure | undefined)[] = [
  { says: "how", page: "214", endState: "As the page ends.", bar: "before" },
  { says: "how", page: "p. 88", endState: "As printed.", bar: "after", fuse: "31", fuseKept: "in the visor" },
  { says: "how", page: "7", endState: "As seen.", engineRunEveryHours: 6, backToDriving: "As on page 9." },
  { says: "how", page: "7" },
  { says: "forbidden" },
  { says: "not-recorded" },
  undefined,
];

/** Everything that a list hangs on, and what it can be; null and undefined: nobody knows. */
export const factors = {
  coupling: [...couplings, null],
  brake: [...brakeFamilies, null],
  style: [...wiringStyles, null],
  procedure: procedures,
  airLine: known,
  drop: known,
  armEnds: [...armEnds, null],
  aligning: known,
  stowsOn: ["coach", "car", null],
  arms: ["fixed", "removable", null],
  shortCables: known,
  cordEnd: ["6-round", "hard-wired", null],
  chargeLine: known,
  chargePlug: ["in-cord", "own-plug", null],
  breakaway: known,
  manualApply: known,
  monitor: known,
  booster: ["vacuum", "electric", "none", null],
  lightBarPower: ["cord", "own-battery", null],
  lightBarHeldBy: ["straps", "magnets", "brackets", null],
  jacks: known,
  suspension: ["springs", "air", null],
  transferCase: known,
  parkingBrake: ["lever", "pedal", "switch", null],
  lampSignals: ["combined", "separate", null],
  converter: ["none", "three-to-two", "two-to-three", null],
  weight: ["within", "over", null],
} as const;

export type Factors = { [K in keyof typeof factors]: (typeof factors)[K][number] };

/** The sheet of one choice of factors. */
export function sheetOf(of: Factors): Sheet {
  const rating = of.weight === null ? null : quantityOf("mass", of.weight === "over" ? 3000 : 5000, "lb");
  return {
    v: 1,
    name: "Rig",
    coach: { jacks: of.jacks, suspension: of.suspension, signals: "combined" },
    car: {
      loaded: quantityOf("mass", 3500, "lb"),
      transferCase: of.transferCase,
      parkingBrake: of.parkingBrake,
      booster: of.booster,
      lampSignals: of.lampSignals,
    },
    gear: {
      dropReceiver: { there: of.drop },
      towBar: {
        coupling: of.coupling,
        armEnds: of.armEnds,
        selfAligning: of.aligning,
        stowsOn: of.stowsOn,
        rating,
      },
      basePlate: { arms: of.arms },
      shortCables: { there: of.shortCables },
      chargeLine: { there: of.chargeLine, plug: of.chargePlug, fuseAmps: 15 },
      cord: { carEnd: of.cordEnd },
      airLine: { there: of.airLine },
      brake: { family: of.brake, manualApply: of.manualApply, monitor: of.monitor },
      breakaway: { there: of.breakaway },
      lightBar: { power: of.lightBarPower, heldBy: of.lightBarHeldBy },
    },
    wiring: { style: of.style, converter: of.converter },
    ...(of.procedure && { procedure: of.procedure }),
  };
}

/**
 * Every coupling with every brake, wiring and state of the manual; the other factors take turns beside them, so that
 * every value of each meets every value of every other.
 */
export function everyRig(): { of: Factors; sheet: Sheet }[] {
  const turn = turns(20261201);
  return factors.coupling.flatMap((coupling) =>
    factors.brake.flatMap((brake) =>
      factors.style.flatMap((style) =>
        factors.procedure.map((procedure) => {
          const others = Object.fromEntries(
            Object.entries(factors).map(([name, values]) => [name, values[turn(values.length)]]),
          ) as Factors;
          const of = { ...others, coupling, brake, style, procedure };
          return { of, sheet: sheetOf(of) };
        }),
      ),
    ),
  );
}

/** Numbers below a bound in an order that looks like chance and is the same every time: Marsaglia's xorshift, 2003. */
function turns(seed: number): (bound: number) => number {
  let state = seed;
  return (bound) => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) % bound;
  };
}
