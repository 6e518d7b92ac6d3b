import { existsSync } from "node:fs";
import path from "node:path";

/** The checkout. Every script and every child runs here. */
export const root = path.resolve(import.meta.dirname, "..");

/** Reads `.env` as Next does; what the shell has set already wins. */
export function loadEnvFile(): void {
  const file = path.join(root, ".env");
  if (existsSync(file)) process.loadEnvFile(file);
}

/** Something the person at the keyboard can put right: shown as a sentence, without a stack. */
export class PlainError extends Error {}
