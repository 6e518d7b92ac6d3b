import { readSheetSchema } from "@/lib/server/contracts/rigs";
import { serve } from "@/lib/server/serve";
import { sheetSchema } from "@/lib/server/sheet-schema";

// Else the build would write the origin of the machine that builds into the answer.
export const dynamic = "force-dynamic";

export const GET = serve(readSheetSchema, async () => ({
  status: 200,
  text: JSON.stringify(sheetSchema()),
}));
