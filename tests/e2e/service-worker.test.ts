import { appendFileSync, readFileSync, writeFileSync } from "node:fs";
import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";
import type { Product } from "../support/product-process";

/** Opens the field wing online, signed in, and waits until its worker has kept everything and covers the page. */
async function installWorker(page: Page, product: Product): Promise<void> {
  await product.signIn(page, "driver@demo.example");
  await page.goto("/field");
  await page.evaluate(async () => {
    await navigator.serviceWorker.ready;
    if (navigator.serviceWorker.controller) return;
    await new Promise((done) =>
      navigator.serviceWorker.addEventListener("controllerchange", done, { once: true }),
    );
  });
}

const headingOf = (page: Page) => page.locator("h1").first().textContent();

test("the field wing opens with no server, whatever its query", async ({ page, product }) => {
  await installWorker(page, product);
  const heading = await headingOf(page);
  await product.stop();
  await page.goto("/field?rig=0198a5c2-0000-7000-8000-000000000000&utm_source=x");
  expect(await headingOf(page)).toBe(heading);
  expect(await page.evaluate(() => performance.getEntriesByType("navigation").length)).toBe(1);
});

test("the field wing opens with no network in a new tab", async ({ page, context, product }) => {
  await installWorker(page, product);
  await context.setOffline(true);
  const tab = await context.newPage();
  expect((await tab.goto("/field"))?.status()).toBe(200);
  await context.setOffline(false);
});

test("other pages open offline as they should", async ({ page, product }) => {
  product.allowError(/status of 401/);
  const headings = new Map<string, string | null>();
  for (const path of ["/", "/sign-in", "/offline"]) {
    await page.goto(path);
    headings.set(path, await headingOf(page));
  }
  await installWorker(page, product);
  await product.stop();
  for (const [path, shown] of Object.entries({ "/": "/", "/sign-in": "/sign-in", "/desk?x=1": "/offline" })) {
    await page.goto(path);
    expect(await headingOf(page), path).toBe(headings.get(shown));
  }
});

test("the worker answers neither the API nor the router's requests", async ({ page, product }) => {
  await installWorker(page, product);
  await product.stop();
  const outcomes = await page.evaluate(async () => {
    const ask = (url: string, headers: Record<string, string>) =>
      fetch(url, { headers }).then(
        (answer) => answer.status,
        () => "failed",
      );
    return [await ask("/api/health", {}), await ask("/field", { RSC: "1" }), await ask("/field?_rsc=1", {})];
  });
  expect(outcomes).toEqual(["failed", "failed", "failed"]);
});

test("keeps documents only as they are without a redirect", async ({ page, product }) => {
  await installWorker(page, product);
  const kept = await page.evaluate(async () => {
    const caches_ = await Promise.all((await caches.keys()).map((name) => caches.open(name)));
    const responses = await Promise.all(
      caches_.map(async (cache) => Promise.all((await cache.keys()).map((request) => cache.match(request)))),
    );
    return responses
      .flat()
      .map((response) => ({ status: response?.status, redirected: response?.redirected }));
  });
  expect(kept.length).toBeGreaterThan(10);
  expect(kept.every(({ status, redirected }) => status === 200 && redirected === false)).toBe(true);
});

test("a new worker waits until the page asks it to take over", async ({ page, product }) => {
  await installWorker(page, product);
  // A page outside of the field wing: one inside loads itself anew when a new worker takes over.
  await page.goto("/offline");
  const before = readFileSync("public/sw.js");
  try {
    appendFileSync("public/sw.js", "// a later build\n");
    await page.evaluate(async () => {
      const registration = await navigator.serviceWorker.ready;
      await registration.update();
      while (!registration.waiting) await new Promise((done) => setTimeout(done, 50));
    });
    const taken = page.evaluate(async () => {
      const change = new Promise((done) => {
        navigator.serviceWorker.addEventListener("controllerchange", () => done("taken over"), {
          once: true,
        });
      });
      return await change;
    });
    const first = await Promise.race([taken, page.waitForTimeout(1000).then(() => "still waiting")]);
    expect(first).toBe("still waiting");
    await page.evaluate(async () => {
      (await navigator.serviceWorker.ready).waiting?.postMessage({ type: "SKIP_WAITING" });
    });
    expect(await taken).toBe("taken over");
  } finally {
    writeFileSync("public/sw.js", before);
  }
});
