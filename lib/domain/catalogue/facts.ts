import type { BrakeFamily } from "../sheet/gear";
import { isThere, type Sheet } from "../sheet/sheet";
import { asksForEngineRun, manualOf, type ManualSays } from "./manual";
import { ruledOut, type RuleOut } from "./rule-outs";

/** Yes, no, or null where nobody knows. */
export type Known = boolean | null;

/** What a list hangs on, drawn from a sheet. The sheet itself stands beside it for words, figures and places. */
export interface Facts {
  sheet: Sheet;
  coupling: "direct" | "ball" | "pintle" | null;
  drop: Known;
  armEnds: "pin" | "quick" | null;
  /** Whether the arms slide out and lock. */
  aligning: Known;
  stowsOn: "coach" | "car" | null;
  removableArms: Known;
  shortPair: Known;
  brake: BrakeFamily | null;
  manualApply: Known;
  breakaway: Known;
  airLine: Known;
  cord: Known;
  chargeLine: Known;
  /** Whether a monitor stands in the coach that no other check reads. */
  monitor: Known;
  wiring: "diodes" | "bulbs" | "light-bar" | "trailer-plug" | null;
  /** How the lamps that are seen from behind answer. */
  layout: "combined" | "separate" | null;
  jacks: Known;
  airSuspension: Known;
  manual: ManualSays;
  /** Whether the manual wants its steps done before the bar is on. */
  before: Known;
  engineRun: boolean;
  fuse: string | null;
  backToDriving: string | null;
  transferCase: Known;
  ruleOuts: RuleOut[];
}

/** The facts of a sheet: what it says, and what follows from that alone. */
export function factsOf(sheet: Sheet): Facts {
  const { coach = {}, car = {}, gear = {}, wiring = {}, procedure = {} } = sheet;
  const family = gear.brake?.family ?? null;
  const bar = gear.towBar ?? {};
  const removableArms = is(gear.basePlate?.arms, "removable");
  return {
    sheet,
    coupling: bar.coupling ?? null,
    drop: isThere(gear, "dropReceiver"),
    armEnds: bar.armEnds ?? null,
    aligning: bar.selfAligning ?? null,
    stowsOn: bar.stowsOn ?? null,
    removableArms,
    // Arms that come off need a short pair, whether it is there or not.
    shortPair: removableArms || (isThere(gear, "shortCables") ?? removableArms),
    brake: family,
    manualApply: family === "none" || family === "surge" ? false : (gear.brake?.manualApply ?? null),
    breakaway: isThere(gear, "breakaway") ?? (family === "none" ? false : null),
    airLine: family === "air" ? true : isThere(gear, "airLine"),
    cord: cordOf(sheet),
    chargeLine: isThere(gear, "chargeLine"),
    monitor: monitorOf(family, gear.brake?.monitor ?? null),
    wiring: wiring.style ?? null,
    layout: layoutOf(sheet),
    jacks: coach.jacks ?? null,
    airSuspension: is(coach.suspension, "air"),
    manual: manualOf(sheet),
    before: is(procedure.bar, "before"),
    engineRun: asksForEngineRun(procedure),
    fuse: procedure.fuse ?? null,
    backToDriving: procedure.backToDriving ?? null,
    transferCase: car.transferCase ?? null,
    ruleOuts: ruledOut(sheet),
  };
}

function is(value: string | null | undefined, wanted: string): Known {
  return value ? value === wanted : null;
}

// A unit built into the car and one on the coach's air are seen to be ready on their monitor.
function monitorOf(family: BrakeFamily | null, monitor: Known): Known {
  if (family === "none" || family === "installed-vacuum" || family === "air") return false;
  return family === "surge" ? monitor === true : monitor;
}

// Lamps with a battery of their own want no cord, and then what else might want one is the brake.
function cordOf({ gear, wiring }: Sheet): Known {
  const ownBattery = wiring?.style === "light-bar" && gear?.lightBar?.power === "own-battery";
  const writtenDown = Object.values(gear?.cord ?? {}).some((value) => value !== null);
  return !ownBattery || writtenDown || gear?.brake?.family === "installed-vacuum" || null;
}

/**
 * Where turn and stop have lamps of their own. Two signals cannot work three lamps: behind a combined coach, without
 * a converter, the red lamp of a car with separate ones does both.
 */
function layoutOf({ coach, car, wiring }: Sheet): Facts["layout"] {
  if (wiring?.converter === "two-to-three") return "separate";
  if (wiring?.style === "light-bar" || wiring?.converter === "three-to-two") return "combined";
  if (wiring?.converter === "none" && coach?.signals === "combined") return "combined";
  return car?.lampSignals ?? null;
}
