import path from "node:path";
import { expect, test, type Page } from "@playwright/test";
import { build } from "esbuild";
import { PHOTO } from "@/lib/domain/photo";
import { root } from "@/scripts/environment";
import { GPS_MARK, picture, segments, withGps } from "../support/picture-files";

// The part that needs a real browser and no screen of ours: how a file becomes the photograph that is kept.

type Taken = {
  base64: string;
  mime: string;
  widthPx: number;
  heightPx: number;
  left: number[];
  right: number[];
};
type Outcome = { taken: Taken } | { fault: string };

test.beforeEach(async ({ page }) => {
  const { outputFiles } = await build({
    entryPoints: [path.join(root, "lib/client/photo-taking.ts")],
    bundle: true,
    write: false,
    format: "iife",
    globalName: "taking",
    tsconfig: path.join(root, "tsconfig.json"),
  });
  await page.route("**/*", (route) =>
    route.fulfill({ contentType: "text/html", body: `<script>${outputFiles[0]!.text}</script>` }),
  );
  await page.goto("http://127.0.0.1/");
});

/** Takes the file as the product does, and looks at two of the kept picture's pixels. */
async function take(page: Page, file: Buffer, type = "image/jpeg"): Promise<Outcome> {
  return page.evaluate(
    async ({ base64, type }) => {
      const { takePhoto, PhotoFault } = (
        globalThis as unknown as { taking: typeof import("@/lib/client/photo-taking") }
      ).taking;
      const raw = Uint8Array.from(atob(base64), (char) => char.charCodeAt(0));
      try {
        const { bytes, ...taken } = await takePhoto(new Blob([raw], { type }));
        const shown = await createImageBitmap(new Blob([bytes], { type: taken.mime }));
        const canvas = new OffscreenCanvas(shown.width, shown.height);
        const context = canvas.getContext("2d")!;
        context.drawImage(shown, 0, 0);
        const pixel = (x: number) => [
          ...context.getImageData(Math.floor(x * shown.width), Math.floor(shown.height / 4), 1, 1).data,
        ];
        const chars = new Uint8Array(bytes).reduce((text, byte) => text + String.fromCharCode(byte), "");
        return { taken: { base64: btoa(chars), ...taken, left: pixel(0.25), right: pixel(0.75) } };
      } catch (error) {
        if (error instanceof PhotoFault) return { fault: error.code };
        throw error;
      }
    },
    { base64: file.toString("base64"), type },
  );
}

async function taken(page: Page, file: Buffer, type?: string): Promise<Taken & { bytes: Buffer }> {
  const outcome = await take(page, file, type);
  if ("fault" in outcome) throw new Error(outcome.fault);
  return { ...outcome.taken, bytes: Buffer.from(outcome.taken.base64, "base64") };
}

const isRed = ([red, , blue]: number[]) => red! > 150 && blue! < 60;
const isBlue = ([red, , blue]: number[]) => blue! > 150 && red! < 60;

test("where it was taken is gone, and everything else that is no pixel", async ({ page }) => {
  const file = withGps(await picture(page, 400, 300), 1);
  expect(file.includes(GPS_MARK)).toBe(true);
  expect(segments(file).map(({ marker }) => marker)).toContain("ffe1");
  const { bytes, left, right } = await taken(page, file);
  expect(bytes.includes(GPS_MARK)).toBe(false);
  expect(bytes.includes("Exif")).toBe(false);
  // Of the segments for applications and comments (ffe0 to ffef, fffe) only the JFIF header, and the color profile
  // that this browser gives every canvas.
  const beside = segments(bytes).filter(({ marker }) => marker >= "ffe0");
  expect(beside.map(({ marker, begins }) => [marker, begins.split("\0")[0]])).toEqual([
    ["ffe0", "JFIF"],
    ["ffe2", "ICC_PROFILE"],
  ]);
  expect([isRed(left), isBlue(right)]).toEqual([true, true]);
});

test("a phone held upright: the picture is turned, since what said so is gone", async ({ page }) => {
  // 6: the first row is on the right, so the left half of what is stored becomes the top.
  const file = withGps(await picture(page, 400, 300), 6);
  const { widthPx, heightPx, left, right } = await taken(page, file);
  expect([widthPx, heightPx]).toEqual([300, 400]);
  expect([isRed(left), isRed(right)]).toEqual([true, true]);
});

test("a large one comes down to 1600 pixels on its longer side, a small one stays", async ({ page }) => {
  expect(await taken(page, await picture(page, 4_000, 3_000))).toMatchObject({
    widthPx: 1600,
    heightPx: 1200,
  });
  expect(await taken(page, await picture(page, 900, 3_000))).toMatchObject({ widthPx: 480, heightPx: 1600 });
  expect(await taken(page, await picture(page, 640, 480))).toMatchObject({ widthPx: 640, heightPx: 480 });
});

test("one that compresses badly becomes coarser until it may be kept", async ({ page }) => {
  const { bytes, widthPx } = await taken(page, await picture(page, 1_600, 1_600, { noise: true }));
  expect(widthPx).toBe(1600);
  expect(bytes.length).toBeLessThanOrEqual(PHOTO.bytes);
  expect(bytes.length).toBeGreaterThan(PHOTO.bytes / 4);
});

test("a PNG or a WebP file becomes a JPEG, its see-through part white", async ({ page }) => {
  for (const type of ["image/png", "image/webp"]) {
    const { mime, left } = await taken(page, await picture(page, 40, 30, { type }), type);
    expect([mime, isRed(left)]).toEqual(["image/jpeg", true]);
  }
  const clear = await taken(
    page,
    await picture(page, 40, 30, { type: "image/png", clear: true }),
    "image/png",
  );
  expect(clear.left.slice(0, 3).every((part) => part > 250)).toBe(true);
});

test("what is no picture, or none that this browser knows, is told apart from a failure of ours", async ({
  page,
}) => {
  // The first bytes of a HEIC file, as some phones write by default.
  const heic = Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from("ftypheic\0\0\0\0mif1heic", "latin1")]);
  for (const [file, type] of [
    [heic, "image/heic"],
    [Buffer.from("%PDF-1.7"), "image/jpeg"],
    [Buffer.alloc(0), "image/jpeg"],
    [(await picture(page, 400, 300)).subarray(0, 20), "image/jpeg"],
  ] as const) {
    expect(await take(page, file, type)).toEqual({ fault: "unreadable" });
  }
});
