import { defineConfig, globalIgnores } from "eslint/config";
import next from "eslint-config-next/core-web-vitals";
import typescript from "eslint-config-next/typescript";

/** What each room may not import: lib/ has three rooms because code can run in three places. */
const zones = [
  ["./lib/domain", ["./app", "./components", "./lib/client", "./lib/server", "./models", "./service-worker"]],
  ["./lib/client", ["./app", "./components", "./lib/server", "./models", "./service-worker"]],
  ["./lib/server", ["./app", "./components", "./lib/client", "./service-worker"]],
  ["./models", ["./app", "./components", "./lib/client", "./lib/server", "./service-worker"]],
  ["./components", ["./app", "./lib/server", "./models", "./service-worker"]],
  ["./app/api", ["./components", "./lib/client", "./service-worker"]],
  ["./service-worker", ["./app", "./components", "./lib/server", "./models"]],
].map(([target, from]) => ({
  target,
  from,
  message: "See DEVELOPERS.md, Rooms: this room may not reach into that one.",
}));

export default defineConfig([
  ...next,
  ...typescript,
  {
    settings: { "import/resolver": { typescript: { project: "./tsconfig.json" } } },
    rules: {
      "import/no-restricted-paths": ["error", { zones, basePath: import.meta.dirname }],
      "no-console": "error",
    },
  },
  { files: ["scripts/**"], rules: { "no-console": "off" } },
  globalIgnores([".next/**", ".data/**", "public/sw.js", "next-env.d.ts", "test-results/**"]),
]);
