import { describe, expect, it, test } from "vitest";
import { finished, imported, sheetOf, withBlanks, withoutIds, type Draft } from "@/lib/domain/sheet/draft";
import { draftErrors, draftWarnings } from "@/lib/domain/sheet/draft-check";
import { mergeSheets, withField } from "@/lib/domain/sheet/draft-merge";
import { placeOf } from "@/lib/domain/sheet/draft-places";
import {
  fieldsShown,
  parts,
  partShows,
  progressOf,
  sectionKeys,
  sectionOf,
  sectionParts,
} from "@/lib/domain/sheet/draft-sections";
import { outline } from "@/lib/domain/sheet/outline";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import { readSheet, type Sheet } from "@/lib/domain/sheet/sheet";
import { householdSheet } from "@/seeders/demo/sheets/household";
import { longCoachSheet } from "@/seeders/demo/sheets/long-coach";
import { shopSheet } from "@/seeders/demo/sheets/shop";
import { shortCoachSheet } from "@/seeders/demo/sheets/short-coach";

const pounds = (value: number) => quantityOf("mass", value, "lb")!;
const noNewId = () => {
  throw new Error("this sheet has all its ids");
};
const whole: Sheet = { v: 1, name: "x" };

describe("sections", () => {
  it("ask for every part of a sheet once", () => {
    const asked = sectionKeys.flatMap((section) => sectionParts[section]);
    const all = outline.flatMap(({ path }) => (path.length > 0 ? [path.at(-1)] : []));
    expect([...asked].sort()).toEqual([...all].sort());
  });

  it("name only fields that there are, and none twice", () => {
    for (const part of Object.values(parts)) {
      expect(Object.keys(part.fields)).toEqual(expect.arrayContaining([...part.first]));
      expect(new Set(part.first).size, part.key).toBe(part.first.length);
    }
  });

  test.each<[string, Sheet, string, boolean]>([
    ["a coupler belongs to a ball", { ...whole, gear: { towBar: { coupling: "ball" } } }, "coupler", true],
    ["and to a pintle hook", { ...whole, gear: { towBar: { coupling: "pintle" } } }, "coupler", true],
    ["not into the receiver", { ...whole, gear: { towBar: { coupling: "direct" } } }, "coupler", false],
    ["nor where nobody knows", { ...whole, gear: { towBar: { coupling: null } } }, "coupler", false],
    [
      "short cables belong to removable arms",
      { ...whole, gear: { basePlate: { arms: "removable" } } },
      "shortCables",
      true,
    ],
    ["not to fixed ones", { ...whole, gear: { basePlate: { arms: "fixed" } } }, "shortCables", false],
    ["a light bar is a style of wiring", { ...whole, wiring: { style: "light-bar" } }, "lightBar", true],
    ["and of no other", { ...whole, wiring: { style: "bulbs" } }, "lightBar", false],
  ])("%s", (_, sheet, key, shows) => {
    expect(partShows(sheet, key as "coupler")).toBe(shows);
  });

  it("leave out what means nothing on this rig", () => {
    const shown = (sheet: Sheet, key: keyof typeof parts) => {
      const { first, more } = fieldsShown(sheet, parts[key]);
      return [...first, ...more];
    };
    expect(shown({ ...whole, gear: { airLine: { there: false, serial: "A" } } }, "airLine")).toEqual([
      "there",
    ]);
    expect(shown({ ...whole, gear: { airLine: { there: true } } }, "airLine")).toContain("serial");
    expect(shown({ ...whole, gear: { airLine: { serial: "A" } } }, "airLine")).toContain("lot");
    const forbids = (more: object) =>
      shown({ ...whole, procedure: { says: "forbidden", ...more } }, "procedure").sort();
    expect(forbids({})).toEqual(["manual", "page", "photo", "says"]);
    // What someone wrote down before is not lost by it.
    expect(forbids({ endState: "Key off" })).toContain("endState");
    expect(shown({ ...whole, procedure: { says: "not-recorded" } }, "procedure")).toEqual(["says"]);
    expect(shown({ ...whole, procedure: { says: "how" } }, "procedure")).toContain("endState");
    expect(shown({ ...whole, gear: { towBar: { coupling: "pintle" } } }, "coupler")).not.toContain(
      "ballSize",
    );
  });

  it("count what is filled in, not known included", () => {
    const empty = progressOf(whole, "brake");
    const sheet: Sheet = { ...whole, gear: { brake: { family: null, monitor: false, serial: "" as never } } };
    expect(progressOf(sheet, "brake")).toEqual({ filled: 2, of: empty.of });
  });

  test.each([
    ["/coach/gvwr", "coach", "Coach: GVWR"],
    ["/gear/towBar/rating/massKg", "bar", "Tow bar: Rating"],
    ["/wiring/segments/1/gaugeAwg", "wiring", "Wiring, Segment 2: Gauge, AWG"],
    ["/wiring/segments/1/conductors/0/far", "wiring", "Wiring, Segment 2, Wire 1: Does, at the far end"],
    ["/procedure/page", "manual", "The car’s own manual: Page"],
    ["/name", "rig", "Rig: Name"],
    ["/nowhere", "rig", "/nowhere"],
  ])("%s is found in %s as %s", (pointer, section, words) => {
    expect(sectionOf(pointer)).toBe(section);
    expect(placeOf(pointer).words).toBe(words);
  });
});

describe("a draft", () => {
  test.each([householdSheet, longCoachSheet, shopSheet, shortCoachSheet].map((sheet) => [sheet.name, sheet]))(
    "of %s amounts to that very sheet",
    (_, sheet) => {
      const draft = withBlanks(structuredClone(sheet) as unknown as Draft);
      expect(finished(draft, noNewId)).toEqual(sheet);
      expect(draftErrors(draft)).toEqual([]);
    },
  );

  it("gives an id to what is there, and none to what is not", () => {
    let made = 0;
    const sheet = finished(
      {
        name: " Bay  3 ",
        coach: { jacks: true },
        car: { year: "" },
        gear: {
          towBar: { id: "kept", rating: null },
          airLine: { there: false, serial: "gone" },
          coupler: { rating: pounds(5000) },
        },
        procedure: { says: "forbidden", page: "12" },
        wiring: { segments: [{ from: "", to: "", conductors: [], splices: [] }] },
      },
      () => `new ${++made}`,
    );
    expect(sheet).toEqual({
      v: 1,
      name: "Bay 3",
      coach: { id: "new 1", jacks: true },
      gear: { airLine: { there: false }, towBar: { id: "kept", rating: null } },
      procedure: { says: "forbidden", page: "12" },
    });
  });

  it("keeps not known apart from nothing", () => {
    expect(sheetOf({ name: "x", coach: { gvwr: null, gcwr: "" } }).coach).toEqual({ gvwr: null });
  });

  it("that comes from a file keeps the ids of the draft and brings none", () => {
    const draft = { name: "y", coach: { id: "mine" }, gear: { cord: { id: "my cord" } } };
    const taken = imported({ ...householdSheet, gear: { towBar: { id: "theirs", rating: null } } }, draft);
    expect(taken.coach).toMatchObject({ id: "mine", jacks: householdSheet.coach!.jacks });
    expect(taken.gear).toEqual({ towBar: { rating: null } });
    expect(imported(householdSheet, householdSheet as unknown as Draft)).toEqual(householdSheet);
  });

  it("without its ids says the same", () => {
    const copy = withoutIds(householdSheet);
    expect(JSON.stringify(copy)).not.toContain('"id"');
    expect(householdSheet.coach?.id).toBeDefined();
    expect(copy.coach?.gvwr).toEqual(householdSheet.coach?.gvwr);
  });

  test.each<[string, Draft, string, RegExp]>([
    ["a figure that is none", { name: "x", coach: { gvwr: "12 tons" } }, "/coach/gvwr", /not a number/],
    ["a negative weight", { name: "x", coach: { gvwr: pounds(-5) } }, "/coach/gvwr", /cannot be negative/],
    ["a year that is none", { name: "x", car: { year: "20x1" } }, "/car/year", /not a year/],
    ["a year too early", { name: "x", car: { year: 1850 } }, "/car/year", /before 1900/],
    [
      "GCWR below GVWR",
      { name: "x", coach: { gvwr: pounds(22000), gcwr: pounds(20000) } },
      "/coach/gcwr",
      /below GVWR/,
    ],
    ["a rig without a name", { name: "" }, "/name", /has a name/],
    [
      "a gauge of zero in the second segment",
      { name: "x", wiring: { segments: [{ from: "a" }, { gaugeAwg: 0 }] } },
      "/wiring/segments/1/gaugeAwg",
      /cannot be zero/,
    ],
  ])("refuses %s at its field, once", (_, draft, pointer, words) => {
    expect(draftErrors(draft)).toEqual([{ pointer, detail: expect.stringMatching(words) as string }]);
  });

  it("warns of the unusual and takes it", () => {
    const draft = { name: "x", car: { curb: pounds(20000) } };
    expect(draftErrors(draft)).toEqual([]);
    expect(draftWarnings(draft).map(({ pointer }) => pointer)).toEqual(["/car/curb"]);
  });
});

describe("two people's sheets", () => {
  const base: Sheet = {
    v: 1,
    name: "Lot 7",
    coach: { id: "c", gvwr: pounds(30000), jacks: true },
    gear: { towBar: { coupling: "direct" } },
    wiring: { segments: [{ from: "a" }] },
  };

  it("are merged where each changed something else", () => {
    const mine = { ...base, coach: { ...base.coach, gvwr: pounds(31000) } };
    const theirs: Sheet = {
      ...base,
      name: "Lot 8",
      gear: { towBar: { coupling: null }, cord: { shape: "coiled" } },
    };
    const merged = mergeSheets(base, mine, theirs);
    expect(merged.sheet).toEqual({
      ...base,
      name: "Lot 8",
      coach: { id: "c", gvwr: pounds(31000), jacks: true },
      gear: { towBar: { coupling: null }, cord: { shape: "coiled" } },
    });
    expect(merged.fromMe).toEqual(["/coach/gvwr"]);
    expect(merged.fromThem).toEqual(["/name", "/gear/towBar/coupling", "/gear/cord/shape"]);
    expect(merged.conflicts).toEqual([]);
  });

  it("conflict where both changed the same field to something else, and the choice decides", () => {
    const mine = { ...base, coach: { ...base.coach, jacks: false } };
    const theirs = { ...base, coach: { ...base.coach, jacks: null } };
    const { conflicts, sheet } = mergeSheets(base, mine, theirs);
    expect(conflicts).toEqual([{ pointer: "/coach/jacks", mine: false, theirs: null }]);
    expect(withField(sheet, "/coach/jacks", false).coach?.jacks).toBe(false);
    expect("jacks" in withField(sheet, "/coach/jacks", undefined).coach!).toBe(false);
  });

  it("agree where both made the same change, and what one emptied stays empty", () => {
    const coach = { ...base.coach! };
    delete coach.jacks;
    const mine = { ...base, name: "Lot 9", coach };
    const merged = mergeSheets(base, mine, { ...base, name: "Lot 9" });
    expect(merged.sheet).toEqual(mine);
    expect(merged.conflicts).toEqual([]);
    expect(merged.fromThem).toEqual([]);
  });

  it("take the rows of a list together", () => {
    const mine = { ...base, wiring: { segments: [{ from: "a" }, { from: "b" }] } };
    const theirs = { ...base, wiring: { segments: [{ from: "z" }] } };
    const { conflicts } = mergeSheets(base, mine, theirs);
    expect(conflicts.map(({ pointer }) => pointer)).toEqual(["/wiring/segments"]);
  });

  it("keep the id that was saved first, without asking", () => {
    const mine = { ...base, gear: { ...base.gear, cord: { id: "mine", shape: "coiled" as const } } };
    const theirs = { ...base, gear: { ...base.gear, cord: { id: "theirs", shape: "coiled" as const } } };
    const merged = mergeSheets(base, mine, theirs);
    expect(merged.sheet.gear?.cord?.id).toBe("theirs");
    expect([merged.conflicts, merged.fromThem]).toEqual([[], []]);
  });

  it("come out as a sheet that reads", () => {
    expect(readSheet(mergeSheets(householdSheet, householdSheet, householdSheet).sheet)).toEqual({
      kind: "sheet",
      sheet: householdSheet,
    });
  });
});
