import { describe, expect, test } from "vitest";
import { checksOf, revisionShape, walkChecks, type RevisionDocument } from "@/lib/domain/revision";
import { document } from "../support/rig";

describe("a revision document", () => {
  const walks = (over: object): RevisionDocument => ({ ...document, walks: { ...document.walks, ...over } });

  test.each<[string, unknown, boolean]>([
    ["as it should be", document, true],
    ["with members of a later version", { ...document, later: 1, sheet: { deep: [1] } }, true],
    ["of another version", { ...document, v: 2 }, false],
    ["with an empty walk", walks({ delivery: { full: [], short: [] } }), false],
    ["with an unknown check in a walk", walks({ unhook: { full: ["paint"], short: ["paint"] } }), false],
    [
      "with a short walk that asks for more",
      walks({ unhook: { full: ["pin"], short: ["pin", "tires"] } }),
      false,
    ],
    [
      "with a short walk that leaves out a hold",
      walks({ unhook: { full: ["pin", "tires"], short: ["tires"] } }),
      false,
    ],
    [
      "with a short walk that leaves out a fix",
      walks({ unhook: { full: ["pin", "tires"], short: ["pin"] } }),
      true,
    ],
    ["without a purpose", { ...document, walks: { unhook: document.walks.unhook } }, false],
  ])("%s", (_, value, is) => {
    expect(revisionShape.safeParse(value).success).toBe(is);
  });
});

test("checks by key, and in walking order with their stations", () => {
  expect([...checksOf(document).keys()]).toEqual(["pin", "cables", "air", "jacket", "tires"]);
  expect(
    walkChecks(document, "hook-up", "short").map(({ station, check }) => [station.key, check.key]),
  ).toEqual([
    ["car-nose", "pin"],
    ["cables-and-cord", "cables"],
    ["cables-and-cord", "air"],
  ]);
});
