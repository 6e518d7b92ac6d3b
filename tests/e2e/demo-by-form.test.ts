import { compose } from "@/lib/domain/catalogue/compose";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { RigReading } from "@/lib/domain/rigs";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { householdSheet } from "@/seeders/demo/sheets/household";
import { longCoachSheet } from "@/seeders/demo/sheets/long-coach";
import { shopSheet } from "@/seeders/demo/sheets/shop";
import { shortCoachSheet } from "@/seeders/demo/sheets/short-coach";
import { expect, test } from "../support/product";
import { fillSheet, goToSection } from "../support/sheet-filling";

/** The sheet without the ids of its things, which the form makes anew. */
function withoutIds(sheet: Sheet): unknown {
  return JSON.parse(JSON.stringify(sheet, (key, value: unknown) => (key === "id" ? undefined : value)));
}

for (const [who, sheet] of [
  ["driver@demo.example", householdSheet],
  ["installer@demo.example", shopSheet],
  ["manager@demo.example", longCoachSheet],
  ["manager@demo.example", shortCoachSheet],
] as const) {
  test(`${sheet.name} is entered through the form alone, and its list is the demo's`, async ({
    page,
    product,
  }) => {
    test.setTimeout(240_000);
    const rig = crypto.randomUUID();
    await product.signIn(page, who);
    await page.goto(`/desk/sheet?new=${rig}`);
    await fillSheet(page, sheet);
    await goToSection(page, "look");
    await page.getByRole("button", { name: words.save, exact: true }).click();
    await page.waitForURL(`**/desk/rig?id=${rig}`);

    const answer = await page.request.get(`${product.origin}/api/rigs/${rig}`);
    const { document } = (await answer.json()) as RigReading;
    const entered = document.sheet as unknown as Sheet;
    expect(withoutIds(entered)).toEqual(withoutIds(sheet));
    const { list, walks } = compose(sheet);
    expect({ list: document.list, walks: document.walks }).toEqual({ list, walks });
  });
}
