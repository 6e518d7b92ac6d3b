import { describe, expect, test } from "vitest";
import { compose } from "@/lib/domain/catalogue/compose";
import { ruledOut } from "@/lib/domain/catalogue/rule-outs";
import { calloutsOf } from "@/lib/domain/callouts";
import { purposes, type Purpose } from "@/lib/domain/entry";
import { checksOf, revisionShape, type Check, type RevisionDocument } from "@/lib/domain/revision";
import { everyRig, factors, type Factors } from "../support/every-rig";

interface Composed {
  of: Factors;
  document: RevisionDocument;
  checks: Map<string, Check>;
  ruledOut: boolean;
}

const rigs: Composed[] = everyRig().map(({ of, sheet }) => {
  const document = compose(sheet);
  return { of, document, checks: checksOf(document), ruledOut: ruledOut(sheet).length > 0 };
});

/** What is wrong with any rig of the matrix, at most five of it: a hundred say no more. */
function wrong(find: (rig: Composed) => unknown[]): unknown[] {
  const found: unknown[] = [];
  for (const rig of rigs) {
    for (const what of find(rig)) if (found.length < 5) found.push([what, JSON.stringify(rig.of)]);
  }
  return found;
}

const full = ({ document }: Composed, purpose: Purpose) => document.walks[purpose].full;
const short = ({ document }: Composed, purpose: Purpose) => document.walks[purpose].short;
const how = ({ procedure }: Factors) => Boolean(procedure?.endState);
const towing = ["hook-up", "re-check", "delivery", "yard-out"] as const;
const coming = ["unhook", "yard-in"] as const;

test("the matrix has every pair of values of every two factors", () => {
  const names = Object.keys(factors) as (keyof Factors)[];
  const missing: string[] = [];
  for (const [at, a] of names.entries()) {
    for (const b of names.slice(at + 1)) {
      const met = new Set(rigs.map(({ of }) => `${JSON.stringify(of[a])}|${JSON.stringify(of[b])}`));
      if (met.size !== factors[a].length * factors[b].length) missing.push(`${a} and ${b}`);
    }
  }
  expect(missing).toEqual([]);
  expect(rigs).toHaveLength(4 * 7 * 5 * 7);
});

describe("every list", () => {
  test("is a document with each key once, every check in some walk, and nothing in a walk twice", () => {
    expect(
      wrong(({ document, checks }) => {
        const keys = document.list.stations.flatMap((station) => station.checks.map(({ key }) => key));
        const walks = purposes.map((purpose) => document.walks[purpose].full);
        return [
          !revisionShape.safeParse(document).success && "shape",
          keys.length !== checks.size && "a key twice",
          walks.some((walk) => new Set(walk).size !== walk.length) && "twice in a walk",
          keys.some((key) => !walks.some((walk) => walk.includes(key))) && "in no walk",
        ].filter(Boolean);
      }),
    ).toEqual([]);
  });

  test("has a short walk of the holds of the full one, and of nothing else", () => {
    expect(
      wrong((rig) =>
        purposes.filter(
          (purpose) =>
            full(rig, purpose)
              .filter((key) => rig.checks.get(key)!.effect === "hold")
              .join() !== short(rig, purpose).join(),
        ),
      ),
    ).toEqual([]);
  });

  test("is as long as someone will walk", () => {
    expect(
      wrong((rig) => {
        const counts: [string, number, number, number][] = [
          ["hook-up, short", short(rig, "hook-up").length, 15, rig.ruledOut ? 20 : 19],
          ["hook-up, full", full(rig, "hook-up").length, 16, rig.ruledOut ? 25 : 24],
          ["re-check", full(rig, "re-check").length, 7, rig.ruledOut ? 12 : 11],
          ["unhook", full(rig, "unhook").length, 6, 10],
        ];
        return counts.filter(([, count, least, most]) => count < least || count > most);
      }),
    ).toEqual([]);
  });

  test("touches only what is on it, and never itself", () => {
    expect(
      wrong(({ checks }) =>
        [...checks.values()].flatMap(({ key, touches = [] }) =>
          touches.filter((touched) => touched === key || !checks.has(touched)),
        ),
      ),
    ).toEqual([]);
  });

  test("has a figure only beside a callout that its drawing has", () => {
    expect(
      wrong(({ checks }) =>
        [...checks.values()].flatMap((check) => {
          const letters: string[] = calloutsOf(check).map(({ letter }) => letter);
          return Object.keys(check.figures ?? {}).filter((letter) => !letters.includes(letter));
        }),
      ),
    ).toEqual([]);
  });

  test("says of each check why it is there and where it comes from", () => {
    expect(
      wrong(({ checks }) =>
        [...checks.values()].flatMap(({ key, listed, origin }) =>
          listed && origin?.says && (origin.kind !== "practice" || /^Common practice/.test(origin.says))
            ? []
            : [key],
        ),
      ),
    ).toEqual([]);
  });
});

/** Whether gear is on the rig: no is the only answer that keeps its check off the list. */
const unlessNo = (known: boolean | null) => known !== false;

/** Whether nothing on the sheet wants a cord and none is written down. */
const noCord = ({ style, lightBarPower, cordEnd }: Factors) =>
  style === "light-bar" && lightBarPower === "own-battery" && cordEnd === null;

/** The topics of a hook-up that hold, and whether a rig has them. */
const topics: [string, (of: Factors) => boolean][] = [
  ["coach-held", () => true],
  ["receiver-pins", () => true],
  ["base-plate", () => true],
  ["arm-left", () => true],
  ["arm-right", () => true],
  ["cables", () => true],
  ["lanyard", ({ breakaway, brake }) => breakaway ?? brake !== "none"],
  ["cord", () => true],
  ["end-state", how],
  ["manual-page", (of) => !how(of)],
  ["steering-free", () => true],
  ["brake-ready", ({ brake }) => brake !== "none"],
  ["chocks-out", () => true],
  ["wheels-roll", () => true],
  ["arms-locked", () => true],
  ["light-bar", ({ style }) => style === null || style === "light-bar"],
  ["lamps", () => true],
  [
    "manual-apply",
    ({ manualApply, brake }) => unlessNo(manualApply) && brake !== "none" && brake !== "surge",
  ],
  ["joints", () => true],
  ["jacks-up", ({ jacks, suspension }) => unlessNo(jacks) || suspension !== "springs"],
  ["ruled-out", ({ brake, weight }) => brake === "none" || weight === "over"],
];

describe("a hook-up", () => {
  test("covers every topic that holds on its rig, and has no other hold", () => {
    expect(
      wrong((rig) => {
        const expected = topics.filter(([, has]) => has(rig.of)).map(([key]) => key);
        const walked = new Set(short(rig, "hook-up"));
        return [
          ...expected.filter((key) => !walked.has(key)).map((key) => `no ${key}`),
          ...[...walked].filter((key) => !expected.includes(key)).map((key) => `has ${key}`),
        ];
      }),
    ).toEqual([]);
  });

  test("and every other walk that tows begins with what its sheet rules out, and no other does", () => {
    expect(
      wrong((rig) => {
        const heads = (purpose: Purpose) =>
          full(rig, purpose).findIndex((key) => key !== "manual-page" && key !== "ruled-out");
        const expected = Number(!how(rig.of)) + Number(rig.of.brake === "none" || rig.of.weight === "over");
        return [
          ...towing.filter((purpose) => heads(purpose) !== expected),
          ...coming.filter((purpose) => heads(purpose) !== 0),
        ];
      }),
    ).toEqual([]);
  });

  test("lets only gear be absent that nobody has looked for", () => {
    const open: [string, (of: Factors) => boolean][] = [
      ["lanyard", ({ breakaway }) => breakaway === null],
      ["breakaway-pull", ({ breakaway }) => breakaway === null],
      ["charge-line", ({ chargeLine }) => chargeLine === null],
      ["light-bar", ({ style }) => style === null],
      ["light-bar-off", ({ style }) => style === null],
      ["manual-apply", ({ manualApply }) => manualApply === null],
      ["monitor", ({ monitor }) => monitor === null],
      ["jacks-up", ({ jacks, suspension }) => jacks !== true && suspension !== "air"],
      ["short-cables", ({ arms, shortCables }) => arms === null && shortCables === null],
      ["cord", noCord],
      ["cord-jacket", noCord],
    ];
    const may = new Map(open);
    expect(
      wrong(({ of, checks }) =>
        [...checks.values()]
          .filter(({ key, mayBeAbsent }) => mayBeAbsent && !may.get(key)?.(of))
          .map(({ key }) => key),
      ),
    ).toEqual([]);
  });
});

/** What stands before what, wherever a walk has both. */
const before: [readonly Purpose[], string, string, ((of: Factors) => boolean)?][] = [
  [towing, "coach-held", "receiver-pins"],
  [towing, "receiver-pins", "arm-left"],
  [towing, "base-plate", "arm-left"],
  [towing, "arm-left", "arm-right"],
  [towing, "arm-right", "cables"],
  [towing, "arm-right", "cord"],
  [towing, "end-state", "arm-left", ({ procedure }) => procedure?.bar === "before"],
  [towing, "cord", "end-state", ({ procedure }) => procedure?.bar !== "before"],
  [towing, "end-state", "steering-free"],
  [towing, "end-state", "chocks-out"],
  [towing, "brake-ready", "chocks-out"],
  [towing, "arm-right", "chocks-out"],
  [towing, "cables", "chocks-out"],
  [towing, "lanyard", "chocks-out"],
  [towing, "chocks-out", "wheels-roll"],
  [towing, "wheels-roll", "arms-locked"],
  [towing, "arms-locked", "lamps"],
  [towing, "light-bar", "lamps"],
  [towing, "brake-ready", "lamps"],
  [towing, "wheels-roll", "manual-apply"],
  [towing, "lamps", "joints"],
  [towing, "manual-apply", "joints"],
  [["delivery"], "tires", "car-held"],
  [[...coming, "delivery"], "coach-held", "car-held"],
  ...["brake-off", "lines-off", "latches-released", "one-side", "bar-stowed", "back-to-driving"].map(
    (key): (typeof before)[number] => [[...coming, "delivery"], "car-held", key],
  ),
  [[...coming, "delivery"], "latches-released", "one-side"],
  [[...coming, "delivery"], "one-side", "bar-stowed"],
  [[...coming, "delivery"], "fuse-back", "back-to-driving"],
  [["delivery", "yard-out"], "joints", "driver-shows"],
];

describe("the order", () => {
  test.each(before)("of %j has %s before %s", (which, first, second, when = () => true) => {
    let met = 0;
    const found = wrong((rig) => {
      if (!when(rig.of)) return [];
      return which.filter((purpose) => {
        const walk = full(rig, purpose);
        if (!walk.includes(first) || !walk.includes(second)) return false;
        met += 1;
        return walk.indexOf(first) > walk.indexOf(second);
      });
    });
    expect(found).toEqual([]);
    expect(met).toBeGreaterThan(0);
  });

  test("never lets an unhook begin with anything but what holds", () => {
    expect(
      wrong((rig) => (full(rig, "unhook").slice(0, 2).join() === "coach-held,car-held" ? [] : ["no"])),
    ).toEqual([]);
  });
});

/** Everything that a person reads of a check, but the rule that it cites and the reason why it is listed. */
function wordsOf({ ask, how, why, mend, who, caution, figures, measure }: Check): string {
  return [ask, how, why, mend, who, caution, ...Object.values(figures ?? {}), measure?.beside]
    .filter(Boolean)
    .join(" ");
}

/** Gear, when a rig does not have it, and the words that would be about it. */
const absent: [string, (of: Factors) => boolean, RegExp][] = [
  ["a drop receiver", ({ drop }) => drop === false, /drop receiver/i],
  ["a ball", ({ coupling }) => coupling !== "ball" && coupling !== null, /\bball\b|\bcoupler/i],
  ["a pintle hook", ({ coupling }) => coupling !== "pintle" && coupling !== null, /pintle|\bthe hook\b/i],
  [
    "pins at the arms",
    ({ armEnds }) => armEnds === "quick",
    /both tabs|arms’ pins|pin and a clip for each arm/i,
  ],
  ["quick ends", ({ armEnds }) => armEnds === "pin", /spring clip|turned in/i],
  [
    "arms that slide",
    ({ aligning }) => aligning === false,
    /arms? (that )?(slide|come out and lock)|latch(es)? home|drawn out/i,
  ],
  [
    "arms that come off",
    ({ arms, shortCables }) => arms === "fixed" && shortCables !== true,
    /removable arm|short (pair|cable)|plate’s own arms/i,
  ],
  ["an air line", ({ airLine, brake }) => airLine === false && brake !== "air", /air line/i],
  ["a charge line", ({ chargeLine }) => chargeLine === false, /charge line/i],
  ["a cord to take off", ({ cordEnd }) => cordEnd === "hard-wired", /put away: cord/i],
  ["a breakaway switch", ({ breakaway }) => breakaway === false, /lanyard|breakaway/i],
  ["a light bar", ({ style }) => style !== "light-bar" && style !== null, /light bar/i],
  ["a trailer plug", ({ style }) => style !== "trailer-plug" && style !== null, /trailer plug/i],
  ["jacks", ({ jacks }) => jacks === false, /\bjacks?\b|feet of the coach/i],
  ["air suspension", ({ suspension }) => suspension === "springs", /air suspension|travel height$/i],
  ["a transfer case", ({ transferCase }) => transferCase === false, /transfer case/i],
  ["a box at the pedal", ({ brake }) => brake !== "portable" && brake !== null, /\bbox\b|footwell/i],
  ["a monitor", ({ monitor, brake }) => monitor === false || brake === "none", /\bmonitor\b/i],
  ["an electric booster", ({ booster }) => booster !== "electric", /electric booster/i],
  ["a booster", ({ booster }) => booster === "none", /booster/i],
  ["fluid in a line", ({ brake }) => brake !== "hydraulic", /brake line|\bdrips?\b/i],
  ["a brake in the bar", ({ brake }) => brake !== "surge", /brake cable/i],
  ["a brake unit", ({ brake }) => brake === "none", /brake unit|brake for towing is|brake’s own manual/i],
  ["an engine run", ({ procedure }) => !procedure?.engineRunEveryHours, /engine run/i],
  [
    "a fuse that comes out",
    ({ procedure }) => !procedure?.fuse || !how({ procedure } as Factors),
    /fuse that comes out/i,
  ],
];

test.each(absent)(
  "nothing is said about %s where the sheet says that there is none",
  (_, isAbsent, words) => {
    expect(rigs.some(({ of }) => isAbsent(of))).toBe(true);
    // The expression finds it where it is.
    expect(rigs.some(({ checks }) => [...checks.values()].some((check) => words.test(wordsOf(check))))).toBe(
      true,
    );
    expect(
      wrong(({ of, checks }) => {
        if (!isAbsent(of)) return [];
        return [...checks.values()]
          .filter((check) => check.key !== "ruled-out" && words.test(wordsOf(check)))
          .map(({ key }) => [key, words.exec(wordsOf(checks.get(key)!))?.[0]]);
      }),
    ).toEqual([]);
  },
);

test("a list speaks plainly: headlines that fit, whole sentences, and none of the words it must not say", () => {
  const seen = new Map<string, Check>();
  for (const { checks } of rigs) for (const check of checks.values()) seen.set(wordsOf(check), check);
  for (const [words, { ask, how, why, mend }] of seen) {
    expect([ask, ask.length <= 38]).toEqual([ask, true]);
    expect(words).not.toMatch(/\b(safe|legal|passed|certified|compliant|roadworthy)\b/i);
    expect(words).not.toMatch(/\b(torque|ft-lb|n·m|transmission|ignition)\b/i);
    expect(words.replace("With a transfer case in neutral, park does not hold", "")).not.toMatch(
      /\b(neutral|reverse|in park|park (does|it)|in gear|shift)\b/i,
    );
    expect(words).not.toMatch(/!|\bplease\b|\bundefined\b|\bnull\b|\[object| {2}| \./);
    for (const sentence of [how, why, mend]) expect(sentence).toMatch(/^[A-Z].+[.”]$/);
  }
});
