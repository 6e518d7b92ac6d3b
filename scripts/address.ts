import { PlainError } from "./environment";
import { firstFreePort, isFree } from "./ports";

/** Where the product listens, how people reach it, and the port that was in use if it had to take another one. */
export type Address = { host: string; port: number; origin: string; insteadOf?: number };

/**
 * Settles where to listen and refuses an environment that cannot work. A port that was asked for, by PORT or by an
 * ORIGIN that belongs to it, is taken or refused; otherwise the next free one will do, and ORIGIN follows.
 */
export async function chooseAddress(env: NodeJS.ProcessEnv): Promise<Address> {
  const { readSettings } = await import("@/lib/server/settings");
  const { HOST: host, PORT: wanted } = plainly(() => readSettings(env));
  const asked = Boolean(env.PORT || env.ORIGIN);
  if (asked && !(await isFree(wanted, host))) {
    throw new PlainError(`Port ${wanted} is in use. Stop what uses it, or set PORT to another number.`);
  }
  const port = asked ? wanted : await firstFreePort(wanted, host);
  const { ORIGIN: origin } = readSettings({ ...env, PORT: String(port) });
  return { host, port, origin, ...(port === wanted ? {} : { insteadOf: wanted }) };
}

/** What is wrong with a setting is for the person who set it: a sentence, without a stack. */
function plainly<Result>(read: () => Result): Result {
  try {
    return read();
  } catch (error) {
    throw new PlainError((error as Error).message);
  }
}
