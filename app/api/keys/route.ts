import { readKeys } from "@/lib/server/contracts/service";
import { serve } from "@/lib/server/serve";
import { serverKeys } from "@/lib/server/server-key";

// Else the build would write the keys of the machine that builds into the answer.
export const dynamic = "force-dynamic";

export const GET = serve(readKeys, async () => ({ status: 200, json: { keys: serverKeys() } }));
