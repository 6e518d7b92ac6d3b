import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { review } from "@/lib/domain/catalogue/review";
import { compose } from "@/lib/domain/catalogue/compose";
import { listDifferences } from "@/lib/domain/catalogue/differences";
import { rigListShape, rigReadingShape, thingListShape, type RigRow } from "@/lib/domain/rigs";
import { sheetIn, type Sheet } from "@/lib/domain/sheet/sheet";
import type { Product } from "../support/product-process";
import { expect, test } from "../support/product";
import { readyPhone, startHookUp, tap } from "../support/walking";

const ABSENT = "00000000-0000-4000-8000-000000000001";

test.use({ viewport: { width: 1280, height: 800 }, hasTouch: false });

async function rigsOf(page: Page, product: Product): Promise<RigRow[]> {
  const answer = await page.request.get(`${product.origin}/api/rigs`);
  return rigListShape.parse(await answer.json()).rigs;
}

async function sheetOf(page: Page, product: Product, rig: string): Promise<{ sheet: Sheet; base: string }> {
  const answer = await page.request.get(`${product.origin}/api/rigs/${rig}`);
  const { document, revision } = rigReadingShape.parse(await answer.json());
  return { sheet: sheetIn(document)!, base: revision.digest };
}

const checks = (page: Page) =>
  page.getByRole("listitem").filter({ has: page.getByRole("heading", { level: 3 }) });
const status = (page: Page) => page.getByRole("status").filter({ hasText: /in, \d+ out|No check/ });

/** How much wider than the screen the page is, in pixels. */
const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

for (const [whose, email] of [
  ["the household's", "driver@demo.example"],
  ["the shop's", "installer@demo.example"],
] as const) {
  test(`${whose} rig: every check of the catalogue, in or out and why, where it comes from`, async ({
    page,
    product,
  }) => {
    await product.signIn(page, email);
    const [rig] = await rigsOf(page, product);
    const { sheet } = await sheetOf(page, product, rig!.id);
    const all = review(sheet);
    await page.goto(`/desk/list?rig=${rig!.id}`);
    await expect(checks(page)).toHaveCount(all.length);
    const shown = await checks(page).evaluateAll((items) =>
      items.map((item) => ({ id: item.id, text: (item as HTMLElement).innerText.replaceAll(/\s+/g, " ") })),
    );
    const text = new Map(shown.map((one) => [one.id, one.text]));
    for (const { id, check, listed, reason } of all) {
      expect(text.get(id), id).toContain(
        `${check.ask} ${listed ? "In" : "Out"}. ${reason}`.replaceAll(/\s+/g, " "),
      );
      expect(text.get(id), id).toContain(check.origin!.says);
    }
  });
}

test("what is shown stands in the address, and the address shows it", async ({ page, product }) => {
  await product.signIn(page, "driver@demo.example");
  const [rig] = await rigsOf(page, product);
  const all = review((await sheetOf(page, product, rig!.id)).sheet);
  await page.goto(`/desk/list?rig=${rig!.id}`);
  await page.getByRole("radio", { name: "Out", exact: true }).click();
  await expect(checks(page)).toHaveCount(all.filter(({ listed }) => !listed).length);
  await page.getByRole("combobox", { name: "Walk" }).selectOption("Unhook");
  await page.getByRole("radio", { name: "In", exact: true }).click();
  await page.getByRole("checkbox", { name: "Holds only" }).click();
  const left = all.filter(
    ({ listed, walks, check }) => listed && walks.includes("unhook") && check.effect === "hold",
  );
  await expect(status(page)).toHaveText(`${left.length} checks in, 0 out.`);
  await expect(page).toHaveURL(`/desk/list?rig=${rig!.id}&show=in&walk=unhook&holds=1`);
  await page.reload();
  await expect(checks(page)).toHaveCount(left.length);
  await expect(page.getByRole("radio", { name: "In", exact: true })).toBeChecked();
});

test("two rigs' lists stand side by side, with the reason on either side", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  const [one, other] = await rigsOf(page, product);
  const { sheet } = await sheetOf(page, product, one!.id);
  const { sheet: otherSheet } = await sheetOf(page, product, other!.id);
  const differences = listDifferences(compose(sheet), compose(otherSheet));
  await page.goto(`/desk/list?rig=${one!.id}`);
  await page.getByRole("combobox", { name: "Compare with another rig" }).selectOption(other!.name);
  await expect(page).toHaveURL(`/desk/list?rig=${one!.id}&beside=${other!.id}`);
  const asks = async (name: RegExp) => {
    const section = page.locator("section").filter({ has: page.getByRole("heading", { level: 3, name }) });
    return (await section.getByRole("heading", { level: 4 }).allInnerTexts()).toSorted();
  };
  await expect(
    page.getByRole("heading", { level: 2, name: `${one!.name} beside ${other!.name}` }),
  ).toBeVisible();
  const having = (change: string) =>
    differences
      .filter((difference) => difference.change === change)
      .map(({ ask }) => ask)
      .toSorted();
  expect(having("removed").length * having("added").length * having("changed").length).toBeGreaterThan(0);
  expect(await asks(new RegExp(`^Only on the list of ${one!.name}`))).toEqual(having("removed"));
  expect(await asks(new RegExp(`^Only on the list of ${other!.name}`))).toEqual(having("added"));
  expect(await asks(/^On both, put differently/)).toEqual(having("changed"));
  const [gone] = differences.filter(({ change }) => change === "removed");
  const why = (of: Sheet, listed: boolean) =>
    review(of).find((each) => each.check.key === gone!.key && each.listed === listed)!;
  const on = why(sheet, true);
  const off = review(otherSheet).find(({ id }) => id === on.id)!;
  const row = page.getByRole("listitem").filter({ has: page.getByRole("heading", { name: gone!.ask }) });
  await expect(row).toContainText(`${one!.name}: ${on.reason}`);
  await expect(row).toContainText(`${other!.name}: ${off.reason}`);
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
});

test("a thing's history says who wrote what down differently, and where it went", async ({
  page,
  product,
}) => {
  await product.signIn(page, "manager@demo.example");
  const [one] = await rigsOf(page, product);
  const { sheet, base } = await sheetOf(page, product, one!.id);
  const revise = async (over: string, changed: Sheet) => {
    const answer = await page.request.post(`${product.origin}/api/rigs/${one!.id}/revisions`, {
      data: { base: over, sheet: changed },
      headers: { Origin: product.origin },
    });
    expect(answer.status()).toBe(201);
    return ((await answer.json()) as { revision: { digest: string } }).revision.digest;
  };
  const { basePlate, ...rest } = sheet.gear!;
  const second = await revise(base, {
    ...sheet,
    gear: { ...rest, basePlate: { ...basePlate, serial: "B-9999" } },
  } as Sheet);
  await revise(second, { ...sheet, gear: rest } as Sheet);
  const book = thingListShape.parse(
    await (await page.request.get(`${product.origin}/api/things`)).json(),
  ).things;
  await page.goto("/desk/things");
  const table = page.getByRole("table", { name: "Coaches, cars and gear" });
  await expect(table.getByRole("row")).toHaveCount(book.length + 1);
  const row = table.getByRole("row").filter({ hasText: "B-9999" });
  await expect(row).toContainText("on no rig now");
  await row.getByRole("link").click();
  const happened = page.getByRole("list").filter({ hasText: "First written down." }).getByRole("listitem");
  await expect(happened).toHaveCount(3);
  await expect(happened.nth(0)).toContainText(`${one!.name}, revision 3`);
  await expect(happened.nth(0)).toContainText("No longer on this rig.");
  await expect(happened.nth(1).getByRole("row", { name: /^Serial number/ })).toContainText("B-9999");
  await expect(happened.nth(1)).toContainText("Ines at the north lot");
  await expect(happened.nth(2)).toContainText("First written down.");
});

for (const [what, path, says] of [
  ["a rig that is not there", `/desk/list?rig=${ABSENT}`, "There is no such rig here"],
  ["no rig", "/desk/list", "There is no such rig here"],
  ["a thing that is not there", `/desk/thing?id=${ABSENT}`, "There is no such thing in the book"],
] as const) {
  test(`${what}: says so`, async ({ page, product }) => {
    product.allowError(/status of 404/);
    await product.signIn(page, "driver@demo.example");
    await page.goto(path);
    await expect(page.getByText(says)).toBeVisible();
  });
}

for (const colorScheme of ["light", "dark"] as const) {
  test(`axe finds nothing and nothing is wider than the screen, ${colorScheme}`, async ({
    page,
    product,
  }) => {
    await page.emulateMedia({ colorScheme });
    await product.signIn(page, "driver@demo.example");
    const [rig] = await rigsOf(page, product);
    const found: Record<string, unknown> = {};
    const visit = async (path: string, name: string | RegExp) => {
      await page.goto(path);
      await expect(page.getByRole("heading", { name }).first()).toBeVisible();
      const { violations } = await new AxeBuilder({ page }).analyze();
      await page.setViewportSize({ width: 360, height: 740 });
      await page.evaluate(() => (document.documentElement.style.fontSize = "200%"));
      const wide = await sideways(page);
      if (violations.length + wide > 0) {
        found[path] = { axe: violations.map(({ id, nodes }) => [id, nodes[0]?.html]), wide };
      }
      await page.setViewportSize({ width: 1280, height: 800 });
    };
    await visit(`/desk/list?rig=${rig!.id}`, "Coach tail");
    await visit("/desk/things", "Coaches, cars and gear");
    const { things } = thingListShape.parse(
      await (await page.request.get(`${product.origin}/api/things`)).json(),
    );
    await visit(`/desk/thing?id=${things[0]!.id}`, "History");
    expect(found).toEqual({});
  });
}

test.describe("on a phone", () => {
  test.use({ viewport: { width: 390, height: 844 }, hasTouch: true });

  test("one tap on a check says why it is on this list", async ({ page, product }) => {
    await readyPhone(page, product);
    await startHookUp(page);
    const { sheet } = await sheetOf(page, product, (await rigsOf(page, product))[0]!.id);
    const asked = await page.getByRole("heading", { level: 2 }).innerText();
    const one = review(sheet).find(({ check, listed }) => listed && check.ask === asked)!;
    const ask = page.getByRole("button", { name: "Why is this on my list?" });
    const box = (await ask.boundingBox())!;
    expect(Math.min(box.width, box.height)).toBeGreaterThanOrEqual(72);
    await expect(page.getByRole("button", { name: /^Good/ })).toBeInViewport({ ratio: 1 });
    await expect(page.getByText(one.reason)).toBeHidden();
    await tap(page, /^Why is this on my list/);
    await expect(page.getByText(one.reason)).toBeVisible();
    await expect(page.getByText(one.check.origin!.says)).toBeVisible();
    await expect(ask).toHaveAttribute("aria-expanded", "true");
    await tap(page, /^Good/);
    await expect(page.getByRole("heading", { level: 2 })).not.toHaveText(asked);
    await expect(ask).toHaveAttribute("aria-expanded", "false");
  });
});
