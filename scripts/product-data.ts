import path from "node:path";
import { root } from "./environment";
import { joinDataDirectory, provideServer } from "./mariadb";

/** Where this checkout keeps its data, as a full path: children may run elsewhere. */
export function dataDirectory(): string {
  return path.resolve(root, process.env.DATA_DIR || ".data");
}

/** Takes part in the data directory until this process ends, after clearing up behind runs that were killed. */
export async function enterDataDirectory(): Promise<void> {
  await joinDataDirectory(dataDirectory());
}

/**
 * Sees to a database that is migrated and, if it is ours or DEMO asks for it, seeded, and to a key for receipts.
 * Leaves DATABASE_URL in the environment for the processes started after it.
 */
export async function prepareData(): Promise<{ hasDemo: boolean }> {
  const own = !process.env.DATABASE_URL;
  process.env.DATABASE_URL ||= await provideServer(dataDirectory(), true);
  const demo = own ? process.env.DEMO !== "0" : process.env.DEMO === "1";
  // Imported only now: these read the settings, and the settings are read once.
  const { prepareDatabase } = await import("./schema");
  const { ensureServerKey } = await import("@/lib/server/server-key");
  const { closeDatabase } = await import("@/lib/server/database");
  const prepared = await prepareDatabase({ demo });
  await ensureServerKey();
  await closeDatabase();
  return prepared;
}
