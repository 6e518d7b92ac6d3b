import { describe, expect, test } from "vitest";
import { compose } from "@/lib/domain/catalogue/compose";
import { checksOf, type Check, type RevisionDocument } from "@/lib/domain/revision";
import type { Car, Procedure, Sheet } from "@/lib/domain/sheet/sheet";
import { householdSheet } from "@/seeders/demo/sheets/household";

/** What two manuals say of one point, each right for its own car: the rows of the trade's table of contradictions. */
interface Row {
  point: string;
  car?: Car;
  one: Procedure;
  other: Procedure;
}

const rows: Row[] = [
  {
    point: "when to shift the drivetrain",
    one: {
      bar: "before",
      endState: "Transfer case proved in neutral, parking brake on, and only then the bar.",
    },
    other: { bar: "after", endState: "Attached first, then in neutral; the brake came off once attached." },
  },
  {
    point: "an automatic gearbox",
    car: { gearbox: "automatic" },
    one: { endState: "Selector in Park with the transfer case in Neutral." },
    other: { endState: "Selector in Neutral." },
  },
  {
    point: "a manual gearbox",
    car: { gearbox: "manual" },
    one: { endState: "In gear, transfer case in Neutral." },
    other: { endState: "Gear lever in Neutral." },
  },
  {
    point: "key and ignition",
    one: { endState: "Key at ACC." },
    other: { endState: "Key OFF, which unlocks the column; fob outside, doors locked by hand." },
  },
  {
    point: "the 12 V battery",
    one: { endState: "As the page ends.", battery: "stays connected", fuse: "31" },
    other: { endState: "As the page ends.", battery: "negative cable off and insulated" },
  },
  {
    point: "the path into neutral",
    one: { endState: "From Drive only; Reverse and then Neutral destroys it." },
    other: { endState: "Drive, Reverse, Neutral, engine running; then off." },
  },
];

function listOf({ car }: Row, procedure: Procedure): RevisionDocument {
  const sheet: Sheet = {
    ...householdSheet,
    car: { ...householdSheet.car, ...car },
    procedure: { says: "how", manual: "the manual", page: "214", ...procedure },
  };
  return compose(sheet);
}

const wordsOf = ({ ask, how, why, mend, who, caution }: Check) =>
  [ask, how, why, mend, who, caution].filter(Boolean).join(" ");

/** A list's words without what the owner wrote. */
function ours(document: RevisionDocument, { endState, battery, fuse }: Procedure): string[] {
  return [...checksOf(document)].map(([, check]) =>
    [endState, battery, fuse]
      .filter((text) => text !== undefined && text !== null)
      .reduce((words, text) => words.replaceAll(`“${text}”`, "“”"), wordsOf(check)),
  );
}

// What a generic step would be about. A parking brake, a transfer case, a car that rolls in first gear and the brake
// that a car is driven with again are not one.
const step =
  /\b(neutral|reverse|selector|shift|ignition|acc\b|key|insulat|disconnect|drive(train|line)|first gear|in gear|in park)/gi;

describe.each(rows)("of $point", (row) => {
  test.each(["one", "other"] as const)(
    "what %s manual says stands in the owner's words, at its place",
    (which) => {
      const procedure = row[which];
      const document = listOf(row, procedure);
      const cabin = checksOf(document).get("end-state")!;
      expect(cabin.how).toContain(`“${procedure.endState}”`);
      if (procedure.battery) expect(cabin.how).toContain(`“${procedure.battery}”`);
      expect(cabin.ask).toBe("Cabin as on page 214");
      expect(cabin.origin).toEqual({ kind: "vehicle-manual", says: "the manual, page 214." });
      const walk = document.walks["hook-up"].short;
      const [state, arm] = [walk.indexOf("end-state"), walk.indexOf("arm-left")];
      expect(state < arm).toBe(procedure.bar === "before");
    },
  );

  test("nothing of ours comes between, whichever it is", () => {
    const [one, other] = [listOf(row, row.one), listOf(row, row.other)];
    for (const [document, procedure] of [
      [one, row.one],
      [other, row.other],
    ] as const) {
      const said = new Set(
        ours(document, procedure).flatMap((words) => words.toLowerCase().match(step) ?? []),
      );
      // Why a wheel that rolls proves little, and what another car's way can wreck.
      expect([...said].filter((word) => !["first gear", "drivetrain", "driveline"].includes(word))).toEqual(
        [],
      );
    }
    if (row.one.fuse) return;
    expect(ours(other, row.other).sort()).toEqual(ours(one, row.one).sort());
  });

  test("the two lists are told apart", () => {
    expect(listOf(row, row.one).list).not.toEqual(listOf(row, row.other).list);
  });
});

test("a manual that wants its steps before the bar has them before the arms, with all else in its place", () => {
  const [first] = rows as [Row];
  const before = listOf(first, first.one).walks["hook-up"].full;
  const after = listOf(first, first.other).walks["hook-up"].full;
  expect(before.filter((key) => key !== "end-state")).toEqual(after.filter((key) => key !== "end-state"));
  expect(before.slice(1, 4)).toEqual(["receiver-pins", "end-state", "base-plate"]);
  expect(after[after.indexOf("end-state") + 1]).toBe("steering-free");
});

test.each<[string, Procedure | undefined, string, RegExp]>([
  ["forbidden", { says: "forbidden", page: "214", endState: "x" }, "manual-forbids", /forbids/],
  ["not recorded", { says: "not-recorded" }, "manual-not-recorded", /no page and end state/],
  ["not asked yet", undefined, "manual-not-recorded", /no page and end state/],
  ["a way without its page", { says: "how", endState: "x" }, "manual-not-recorded", /no page and end state/],
  ["a way without its end state", { says: "how", page: "9" }, "manual-not-recorded", /no page and end state/],
])("%s holds at the first station and says why", (_, procedure, __, says) => {
  const { procedure: recorded, ...sheet } = householdSheet;
  expect(recorded).toBeDefined();
  const document = compose({ ...sheet, ...(procedure && { procedure }) });
  const checks = checksOf(document);
  expect(document.walks["hook-up"].short[0]).toBe("manual-page");
  expect(document.list.stations[0]!.checks.map(({ key }) => key)).toContain("manual-page");
  expect(checks.get("manual-page")!.how).toMatch(says);
  expect(checks.has("end-state")).toBe(false);
  expect(document.walks.unhook.full).not.toContain("manual-page");
});
