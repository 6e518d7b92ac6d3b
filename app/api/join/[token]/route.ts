import { Problem } from "@/lib/domain/problem";
import { join, readInvitation } from "@/lib/server/contracts/people";
import { invitationOf, joined } from "@/lib/server/people/invitations";
import { serve } from "@/lib/server/serve";
import { beginSession, endSession, signedIn } from "@/lib/server/session";

export const GET = serve(readInvitation, async ({ token }) => {
  const invitation = await invitationOf(token);
  return invitation instanceof Problem ? invitation : { status: 200, json: invitation };
});

export const POST = serve(join, async ({ request, token, body }) => {
  const member = await joined(request, token, body);
  if (member instanceof Problem) return member;
  const before = await signedIn(request);
  await endSession(before?.sessionId);
  return { status: 201, json: { member }, cookies: [await beginSession(member.id)] };
});
