import { createHash, randomUUID } from "node:crypto";
import { mkdir, open, readFile, rename, rm, stat } from "node:fs/promises";
import path from "node:path";
import type { PhotoPut } from "@/lib/domain/photo";
import { Problem } from "@/lib/domain/problem";
import { signedPut } from "./link";
import type { PhotoStore, StoredPhoto } from "./store";

/** Photographs in a local folder, one below it for each organisation, each file named by its digest. */
export class PhotoFolder implements PhotoStore {
  constructor(private readonly folder: string) {}

  async has(photo: StoredPhoto): Promise<boolean> {
    return stat(this.file(photo)).then(
      ({ size }) => size === photo.bytes,
      (error: unknown) => unlessMissing(error, false),
    );
  }

  presignPut(photo: StoredPhoto, now: Date): PhotoPut {
    return signedPut(photo, now);
  }

  /** Whole, since it is small; a stream that nobody reads to its end would hold the file open. */
  async read(photo: StoredPhoto): Promise<Uint8Array<ArrayBuffer> | null> {
    return readFile(this.file(photo)).catch((error: unknown) => unlessMissing(error, null));
  }

  /**
   * Takes a photograph's bytes while they stream. They are counted and digested on the way to a file of another name,
   * which takes its own only when all of it is right and on the disk; so two that send at once do each other no harm.
   * @returns what is wrong with them, or null when they are kept
   */
  async put(photo: StoredPhoto, body: AsyncIterable<Uint8Array>): Promise<Problem | null> {
    const file = this.file(photo);
    const folder = path.dirname(file);
    await mkdir(folder, { recursive: true, mode: 0o700 });
    const partial = path.join(folder, `${photo.sha256}.${randomUUID()}.partial`);
    try {
      const fault = await write(partial, photo, body);
      if (fault) return fault;
      await rename(partial, file);
      await flush(folder);
      return null;
    } finally {
      // Nothing is there any more under this name when all went well.
      await rm(partial, { force: true });
    }
  }

  private file({ organisation, sha256 }: StoredPhoto): string {
    return path.resolve(/* turbopackIgnore: true */ this.folder, organisation, sha256.slice(0, 2), sha256);
  }
}

async function write(
  file: string,
  { sha256, bytes }: StoredPhoto,
  body: AsyncIterable<Uint8Array>,
): Promise<Problem | null> {
  const handle = await open(file, "wx", 0o600);
  try {
    const digest = createHash("sha256");
    let size = 0;
    for await (const chunk of arriving(body)) {
      if (chunk instanceof Problem) return chunk;
      size += chunk.byteLength;
      if (size > bytes) return new Problem("too-large", { detail: `Recorded with ${bytes} bytes.` });
      digest.update(chunk);
      await handle.appendFile(chunk);
    }
    if (digest.digest("hex") !== sha256) return new Problem("wrong-content");
    if (size !== bytes) return new Problem("wrong-content", { detail: `Recorded with ${bytes} bytes.` });
    await handle.sync();
    return null;
  } finally {
    await handle.close();
  }
}

/** The chunks as they come; a connection that broke is the sender's trouble and not a fault of ours. */
async function* arriving(body: AsyncIterable<Uint8Array>): AsyncGenerator<Uint8Array | Problem> {
  try {
    yield* body;
  } catch {
    yield new Problem("wrong-content", { detail: "It broke off." });
  }
}

/** A rename is on the disk when its folder is. */
async function flush(folder: string): Promise<void> {
  const handle = await open(folder);
  await handle.sync().finally(() => handle.close());
}

function unlessMissing<T>(error: unknown, otherwise: T): T {
  if ((error as NodeJS.ErrnoException).code === "ENOENT") return otherwise;
  throw error;
}
