import { expect, test } from "../support/product";

const pages = ["/", "/sign-in", "/sign-up", "/join", "/field", "/offline"];

test.describe("headers", () => {
  for (const page of [...pages, "/no-such-page"]) {
    test(`${page} carries the policies`, async ({ request }) => {
      const headers = (await request.get(page)).headers();
      const policy = headers["content-security-policy"] ?? "";
      for (const part of [
        "default-src 'self'",
        "media-src 'self' blob:",
        "object-src 'none'",
        "base-uri 'none'",
        "frame-ancestors 'none'",
      ]) {
        expect(policy).toContain(part);
      }
      expect(policy).not.toContain("unsafe");
      // Servers in front of the product commonly refuse headers beyond four kilobytes.
      expect(policy.length).toBeLessThan(3000);
      expect(headers["x-content-type-options"]).toBe("nosniff");
      expect(headers["referrer-policy"]).toBe("same-origin");
      expect(headers["cross-origin-opener-policy"]).toBe("same-origin");
      expect(headers["permissions-policy"]).toContain("camera=(self)");
      expect(headers["strict-transport-security"]).toBeUndefined();
    });
  }

  for (const path of pages) {
    test(`${path} runs under its policy`, async ({ page, product }) => {
      // Nobody is signed in, and a page may ask.
      product.allowError(/status of 401/);
      // The guard on the browser's console fails this on any violation.
      await page.goto(path, { waitUntil: "networkidle" });
    });
  }

  test("an inline script that is not ours does not run", async ({ page, product }) => {
    product.allowError(/Content Security Policy/);
    await page.goto("/offline");
    await page.evaluate(() => {
      const script = document.createElement("script");
      script.textContent = "document.title = 'run';";
      document.body.append(script);
    });
    await expect(page).not.toHaveTitle("run");
  });
});

test.describe("another name of this machine", () => {
  test("leads to the page's own address", async ({ page, product }) => {
    await page.goto(`http://localhost:${product.port}/offline?a=1&b=%2F`);
    expect(page.url()).toBe(`${product.origin}/offline?a=1&b=%2F`);
  });

  test("answers the API as it is", async ({ request, product }) => {
    const answer = await request.get(`http://localhost:${product.port}/api/health`, { maxRedirects: 0 });
    expect(answer.status()).toBe(200);
  });

  test("cannot be abused to lead elsewhere", async ({ request, product }) => {
    for (const [host, path] of [
      ["evil.example", "/offline"],
      [`localhost:${product.port}`, "//evil.example/offline"],
      [`localhost:${product.port}`, "/%2F%2Fevil.example"],
    ] as const) {
      const answer = await request.get(`${product.origin}${path}`, {
        headers: { Host: host },
        maxRedirects: 0,
      });
      const { location } = answer.headers();
      if (location) expect(new URL(location, product.origin).host).toBe(`127.0.0.1:${product.port}`);
    }
  });
});
