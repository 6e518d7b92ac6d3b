import { withdrawInvitation } from "@/lib/server/contracts/people";
import { withdrawn } from "@/lib/server/people/invitations";
import { serve } from "@/lib/server/serve";

export const DELETE = serve(
  withdrawInvitation,
  async ({ member, id }) => (await withdrawn(member, id)) ?? { status: 204 },
);
