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

/**
 * Answers what is left of a walk, in turn, until nothing is asked any more: checks by `answer`, the question about the
 * car with nobody.
 */
export async function walkOn(page: Page, answer: (ask: string) => RegExp = () => good): Promise<void> {
  const onward = page.getByRole("button", { name: /^(Good|Nobody has|Close and sign|Fixed, look again)/ });
  for (;;) {
    await onward.first().waitFor();
    if (await page.getByRole("button", { name: /^(Close and sign|Fixed, look again)/ }).isVisible()) return;
    const asked = await ask(page).innerText();
    const aboutCar = await page.getByRole("button", { name: nobody }).isVisible();
    const name = aboutCar ? nobody : answer(asked);
    await tap(page, name);
    if (name.source.startsWith("^Fault")) await tap(page, /^Go on$/);
    await moved(page, asked);
  }
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
