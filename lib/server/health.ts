import "server-only";
import { setTimeout as sleep } from "node:timers/promises";
import { QueryTypes } from "sequelize";
import { database } from "./database";

const PATIENCE_MS = 2_000;

/** Whether the database answers within two seconds. A server that hangs is as bad as one that is gone. */
export async function databaseAnswers(): Promise<boolean> {
  const patience = new AbortController();
  const answer = database()
    .query("SELECT 1", { type: QueryTypes.SELECT })
    .then(
      () => true,
      () => false,
    );
  const late = sleep(PATIENCE_MS, false, { signal: patience.signal }).catch(() => false);
  return Promise.race([answer, late]).finally(() => patience.abort());
}
