import { listRigs, makeRig } from "@/lib/server/contracts/rigs";
import { rigList } from "@/lib/server/rigs/reading";
import { rigMade } from "@/lib/server/rigs/saving";
import { serve } from "@/lib/server/serve";

export const GET = serve(listRigs, async ({ member }) => ({
  status: 200,
  json: { rigs: await rigList(member) },
}));

export const POST = serve(makeRig, async ({ member, body, raw }) =>
  rigMade(member, body.id, (raw as typeof body).sheet),
);
