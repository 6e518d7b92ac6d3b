import { loadEnvFile } from "./environment";
import { build, buildIfOlder } from "./production-build";
import { runScript } from "./shutdown";

await runScript(async () => {
  loadEnvFile();
  if (process.argv.includes("--if-older")) await buildIfOlder();
  else await build();
  return 0;
}, 1);
