import { expect, type Page } from "@playwright/test";

export const DRIVER = "driver@demo.example";

/** A touch counts this long after something appeared. */
export const SETTLED_MS = 700;

export const good = /^Good/;
export const nobody = /^Nobody has/;
export const fault = /^Fault \(do not tow\)/;
export const closeAndSign = /^Close and sign/;

type Signing = { signIn: (page: Page, email: string) => Promise<void> };

/** Signed in, with the bundle and the worker on the phone, on the rigs screen. */
export async function readyPhone(page: Page, product: Signing, email = DRIVER): Promise<void> {
  await product.signIn(page, email);
  await page.goto("/field");
  await expect(page.getByRole("button", { name: /^(Hook-up|Yard out)/ }).first()).toBeVisible();
  await page.evaluate(async () => void (await navigator.serviceWorker.ready));
}

/** From here on the page runs as on a phone with a quarter of this machine's speed. */
export async function slowPhone(page: Page): Promise<void> {
  const session = await page.context().newCDPSession(page);
  await session.send("Emulation.setCPUThrottlingRate", { rate: 4 });
}

/** Taps a button once it takes touches. */
export async function tap(page: Page, name: RegExp): Promise<void> {
  await page.getByRole("button", { name }).first().waitFor();
  await page.waitForTimeout(SETTLED_MS);
  await page.getByRole("button", { name }).first().click();
}

/** What the check that shows asks for. */
export const ask = (page: Page) => page.getByRole("heading", { level: 2 });

/** Which check of how many shows. */
export async function place(page: Page): Promise<number[]> {
  return (await page.getByText(/^\d+ of \d+$/).innerText()).split(" of ").map(Number);
}

/** Starts a hook-up by the first control of that name. */
export async function startHookUp(page: Page): Promise<void> {
  await page
    .getByRole("button", { name: /^Hook-up/ })
    .first()
    .click();
  await expect(page.getByRole("button", { name: good })).toBeVisible();
}

/** Waits until something else is asked than this. */
export async function moved(page: Page, from: string): Promise<void> {
  await expect(ask(page)).not.toHaveText(from);
}

/** Marks the check that shows as a fault and goes on without saying what. */
export async function markFault(page: Page): Promise<string> {
  const asked = await ask(page).innerText();
  await tap(page, /^Fault/);
  await tap(page, /^Go on$/);
  await moved(page, asked);
  return asked;
}

/** The ends of a walk, and what is answered on the way to them. */
const ends = /^(Close and sign|Fixed, look again)/;
const answers = /^(Good|Nobody has|They light|Dark$|Go on without|Go on$|Close and sign|Fixed, look again)/;

/** What is asked now: the check or signal, and the question under it. */
function asking(page: Page): Promise<string> {
  return page.evaluate(() =>
    [...document.querySelectorAll("h2, section[aria-labelledby] > p:first-child")]
      .map((each) => each.textContent)
      .join(" / "),
  );
}

/**
 * Answers what is left of a walk, in turn, until nothing is asked any more: checks by `answer`, everything else with
 * the first answer that says all is well.
 * @param until stops where such a button shows
 */
export async function walkOn(
  page: Page,
  answer: (ask: string) => RegExp = () => good,
  until: RegExp = ends,
): Promise<void> {
  const button = page.getByRole("button", { name: answers });
  const end = page.getByRole("button", { name: until });
  for (;;) {
    await button.or(end).first().waitFor();
    if (await end.first().isVisible()) return;
    const before = await asking(page);
    const name = await button.first().innerText();
    await tap(page, good.test(name) ? answer(await ask(page).innerText()) : firstWords(name));
    await expect.poll(() => asking(page)).not.toBe(before);
  }
}

function firstWords(name: string): RegExp {
  return new RegExp(`^${name.split("\n")[0]}`);
}

/** Calls the open walk off as it stands: closed and signed. */
export async function callOff(page: Page): Promise<void> {
  await tap(page, /^Stop…/);
  await tap(page, /^Call it off/);
  await tap(page, /^called away/);
}

/** The entries of the walk that shows, as the phone's store has them. */
export async function storedEntries(page: Page): Promise<{ type: string; body: Record<string, unknown> }[]> {
  return await page.evaluate(async () => {
    const walk = new URLSearchParams(location.search).get("walk")!;
    const opening = indexedDB.open("hookfast");
    await new Promise((done) => (opening.onsuccess = done));
    const shelf = opening.result.transaction("kept").objectStore("kept");
    const reading = shelf.getAll(IDBKeyRange.bound(["entry", walk, 0], ["entry", walk, []]));
    await new Promise((done) => (reading.onsuccess = done));
    opening.result.close();
    return (reading.result as { text: string }[]).map(({ text }) => JSON.parse(text));
  });
}
