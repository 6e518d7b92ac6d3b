import { Problem } from "@/lib/domain/problem";
import { readRevision } from "@/lib/server/contracts/rigs";
import { revisionReading } from "@/lib/server/rigs/reading";
import { serve } from "@/lib/server/serve";

export const GET = serve(readRevision, async ({ member, id, sha256 }) => {
  const reading = await revisionReading(member, id, sha256);
  return reading instanceof Problem ? reading : { status: 200, json: reading };
});
