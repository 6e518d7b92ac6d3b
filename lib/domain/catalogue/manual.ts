import type { Procedure, Sheet } from "../sheet/sheet";

/** What a rig has of its car's own manual. A way without its page or its end state is as good as none. */
export type ManualSays =
  { says: "how"; page: string; endState: string } | { says: "forbidden" } | { says: "not-recorded" };

/** What the sheet has of the car's own manual. */
export function manualOf({ procedure = {} }: Sheet): ManualSays {
  const { says, page, endState } = procedure;
  if (says === "forbidden") return { says };
  if (says === "how" && page && endState) return { says, page: bare(page), endState };
  return { says: "not-recorded" };
}

// Someone who writes "p. 214" means the page that someone else writes as "214".
function bare(page: string): string {
  return page.replace(/^(pages?|pp?\.)\s*(?=\S)/i, "");
}

/** Whether the manual asks for the engine to run on the way. */
export function asksForEngineRun(procedure: Procedure): boolean {
  return Boolean(procedure.engineRunEveryHours || procedure.engineRunEvery);
}
