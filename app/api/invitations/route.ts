import { Problem } from "@/lib/domain/problem";
import { invite, listInvitations } from "@/lib/server/contracts/people";
import { invited, openInvitations } from "@/lib/server/people/invitations";
import { serve } from "@/lib/server/serve";

export const GET = serve(listInvitations, async ({ member }) => ({
  status: 200,
  json: { invitations: await openInvitations(member) },
}));

export const POST = serve(invite, async ({ member, body }) => {
  const made = await invited(member, body.role);
  return made instanceof Problem ? made : { status: 201, json: made };
});
