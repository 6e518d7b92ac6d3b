import type { Page } from "@playwright/test";
import { expect, test } from "../support/product";
import { ask, good, readyPhone, startHookUp, storedEntries, tap } from "../support/walking";

/** A hook-up at its lamp check. */
async function atTheLamps(page: Page, product: Parameters<typeof readyPhone>[1]): Promise<void> {
  await readyPhone(page, product);
  await startHookUp(page);
  await tap(page, /^Show the stations/);
  await tap(page, /^Car tail/);
  await expect(ask(page)).toHaveText("Tail lamps");
}

const lampMarks = async (page: Page) =>
  (await storedEntries(page)).filter(({ body }) => body.check === "lamps").map(({ body }) => body);

async function answer(page: Page, name: RegExp): Promise<void> {
  const signal = await ask(page).innerText();
  await tap(page, name);
  await expect(ask(page)).not.toHaveText(signal);
}

test("seven signals as drawn are good, and every one is saved as it is answered", async ({
  page,
  product,
}) => {
  test.setTimeout(120_000);
  await atTheLamps(page, product);
  for (let signal = 1; signal < 7; signal += 1) {
    await expect(page.getByText(`signal ${signal} of 7`)).toBeVisible();
    await answer(page, good);
    expect((await lampMarks(page)).at(-1)).toMatchObject({ outcome: "unseen" });
  }
  await answer(page, good);
  const last = (await lampMarks(page)).at(-1)!;
  expect(last.outcome).toBe("good");
  expect(Object.keys(last.seen as object)).toHaveLength(7);
  expect(last.seen).toMatchObject({ "stop-left": { left: "flashing", right: "steady" } });
});

test("one lamp odd is a fault, with what it did", async ({ page, product }) => {
  await atTheLamps(page, product);
  await answer(page, good);
  await tap(page, /^Odd/);
  await tap(page, /^Save as odd/);
  await expect(page.getByText("Touch the lamp that is odd.")).toBeVisible();
  await tap(page, /^Left lamp/);
  await tap(page, /^Dim/);
  await answer(page, /^Save as odd/);
  expect((await lampMarks(page)).at(-1)).toMatchObject({
    outcome: "fault",
    seen: { tail: { left: "steady", right: "steady" }, left: { left: "dim", right: "dark" } },
  });
});

test("a double tap on a signal answers it once", async ({ page, product }) => {
  await atTheLamps(page, product);
  await page.waitForTimeout(700);
  await page.getByRole("button", { name: good }).dblclick();
  await expect(ask(page)).toHaveText("Left turn");
  await page.waitForTimeout(700);
  await expect(ask(page)).toHaveText("Left turn");
});

test("a second phone prompts the driver in step with the board", async ({ page, context, product }) => {
  test.setTimeout(120_000);
  await atTheLamps(page, product);
  const prompter = await context.newPage();
  await prompter.goto("/field?prompt=lamps");
  await tap(page, /^With two, or alone/);
  await tap(page, /^A second phone/);
  for (const each of [page, prompter]) await each.clock.install();
  // Ten seconds past a minute: both wait for the same half minute.
  const minuteMs = (Math.ceil(Date.now() / 60_000) + 1) * 60_000;
  for (const each of [page, prompter]) await each.clock.pauseAt(minuteMs + 10_000);
  const start = async (each: Page) => {
    await each.clock.runFor(700);
    await each.getByRole("button", { name: /^Start together/ }).click();
  };
  await start(page);
  await start(prompter);
  for (const [at, shown] of [
    [31_000, "Tail lamps"],
    [39_000, "Left turn"],
    [47_000, "Right turn"],
  ] as const) {
    for (const each of [page, prompter]) {
      const nowMs = await each.evaluate(() => Date.now());
      await each.clock.runFor(minuteMs + at - nowMs);
    }
    await expect(ask(page)).toHaveText(shown);
    await expect(prompter.getByText(shown.split(" ")[0]!).first()).toBeVisible();
  }
});

test("alone: a filmed clip is marked, looked at signal by signal, and named in the note", async ({
  page,
  product,
}) => {
  test.setTimeout(120_000);
  await atTheLamps(page, product);
  await tap(page, /^With two, or alone/);
  await tap(page, /^Alone, from a filmed clip/);
  const clip = await filmed(page);
  await page
    .locator("input[type=file]")
    .first()
    .setInputFiles({ name: "tail.webm", mimeType: "video/webm", buffer: clip });
  await tap(page, /^Here/);
  for (let signal = 2; signal <= 7; signal += 1) await tap(page, /^Not in the clip/);
  await expect(page.locator("video")).toBeVisible();
  await expect(ask(page)).toHaveText("Tail lamps");
  await answer(page, good);
  expect((await lampMarks(page)).at(-1)).toMatchObject({
    note: expect.stringMatching(/^From a filmed clip: tail/),
  });
});

/** A second of moving picture, made by the browser itself. */
async function filmed(page: Page): Promise<Buffer> {
  const base64 = await page.evaluate(async () => {
    const canvas = document.createElement("canvas");
    const paint = canvas.getContext("2d")!;
    const recorder = new MediaRecorder(canvas.captureStream(10), { mimeType: "video/webm" });
    const parts: Blob[] = [];
    recorder.ondataavailable = ({ data }) => parts.push(data);
    const done = new Promise((stopped) => (recorder.onstop = stopped));
    recorder.start();
    for (let frame = 0; frame < 12; frame += 1) {
      paint.fillRect(frame, frame, 40, 40);
      await new Promise((next) => setTimeout(next, 100));
    }
    recorder.stop();
    await done;
    const bytes = new Uint8Array(await new Blob(parts).arrayBuffer());
    return btoa(bytes.reduce((text, byte) => text + String.fromCharCode(byte), ""));
  });
  return Buffer.from(base64, "base64");
}

test("a brake is idle by its lamps, or by pedal and unit where they cannot show it", async ({
  page,
  product,
}) => {
  test.setTimeout(120_000);
  await readyPhone(page, product);
  await startHookUp(page);
  const toBrake = async () => {
    await tap(page, /^Show the stations/);
    await tap(page, /^Car cabin/);
    while ((await ask(page).innerText()) !== "Box ready, pedal all the way up") await answer(page, good);
  };
  await toBrake();
  await tap(page, /^They light/);
  await answer(page, /^Dark$/);
  await tap(page, /^Back one/);
  await tap(page, /^They stay dark/);
  await tap(page, /^All the way up/);
  await answer(page, /^Both idle/);
  const notes = (await storedEntries(page))
    .filter(({ body }) => body.check === "brake-ready")
    .map(({ body }) => body);
  expect(notes).toMatchObject([
    { outcome: "good", note: "Idle shown by the stop lamps: lit with the pedal pressed, dark with it up." },
    { outcome: "good", note: expect.stringContaining("Feel the wheels at the first stop.") },
  ]);
});
