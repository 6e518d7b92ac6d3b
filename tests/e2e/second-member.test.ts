import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";

const PASSWORD = "a few long words";

/** How much wider than the screen the page is, in pixels. */
const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

/** Makes an invitation at the desk and reads its link off the page. */
async function invite(page: Page, role: string): Promise<string> {
  await page.goto("/desk/people");
  await page.getByRole("radio", { name: role }).check();
  await page.getByRole("button", { name: "Make a link" }).click();
  return page.getByLabel("Link", { exact: true }).inputValue();
}

async function fillIn(page: Page, name: string, email: string): Promise<void> {
  await page.getByLabel("Your name").fill(name);
  await page.getByLabel("Email address").fill(email);
  await page.getByLabel("New password").fill(PASSWORD);
  await page.getByRole("button", { name: "Join", exact: true }).click();
}

test("a manager passes a link on, and a second person walks the household's rig by it", async ({
  page,
  product,
  browser,
}) => {
  await page.context().grantPermissions(["clipboard-read", "clipboard-write"]);
  await product.signIn(page, "driver@demo.example");
  const link = await invite(page, "Driver");
  expect(link).toMatch(new RegExp(`^${product.origin}/join\\?token=[A-Za-z0-9_-]{43}$`));
  await page.getByRole("button", { name: "Copy the link" }).click();
  await expect(page.getByText("The link is copied.")).toBeVisible();
  expect(await page.evaluate(() => navigator.clipboard.readText())).toBe(link);
  await expect(page.getByText("Driver, invited by Robin at Maple Loop")).toBeVisible();

  product.allowError(/status of 401/);
  product.allowError(/status of 404/);
  const elsewhere = await browser.newContext();
  const other = await elsewhere.newPage();
  await other.goto(link);
  await expect(
    other.getByText("Robin at Maple Loop invites you to Maple Loop household, as driver."),
  ).toBeVisible();
  await fillIn(other, "Alex at Maple Loop", "alex@demo.example");
  await other.waitForURL("**/field");
  await expect(other.getByRole("button", { name: /^Hook-up/ }).first()).toBeVisible();
  await other.goto("/desk/people");
  await expect(other.getByText("Only managers see who belongs here and invite others.")).toBeVisible();
  await other.goto(link);
  await expect(other.getByText("This invitation is not open")).toBeVisible();
  await elsewhere.close();

  await page.reload();
  await expect(page.getByText("Alex at Maple Loop")).toBeVisible();
  await expect(page.getByText("None is open.")).toBeVisible();
});

test("a link that is withdrawn while someone fills the form in leads nowhere, and says so", async ({
  page,
  product,
  browser,
}) => {
  product.allowError(/status of 40[149]/);
  await product.signIn(page, "driver@demo.example");
  const link = await invite(page, "Manager");
  const elsewhere = await browser.newContext();
  const other = await elsewhere.newPage();
  await other.goto(link);
  await fillIn(other, "Sam", "driver@demo.example");
  await expect(other.getByText("There is an account with that address already")).toBeVisible();
  await expect(other.getByLabel("Email address")).toBeFocused();
  await page.getByRole("button", { name: /^Withdraw/ }).click();
  await expect(page.getByText("None is open.")).toBeVisible();
  await fillIn(other, "Sam", "sam@demo.example");
  await expect(other.getByText("This invitation is not open")).toBeVisible();
  await elsewhere.close();
});

for (const colorScheme of ["light", "dark"] as const) {
  test(`axe finds nothing on either page, and nothing is wider than a phone, ${colorScheme}`, async ({
    page,
    product,
  }) => {
    product.allowError(/status of 40[14]/);
    await page.emulateMedia({ colorScheme });
    await page.setViewportSize({ width: 360, height: 800 });
    await product.signIn(page, "manager@demo.example");
    const link = await invite(page, "Auditor");
    const check = async () => {
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      expect(await sideways(page)).toBe(0);
    };
    await check();
    await page.evaluate(() => document.documentElement.setAttribute("data-text", "200"));
    expect(await sideways(page)).toBe(0);
    await page.goto(link);
    await expect(page.getByText(/invites you to North Lot rentals, as auditor\.$/)).toBeVisible();
    await page.getByRole("button", { name: "Join", exact: true }).click();
    await expect(page.getByText("Enter your name.")).toBeVisible();
    await check();
    await page.goto("/join?token=cut-short");
    await expect(page.getByText("This invitation is not open")).toBeVisible();
    await check();
  });
}
