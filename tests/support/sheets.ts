import fc from "fast-check";
import type { Field, Fields } from "@/lib/domain/sheet/field";
import { outline, type ListOutline } from "@/lib/domain/sheet/outline";
import { quantityOf, unitsFor, type QuantityKind } from "@/lib/domain/sheet/quantity";
import type { Sheet } from "@/lib/domain/sheet/sheet";

/** Any sheet that can be written down, without empty parts or lists. */
export const anySheet: fc.Arbitrary<Sheet> = fc.tuple(...outline.map(anyPart)).map((parts) => {
  const sheet: Record<string, unknown> = { v: 1 };
  outline.forEach(({ path }, index) => place(sheet, path, parts[index]!));
  return { name: "Rig", ...sheet } as unknown as Sheet;
});

/** A sheet in which every field of every part is known. */
export const fullSheet = (): Sheet => {
  const values = (fields: Fields) =>
    Object.fromEntries(
      Object.entries(fields).map(([key, field]) => [
        key,
        fc.sample(anyValue(field), { numRuns: 1, seed: 1 })[0],
      ]),
    );
  const items = (lists: readonly ListOutline[]): Record<string, unknown> =>
    Object.fromEntries(lists.map((list) => [list.key, [{ ...values(list.fields), ...items(list.lists) }]]));
  const sheet: Record<string, unknown> = { v: 1 };
  for (const { path, fields, lists } of outline) place(sheet, path, { ...values(fields), ...items(lists) });
  return sheet as unknown as Sheet;
};

function place(sheet: Record<string, unknown>, path: readonly string[], values: Record<string, unknown>) {
  if (path.length === 0) {
    // A rig has a name, and its notes may be there or not.
    Object.assign(sheet, values, values.name === null ? { name: "Rig" } : {});
    return;
  }
  if (Object.keys(values).length === 0) return;
  const [first, second] = path as [string, string?];
  if (second === undefined) sheet[first] = values;
  else sheet[first] = { ...(sheet[first] as object | undefined), [second]: values };
}

function anyPart({ thing, fields, lists }: (typeof outline)[number]) {
  const ids = thing ? { id: fc.uuid() } : {};
  return fc.record({ ...ids, ...anyFields(fields), ...anyLists(lists) }, { requiredKeys: [] });
}

function anyFields(fields: Fields) {
  return Object.fromEntries(Object.entries(fields).map(([key, field]) => [key, fc.option(anyValue(field))]));
}

function anyLists(lists: readonly ListOutline[]): Record<string, fc.Arbitrary<unknown>> {
  return Object.fromEntries(
    lists.map((list) => {
      const item = fc.record({ ...anyFields(list.fields), ...anyLists(list.lists) }, { requiredKeys: [] });
      return [list.key, fc.array(item, { minLength: 1, maxLength: 3 })];
    }),
  );
}

function anyValue(field: Field): fc.Arbitrary<unknown> {
  switch (field.kind) {
    case "text":
      return fc.stringMatching(/^[A-Za-z0-9][ -~]{0,18}$/);
    case "choice":
      return fc.constantFrom(...field.of);
    case "yes-no":
      return fc.boolean();
    case "year":
      return fc.integer({ min: 1900, max: 2100 });
    case "date":
      return fc.constantFrom("2024-02-29", "2026-11-03", "2026-12-01");
    case "count":
      return fc.integer({ min: 0, max: field.most });
    case "photo":
      return fc.constant({ sha256: "ab".repeat(32), bytes: 2048, mime: "image/jpeg" });
    default:
      return anyQuantity(field.kind);
  }
}

function anyQuantity(kind: QuantityKind) {
  return fc
    .tuple(fc.integer({ min: 1, max: 40_000 }), fc.constantFrom(...unitsFor(kind, "us")))
    .map(([value, unit]) => quantityOf(kind, value, unit));
}
