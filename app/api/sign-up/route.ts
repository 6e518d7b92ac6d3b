import { Problem } from "@/lib/domain/problem";
import { signUp } from "@/lib/server/contracts/sign-up";
import { serve } from "@/lib/server/serve";
import { beginSession, endSession, signedIn } from "@/lib/server/session";
import { signedUp } from "@/lib/server/sign-up";

export const POST = serve(signUp, async ({ request, body, raw }) => {
  const member = await signedUp(request, body, raw);
  if (member instanceof Problem) return member;
  const before = await signedIn(request);
  await endSession(before?.sessionId);
  return { status: 201, json: { member }, cookies: [await beginSession(member.id)] };
});
