import { accessSync, constants } from "node:fs";
import path from "node:path";
import { PlainError } from "./environment";
import { exclusively } from "./exclusively";
import { exitCode, runProgram, startProgram } from "./processes";

/** Where a program is; Debian keeps servers in folders that a plain user's PATH leaves out. */
export function findProgram(name: string): string | undefined {
  const folders = [...(process.env.PATH ?? "").split(":"), "/usr/local/sbin", "/usr/sbin", "/usr/bin"];
  return folders.map((folder) => path.join(folder, name)).find(isExecutable);
}

function isExecutable(file: string): boolean {
  try {
    accessSync(file, constants.X_OK);
    return path.isAbsolute(file);
  } catch {
    return false;
  }
}

/** The program's path, after installing the Debian package that brings it when it is missing. */
export async function ensureProgram(name: string, debianPackage: string): Promise<string> {
  const found = findProgram(name);
  if (found) return found;
  await exclusively("apt", async () => {
    if (!findProgram(name)) await installPackage(debianPackage);
  });
  const installed = findProgram(name);
  if (!installed)
    throw new PlainError(`Debian's package ${debianPackage} was installed but brought no ${name}.`);
  return installed;
}

async function installPackage(debianPackage: string): Promise<void> {
  const words = ["-o", "DPkg::Lock::Timeout=300", "install", "-y", "--no-install-recommends", debianPackage];
  const byHand = `sudo apt-get update && sudo apt-get install -y --no-install-recommends ${debianPackage}`;
  if (!findProgram("apt-get")) {
    throw new PlainError(
      `Hookfast needs ${debianPackage}, and this machine has no apt-get to install it with.`,
    );
  }
  const asRoot = await rootPrefix();
  if (!asRoot) {
    throw new PlainError(
      `Hookfast needs Debian's package ${debianPackage}. Install it, then run this again:\n\n  ${byHand}\n`,
    );
  }
  console.log(`Installing Debian's package ${debianPackage}.`);
  // The lists of a fresh machine are empty or old: the first attempt may know the package under a version that is gone.
  if ((await apt(asRoot, words)).code === 0) return;
  const lists = await apt(asRoot, ["update"]);
  const second = await apt(asRoot, words);
  if (second.code !== 0) {
    throw new PlainError(
      `${lists.output}${second.output}\n${debianPackage} could not be installed. Try it by hand:\n\n  ${byHand}\n`,
    );
  }
}

/** What to put before a command so that it runs as root; nothing when that would need a password. */
async function rootPrefix(): Promise<string[] | undefined> {
  if (process.getuid?.() === 0) return [];
  if (!findProgram("sudo")) return undefined;
  return (await exitCode(startProgram("sudo", ["-n", "true"], { stdio: "ignore" }))) === 0
    ? ["sudo", "-n"]
    : undefined;
}

function apt(asRoot: string[], words: string[]) {
  const [file = "env", ...rest] = [...asRoot, "env", "DEBIAN_FRONTEND=noninteractive", "apt-get", ...words];
  return runProgram(file, rest);
}
