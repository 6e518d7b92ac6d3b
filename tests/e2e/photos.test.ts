import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { walkPageShape, walkReadingShape } from "@/lib/domain/history";
import { photoReadingWords, photoWords } from "@/lib/domain/messages/photo";
import { GPS_MARK, picture, withGps } from "../support/picture-files";
import type { Product } from "../support/product-process";
import { expect, test } from "../support/product";
import { callOff, tap } from "../support/walking";

const DRIVER = "driver@demo.example";

/** Starts a hook-up and goes to where its first check takes a photograph. */
async function toPhotoField(page: Page, product: Product): Promise<void> {
  await product.signIn(page, DRIVER);
  await page.goto("/field");
  await page
    .getByRole("button", { name: /^Hook-up/ })
    .first()
    .click();
  await tap(page, /^Fault/);
  await expect(page.getByRole("group", { name: photoWords.group })).toBeVisible();
}

/** Hands a file to one of the two buttons. */
async function handOver(page: Page, button: string, buffer: Buffer, mimeType = "image/jpeg"): Promise<void> {
  await page.getByLabel(button).setInputFiles({ name: "IMG_0001.jpg", mimeType, buffer });
}

/** Every photograph's bytes in the phone's store. */
async function keptBytes(page: Page): Promise<Buffer[]> {
  const kept = await page.evaluate(async () => {
    const open = indexedDB.open("hookfast");
    await new Promise((done) => (open.onsuccess = done));
    const range = IDBKeyRange.bound(["photo"], ["photo", []]);
    const all = open.result.transaction("kept").objectStore("kept").getAll(range);
    await new Promise((done) => (all.onsuccess = done));
    open.result.close();
    return (all.result as ArrayBuffer[]).map((bytes) =>
      btoa(new Uint8Array(bytes).reduce((text, byte) => text + String.fromCharCode(byte), "")),
    );
  });
  return kept.map((base64) => Buffer.from(base64, "base64"));
}

async function closeAndSign(page: Page): Promise<void> {
  await callOff(page);
}

/** The photographs of the newest walk, as the server reads it back. */
async function photosAtTheDesk(page: Page, product: Product) {
  const list = await page.request.get(`${product.origin}/api/walks?limit=1`);
  const [walk] = walkPageShape.parse(await list.json()).walks;
  const answer = await page.request.get(`${product.origin}/api/walks/${walk!.id}`);
  const { photos } = walkReadingShape.parse(await answer.json());
  return { id: walk!.id, photos };
}

test("taken with the server gone, stripped of its place, sent after the walk, read back at the desk", async ({
  page,
  product,
}) => {
  test.setTimeout(120_000);
  await toPhotoField(page, product);
  const file = withGps(await picture(page, 2_400, 1_800), 1);
  expect(file.includes(GPS_MARK)).toBe(true);
  await product.stop();
  await handOver(page, photoWords.take, file);
  const field = page.getByRole("group", { name: photoWords.group });
  await expect(field).toContainText(photoWords.saved);
  await expect(field.getByRole("img", { name: photoWords.taken })).toBeVisible();
  // The same one again is kept once.
  await handOver(page, photoWords.choose, file);
  await expect(field).toContainText(photoWords.saved);
  await expect.poll(async () => (await keptBytes(page)).length).toBe(1);
  const [kept] = await keptBytes(page);
  expect(kept!.includes(GPS_MARK)).toBe(false);
  expect(kept!.includes("Exif")).toBe(false);
  await closeAndSign(page);
  await product.start();

  await expect
    .poll(async () => (await photosAtTheDesk(page, product)).photos.map(({ arrived }) => arrived), {
      timeout: 60_000,
    })
    .toEqual([true, true]);
  const { id, photos } = await photosAtTheDesk(page, product);
  const there = await page.request.get(`${product.origin}/api/photos/${photos[0]!.sha256}`);
  expect((await there.body()).equals(kept!)).toBe(true);

  await page.goto(`/desk/walk?id=${id}`);
  const shown = page.getByRole("img", { name: /^Photograph 1 of 2: / });
  await expect(shown).toBeVisible();
  await expect.poll(() => shown.evaluate((picture: HTMLImageElement) => picture.naturalWidth)).toBe(1600);
  await expect(page.getByText(photoReadingWords.fetching)).toHaveCount(0);
});

test("what is no picture is said in words, and the walk goes on", async ({ page, product }) => {
  await toPhotoField(page, product);
  await handOver(page, photoWords.choose, Buffer.from("no picture at all"), "image/heic");
  const field = page.getByRole("group", { name: photoWords.group });
  await expect(field).toContainText(photoWords.faults.unreadable);
  expect(await keptBytes(page)).toEqual([]);
  await handOver(page, photoWords.choose, await picture(page, 40, 30));
  await expect(field).toContainText(photoWords.saved);
});

test("the buttons are reached by keyboard, large enough for a knuckle, and named", async ({
  page,
  product,
}) => {
  test.setTimeout(120_000);
  // Listened for from the start: the browser needs a moment to hand a chooser over.
  const chooser = page.waitForEvent("filechooser", { timeout: 120_000 });
  await toPhotoField(page, product);
  const field = page.getByRole("group", { name: photoWords.group });
  for (const name of [photoWords.take, photoWords.choose]) {
    await expect(field.getByLabel(name)).toHaveAttribute("accept", "image/*");
    const box = (await field.locator("label", { hasText: name }).boundingBox())!;
    expect(box.height).toBeGreaterThanOrEqual(72);
    expect(box.width).toBeGreaterThanOrEqual(72);
  }
  await expect(field.getByLabel(photoWords.take)).toHaveAttribute("capture", "environment");
  await expect(field.getByLabel(photoWords.choose)).not.toHaveAttribute("capture");
  await field.getByLabel(photoWords.take).focus();
  await page.keyboard.press("Tab");
  await expect(field.getByLabel(photoWords.choose)).toBeFocused();
  await page.keyboard.press("Enter");
  await (
    await chooser
  ).setFiles({
    name: "a.jpg",
    mimeType: "image/jpeg",
    buffer: await picture(page, 40, 30),
  });
  await expect(field).toContainText(photoWords.saved);
  const { violations } = await new AxeBuilder({ page }).include("[role=group]").analyze();
  expect(violations).toEqual([]);
});
