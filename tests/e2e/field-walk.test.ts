import AxeBuilder from "@axe-core/playwright";
import { expect, test } from "../support/product";
import {
  ask,
  closeAndSign,
  DRIVER,
  fault,
  good,
  markFault,
  place,
  readyPhone,
  SETTLED_MS,
  slowPhone,
  startHookUp,
  tap,
  walkOn,
} from "../support/walking";

test("cold start with no server, a fault on a hold, saved; the server is back, received by itself", async ({
  page,
  context,
  product,
}) => {
  test.setTimeout(120_000);
  await readyPhone(page, product);
  await page.close();
  await product.stop();

  const cold = await context.newPage();
  await cold.goto("/field");
  await startHookUp(cold);
  const [, total] = await place(cold);
  let faulty = "";
  await walkOn(cold, (asked) => {
    faulty ||= asked;
    return faulty === asked ? fault : good;
  });
  await tap(cold, /^Call it off/);
  await tap(cold, /^needs a part/);

  await expect(cold.getByRole("heading", { name: "Do not tow" })).toBeVisible();
  await expect(cold.getByRole("heading", { name: faulty })).toBeVisible();
  const main = cold.getByRole("main");
  await expect(main).toContainText(
    "Secure the car first: parking brake on, wheels chocked. Nobody between the vehicles while either can move.",
  );
  await expect(main).toContainText(`${total} of ${total} looked at`);
  await expect(main).toContainText("goes to the server by itself when there is a signal");
  await expect(main).not.toContainText("received");

  await cold.reload();
  await expect(cold.getByRole("heading", { name: "Do not tow" })).toBeVisible();
  await product.start();
  await expect(cold.getByRole("region", { name: "Where this record is" })).toContainText(
    /received \d\d:\d\d/,
    {
      timeout: 60_000,
    },
  );
});

test("all good is no hold marked, with what that says and does not say", async ({ page, product }) => {
  await readyPhone(page, product);
  await startHookUp(page);
  await walkOn(page);
  await page.getByRole("button", { name: closeAndSign }).click();
  await expect(page.getByRole("heading", { name: "No hold marked" })).toBeVisible();
  await expect(page.getByRole("main")).toContainText(
    "This is a record of what you saw, not a statement that the rig is fit for the road.",
  );
  await expect(page.getByText(/^received \d\d:\d\d$/).last()).toBeVisible();
  await page.getByRole("link", { name: "Back to rigs" }).click();
  await expect(page).toHaveURL(/\/field$/);
  await expect(page.getByRole("link", { name: /^No hold marked/ })).toContainText("received");
});

test("a double tap marks once, and the first touch within 600 ms of a check is ignored", async ({
  page,
  product,
}) => {
  await readyPhone(page, product);
  await startHookUp(page);
  await page.waitForTimeout(SETTLED_MS);
  await page.getByRole("button", { name: good }).dblclick();
  await expect(page.getByText(/^2 of \d+$/)).toBeVisible();
  await page.waitForTimeout(SETTLED_MS);
  // In the page, because the way there and back may take longer than 600 ms.
  await page.evaluate(async () => {
    const ask = () => document.querySelector("h2")!.textContent;
    const good = () =>
      [...document.querySelectorAll("button")].find((each) => each.textContent.startsWith("Good"))!;
    const asked = ask();
    good().click();
    while (ask() === asked) await new Promise(requestAnimationFrame);
    good().click();
  });
  await page.waitForTimeout(SETTLED_MS);
  expect(await place(page)).toEqual([3, expect.any(Number)]);
});

test("a hold at fault becomes good only with a reason", async ({ page, product }) => {
  await readyPhone(page, product);
  await startHookUp(page);
  const held = await markFault(page);
  await tap(page, /^Back one/);
  await tap(page, good);
  await expect(page.getByText("Why is it good now?")).toBeVisible();
  await expect(ask(page)).toHaveText(held);
  await tap(page, /^It was fixed/);
  await page.getByLabel("Or in a few words").fill("");
  await tap(page, /^Save as good/);
  await expect(page.getByText("Say in a few words what was done.")).toBeVisible();
  await page.getByLabel("Or in a few words").fill("new clip");
  await tap(page, /^Save as good/);
  await expect(ask(page)).not.toHaveText(held);
  await tap(page, /^Back one/);
  await expect(page.getByText("Marked: good")).toBeVisible();
});

test("a second tab reads the walk that the first one records", async ({ page, context, product }) => {
  await readyPhone(page, product);
  await slowPhone(page);
  await startHookUp(page);
  await tap(page, good);
  const second = await context.newPage();
  await second.goto(page.url());
  await expect(second.getByText("Another tab records this walk")).toBeVisible();
  await expect(second.getByRole("button", { name: good })).toHaveCount(0);
  await page.close();
  // The tab that was closed lets go of the walk a moment later.
  await expect(async () => {
    await second.getByRole("button", { name: "Take it up here" }).click({ timeout: 1_000 });
    await expect(second.getByRole("button", { name: /^Only the phone was away/ })).toBeVisible();
  }).toPass();
  await tap(second, /^Only the phone was away/);
  await expect(second.getByText(/^2 of \d+$/)).toBeVisible();
});

test("a mark that the phone did not keep says so and stays", async ({ page, product }) => {
  await readyPhone(page, product);
  await startHookUp(page);
  const here = await ask(page).innerText();
  await page.evaluate(() => {
    const { add } = IDBObjectStore.prototype;
    IDBObjectStore.prototype.add = function () {
      IDBObjectStore.prototype.add = add;
      throw new DOMException("", "QuotaExceededError");
    };
  });
  await tap(page, good);
  await expect(page.getByRole("main").getByRole("alert")).toContainText("This phone’s storage is full");
  await expect(ask(page)).toHaveText(here);
  await tap(page, good);
  await expect(ask(page)).not.toHaveText(here);
});

test("by keyboard alone: the focus follows the checks", async ({ page, product }) => {
  await readyPhone(page, product);
  await page
    .getByRole("button", { name: /^Hook-up/ })
    .first()
    .focus();
  await page.keyboard.press("Enter");
  await expect(page.getByRole("button", { name: good })).toBeVisible();
  await expect(ask(page)).toBeFocused();
  await page.waitForTimeout(SETTLED_MS);
  await page.keyboard.press("Tab");
  while (!(await page.getByRole("button", { name: good }).evaluate((b) => b === document.activeElement))) {
    await page.keyboard.press("Tab");
  }
  const here = await ask(page).innerText();
  await page.keyboard.press("Enter");
  await expect(ask(page)).not.toHaveText(here);
  await expect(ask(page)).toBeFocused();
  await expect(page.getByText(/^Good, saved\. .+, 2 of \d+\.$/)).toBeAttached();
});

test("signed out, with nothing on the phone: the way to sign in", async ({ page, product }) => {
  product.allowError(/status of 401/);
  await page.goto("/field");
  await expect(page.getByRole("link", { name: "Sign in" })).toHaveAttribute("href", "/sign-in?then=/field");
});

test("an auditor is told that walks are made by others", async ({ page, product }) => {
  product.allowError(/status of 403/);
  await product.signIn(page, "auditor@demo.example");
  await page.goto("/field");
  await expect(page.getByText("Your role reads walks and does not make them")).toBeVisible();
  await expect(page.getByRole("link", { name: "Go to the desk" })).toHaveAttribute("href", "/desk");
});

test("a browser that keeps nothing says so", async ({ page, product }) => {
  await product.signIn(page, DRIVER);
  await page.addInitScript(() => {
    IDBFactory.prototype.open = () => {
      throw new DOMException("", "SecurityError");
    };
  });
  await page.goto("/field");
  await expect(page.getByText("This browser will not keep anything")).toBeVisible({ timeout: 2_000 });
});

for (const colorScheme of ["light", "dark"] as const) {
  test(`axe finds nothing on the screens of a walk, ${colorScheme}`, async ({ page, product }) => {
    test.setTimeout(120_000);
    const clean = async () => expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    await page.emulateMedia({ colorScheme });
    await readyPhone(page, product);
    await clean();
    await startHookUp(page);
    await clean();
    await tap(page, fault);
    await expect(page.getByText("What is not as drawn?")).toBeVisible();
    await clean();
    await tap(page, /^Go on$/);
    await tap(page, /^Back one/);
    await clean();
    await tap(page, good);
    await expect(page.getByText("Why is it good now?")).toBeVisible();
    await clean();
    await tap(page, /^It was fixed/);
    await clean();
    await tap(page, /^Back$/);
    await tap(page, /^Leave it as fault/);
    await tap(page, /^Show the stations/);
    await clean();
    await tap(page, /^Back to the check/);
    await tap(page, /^Stop…/);
    await clean();
    await tap(page, /^Pause/);
    await tap(page, /^Go on: hook-up/);
    await expect(page.getByText(/^Paused/)).toBeVisible();
    await clean();
    await tap(page, /^Call it off/);
    await clean();
    await tap(page, /^called away/);
    await expect(page.getByRole("heading", { name: "Do not tow" })).toBeVisible();
    await clean();
    await page.getByRole("link", { name: "Back to rigs" }).click();
    await expect(page.getByRole("link", { name: /^Do not tow/ })).toBeVisible();
    await clean();
  });
}
