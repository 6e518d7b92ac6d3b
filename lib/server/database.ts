import "server-only";
import * as mariadb from "mariadb";
import { Sequelize, Transaction, type Options } from "sequelize";
import { bindModels, type Tables } from "@/models";
import { settings } from "./settings";

const options: Options = {
  dialect: "mariadb",
  dialectModule: mariadb,
  timezone: "+00:00",
  isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED,
  logging: false,
  define: { timestamps: false, underscored: true },
  // A waiting request gives up before its phone does, and answers 503.
  pool: { max: 10, min: 0, acquire: 10_000, idle: 5_000, evict: 1_000 },
  dialectOptions: {
    connectTimeout: 5_000,
    // Silence on a connection in use means a server that is gone; the pool lets idle ones go sooner than this.
    socketTimeout: 15_000,
    initSql: "SET SESSION innodb_lock_wait_timeout = 5",
    // DECIMAL is then always a string and BIGINT always a number, checked.
    supportBigNumbers: false,
    bigNumberStrings: false,
    bigIntAsNumber: true,
    insertIdAsNumber: true,
    checkNumberRange: true,
    decimalAsNumber: false,
  },
};

const shared = globalThis as { hookfastDatabase?: Sequelize };

/** The one connection pool of this process, whatever reloads or bundles around it. Opens nothing until it is used. */
export function database(): Sequelize {
  shared.hookfastDatabase ??= new Sequelize(settings.DATABASE_URL, options);
  return shared.hookfastDatabase;
}

/** Every table, bound to {@link database}. */
export function tables(): Tables {
  return bindModels(database());
}

/** Ends every connection; the next call of {@link database} opens a new pool. */
export async function closeDatabase(): Promise<void> {
  const open = shared.hookfastDatabase;
  shared.hookfastDatabase = undefined;
  await open?.close();
}
