import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";
import { ask, closeAndSign, moved, readyPhone, startHookUp, tap, walkOn } from "../support/walking";

type Visit = (state: string) => Promise<void>;

/** Goes to a station by the plan. */
async function goTo(page: Page, station: RegExp): Promise<void> {
  await tap(page, /^Show the stations/);
  await tap(page, station);
}

/** Shows every state of a walk, one after the other, by taps alone. */
async function everyState(page: Page, visit: Visit): Promise<void> {
  await visit("rigs");
  await startHookUp(page);
  await visit("a check");
  await tap(page, /^Fault/);
  await visit("what is wrong");
  await tap(page, /^coach brake set/);
  await visit("touched as not as drawn");
  await tap(page, /^Mended on the spot/);
  await visit("what was done");
  await tap(page, /^Back$/);
  await visit("why it is good now");
  await tap(page, /^Leave it as fault/);
  await visit("a check that has its mark");
  await tap(page, /^Show the stations/);
  await visit("the stations");
  await tap(page, /^Car cabin/);
  await expect(ask(page)).toHaveText("Cabin as on page 214");
  await tap(page, /^Good/);
  await tap(page, /^Good/);
  await visit("do the stop lamps light");
  await tap(page, /^They stay dark/);
  await visit("is the pedal up");
  await tap(page, /^All the way up/);
  await visit("is the unit idle");
  await tap(page, /^Back one/);
  await tap(page, /^Back one/);
  await tap(page, /^They light/);
  await visit("are they dark");
  await tap(page, /^Dark$/);
  await tap(page, /^Stop…/);
  await visit("stopped on the way");
  await tap(page, /^Call it off/);
  await visit("called off, why");
  await tap(page, /^Back$/);
  await tap(page, /^Pause/);
  await visit("rigs with a paused walk");
  await tap(page, /^Go on: hook-up/);
  await visit("taken up again");
  await tap(page, /^Nobody has/);
  await lampStates(page, visit);
  await goTo(page, /^Last look/);
  await visit("has anyone been in the car");
  await tap(page, /^Nobody has/);
  await goTo(page, /^Last look/);
  while ((await ask(page).innerText()) !== "Car tires: none low, none cracked") {
    const asked = await ask(page).innerText();
    await tap(page, /^Good/);
    await moved(page, asked);
  }
  await tap(page, /^Good/);
  await visit("what the gauge reads");
  for (const key of ["3", "3"]) await page.getByRole("button", { name: key, exact: true }).click();
  await tap(page, /^Save and go on/);
  await walkOn(page);
  await visit("held");
  await tap(page, /^Fixed, look again/);
  await walkFixed(page);
  await visit("all marked");
  await tap(page, closeAndSign);
  await visit("no hold marked");
  await tap(page, /^The rig was left/);
  await visit("stale");
  await page.getByRole("link", { name: "Back to rigs" }).click();
  await page.getByRole("link", { name: /^Paper cards/ }).click();
  await visit("paper cards");
  await tap(page, /^Print: hook-up/);
  await visit("a card");
  await tap(page, /^Back$/);
  await tap(page, /^Enter: hook-up/);
  await visit("a card to enter");
  await page.goto("/field?settings=1");
  await expect(page.getByRole("heading", { name: "Settings" })).toBeVisible();
  await visit("settings");
  await page.goto("/field?prompt=lamps");
  await visit("the prompter");
}

async function lampStates(page: Page, visit: Visit): Promise<void> {
  await goTo(page, /^Car tail/);
  await expect(ask(page)).toHaveText("Tail lamps");
  await visit("a signal");
  await tap(page, /^Whole check/);
  await visit("the whole lamp check");
  await tap(page, /^Back to the signals/);
  await tap(page, /^With two, or alone/);
  await visit("how the signals are given");
  await tap(page, /^By arm signals/);
  await visit("arm signals");
  await tap(page, /^With two, or alone/);
  await tap(page, /^Alone, from a filmed clip/);
  await visit("a clip to choose");
  await tap(page, /^Back/);
  await tap(page, /^With two, or alone/);
  await tap(page, /^A second phone/);
  await visit("a script to start");
  await tap(page, /^Start together/);
  await visit("a script that waits");
  await tap(page, /^Stop the script/);
  await tap(page, /^With two, or alone/);
  await tap(page, /^By calling out/);
  await tap(page, /^Odd/);
  await visit("which lamp is odd");
  await tap(page, /^Right lamp/);
  await visit("what it does");
  await tap(page, /^Dim/);
  await tap(page, /^Save as odd/);
  await expect(ask(page)).toHaveText("Left turn");
}

/** After the mending: every hold that was at fault was fixed. */
async function walkFixed(page: Page): Promise<void> {
  for (;;) {
    await walkOn(page, () => /^Good/, /^(Close and sign|It was fixed)/);
    if (await page.getByRole("button", { name: closeAndSign }).isVisible()) return;
    await tap(page, /^It was fixed/);
    await tap(page, /^closed or locked/);
  }
}

/** Everything that can be touched, with its size; what the browser does not show is left out. */
function smallTargets(page: Page): Promise<string[]> {
  return page.evaluate(() => {
    const wanted = "button, a[href], summary, label:has(input), input:not([type=radio], [type=file])";
    return [...document.querySelectorAll<HTMLElement>(wanted)]
      .filter((each) => each.checkVisibility() && !each.closest(".sr-only") && !each.matches(".sr-only"))
      .filter((each) => !(each instanceof HTMLLabelElement) || each.querySelector("input"))
      .map((each) => ({ each, box: each.getBoundingClientRect() }))
      .filter(({ box }) => box.width < 71.5 || box.height < 71.5)
      .map(({ each, box }) => `${each.textContent || each.tagName}: ${box.width} by ${box.height}`);
  });
}

/** How far the page is wider than its window. */
const overflow = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

for (const colorScheme of ["light", "dark"] as const) {
  test(`axe finds nothing in any state, and every target is 72 px, ${colorScheme}`, async ({
    page,
    product,
  }) => {
    test.setTimeout(400_000);
    await page.emulateMedia({ colorScheme });
    await readyPhone(page, product);
    const found: Record<string, unknown> = {};
    await everyState(page, async (state) => {
      const { violations } = await new AxeBuilder({ page }).analyze();
      const small = await smallTargets(page);
      const wide = await overflow(page);
      if (violations.length + small.length + wide > 0) {
        found[state] = { axe: violations.map(({ id, nodes }) => [id, nodes[0]?.html]), small, wide };
      }
    });
    expect(found).toEqual({});
  });
}

test.describe("360 by 740 with text twice as large", () => {
  test.use({ viewport: { width: 360, height: 740 } });

  test("every state works by taps, fits its width and keeps its targets", async ({ page, product }) => {
    test.setTimeout(400_000);
    await page.addInitScript(() => {
      const enlarge = () => document.documentElement.style.setProperty("font-size", "200%");
      document.addEventListener("DOMContentLoaded", enlarge);
    });
    await readyPhone(page, product);
    const found: Record<string, unknown> = {};
    await everyState(page, async (state) => {
      const small = await smallTargets(page);
      const wide = await overflow(page);
      if (small.length + wide > 0) found[state] = { small, wide };
    });
    expect(found).toEqual({});
  });
});
