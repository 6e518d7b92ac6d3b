import { saveRevision } from "@/lib/server/contracts/rigs";
import { revisionSaved } from "@/lib/server/rigs/saving";
import { serve } from "@/lib/server/serve";

export const POST = serve(saveRevision, async ({ member, id, body, raw }) =>
  revisionSaved(member, id, body.base, (raw as typeof body).sheet),
);
