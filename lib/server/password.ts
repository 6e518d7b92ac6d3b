import "server-only";
import { hash, verify } from "@node-rs/argon2";

/** OWASP's recommended minimum for argon2id (the package's default kind): 19 MiB, two passes, one lane. */
const COST = { memoryCost: 19 * 1024, timeCost: 2, parallelism: 1 };

/** Made at {@link COST} of random bytes that nobody kept: an unknown address costs the same time as a known one. */
const NOBODYS =
  "$argon2id$v=19$m=19456,t=2,p=1$WFBVV69SuAiWV8V6msngOQ$uEgvGH7z2B3Kg56COFLH014XaaM8Dc5OZ5kQKKSBVAE";

/** The argon2id hash of a password in its own text form, parameters and salt included. */
export async function hashPassword(password: string): Promise<string> {
  return hash(password, COST);
}

/**
 * Whether a password is the one that was hashed.
 * @param stored null for a member who does not exist: false, in the same time
 */
export async function verifyPassword(stored: string | null, password: string): Promise<boolean> {
  const right = await verify(stored ?? NOBODYS, password);
  return right && stored !== null;
}
