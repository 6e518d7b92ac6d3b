import { chooseAddress } from "./address";
import { loadEnvFile } from "./environment";
import { serve } from "./next";
import { prepareData, enterDataDirectory } from "./product-data";
import { runScript } from "./shutdown";

await runScript(async () => {
  loadEnvFile();
  await enterDataDirectory();
  await chooseAddress(process.env);
  await prepareData();
  return await serve("dev", ({ origin }) =>
    console.log(`\nHookfast, reloading as you edit, is at ${origin}\n`),
  );
}, 0);
