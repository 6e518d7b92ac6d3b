import "server-only";
import * as z from "zod/mini";
import { gearNames, gearWords } from "@/lib/domain/messages/sheet-gear";
import { sheetSchemaWords as say } from "@/lib/domain/messages/sheet-schema";
import { carWords, coachWords, type FieldWords } from "@/lib/domain/messages/sheet-vehicles";
import {
  conductorWords,
  contactWords,
  groundWords,
  procedureWords,
  segmentWords,
  spliceWords,
  wiringWords,
} from "@/lib/domain/messages/sheet-wiring";
import { gearKeys } from "@/lib/domain/sheet/gear";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import { SHEET_VERSION, sheetShape, type Sheet } from "@/lib/domain/sheet/sheet";
import { settings } from "./settings";

/** As much of a JSON Schema as is looked into here. */
interface Schema {
  $schema?: string;
  title?: string;
  description?: string;
  properties?: Record<string, Schema>;
  items?: Schema;
}

type Words = Record<string, FieldWords>;

/** A small sheet, so that a reader sees how known, not known and absent look. */
const example: Sheet = {
  v: SHEET_VERSION,
  name: "Maple Loop",
  coach: {
    gvwr: quantityOf("mass", 22000, "lb"),
    gcwr: quantityOf("mass", 26000, "lb"),
    tagAxleRating: null,
  },
  car: { year: 2019, gearbox: "automatic", transferCase: true },
  gear: { towBar: { coupling: "direct", rating: null }, dropReceiver: { there: false } },
  procedure: { says: "not-recorded" },
};

/**
 * The JSON Schema (2020-12) of a rig sheet, from the shape that reads one; each field with its name and where on the
 * vehicle it is found. It says less than the shape does: that both values of a quantity are the same weight, say, is
 * checked when a sheet is read.
 */
export function sheetSchema(): Record<string, unknown> {
  const { $schema, ...schema } = z.toJSONSchema(sheetShape, {
    io: "input",
    unrepresentable: "any",
  }) as Schema;
  const parts = schema.properties!;
  const { coach, car, gear, wiring, procedure } = parts as Required<typeof parts>;
  name(parts, say.parts);
  for (const [thing, words] of [
    [coach, coachWords],
    [car, carWords],
  ] as const) {
    nameThing(thing!, words);
  }
  for (const key of gearKeys) {
    const piece = gear!.properties![key]!;
    piece.title = gearNames[key];
    nameThing(piece, gearWords[key]);
  }
  name(procedure!.properties!, procedureWords);
  nameWiring(wiring!.properties!);
  const { title, description } = say;
  return {
    $schema,
    $id: `${settings.ORIGIN}/api/sheet-schema`,
    title,
    description,
    ...schema,
    examples: [example],
  };
}

function nameThing({ properties }: Schema, words: Words): void {
  properties!.id!.description = say.id;
  name(properties!, words);
}

function nameWiring(wiring: Record<string, Schema>): void {
  const each = (list: Schema | undefined) => list!.items!.properties!;
  const segment = each(wiring.segments);
  name(wiring, { ...wiringWords, ...say.lists });
  name(each(wiring.socket), contactWords);
  name(segment, { ...segmentWords, ...say.lists });
  name(each(segment.conductors), conductorWords);
  name(each(segment.splices), spliceWords);
  name(each(wiring.grounds), groundWords);
}

/** Gives every member that has words its title and description. */
function name(properties: Record<string, Schema>, words: Words): void {
  for (const [key, schema] of Object.entries(properties)) {
    const { label, where } = words[key] ?? {};
    if (label) Object.assign(schema, { title: label, description: where });
  }
}
