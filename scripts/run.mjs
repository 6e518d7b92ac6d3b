// Plain Node and no packages: this file runs before anything is installed.
import { spawn, spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";

const root = path.resolve(import.meta.dirname, "..");
const [command, ...words] = process.argv.slice(2);
const lockFile = path.join(root, "package-lock.json");
const marker = path.join(root, "node_modules", ".hookfast-lock");

if (!command || !existsSync(path.join(root, "scripts", `${command}.ts`))) {
  stopWith("Say what to run: npm start, npm run dev, npm test or npm run build.");
}
checkNode();
install();
runCommand();

function stopWith(sentence) {
  console.error(sentence);
  process.exit(1);
}

function checkNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major < 20 || (major === 20 && minor < 19) || major > 22) {
    stopWith(`Hookfast runs on Node 20.19 up to 22; this is ${process.version}.`);
  }
}

/** Installs the locked packages unless exactly these are there already. */
function install() {
  const digest = createHash("sha256").update(readFileSync(lockFile)).digest("hex");
  if (existsSync(marker) && readFileSync(marker, "utf8") === digest) return;
  if (!holdsLockedPackages()) {
    console.log("Installing the locked packages.");
    const npm = process.env.npm_execpath;
    const [file, first] = npm?.endsWith(".js") ? [process.execPath, [npm]] : ["npm", []];
    // --include=dev: a build needs them, and NODE_ENV=production would leave them out.
    const done = spawnSync(file, [...first, "ci", "--include=dev"], { cwd: root, stdio: "inherit" });
    if (done.status !== 0) stopWith("The packages could not be installed; npm says why above.");
  }
  writeFileSync(marker, digest);
}

/** Someone may have run npm themselves: its own record of node_modules is compared with the lock file. */
function holdsLockedPackages() {
  const record = path.join(root, "node_modules", ".package-lock.json");
  if (!existsSync(record)) return false;
  const wanted = JSON.parse(readFileSync(lockFile, "utf8")).packages;
  const present = JSON.parse(readFileSync(record, "utf8")).packages;
  const same = (name) => present[name]?.integrity === wanted[name]?.integrity;
  return (
    Object.keys(wanted).every(
      (name) => name === "" || same(name) || (wanted[name].optional && !present[name]),
    ) && Object.keys(present).every((name) => name in wanted)
  );
}

function runCommand() {
  const flags = ["--conditions=react-server", "--import", "tsx"];
  const child = spawn(process.execPath, [...flags, `scripts/${command}.ts`, ...words], {
    cwd: root,
    stdio: "inherit",
    env: { ...process.env, HOOKFAST_PARENT: String(process.pid) },
  });
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) {
    process.on(signal, () => child.kill(signal === "SIGHUP" ? "SIGTERM" : signal));
  }
  // npm killed outright forwards nothing; being handed to another parent is the only sign of it.
  const started = ancestors();
  if (process.env.npm_lifecycle_event === command) {
    setInterval(() => ancestors() !== started && child.kill("SIGTERM"), 500).unref();
  }
  child.on("exit", (code, signal) => process.exit(code ?? (signal ? 1 : 0)));
}

/** The parent, and the one above when the parent is only the shell that npm puts between. */
function ancestors() {
  try {
    const isShell = readFileSync(`/proc/${process.ppid}/cmdline`, "utf8").startsWith("sh\0-c\0");
    const stat = readFileSync(`/proc/${process.ppid}/stat`, "utf8").split(") ").at(-1);
    return `${process.ppid} ${isShell ? stat.split(" ")[1] : ""}`;
  } catch {
    return String(process.ppid);
  }
}
