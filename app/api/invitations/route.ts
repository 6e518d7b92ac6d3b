import { Problem } from "@/lib/domain/problem";
import { invite, listInvitations, withdrawInvitation } from "@/lib/server/contracts/people";
import { invited, openInvitations, withdrawn } from "@/lib/server/people/invitations";
import { serve } from "@/lib/server/serve";

export const GET = serve(listInvitations, async ({ member }) => ({
  status: 200,
  json: { invitations: await openInvitations(member) },
}));

export const POST = serve(invite, async ({ member, body }) => {
  const made = await invited(member, body.role);
  return made instanceof Problem ? made : { status: 201, json: made };
});

export const DELETE = serve(
  withdrawInvitation,
  async ({ member, query }) => (await withdrawn(member, query.id)) ?? { status: 204 },
);
