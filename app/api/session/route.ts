import { Problem } from "@/lib/domain/problem";
import { signIn, signOut, whoAmI } from "@/lib/server/contracts/session";
import { serve } from "@/lib/server/serve";
import { beginSession, endSession, signedIn } from "@/lib/server/session";
import { checkCredentials } from "@/lib/server/sign-in";

export const POST = serve(signIn, async ({ request, body }) => {
  const member = await checkCredentials(body);
  if (member instanceof Problem) return member;
  const before = await signedIn(request);
  await endSession(before?.sessionId);
  return { status: 200, json: { member }, cookies: [await beginSession(member.id)] };
});

export const GET = serve(whoAmI, async ({ member }) => ({ status: 200, json: { member } }));

export const DELETE = serve(signOut, async ({ request }) => {
  const session = await signedIn(request);
  return { status: 204, cookies: [await endSession(session?.sessionId)] };
});
