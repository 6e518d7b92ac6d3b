import type { ChildProcess } from "node:child_process";
import { setTimeout as sleep } from "node:timers/promises";
import { chooseAddress, type Address } from "./address";
import { exclusively } from "./exclusively";
import { exitCode, startProgram } from "./processes";
import { dataDirectory } from "./product-data";
import { noteServer } from "./runs";

/** Serves the checkout until the server ends; `onReady` hears where, once it answers. Hands back its exit code. */
export async function serve(mode: "start" | "dev", onReady: (address: Address) => void): Promise<number> {
  // Held until the port is really taken, or two checkouts starting together choose the same one.
  const { ended } = await exclusively("port", async () => {
    const address = await chooseAddress(process.env);
    const server = startNext(mode, address);
    const ended = exitCode(server);
    noteServer(dataDirectory(), server.pid);
    if (await answers(server, address)) onReady(address);
    return { ended };
  });
  return await ended;
}

function startNext(mode: "start" | "dev", address: Address): ChildProcess {
  const words = [mode, "-H", address.host, "-p", String(address.port)];
  return startProgram(process.execPath, ["node_modules/next/dist/bin/next", ...words], {
    env: {
      ...process.env,
      NODE_ENV: mode === "start" ? "production" : "development",
      NEXT_TELEMETRY_DISABLED: "1",
      PORT: String(address.port),
      HOST: address.host,
      ORIGIN: address.origin,
    },
  });
}

/** Waits until the server answers anything, a 503 too; false when it ends instead. */
async function answers(server: ChildProcess, { host, port }: Address): Promise<boolean> {
  const name = { "0.0.0.0": "127.0.0.1", "::": "[::1]" }[host] ?? (host.includes(":") ? `[${host}]` : host);
  while (server.exitCode === null && server.signalCode === null) {
    try {
      await fetch(`http://${name}:${port}/api/health`, { redirect: "manual" });
      return true;
    } catch {
      await sleep(50);
    }
  }
  return false;
}
