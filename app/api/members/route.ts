import { listPeople } from "@/lib/server/contracts/people";
import { people } from "@/lib/server/people/invitations";
import { serve } from "@/lib/server/serve";

export const GET = serve(listPeople, async ({ member }) => ({
  status: 200,
  json: { members: await people(member) },
}));
