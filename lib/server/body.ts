import "server-only";
import { Problem } from "@/lib/domain/problem";

/**
 * A request's body as JSON, counted while it streams: a route handler has no limit of its own.
 * @param limit the most bytes
 * @returns the value in `raw`, or a problem: `too-large`, or `not-json` (invalid UTF-8 too)
 */
export async function readJson(request: Request, limit: number): Promise<{ raw: unknown } | Problem> {
  const bytes = await readBytes(request, limit);
  if (bytes instanceof Problem) return bytes;
  try {
    return { raw: JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes)) };
  } catch {
    return new Problem("not-json");
  }
}

async function readBytes(request: Request, limit: number): Promise<Buffer | Problem> {
  const tooLarge = new Problem("too-large", { detail: `The most is ${limit} bytes.` });
  if (Number(request.headers.get("content-length")) > limit) return tooLarge;
  const chunks: Uint8Array[] = [];
  let size = 0;
  // Leaving the loop early cancels the stream.
  for await (const chunk of request.body ?? []) {
    size += chunk.byteLength;
    if (size > limit) return tooLarge;
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}
