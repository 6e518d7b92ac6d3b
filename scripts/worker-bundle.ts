import { createHash } from "node:crypto";
import { existsSync, readFileSync } from "node:fs";
import path from "node:path";
import { build, stop } from "esbuild";
import { getManifest } from "workbox-build";
import { PlainError, root } from "./environment";

type Precached = { url: string; revision: string | null };

/** The documents a phone must be able to open with neither network nor server. */
const documents = {
  "/": "index",
  "/field": "field",
  "/desk/sheet": "desk/sheet",
  "/offline": "offline",
  "/sign-in": "sign-in",
};

/** Bundles `service-worker/` for a build, with the list of what to keep on the phone written into it. */
export async function bundleWorker(distDir: string): Promise<void> {
  const files = [...(await builtFiles(distDir)), ...(await publicFiles()), ...metadataFiles(distDir)];
  await build({
    absWorkingDir: root,
    entryPoints: ["service-worker/index.ts"],
    outfile: path.join(distDir, "sw.js"),
    bundle: true,
    format: "iife",
    minify: true,
    target: "es2020",
    logLevel: "warning",
    define: {
      "process.env.NODE_ENV": '"production"',
      PRECACHED_FILES: JSON.stringify(files),
      PRECACHED_DOCUMENTS: JSON.stringify(documentsOf(distDir)),
    },
  });
  await stop();
}

/** Next's own files carry their digest in the name, so that they need no revision. */
async function builtFiles(distDir: string): Promise<Precached[]> {
  const { polyfillFiles } = JSON.parse(readFileSync(path.join(distDir, "build-manifest.json"), "utf8")) as {
    polyfillFiles: string[];
  };
  const list = await getManifest({
    globDirectory: path.join(distDir, "static"),
    globPatterns: ["**/*.{js,css,woff2}"],
    // No browser that has service workers loads these.
    globIgnores: [...polyfillFiles.map((file) => file.replace("static/", "")), "**/_*Manifest.js"],
    modifyURLPrefix: { "": "/_next/static/" },
    dontCacheBustURLsMatching: /./,
    maximumFileSizeToCacheInBytes: 8 * 1024 * 1024,
  });
  return checked(list);
}

async function publicFiles(): Promise<Precached[]> {
  const list = await getManifest({
    globDirectory: path.join(root, "public"),
    // Icons only: README.md's picture lies here too.
    globPatterns: ["{icon,apple-touch-icon}*.png"],
    modifyURLPrefix: { "": "/" },
  });
  return checked(list);
}

function checked({ manifestEntries, warnings }: Awaited<ReturnType<typeof getManifest>>): Precached[] {
  if (warnings.length > 0) throw new PlainError(`The offline files are incomplete: ${warnings.join(" ")}`);
  return manifestEntries.map(({ url, revision }) => ({ url, revision }));
}

/** The manifest and icons that `app/` makes; Next keeps their bodies beside the documents. */
function metadataFiles(distDir: string): Precached[] {
  const names = ["manifest.webmanifest", "favicon.ico", "icon.svg", "icon.png", "apple-icon.png"];
  return names
    .map((name) => ({ url: `/${name}`, file: path.join(distDir, "server", "app", `${name}.body`) }))
    .filter(({ file }) => existsSync(file))
    .map(({ url, file }) => ({ url, revision: revisionOf(file) }));
}

function documentsOf(distDir: string): Precached[] {
  return Object.entries(documents).map(([url, name]) => {
    const file = path.join(distDir, "server", "app", `${name}.html`);
    if (!existsSync(file))
      throw new PlainError(`The page ${url} is not prerendered, so it could not open offline.`);
    return { url, revision: revisionOf(file) };
  });
}

function revisionOf(file: string): string {
  return createHash("sha256").update(readFileSync(file)).digest("hex").slice(0, 20);
}
