import type { Envelope } from "@/lib/domain/field";
import { sendEntries } from "@/lib/server/contracts/field";
import { ingest } from "@/lib/server/ingest/ingest";
import { serve } from "@/lib/server/serve";

// The body has its shape by now, but what is stored must be what was sent, so the raw value goes on.
export const POST = serve(sendEntries, async ({ member, raw }) => ({
  status: 200,
  json: await ingest(member, raw as Envelope),
}));
