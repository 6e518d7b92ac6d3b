import { readFile } from "node:fs/promises";
import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { digestOf } from "@/lib/domain/digest";
import { bodyOf, readEntry, type Link } from "@/lib/domain/entry";
import { walkPageShape, type WalkPage } from "@/lib/domain/history";
import type { SealLine } from "@/lib/domain/record-file";
import { replay } from "@/lib/domain/replay";
import { revisionShape } from "@/lib/domain/revision";
import { sealMessage, verifies } from "@/lib/domain/signature";
import type { Product } from "../support/product-process";
import { expect, test } from "../support/product";

const ABSENT = "00000000-0000-4000-8000-000000000001";

test.use({ viewport: { width: 1280, height: 800 }, hasTouch: false });

/** The history as the server gives it to whoever is signed in. */
async function listed(page: Page, product: Product, query = ""): Promise<WalkPage> {
  const answer = await page.request.get(`${product.origin}/api/walks${query}`);
  return walkPageShape.parse(await answer.json());
}

/** Asks for two walks at a time, so that the demo's few make several pages. */
async function twoAtATime(page: Page): Promise<void> {
  await page.route("**/api/walks?*", (route) => route.continue({ url: `${route.request().url()}&limit=2` }));
  await page.route("**/api/walks", (route) => route.continue({ url: `${route.request().url()}?limit=2` }));
}

const rows = (page: Page) => page.getByRole("table", { name: "Walks, newest first" }).getByRole("row");

/** How much wider than the screen the page is, in pixels. */
const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

test("the history lists what the server lists, each row one link to its walk", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  const { walks, names } = await listed(page, product);
  await page.goto("/desk");
  await expect(rows(page)).toHaveCount(walks.length + 1);
  const links = await rows(page)
    .getByRole("link")
    .evaluateAll((all) => all.map((link) => link.getAttribute("href")));
  expect(links).toEqual(walks.map(({ id }) => `/desk/walk?id=${id}`));
  for (const [at, walk] of walks.entries()) {
    const row = rows(page).nth(at + 1);
    await expect(row).toContainText(names[walk.rig]!);
    await expect(row).toContainText(names[walk.member]!);
    await expect(row.getByRole("time").or(row.locator("time")).first()).toHaveAttribute(
      "datetime",
      walk.openedAt,
    );
  }
});

test("do not tow stands in red and bold, and no other verdict does", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  await page.goto("/desk");
  await expect(rows(page).nth(1)).toBeVisible();
  const verdicts = rows(page)
    .getByRole("cell")
    .filter({ hasText: /^(Do not tow|No hold marked|Unfinished)$/ });
  const looks = await verdicts.locator("span").evaluateAll((spans) => {
    const ink = getComputedStyle(document.body).color;
    return spans.map((span) => {
      const { color, fontWeight } = getComputedStyle(span);
      return { text: span.textContent, red: color !== ink, bold: Number(fontWeight) >= 700 };
    });
  });
  expect(new Set(looks.map(({ text }) => text)).size).toBeGreaterThan(1);
  expect(looks).toEqual(
    looks.map(({ text }) => ({ text, red: text === "Do not tow", bold: text === "Do not tow" })),
  );
});

test("older walks come a page at a time, none twice and none left out", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  const { walks } = await listed(page, product);
  expect(walks.length).toBeGreaterThan(2);
  await twoAtATime(page);
  await page.goto("/desk");
  await expect(rows(page)).toHaveCount(3);
  for (let shown = 2; shown < walks.length; shown += 2) {
    await page.getByRole("button", { name: "Older walks" }).click();
    await expect(rows(page)).toHaveCount(Math.min(shown + 2, walks.length) + 1);
  }
  await expect(page.getByRole("button", { name: "Older walks" })).toHaveCount(0);
  await expect(page.getByText("There are no older ones.")).toBeVisible();
  const links = await rows(page)
    .getByRole("link")
    .evaluateAll((all) => all.map((link) => link.getAttribute("href")));
  expect(links).toEqual(walks.map(({ id }) => `/desk/walk?id=${id}`));
});

test("a driver reads the walks of their own", async ({ page, product }) => {
  await product.signIn(page, "driver@demo.example");
  const { walks } = await listed(page, product);
  await page.goto("/desk");
  await expect(rows(page)).toHaveCount(walks.length + 1);
});

test("an auditor reads walks and has no way to make one", async ({ page, product }) => {
  await product.signIn(page, "auditor@demo.example");
  await page.goto("/desk");
  await rows(page).getByRole("link").first().click();
  await expect(page.getByRole("heading", { name: "What was seen" })).toBeVisible();
  await expect(page.getByRole("button", { name: "Sign out" })).toBeVisible();
  await expect(page.locator('a[href^="/field"]')).toHaveCount(0);
});

test("one walk is read back by station, with its verdict and its marks", async ({ page, product }) => {
  await product.signIn(page, "driver@demo.example");
  const { walks } = await listed(page, product);
  const { walk, document, names } = await (
    await page.request.get(`${product.origin}/api/walks/${walks[0]!.id}`)
  ).json();
  await page.goto("/desk");
  await rows(page).getByRole("link").first().click();
  await expect(page.getByRole("heading", { level: 1 })).toContainText(names.rig);
  await expect(page.getByRole("heading", { level: 2 }).first()).toHaveText(
    { "no-hold": "No hold marked", hold: "Do not tow", unfinished: "Unfinished" }[walk.verdict as string]!,
  );
  const asked = revisionShape.parse(document).walks[walks[0]!.purpose].full;
  await expect(page.getByText(new RegExp(`of ${asked.length} looked at`))).toBeVisible();
  await expect(page.getByRole("img", { name: /Coach tail: / })).toBeVisible();
  await expect(page.getByRole("heading", { name: "Signed and received" })).toBeVisible();
});

test("the record downloads, and its lines parse, chain and carry the signature", async ({
  page,
  product,
}) => {
  await product.signIn(page, "driver@demo.example");
  await page.goto("/desk");
  await rows(page).getByRole("link").first().click();
  const started = page.waitForEvent("download");
  await page.getByRole("link", { name: "Download the record" }).click();
  const lines = (await readFile(await (await started).path(), "utf8")).trimEnd().split("\n");
  const { revision } = JSON.parse(lines[0]!);
  const seal = JSON.parse(lines.at(-1)!) as SealLine;
  let prev = digestOf(revision);
  const links = lines.slice(1, -1).map((line, seq) => {
    const link = readEntry(JSON.parse(line)) as Link;
    expect([link.text, link.entry.seq, link.entry.prev]).toEqual([line, seq, prev]);
    prev = link.digest;
    return link.entry;
  });
  expect(seal.seal).toBe(prev);
  expect(verifies(seal.device, seal.alg, sealMessage(seal.seal), seal.signature)).toBe(true);
  expect(replay(revision, links).verdict).toBe(bodyOf(links.at(-1)!, "close")!.verdict);
});

for (const [what, path] of [
  ["an id without a walk", `/desk/walk?id=${ABSENT}`],
  ["an id that is none", "/desk/walk?id=../session"],
  ["no id", "/desk/walk"],
] as const) {
  test(`${what}: says that there is no such walk`, async ({ page, product }) => {
    product.allowError(/status of 404/);
    await product.signIn(page, "manager@demo.example");
    await page.goto(path);
    await expect(page.getByText("There is no such walk here")).toBeVisible();
    await page.getByRole("link", { name: "Go to the history" }).click();
    await expect(rows(page).nth(1)).toBeVisible();
  });
}

test("without the server the desk says so and recovers on a second try", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  await page.route("**/api/walks", (route) => route.abort());
  product.allowError(/ERR_FAILED/);
  await page.goto("/desk");
  await expect(page.getByText("Hookfast cannot be reached from here")).toBeVisible();
  await page.unroute("**/api/walks");
  await page.getByRole("button", { name: "Try again" }).click();
  await expect(rows(page).nth(1)).toBeVisible();
});

test("a history without walks says why, by what the reader can do", async ({ page, product }) => {
  await page.route("**/api/walks", (route) => route.fulfill({ json: { walks: [], next: null, names: {} } }));
  await product.signIn(page, "auditor@demo.example");
  await page.goto("/desk");
  await expect(page.getByText("No walks yet")).toBeVisible();
  await expect(page.getByRole("link", { name: "Walk a rig" })).toHaveCount(0);
  await product.signIn(page, "driver@demo.example");
  await page.goto("/desk");
  await expect(page.getByRole("link", { name: "Walk a rig" })).toBeVisible();
});

test("the keyboard reaches the content first and every walk after it", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  await page.goto("/desk");
  await expect(rows(page).nth(1)).toBeVisible();
  await page.keyboard.press("Tab");
  await expect(page.getByRole("link", { name: "Skip to the content" })).toBeFocused();
  await page.keyboard.press("Enter");
  await page.keyboard.press("Tab");
  await expect(rows(page).getByRole("link").first()).toBeFocused();
});

for (const width of [390, 1280]) {
  test(`text at twice its size fits at ${width} px`, async ({ page, product }) => {
    await page.setViewportSize({ width, height: 800 });
    await product.signIn(page, "manager@demo.example");
    const doubled = async () => {
      await page.evaluate(() => (document.documentElement.style.fontSize = "200%"));
      return await sideways(page);
    };
    await page.goto("/");
    expect(await doubled()).toBe(0);
    await page.goto("/sign-in");
    expect(await doubled()).toBe(0);
    await page.goto("/desk");
    await expect(rows(page).nth(1)).toBeVisible();
    expect(await doubled()).toBe(0);
    await rows(page).getByRole("link").first().click();
    await expect(page.getByRole("heading", { name: "What was seen" })).toBeVisible();
    expect(await doubled()).toBe(0);
  });

  for (const colorScheme of ["light", "dark"] as const) {
    test(`axe finds nothing at ${width} px, ${colorScheme}, and nothing is wider than the screen`, async ({
      page,
      product,
    }) => {
      await page.setViewportSize({ width, height: 800 });
      await page.emulateMedia({ colorScheme });
      await product.signIn(page, "manager@demo.example");
      await page.goto("/desk");
      await expect(rows(page).nth(1)).toBeVisible();
      expect(await sideways(page)).toBe(0);
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      await rows(page).getByRole("link").first().click();
      await expect(page.getByRole("heading", { name: "What was seen" })).toBeVisible();
      expect(await sideways(page)).toBe(0);
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    });
  }
}
