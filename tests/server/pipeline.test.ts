import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, test } from "vitest";
import { POST as registerDevice } from "@/app/api/devices/route";
import { GET as readBundle } from "@/app/api/field/bundle/route";
import { POST as sendEntries } from "@/app/api/field/entries/route";
import { DELETE as signOut, GET as whoAmI, POST as signIn } from "@/app/api/session/route";
import { GET as readWalk } from "@/app/api/walks/[id]/route";
import { GET as readRecord } from "@/app/api/walks/[id]/record/route";
import { GET as listWalks } from "@/app/api/walks/route";
import * as unknown from "@/app/api/[[...unknown]]/route";
import { problems, type ProblemCode } from "@/lib/domain/problem";
import { freshDatabase } from "../support/database";
import { givenDevice, givenMember, givenRig, newKey, request, type GivenMember } from "../support/given";
import { WalkBuilder } from "../support/walk-builder";

freshDatabase();

let driver: GivenMember;
let auditor: GivenMember;

beforeAll(async () => {
  driver = await givenMember({ role: "driver" });
  auditor = await givenMember({ role: "auditor", organisation: driver.organisation });
});

async function expectProblem(response: Response, code: ProblemCode): Promise<Record<string, unknown>> {
  const body = (await response.json()) as Record<string, unknown>;
  expect(body).toMatchObject({ type: "about:blank", code, ...problems[code] });
  expect(response.status).toBe(problems[code].status);
  expect(response.headers.get("content-type")).toBe("application/problem+json");
  expect(response.headers.get("cache-control")).toBe("no-store");
  return body;
}

describe("origin comes first", () => {
  const own = "http://127.0.0.1:3000";
  const post = (headers: Record<string, string>) =>
    sendEntries(
      new Request(`${own}/api/field/entries`, {
        method: "POST",
        headers: { cookie: driver.cookie, ...headers },
        body: JSON.stringify({ device: randomUUID(), entries: [], seals: [] }),
      }),
    );

  test.each<[string, Record<string, string>, number]>([
    ["our own origin", { origin: own }, 200],
    ["the browser says same-origin", { "sec-fetch-site": "same-origin" }, 200],
    ["both", { origin: own, "sec-fetch-site": "same-origin" }, 200],
    ["neither", {}, 403],
    ["a foreign origin", { origin: "https://elsewhere.example" }, 403],
    ["another port", { origin: "http://127.0.0.1:3001" }, 403],
    ["another name for this machine", { origin: "http://localhost:3000" }, 403],
    ["no origin to tell", { origin: "null" }, 403],
    ["same site is not same origin", { "sec-fetch-site": "same-site" }, 403],
    ["typed in or bookmarked", { "sec-fetch-site": "none" }, 403],
    ["ours, but the browser says otherwise", { origin: own, "sec-fetch-site": "cross-site" }, 403],
    [
      "foreign, though the browser agrees",
      { origin: "https://x.example", "sec-fetch-site": "same-origin" },
      403,
    ],
  ])("%s", async (_, headers, status) => {
    const response = await post(headers);
    expect(response.status).toBe(status);
    if (status === 403) await expectProblem(response, "foreign-origin");
  });

  test("reading needs none", async () => {
    const response = await whoAmI(new Request(`${own}/api/session`, { headers: { cookie: driver.cookie } }));
    expect(response.status).toBe(200);
  });
});

describe("the steps in their order: origin, session, role, parse, thing", () => {
  const foreign = { origin: "https://elsewhere.example" };
  const send = (who: GivenMember | null, body: string, headers = {}) =>
    sendEntries(request("POST", "/api/field/entries", who, body, headers));

  test("a foreign origin is told before a missing session", async () => {
    await expectProblem(await send(null, "{", foreign), "foreign-origin");
  });
  test("a missing session before the role", async () => {
    await expectProblem(await send(null, "{"), "signed-out");
  });
  test("a session that never was", async () => {
    await expectProblem(await send({ ...driver, cookie: "hookfast=made-up" }, "{"), "signed-out");
  });
  test("the role before the body", async () => {
    await expectProblem(await send(auditor, "{"), "role-refused");
  });
  test("the body before anything is done", async () => {
    await expectProblem(await send(driver, "{"), "not-json");
  });
  test("the query before the thing", async () => {
    await expectProblem(await listWalks(request("GET", "/api/walks?x=1", driver)), "wrong-shape");
  });
  test("auditors read but do not record", async () => {
    await expectProblem(await readBundle(request("GET", "/api/field/bundle", auditor)), "role-refused");
    expect((await listWalks(request("GET", "/api/walks", auditor))).status).toBe(200);
  });
});

describe("bodies", () => {
  const send = (body: BodyInit, headers: Record<string, string> = {}) =>
    sendEntries(
      new Request("http://127.0.0.1:3000/api/field/entries", {
        method: "POST",
        headers: { cookie: driver.cookie, "sec-fetch-site": "same-origin", ...headers },
        body,
        duplex: "half",
      } as RequestInit),
    );
  const envelope = (over: object) =>
    JSON.stringify({ device: randomUUID(), entries: [], seals: [], ...over });
  const entry = (seq: unknown) => ({ walk: randomUUID(), seq });

  test.each([
    ["half a document", '{"device":'],
    ["nothing", ""],
    ["a word", "hello"],
    ["invalid UTF-8", Uint8Array.of(0x22, 0xff, 0x22)],
    ["a number that JSON does not know", '{"device":NaN}'],
  ])("not-json: %s", async (_, body) => {
    await expectProblem(await send(body), "not-json");
  });

  test("too-large: 2 MiB, and one byte over", async () => {
    await expectProblem(await send(" ".repeat(2 * 1024 * 1024)), "too-large");
    const full = envelope({}) + " ".repeat(1024 * 1024 - envelope({}).length);
    expect((await send(full)).status).toBe(200);
    const body = await expectProblem(await send(full + " "), "too-large");
    expect(body.detail).toBe("The most is 1048576 bytes.");
  });

  test("too-large: a stream without a length is counted, and not read to its end", async () => {
    let pulled = 0;
    const endless = new ReadableStream({
      pull(controller) {
        pulled += 1;
        controller.enqueue(new Uint8Array(256 * 1024).fill(32));
      },
    });
    await expectProblem(await send(endless), "too-large");
    expect(pulled).toBeLessThan(10);
  });

  test("too-large: 501 entries or seals, whatever else is wrong with them", async () => {
    const many = await expectProblem(
      await send(envelope({ entries: Array.from({ length: 501 }, () => 1) })),
      "too-large",
    );
    expect(many.detail).toBe("The most is 500 entries.");
    await expectProblem(await send(envelope({ seals: Array.from({ length: 501 }, () => 1) })), "too-large");
    await expectProblem(
      await send(envelope({ entries: Array.from({ length: 500 }, () => 1) })),
      "wrong-shape",
    );
  });

  test.each<[string, string, string[]]>([
    ["no object", "[]", [""]],
    ["nothing at all", "null", [""]],
    ["all members missing", "{}", ["/device", "/entries", "/seals"]],
    ["a device that is no UUID", envelope({ device: "x" }), ["/device"]],
    [
      "a walk in capitals",
      envelope({ entries: [{ walk: randomUUID().toUpperCase(), seq: 0 }] }),
      ["/entries/0/walk"],
    ],
    ["entries that are no list", envelope({ entries: {} }), ["/entries"]],
    ["an element without a walk", envelope({ entries: [{ seq: 0 }] }), ["/entries/0/walk"]],
    ["an element without a number", envelope({ entries: [entry(0), entry("1")] }), ["/entries/1/seq"]],
    ["a negative number", envelope({ entries: [entry(-1)] }), ["/entries/0/seq"]],
    ["half a number", envelope({ entries: [entry(0.5)] }), ["/entries/0/seq"]],
    ["a seal without a walk", envelope({ seals: [{}] }), ["/seals/0/walk"]],
  ])("wrong-shape: %s", async (_, body, pointers) => {
    const { errors } = (await expectProblem(await send(body), "wrong-shape")) as {
      errors: { pointer: string; detail: string }[];
    };
    expect(errors.map(({ pointer }) => pointer)).toEqual(pointers);
    for (const { detail } of errors) expect(detail).not.toBe("");
  });
});

describe("sessions", () => {
  test("a session cookie says who is there, until it is signed out", async () => {
    const member = await givenMember({ role: "installer" });
    const { cookie, ...itself } = member;
    const there = await whoAmI(request("GET", "/api/session", member));
    expect(await there.json()).toEqual({ member: itself });
    expect(there.headers.get("set-cookie")).toBeNull();
    const out = await signOut(request("DELETE", "/api/session", { cookie }));
    expect([out.status, await out.text()]).toEqual([204, ""]);
    expect(out.headers.get("set-cookie")).toBe("hookfast=; HttpOnly; Max-Age=0; Path=/; SameSite=Lax");
    await expectProblem(await whoAmI(request("GET", "/api/session", member)), "signed-out");
    expect((await signOut(request("DELETE", "/api/session", member))).status).toBe(204);
  });

  test("nobody is there without a cookie", async () => {
    await expectProblem(await whoAmI(request("GET", "/api/session", null)), "signed-out");
  });

  test("signing in is refused from elsewhere too", async () => {
    const headers = { origin: "https://elsewhere.example" };
    await expectProblem(await signIn(request("POST", "/api/session", null, {}, headers)), "foreign-origin");
  });
});

describe("not found", () => {
  test("what belongs to others, what is not there and what could not be look the same", async () => {
    const other = await givenMember({ role: "manager" });
    const device = await givenDevice(other);
    const rig = await givenRig(other.organisation);
    const walk = new WalkBuilder({ member: other, device, rig });
    const sent = await sendEntries(
      request("POST", "/api/field/entries", other, {
        device: device.id,
        entries: walk.entries(),
        seals: [],
      }),
    );
    expect(sent.status).toBe(200);
    const ask = async (id: string, read: typeof readWalk) => {
      const response = await read(request("GET", `/api/walks/${id}`, driver), {
        params: Promise.resolve({ id }),
      });
      return [response.status, [...response.headers], await response.text()];
    };
    const nowhere = await ask(randomUUID(), readWalk);
    expect(nowhere[0]).toBe(404);
    for (const id of [walk.id, "x", walk.id.toUpperCase(), "%00", "'"]) {
      expect(await ask(id, readWalk)).toEqual(nowhere);
      expect(await ask(id, readRecord)).toEqual(nowhere);
    }
    const anywhere = await unknown.GET();
    expect([anywhere.status, [...anywhere.headers], await anywhere.text()]).toEqual(nowhere);
  });

  test("every method of an unknown address", async () => {
    for (const handler of Object.values(unknown)) await expectProblem(await handler(), "not-found");
    expect(Object.keys(unknown).sort()).toEqual(["DELETE", "GET", "OPTIONS", "PATCH", "POST", "PUT"]);
  });
});

describe("devices", () => {
  const register = (who: GivenMember, over: object) => {
    const { id, alg, publicKey } = newKey();
    const body = { id, alg, publicKey, label: "my phone", ...over };
    return registerDevice(request("POST", "/api/devices", who, body));
  };

  test("the first time 201, the same again 200 with the label it has", async () => {
    const { id, alg, publicKey } = newKey("ES256");
    const first = await register(driver, { id, alg, publicKey });
    expect(first.status).toBe(201);
    const registered = await first.json();
    expect(registered).toMatchObject({ id, alg, label: "my phone" });
    const again = await register(driver, {
      id,
      alg,
      publicKey: { ...publicKey, use: "sig", kid: "ignored" },
      label: "renamed",
    });
    expect(again.status).toBe(200);
    expect(await again.json()).toEqual(registered);
  });

  test("device-taken: another key, or another member, under the same id", async () => {
    const { id, alg, publicKey } = newKey();
    await register(driver, { id, alg, publicKey });
    await expectProblem(await register(driver, { id }), "device-taken");
    await expectProblem(await register(auditor, { id, alg, publicKey }), "device-taken");
  });

  test("an id written in capitals is the same device", async () => {
    const { id, alg, publicKey } = newKey();
    const capitals = await register(driver, { id: id.toUpperCase(), alg, publicKey });
    expect(await capitals.json()).toMatchObject({ id });
    expect((await register(driver, { id, alg, publicKey })).status).toBe(200);
  });

  test("the same key may have two ids", async () => {
    const { alg, publicKey } = newKey();
    for (let times = 0; times < 2; times += 1) {
      expect((await register(driver, { alg, publicKey })).status).toBe(201);
    }
  });

  test("registered twice at the same moment", async () => {
    const { id, alg, publicKey } = newKey();
    const both = await Promise.all([0, 1].map(() => register(driver, { id, alg, publicKey })));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 201]);
  });

  test.each<[string, (key: ReturnType<typeof newKey>) => object, string]>([
    ["an algorithm that the key does not have", () => ({ alg: "ES256" }), "/alg"],
    ["an unknown algorithm", () => ({ alg: "RS256" }), "/alg"],
    ["an id that is no UUID", () => ({ id: "phone" }), "/id"],
    [
      "a key of small order",
      () => ({ publicKey: { kty: "OKP", crv: "Ed25519", x: "A".repeat(43) } }),
      "/publicKey",
    ],
    ["a private key", ({ publicKey }) => ({ publicKey: { ...publicKey, d: "x" } }), "/publicKey"],
    ["an unknown kind of key", () => ({ publicKey: { kty: "RSA" } }), "/publicKey/kty"],
    ["half a key", () => ({ publicKey: { kty: "OKP", crv: "Ed25519" } }), "/publicKey/x"],
    [
      "a point that is not on its curve",
      () => ({
        alg: "ES256",
        publicKey: { kty: "EC", crv: "P-256", x: "A".repeat(43), y: "A".repeat(43) },
      }),
      "/publicKey",
    ],
    ["a label without end", () => ({ label: "x".repeat(101) }), "/label"],
  ])("wrong-shape: %s", async (_, over, pointer) => {
    const body = await expectProblem(await register(driver, over(newKey())), "wrong-shape");
    expect(body.errors).toEqual([{ pointer, detail: expect.any(String) as string }]);
  });
});
