import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";
import { good, markFault, tap, walkOn } from "../support/walking";

// Nobody is signed in, and the wing asks.
test.use({ allowedErrors: [/status of 401/] });

const PASSWORD = "oak bend in the rain";
const start = "Start without an account";

/** The wing opened once, with the worker on the phone. */
async function freshPhone(page: Page): Promise<void> {
  await page.goto("/field");
  await expect(page.getByRole("link", { name: start })).toBeVisible();
  await page.evaluate(async () => void (await navigator.serviceWorker.ready));
}

const usual = [/^Into the receiver/, /^A portable box/, /^No$/, /^Separate bulbs/, /^Not looked up yet/];

/** Makes a rig by taps alone. */
async function makeRig(page: Page, answers: readonly RegExp[] = usual): Promise<void> {
  for (const answer of [...answers, /^Keep this rig/]) await tap(page, answer);
  await expect(page.getByRole("heading", { name: "Our rig" })).toBeVisible();
}

/** Walks to the end, the first check at fault, and signs. */
async function walkAndSign(page: Page): Promise<void> {
  await page
    .getByRole("button", { name: /^Hook-up/ })
    .first()
    .click();
  await expect(page.getByRole("button", { name: /^Fault/ })).toBeVisible();
  // Nobody has looked the manual up, so there is nothing that could be good about it.
  await expect(page.getByRole("button", { name: good })).toHaveCount(0);
  await markFault(page);
  await walkOn(page);
  await tap(page, /^Call it off/);
  await tap(page, /^called away/);
}

async function fill(page: Page, email: string, password = PASSWORD): Promise<void> {
  await page.getByLabel("Your name").fill("Sam");
  await page.getByLabel("Household").fill("Oak Bend");
  await page.getByLabel("Email address").fill(email);
  await page.getByRole("textbox", { name: "New password" }).fill(password);
}

const submit = (page: Page) => page.getByRole("button", { name: "Sign up" }).click();

test("no account, no server: a rig is made and walked; after the sign-up the walk is received", async ({
  page,
  context,
  product,
}) => {
  test.setTimeout(180_000);
  await freshPhone(page);
  await page.close();
  await product.stop();

  const cold = await context.newPage();
  await cold.goto("/field");
  await cold.getByRole("link", { name: start }).click();
  await makeRig(cold);
  await expect(cold.getByText("This phone, no account")).toBeVisible();
  await expect(cold.getByText("Kept on this phone only.")).toBeVisible();
  await walkAndSign(cold);
  await expect(cold.getByRole("heading", { name: "Do not tow" })).toBeVisible();
  const walk = new URL(cold.url()).searchParams.get("walk")!;
  const record = cold.getByRole("region", { name: "Where this record is" });
  await expect(record).toContainText("goes to the server after you sign up");
  await cold.reload();
  await expect(record).toContainText("goes to the server after you sign up");

  await product.start();
  await record.getByRole("link").click();
  await expect(cold.getByRole("listitem").filter({ hasText: "Our rig" })).toContainText("1 walk");
  await fill(cold, "sam@oakbend.example");
  await submit(cold);
  await cold.waitForURL("**/field");
  await expect(cold.getByText("Sam, Oak Bend")).toBeVisible();
  await expect(cold.getByRole("link", { name: /^Do not tow/ })).toContainText("received", {
    timeout: 60_000,
  });
  await expect(cold.getByText("Kept on this phone only.")).toHaveCount(0);
  const stored = await cold.request.get(`${product.origin}/api/walks/${walk}`);
  expect(await stored.json()).toMatchObject({
    walk: { id: walk, state: "sealed", verdict: "hold" },
    names: { rig: "Our rig", member: "Sam" },
  });
});

test("signed in to an account instead: the rig stays on this phone, beside the account's", async ({
  page,
  product,
}) => {
  await freshPhone(page);
  await page.getByRole("link", { name: start }).click();
  await makeRig(page);
  await page.goto("/sign-in?then=/field");
  await expect(page.getByText("stay on this phone when you sign in")).toBeVisible();
  await product.signIn(page, "driver@demo.example");
  await page.goto("/field");
  const local = page.getByRole("region", { name: "On this phone only" });
  await expect(local.getByRole("heading", { name: "Our rig" })).toBeVisible();
  await expect(page.getByRole("heading", { name: "Maple rig" })).toBeVisible();
  await local.getByRole("button", { name: /^Hook-up/ }).click();
  await tap(page, /^Fault/);
  await page.reload();
  await expect(page.getByText(/^It waits at 2 of \d+/)).toBeVisible();
});

test("the answers can be gone back over, and what the manual says is asked for in words", async ({
  page,
}) => {
  await freshPhone(page);
  await page.getByRole("link", { name: start }).click();
  await tap(page, /^On a ball/);
  await expect(page.getByRole("heading", { level: 2 })).toBeFocused();
  await tap(page, /^Back one/);
  await expect(page.getByRole("button", { name: /^On a ball/ })).toHaveAttribute("aria-pressed", "true");
  for (const answer of [/^On a ball/, /^Nothing yet/, /^Yes$/, /^A light bar/, /^It says how/]) {
    await tap(page, answer);
  }
  await tap(page, /^Go on/);
  await expect(page.getByLabel("Page")).toHaveAccessibleDescription(/^Enter the page/);
  await page.getByLabel("Page").fill("214");
  await page.getByLabel(/^How the cabin/).fill("Key off, selector as in the picture.");
  await tap(page, /^Go on/);
  await page.getByLabel("Name").fill("");
  await tap(page, /^Keep this rig/);
  await expect(page.getByText("Give the rig a name.")).toBeVisible();
  await page.getByLabel("Name").fill("Oak rig");
  await tap(page, /^Keep this rig/);
  await expect(page.getByRole("heading", { name: "Oak rig" })).toBeVisible();
  await page.reload();
  await expect(page.getByRole("heading", { name: "Oak rig" })).toBeVisible();
});

test("a rig that the phone did not keep says so, and can be kept again", async ({ page }) => {
  await freshPhone(page);
  await page.getByRole("link", { name: start }).click();
  for (const answer of usual) await tap(page, answer);
  await page.evaluate(() => {
    const { put } = IDBObjectStore.prototype;
    IDBObjectStore.prototype.put = function () {
      IDBObjectStore.prototype.put = put;
      throw new DOMException("", "QuotaExceededError");
    };
  });
  await tap(page, /^Keep this rig/);
  await expect(page.getByRole("main").getByRole("alert")).toContainText("Not kept.");
  await tap(page, /^Keep this rig/);
  await expect(page.getByRole("heading", { name: "Our rig" })).toBeVisible();
});

test("sign-up says what is wrong where it is wrong", async ({ page, product }) => {
  product.allowError(/status of 409/);
  await page.goto("/sign-up");
  await submit(page);
  await expect(page.getByLabel("Your name")).toBeFocused();
  await fill(page, "driver@demo.example", "fourteen chars");
  await submit(page);
  const password = page.getByRole("textbox", { name: "New password" });
  await expect(password).toHaveAccessibleDescription(/^Use 15 characters or more/);
  await expect(password).toHaveAttribute("autocomplete", "new-password");
  await password.fill(PASSWORD);
  await submit(page);
  const email = page.getByLabel("Email address");
  await expect(email).toHaveAccessibleDescription(/^There is an account with that address already/);
  await expect(email).toBeFocused();
  await email.fill("kim@oakbend.example");
  await product.stop();
  await submit(page);
  await expect(page.getByText("Hookfast cannot be reached from here.")).toBeVisible();
  await product.start();
  await submit(page);
  await page.waitForURL("**/field");
  await expect(page.getByText("Sam, Oak Bend")).toBeVisible();
});

test("sign-up is found from the front page and from sign-in", async ({ page }) => {
  for (const from of ["/", "/sign-in"]) {
    await page.goto(from);
    await expect(page.getByRole("link", { name: "Sign up" })).toHaveAttribute("href", "/sign-up");
  }
});

test("large text on a small screen: nothing is wider than it, and every target is a knuckle wide", async ({
  page,
}) => {
  await page.setViewportSize({ width: 360, height: 740 });
  const measure = async () => {
    await page.evaluate(() => document.documentElement.style.setProperty("font-size", "200%"));
    const { over, low } = await page.evaluate(() => ({
      over: document.documentElement.scrollWidth - innerWidth,
      low: [
        ...document.querySelectorAll(
          "main button, main a, main label:has(input), main input:not([type=radio]), main textarea",
        ),
      ]
        .filter((each) => each.getBoundingClientRect().height < 72)
        .map((each) => each.textContent),
    }));
    expect({ over: Math.max(0, over), low }).toEqual({ over: 0, low: [] });
  };
  await freshPhone(page);
  await measure();
  await page.getByRole("link", { name: start }).click();
  for (const answer of [...usual.slice(0, -1), /^It says how/]) {
    await measure();
    await tap(page, answer);
  }
  await measure();
  await page.getByLabel("Page").fill("1");
  await page.getByLabel(/^How the cabin/).fill("Off.");
  await tap(page, /^Go on/);
  await measure();
  await tap(page, /^Keep this rig/);
  await expect(page.getByRole("heading", { name: "Our rig" })).toBeVisible();
  await measure();
});

for (const colorScheme of ["light", "dark"] as const) {
  test(`axe finds nothing on the way to a rig and an account, ${colorScheme}`, async ({ page }) => {
    test.setTimeout(120_000);
    const clean = async () => expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    await page.emulateMedia({ colorScheme });
    await freshPhone(page);
    await clean();
    await page.getByRole("link", { name: start }).click();
    for (const answer of [...usual.slice(0, -1), /^It says how/]) {
      await clean();
      await tap(page, answer);
    }
    await tap(page, /^Go on/);
    await clean();
    await page.getByLabel("Page").fill("1");
    await page.getByLabel(/^How the cabin/).fill("Off.");
    await tap(page, /^Go on/);
    await clean();
    await tap(page, /^Keep this rig/);
    await expect(page.getByRole("heading", { name: "Our rig" })).toBeVisible();
    await clean();
    await page.goto("/sign-up");
    await expect(page.getByText("Goes with your account from this phone")).toBeVisible();
    await submit(page);
    await clean();
  });
}
