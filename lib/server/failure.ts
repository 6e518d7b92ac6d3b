import "server-only";
import { BaseError, ConnectionError } from "sequelize";
import { Problem } from "@/lib/domain/problem";
import { log } from "./log";

/** Seconds after which a phone may try again when the database does not answer. */
const RETRY_AFTER_S = 5;

// Server shut down, too many connections, connection killed, statement timed out, read only, lock wait, deadlock.
const PASSING = new Set([1053, 1040, 1927, 1969, 1290, 1205, 1213]);

/** The problem that stands for something thrown: 503 when it is the database that is away, else a bug, logged. */
export function problemOf(thrown: unknown): Problem {
  if (isUnavailable(thrown)) {
    log.warn({ err: thrown }, "the database does not answer");
    return unavailable();
  }
  log.error({ err: thrown }, "a request failed");
  return new Problem("internal");
}

/** The problem for a database that does not answer. */
export function unavailable(): Problem {
  return new Problem("unavailable", { retryAfterS: RETRY_AFTER_S });
}

function isUnavailable(thrown: unknown): boolean {
  if (thrown instanceof ConnectionError) return true;
  if (!(thrown instanceof BaseError)) return false;
  const cause = (thrown as { parent?: { errno?: number; fatal?: boolean } }).parent;
  return cause?.fatal === true || (cause?.errno !== undefined && PASSING.has(cause.errno));
}
