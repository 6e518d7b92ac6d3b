import type { BrowserContext, Page } from "@playwright/test";
import { signals } from "@/lib/domain/entry";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";
import { guardConsole } from "../support/browser-console";
import { expect, test } from "../support/product";

const start = (page: Page) => page.getByRole("button", { name: "Start together" });
const told = (page: Page) => page.getByRole("status");
const clock = (page: Page) => page.getByRole("timer", { name: "Time now" });
const secondsLeft = (page: Page) => page.getByRole("timer").getByText(/^\d+ s left$/);

/** The huge word never breaks; one that is too large makes the page scroll sideways. */
const widerThanScreen = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth > document.documentElement.clientWidth);

/** A phone that shows the prompter, without any network from here on, its clock standing still. */
async function phone(context: BrowserContext, stoodAt: string): Promise<Page> {
  const page = await context.newPage();
  await page.clock.install({ time: new Date("2026-11-30T10:30:00-07:00") });
  await page.goto("/field?prompt=lamps");
  await expect(start(page)).toBeVisible();
  await page.evaluate(async () => void (await navigator.serviceWorker.ready));
  await context.setOffline(true);
  await page.clock.pauseAt(new Date(`2026-11-30T${stoodAt}-07:00`));
  return page;
}

test.describe("the lamp prompter", () => {
  test.beforeEach(({ product }) => product.allowError(/status of 401|ERR_INTERNET_DISCONNECTED/));

  test("keeps two phones in step with no network, whenever each is tapped in the half minute", async ({
    context,
    browser,
    product,
  }) => {
    const other = await browser.newContext({
      baseURL: product.origin,
      viewport: { width: 320, height: 640 },
      timezoneId: "America/Denver",
    });
    const unexpected = guardConsole(other, (text) => product.allows(text));
    const driver = await phone(context, "10:32:03.000");
    const watcher = await phone(other, "10:32:03.400");
    const both = [driver, watcher];
    const pass = (ms: number) => Promise.all(both.map((page) => page.clock.runFor(ms)));

    await start(driver).click();
    await expect(clock(driver)).toHaveText("10:32:03");
    await pass(14_000);
    await start(watcher).click();
    for (const page of both) {
      await expect(page.getByText("Both phones start at 10:32:30.")).toBeVisible();
      await expect(clock(page)).toHaveText("10:32:17");
      await expect(told(page).getByText("First: tail lamps")).toBeVisible();
    }

    await pass(17_000);
    for (const [at, signal] of signals.entries()) {
      const { huge, press } = lampScriptWords.signal[signal];
      const next = signals[at + 1];
      for (const page of both) {
        await expect(told(page)).toContainText(huge.join(""));
        await expect(told(page)).toContainText(press);
        expect(await widerThanScreen(page), `${signal} fits the screen`).toBe(false);
        await expect(page.getByText(`signal ${at + 1} of 7`)).toBeVisible();
        await expect(secondsLeft(page)).toHaveText("4 s left");
        const after = next
          ? lampScriptWords.bar.next(lampScriptWords.signal[next].name)
          : "This is the last one.";
        await expect(page.getByText(after)).toBeVisible();
      }
      await pass(8_000);
    }
    for (const page of both) await expect(page.getByText("All seven. Again?")).toBeVisible();
    expect(unexpected).toEqual([]);
    await other.close();
  });

  test("holds each signal as long as was chosen, and stops when it is told to", async ({ context }) => {
    const page = await phone(context, "10:32:26.000");
    await page.getByText("12 s", { exact: true }).click();
    await start(page).click();
    await expect(page.getByText("Both phones start at 10:33:00.")).toBeVisible();
    await page.clock.runFor(34_000);
    await expect(secondsLeft(page)).toHaveText("12 s left");
    await page.clock.runFor(11_000);
    await expect(secondsLeft(page)).toHaveText("1 s left");
    await expect(told(page)).toContainText("Tail");
    await page.clock.runFor(1_000);
    await expect(told(page)).toContainText("Left");
    await page.getByRole("button", { name: "Stop the script" }).click();
    await expect(start(page)).toBeVisible();
    await page.clock.runFor(12_000);
    await expect(page.getByText(/^signal/)).toHaveCount(0);
  });

  test("is back in step after the phone was asleep", async ({ context }) => {
    const page = await phone(context, "10:32:10.000");
    await start(page).click();
    // Sixteen seconds of signals pass without a single tick.
    await page.clock.fastForward(20_000 + 17_000);
    await expect(told(page)).toContainText("Right");
    await expect(secondsLeft(page)).toHaveText("7 s left");
  });
});
