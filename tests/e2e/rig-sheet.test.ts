import { readFile } from "node:fs/promises";
import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { withoutIds } from "@/lib/domain/sheet/draft";
import { sectionKeys, type SectionKey } from "@/lib/domain/sheet/draft-sections";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { householdSheet } from "@/seeders/demo/sheets/household";
import { shopSheet } from "@/seeders/demo/sheets/shop";
import { expect, test } from "../support/product";
import type { Product } from "../support/product-process";
import { fillField, fillSection, fillSheet, goToSection } from "../support/sheet-filling";

const INSTALLER = "installer@demo.example";
let rigs = 0;
const newId = () => `0198a5c2-0000-4000-8000-${String((rigs += 1)).padStart(12, "0")}`;

/** Opens the form of a new rig; resolves to the rig's id. */
async function newSheet(page: Page, product: Product, who = INSTALLER): Promise<string> {
  await product.signIn(page, who);
  const rig = newId();
  await page.goto(`/desk/sheet?new=${rig}`);
  await expect(page.getByRole("heading", { level: 1, name: words.newTitle })).toBeVisible();
  await expect(page.getByLabel(words.name.label, { exact: true })).toBeVisible();
  return rig;
}

async function keptOnPhone(page: Page): Promise<void> {
  await page.waitForTimeout(400);
  await expect(page.getByText(/^Saved on this phone, \d\d:\d\d$/)).toBeVisible();
}

async function save(page: Page): Promise<void> {
  await goToSection(page, "look");
  await page.getByRole("button", { name: words.save, exact: true }).click();
}

/** The sheet as the server has it, without the ids that the form made. */
async function savedSheet(page: Page, rig: string): Promise<Sheet> {
  const answer = await page.request.get(`/api/rigs/${rig}`);
  expect(answer.status()).toBe(200);
  const { document } = (await answer.json()) as { document: { sheet: Sheet } };
  return withoutIds(document.sheet);
}

const coach = { kind: "mass" } as const;
const pounds = (value: number) => ({ entered: { value, unit: "lb" } });

test("a rig is entered through the form alone, with a stop, a reload and a spell without network", async ({
  page,
  context,
  product,
}) => {
  test.setTimeout(300_000);
  const rig = await newSheet(page, product);
  await page.evaluate(async () => {
    await navigator.serviceWorker.ready;
    if (navigator.serviceWorker.controller) return;
    await new Promise((done) =>
      navigator.serviceWorker.addEventListener("controllerchange", done, { once: true }),
    );
  });
  await fillSection(page, householdSheet, "rig");
  await fillSection(page, householdSheet, "coach");
  await keptOnPhone(page);

  await page.reload();
  await goToSection(page, "coach");
  await expect(page.getByLabel("GVWR", { exact: true })).toHaveValue("22000");
  await fillSection(page, householdSheet, "car");
  await keptOnPhone(page);

  await page.close();
  await context.setOffline(true);
  const later = await context.newPage();
  await later.goto(`/desk/sheet?new=${rig}`);
  await expect(later.getByText(words.offline)).toBeVisible();
  await expect(later.getByLabel(words.name.label, { exact: true })).toHaveValue("Maple rig");
  for (const section of ["bar", "plate", "lines", "brake", "wiring", "manual"] as const) {
    await fillSection(later, householdSheet, section);
  }
  await save(later);
  await expect(later.getByText(words.unreached)).toBeVisible();

  await context.setOffline(false);
  await later.getByRole("button", { name: words.save, exact: true }).click();
  await later.waitForURL(`**/desk/rig?id=${rig}`);
  expect(await savedSheet(later, rig)).toEqual(withoutIds(householdSheet));
  await later.goto("/desk/sheet");
  await expect(later.getByText(words.draftsNone)).toBeVisible();
});

test("the impossible is refused with the field named, the unusual is taken with a warning", async ({
  page,
  product,
}) => {
  const rig = await newSheet(page, product);
  const form = page.locator("form");
  await fillField(form, words.name.label, { kind: "text", most: 60 }, "Bay 9");
  await goToSection(page, "coach");
  await page.getByLabel("GVWR", { exact: true }).fill("22,");
  await keptOnPhone(page);
  await page.reload();
  await expect(page.getByLabel("GVWR", { exact: true })).toHaveValue("22,");
  await fillField(form, "GVWR", coach, pounds(22000));
  await fillField(form, "GCWR", coach, pounds(20000));
  await page.getByLabel("GCWR", { exact: true }).blur();
  await expect(page.getByLabel("GCWR", { exact: true })).toHaveAccessibleDescription(/GCWR is below GVWR/);
  await page.getByLabel("Receiver rating", { exact: true }).fill("-50");
  await page.getByLabel("Receiver rating", { exact: true }).blur();
  await expect(page.getByLabel("Receiver rating", { exact: true })).toHaveAccessibleDescription(
    /cannot be negative/,
  );

  let sent = 0;
  page.on("request", (request) => (sent += request.method() === "POST" ? 1 : 0));
  await save(page);
  const wrong = page.getByRole("group", { name: words.errorsTitle });
  await expect(wrong.getByRole("button")).toHaveText([/^Coach: Receiver rating/, /^Coach: GCWR/]);
  expect(sent).toBe(0);
  await wrong.getByRole("button", { name: /GCWR/ }).click();
  await expect(page.getByLabel("GCWR", { exact: true })).toBeFocused();
  await fillField(form, "GCWR", coach, pounds(26000));
  await fillField(form, "Receiver rating", coach, null);

  await goToSection(page, "car");
  await fillField(form, "Loaded weight", coach, pounds(30000));
  await page.getByText("More, for limits and geometry").click();
  await fillField(form, "Curb weight", coach, pounds(30000));
  await page.getByLabel("Curb weight", { exact: true }).blur();
  await expect(page.getByLabel("Curb weight", { exact: true })).toHaveAccessibleDescription(
    /Unusual: Few cars weigh this/,
  );
  await save(page);
  await page.waitForURL(`**/desk/rig?id=${rig}`);
  expect((await savedSheet(page, rig)).coach).toEqual({
    gvwr: { massKg: 9979.03214, ...pounds(22000) },
    gcwr: { massKg: 11793.40162, ...pounds(26000) },
    receiverRating: null,
  });
});

test("two people who save at once lose nothing, and choose where both changed the same", async ({
  page,
  browser,
  product,
}) => {
  test.setTimeout(120_000);
  const rig = await newSheet(page, product);
  await fillField(page.locator("form"), words.name.label, { kind: "text", most: 60 }, "Bay 4");
  await goToSection(page, "coach");
  await fillField(page.locator("form"), "GVWR", coach, pounds(30000));
  await save(page);
  await page.waitForURL(`**/desk/rig?id=${rig}`);

  const context = await browser.newContext({
    baseURL: product.origin,
    viewport: { width: 1280, height: 800 },
  });
  const other = await context.newPage();
  await product.signIn(other, INSTALLER);
  for (const each of [page, other]) {
    await each.goto(`/desk/sheet?rig=${rig}&section=coach`);
    await expect(each.getByLabel("GVWR", { exact: true })).toHaveValue("30000");
  }
  await fillField(other.locator("form"), "GVWR", coach, pounds(31000));
  await fillField(other.locator("form"), "GCWR", coach, pounds(40000));
  await save(other);
  await other.waitForURL(`**/desk/rig?id=${rig}`);
  await context.close();

  product.allowError(/status of 409/);
  await fillField(page.locator("form"), "GVWR", coach, pounds(32000));
  await fillField(page.locator("form"), "Receiver rating", coach, pounds(10000));
  await save(page);
  await expect(page.getByRole("heading", { name: words.staleTitle })).toBeFocused();
  await expect(page.getByRole("listitem").filter({ hasText: /^Coach: GCWR$/ })).toBeVisible();
  await expect(page.getByRole("listitem").filter({ hasText: /^Coach: Receiver rating$/ })).toBeVisible();
  await page.getByRole("button", { name: words.saveMerged }).click();
  await expect(page.getByText(words.chooseFirst)).toBeVisible();
  const choice = page.getByRole("group", { name: "Coach: GVWR" });
  await expect(choice.getByRole("radio")).toHaveCount(2);
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
  await choice.getByRole("radio", { name: /^Yours 32,000/ }).check();
  await page.getByRole("button", { name: words.saveMerged }).click();
  await page.waitForURL(`**/desk/rig?id=${rig}`);
  const { coach: saved } = await savedSheet(page, rig);
  expect(saved).toMatchObject({
    gvwr: pounds(32000),
    gcwr: pounds(40000),
    receiverRating: pounds(10000),
  });
});

test("a sheet goes out as a file and comes in again, a newer or broken one does not", async ({
  page,
  product,
}) => {
  await newSheet(page, product);
  const give = async (name: string, text: string) =>
    page.getByLabel(words.importButton).setInputFiles({
      name,
      mimeType: "application/json",
      buffer: Buffer.from(text),
    });
  await give("shop.json", JSON.stringify(shopSheet));
  await expect(page.getByText(words.imported("shop.json"))).toBeVisible();
  await expect(page.getByLabel(words.name.label, { exact: true })).toHaveValue(shopSheet.name);

  const download = page.waitForEvent("download");
  await page.getByRole("button", { name: words.exportButton }).click();
  const file = await download;
  expect(file.suggestedFilename()).toBe(`${shopSheet.name}.sheet.json`);
  const exported = JSON.parse(await readFile(await file.path(), "utf8")) as Sheet;
  expect(withoutIds(exported)).toEqual(withoutIds(shopSheet));

  await give("newer.json", JSON.stringify({ ...shopSheet, v: 2 }));
  await expect(page.getByText(words.importNewer(2))).toBeVisible();
  await give("wrong.json", JSON.stringify({ ...shopSheet, coach: { gvwr: "heavy" } }));
  await expect(
    page.getByRole("listitem").filter({ hasText: /^Coach: GVWR: This is not a number/ }),
  ).toBeVisible();
  await give("photo.json", "not json");
  await expect(page.getByText(words.importUnreadable)).toBeVisible();
  await expect(page.getByLabel(words.name.label, { exact: true })).toHaveValue(shopSheet.name);
});

test("a wire that changes its function under one color says so and asks for a tag", async ({
  page,
  product,
}) => {
  await newSheet(page, product);
  await fillSheet(page, {
    v: 1,
    name: "Bay 5",
    wiring: {
      segments: [{ from: "socket", conductors: [{ color: "red", near: "left", far: "left-stop" }] }],
    },
  });
  await goToSection(page, "wiring");
  const form = page.locator("form");
  await expect(form.getByText(/red does “Left turn” at the near end and “Left turn and stop”/)).toBeVisible();
  await form
    .getByRole("radiogroup", { name: "Tagged at both ends" })
    .getByRole("radio", { name: "Yes" })
    .check();
  await page.emulateMedia({ media: "print" });
  await expect(form).toBeHidden();
  await expect(page.getByText(/^red does “Left turn” at the near end/).filter({ visible: true })).toHaveCount(
    1,
  );
});

for (const [who, reason] of [["auditor@demo.example", words.roleRefused]] as const) {
  test(`${who} is told that others change sheets`, async ({ page, product }) => {
    await product.signIn(page, who);
    await page.goto(`/desk/sheet?new=${newId()}`);
    await expect(page.getByText(reason)).toBeVisible();
  });
}

for (const colorScheme of ["light", "dark"] as const) {
  for (const [width, height] of [
    [390, 844],
    [1280, 800],
  ] as const) {
    test(`axe finds nothing in any section, ${colorScheme}, ${width} px`, async ({ page, product }) => {
      test.setTimeout(300_000);
      await page.emulateMedia({ colorScheme });
      await page.setViewportSize({ width, height });
      await newSheet(page, product);
      await page.getByLabel(words.importButton).setInputFiles({
        name: "household.json",
        mimeType: "application/json",
        buffer: Buffer.from(JSON.stringify(householdSheet)),
      });
      for (const section of sectionKeys) {
        await goToSection(page, section);
        const folded = page.locator("form details:not([open]) > summary").filter({ hasText: words.more });
        while ((await folded.count()) > 0) await folded.first().click();
        expect((await new AxeBuilder({ page }).analyze()).violations, section).toEqual([]);
        await targetsAreLarge(page, section);
      }
    });
  }
}

async function targetsAreLarge(page: Page, section: SectionKey): Promise<void> {
  const targets = page
    .locator("form")
    .locator("button, a, summary, select, textarea, input[type=text], input[type=date], label:has(input)");
  const small = await targets.filter({ visible: true }).evaluateAll((nodes) =>
    nodes
      // A sum of fractions may end a hair below.
      .filter((node) => node.getBoundingClientRect().height < 43.99)
      .map((node) => node.outerHTML.slice(0, 120)),
  );
  expect(small, section).toEqual([]);
}

test("with the largest text nothing needs sideways scrolling", async ({ page, product }) => {
  await page.setViewportSize({ width: 360, height: 740 });
  await page.addInitScript(() =>
    localStorage.setItem("hookfast-preferences", JSON.stringify({ text: "200" })),
  );
  await newSheet(page, product);
  await page.getByLabel(words.importButton).setInputFiles({
    name: "household.json",
    mimeType: "application/json",
    buffer: Buffer.from(JSON.stringify(householdSheet)),
  });
  for (const section of sectionKeys) {
    await goToSection(page, section);
    const wide = await page.evaluate(() =>
      [...document.querySelectorAll("body *")]
        .filter((element) => !element.closest("svg, .sr-only, next-route-announcer"))
        .filter((element) => element.getBoundingClientRect().right > window.innerWidth + 0.5)
        .map((element) => element.outerHTML.slice(0, 120)),
    );
    expect(wide, section).toEqual([]);
  }
});
