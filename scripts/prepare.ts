import { loadEnvFile } from "./environment";
import { prepareDatabase } from "./schema";
import { runScript } from "./shutdown";

// Migrates the database that DATABASE_URL names and sees to a receipt key, without serving anything.
await runScript(async () => {
  loadEnvFile();
  await prepareDatabase({ demo: process.env.DEMO === "1" });
  const { ensureServerKey } = await import("@/lib/server/server-key");
  await ensureServerKey();
  return 0;
}, 1);
