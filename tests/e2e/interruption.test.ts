import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";
import {
  ask,
  closeAndSign,
  good,
  markFault,
  moved,
  nobody,
  place,
  readyPhone,
  slowPhone,
  startHookUp,
  storedEntries,
  tap,
  walkOn,
} from "../support/walking";

const goOn = /^(Go on$|Nobody has)/;

/** A slow phone, once everything is on it. */
async function readySlowPhone(page: Page, product: Parameters<typeof readyPhone>[1]): Promise<void> {
  await readyPhone(page, product);
  await slowPhone(page);
}

test("a phone killed at ten random moments: nothing marked is lost, the same step, the last two again", async ({
  page,
  context,
  product,
}) => {
  test.setTimeout(300_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  const address = page.url();
  let current = page;
  const seed = Date.now();
  test.info().annotations.push({ type: "seed", description: String(seed) });
  const random = randomOf(seed);
  for (let kill = 0; kill < 10; kill += 1) {
    await slowPhone(current);
    // Somewhere in the middle of a mark or two, without waiting for what they lead to.
    for (let mark = 0; mark < 1 + Math.floor(random() * 3); mark += 1) {
      const button = current.getByRole("button", { name: /^(Good|Nobody has)/ }).first();
      if (!(await button.isVisible())) break;
      await current.waitForTimeout(650);
      await button.click({ noWaitAfter: true });
      await current.waitForTimeout(random() * 300);
    }
    const session = await context.newCDPSession(current);
    const crashed = current.waitForEvent("crash");
    // Nobody is left to answer.
    void session.send("Page.crash").catch(() => {});
    await crashed;
    await current.close();

    current = await context.newPage();
    await current.goto(address);
    await current.getByRole("heading", { level: 2 }).waitFor();
    const entries = await storedEntries(current);
    const marks = entries.filter(({ type }) => type === "mark").map(({ body }) => body.check);
    if (marks.length === 0) continue;
    const resume = current.getByRole("button", { name: goOn });
    await expect(resume.first()).toBeVisible();
    await expect(current.getByText(/^It waits at \d+ of \d+/)).toBeVisible();
    await tap(current, goOn);
    await expect(resume.filter({ hasText: "Go on" })).toHaveCount(0);
    const after = await storedEntries(current);
    const last = after.findLast(({ type }) => type === "resume")!;
    const counting = [...new Set(marks.toReversed())];
    expect(last.body.again).toEqual(expect.arrayContaining(counting.slice(0, 1)));
    expect(after.slice(0, entries.length)).toEqual(entries);
  }
  await walkOn(current);
  await tap(current, closeAndSign);
  await expect(current.getByRole("heading", { name: "No hold marked" })).toBeVisible();
  await expect(current.getByRole("region", { name: "Where this record is" })).toContainText(/received/, {
    timeout: 30_000,
  });
});

/** A small generator of numbers from 0 to 1, so that a failing run can be told by its seed. */
function randomOf(seed: number): () => number {
  let state = seed % 2147483647;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}

test("a reload waits at the same check, and the last two are asked again", async ({ page, product }) => {
  await readySlowPhone(page, product);
  await startHookUp(page);
  const asked: string[] = [];
  for (let mark = 0; mark < 3; mark += 1) {
    asked.push(await ask(page).innerText());
    await tap(page, good);
    await expect(ask(page)).not.toHaveText(asked.at(-1)!);
  }
  const waiting = await ask(page).innerText();
  await page.reload();
  await expect(page.getByText(`It waits at 4 of 21: ${waiting}`)).toBeVisible();
  await expect(page.getByText(asked[0]!)).toHaveCount(0);
  await expect(page.getByText(asked[1]!)).toBeVisible();
  await tap(page, /^Go on$/);
  await expect(ask(page)).toHaveText(asked[1]!);
  await tap(page, good);
  await expect(ask(page)).toHaveText(asked[2]!);
  await tap(page, good);
  await expect(ask(page)).toHaveText(waiting);

  await page.reload();
  await tap(page, /^Only the phone was away/);
  await expect(ask(page)).toHaveText(waiting);
});

test("paused, taken up, someone was in the car: the cabin is asked again, and once more before the last look", async ({
  page,
  product,
}) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  while ((await place(page))[0]! < 12) {
    const asked = await ask(page).innerText();
    await tap(page, good);
    await expect(ask(page)).not.toHaveText(asked);
  }
  await tap(page, /^Stop…/);
  await tap(page, /^Pause/);
  await tap(page, /^Go on: hook-up, 12 of 21/);
  await expect(page.getByText("Has anyone been in the car since the cabin was marked?")).toBeVisible();
  await tap(page, /^Someone, or not sure/);
  await expect(ask(page)).toHaveText("Cabin as on page 214");
  await walkOn(page);
  const entries = await storedEntries(page);
  const asked = entries.filter(({ type }) => type === "resume").map(({ body }) => body);
  expect(asked).toEqual([
    { again: ["end-state", "steering-free"], car: "entered" },
    { again: [], car: "untouched" },
  ]);
  expect(entries.map(({ type }) => type)).toContain("pause");
});

test("at the last look: someone was in the car, so the cabin comes first", async ({ page, product }) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  await walkOn(page, () => good, nobody);
  await tap(page, /^Someone, or not sure/);
  await expect(ask(page)).toHaveText("Cabin as on page 214");
  await walkOn(page);
  await tap(page, closeAndSign);
  await expect(page.getByRole("heading", { name: "No hold marked" })).toBeVisible();
});

test("fixed and gone on: only what the mending can have changed is asked again", async ({
  page,
  product,
}) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  await tap(page, good);
  await expect(page.getByText(/^2 of \d+$/)).toBeVisible();
  const held = await markFault(page);
  await walkOn(page);
  await expect(page.getByRole("heading", { name: "Do not tow" })).toBeVisible();
  await expect(page.getByText(/^Secure the car first/)).toBeVisible();
  await tap(page, /^Fixed, look again/);
  await expect(ask(page)).toHaveText(held);
  await tap(page, good);
  await tap(page, /^It was fixed/);
  await tap(page, /^put in place/);
  const again: string[] = [];
  await walkOn(page, (asked) => {
    again.push(asked);
    return good;
  });
  expect(again.length).toBeLessThan(8);
  // Whoever mended it had chocked the car for that.
  expect(again).toEqual(
    expect.arrayContaining(["Parking brake off, chocks out", "All four car wheels roll"]),
  );
  expect(again).toContain("Hands on every joint, no tire low");
  await tap(page, closeAndSign);
  await expect(page.getByRole("heading", { name: "No hold marked" })).toBeVisible();
});

test("couldn't see leaves the walk unfinished, and says what", async ({ page, product }) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  const unseen = await ask(page).innerText();
  await walkOn(page, (asked) => (asked === unseen ? /^Couldn’t see/ : good));
  await tap(page, closeAndSign);
  await expect(page.getByRole("heading", { name: "Unfinished" })).toBeVisible();
  await expect(page.getByText("20 of 21 looked at.", { exact: true })).toBeVisible();
  await expect(page.getByRole("list").filter({ hasText: unseen })).toBeVisible();
});

test("a clock set back an hour is recorded, and the walking time goes on", async ({ page, product }) => {
  await page.clock.install();
  await readySlowPhone(page, product);
  await startHookUp(page);
  await page.clock.setSystemTime(Date.now() - 3_600_000);
  await page.waitForTimeout(700);
  await page.clock.runFor(700);
  await page.getByRole("button", { name: good }).click();
  await expect(page.getByText(/^2 of \d+$/)).toBeVisible();
  const entries = await storedEntries(page);
  expect(entries.map(({ type }) => type)).toEqual(["open", "disturbed", "mark"]);
  const { wallMs, monoMs } = entries[1]!.body as { wallMs: number; monoMs: number };
  expect(wallMs).toBeLessThan(-3_500_000);
  expect(monoMs).toBeGreaterThanOrEqual(0);
});

test("called off with a reason: closed, signed, and the reason in the record", async ({ page, product }) => {
  await readySlowPhone(page, product);
  await startHookUp(page);
  await tap(page, good);
  await tap(page, /^Stop…/);
  await tap(page, /^Call it off/);
  await tap(page, /^Call it off and sign/);
  await expect(page.getByText("Choose or write a reason.")).toBeVisible();
  await page.getByLabel("In a few words").fill("thunder close by");
  await tap(page, /^Call it off and sign/);
  await expect(page.getByRole("heading", { name: "Unfinished" })).toBeVisible();
  const entries = await storedEntries(page);
  expect(entries.slice(-2).map(({ type }) => type)).toEqual(["note", "close"]);
  expect(entries.at(-2)!.body).toEqual({ text: "called off: thunder close by" });
});

test("a verdict goes stale when the rig was left", async ({ page, product }) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  await walkOn(page);
  await tap(page, closeAndSign);
  await tap(page, /^The rig was left, or the car entered/);
  await expect(page.getByText(/^Stale since \d\d:\d\d/)).toBeVisible();
  await page.getByRole("link", { name: "Back to rigs" }).click();
  await expect(page.getByText(/^Stale since \d\d:\d\d/)).toBeVisible();
  await page.reload();
  await expect(page.getByText(/^Stale since \d\d:\d\d/)).toBeVisible();
});

test("a card is printed, and entered later as a walk from paper, untimed", async ({ page, product }) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await page.getByRole("link", { name: /^Paper cards/ }).click();
  await tap(page, /^Print: hook-up/);
  await expect(page.getByRole("heading", { name: "Hook-up: Maple rig" })).toBeVisible();
  await expect(page.getByText("Left arm: pin in, clip over it")).toBeVisible();
  await tap(page, /^Back$/);
  await tap(page, /^Enter: hook-up/);
  await page.getByLabel("When was it walked?").fill("2026-11-30T08:10");
  await tap(page, /^Enter the marks/);
  await expect(page.getByText("from paper", { exact: true })).toBeVisible();
  await walkOn(page);
  await tap(page, closeAndSign);
  await expect(page.getByText(/21 of 21 looked at, from paper, untimed\./)).toBeVisible();
  const entries = await storedEntries(page);
  expect(entries[0]!.body).toMatchObject({ source: "paper" });
  expect(entries[1]!.body).toEqual({ text: "Walked on paper, 2026-11-30 08:10." });
  expect(new Set(entries.map((entry) => (entry as unknown as { elapsedMs: number }).elapsedMs))).toEqual(
    new Set([0]),
  );
});

test("what is not as drawn is touched, kept in the mark, and shown where the rig is held", async ({
  page,
  product,
}) => {
  test.setTimeout(240_000);
  await readySlowPhone(page, product);
  await startHookUp(page);
  while ((await ask(page).innerText()) !== "Left arm: pin in, clip over it") {
    const asked = await ask(page).innerText();
    await tap(page, good);
    await moved(page, asked);
  }
  await tap(page, /^Fault/);
  await tap(page, /^ring over its end/);
  await expect(page.getByRole("button", { name: "ring over its end" })).toHaveAttribute(
    "aria-pressed",
    "true",
  );
  await page.getByLabel("In a few words").fill("ring bent");
  await tap(page, /^Go on$/);
  await walkOn(page);
  await expect(page.getByText("Not as drawn: ring over its end. ring bent")).toBeVisible();
});
