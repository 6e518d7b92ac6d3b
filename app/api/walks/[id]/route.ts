import { Problem } from "@/lib/domain/problem";
import { readWalk } from "@/lib/server/contracts/walks";
import { serve } from "@/lib/server/serve";
import { walkReading } from "@/lib/server/walk-reading";

export const GET = serve(readWalk, async ({ member, id }) => {
  const reading = await walkReading(member, id);
  return reading instanceof Problem ? reading : { status: 200, json: reading };
});
