import path from "node:path";
import { defineConfig } from "vitest/config";

const root = import.meta.dirname;

/** A project per place where code runs; tests/e2e belongs to Playwright. */
const project = (name: string) => ({
  extends: true as const,
  test: { name, include: [`tests/${name}/**/*.test.{ts,tsx}`] },
});

export default defineConfig({
  resolve: {
    alias: {
      "@": root,
      // Outside of Next this package throws on purpose.
      "server-only": path.join(root, "node_modules/server-only/empty.js"),
    },
  },
  test: {
    environment: "node",
    // Linting and argon2 are slow on a busy machine; a test that hangs is still found.
    testTimeout: 30_000,
    setupFiles: ["tests/support/quiet-console.ts"],
    // Each file in a process of its own: modules here keep one database, one set of settings, one store.
    pool: "forks",
    maxWorkers: 2,
    projects: ["domain", "client", "server", "scripts"].map(project),
  },
});
