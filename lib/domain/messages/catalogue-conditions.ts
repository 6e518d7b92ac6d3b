import type { ConditionName, Outcome } from "../catalogue/conditions";

type Reasons = Record<Outcome, string>;

/** A piece of gear that a sheet has, has not, or does not speak of. */
const gear = (name: string): Reasons => ({
  yes: `The sheet has ${name}.`,
  no: `The sheet has no ${name.replace(/^an? /, "")}.`,
  unknown: `The sheet does not say whether there is ${name}, so it is looked for.`,
});

/** One of several ways in which a part can be made. */
const way = (yes: string, no: string, open: string): Reasons => ({
  yes,
  no,
  unknown: `The sheet does not say ${open}, so this list asks for what is the same on all.`,
});

/** What a sheet always answers: not saying it is an answer too. */
const answered = (yes: string, no: string): Reasons => ({ yes, no, unknown: no });

const COUPLING = "how the bar holds at the coach";
const ENDS = "how the arms hold at the car";
const BRAKE = "what kind of brake the car has";

/** Why a check is on a list or not, for each thing that decides it. */
export const conditionWords: Record<ConditionName, Reasons> = {
  every: answered("Every rig has it.", ""),
  direct: way(
    "The bar goes straight into the receiver.",
    "The bar does not go straight into the receiver.",
    COUPLING,
  ),
  ball: way("The bar holds on a ball.", "The bar does not hold on a ball.", COUPLING),
  pintle: way("The bar holds on a pintle hook.", "The bar does not hold on a pintle hook.", COUPLING),
  drop: gear("a drop receiver"),
  pinEnds: way("The arms hold by a pin and clip.", "The arms do not hold by a pin and clip.", ENDS),
  quickEnds: way("The arms have quick-disconnect ends.", "The arms do not have quick-disconnect ends.", ENDS),
  aligning: way("The arms slide and lock.", "The arms do not slide.", "whether the arms slide and lock"),
  stowsOnCoach: way(
    "The bar stays folded on the coach.",
    "The bar stays folded on the car.",
    "where the bar stays folded",
  ),
  shortPair: {
    yes: "The base plate’s arms come off, or the sheet has short cables.",
    no: "The base plate’s arms are fixed and the sheet has no short cables.",
    unknown:
      "The sheet does not say whether the base plate’s arms come off, so the short cables are looked for.",
  },
  brake: {
    yes: "The sheet has a brake for towing.",
    no: "The sheet says that the car has no brake for towing.",
    unknown: "The sheet does not say what kind of brake the car has, so it is looked for.",
  },
  brakeBox: way("The brake is a box at the pedal.", "The brake is not a box at the pedal.", BRAKE),
  brakeBuiltIn: way(
    "The brake is built into the car, with its own vacuum.",
    "The brake is not the electric kind that is built in.",
    BRAKE,
  ),
  brakeAir: way("The brake works on the coach’s air.", "The brake does not work on air.", BRAKE),
  brakeHydraulic: way(
    "The brake works on a line of fluid from the coach.",
    "The brake does not work on a line of fluid.",
    BRAKE,
  ),
  brakeSurge: way("The brake is built into the bar.", "The brake is not built into the bar.", BRAKE),
  manualApply: {
    yes: "The sheet has a control in the coach that puts the car’s brake on.",
    no: "There is no control in the coach for the car’s brake.",
    unknown:
      "The sheet does not say whether the coach has a control for the car’s brake, so it is looked for.",
  },
  breakaway: gear("a breakaway switch"),
  airLine: gear("an air line"),
  cord: {
    yes: "A cord joins coach and car.",
    no: "No cord joins coach and car.",
    unknown: "The light bar has a battery of its own, so a cord may not be there: it is looked for.",
  },
  chargeLine: gear("a charge line"),
  monitor: {
    yes: "The sheet has a brake monitor in the coach.",
    no: "There is no brake monitor in the coach, or another check reads it.",
    unknown: "The sheet does not say whether there is a brake monitor in the coach, so it is looked for.",
  },
  lightBar: {
    yes: "The car’s lamps for the road are on a removable light bar.",
    no: "The sheet has no light bar.",
    unknown: "The sheet does not say how the car’s lamps are fed, so a light bar is looked for.",
  },
  trailerPlug: {
    yes: "The car’s lamps are fed by a trailer plug.",
    no: "The sheet has no trailer plug at the car.",
    unknown:
      "The sheet does not say how the car’s lamps are fed. The lamps’ own check shows whether a plug is home.",
  },
  jacks: {
    yes: "The coach has jacks, air suspension or both.",
    no: "The coach has neither jacks nor air suspension.",
    unknown: "The sheet does not say whether the coach has jacks or air suspension, so they are looked for.",
  },
  manualRecorded: answered(
    "The sheet has the page and the end state of the car’s own manual.",
    "The sheet does not have what the car’s own manual says.",
  ),
  manualForbids: answered(
    "The car’s own manual forbids towing it on its four wheels.",
    "The sheet does not say that the manual forbids it.",
  ),
  manualMissing: answered(
    "What the car’s own manual says is not recorded.",
    "The sheet has what the car’s own manual says.",
  ),
  engineRun: answered(
    "The car’s own manual wants the engine run on the way.",
    "The sheet has no engine run on the way.",
  ),
  fuse: answered(
    "The sheet names a fuse that comes out for towing.",
    "The sheet names no fuse that comes out.",
  ),
  backToDriving: answered(
    "The sheet has what the manual wants before the car is driven again.",
    "The sheet has nothing on how the car goes back to driving.",
  ),
  ruledOut: answered("The sheet rules this rig out.", "No figure on the sheet rules this rig out."),
};
