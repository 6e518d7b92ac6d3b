import { chooseAddress, type Address } from "./address";
import { loadEnvFile } from "./environment";
import { serve } from "./next";
import { prepareData, enterDataDirectory } from "./product-data";
import { buildIfOlder } from "./production-build";
import { runScript } from "./shutdown";

await runScript(async () => {
  loadEnvFile();
  await enterDataDirectory();
  // Before anything that takes long: an address that cannot be used should not cost a build.
  await chooseAddress(process.env);
  const { hasDemo } = await prepareData();
  await buildIfOlder();
  return await serve("start", (address) => console.log(greeting(address, hasDemo)));
}, 0);

function greeting({ origin, insteadOf }: Address, hasDemo: boolean): string {
  const moved = insteadOf
    ? [`Port ${insteadOf} is in use by something else, so this took the next free one.`]
    : [];
  const people = ["driver", "installer", "manager", "auditor"].map((name) => `  ${name}@demo.example`);
  const demo = ["The people of the demo, each with the password: walk the rig twice", ...people];
  return ["", ...moved, `Hookfast is at ${origin}`, ...(hasDemo ? demo : []), ""].join("\n");
}
