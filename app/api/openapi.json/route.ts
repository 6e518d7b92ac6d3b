import { contracts } from "@/lib/server/contracts/all";
import { readOpenApi } from "@/lib/server/contracts/service";
import { openApiDocument } from "@/lib/server/openapi";
import { serve } from "@/lib/server/serve";

export const dynamic = "force-dynamic";

export const GET = serve(readOpenApi, async () => ({ status: 200, json: openApiDocument(contracts) }));
