import "server-only";
import path from "node:path";
import { z } from "zod";

const loopback = new Set(["127.0.0.1", "localhost", "[::1]"]);

/** An empty line in `.env` means the default, as if the line were not there. */
const unlessEmpty = <Schema extends z.ZodType>(schema: Schema) =>
  z.preprocess((value) => (value === "" ? undefined : value), schema);

const port = "a number from 1 to 65535";

const environment = z.object({
  PORT: unlessEmpty(z.coerce.number(port).int(port).min(1, port).max(65535, port).default(3000)),
  HOST: unlessEmpty(z.string().default("127.0.0.1")),
  ORIGIN: unlessEmpty(z.string().optional()),
  DATABASE_URL: unlessEmpty(z.string().startsWith("mariadb://", "a mariadb:// URL").optional()),
  DATA_DIR: unlessEmpty(z.string().default(".data")),
  KEYS_DIR: unlessEmpty(z.string().optional()),
  PHOTOS_DIR: unlessEmpty(z.string().optional()),
  DEMO: unlessEmpty(z.enum(["0", "1"], "0 or 1").optional()),
  NEXT_DIST_DIR: unlessEmpty(z.string().default(".next")),
});

/** Where the product is reached, what it stores where, and what follows from that. */
export type Settings = {
  PORT: number;
  HOST: string;
  /** Scheme, host and port as a browser sends them in its Origin header. */
  ORIGIN: string;
  /** Throws when none is set: a build must do without one. */
  readonly DATABASE_URL: string;
  DATA_DIR: string;
  /** Where the keys that sign receipts live, outside the database. */
  KEYS_DIR: string;
  /** Where the bytes of photographs live. */
  PHOTOS_DIR: string;
  DEMO: boolean;
  NEXT_DIST_DIR: string;
  cookie: { name: string; secure: boolean };
};

/** Checks an environment and derives the settings; throws a sentence that names the variable to correct. */
export function readSettings(env: Record<string, string | undefined>): Settings {
  const read = environment.safeParse(env);
  if (!read.success) {
    const [issue] = read.error.issues;
    throw new Error(`${issue?.path.join(".")} has to be ${issue?.message}. See .env.example.`);
  }
  const { DATABASE_URL, ORIGIN, KEYS_DIR, PHOTOS_DIR, DEMO, ...rest } = read.data;
  const origin = readOrigin(ORIGIN ?? `http://127.0.0.1:${rest.PORT}`);
  const secure = origin.startsWith("https:");
  return {
    ...rest,
    ORIGIN: origin,
    get DATABASE_URL() {
      if (!DATABASE_URL)
        throw new Error("DATABASE_URL is not set. npm start and npm run dev set it by themselves.");
      return DATABASE_URL;
    },
    KEYS_DIR: KEYS_DIR ?? path.join(rest.DATA_DIR, "keys"),
    PHOTOS_DIR: PHOTOS_DIR ?? path.join(rest.DATA_DIR, "photos"),
    DEMO: DEMO === "1",
    // A browser takes a __Host- cookie over https only.
    cookie: { name: secure ? "__Host-hookfast" : "hookfast", secure },
  };
}

function readOrigin(text: string): string {
  const url = URL.canParse(text) ? new URL(text) : undefined;
  if (!url || (text !== url.origin && text !== `${url.origin}/`)) {
    throw new Error(`ORIGIN has to be a scheme, a host and perhaps a port, not "${text}". See .env.example.`);
  }
  if (url.protocol === "http:" && !loopback.has(url.hostname)) {
    throw new Error(
      `ORIGIN is ${url.origin}, but sessions over plain http stay on this machine. Use https there.`,
    );
  }
  if (url.protocol !== "https:" && url.protocol !== "http:") {
    throw new Error(`ORIGIN has to begin with https or, on this machine, http, not ${url.protocol}`);
  }
  return url.origin;
}

let read: Settings | undefined;

/** The settings of this process, read at first use and then fixed. */
export const settings: Settings = new Proxy({} as Settings, {
  get: (_, name) => Reflect.get((read ??= readSettings(process.env)), name) as unknown,
});
