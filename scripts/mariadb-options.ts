import path from "node:path";
import { shortFolder } from "./short-folder";

/** What Hookfast's own database server is started with. */
export function serverOptions(dataDir: string, port: number, durable: boolean): string[] {
  return [
    // First, or it is not obeyed: the machine's own configuration must not reach this server.
    "--no-defaults",
    ...(process.getuid?.() === 0 ? ["--user=root"] : []),
    `--datadir=${path.join(dataDir, "db")}`,
    "--bind-address=127.0.0.1",
    `--port=${port}`,
    `--socket=${path.join(shortFolder(dataDir), "db.sock")}`,
    `--pid-file=${path.join(dataDir, "db.pid")}`,
    `--log-error=${path.join(dataDir, "db.log")}`,
    `--init-file=${path.join(dataDir, "db.sql")}`,
    "--skip-name-resolve",
    "--transaction-isolation=READ-COMMITTED",
    "--default-time-zone=+00:00",
    "--character-set-server=utf8mb4",
    "--collation-server=utf8mb4_unicode_ci",
    "--local-infile=0",
    "--max-allowed-packet=64M",
    // 1 survives a power cut; the tests' data may be lost with the machine.
    `--innodb-flush-log-at-trx-commit=${durable ? 1 : 2}`,
  ];
}
