import "server-only";
import { createHash } from "node:crypto";
import { RateLimiterMemory, RateLimiterRes } from "rate-limiter-flexible";
import { Problem } from "@/lib/domain/problem";

/** Sign-ups, whatever came of them: to one email address, and from one network address. */
export const SIGN_UPS = { toAddress: 5, fromNetwork: 30, withinS: 60 * 60 } as const;

const toAddress = new RateLimiterMemory({ points: SIGN_UPS.toAddress, duration: SIGN_UPS.withinS });
const fromNetwork = new RateLimiterMemory({ points: SIGN_UPS.fromNetwork, duration: SIGN_UPS.withinS });

/**
 * Counts a sign-up before anything is done about it. Successes count too: each one stores something for good, and a
 * refusal tells whether an address has an account.
 * @returns the refusal where there were too many, else null
 */
export async function countSignUp(request: Request, email: string): Promise<Problem | null> {
  try {
    await fromNetwork.consume(networkAddress(request));
    await toAddress.consume(createHash("sha256").update(email).digest("base64url"));
    return null;
  } catch (thrown) {
    if (!(thrown instanceof RateLimiterRes)) throw thrown;
    return new Problem("too-many-attempts", {
      retryAfterS: Math.max(1, Math.ceil(thrown.msBeforeNext / 1000)),
    });
  }
}

/**
 * Who the server in front says is calling: the last address of the header, which is the one that it has added itself;
 * those before it are the caller's own claim. Without a server in front Next writes the connection's address there.
 */
function networkAddress(request: Request): string {
  return request.headers.get("x-forwarded-for")?.split(",").at(-1)?.trim() || "unknown";
}
