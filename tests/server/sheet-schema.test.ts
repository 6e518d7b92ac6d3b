import { describe, expect, test } from "vitest";
import { GET as readSchema } from "@/app/api/sheet-schema/route";
import { gearKeys } from "@/lib/domain/sheet/gear";
import { readSheet, type Sheet } from "@/lib/domain/sheet/sheet";
import { settings } from "@/lib/server/settings";
import { givenSheet } from "../support/sheet";

interface Schema {
  type?: string | string[];
  const?: unknown;
  enum?: unknown[];
  anyOf?: Schema[];
  properties?: Record<string, Schema>;
  required?: string[];
  additionalProperties?: unknown;
  items?: Schema;
  minLength?: number;
  maxLength?: number;
  maxItems?: number;
  minimum?: number;
  maximum?: number;
  pattern?: string;
  title?: string;
  description?: string;
}

async function schema(): Promise<Schema & { $schema: string; $id: string; examples: unknown[] }> {
  const response = await readSchema(new Request("http://x/api/sheet-schema"));
  expect(response.headers.get("content-type")).toBe("application/schema+json");
  expect(response.headers.get("cache-control")).toBe("public, max-age=300");
  return (await response.json()) as Awaited<ReturnType<typeof schema>>;
}

/** As much of JSON Schema 2020-12 as the document uses: where a value is not as it says. */
function faults(value: unknown, at: Schema, pointer = ""): string[] {
  if (at.anyOf) {
    const each = at.anyOf.map((one) => faults(value, one, pointer));
    return each.some((found) => found.length === 0)
      ? []
      : each.reduce((a, b) => (a.length <= b.length ? a : b));
  }
  const kind = value === null ? "null" : Array.isArray(value) ? "array" : typeof value;
  const types = at.type === undefined ? [kind] : [at.type].flat();
  const fits = types.includes(kind) || (types.includes("integer") && Number.isInteger(value));
  if (!fits) return [pointer];
  if ("const" in at && at.const !== value) return [pointer];
  if (at.enum && !at.enum.includes(value)) return [pointer];
  if (typeof value === "string") {
    const { minLength = 0, maxLength = Infinity, pattern = "" } = at;
    return value.length < minLength || value.length > maxLength || !new RegExp(pattern).test(value)
      ? [pointer]
      : [];
  }
  if (typeof value === "number") {
    return value < (at.minimum ?? -Infinity) || value > (at.maximum ?? Infinity) ? [pointer] : [];
  }
  if (Array.isArray(value)) {
    if (value.length > (at.maxItems ?? Infinity)) return [pointer];
    return value.flatMap((item, index) => faults(item, at.items!, `${pointer}/${index}`));
  }
  if (kind !== "object") return [];
  const members = value as Record<string, unknown>;
  const missing = (at.required ?? []).filter((key) => !(key in members)).map((key) => `${pointer}/${key}`);
  return [
    ...missing,
    ...Object.entries(members).flatMap(([key, inner]) => {
      const known = at.properties?.[key];
      if (known) return faults(inner, known, `${pointer}/${key}`);
      return at.additionalProperties === false ? [`${pointer}/${key}`] : [];
    }),
  ];
}

/** Every schema below this one that stands for a field, with its pointer. */
function fields(at: Schema, pointer = ""): [string, Schema][] {
  const inner = Object.entries(at.properties ?? {}).flatMap(([key, one]): [string, Schema][] => [
    [`${pointer}/${key}`, one],
    // A quantity or a photograph is one field.
    ...(one.anyOf ? [] : fields(one, `${pointer}/${key}`)),
  ]);
  return at.items ? [...inner, ...fields(at.items, `${pointer}/*`)] : inner;
}

describe("GET /api/sheet-schema", () => {
  test("is JSON Schema 2020-12 with an address of its own", async () => {
    const { $schema, $id, title, type, required, additionalProperties } = await schema();
    expect($schema).toBe("https://json-schema.org/draft/2020-12/schema");
    expect($id).toBe(`${settings.ORIGIN}/api/sheet-schema`);
    expect({ title, type, required, additionalProperties }).toEqual({
      title: "Rig sheet",
      type: "object",
      required: ["v", "name"],
      additionalProperties: false,
    });
  });

  test("every field says what it is called and where it is found", async () => {
    const all = fields(await schema()).filter(([pointer]) => pointer !== "/v");
    expect(all.length).toBeGreaterThan(150);
    for (const [pointer, { title, description }] of all) {
      if (pointer.endsWith("/id"))
        expect([pointer, description]).toEqual([pointer, expect.stringContaining("id")]);
      else expect([pointer, title]).toEqual([pointer, expect.stringMatching(/\S/)]);
      if (!/^\/gear\/\w+$/.test(pointer))
        expect([pointer, description]).toEqual([pointer, expect.stringMatching(/\S/)]);
    }
    expect(fields(await schema()).filter(([pointer]) => /^\/gear\/\w+$/.test(pointer))).toHaveLength(
      gearKeys.length,
    );
  });

  test("its examples are sheets", async () => {
    const document = await schema();
    expect(document.examples.length).toBeGreaterThan(0);
    for (const example of document.examples) {
      expect(readSheet(example).kind).toBe("sheet");
      expect(faults(example, document)).toEqual([]);
    }
  });

  // The reader and the document have to agree about what can be said in a JSON Schema.
  test.each<[string, (sheet: Sheet) => unknown, string[]]>([
    ["a full sheet", (sheet) => sheet, []],
    ["no name", ({ v }) => ({ v }), ["/name"]],
    ["another version", (sheet) => ({ ...sheet, v: 2 }), ["/v"]],
    ["an unknown member", (sheet) => ({ ...sheet, coah: {} }), ["/coah"]],
    ["an unknown member of the car", (sheet) => ({ ...sheet, car: { colour: "blue" } }), ["/car/colour"]],
    ["a gearbox that there is not", (sheet) => ({ ...sheet, car: { gearbox: "none" } }), ["/car/gearbox"]],
    ["a year before cars", (sheet) => ({ ...sheet, car: { year: 1850 } }), ["/car/year"]],
    ["an id that is none", (sheet) => ({ ...sheet, coach: { id: "mine" } }), ["/coach/id"]],
    [
      "a negative weight",
      (sheet) => ({ ...sheet, car: { curb: { massKg: -1, entered: { value: 1, unit: "kg" } } } }),
      ["/car/curb/massKg"],
    ],
    [
      "a weight in feet",
      (sheet) => ({ ...sheet, car: { curb: { massKg: 1, entered: { value: 1, unit: "ft" } } } }),
      ["/car/curb/entered/unit"],
    ],
    [
      "a splice of no kind",
      (sheet) => ({ ...sheet, wiring: { segments: [{ splices: [{ kind: "glued" }] }] } }),
      ["/wiring/segments/0/splices/0/kind"],
    ],
    [
      "thirteen grounds",
      (sheet) => ({ ...sheet, wiring: { grounds: Array(13).fill({}) } }),
      ["/wiring/grounds"],
    ],
  ])("%s", async (_, change, expected) => {
    const value = change(givenSheet());
    expect(faults(value, await schema())).toEqual(expected);
    expect(readSheet(value).kind === "sheet").toBe(expected.length === 0);
  });
});
