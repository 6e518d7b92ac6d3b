import { conditionWords } from "../messages/catalogue-conditions";
import type { Facts, Known } from "./facts";

/** What a condition comes out as on a sheet. */
export type Outcome = "yes" | "no" | "unknown";

const brakeIs =
  (...families: Facts["brake"][]) =>
  ({ brake }: Facts): Known =>
    brake === null ? null : families.includes(brake);

const equals = (value: string | null, wanted: string): Known => (value === null ? null : value === wanted);

/** Everything that decides whether a check is on a list; null is: nobody knows. */
const conditions = {
  every: () => true,
  direct: ({ coupling }) => equals(coupling, "direct"),
  ball: ({ coupling }) => equals(coupling, "ball"),
  pintle: ({ coupling }) => equals(coupling, "pintle"),
  drop: ({ drop }) => drop,
  pinEnds: ({ armEnds }) => equals(armEnds, "pin"),
  quickEnds: ({ armEnds }) => equals(armEnds, "quick"),
  aligning: ({ aligning }) => aligning,
  stowsOnCoach: ({ stowsOn }) => equals(stowsOn, "coach"),
  shortPair: ({ shortPair }) => shortPair,
  brake: ({ brake }) => (brake === null ? null : brake !== "none"),
  brakeBox: brakeIs("portable"),
  brakeBuiltIn: brakeIs("installed-vacuum"),
  brakeAir: brakeIs("air"),
  brakeHydraulic: brakeIs("hydraulic"),
  brakeSurge: brakeIs("surge"),
  manualApply: ({ manualApply }) => manualApply,
  breakaway: ({ breakaway }) => breakaway,
  airLine: ({ airLine }) => airLine,
  cord: ({ cord }) => cord,
  chargeLine: ({ chargeLine }) => chargeLine,
  monitor: ({ monitor }) => monitor,
  lightBar: ({ wiring }) => equals(wiring, "light-bar"),
  trailerPlug: ({ wiring }) => equals(wiring, "trailer-plug"),
  jacks: ({ jacks, airSuspension }) =>
    jacks || airSuspension || (jacks === null || airSuspension === null ? null : false),
  manualRecorded: ({ manual }) => manual.says === "how",
  manualForbids: ({ manual }) => manual.says === "forbidden",
  manualMissing: ({ manual }) => manual.says === "not-recorded",
  engineRun: ({ engineRun }) => engineRun,
  fuse: ({ fuse }) => fuse !== null,
  backToDriving: ({ backToDriving }) => backToDriving !== null,
  ruledOut: ({ ruleOuts }) => ruleOuts.some(({ code }) => !code.startsWith("manual-")),
} satisfies Record<string, (facts: Facts) => Known>;

export type ConditionName = keyof typeof conditions;

/** A condition and the outcomes that put a check on the list; `optional` gear may be absent where nobody knows. */
export interface When {
  condition: ConditionName;
  on: readonly Outcome[];
  optional?: true;
}

export const only = (condition: ConditionName): When => ({ condition, on: ["yes"] });
export const unless = (condition: ConditionName): When => ({ condition, on: ["no"] });
export const unsaid = (condition: ConditionName): When => ({ condition, on: ["unknown"] });
/** Said or not: the check is there, and its reason tells this too. */
export const told = (condition: ConditionName): When => ({ condition, on: ["yes", "no", "unknown"] });
/** Gear that is looked for where the sheet does not say whether it is there. */
export const maybe = (condition: ConditionName): When => ({
  condition,
  on: ["yes", "unknown"],
  optional: true,
});

/** Whether these conditions put a check on the list, why or why not, and whether its part may be absent. */
export function judge(
  when: readonly When[],
  facts: Facts,
): { listed: boolean; reason: string; mayBeAbsent: boolean } {
  const outcomes = when.map(({ condition, on, optional }) => {
    const outcome = outcomeOf(condition, facts);
    const reason = conditionWords[condition][outcome];
    return { holds: on.includes(outcome), reason, absent: optional === true && outcome === "unknown" };
  });
  const against = outcomes.find(({ holds }) => !holds);
  return {
    listed: !against,
    reason: against?.reason ?? outcomes.map(({ reason }) => reason).join(" "),
    mayBeAbsent: !against && outcomes.some(({ absent }) => absent),
  };
}

function outcomeOf(condition: ConditionName, facts: Facts): Outcome {
  const is = conditions[condition](facts);
  return is === null ? "unknown" : is ? "yes" : "no";
}
