import { defineConfig } from "@playwright/test";

const asRoot = process.getuid?.() === 0 ? ["--no-sandbox"] : [];

export default defineConfig({
  testDir: "tests/e2e",
  testMatch: "**/*.test.ts",
  // Each file has a product of its own, which its tests stop and start: files side by side, tests one after another.
  workers: 2,
  // One more try: a machine that stood still for a moment is not a fault. The report counts such a test as flaky.
  retries: 1,
  timeout: 60_000,
  expect: { timeout: 10_000 },
  use: {
    // A phone held upright; a desk test widens it with test.use.
    viewport: { width: 390, height: 844 },
    hasTouch: true,
    locale: "en-US",
    timezoneId: "America/Denver",
    screenshot: "only-on-failure",
    launchOptions: {
      executablePath: process.env.CHROMIUM ?? "/usr/bin/chromium",
      // A browser under test talks to the product and to nobody else.
      args: [
        ...asRoot,
        ..."background-networking component-update sync".split(" ").map((x) => `--disable-${x}`),
        "--no-first-run",
      ],
    },
  },
});
