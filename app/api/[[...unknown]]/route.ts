import { Problem } from "@/lib/domain/problem";
import { problemResponse } from "@/lib/server/reply";

/** Every address under /api that no route has: the same answer as for a thing that is not there. */
async function nothingHere(): Promise<Response> {
  return problemResponse(new Problem("not-found"));
}

export const GET = nothingHere;
export const POST = nothingHere;
export const PUT = nothingHere;
export const PATCH = nothingHere;
export const DELETE = nothingHere;
export const OPTIONS = nothingHere;
