import { createHash } from "node:crypto";
import { createConnection } from "mariadb";
import { afterAll, beforeAll, expect } from "vitest";

/**
 * Gives this test file a migrated database of its own and drops it at the end. Call it at the top of the file, before
 * anything asks `database()` for a connection; `{ demo: true }` seeds the demo into it.
 */
export function freshDatabase(wanted: { demo?: boolean } = {}): void {
  const server = process.env.TEST_DATABASE_SERVER;
  if (!server) throw new Error("These tests need a database server: run them with npm test -- server.");
  const name = databaseName();

  beforeAll(async () => {
    await administer(server, [`DROP DATABASE IF EXISTS ${name}`, `CREATE DATABASE ${name}`]);
    process.env.DATABASE_URL = `${server}/${name}`;
    const { settings } = await import("@/lib/server/settings");
    if (settings.DATABASE_URL !== process.env.DATABASE_URL) {
      throw new Error("Something read the settings before freshDatabase could set DATABASE_URL.");
    }
    const { prepareDatabase } = await import("@/scripts/schema");
    await prepareDatabase({ demo: wanted.demo === true });
  }, 60_000);

  afterAll(async () => {
    const { closeDatabase } = await import("@/lib/server/database");
    await closeDatabase();
    await administer(server, [`DROP DATABASE IF EXISTS ${name}`]);
  });
}

/** One name per test file and run: files run side by side, and so may two checkouts' worth of runs. */
function databaseName(): string {
  const file = expect.getState().testPath ?? "";
  return `hookfast_t_${createHash("sha256").update(file).digest("hex").slice(0, 12)}_${process.pid}`;
}

async function administer(server: string, statements: string[]): Promise<void> {
  const connection = await createConnection(`${server}/information_schema`);
  try {
    for (const statement of statements) await connection.query(statement);
  } finally {
    await connection.end();
  }
}
