import { expect, test } from "vitest";
import { optionWords } from "@/lib/domain/messages/sheet-wiring";
import type { Fields } from "@/lib/domain/sheet/field";
import { gearFields } from "@/lib/domain/sheet/gear";
import { procedureFields } from "@/lib/domain/sheet/procedure";
import { carFields, coachFields } from "@/lib/domain/sheet/vehicles";
import * as wiring from "@/lib/domain/sheet/wiring";

const tables: Fields[] = [
  coachFields,
  carFields,
  procedureFields,
  wiring.wiringFields,
  wiring.contactFields,
  wiring.segmentFields,
  wiring.conductorFields,
  wiring.spliceFields,
  wiring.groundFields,
  ...Object.values(gearFields),
];

test("every option of every choice has its words, and no words are left over", () => {
  const options = new Set(
    tables
      .flatMap((table) => Object.values(table))
      .flatMap((field) => (field.kind === "choice" ? field.of : [])),
  );
  expect([...options].sort()).toEqual(Object.keys(optionWords).sort());
});
