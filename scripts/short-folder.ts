import { createHash } from "node:crypto";
import { lstatSync, mkdirSync, rmSync, symlinkSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { PlainError } from "./environment";

/**
 * A folder with a short and plain name for a data directory, whose own path is as long as it likes and may hold
 * blanks. `data` inside it leads to the data directory.
 */
export function shortFolder(dataDir: string): string {
  const name = `hookfast-${createHash("sha256").update(dataDir).digest("hex").slice(0, 12)}`;
  // A socket's path may have at most 107 bytes.
  const temporary = /^[\w./-]{1,80}$/.test(os.tmpdir()) ? os.tmpdir() : "/tmp";
  const folder = path.join(temporary, name);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const found = lstatSync(folder);
  // The temporary folder is everyone's: a folder that someone else laid there is not ours to use.
  if (!found.isDirectory() || found.uid !== process.getuid?.()) {
    throw new PlainError(
      `${folder} belongs to someone else. Remove it, or set TMPDIR to a folder of your own.`,
    );
  }
  const link = path.join(folder, "data");
  rmSync(link, { force: true });
  symlinkSync(dataDir, link);
  return folder;
}
