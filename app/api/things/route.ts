import { listThings } from "@/lib/server/contracts/rigs";
import { serve } from "@/lib/server/serve";
import { thingList } from "@/lib/server/things/reading";

export const GET = serve(listThings, async ({ member }) => ({
  status: 200,
  json: { things: await thingList(member) },
}));
