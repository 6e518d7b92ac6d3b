import { Problem } from "@/lib/domain/problem";
import { readRig } from "@/lib/server/contracts/rigs";
import { rigReading } from "@/lib/server/rigs/reading";
import { serve } from "@/lib/server/serve";

export const GET = serve(readRig, async ({ member, id }) => {
  const reading = await rigReading(member, id);
  return reading instanceof Problem ? reading : { status: 200, json: reading };
});
