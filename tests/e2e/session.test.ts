import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";

const PASSWORD = "walk the rig twice";

// Asking who is signed in is answered with 401 when nobody is, which a browser reports.
test.use({ allowedErrors: [/status of 401/] });

async function fill(page: Page, email: string, password: string): Promise<void> {
  await page.getByLabel("Email address").fill(email);
  await page.getByRole("textbox", { name: "Password" }).fill(password);
}

test("the front page has three ways in", async ({ page }) => {
  await page.goto("/");
  const ways = page.getByRole("navigation", { name: "Ways in" }).getByRole("link");
  await expect(ways).toHaveCount(3);
  expect(await ways.evaluateAll((links) => links.map((link) => link.getAttribute("href")))).toEqual([
    "/field",
    "/desk",
    "/sign-in",
  ]);
});

for (const [email, home] of [
  ["auditor@demo.example", "/desk"],
  ["manager@demo.example", "/field"],
] as const) {
  test(`${email} signs in by keyboard and arrives at ${home}`, async ({ page }) => {
    await page.goto("/sign-in");
    await fill(page, email, PASSWORD);
    await page.keyboard.press("Enter");
    await page.waitForURL(`**${home}`);
  });
}

test("what is missing is said at its field, and nothing is sent", async ({ page }) => {
  let sent = 0;
  page.on("request", (request) => (sent += request.method() === "POST" ? 1 : 0));
  await page.goto("/sign-in");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByLabel("Email address")).toHaveAccessibleDescription("Enter your email address.");
  await expect(page.getByRole("textbox", { name: "Password" })).toHaveAccessibleDescription(
    "Enter your password.",
  );
  await expect(page.getByLabel("Email address")).toBeFocused();
  expect(sent).toBe(0);
});

test("a wrong password is told in one sentence and leaves the address", async ({ page }) => {
  await page.goto("/sign-in");
  await fill(page, "driver@demo.example", "not this one");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("alert").filter({ hasText: "password" })).toHaveText(
    "That address and password do not belong together.",
  );
  await expect(page.getByLabel("Email address")).toHaveValue("driver@demo.example");
  await expect(page.getByRole("textbox", { name: "Password" })).toHaveValue("");
  await expect(page.getByRole("textbox", { name: "Password" })).toBeFocused();
  expect(page.url()).not.toContain("not%20this%20one");
});

test("too many attempts say how long to wait", async ({ page, product }) => {
  product.allowError(/status of 429/);
  await page.route("**/api/session", (route) =>
    route.request().method() === "POST"
      ? route.fulfill({
          status: 429,
          contentType: "application/problem+json",
          headers: { "retry-after": "540" },
          body: JSON.stringify({ type: "about:blank", title: "-", status: 429, code: "too-many-attempts" }),
        })
      : route.continue(),
  );
  await page.goto("/sign-in");
  await fill(page, "driver@demo.example", PASSWORD);
  await page.keyboard.press("Enter");
  await expect(page.getByText("Too many failed attempts. Try again in 9 min.")).toBeVisible();
});

test("a server that is gone is told apart from a refusal", async ({ page, product }) => {
  await page.goto("/sign-in");
  await fill(page, "driver@demo.example", PASSWORD);
  await product.stop();
  await page.keyboard.press("Enter");
  await expect(page.getByText("Hookfast cannot be reached from here.")).toBeVisible();
});

test("the password can be shown and hidden", async ({ page }) => {
  await page.goto("/sign-in");
  const password = page.getByRole("textbox", { name: "Password" });
  await expect(password).toHaveAttribute("autocomplete", "current-password");
  await expect(page.getByLabel("Email address")).toHaveAttribute("autocomplete", "username");
  await page.getByRole("button", { name: "Show password" }).click();
  await expect(password).toHaveAttribute("type", "text");
  await page.getByRole("button", { name: "Hide password" }).click();
  await expect(password).toHaveAttribute("type", "password");
});

for (const foreign of [
  "https://elsewhere.example/",
  "//elsewhere.example/",
  "/\\elsewhere.example/",
  "/%09/elsewhere.example/",
  "javascript:alert(1)",
]) {
  test(`then=${foreign} is not followed`, async ({ page, product }) => {
    await page.goto(`/sign-in?then=${foreign.includes("%") ? foreign : encodeURIComponent(foreign)}`);
    await fill(page, "auditor@demo.example", PASSWORD);
    await page.keyboard.press("Enter");
    await page.waitForURL(`${product.origin}/desk`);
  });
}

test("the desk sends someone who is signed out to sign in, and back to the same place", async ({ page }) => {
  await page.goto("/desk/walk?id=00000000-0000-4000-8000-000000000001");
  await page.waitForURL(/\/sign-in\?then=/);
  await fill(page, "manager@demo.example", PASSWORD);
  await page.keyboard.press("Enter");
  await page.waitForURL(/\/desk\/walk\?id=00000000-0000-4000-8000-000000000001$/);
});

test("someone who is signed in is told so, goes on, or signs out", async ({ page, product }) => {
  await product.signIn(page, "auditor@demo.example");
  await page.goto("/sign-in?then=%2Fdesk");
  await expect(page.getByRole("heading", { name: /^You are signed in as/ })).toBeVisible();
  await page.getByRole("button", { name: "Go on" }).click();
  await page.waitForURL("**/desk");
  await page.goto("/sign-in");
  await page.getByRole("button", { name: "Sign out" }).click();
  await expect(page.getByRole("heading", { name: "Sign in", exact: true })).toBeVisible();
  expect((await page.request.get(`${product.origin}/api/session`)).status()).toBe(401);
});

test("signing out at the desk ends the session", async ({ page, product }) => {
  await page.setViewportSize({ width: 1280, height: 800 });
  await product.signIn(page, "manager@demo.example");
  await page.goto("/desk");
  await page.getByRole("button", { name: "Sign out" }).click();
  await page.waitForURL("**/sign-in");
  expect((await page.request.get(`${product.origin}/api/session`)).status()).toBe(401);
  await page.goto("/desk");
  await page.waitForURL(/\/sign-in\?then=%2Fdesk$/);
});

test("signing out without the server says that it did not happen", async ({ page, product }) => {
  await page.setViewportSize({ width: 1280, height: 800 });
  await product.signIn(page, "manager@demo.example");
  await page.goto("/desk");
  await expect(page.getByRole("button", { name: "Sign out" })).toBeVisible();
  await product.stop();
  await page.getByRole("button", { name: "Sign out" }).click();
  await expect(page.getByText("You are still signed in.")).toBeVisible();
});

for (const colorScheme of ["light", "dark"] as const) {
  for (const [name, path] of [
    ["front page", "/"],
    ["sign-in", "/sign-in"],
    ["not-found", "/nowhere"],
  ] as const) {
    test(`axe finds nothing on the ${name}, ${colorScheme}`, async ({ page, product }) => {
      product.allowError(/status of 404/);
      await page.emulateMedia({ colorScheme });
      await page.goto(path);
      if (path === "/sign-in") {
        await page.getByRole("button", { name: "Sign in" }).click();
        await expect(page.getByText("Enter your email address.")).toBeVisible();
      }
      expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    });
  }
}
