import { describe, expect, test } from "vitest";
import { compose } from "@/lib/domain/catalogue/compose";
import { ruledOut } from "@/lib/domain/catalogue/rule-outs";
import { checksOf } from "@/lib/domain/revision";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import type { Car, Coach, Gear, Sheet } from "@/lib/domain/sheet/sheet";
import { householdSheet as base } from "@/seeders/demo/sheets/household";
import { inches, pounds } from "@/seeders/demo/quantities";

const kilograms = (value: number) => quantityOf("mass", value, "kg");

interface Change {
  coach?: Coach;
  car?: Car;
  gear?: Gear;
}

function changed({ coach, car, gear = {} }: Change): Sheet {
  const pieces = Object.fromEntries(
    Object.entries({ ...base.gear, ...gear }).map(([key, piece]) => [
      key,
      { ...base.gear?.[key as keyof Gear], ...piece },
    ]),
  );
  return { ...base, coach: { ...base.coach, ...coach }, car: { ...base.car, ...car }, gear: pieces };
}

// Room for a car of 5,000 lb.
const heavier: Coach = { gcwr: pounds(27000) };

test("the household's own rig is not ruled out: 3,040 lb of car, everything rated 5,000 lb or more", () => {
  expect(ruledOut(base)).toEqual([]);
});

describe("a figure that is reached is no reason, one beyond it is", () => {
  // The household's car weighs 3,040 lb loaded, its coach 7,320 + 13,840 = 21,160 lb of a GCWR of 26,000 lb.
  test.each<[string, Change, Change, string, string]>([
    [
      "receiver",
      { coach: { receiverRating: pounds(3040) } },
      { coach: { receiverRating: pounds(3039) } },
      "over-receiver",
      "The car weighs 3,040 lb loaded; the coach’s receiver is rated 3,039 lb.",
    ],
    [
      "tow limit with brakes",
      { coach: { towLimitBraked: pounds(3040) } },
      { coach: { towLimitBraked: pounds(3000) } },
      "over-tow-limit",
      "The car weighs 3,040 lb loaded; the coach maker’s limit for a car with brakes is 3,000 lb.",
    ],
    [
      "drop receiver",
      { gear: { dropReceiver: { rating: pounds(3040) } } },
      { gear: { dropReceiver: { rating: pounds(2000) } } },
      "over-drop-receiver",
      "The car weighs 3,040 lb loaded; the drop receiver is rated 2,000 lb.",
    ],
    [
      "ball",
      { gear: { towBar: { coupling: "ball" }, coupler: { rating: pounds(3500) } } },
      { gear: { towBar: { coupling: "ball" }, coupler: { rating: pounds(2000) } } },
      "over-coupler",
      "The car weighs 3,040 lb loaded; the ball or pintle hook is rated 2,000 lb.",
    ],
    [
      "tow bar",
      { gear: { towBar: { rating: pounds(3040) } } },
      { gear: { towBar: { rating: pounds(3000) } } },
      "over-tow-bar",
      "The car weighs 3,040 lb loaded; the tow bar is rated 3,000 lb.",
    ],
    [
      "base plate in another unit",
      // 3,040 lb are 1,378.9 kg.
      { gear: { basePlate: { rating: kilograms(1379) } } },
      { gear: { basePlate: { rating: kilograms(1378) } } },
      "over-base-plate",
      "The car weighs 3,040 lb loaded; the base plate is rated 1,378 kg.",
    ],
    [
      // FMCSA guidance to 49 CFR 393.70(d): 5,000 lb on two chains of 3,000 lb is within the combined strength.
      "cables, all of them together",
      { coach: heavier, car: { loaded: pounds(5000) }, gear: { cables: { count: 2, rating: pounds(3000) } } },
      { coach: heavier, car: { loaded: pounds(5000) }, gear: { cables: { count: 2, rating: pounds(2400) } } },
      "over-cables",
      "The car weighs 5,000 lb loaded; the safety cables together are rated 2 times 2,400 lb.",
    ],
    [
      "GCWR less the coach as weighed",
      { car: { loaded: pounds(4840) } },
      { car: { loaded: pounds(4841) } },
      "over-gcwr",
      "GCWR 26,000 lb less the coach as weighed, 21,160 lb, leaves 4,840 lb. The car weighs 4,841 lb loaded.",
    ],
    [
      "the car's own weight where it was never weighed loaded",
      { car: { loaded: null, curb: pounds(3040) }, gear: { towBar: { rating: pounds(3040) } } },
      { car: { loaded: null, curb: pounds(3041) }, gear: { towBar: { rating: pounds(3040) } } },
      "over-tow-bar",
      "The car weighs 3,041 lb even before it is loaded; the tow bar is rated 3,040 lb.",
    ],
    [
      // 21.5 less a drop of 4 is 17.5.
      "slope, coach end high",
      { car: { basePlateHeight: inches(14.5) } },
      { car: { basePlateHeight: inches(14.4) } },
      "out-of-level",
      "The tow bar stands 3.1 in out of level; its maker’s limit is 3 in.",
    ],
    [
      "slope, car end high",
      { car: { basePlateHeight: inches(20.5) } },
      { car: { basePlateHeight: inches(21) } },
      "out-of-level",
      "The tow bar stands 3.5 in out of level; its maker’s limit is 3 in.",
    ],
    [
      // 21.5 and a rise of 4 is 25.5.
      "slope with a rise",
      { car: { basePlateHeight: inches(23) }, gear: { dropReceiver: { direction: "rise" } } },
      { car: { basePlateHeight: inches(22) }, gear: { dropReceiver: { direction: "rise" } } },
      "out-of-level",
      "The tow bar stands 3.5 in out of level; its maker’s limit is 3 in.",
    ],
  ])("%s", (_, at, beyond, code, says) => {
    expect(ruledOut(changed(at))).toEqual([]);
    expect(ruledOut(changed(beyond))).toContainEqual({ code, says });
  });
});

test.each<[string, Change]>([
  ["the tow bar's rating", { gear: { towBar: { rating: null } }, car: { loaded: pounds(4800) } }],
  ["how many cables there are", { gear: { cables: { count: null, rating: pounds(100) } } }],
  ["the car's weight", { car: { loaded: null, curb: null }, gear: { towBar: { rating: pounds(1) } } }],
  ["one of the coach's axles", { coach: { gcwr: pounds(22000), rearAxleLoaded: null } }],
  ["a tag axle's load where there is one", { coach: { gcwr: pounds(22000), tagAxleRating: pounds(9000) } }],
  [
    "how far the drop goes",
    { car: { basePlateHeight: inches(40) }, gear: { dropReceiver: { offset: null } } },
  ],
  [
    "what a ball adds in height",
    { car: { basePlateHeight: inches(40) }, gear: { towBar: { coupling: "ball" } } },
  ],
])("without %s nothing is compared, and so nothing ruled out", (_, change) => {
  expect(ruledOut(changed(change))).toEqual([]);
});

test("gear that is not there is not compared", () => {
  const without: Change = {
    coach: { receiverHeight: inches(17.5) },
    gear: { dropReceiver: { there: false, rating: pounds(100) }, coupler: { rating: pounds(100) } },
  };
  expect(ruledOut(changed(without))).toEqual([]);
});

describe("a car without a brake", () => {
  const none = (coach: Coach = {}) =>
    changed({ coach, gear: { brake: { family: "none" }, breakaway: { there: false } } });

  test("is held against the coach maker's limit and local law, with the figures where they are known", () => {
    expect(ruledOut(none())).toEqual([
      {
        code: "no-brake",
        says: "The car has no brake for towing. The coach maker’s limit for a car without one decides, and so does local law. That limit is 1,000 lb; the car weighs 3,040 lb.",
      },
    ]);
    expect(ruledOut(none({ towLimitUnbraked: null }))[0]!.says).toMatch(/local law\.$/);
  });

  test("has a list without the brake, which begins with the reason", () => {
    const document = compose(none());
    const { full } = document.walks["hook-up"];
    expect(full[0]).toBe("ruled-out");
    expect(full).not.toContain("brake-ready");
    expect(full).not.toContain("manual-apply");
    expect(checksOf(document).get("ruled-out")!.how).toContain("The car has no brake for towing.");
  });
});

test("the first check says every reason that is not the manual's, and the manual has its own", () => {
  const sheet = changed({ gear: { towBar: { rating: pounds(3000) }, basePlate: { rating: pounds(2000) } } });
  const document = compose({ ...sheet, procedure: { says: "forbidden" } });
  expect(document.walks["hook-up"].full.slice(0, 3)).toEqual(["manual-page", "ruled-out", "coach-held"]);
  const { how } = checksOf(document).get("ruled-out")!;
  expect(how).toContain("the tow bar is rated 3,000 lb.");
  expect(how).toContain("the base plate is rated 2,000 lb.");
  expect(how).not.toContain("manual");
});

test("a sheet with nothing on it is ruled out as not recorded, and nothing else", () => {
  expect(ruledOut({ v: 1, name: "x" }).map(({ code }) => code)).toEqual(["manual-not-recorded"]);
  expect(compose({ v: 1, name: "x" }).walks["hook-up"].full[0]).toBe("manual-page");
});
