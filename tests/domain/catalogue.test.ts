import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { entries } from "@/lib/domain/catalogue/catalogue";
import { CATALOGUE, compose } from "@/lib/domain/catalogue/compose";
import { judge, only, type ConditionName } from "@/lib/domain/catalogue/conditions";
import { listDifferences } from "@/lib/domain/catalogue/differences";
import { factsOf } from "@/lib/domain/catalogue/facts";
import { ordersFor } from "@/lib/domain/catalogue/order";
import { review } from "@/lib/domain/catalogue/review";
import { digestOf, sha256Hex } from "@/lib/domain/digest";
import { purposes } from "@/lib/domain/entry";
import { canonicalText, findJsonFault } from "@/lib/domain/json";
import { conditionWords } from "@/lib/domain/messages/catalogue-conditions";
import { checksOf, revisionShape } from "@/lib/domain/revision";
import { readSheet, type Gear, type Sheet } from "@/lib/domain/sheet/sheet";
import { householdSheet } from "@/seeders/demo/sheets/household";
import { pounds } from "@/seeders/demo/quantities";
import { everyRig } from "../support/every-rig";
import { anySheet } from "../support/sheets";

/**
 * The digest of every word that the catalogue has for the rigs of the matrix, and of its orders, by its version. Where
 * this fails, `CATALOGUE` gets a new name and this table a row: lists that were made by the old one stay as they are.
 */
const versions: Record<string, string> = {
  "hookfast 1": "4af6640f9c121d45506bb23b7321550bd567bb25a98bc4ac43d6a32cc90c8b93",
};

// Every fourth of the matrix: four goes into none of its lengths, so that each value of each comes up.
const rigs = everyRig()
  .filter((_, at) => at % 4 === 0)
  .map(({ sheet }) => ({ sheet, reviewed: review(sheet) }));

test("other checks, words or orders are another version of the catalogue", () => {
  const words = rigs
    .flatMap(({ reviewed }) => reviewed)
    .map(({ id, station, check, walks }) => JSON.stringify([id, station, check, walks]));
  const orders = [true, false].map((before) => JSON.stringify(ordersFor(before)));
  expect(sha256Hex([...new Set([...words, ...orders])].sort().join("\n"))).toBe(versions[CATALOGUE]);
});

describe("every condition", () => {
  const sheet = (over: Omit<Partial<Sheet>, "v">): Sheet => ({ v: 1, name: "x", ...over });
  const gear = (pieces: Gear) => sheet({ gear: pieces });
  const none = sheet({});
  const there = (key: "dropReceiver" | "airLine" | "chargeLine" | "breakaway") =>
    [gear({ [key]: { there: true } }), gear({ [key]: { there: false } }), none] as const;
  const bar = (coupling: "direct" | "ball" | "pintle") => gear({ towBar: { coupling } });
  const brake = (family: NonNullable<NonNullable<Gear["brake"]>["family"]>) => gear({ brake: { family } });
  const how = sheet({
    procedure: {
      says: "how",
      page: "1",
      endState: "x",
      engineRunEveryHours: 6,
      fuse: "31",
      backToDriving: "y",
    },
  });
  const ownBattery = sheet({ wiring: { style: "light-bar" }, gear: { lightBar: { power: "own-battery" } } });

  /** A sheet for each outcome; null where a condition never comes out so. */
  const table: Record<ConditionName, readonly [yes: Sheet | null, no: Sheet | null, unknown: Sheet | null]> =
    {
      every: [none, null, null],
      direct: [bar("direct"), bar("ball"), none],
      ball: [bar("ball"), bar("pintle"), none],
      pintle: [bar("pintle"), bar("direct"), none],
      drop: there("dropReceiver"),
      pinEnds: [gear({ towBar: { armEnds: "pin" } }), gear({ towBar: { armEnds: "quick" } }), none],
      quickEnds: [gear({ towBar: { armEnds: "quick" } }), gear({ towBar: { armEnds: "pin" } }), none],
      aligning: [gear({ towBar: { selfAligning: true } }), gear({ towBar: { selfAligning: false } }), none],
      stowsOnCoach: [gear({ towBar: { stowsOn: "coach" } }), gear({ towBar: { stowsOn: "car" } }), none],
      shortPair: [gear({ basePlate: { arms: "removable" } }), gear({ basePlate: { arms: "fixed" } }), none],
      brake: [brake("surge"), brake("none"), none],
      brakeBox: [brake("portable"), brake("air"), none],
      brakeBuiltIn: [brake("installed-vacuum"), brake("air"), none],
      brakeAir: [brake("air"), brake("none"), none],
      brakeHydraulic: [brake("hydraulic"), brake("air"), none],
      brakeSurge: [brake("surge"), brake("air"), none],
      manualApply: [gear({ brake: { manualApply: true } }), brake("surge"), none],
      breakaway: there("breakaway"),
      airLine: there("airLine"),
      cord: [none, null, ownBattery],
      chargeLine: there("chargeLine"),
      monitor: [gear({ brake: { monitor: true } }), brake("installed-vacuum"), none],
      lightBar: [sheet({ wiring: { style: "light-bar" } }), sheet({ wiring: { style: "bulbs" } }), none],
      trailerPlug: [
        sheet({ wiring: { style: "trailer-plug" } }),
        sheet({ wiring: { style: "bulbs" } }),
        none,
      ],
      jacks: [
        sheet({ coach: { jacks: false, suspension: "air" } }),
        sheet({ coach: { jacks: false, suspension: "springs" } }),
        sheet({ coach: { jacks: false } }),
      ],
      manualRecorded: [how, none, null],
      manualForbids: [sheet({ procedure: { says: "forbidden" } }), none, null],
      manualMissing: [none, how, null],
      engineRun: [how, none, null],
      fuse: [how, none, null],
      backToDriving: [how, none, null],
      ruledOut: [brake("none"), none, null],
    };

  test.each(Object.entries(table))(
    "%s comes out as the sheet has it, with its own sentence",
    (name, sheets) => {
      const condition = name as ConditionName;
      (["yes", "no", "unknown"] as const).forEach((outcome, at) => {
        const given = sheets[at];
        if (!given) return;
        const { listed, reason, mayBeAbsent } = judge(
          [{ condition, on: ["yes", "unknown"], optional: true }],
          factsOf(given),
        );
        expect([outcome, listed, mayBeAbsent]).toEqual([outcome, outcome !== "no", outcome === "unknown"]);
        expect(reason).toBe(conditionWords[condition][outcome]);
        expect(reason).toMatch(/^[A-Z].+\.$/);
        expect(judge([only(condition)], factsOf(given)).listed).toBe(outcome === "yes");
      });
    },
  );

  test("decides some check, and no check hangs on one that there is not", () => {
    const used = new Set(entries.flatMap(({ when }) => when.map(({ condition }) => condition)));
    expect([...used].sort()).toEqual(Object.keys(table).sort());
  });
});

describe("the catalogue", () => {
  test("has each entry once, and leaves exactly one of those that share a key, or none", () => {
    expect(new Set(entries.map(({ id }) => id)).size).toBe(entries.length);
    for (const { reviewed } of rigs) {
      const listed = reviewed.filter((one) => one.listed);
      expect(new Set(listed.map(({ check }) => check.key)).size).toBe(listed.length);
    }
  });

  test("has every entry on the list of some rig, and off that of some other unless every rig has it", () => {
    const on = new Set<string>();
    const off = new Set<string>();
    for (const { reviewed } of rigs) for (const { id, listed } of reviewed) (listed ? on : off).add(id);
    expect(entries.map(({ id }) => id).filter((id) => !on.has(id))).toEqual([]);
    const always = entries.map(({ id }) => id).filter((id) => !off.has(id));
    const unconditional = entries.filter(({ when }) =>
      when.every(({ on }) => on.length === 3 || on[0] === "yes"),
    );
    expect(unconditional.map(({ id }) => id)).toEqual(expect.arrayContaining(always));
  });

  test("has a walk for every key, and an entry for every key of a walk", () => {
    const walked = new Set(purposes.flatMap((purpose) => ordersFor(null)[purpose]));
    expect([...walked].sort()).toEqual([...new Set(entries.map(({ key }) => key))].sort());
  });

  test("touches only what it has", () => {
    const keys = new Set(entries.map(({ key }) => key));
    for (const { sheet } of rigs.filter((_, at) => at % 3 === 0)) {
      const facts = factsOf(sheet);
      for (const { id, words } of entries)
        expect([id, (words(facts).touches ?? []).filter((key) => !keys.has(key))]).toEqual([id, []]);
    }
  });
});

describe("the review", () => {
  test("holds every entry against a sheet once, and agrees with the list", () => {
    for (const { sheet, reviewed } of rigs) {
      expect(reviewed.map(({ id }) => id)).toEqual(entries.map(({ id }) => id));
      const listed = reviewed.filter((one) => one.listed).map(({ check }) => check);
      const composed = [...checksOf(compose(sheet)).values()];
      expect(listed.map(({ key }) => key).sort()).toEqual(composed.map(({ key }) => key).sort());
      const byKey = new Map(listed.map((check) => [check.key, check]));
      expect(composed.map(({ key }) => JSON.stringify(byKey.get(key)))).toEqual(
        composed.map((check) => JSON.stringify(check)),
      );
    }
  });

  test("gives a reason for every check, in or out", () => {
    for (const { id, reason, listed, check } of review(householdSheet)) {
      expect([id, /^[A-Z].+\.$/.test(reason)]).toEqual([id, true]);
      if (listed) expect(check.listed).toBe(reason);
    }
    const reasonOf = (id: string) => review(householdSheet).find((one) => one.id === id)!.reason;
    expect(reasonOf("cord-and-air")).toBe("The sheet has no air line.");
    expect(reasonOf("receiver-pintle")).toBe("The bar does not hold on a pintle hook.");
    expect(reasonOf("receiver-direct-drop")).toBe(
      "The bar goes straight into the receiver. The sheet has a drop receiver.",
    );
  });
});

describe("the differences between two lists", () => {
  const before = compose(householdSheet);
  const changed = (over: Partial<Sheet>) => listDifferences(before, compose({ ...householdSheet, ...over }));
  const { gear } = householdSheet;

  test("are none between a list and itself, nor between two names of a rig", () => {
    expect(changed({})).toEqual([]);
    expect(changed({ name: "Another", notes: "x" })).toEqual([]);
  });

  test("are the checks that came, in the order of the list, and those that went", () => {
    const differences = changed({
      gear: { ...gear, chargeLine: { there: true, plug: "own-plug" }, breakaway: { there: false } },
    });
    expect(differences.map(({ key, change }) => [key, change])).toEqual([
      // Mending them can no longer change the lanyard.
      ["receiver-pins", "changed"],
      ["cables", "changed"],
      ["charge-line", "added"],
      ["lines-off", "changed"],
      ["lanyard", "removed"],
      ["breakaway-pull", "removed"],
    ]);
    expect(differences[2]!.ask).toBe("Charge line plugged in, fuse in");
  });

  test("say what of a check is new", () => {
    const cables = { ...gear?.cables, rating: pounds(6000) };
    expect(changed({ gear: { ...gear, cables } })).toEqual([
      { key: "cables", ask: "Cables crossed, links screwed shut", change: "changed", members: ["figures"] },
    ]);
  });

  test("say that a check stands at another place, and name no more of them than needed", () => {
    const procedure = { ...householdSheet.procedure, bar: "before" as const };
    expect(changed({ procedure })).toEqual([
      {
        key: "end-state",
        ask: "Cabin as on page 214",
        change: "changed",
        members: [],
        walks: { added: [], removed: [], moved: ["hook-up", "delivery", "yard-out"] },
      },
    ]);
  });

  test("turned around are the same checks, come for gone", () => {
    for (const { sheet } of rigs.filter((_, at) => at % 9 === 0)) {
      const after = compose(sheet);
      const turned = { added: "removed", removed: "added", changed: "changed" } as const;
      const there = listDifferences(before, after).map(({ key, change }) => `${key} ${change}`);
      const back = listDifferences(after, before).map(({ key, change }) => `${key} ${turned[change]}`);
      expect(back.sort()).toEqual(there.sort());
    }
  });
});

describe("composing", () => {
  test("gives the same list for the same sheet, in whatever order its members stand", () => {
    for (const { sheet } of rigs.filter((_, at) => at % 6 === 0)) {
      const text = canonicalText(compose(sheet));
      expect(canonicalText(compose(structuredClone(sheet)))).toBe(text);
      expect(canonicalText(compose(backwards(sheet)))).toBe(text);
    }
  });

  test("leaves the sheet as it was, and keeps all of it", () => {
    const sheet = structuredClone(householdSheet);
    const document = compose(sheet);
    expect(sheet).toEqual(householdSheet);
    expect(document.sheet).toEqual(householdSheet);
    expect(document.catalogue).toBe(CATALOGUE);
  });

  test("of any sheet that can be written down gives a document that the server takes", () => {
    fc.assert(
      fc.property(anySheet, (sheet) => {
        expect(readSheet(sheet).kind).toBe("sheet");
        const document = compose(sheet);
        expect(revisionShape.safeParse(document).error).toBeUndefined();
        expect(findJsonFault(document)).toBeNull();
        for (const [, { ask }] of checksOf(document)) expect([ask, ask.length <= 38]).toEqual([ask, true]);
        expect(digestOf(JSON.parse(JSON.stringify(document)))).toBe(digestOf(document));
      }),
      { numRuns: 30, seed: 4 },
    );
  });
});

/** A value with the members of all its objects in the opposite order. */
function backwards<T>(value: T): T {
  if (Array.isArray(value)) return value.map((one: unknown) => backwards(one)) as T;
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .map(([key, one]) => [key, backwards(one as unknown)])
      .reverse(),
  ) as T;
}
