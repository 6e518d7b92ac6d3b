import { bundleFor } from "@/lib/server/bundle";
import { readBundle } from "@/lib/server/contracts/field";
import { serve } from "@/lib/server/serve";

export const GET = serve(readBundle, async ({ member }) => ({ status: 200, json: await bundleFor(member) }));
