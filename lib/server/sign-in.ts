import "server-only";
import { createHash } from "node:crypto";
import { RateLimiterMemory } from "rate-limiter-flexible";
import type { Credentials, Member } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import { tables } from "./database";
import { verifyPassword } from "./password";

const FAILURES = 10;

const failures = new RateLimiterMemory({ points: FAILURES, duration: 5 * 60 });

/**
 * Checks an address and a password. An unknown address gets the same answer in the same time as a wrong password.
 * After ten failures for an address within five minutes even the right password is refused until that time is over.
 */
export async function checkCredentials({ email, password }: Credentials): Promise<Member | Problem> {
  const address = normalAddress(email);
  const key = createHash("sha256").update(address).digest("base64url");
  const before = await refusal(key);
  if (before) return before;
  const found = await memberAt(address);
  const right = await verifyPassword(found?.passwordHash ?? null, password);
  // Again, since other attempts may have failed meanwhile: many at once must not try more than ten passwords.
  const during = await refusal(key);
  if (during) return during;
  if (!right || !found) {
    await failures.penalty(key);
    return new Problem("wrong-credentials");
  }
  await failures.delete(key);
  return found.member;
}

/** An email address as it is stored and compared. */
export function normalAddress(email: string): string {
  return email.trim().toLowerCase();
}

async function refusal(key: string): Promise<Problem | null> {
  const state = await failures.get(key);
  if (!state || state.consumedPoints < FAILURES || state.msBeforeNext <= 0) return null;
  return new Problem("too-many-attempts", { retryAfterS: Math.ceil(state.msBeforeNext / 1000) });
}

async function memberAt(email: string): Promise<{ member: Member; passwordHash: string } | null> {
  const { Member, Organisation } = tables();
  const row = (await Member.findOne({
    where: { email },
    attributes: ["id", "name", "email", "role", "passwordHash"],
    include: { model: Organisation, as: "organisation", attributes: ["id", "name", "kind"] },
    raw: true,
    nest: true,
  })) as unknown as (Member & { passwordHash: string }) | null;
  if (!row) return null;
  const { passwordHash, ...member } = row;
  return { member, passwordHash };
}
