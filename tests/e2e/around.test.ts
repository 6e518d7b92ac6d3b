import { appendFileSync, readFileSync, writeFileSync } from "node:fs";
import AxeBuilder from "@axe-core/playwright";
import type { BrowserContext, Page } from "@playwright/test";
import { expect, test } from "../support/product";
import { callOff, slowPhone, tap } from "../support/walking";
import type { Product } from "../support/product-process";

const DRIVER = "driver@demo.example";
/** Trouble with the store is said within a second; at a quarter of the speed that is four of this machine's. */
const SAID_MS = 1_000;
const SAID_SLOWED_MS = 4 * SAID_MS;
/** A touch counts this long after a check appeared. */
const SETTLED_MS = 700;
const good = /^Good/;

/** Signed in, with the bundle and the worker on the phone. */
async function readyPhone(page: Page, product: Product): Promise<void> {
  await product.signIn(page, DRIVER);
  await page.goto("/field");
  await expect(hookUp(page)).toBeVisible();
  await page.evaluate(async () => {
    await navigator.serviceWorker.ready;
    if (navigator.serviceWorker.controller) return;
    await new Promise((done) =>
      navigator.serviceWorker.addEventListener("controllerchange", done, { once: true }),
    );
  });
}

const hookUp = (page: Page) => page.getByRole("button", { name: /^Hook-up/ }).first();
const ask = (page: Page) => page.getByRole("heading", { level: 2 });

async function startHookUp(page: Page): Promise<void> {
  await hookUp(page).click();
  await expect(page.getByRole("button", { name: good })).toBeVisible();
}

async function mark(page: Page): Promise<void> {
  const asked = await ask(page).innerText();
  await page.waitForTimeout(SETTLED_MS);
  await page.getByRole("button", { name: good }).click();
  await expect(ask(page)).not.toHaveText(asked);
}

/** The room that the browser gives this origin, in bytes; without a size, its own again. */
async function setQuota(page: Page, product: Product, quotaSize?: number): Promise<void> {
  const session = await page.context().newCDPSession(page);
  await session.send("Storage.overrideQuotaForOrigin", { origin: product.origin, quotaSize });
}

/**
 * Fills what room is left, down to the last hundred bytes. Chromium goes by the room that it found half a minute ago
 * as long as that suffices, so a quota that shrinks under an open database shows too late for a test.
 */
async function fill(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const db = await new Promise<IDBDatabase>((done) => {
      const request = indexedDB.open("filling");
      request.onupgradeneeded = () => request.result.createObjectStore("filling", { autoIncrement: true });
      request.onsuccess = () => done(request.result);
    });
    const add = (size: number) =>
      new Promise<boolean>((done) => {
        const transaction = db.transaction("filling", "readwrite", { durability: "strict" });
        transaction.oncomplete = () => done(true);
        transaction.onabort = () => done(false);
        // Random, because what is kept is compressed.
        transaction.objectStore("filling").add(crypto.getRandomValues(new Uint8Array(size)));
      });
    for (let size = 2 ** 16; size > 50; size /= 4) while (await add(size));
    db.close();
  });
}

const attributes = (page: Page) =>
  page.evaluate(() => {
    const { look, hand, text } = document.documentElement.dataset;
    const bars = [...document.querySelectorAll<HTMLMetaElement>("meta[name=theme-color]")].find(
      ({ media }) => !media || matchMedia(media).matches,
    );
    const { backgroundColor } = getComputedStyle(document.body);
    return { look, hand, text, bars: bars?.content, backgroundColor };
  });

/** Chooses in the settings, each by its question and answer. */
async function choose(page: Page, answers: Record<string, string>): Promise<void> {
  for (const [question, answer] of Object.entries(answers)) {
    const group = page.getByRole("group", { name: question });
    await group.getByRole("radio", { name: answer }).check();
  }
}

const NIGHT = { look: "night", bars: "#101214", backgroundColor: "rgb(16, 18, 20)" };

test("choices show at once, before anything is painted after a reload, on every page and in every tab", async ({
  page,
  context,
  product,
}) => {
  product.allowError(/status of 401/);
  await readyPhone(page, product);
  const second = await context.newPage();
  await second.goto("/sign-in");
  expect(await attributes(second)).toMatchObject({ backgroundColor: "rgb(250, 248, 242)", bars: "#faf8f2" });

  await page.getByRole("link", { name: "Settings" }).click();
  await expect(page.getByRole("heading", { level: 1, name: "Settings" })).toBeFocused();
  await choose(page, { "Day and night": "Night", "Size of text": "Larger", "The hand": "Left" });
  expect(await attributes(page)).toEqual({ ...NIGHT, hand: "left", text: "125" });
  await expect.poll(() => attributes(second)).toEqual({ ...NIGHT, hand: "left", text: "125" });

  // What the document is like when its body begins, long before any script of the page has run.
  await page.addInitScript(() => {
    new MutationObserver((_, observer) => {
      if (!document.body) return;
      observer.disconnect();
      const { look, hand, text } = document.documentElement.dataset;
      const scripts = performance.getEntriesByType("resource").filter(({ name }) => name.endsWith(".js"));
      const ran = scripts.length > 0 && "next" in window;
      Object.assign(window, { atFirst: { look, hand, text, ran } });
    }).observe(document, { childList: true, subtree: true });
  });
  for (const path of ["/field?settings=1", "/field", "/sign-in", "/", "/desk"]) {
    await page.goto(path);
    expect(await page.evaluate(() => (window as unknown as { atFirst: object }).atFirst), path).toEqual({
      look: "night",
      hand: "left",
      text: "125",
      ran: false,
    });
    expect(await attributes(page), path).toMatchObject(NIGHT);
  }

  await page.goto("/field?settings=1");
  await expect(page.getByRole("radio", { name: "Night" })).toBeChecked();
  await choose(page, { "Day and night": "As the phone", "Size of text": "Usual", "The hand": "Right" });
  await expect
    .poll(() => attributes(second))
    .toEqual({ bars: "#faf8f2", backgroundColor: "rgb(250, 248, 242)" });
  await page.emulateMedia({ colorScheme: "dark" });
  expect(await attributes(page)).toMatchObject({ bars: "#101214", backgroundColor: NIGHT.backgroundColor });
  await choose(page, { "Day and night": "Day" });
  expect(await attributes(page)).toMatchObject({ bars: "#faf8f2", backgroundColor: "rgb(250, 248, 242)" });
});

test("a left hand has Good on its side, in the same order for a reader", async ({ page, product }) => {
  await readyPhone(page, product);
  await page.goto("/field?settings=1");
  const left = async (label: string) =>
    (await page.locator("[data-sample=acts]").getByText(label, { exact: true }).boundingBox())!.x;
  const order = () => page.locator("[data-sample=acts]").innerText();
  const [before, read] = [[await left("Good"), await left("Fault")], await order()];
  expect(before[0]).toBeLessThan(before[1]!);
  await choose(page, { "The hand": "Left" });
  expect(await left("Fault")).toBeLessThan(await left("Good"));
  expect(await order()).toBe(read);
});

test("sound and vibration: on by themselves, off by choice, tried with one tap", async ({
  page,
  product,
}) => {
  await page.addInitScript(() => {
    const log: unknown[] = [];
    Object.assign(window, { log });
    navigator.vibrate = (pattern) => Boolean(log.push(pattern));
    const { start } = OscillatorNode.prototype;
    OscillatorNode.prototype.start = function (when) {
      log.push([this.frequency.value, this.context.state]);
      start.call(this, when);
    };
  });
  const log = () => page.evaluate(() => (window as unknown as { log: unknown[] }).log.splice(0));
  await readyPhone(page, product);
  await page.goto("/field?settings=1");
  const attempt = () => page.getByRole("button", { name: "Hear and feel it" }).click();
  await attempt();
  await expect.poll(log).toEqual([
    [90, 90, 90],
    [660, "running"],
    [440, "running"],
  ]);
  await choose(page, { Sound: "Off" });
  await attempt();
  expect(await log()).toEqual([[90, 90, 90]]);
  await choose(page, { Vibration: "Off" });
  await attempt();
  await page.waitForTimeout(300);
  expect(await log()).toEqual([]);
});

test("rigs, settings and sign-in with the largest text need no sideways scrolling", async ({
  page,
  product,
}) => {
  product.allowError(/status of 401/);
  await page.setViewportSize({ width: 360, height: 740 });
  await page.addInitScript(() =>
    localStorage.setItem("hookfast-preferences", JSON.stringify({ text: "200" })),
  );
  const fits = async (path: string) => {
    await page.goto(path);
    await page.getByRole("heading", { level: 1 }).first().waitFor();
    await page.waitForTimeout(300);
    const wide = await page.evaluate(() =>
      [...document.querySelectorAll("body *")]
        .filter((element) => !element.closest("svg, .sr-only, next-route-announcer"))
        .filter((element) => element.getBoundingClientRect().right > window.innerWidth + 0.5)
        .map((element) => element.outerHTML.slice(0, 120)),
    );
    const { fontSize, scrolls } = await page.evaluate(() => ({
      fontSize: getComputedStyle(document.documentElement).fontSize,
      scrolls: document.documentElement.scrollWidth - window.innerWidth,
    }));
    expect({ wide, fontSize, scrolls }, path).toEqual({ wide: [], fontSize: "32px", scrolls: 0 });
  };
  await fits("/sign-in");
  await readyPhone(page, product);
  await fits("/field");
  await fits("/field?settings=1");
});

for (const colorScheme of ["light", "dark"] as const) {
  test(`axe finds nothing in the settings, and every field target is 72 px, ${colorScheme}`, async ({
    page,
    product,
  }) => {
    await page.emulateMedia({ colorScheme });
    await readyPhone(page, product);
    await page.goto("/field?settings=1");
    await page.getByText(/used, about/).waitFor();
    expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
    const targets = page.getByRole("main").locator("button, a, label");
    expect(await targets.count()).toBeGreaterThan(15);
    for (const target of await targets.all()) {
      expect((await target.boundingBox())!.height, await target.innerText()).toBeGreaterThanOrEqual(72);
    }
  });
}

test("a full phone is said within a second, and the walk can be taken away as a file", async ({
  page,
  product,
}) => {
  await page.goto("/offline");
  await setQuota(page, product, 12_000_000);
  await readyPhone(page, product);
  await slowPhone(page);
  await startHookUp(page);
  await mark(page);
  await fill(page);
  const here = await ask(page).innerText();
  await page.waitForTimeout(SETTLED_MS);
  await page.getByRole("button", { name: good }).click();
  await expect(page.getByRole("main").getByRole("alert")).toBeVisible({ timeout: SAID_SLOWED_MS });
  await expect(ask(page)).toHaveText(here);

  await page.goBack();
  await page
    .getByRole("button", { name: /^Re-check/ })
    .first()
    .click();
  // It is said above everything and on the card that was tapped.
  const notice = page.locator("[data-trouble=full]").first();
  await expect(notice).toContainText("This phone’s storage is full", { timeout: SAID_SLOWED_MS });

  await page.getByRole("link", { name: "Settings" }).click();
  await expect(notice).toBeVisible();
  const download = page.waitForEvent("download");
  await notice.getByRole("button", { name: /^Export everything/ }).click();
  const file = await download;
  expect(file.suggestedFilename()).toMatch(/^hookfast-all-\d{4}-\d\d-\d\d\.ndjson$/);
  const types = readFileSync(await file.path(), "utf8")
    .trim()
    .split("\n")
    .map((line) => (JSON.parse(line) as { type?: string }).type ?? "revision");
  expect(types).toEqual(["revision", "open", "mark"]);
  await expect(notice).toContainText("Handed to the browser’s downloads: hookfast-all");

  await setQuota(page, product);
  await page.getByRole("link", { name: "Back to rigs" }).click();
  await page
    .getByRole("button", { name: /^Re-check/ })
    .first()
    .click();
  await expect(page.getByRole("button", { name: good })).toBeVisible();
  await page.goBack();
  await expect(page.locator("[data-trouble]")).toHaveCount(0);
});

test("a store deleted under a running walk is said within a second; this page still has the walk", async ({
  page,
  context,
  product,
}) => {
  await readyPhone(page, product);
  await slowPhone(page);
  await context.setOffline(true);
  await startHookUp(page);
  await mark(page);
  await page.evaluate(() => indexedDB.deleteDatabase("hookfast"));
  const notice = page.locator("[data-lost]");
  await expect(notice).toContainText("1 walk that had not been received", { timeout: SAID_SLOWED_MS });
  await expect(notice).toContainText(/Hook-up, .+, \d\d:\d\d/);
  const download = page.waitForEvent("download");
  await notice.getByRole("button", { name: "Export to a file" }).click();
  const file = await download;
  expect(file.suggestedFilename()).toMatch(/^hookfast-hook-up-\d{4}-\d\d-\d\d\.ndjson$/);
  const lines = readFileSync(await file.path(), "utf8")
    .trim()
    .split("\n");
  expect(lines.map((line) => (JSON.parse(line) as { type?: string }).type)).toEqual([
    undefined,
    "open",
    "mark",
  ]);
  await context.setOffline(false);
});

test("a store cleared between two visits: what is gone, and what would have kept it, until it is read", async ({
  page,
  context,
  product,
}) => {
  await readyPhone(page, product);
  await context.setOffline(true);
  await startHookUp(page);
  await mark(page);
  await page.close();
  const cleaner = await context.newPage();
  await context.setOffline(false);
  await cleaner.goto("/offline");
  await cleaner.evaluate(
    () => new Promise((done) => (indexedDB.deleteDatabase("hookfast").onsuccess = done)),
  );
  await cleaner.goto("/field");
  const notice = cleaner.locator("[data-lost='1']");
  await expect(notice).toBeVisible({ timeout: SAID_MS + 1_000 });
  await expect(notice).toContainText("This browser’s storage was cleared.");
  await expect(notice).toContainText("install Hookfast on the home screen");
  // The rigs come back by themselves.
  await expect(hookUp(cleaner)).toBeVisible();
  const second = await context.newPage();
  await second.goto("/field");
  await expect(second.locator("[data-lost='1']")).toBeVisible();
  await notice.getByRole("button", { name: "I have read this" }).click();
  await expect(notice).toHaveCount(0);
  await expect(second.locator("[data-lost]")).toHaveCount(0);
  await cleaner.reload();
  await expect(hookUp(cleaner)).toBeVisible();
  await expect(cleaner.locator("[data-lost]")).toHaveCount(0);
});

test("a store that refuses is said within a second, and the settings still open", async ({
  page,
  product,
}) => {
  await product.signIn(page, DRIVER);
  await page.addInitScript(() => {
    IDBFactory.prototype.open = () => {
      throw new DOMException("", "SecurityError");
    };
  });
  await page.goto("/field?settings=1");
  await expect(page.locator("[data-trouble=refused]")).toContainText("Private windows", {
    timeout: SAID_MS + 1_000,
  });
  await choose(page, { "Day and night": "Night" });
  expect(await attributes(page)).toMatchObject(NIGHT);
});

/** A later build: the same worker, a byte longer. */
async function laterBuild<T>(work: () => Promise<T>): Promise<T> {
  const before = readFileSync("public/sw.js");
  try {
    appendFileSync("public/sw.js", "// a later build\n");
    return await work();
  } finally {
    writeFileSync("public/sw.js", before);
  }
}

async function fetchUpdate(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const registration = await navigator.serviceWorker.ready;
    await registration.update();
    while (!registration.waiting) await new Promise((done) => setTimeout(done, 50));
  });
  // workbox-window tells of a waiting worker a moment later.
  await page.waitForTimeout(500);
}

const offer = (page: Page) => page.getByRole("region", { name: "A new version is ready" });
/** A mark on the page that a reload wipes. */
const stain = (page: Page) => page.evaluate(() => void Object.assign(window, { stained: true }));
const stained = (page: Page) => page.evaluate(() => "stained" in window);

test("a new version is not offered while a walk is open in any tab; after it, and taken, the walks are there", async ({
  page,
  context,
  product,
}) => {
  test.setTimeout(120_000);
  await readyPhone(page, product);
  await slowPhone(page);
  const rigs = await context.newPage();
  await rigs.goto("/field");
  await expect(hookUp(rigs)).toBeVisible();
  await laterBuild(async () => {
    await startHookUp(page);
    await mark(page);
    await fetchUpdate(page);
    await expect(rigs.getByRole("button", { name: /^Go on: hook-up/ })).toBeVisible();
    await rigs.waitForTimeout(1_000);
    await expect(offer(rigs)).toHaveCount(0);
    await mark(page);

    await callOff(page);
    await expect(page.getByRole("heading", { name: "Unfinished" })).toBeVisible();
    await expect(offer(rigs)).toBeVisible();
    await page.getByRole("link", { name: "Back to rigs" }).click();
    await expect(offer(page)).toBeVisible();

    await stain(page);
    await stain(rigs);
    await offer(page).getByRole("button", { name: "Use it now" }).click();
    await expect.poll(() => stained(page).catch(() => true)).toBe(false);
    await expect.poll(() => stained(rigs).catch(() => true)).toBe(false);
    await expect(page.getByRole("link", { name: /^Unfinished/ })).toBeVisible();
    await expect(offer(page)).toHaveCount(0);
  });
});

test("a tab with a walk keeps its page and goes on when the worker changes under it all the same", async ({
  page,
  product,
}) => {
  await readyPhone(page, product);
  await slowPhone(page);
  await startHookUp(page);
  await mark(page);
  await laterBuild(async () => {
    await fetchUpdate(page);
    await stain(page);
    await page.evaluate(async () => {
      const changed = new Promise((done) =>
        navigator.serviceWorker.addEventListener("controllerchange", done, { once: true }),
      );
      (await navigator.serviceWorker.ready).waiting?.postMessage({ type: "SKIP_WAITING" });
      await changed;
    });
    await mark(page);
    await product.stop();
    await mark(page);
    expect(await stained(page)).toBe(true);
    await page.reload();
    await tap(page, /^Only the phone was away/);
    await expect(page.getByText(/^4 of \d+$/)).toBeVisible();
  });
});

async function onPhoneWithHomeScreen(context: BrowserContext, standalone: boolean): Promise<void> {
  await context.addInitScript((installed) => {
    Object.defineProperty(Navigator.prototype, "standalone", { value: installed, configurable: true });
  }, standalone);
}

test("where the installed app keeps its own storage that is said before sign-in, and not inside it", async ({
  page,
  browser,
  product,
}) => {
  product.allowError(/status of 401/);
  await onPhoneWithHomeScreen(page.context(), false);
  await page.goto("/sign-in");
  const first = page.getByRole("heading", { name: "Before you sign in: install it" });
  await expect(first).toBeVisible();
  expect((await first.boundingBox())!.y).toBeLessThan((await page.getByLabel("Email").boundingBox())!.y);
  await expect(page.getByRole("list", { name: "Three steps" }).getByRole("listitem")).toHaveCount(3);
  expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);

  const installed = await browser.newContext({ baseURL: product.origin });
  await onPhoneWithHomeScreen(installed, true);
  const app = await installed.newPage();
  await app.goto("/sign-in");
  await expect(app.getByLabel("Email")).toBeVisible();
  await app.waitForTimeout(300);
  await expect(app.getByText(/install/i)).toHaveCount(0);
  await installed.close();
});

test("elsewhere: that a browser may clear, and the browser's own offer where it makes one", async ({
  page,
  product,
}) => {
  product.allowError(/status of 401/);
  await page.goto("/sign-in");
  await expect(page.getByText(/^A browser may clear/)).toBeVisible();
  await expect(page.getByRole("button", { name: "Install Hookfast" })).toHaveCount(0);
  await page.evaluate(() => {
    const offered = Object.assign(new Event("beforeinstallprompt", { cancelable: true }), {
      prompt: async () => {
        Object.assign(window, { asked: true });
        return { outcome: "accepted" };
      },
    });
    window.dispatchEvent(offered);
    Object.assign(window, { kept: offered.defaultPrevented });
  });
  await page.getByRole("button", { name: "Install Hookfast" }).click();
  expect(
    await page.evaluate(() => {
      const { asked, kept } = window as unknown as { asked: boolean; kept: boolean };
      return { asked, kept };
    }),
  ).toEqual({ asked: true, kept: true });
  await page.evaluate(() => window.dispatchEvent(new Event("appinstalled")));
  await expect(page.getByText(/^A browser may clear/)).toHaveCount(0);
});
