import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { walkPageShape, walkReadingShape, type WalkReading } from "@/lib/domain/history";
import { photoReadingWords as words } from "@/lib/domain/messages/photo";
import type { WalkPhoto } from "@/lib/domain/photo";
import { picture } from "../support/picture-files";
import type { Product } from "../support/product-process";
import { expect, test } from "../support/product";

test.use({ viewport: { width: 1280, height: 800 }, hasTouch: false });

const digest = (digit: string) => digit.repeat(64);

/** Opens the newest walk as the server has it, with these photographs added to the answer. */
async function openWalk(page: Page, product: Product, photosOf: (reading: WalkReading) => WalkPhoto[]) {
  await product.signIn(page, "manager@demo.example");
  const list = await page.request.get(`${product.origin}/api/walks?limit=1`);
  const [walk] = walkPageShape.parse(await list.json()).walks;
  const answer = await page.request.get(`${product.origin}/api/walks/${walk!.id}`);
  const reading = walkReadingShape.parse(await answer.json());
  await page.route(`**/api/walks/${walk!.id}`, (route) =>
    route.fulfill({ json: { ...reading, photos: photosOf(reading) } }),
  );
  await page.goto(`/desk/walk?id=${walk!.id}`);
  await expect(page.getByRole("heading", { level: 1 })).toBeVisible();
  return reading;
}

const firstCheck = ({ document }: WalkReading) =>
  document.list.stations.flatMap(({ checks }) => checks).find(({ key }) => key === keyOf(document))!;
const keyOf = (document: WalkReading["document"]) => document.walks["re-check"].full[0]!;

test("a check's photographs stand with it, those of no check stand apart, each in the state it is in", async ({
  page,
  product,
}) => {
  product.allowError(/status of 404/);
  const bytes = await picture(page, 400, 300);
  await page.route("**/api/photos/*", async (route) => {
    const held = route.request().url().endsWith(digest("c"));
    if (held) return void (release = () => void route.fulfill({ body: bytes, contentType: "image/jpeg" }));
    if (route.request().url().endsWith(digest("a"))) {
      return route.fulfill({ body: bytes, contentType: "image/jpeg" });
    }
    return route.continue();
  });
  let release = () => {};
  const reading = await openWalk(page, product, ({ document }) => [
    { seq: 1, sha256: digest("a"), check: keyOf(document), arrived: true },
    { seq: 2, sha256: digest("b"), check: keyOf(document), arrived: true },
    { seq: 3, sha256: digest("c"), check: null, arrived: true },
    { seq: 4, sha256: digest("d"), check: "a check of another list", arrived: false },
  ]);
  const { key, ask } = firstCheck(reading);
  const row = page.locator(`li#${key}`);
  const shown = row.getByRole("img", { name: `Photograph 1 of 2: ${ask}` });
  await expect(shown).toBeVisible();
  await expect(row.getByText(words.failed)).toBeVisible();
  await expect(row.getByRole("link")).toHaveAttribute("href", `/api/photos/${digest("a")}`);
  const apart = page.locator("section", { has: page.getByRole("heading", { name: words.title }) }).last();
  await expect(apart.getByText(words.fetching)).toBeVisible();
  await expect(apart.getByText(words.missing)).toBeVisible();
  await expect(apart.getByRole("link")).toHaveCount(1);
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations).toEqual([]);

  release();
  await expect(apart.getByText(words.fetching)).toHaveCount(0);
  await page.unroute("**/api/photos/*");
  await page.route("**/api/photos/*", (route) => route.fulfill({ body: bytes, contentType: "image/jpeg" }));
  await row.getByRole("button", { name: words.again }).click();
  await expect(row.getByText(words.failed)).toHaveCount(0);
  await expect(row.getByRole("link")).toHaveCount(2);
});

test("a walk without photographs says nothing of them", async ({ page, product }) => {
  await openWalk(page, product, () => []);
  await expect(page.getByRole("heading", { name: words.title })).toHaveCount(0);
});
