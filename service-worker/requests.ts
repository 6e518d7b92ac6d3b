import { registerRoute } from "workbox-routing";
import { planFor, type Plan } from "./plan";
import { kept, keptFiles } from "./precache";

/** Answers requests as planned; one that is left alone never reaches a handler. */
export function answerRequests(): void {
  registerRoute(
    ({ request, url, sameOrigin }) => {
      const fromRouter = request.headers.get("RSC") === "1" || url.searchParams.has("_rsc");
      const { method, mode } = request;
      const plan = planFor({ method, mode, sameOrigin, path: url.pathname, fromRouter }, keptFiles);
      return plan === "leave" ? false : { plan };
    },
    async ({ request, url, params }) => await answer((params as { plan: Plan }).plan, request, url.pathname),
  );
}

async function answer(plan: Plan, request: Request, path: string): Promise<Response> {
  if (plan === "file" || plan === "shell") return (await kept(path)) ?? (await fetch(request));
  try {
    return await fetch(request);
  } catch (error) {
    const page = await kept(plan === "network-else-shell" ? path : "/offline");
    if (page) return page;
    throw error;
  }
}
