import { createHash } from "node:crypto";
import { readdirSync } from "node:fs";
import path from "node:path";
import { pathToFileURL } from "node:url";
import { createConnection } from "mariadb";
import { QueryTypes, type QueryInterface, type Sequelize } from "sequelize";
import { SequelizeStorage, Umzug } from "umzug";
import { PlainError, root } from "./environment";

type Step = { context: QueryInterface };
type Migration = { up(step: Step): Promise<unknown>; down(step: Step): Promise<unknown> };

/**
 * Brings the database that DATABASE_URL names up to date and, when asked, seeds the demo into an empty one or keeps it current. Two
 * starts may do this at once: the second waits and finds everything done.
 */
export async function prepareDatabase(wanted: { demo: boolean }): Promise<{ hasDemo: boolean }> {
  const { database } = await import("@/lib/server/database");
  const { settings } = await import("@/lib/server/settings");
  return await whileLocked(settings.DATABASE_URL, async () => {
    await migrate(database());
    const empty = await isEmpty(database());
    if (wanted.demo && empty) console.log("Seeding the demo.");
    // One that stands already is completed and gets what its lists have gained.
    if (wanted.demo && (empty || (await holdsDemo(database())))) {
      await (await import("@/seeders/demo")).seedDemo();
    }
    return { hasDemo: await holdsDemo(database()) };
  });
}

/** Runs the migrations that this database has not seen yet, in the order of their numbers. */
export async function migrate(sequelize: Sequelize): Promise<void> {
  const folder = path.join(root, "migrations");
  const files = readdirSync(folder).filter((name) => /^\d{4}-[a-z0-9-]+\.ts$/.test(name));
  const umzug = new Umzug({
    migrations: files.sort().map((file) => ({
      name: path.basename(file, ".ts"),
      up: async (step: Step) => (await load(folder, file)).up(step),
      down: async (step: Step) => (await load(folder, file)).down(step),
    })),
    context: sequelize.getQueryInterface(),
    storage: new SequelizeStorage({ sequelize, tableName: "migrations" }),
    logger: undefined,
  });
  await umzug.up();
}

async function load(folder: string, file: string): Promise<Migration> {
  return (await import(pathToFileURL(path.join(folder, file)).href)) as Migration;
}

/** MariaDB cannot undo a CREATE TABLE, so a named lock of the server's keeps two migrating processes apart. */
async function whileLocked<Result>(url: string, task: () => Promise<Result>): Promise<Result> {
  const name = `hookfast-${createHash("sha256").update(new URL(url).pathname).digest("hex").slice(0, 32)}`;
  const connection = await createConnection(url).catch((error: Error) => {
    throw new PlainError(`The database that DATABASE_URL names cannot be reached: ${error.message}`);
  });
  try {
    // The lock is the connection's: it falls with it, however this process ends.
    await connection.query("SELECT GET_LOCK(?, 600)", [name]);
    return await task();
  } finally {
    await connection.end();
  }
}

async function isEmpty(sequelize: Sequelize): Promise<boolean> {
  return !(await finds(sequelize, "SELECT 1 FROM members LIMIT 1"));
}

async function holdsDemo(sequelize: Sequelize): Promise<boolean> {
  return await finds(sequelize, "SELECT 1 FROM members WHERE email = 'driver@demo.example'");
}

async function finds(sequelize: Sequelize, query: string): Promise<boolean> {
  return (await sequelize.query(query, { type: QueryTypes.SELECT })).length > 0;
}
