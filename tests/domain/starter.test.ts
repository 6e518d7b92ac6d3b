import { describe, expect, test } from "vitest";
import { digestOf } from "@/lib/domain/digest";
import { purposes } from "@/lib/domain/entry";
import { canonicalText, findJsonFault } from "@/lib/domain/json";
import { replay } from "@/lib/domain/replay";
import { checksOf, revisionShape, walkChecks } from "@/lib/domain/revision";
import { brakeFamilies, couplings } from "@/lib/domain/sheet/gear";
import { readSheet } from "@/lib/domain/sheet/sheet";
import { wiringStyles } from "@/lib/domain/sheet/wiring";
import {
  starterDocument,
  starterSheet,
  starterShape,
  typedWords,
  type Manual,
  type StarterAnswers,
} from "@/lib/domain/starter";
import type { Key } from "../support/given";
import { rig } from "../support/rig";
import { WalkBuilder } from "../support/walk-builder";

// Nothing here signs.
const device = { id: "d" } as Key;

const how: Manual = { says: "how", page: "214", endState: "Selector as in the picture, key off." };
const manuals: Manual[] = [how, { says: "forbidden" }, { says: "not-recorded" }];

const usual: StarterAnswers = {
  name: "Our rig",
  hitch: "direct",
  brake: "portable",
  lamps: "bulbs",
  airLine: false,
  manual: how,
};

const everyAnswer: StarterAnswers[] = couplings.flatMap((hitch) =>
  brakeFamilies.flatMap((brake) =>
    wiringStyles.flatMap((lamps) =>
      [true, false].flatMap((airLine) =>
        manuals.map((manual) => ({ ...usual, hitch, brake, lamps, airLine, manual })),
      ),
    ),
  ),
);

const hookUp = (answers: StarterAnswers) =>
  walkChecks(starterDocument(answers), "hook-up", "full").map(({ check }) => check.key);

/** The verdict of a hook-up in which everything is good but these checks, which are at fault. */
function verdict(answers: StarterAnswers, faults: string[] = []) {
  const document = starterDocument(answers);
  const revision = { id: rig.id, digest: digestOf(document), document };
  const walk = new WalkBuilder({ member: { id: "m" }, device, rig: { ...rig, revision } });
  walk.markAll(Object.fromEntries(faults.map((key) => [key, "fault"])));
  return replay(
    document,
    walk.links.map(({ entry }) => entry),
  ).verdict;
}

describe("every combination of answers", () => {
  test("there are 432 of them, each with a list of its own", () => {
    expect(everyAnswer).toHaveLength(432);
    expect(new Set(everyAnswer.map((answers) => digestOf(starterDocument(answers)))).size).toBe(432);
  });

  test("is a document that the server takes, and keeps its digest on the way", () => {
    for (const answers of everyAnswer) {
      const document = starterDocument(answers);
      expect(revisionShape.safeParse(document).success).toBe(true);
      expect(findJsonFault(document)).toBeNull();
      expect(digestOf(JSON.parse(canonicalText(document)))).toBe(digestOf(document));
      expect(digestOf(starterDocument(structuredClone(answers)))).toBe(digestOf(document));
    }
  });

  test("has each check once, and every check in some walk", () => {
    for (const answers of everyAnswer) {
      const document = starterDocument(answers);
      const keys = document.list.stations.flatMap(({ checks }) => checks.map(({ key }) => key));
      expect(new Set(keys).size).toBe(keys.length);
      const walked = new Set(purposes.flatMap((purpose) => document.walks[purpose].full));
      expect([...walked].sort()).toEqual([...keys].sort());
    }
  });

  test("is a sheet that the form can go on with", () => {
    for (const answers of everyAnswer) expect(readSheet(starterSheet(answers)).kind).toBe("sheet");
  });

  test("asks for a hold at the first station where the manual forbids it or was not recorded, and else not", () => {
    for (const answers of everyAnswer) {
      const first = walkChecks(starterDocument(answers), "hook-up", "short")[0]!;
      expect(first.station.key).toBe("coach-tail");
      expect(first.check.key === "manual-page").toBe(answers.manual.says !== "how");
      expect(hookUp(answers).includes("end-state")).toBe(answers.manual.says === "how");
    }
  });

  test("never stands between someone and unhooking", () => {
    for (const answers of everyAnswer) {
      expect(starterDocument(answers).walks.unhook.full.slice(0, 2)).toEqual(["coach-held", "car-held"]);
    }
  });
});

describe("what an answer changes", () => {
  test.each<[string, Partial<StarterAnswers>, string[]]>([
    ["a light bar", { lamps: "light-bar" }, ["light-bar"]],
    ["a trailer plug", { lamps: "trailer-plug" }, ["trailer-plug"]],
    ["no brake", { brake: "none" }, ["ruled-out"]],
    ["a manual not looked up", { manual: { says: "not-recorded" } }, ["manual-page"]],
  ])("%s brings its check", (_, change, keys) => {
    const before = hookUp(usual);
    expect(hookUp({ ...usual, ...change }).filter((key) => !before.includes(key))).toEqual(keys);
  });

  test.each<[string, Partial<StarterAnswers>, string, RegExp]>([
    ["a ball", { hitch: "ball" }, "receiver-pins", /ball/],
    ["a pintle hook", { hitch: "pintle" }, "receiver-pins", /hook/],
    ["an air line", { airLine: true }, "cord", /air/],
    ["a brake on the coach’s air", { brake: "air", airLine: true }, "brake-ready", /Air/],
  ])("%s changes what is asked", (_, change, key, words) => {
    const ask = (answers: StarterAnswers) => checksOf(starterDocument(answers)).get(key)!.ask;
    expect(ask({ ...usual, ...change })).toMatch(words);
    expect(ask(usual)).not.toMatch(words);
  });

  test("the page and the owner's own words stand in the cabin's check as typed", () => {
    const check = checksOf(starterDocument(usual)).get("end-state")!;
    expect(check.ask).toContain("page 214");
    expect(check.how).toContain("“Selector as in the picture, key off.”");
  });

  test("forbidden and not recorded are different holds", () => {
    const words = (manual: Manual) => checksOf(starterDocument({ ...usual, manual })).get("manual-page")!;
    expect(words({ says: "forbidden" }).how).not.toBe(words({ says: "not-recorded" }).how);
    expect(words({ says: "forbidden" }).mend).not.toBe(words({ says: "not-recorded" }).mend);
  });

  test.each<[string, StarterAnswers, string[], string]>([
    ["all good", usual, [], "no-hold"],
    [
      "a manual that was not recorded",
      { ...usual, manual: { says: "not-recorded" } },
      ["manual-page"],
      "hold",
    ],
    ["a manual that forbids it", { ...usual, manual: { says: "forbidden" } }, ["manual-page"], "hold"],
    ["no brake", { ...usual, brake: "none" }, ["ruled-out"], "hold"],
  ])("%s, answered as it is", (_, answers, faults, expected) => {
    expect(verdict(answers, faults)).toBe(expected);
  });
});

test.each<[string, number, string]>([
  ["  two \n words ", 60, "two words"],
  ["12345", 3, "123"],
  ["ab😀", 3, "ab"],
  ["\ud83d", 3, ""],
  ["   ", 3, ""],
])("typed %j, at most %i, is %j", (text, most, expected) => {
  expect(typedWords(text, most)).toBe(expected);
});

test.each([{ name: "" }, { name: "x".repeat(61) }, { manual: { says: "how", page: "", endState: "x" } }])(
  "%o is no answer",
  (change) => {
    expect(starterShape.safeParse({ ...usual, ...change }).success).toBe(false);
  },
);
