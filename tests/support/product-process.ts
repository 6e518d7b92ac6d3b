import { spawn, type ChildProcess } from "node:child_process";
import { createHash } from "node:crypto";
import { once } from "node:events";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import type { BrowserContext, Page } from "@playwright/test";
import { createConnection } from "mariadb";
import { root } from "@/scripts/environment";
import { anyFreePort } from "@/scripts/ports";
import { runProgram } from "@/scripts/processes";

/** A production server of this checkout with a demo database of its own, stopped and started at will. */
export class Product {
  /** What the server has printed since the test began, a chunk at a time. */
  readonly output: string[] = [];
  private server: ChildProcess | undefined;
  private allowed: RegExp[] = [];
  private readonly env: NodeJS.ProcessEnv;

  private constructor(
    readonly port: number,
    private readonly databaseServer: string,
    private readonly databaseName: string,
  ) {
    this.env = {
      ...process.env,
      NODE_ENV: "production",
      NEXT_TELEMETRY_DISABLED: "1",
      HOST: "127.0.0.1",
      PORT: String(port),
      ORIGIN: this.origin,
      DATABASE_URL: this.databaseUrl,
      KEYS_DIR: path.join(process.env.DATA_DIR ?? ".data/test", "e2e", databaseName, "keys"),
      // Else a demo's photographs would be there already, from the run before.
      PHOTOS_DIR: path.join(process.env.DATA_DIR ?? ".data/test", "e2e", databaseName, "photos"),
      DEMO: "1",
    };
  }

  /** Makes the database for a test file; nothing is served before `start`. */
  static async create(testFile: string): Promise<Product> {
    const server = process.env.TEST_DATABASE_SERVER;
    if (!server) throw new Error("These tests need a database server: run them with npm test -- e2e.");
    const name = `hookfast_e_${createHash("sha256").update(testFile).digest("hex").slice(0, 12)}_${process.pid}`;
    const product = new Product(await anyFreePort(), server, name);
    await product.administer([`DROP DATABASE IF EXISTS ${name}`, `CREATE DATABASE ${name}`]);
    const words = ["--conditions=react-server", "--import", "tsx", "scripts/prepare.ts"];
    const { code, output } = await runProgram(process.execPath, words, { env: product.env });
    if (code !== 0) throw new Error(output);
    return product;
  }

  /** What a browser sends in its Origin header. */
  get origin(): string {
    return `http://127.0.0.1:${this.port}`;
  }

  /** For tests that look behind the product's back. */
  get databaseUrl(): string {
    return `${this.databaseServer}/${this.databaseName}`;
  }

  /** Starts the server on its port, unless it runs, and waits until it answers. */
  async start(): Promise<void> {
    if (this.server) return;
    const words = ["node_modules/next/dist/bin/next", "start", "-H", "127.0.0.1", "-p", String(this.port)];
    const server = spawn(process.execPath, words, {
      cwd: root,
      env: this.env,
      stdio: ["ignore", "pipe", "pipe"],
    });
    server.stdout.on("data", (chunk) => this.output.push(String(chunk)));
    server.stderr.on("data", (chunk) => this.output.push(String(chunk)));
    this.server = server;
    while (!(await this.answers())) {
      if (server.exitCode !== null) throw new Error(`The server ended:\n${this.output.join("")}`);
      await sleep(50);
    }
  }

  /** Ends the server process, as a machine that is gone; errors of refused connections are expected from here on. */
  async stop(): Promise<void> {
    const { server } = this;
    this.server = undefined;
    this.allowed.push(
      /net::ERR_(CONNECTION_REFUSED|CONNECTION_RESET|EMPTY_RESPONSE|FAILED)/,
      /Failed to fetch/,
    );
    if (!server || server.exitCode !== null) return;
    const ended = once(server, "exit");
    server.kill("SIGKILL");
    await ended;
  }

  /** Signs a demo account in: its cookie goes to the browser context. */
  async signIn(
    browser: Page | BrowserContext,
    email: string,
    password = "walk the rig twice",
  ): Promise<void> {
    const headers = { Origin: this.origin };
    const answer = await browser.request.post(`${this.origin}/api/session`, {
      headers,
      data: { email, password },
    });
    if (answer.status() !== 200)
      throw new Error(`${email} cannot sign in: ${answer.status()} ${await answer.text()}`);
  }

  /** Expects a matching error in the browser's console for the rest of this test. */
  allowError(pattern: RegExp): void {
    this.allowed.push(pattern);
  }

  /** Whether an error in the browser's console is expected. */
  allows(text: string): boolean {
    return this.allowed.some((pattern) => pattern.test(text));
  }

  /** Forgets what the test before printed and expected. */
  beginTest(allowed: RegExp[]): void {
    // Only a test that cuts the network sees this one.
    this.allowed = [...allowed, /net::ERR_INTERNET_DISCONNECTED/];
    this.output.length = 0;
  }

  /** Ends the server and drops its database. */
  async remove(): Promise<void> {
    await this.stop();
    await this.administer([`DROP DATABASE IF EXISTS ${this.databaseName}`]);
  }

  private async answers(): Promise<boolean> {
    return await fetch(`${this.origin}/api/health`).then(
      () => true,
      () => false,
    );
  }

  private async administer(statements: string[]): Promise<void> {
    const connection = await createConnection(`${this.databaseServer}/information_schema`);
    try {
      for (const statement of statements) await connection.query(statement);
    } finally {
      await connection.end();
    }
  }
}
