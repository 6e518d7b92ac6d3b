import { readHealth } from "@/lib/server/contracts/service";
import { unavailable } from "@/lib/server/failure";
import { databaseAnswers } from "@/lib/server/health";
import { serve } from "@/lib/server/serve";

export const dynamic = "force-dynamic";

export const GET = serve(readHealth, async () =>
  (await databaseAnswers()) ? { status: 200, json: { ok: true as const } } : unavailable(),
);
