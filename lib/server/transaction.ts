import "server-only";
import { setTimeout as sleep } from "node:timers/promises";
import { DatabaseError, UniqueConstraintError, type Transaction } from "sequelize";
import { database } from "./database";

const ATTEMPTS = 6;
const DEADLOCK = 1213;
const LOCK_WAIT = 1205;

/**
 * Runs work in one transaction and repeats the whole of it when another one got in the way: a deadlock (on a cluster
 * also at commit), a lock wait that ran out, or a row that someone else inserted first.
 * @param work does everything by the transaction it is given and has no other effect
 */
export async function inTransaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await database().transaction(work);
    } catch (error) {
      if (attempt === ATTEMPTS || !wasInTheWay(error)) throw error;
      await sleep(attempt * 10 * (1 + Math.random()));
    }
  }
}

function wasInTheWay(error: unknown): boolean {
  if (error instanceof UniqueConstraintError) return true;
  const errno = error instanceof DatabaseError && (error.parent as { errno?: number }).errno;
  return errno === DEADLOCK || errno === LOCK_WAIT;
}
