import { Problem } from "@/lib/domain/problem";
import { readRecord } from "@/lib/server/contracts/walks";
import { serve } from "@/lib/server/serve";
import { walkRecord } from "@/lib/server/walk-reading";

export const GET = serve(readRecord, async ({ member, id }) => {
  const text = await walkRecord(member, id);
  if (text instanceof Problem) return text;
  const headers = { "content-disposition": `attachment; filename="hookfast-walk-${id}.ndjson"` };
  return { status: 200, text, headers };
});
