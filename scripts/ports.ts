import net from "node:net";

/** Whether a server could listen there now. */
export function isFree(port: number, host = "127.0.0.1"): Promise<boolean> {
  return new Promise((resolve) => {
    const probe = net.createServer();
    probe.once("error", () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** Any port of the loopback address that is free now. */
export function anyFreePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = net.createServer();
    probe.once("error", reject);
    probe.listen({ port: 0, host: "127.0.0.1" }, () => {
      const { port } = probe.address() as net.AddressInfo;
      probe.close(() => resolve(port));
    });
  });
}

/** The first free port from `first` upward, so that a second checkout gets a number that is easy to guess. */
export async function firstFreePort(first: number, host: string): Promise<number> {
  for (let port = first; port < first + 100; port += 1) if (await isFree(port, host)) return port;
  return anyFreePort();
}
