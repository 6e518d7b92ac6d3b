import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { afterEach, beforeEach, expect, it } from "vitest";
import { scriptHashes, writePageHashes } from "@/scripts/page-hashes";

// The example of https://www.w3.org/TR/CSP2/#script-src-hash-usage; the others by openssl dgst -sha256 -binary | base64.
const hello = "sha256-qznLcsROx4GACP2dm0UCKCzCG+HiZ1guq6ZZDob/Tng=";
const one = "sha256-a4ayc/80/OGda4BO/1o/V0etpOqiLx1JwB5S3beHW0s=";
const two = "sha256-1HNeOiZeFu7gP1lxi5tdAwGcB9i2xR+Q2jpmbuwTqzU=";
const three = "sha256-TgdAhWK+24tgzgXB3s/jrRa3IjCWfeAfZAt+Rym0n84=";
const four = "sha256-SyJ3d9TdH8Ycb4hPSGQdArTRIdP9Moywi1Ux/Kzav4o=";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), "hookfast-test-"));
});
afterEach(() => rmSync(folder, { recursive: true }));

it("hashes inline scripts as they stand, each once, and no others", () => {
  const html = [
    "<script>alert('Hello, world.');</script>",
    "<script id=\"a\">alert('Hello, world.');</script>",
    '<script src="/a.js" async=""></script>',
    "<style>p{}</style>",
  ].join("\n");
  expect(scriptHashes(html)).toEqual([hello]);
});

it("keeps the hashes by address, and those of error pages for every address", () => {
  const write = (name: string, text: string) => {
    const file = path.join(folder, "server", name);
    mkdirSync(path.dirname(file), { recursive: true });
    writeFileSync(file, `<script>${text}</script>`);
  };
  write("app/index.html", "1");
  write("app/desk/walk.html", "2");
  write("app/_not-found.html", "3");
  write("pages/404.html", "3");
  write("pages/500.html", "4");
  writePageHashes(folder);
  expect(JSON.parse(readFileSync(path.join(folder, "csp.json"), "utf8"))).toEqual({
    pages: { "/": [one], "/desk/walk": [two] },
    anywhere: [three, four],
  });
});
