import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, describe, expect, test } from "vitest";
import { GET as readHealth } from "@/app/api/health/route";
import { GET as readKeys } from "@/app/api/keys/route";
import { GET as readOpenApi } from "@/app/api/openapi.json/route";
import { receiptHolds, serverKeyShape } from "@/lib/domain/receipt";
import { thumbprint } from "@/lib/domain/signature";
import { contracts } from "@/lib/server/contracts/all";
import { ensureServerKey, serverKeys, signReceipt } from "@/lib/server/server-key";
import { settings } from "@/lib/server/settings";
import { freshDatabase } from "../support/database";
import { givenMember, request } from "../support/given";

const keysDirectory = mkdtempSync(path.join(tmpdir(), "hookfast-keys-"));
process.env.KEYS_DIR = keysDirectory;

freshDatabase();
afterAll(() => rmSync(keysDirectory, { recursive: true }));

describe("GET /api/health", () => {
  test.each(["http://127.0.0.1:3000", "http://elsewhere.example", "https://10.0.0.1:9"])(
    "answers under %s",
    async (origin) => {
      const response = await readHealth(new Request(`${origin}/api/health`));
      expect([response.status, await response.json()]).toEqual([200, { ok: true }]);
      expect(response.headers.get("cache-control")).toBe("no-store");
    },
  );
});

describe("the server's keys", () => {
  const receipt = () =>
    signReceipt({
      walk: "017f22e2-79b0-7cc3-98c4-dc0c0c07398f",
      seal: "ab".repeat(32),
      entries: 3,
      verdict: "hold",
      receivedAt: "2026-05-01T12:00:00.000Z",
    });

  test("are made once, in files that only the owner reads", () => {
    ensureServerKey();
    ensureServerKey();
    const files = readdirSync(keysDirectory);
    expect(files).toEqual([`${serverKeys()[0]!.kid}.jwk`]);
    expect(statSync(path.join(keysDirectory, files[0]!)).mode & 0o777).toBe(0o600);
    expect(settings.KEYS_DIR).toBe(keysDirectory);
  });

  test("are served in public only", async () => {
    const response = await readKeys(new Request("http://127.0.0.1:3000/api/keys"));
    expect(response.headers.get("cache-control")).toBe("public, max-age=300");
    const { keys } = (await response.json()) as { keys: unknown[] };
    expect(keys).toHaveLength(1);
    const key = serverKeyShape.parse(keys[0]);
    expect(Object.keys(key).sort()).toEqual(["crv", "kid", "kty", "x"]);
    expect(key.kid).toBe(thumbprint(key));
  });

  test("the newest signs, and receipts of the older ones still verify", () => {
    const old = receipt();
    expect(receiptHolds(old, "ab".repeat(32), serverKeys())).toBe(true);
    const [name] = readdirSync(keysDirectory) as [string];
    const stored = readFileSync(path.join(keysDirectory, name), "utf8");
    rmSync(path.join(keysDirectory, name));
    ensureServerKey();
    writeFileSync(path.join(keysDirectory, name), stored, { mode: 0o600 });
    const young = receipt();
    expect(serverKeys().map(({ kid }) => kid)).toEqual([young.kid, old.kid]);
    for (const each of [old, young]) expect(receiptHolds(each, "ab".repeat(32), serverKeys())).toBe(true);
  });

  test.each([
    { walk: "017f22e2-79b0-7cc3-98c4-dc0c0c073990" },
    { entries: 4 },
    { verdict: "no-hold" as const },
    { receivedAt: "2026-05-01T12:00:00.001Z" },
    { seal: "ac".repeat(32) },
    { kid: "x" },
    { alg: "ES256" as const },
  ])("a receipt changed in %o does not hold", (change) => {
    const changed = { ...receipt(), ...change };
    expect(receiptHolds(changed, changed.seal, serverKeys())).toBe(false);
  });
});

describe("GET /api/openapi.json", () => {
  type Operation = {
    summary: string;
    security?: unknown[];
    parameters?: { name: string; in: string; required: boolean; schema: object }[];
    requestBody?: { content: Record<string, { schema: object }> };
    responses: Record<string, { description: string; content?: Record<string, { schema: object }> }>;
  };
  type OpenApi = {
    openapi: string;
    info: { title: string; version: string };
    paths: Record<string, Record<string, Operation>>;
    components: { schemas: Record<string, object>; securitySchemes: Record<string, object> };
  };
  const document = async () => (await (await readOpenApi(new Request("http://x/"))).json()) as OpenApi;

  test("lists every route that there is, and no other", async () => {
    const listed = Object.entries((await document()).paths).flatMap(([route, operations]) =>
      Object.keys(operations).map((method) => `${method.toUpperCase()} ${route}`),
    );
    const handlers = await exportedHandlers();
    expect(listed.sort()).toEqual(handlers.sort());
    expect(contracts.map(({ method, path: route }) => `${method} ${route}`).sort()).toEqual(handlers);
  });

  test("is OpenAPI 3.1", async () => {
    const { openapi, info, paths, components } = await document();
    expect(openapi).toBe("3.1.0");
    expect(info).toMatchObject({ title: "Hookfast", version: "1" });
    expect(components.securitySchemes).toEqual({
      session: { type: "apiKey", in: "cookie", name: "hookfast" },
    });
    expect(components.schemas.Problem).toMatchObject({
      type: "object",
      required: ["type", "title", "status", "code"],
    });
    for (const [route, operations] of Object.entries(paths)) {
      expect(route).toMatch(/^\/api\/[a-z0-9.{}/-]+$/);
      for (const operation of Object.values(operations)) {
        expect(operation.summary).not.toBe("");
        const statuses = Object.keys(operation.responses);
        expect(statuses.some((status) => status.startsWith("2"))).toBe(true);
        for (const [status, response] of Object.entries(operation.responses)) {
          expect(status).toMatch(/^[245]\d\d$/);
          expect(response.description).not.toBe("");
          expect(Object.keys(response.content ?? {}).length).toBe(status === "204" ? 0 : 1);
          if (status >= "4") {
            expect(response.content).toEqual({
              "application/problem+json": { schema: { $ref: "#/components/schemas/Problem" } },
            });
          }
        }
        const named = (operation.parameters ?? []).filter((parameter) => parameter.in === "path");
        expect(named.map(({ name }) => `{${name}}`)).toEqual(route.match(/\{\w+\}/g) ?? []);
      }
    }
    // Nothing may point anywhere but into the document, and no dialect is named within it.
    const text = JSON.stringify(paths);
    expect(new Set(text.match(/"\$ref":"[^"]*"/g))).toEqual(
      new Set(['"$ref":"#/components/schemas/Problem"']),
    );
    expect(text).not.toContain("$schema");
  });

  test("says what a client has to know of sending entries", async () => {
    const { post } = (await document()).paths["/api/field/entries"]!;
    expect(Object.keys(post!.responses)).toEqual(["200", "400", "401", "403", "413", "422", "500", "503"]);
    expect(post!.security).toBeUndefined();
    expect(post!.requestBody!.content["application/json"]!.schema).toMatchObject({
      type: "object",
      required: ["device", "entries", "seals"],
      properties: { entries: { items: { required: ["walk", "seq"] } } },
    });
    expect(post!.responses["403"]!.description).toContain("`foreign-origin`");
    expect(post!.responses["403"]!.description).toContain("`role-refused`");
  });

  test("says which routes are public, and what may be asked of a list", async () => {
    const { paths } = await document();
    const open = Object.entries(paths).flatMap(([route, operations]) =>
      Object.entries(operations).flatMap(([method, { security }]) =>
        security ? [`${method} ${route}`] : [],
      ),
    );
    expect(open).toEqual([
      "post /api/session",
      "delete /api/session",
      "post /api/sign-up",
      "get /api/join/{token}",
      "post /api/join/{token}",
      "get /api/sheet-schema",
      "get /api/keys",
      "get /api/health",
      "get /api/openapi.json",
    ]);
    expect(paths["/api/walks"]!.get!.parameters).toEqual([
      { name: "after", in: "query", required: false, schema: { type: "string" } },
      {
        name: "limit",
        in: "query",
        required: false,
        schema: { type: "integer", minimum: 1, maximum: 200 },
      },
    ]);
  });
});

/** Every method that a file app/api/…/route.ts exports, as "METHOD /api/path"; the catch-all for nothing left out. */
async function exportedHandlers(): Promise<string[]> {
  const root = path.resolve(import.meta.dirname, "../../app/api");
  const files = readdirSync(root, { recursive: true, encoding: "utf8" })
    .filter((file) => path.basename(file) === "route.ts")
    .filter((file) => !file.includes("[["));
  const found = await Promise.all(
    files.map(async (file) => {
      const exported = (await import(path.join(root, file))) as object;
      const route = `/api/${path.dirname(file)}`.replaceAll("[", "{").replaceAll("]", "}");
      return Object.keys(exported)
        .filter((name) => /^[A-Z]+$/.test(name))
        .map((method) => `${method} ${route}`);
    }),
  );
  return found.flat().sort();
}

describe("every route but the public ones", () => {
  test("is 401 without a session, and 403 from elsewhere before that", async () => {
    const root = path.resolve(import.meta.dirname, "../../app/api");
    const member = await givenMember({ role: "manager" });
    for (const { method, path: route, public: open } of contracts) {
      const file = path.join(root, route.slice("/api/".length).replaceAll(/\{(\w+)\}/g, "[$1]"), "route.ts");
      const handlers = (await import(file)) as Record<string, (request: Request) => Promise<Response>>;
      const bare = await handlers[method]!(request(method, route, null, method === "POST" ? "" : undefined));
      expect([route, bare.status === 401]).toEqual([route, !open]);
      if (method === "GET") continue;
      const foreign = request(method, route, member, method === "POST" ? "" : undefined, {
        origin: "https://elsewhere.example",
      });
      expect([route, (await handlers[method]!(foreign)).status]).toEqual([route, 403]);
    }
  });
});
