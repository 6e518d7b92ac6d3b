import { createHash, createPublicKey, generateKeyPairSync, randomUUID, sign, verify } from "node:crypto";
import { expect, test } from "../support/product";

/*
 * A program that knows the written format and nothing of this project: its own canonical JSON, digests by Node's
 * crypto, requests by fetch. It must be able to send a walk and check what it gets back.
 */
type Json = null | boolean | number | string | Json[] | { [name: string]: Json };
type Row = { [name: string]: Json };

/** RFC 8785 for the plain strings and whole numbers used here. */
function canonical(value: Json): string {
  if (value === null || typeof value !== "object") return JSON.stringify(value);
  if (Array.isArray(value)) return `[${value.map(canonical).join(",")}]`;
  const names = Object.keys(value).sort();
  return `{${names.map((name) => `${JSON.stringify(name)}:${canonical(value[name]!)}`).join(",")}}`;
}

const sha256 = (text: string) => createHash("sha256").update(text).digest("hex");
const thumbprint = (jwk: Row) => {
  const bare: Row =
    jwk.kty === "EC"
      ? { crv: jwk.crv!, kty: "EC", x: jwk.x!, y: jwk.y! }
      : { crv: jwk.crv!, kty: "OKP", x: jwk.x! };
  return createHash("sha256").update(canonical(bare)).digest("base64url");
};

/** A version 7 UUID: 48 bits of time, then random. */
function uuidV7(): string {
  const time = Date.now().toString(16).padStart(12, "0");
  return `${time.slice(0, 8)}-${time.slice(8)}-7${randomUUID().slice(15)}`;
}

test("a program that knows only the written format sends a walk, checks its receipt and reads it back", async ({
  product,
}) => {
  const { origin } = product;
  let cookie = "";
  const post = (path: string, body: Json | string) =>
    fetch(origin + path, {
      method: "POST",
      headers: { origin, cookie, "content-type": "application/json" },
      body: typeof body === "string" ? body : JSON.stringify(body),
    });
  const get = (path: string) => fetch(origin + path, { headers: { cookie } });

  const signedIn = await post("/api/session", {
    email: "driver@demo.example",
    password: "walk the rig twice",
  });
  expect(signedIn.status).toBe(200);
  cookie = signedIn.headers.get("set-cookie")!.split(";")[0]!;
  const { member } = (await signedIn.json()) as { member: { id: string } };

  const { publicKey, privateKey } = generateKeyPairSync("ec", { namedCurve: "P-256" });
  const jwk = publicKey.export({ format: "jwk" }) as Row;
  const device = randomUUID();
  const registration = { id: device, alg: "ES256", publicKey: jwk, label: "a stranger" };
  expect((await post("/api/devices", registration)).status).toBe(201);
  expect((await post("/api/devices", registration)).status).toBe(200);

  const bundle = (await (await get("/api/field/bundle")).json()) as {
    rigs: { id: string; revision: { digest: string; document: Row } }[];
    keys: Row[];
  };
  expect(bundle.rigs).toHaveLength(1);
  const [rig] = bundle.rigs;
  expect(sha256(canonical(rig!.revision.document))).toBe(rig!.revision.digest);
  const checks = (rig!.revision.document.walks as { "hook-up": { full: string[] } })["hook-up"].full;

  const walk = uuidV7();
  const entries: Row[] = [];
  let prev = rig!.revision.digest;
  const add = (type: string, body: Row) => {
    const seq = entries.length;
    const at = new Date(Date.UTC(2026, 4, 1, 8) + seq * 20_000).toISOString();
    const when = { at, elapsedMs: seq * 20_000, monoMs: 5_000 + seq * 20_000, monoEpoch: "one" };
    const entry: Row = { v: 1, walk, seq, type, ...when, body, prev };
    entries.push(entry);
    prev = sha256(canonical(entry));
  };
  const revision = rig!.revision.digest;
  add("open", {
    rig: rig!.id,
    revision,
    purpose: "hook-up",
    depth: "full",
    device,
    member: member.id,
    app: "stranger 1",
  });
  for (const check of checks) add("mark", { check, outcome: "good" });
  add("weather", { words: "rain, and an entry type that nobody knows", ünknown: true });
  add("close", { verdict: "no-hold", marks: checks.length, faults: 0 });
  const seal = prev;
  const message = Buffer.from(`hookfast-walk-v1:${seal}`, "ascii");
  const signature = sign("sha256", message, { key: privateKey, dsaEncoding: "ieee-p1363" }).toString(
    "base64url",
  );
  const seals = [{ walk, seal, alg: "ES256", signature }];

  type Answer = {
    walks: Record<
      string,
      { stored: number; digest: string | null; state: string; verdict: string; receipt: Row | null }
    >;
    refused: { walk: string; seq: number | null; code: string }[];
  };
  const send = async (part: Row[], sealed: Row[] = []) => {
    const answer = await post("/api/field/entries", { device, entries: part, seals: sealed });
    expect(answer.status).toBe(200);
    const { walks, refused } = (await answer.json()) as Answer;
    return { ...walks[walk]!, refused: refused.map(({ seq, code }) => [seq, code]) };
  };

  // The end before the beginning, the seal before the end, cut, doubled, and a second content at a stored number.
  expect(await send(entries.slice(5))).toMatchObject({ stored: 0, digest: null, refused: [[5, "gap"]] });
  expect(await send(entries.slice(0, 3))).toMatchObject({ stored: 3, state: "open", refused: [] });
  expect(await send(entries.slice(0, 3))).toMatchObject({ stored: 3, refused: [] });
  expect(await send([], seals)).toMatchObject({ stored: 3, refused: [[null, "incomplete"]] });
  const cut = JSON.stringify({ device, entries: entries.slice(3), seals }).slice(0, -40);
  expect((await post("/api/field/entries", cut)).status).toBe(400);
  expect(await send([{ ...entries[1]!, body: { check: checks[0]!, outcome: "fault" } }])).toMatchObject({
    stored: 3,
    refused: [[1, "fork"]],
  });
  const whole = await send(entries, seals);
  expect(whole).toMatchObject({
    stored: entries.length,
    digest: seal,
    state: "sealed",
    verdict: "no-hold",
    refused: [],
  });
  const again = await send(entries.slice(-2), seals);
  expect(again.receipt).toEqual(whole.receipt);

  const { signature: receiptSignature, ...signed } = whole.receipt as Row & {
    signature: string;
    kid: string;
  };
  const { keys } = (await (await fetch(`${origin}/api/keys`)).json()) as { keys: Row[] };
  expect(keys).toEqual(bundle.keys);
  const key = keys.find((candidate) => thumbprint(candidate) === signed.kid)!;
  const serverKey = createPublicKey({
    key: key as unknown as import("node:crypto").JsonWebKey,
    format: "jwk",
  });
  const receiptText = Buffer.from(`hookfast-receipt-v1:${sha256(canonical(signed as Row))}`, "ascii");
  expect(verify(null, receiptText, serverKey, Buffer.from(receiptSignature, "base64url"))).toBe(true);
  expect(signed).toMatchObject({ v: 1, walk, seal, entries: entries.length, verdict: "no-hold" });

  const record = await get(`/api/walks/${walk}/record`);
  expect(record.headers.get("content-type")).toContain("application/x-ndjson");
  const lines = (await record.text()).split("\n");
  expect(lines.pop()).toBe("");
  expect(lines.slice(1, -1)).toEqual(entries.map(canonical));
  expect(JSON.parse(lines[0]!)).toEqual({ revision: rig!.revision.document });
  const last = JSON.parse(lines.at(-1)!) as Row & { device: Row };
  expect(last).toMatchObject({ seal, alg: "ES256", signature, receipt: whole.receipt });
  expect(thumbprint(last.device)).toBe(thumbprint(jwk));

  const list = (await (await get("/api/walks?limit=200")).json()) as { walks: Row[] };
  expect(list.walks.find(({ id }) => id === walk)).toMatchObject({ rig: rig!.id, revision, state: "sealed" });
});
