import { randomUUID } from "node:crypto";
import { readFile } from "node:fs/promises";
import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { createConnection } from "mariadb";
import { digestOf } from "@/lib/domain/digest";
import { canonicalText } from "@/lib/domain/json";
import {
  listChangeWords,
  newerListWords,
  revisionsWords,
  rigsWords,
  rigWords,
  wiringReadingWords,
} from "@/lib/domain/messages/rigs";
import type { RevisionDocument } from "@/lib/domain/revision";
import type { RigReading, RigRow } from "@/lib/domain/rigs";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import type { Product } from "../support/product-process";
import { expect, test } from "../support/product";

const ABSENT = "00000000-0000-4000-8000-000000000001";

test.use({ viewport: { width: 1280, height: 800 }, hasTouch: false });

async function listed(page: Page): Promise<RigRow[]> {
  return ((await (await page.request.get("/api/rigs")).json()) as { rigs: RigRow[] }).rigs;
}

async function reading(page: Page, id: string): Promise<RigReading> {
  return (await (await page.request.get(`/api/rigs/${id}`)).json()) as RigReading;
}

/** The first rig of whoever signs in. */
async function firstRig(page: Page, product: Product, who: string): Promise<RigReading> {
  await product.signIn(page, who);
  return await reading(page, (await listed(page))[0]!.id);
}

/** Saves a sheet over the latest revision, as the form does. */
async function revise(page: Page, product: Product, rig: RigReading, sheet: object): Promise<void> {
  const answer = await page.request.post(`/api/rigs/${rig.id}/revisions`, {
    headers: { Origin: product.origin },
    data: { base: rig.revision.digest, sheet },
  });
  expect(answer.status()).toBe(201);
}

/** Puts a revision on a rig as an older catalogue would have made it: one question is put differently. */
async function olderList(product: Product, rig: RigReading): Promise<string> {
  const document = structuredClone(rig.document) as RevisionDocument;
  const check = document.list.stations[0]!.checks[0]!;
  const { ask } = check;
  check.ask = "Asked as it was asked before";
  document.catalogue = "hookfast 0";
  const connection = await createConnection(product.databaseUrl);
  try {
    await connection.query(
      "INSERT INTO revisions (id, rig_id, number, digest, document, created_at) VALUES (?, ?, ?, ?, ?, ?)",
      [
        randomUUID(),
        rig.id,
        rig.revision.number + 1,
        Buffer.from(digestOf(document), "hex"),
        Buffer.from(canonicalText(document)),
        new Date(),
      ],
    );
  } finally {
    await connection.end();
  }
  return ask;
}

const rows = (page: Page) => page.getByRole("table", { name: rigsWords.caption }).getByRole("row");
const sheetTitle = (page: Page) => page.getByRole("heading", { level: 2, name: rigWords.sheet, exact: true });
const sideways = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);

test("the rigs are those that the server lists, each one link to its sheet", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  const rigs = await listed(page);
  expect(rigs.length).toBeGreaterThan(1);
  await page.goto("/desk/rigs");
  await expect(rows(page)).toHaveCount(rigs.length + 1);
  for (const [at, rig] of rigs.entries()) {
    const row = rows(page).nth(at + 1);
    await expect(row.getByRole("link")).toHaveAttribute("href", `/desk/rig?id=${rig.id}`);
    await expect(row).toContainText(rig.keeper.name);
    await expect(row).toContainText(rigsWords.revision(rig.revision.number));
    await expect(row.getByText(rigsWords.doNotTow)).toHaveCount(rig.ruledOut.length > 0 ? 1 : 0);
  }
  await expect(page.getByRole("link", { name: rigsWords.newRig })).toHaveAttribute(
    "href",
    /^\/desk\/sheet\?new=[0-9a-f-]{36}$/,
  );
});

test("a rig is read back: its sheet, its wiring, its manual's end state, and the length of its walks", async ({
  page,
  product,
}) => {
  const rig = await firstRig(page, product, "driver@demo.example");
  const sheet = rig.document.sheet as unknown as Sheet;
  await page.goto(`/desk/rig?id=${rig.id}`);
  await expect(page.getByRole("heading", { level: 1, name: rig.name })).toBeVisible();
  await expect(page.getByText(sheet.procedure!.endState!)).toBeVisible();
  for (const { from, to, conductors } of sheet.wiring!.segments!) {
    const table = page.getByRole("table", { name: wiringReadingWords.title(from!, to!) });
    await expect(table.getByRole("row")).toHaveCount(conductors!.length + 1);
  }
  const walk = page.getByRole("row", { name: /^Hook-up/ });
  const { full, short } = rig.document.walks["hook-up"];
  await expect(walk.getByRole("cell")).toHaveText([String(full.length), String(short.length)]);
  await expect(page.getByRole("link", { name: rigWords.review })).toHaveAttribute(
    "href",
    `/desk/list?rig=${rig.id}`,
  );
});

test("the sheet is exported as the server has it", async ({ page, product }) => {
  const rig = await firstRig(page, product, "driver@demo.example");
  await page.goto(`/desk/rig?id=${rig.id}`);
  const started = page.waitForEvent("download");
  await page.getByRole("button", { name: rigWords.export }).click();
  const download = await started;
  expect(download.suggestedFilename()).toMatch(/\.sheet\.json$/);
  const text = await readFile(await download.path(), "utf8");
  expect(canonicalText(JSON.parse(text))).toBe(canonicalText(rig.document.sheet));
});

test("an auditor reads a rig and has no way to write one", async ({ page, product }) => {
  const rig = await firstRig(page, product, "auditor@demo.example");
  await page.goto("/desk/rigs");
  await expect(rows(page).nth(1)).toBeVisible();
  await expect(page.getByRole("link", { name: rigsWords.newRig })).toHaveCount(0);
  await page.goto(`/desk/rig?id=${rig.id}`);
  await expect(sheetTitle(page)).toBeVisible();
  await expect(page.getByRole("link", { name: rigWords.edit })).toHaveCount(0);
  await expect(page.getByRole("button", { name: rigWords.export })).toBeVisible();
});

test("a driver of a fleet reads its rigs and has no way to write one", async ({ page, product }) => {
  const rig = await firstRig(page, product, "fleet-driver@demo.example");
  await page.goto(`/desk/rig?id=${rig.id}`);
  await expect(sheetTitle(page)).toBeVisible();
  await expect(page.getByRole("link", { name: rigWords.edit })).toHaveCount(0);
});

test("two revisions compare field by field, a wire of two functions asks for a tag, and a walk keeps its own", async ({
  page,
  product,
}) => {
  const rig = await firstRig(page, product, "driver@demo.example");
  const sheet = structuredClone(rig.document.sheet) as unknown as {
    wiring: { segments: { conductors: { far: string }[] }[] };
    procedure: { page: string };
  };
  sheet.wiring.segments[0]!.conductors[1]!.far = "left";
  sheet.procedure.page = "215";
  await revise(page, product, rig, sheet);

  await page.goto(`/desk/rig?id=${rig.id}`);
  await expect(page.getByText(/^One color, two functions: yellow is/)).toBeVisible();
  await expect(page.getByText(wiringReadingWords.tagWanted)).toBeVisible();
  await page.emulateMedia({ media: "print" });
  await expect(page.getByText(wiringReadingWords.tagWanted)).toBeVisible();
  await page.emulateMedia({ media: "screen" });

  await page.getByRole("link", { name: revisionsWords.changedIn(rig.revision.number + 1) }).click();
  await expect(
    page.getByRole("heading", {
      level: 1,
      name: revisionsWords.comparing(rig.revision.number + 1, rig.revision.number),
    }),
  ).toBeVisible();
  const changed = page.getByRole("listitem").filter({ has: page.locator("ins") });
  await expect(changed.filter({ hasText: "Page" }).locator("del").first()).toHaveText("214");
  await expect(changed.filter({ hasText: "Page" }).locator("ins").first()).toHaveText("215");
  await expect(changed.filter({ hasText: "Wire 2" }).locator("ins")).toHaveText("Left turn");
  await expect(page.getByRole("heading", { name: revisionsWords.listChanges })).toBeVisible();

  await page.getByLabel(revisionsWords.laterOf).selectOption(rig.revision.digest);
  await expect(page.getByText(revisionsWords.nothingOnSheet)).toBeVisible();
  await expect(page.getByText(revisionsWords.nothingOnList)).toBeVisible();

  await page.goto("/desk");
  await page.getByRole("table").getByRole("row").nth(1).getByRole("link").click();
  await page.getByRole("link", { name: revisionsWords.asItWas }).click();
  await expect(page.getByText(/^This is revision \d+ as it was\./)).toBeVisible();
  await expect(page.getByRole("link", { name: rigWords.edit })).toHaveCount(0);
});

test("a newer list shows what would change, and is taken by whoever may", async ({ page, product }) => {
  const rig = await firstRig(page, product, "manager@demo.example");
  const ask = await olderList(product, rig);

  await product.signIn(page, "auditor@demo.example");
  await page.goto(`/desk/rig?id=${rig.id}`);
  await expect(page.getByRole("heading", { name: newerListWords.title })).toBeVisible();
  await expect(page.getByText(newerListWords.reader)).toBeVisible();
  await expect(page.getByRole("button", { name: newerListWords.take })).toHaveCount(0);

  await product.signIn(page, "manager@demo.example");
  await page.goto(`/desk/rig?id=${rig.id}`);
  const change = page.getByRole("listitem").filter({ hasText: listChangeWords.members.ask! });
  await expect(change.locator("del")).toHaveText("Asked as it was asked before");
  await expect(change.locator("ins")).toHaveText(ask);
  await page.getByRole("button", { name: newerListWords.take }).click();
  await expect(page.getByText(newerListWords.taken(rig.revision.number + 2))).toBeVisible();
  await expect(page.getByRole("heading", { name: newerListWords.title })).toHaveCount(0);
  expect((await reading(page, rig.id)).revision.digest).toBe(rig.revision.digest);
});

for (const [what, path] of [
  ["an id without a rig", `/desk/rig?id=${ABSENT}`],
  ["no id", "/desk/rig"],
] as const) {
  test(`${what}: says that there is no such rig`, async ({ page, product }) => {
    product.allowError(/status of 404/);
    await product.signIn(page, "manager@demo.example");
    await page.goto(path);
    await expect(page.getByText(rigWords.goneTitle)).toBeVisible();
    await page.getByRole("link", { name: rigWords.toRigs }).click();
    await expect(rows(page).nth(1)).toBeVisible();
  });
}

test("without the server the rigs say so and come on a second try", async ({ page, product }) => {
  await product.signIn(page, "manager@demo.example");
  await page.route("**/api/rigs", (route) => route.abort());
  product.allowError(/ERR_FAILED/);
  await page.goto("/desk/rigs");
  await expect(page.getByText("Hookfast cannot be reached from here")).toBeVisible();
  await page.unroute("**/api/rigs");
  await page.getByRole("button", { name: "Try again" }).click();
  await expect(rows(page).nth(1)).toBeVisible();
});

test("text at twice its size fits at 360 px", async ({ page, product }) => {
  await page.setViewportSize({ width: 360, height: 800 });
  const rig = await firstRig(page, product, "driver@demo.example");
  for (const path of ["/desk/rigs", `/desk/rig?id=${rig.id}`]) {
    await page.goto(path);
    await expect(rows(page).nth(1).or(sheetTitle(page)).first()).toBeVisible();
    await page.evaluate(() => (document.documentElement.style.fontSize = "200%"));
    expect(await sideways(page)).toBe(0);
  }
});

for (const width of [390, 1280]) {
  for (const colorScheme of ["light", "dark"] as const) {
    test(`axe finds nothing at ${width} px, ${colorScheme}`, async ({ page, product }) => {
      // Three pages, one of them a whole sheet: axe takes its time over it on a slow machine.
      test.setTimeout(180_000);
      await page.setViewportSize({ width, height: 800 });
      await page.emulateMedia({ colorScheme });
      const rig = await firstRig(page, product, "driver@demo.example");
      const [latest, before] = rig.revisions;
      const paths = ["/desk/rigs", `/desk/rig?id=${rig.id}`];
      if (before) paths.push(`/desk/rig?id=${rig.id}&from=${before.digest}&to=${latest!.digest}`);
      for (const path of paths) {
        await page.goto(path);
        const there = rows(page).nth(1).or(sheetTitle(page)).or(page.getByText(revisionsWords.sheetChanges));
        await expect(there.first()).toBeVisible();
        expect(await sideways(page)).toBe(0);
        expect((await new AxeBuilder({ page }).analyze()).violations).toEqual([]);
      }
    });
  }
}
