import { Problem } from "@/lib/domain/problem";
import { readThing } from "@/lib/server/contracts/rigs";
import { serve } from "@/lib/server/serve";
import { thingReading } from "@/lib/server/things/reading";

export const GET = serve(readThing, async ({ member, id }) => {
  const reading = await thingReading(member, id);
  return reading instanceof Problem ? reading : { status: 200, json: reading };
});
