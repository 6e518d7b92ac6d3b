import { Problem } from "@/lib/domain/problem";
import { listWalks } from "@/lib/server/contracts/walks";
import { serve } from "@/lib/server/serve";
import { placeOf } from "@/lib/server/walk-cursor";
import { walkList } from "@/lib/server/walk-list";

export const GET = serve(listWalks, async ({ member, query }) => {
  const after = query.after === undefined ? null : placeOf(query.after);
  if (query.after !== undefined && !after) {
    return new Problem("wrong-shape", { errors: [{ pointer: "after", detail: "no cursor of this list" }] });
  }
  return { status: 200, json: await walkList(member, after, query.limit) };
});
