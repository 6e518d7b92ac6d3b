import { createHash, randomBytes } from "node:crypto";
import { mkdtempSync, readdirSync, readFileSync, rmSync, unlinkSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { QueryTypes } from "sequelize";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { GET as readPhoto, POST as askForPhoto, PUT as sendPhoto } from "@/app/api/photos/[sha256]/route";
import { POST as makeRig } from "@/app/api/rigs/route";
import { GET as readWalk } from "@/app/api/walks/[id]/route";
import { walkReadingShape } from "@/lib/domain/history";
import { PHOTO, photoAnswerShape, type PhotoMime, type PhotoPut } from "@/lib/domain/photo";
import type { ProblemCode } from "@/lib/domain/problem";
import { database, tables } from "@/lib/server/database";
import { ingest } from "@/lib/server/ingest/ingest";
import { signedPut } from "@/lib/server/photos/link";
import { placeFor, recordedQuery } from "@/lib/server/photos/sending";
import { settings } from "@/lib/server/settings";
import { down, up } from "@/migrations/0002-photos";
import { freshDatabase } from "../support/database";
import {
  givenDevice,
  givenMember,
  givenOrganisation,
  givenRig,
  request,
  type GivenMember,
  type Key,
} from "../support/given";
import { WalkBuilder } from "../support/walk-builder";

const folder = mkdtempSync(path.join(tmpdir(), "hookfast-photos-"));
process.env.PHOTOS_DIR = folder;
freshDatabase();
afterAll(() => rmSync(folder, { recursive: true }));

type Rig = Awaited<ReturnType<typeof givenRig>>;
type Named = { bytes?: number; mime?: string; check?: string };

let driver: GivenMember;
let device: Key;
let rig: Rig;
let stranger: GivenMember;
let auditor: GivenMember;

beforeAll(async () => {
  driver = await givenMember({ role: "driver" });
  device = await givenDevice(driver);
  rig = await givenRig(driver.organisation);
  auditor = await givenMember({ role: "auditor", organisation: driver.organisation });
  stranger = await givenMember({ role: "manager" });
});

/** Something nobody has sent before. */
function photo(size = 5_000) {
  const bytes = randomBytes(size);
  return { bytes, sha256: createHash("sha256").update(bytes).digest("hex") };
}

/** A walk in the database that names the photograph. */
async function named(
  { sha256, bytes }: { sha256: string; bytes: Buffer },
  over: Named = {},
  by: { member: GivenMember; device: Key; rig: Rig } = { member: driver, device, rig },
): Promise<WalkBuilder> {
  const walk = new WalkBuilder(by).add("photo", { sha256, bytes: bytes.length, mime: "image/jpeg", ...over });
  const { refused } = await ingest(by.member, { device: by.device.id, entries: walk.entries(), seals: [] });
  expect(refused).toEqual([]);
  return walk;
}

const at = (sha256: string) => ({ params: Promise.resolve({ sha256 }) });
const ask = (sha256: string, who: GivenMember | null = driver, headers = {}) =>
  askForPhoto(request("POST", `/api/photos/${sha256}`, who, undefined, headers), at(sha256));
const read = (sha256: string, who: GivenMember | null = driver) =>
  readPhoto(request("GET", `/api/photos/${sha256}`, who), at(sha256));

async function placeOf(sha256: string, who: GivenMember = driver): Promise<PhotoPut> {
  const answer = await ask(sha256, who);
  expect(answer.status).toBe(200);
  const parsed = photoAnswerShape.parse(await answer.json());
  if ("have" in parsed) throw new Error("it is there already");
  return parsed.put;
}

/** Makes the request that a link stands for, or one that differs from it. */
function put(
  link: PhotoPut,
  body: BodyInit | null,
  over: { who?: GivenMember | null; headers?: Record<string, string>; url?: string } = {},
): Promise<Response> {
  const { who = driver, headers = {}, url = link.url } = over;
  const sent = new Request(settings.ORIGIN + url, {
    method: "PUT",
    headers: {
      ...(who && { cookie: who.cookie }),
      origin: settings.ORIGIN,
      ...link.headers,
      ...headers,
    },
    body,
    duplex: "half",
  } as RequestInit);
  return sendPhoto(sent, at(new URL(url, settings.ORIGIN).pathname.split("/").at(-1)!));
}

async function expectProblem(response: Response, status: number, code: ProblemCode): Promise<void> {
  expect([response.status, await response.json()]).toMatchObject([status, { code }]);
}

const pieces = (chunks: Uint8Array[], end: "close" | "break" = "close") =>
  new ReadableStream<Uint8Array>({
    pull(controller) {
      const next = chunks.shift();
      if (next) return controller.enqueue(next);
      if (end === "break") controller.error(new TypeError("terminated"));
      else controller.close();
    },
  });

/** The files kept for an organisation, and what was left behind on the way to one. */
const files = (organisation = driver.organisation.id) =>
  readdirSync(path.join(folder, organisation), { recursive: true, encoding: "utf8" }).filter(
    (name) => path.basename(name).length > 2,
  );
const partials = () => files().filter((name) => name.endsWith(".partial"));

describe("a photograph on its way", () => {
  test("is asked for, sent and read back to the byte", async () => {
    const one = photo();
    await named(one);
    expect((await read(one.sha256)).status).toBe(404);

    const link = await placeOf(one.sha256);
    expect(link).toMatchObject({ method: "PUT", headers: { "content-type": "image/jpeg" } });
    expect(link.url).toMatch(new RegExp(`^/api/photos/${one.sha256}\\?`));
    expect(Date.parse(link.expiresAt) - Date.now()).toBeGreaterThan(60_000);
    const sent = await put(link, one.bytes);
    expect([sent.status, await sent.text()]).toEqual([204, ""]);

    expect(await (await ask(one.sha256)).json()).toEqual({ have: true });
    const back = await read(one.sha256);
    expect(Buffer.from(await back.arrayBuffer()).equals(one.bytes)).toBe(true);
    expect(Object.fromEntries(back.headers)).toEqual({
      "cache-control": "private, max-age=31536000, immutable",
      "content-disposition": `inline; filename="hookfast-photograph-${one.sha256.slice(0, 12)}.jpg"`,
      "content-length": "5000",
      "content-security-policy": "default-src 'none'; sandbox",
      "content-type": "image/jpeg",
      "cross-origin-resource-policy": "same-origin",
      vary: "cookie",
      "x-content-type-options": "nosniff",
    });
  });

  test("is kept where only the owner of the process reads", async () => {
    const one = photo();
    await named(one);
    await put(await placeOf(one.sha256), one.bytes);
    const [name] = files().filter((each) => each.endsWith(one.sha256));
    expect(name).toBe(path.join(one.sha256.slice(0, 2), one.sha256));
    expect(readFileSync(path.join(folder, driver.organisation.id, name!)).equals(one.bytes)).toBe(true);
  });

  test("may be sent again, and by two at once: one file, one row, nothing left over", async () => {
    const one = photo(200_000);
    await named(one);
    const link = await placeOf(one.sha256);
    const slowly = () => pieces([one.bytes.subarray(0, 90_000), one.bytes.subarray(90_000)]);
    const answers = await Promise.all([
      put(link, slowly()),
      put(link, one.bytes),
      put(await placeOf(one.sha256), slowly()),
    ]);
    expect(answers.map(({ status }) => status)).toEqual([204, 204, 204]);
    expect((await put(link, one.bytes)).status).toBe(204);
    expect(files().filter((name) => name.includes(one.sha256))).toHaveLength(1);
    const where = { sha256: Buffer.from(one.sha256, "hex") };
    expect(await tables().PhotoObject.findAll({ where, raw: true })).toMatchObject([
      { organisationId: driver.organisation.id, bytes: 200_000, mime: "image/jpeg" },
    ]);
    expect(Buffer.from(await (await read(one.sha256)).arrayBuffer()).equals(one.bytes)).toBe(true);
  });

  test("one of two senders that sends rubbish does not spoil the other", async () => {
    const one = photo();
    await named(one);
    const link = await placeOf(one.sha256);
    const answers = await Promise.all([put(link, randomBytes(5_000)), put(link, one.bytes)]);
    expect(answers.map(({ status }) => status)).toEqual([422, 204]);
    expect((await put(link, randomBytes(5_000))).status).toBe(422);
    expect(Buffer.from(await (await read(one.sha256)).arrayBuffer()).equals(one.bytes)).toBe(true);
  });

  test("whose file went missing is asked for again", async () => {
    const one = photo();
    await named(one);
    await put(await placeOf(one.sha256), one.bytes);
    const [name] = files().filter((each) => each.endsWith(one.sha256));
    unlinkSync(path.join(folder, driver.organisation.id, name!));
    expect((await read(one.sha256)).status).toBe(404);
    expect((await put(await placeOf(one.sha256), one.bytes)).status).toBe(204);
    expect((await read(one.sha256)).status).toBe(200);
  });

  test("that came without being noted, as to a store that does not tell, is noted when asked", async () => {
    const one = photo();
    await named(one);
    await put(await placeOf(one.sha256), one.bytes);
    await tables().PhotoObject.destroy({ where: { sha256: Buffer.from(one.sha256, "hex") } });
    expect((await read(one.sha256)).status).toBe(404);
    expect(await (await ask(one.sha256)).json()).toEqual({ have: true });
    expect((await read(one.sha256)).status).toBe(200);
  });
});

describe("asking is refused", () => {
  test("from elsewhere, without a session, and to a role that makes no walks", async () => {
    const { sha256 } = photo();
    await expectProblem(await ask(sha256, driver, { origin: "https://x.example" }), 403, "foreign-origin");
    await expectProblem(await ask(sha256, null), 401, "signed-out");
    await expectProblem(await ask(sha256, auditor), 403, "role-refused");
  });

  test("byte for byte alike: nobody named it, another organisation did, or it is no digest", async () => {
    const one = photo();
    const nobody = await ask(one.sha256);
    await named(one);
    const foreign = await ask(one.sha256, stranger);
    const none = [await ask("ab"), await ask(one.sha256.toUpperCase()), await ask("../../etc/passwd")];
    const texts = await Promise.all([nobody, foreign, ...none].map((answer) => answer.text()));
    expect(new Set(texts).size).toBe(1);
    for (const answer of [nobody, foreign, ...none]) expect(answer.status).toBe(404);
    expect((await ask(one.sha256)).status).toBe(200);
  });

  test("an entry that was refused names nothing", async () => {
    const one = photo();
    const walk = new WalkBuilder({ member: driver, device, rig });
    walk.add("photo", { sha256: one.sha256, bytes: 5_000, mime: "image/jpeg" });
    const { refused } = await ingest(driver, { device: device.id, entries: walk.entries(1), seals: [] });
    expect(refused).toMatchObject([{ seq: 1, code: "gap" }]);
    expect((await ask(one.sha256)).status).toBe(404);
  });

  test.each<[Named, number, ProblemCode]>([
    [{ bytes: PHOTO.bytes + 1 }, 413, "too-large"],
    [{ bytes: Number.MAX_SAFE_INTEGER }, 413, "too-large"],
    [{ mime: "text/html" }, 415, "wrong-media"],
    [{ mime: "image/svg+xml" }, 415, "wrong-media"],
    [{ mime: "image/jpeg; x=é😀" }, 415, "wrong-media"],
  ])("recorded as %j", async (over, status, code) => {
    const one = photo();
    await named(one, over);
    await expectProblem(await ask(one.sha256), status, code);
  });

  test("what a colleague wrote beside the digest does not keep the one who took it from sending", async () => {
    const one = photo();
    const colleague = await givenMember({ role: "driver", organisation: driver.organisation });
    const by = { member: colleague, device: await givenDevice(colleague), rig };
    await named(one, { bytes: 7, mime: "text/html" }, by);
    await named(one);
    expect((await put(await placeOf(one.sha256), one.bytes)).status).toBe(204);
  });
});

describe("sending is refused, and nothing is kept", () => {
  async function given(size = 5_000) {
    const one = photo(size);
    await named(one);
    return { ...one, link: await placeOf(one.sha256) };
  }
  const altered = (link: PhotoPut, name: string, value: string) => {
    const url = new URL(link.url, settings.ORIGIN);
    url.searchParams.set(name, value);
    return url.pathname + url.search;
  };
  async function expectNothingKept(sha256: string): Promise<void> {
    expect(files().filter((name) => name.includes(sha256))).toEqual([]);
    expect((await ask(sha256)).status).toBe(200);
    expect(await (await ask(sha256)).json()).not.toEqual({ have: true });
    expect(partials()).toEqual([]);
  }

  test("from elsewhere, or with no origin at all", async () => {
    const { bytes, link, sha256 } = await given();
    const foreign = { headers: { origin: "https://x.example" } };
    await expectProblem(await put(link, bytes, foreign), 403, "foreign-origin");
    const bare = new Request(settings.ORIGIN + link.url, {
      method: "PUT",
      headers: { cookie: driver.cookie, ...link.headers },
      body: new Uint8Array(bytes),
    });
    await expectProblem(await sendPhoto(bare, at(sha256)), 403, "foreign-origin");
    await expectNothingKept(sha256);
  });

  test("without a session, by a role that makes no walks, by another organisation", async () => {
    const { bytes, link, sha256 } = await given();
    await expectProblem(await put(link, bytes, { who: null }), 401, "signed-out");
    await expectProblem(await put(link, bytes, { who: auditor }), 403, "role-refused");
    await expectProblem(await put(link, bytes, { who: stranger }), 403, "bad-link");
    await expectNothingKept(sha256);
  });

  test.each([
    ["bytes", "5001"],
    ["mime", "image/png"],
    ["expires", String(Date.now() + 10 * 365 * 86_400_000)],
    ["signature", "A".repeat(43)],
    ["signature", ""],
  ])("a link with another %s: %s", async (name, value) => {
    const { bytes, link, sha256 } = await given();
    const headers: Record<string, string> = name === "mime" ? { "content-type": value } : {};
    const answer = await put(link, bytes, { url: altered(link, name, value), headers });
    await expectProblem(answer, 403, "bad-link");
    await expectNothingKept(sha256);
  });

  test("a link for another photograph", async () => {
    const { bytes, link, sha256 } = await given();
    const other = await given();
    const url = link.url.replace(sha256, other.sha256);
    await expectProblem(await put(link, bytes, { url }), 403, "bad-link");
    await expectNothingKept(other.sha256);
  });

  test("a link that ran out, to the millisecond", async () => {
    const { bytes, sha256 } = await given();
    const organisation = driver.organisation.id;
    const about = { organisation, sha256, bytes: 5_000, mime: "image/jpeg" as PhotoMime };
    const old = signedPut(about, new Date(Date.now() - 10 * 60_000));
    await expectProblem(await put(old, bytes), 403, "bad-link");
    await expectNothingKept(sha256);
    const young = signedPut(about, new Date(Date.now() - 9 * 60_000));
    expect((await put(young, bytes)).status).toBe(204);
  });

  test.each([
    ["bytes", String(PHOTO.bytes + 1)],
    ["bytes", "-1"],
    ["bytes", "x"],
    ["mime", "text/html"],
    ["expires", "soon"],
    ["more", "1"],
  ])("a query that is none: %s=%s", async (name, value) => {
    const { bytes, link, sha256 } = await given();
    const answer = await put(link, bytes, { url: altered(link, name, value) });
    await expectProblem(answer, 422, "wrong-shape");
    await expectNothingKept(sha256);
  });

  test("as something else than was recorded", async () => {
    const { bytes, link, sha256 } = await given();
    for (const type of ["image/png", "text/html", "image/jpeg; charset=x"]) {
      await expectProblem(await put(link, bytes, { headers: { "content-type": type } }), 415, "wrong-media");
    }
    await expectNothingKept(sha256);
  });

  test("with one byte more, told beforehand or not", async () => {
    const { bytes, link, sha256 } = await given();
    const told = { headers: { "content-length": "5001" } };
    await expectProblem(await put(link, pieces([bytes, Buffer.from("x")]), told), 413, "too-large");
    await expectProblem(await put(link, pieces([bytes, Buffer.from("x")])), 413, "too-large");
    await expectNothingKept(sha256);
  });

  test("without end: no more is read than was recorded, and a chunk", async () => {
    const { link, sha256 } = await given();
    let pulled = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        pulled += 1;
        controller.enqueue(randomBytes(1_000));
      },
    });
    await expectProblem(await put(link, endless), 413, "too-large");
    expect(pulled).toBeLessThan(12);
    await expectNothingKept(sha256);
  });

  test("cut short, broken off, empty, or other bytes of the same length", async () => {
    const { bytes, link, sha256 } = await given();
    const bodies = [
      bytes.subarray(0, 4_999),
      pieces([bytes.subarray(0, 2_000)], "break"),
      null,
      pieces([]),
      randomBytes(5_000),
    ];
    for (const body of bodies) await expectProblem(await put(link, body), 422, "wrong-content");
    await expectNothingKept(sha256);
    expect((await put(link, bytes)).status).toBe(204);
  });

  test("when the right bytes were recorded with the wrong length", async () => {
    const one = photo();
    await named(one, { bytes: 6_000 });
    await expectProblem(await put(await placeOf(one.sha256), one.bytes), 422, "wrong-content");
    await expectNothingKept(one.sha256);
  });
});

describe("who may look at a photograph", () => {
  test("whoever may read a walk that names it, and to the others it is not there", async () => {
    const fleet = await givenOrganisation();
    const before = await givenOrganisation("household");
    const people = {
      driver: await givenMember({ role: "driver", organisation: before }),
      colleague: await givenMember({ role: "driver", organisation: before }),
      manager: await givenMember({ role: "manager", organisation: before }),
      keepersDriver: await givenMember({ role: "driver", organisation: fleet }),
      keepersAuditor: await givenMember({ role: "auditor", organisation: fleet }),
      stranger,
    };
    const bought = await givenRig(before);
    const by = { member: people.driver, device: await givenDevice(people.driver), rig: bought };
    const one = photo();
    await named(one, {}, by);
    await put(await placeOf(one.sha256, people.driver), one.bytes, { who: people.driver });

    const seen = async () => {
      const answers = await Promise.all(Object.values(people).map((who) => read(one.sha256, who)));
      return Object.keys(people).filter((_, index) => answers[index]!.status === 200);
    };
    expect(await seen()).toEqual(["driver", "manager"]);
    await tables().Rig.update({ keeperId: fleet.id }, { where: { id: bought.id } });
    expect(await seen()).toEqual(["driver", "manager", "keepersAuditor"]);

    const refusals = [await read(one.sha256, stranger), await read(photo().sha256), await read("no digest")];
    const texts = await Promise.all(refusals.map((answer) => answer.text()));
    expect(new Set(texts).size).toBe(1);
    await expectProblem(await read(one.sha256, null), 401, "signed-out");
  });

  test("knowing the digest gives nobody the bytes: each organisation has only what it sent", async () => {
    const one = photo();
    await named(one);
    await put(await placeOf(one.sha256), one.bytes);
    const theirs = {
      member: stranger,
      device: await givenDevice(stranger),
      rig: await givenRig(stranger.organisation),
    };
    const walk = await named(one, {}, theirs);
    expect((await read(one.sha256, stranger)).status).toBe(404);
    const link = await placeOf(one.sha256, stranger);
    await expectProblem(await put(link, randomBytes(5_000), { who: stranger }), 422, "wrong-content");
    expect((await read(one.sha256, stranger)).status).toBe(404);
    expect(await photosIn(walk, stranger)).toMatchObject([{ arrived: false }]);
    expect((await put(link, one.bytes, { who: stranger })).status).toBe(204);
    expect((await read(one.sha256, stranger)).status).toBe(200);
  });
});

describe("a photograph that a rig's sheet names", () => {
  test("is sent by whoever saves the sheet, and seen by keeper and builder alone", async () => {
    const shop = await givenOrganisation("shop");
    const installer = await givenMember({ role: "installer", organisation: shop });
    const later = await givenMember({ role: "driver" });
    const one = photo();
    await expectProblem(await ask(one.sha256, installer), 404, "not-found");
    const id = crypto.randomUUID();
    const page = { sha256: one.sha256, bytes: one.bytes.length, mime: "image/jpeg" };
    const sheet = { v: 1, name: "With its page", procedure: { says: "how", page: "214", photo: page } };
    expect((await makeRig(request("POST", "/api/rigs", installer, { id, sheet }))).status).toBe(201);

    expect((await read(one.sha256, installer)).status).toBe(404);
    await expectProblem(await ask(one.sha256, stranger), 404, "not-found");
    const link = await placeOf(one.sha256, installer);
    expect((await put(link, one.bytes, { who: installer })).status).toBe(204);
    expect(await (await ask(one.sha256, installer)).json()).toEqual({ have: true });

    const seen = async () => [
      Buffer.from(await (await read(one.sha256, installer)).arrayBuffer()).equals(one.bytes),
      (await read(one.sha256, later)).status,
      (await read(one.sha256, stranger)).status,
    ];
    expect(await seen()).toEqual([true, 404, 404]);
    await tables().Rig.update({ keeperId: later.organisation.id }, { where: { id } });
    expect(await seen()).toEqual([true, 200, 404]);
  });
});

async function photosIn(walk: WalkBuilder, who: GivenMember = driver) {
  const params = { params: Promise.resolve({ id: walk.id }) };
  const answer = await readWalk(request("GET", `/api/walks/${walk.id}`, who), params);
  return walkReadingShape.parse(await answer.json()).photos;
}

describe("a walk read back", () => {
  test("says of each photograph whether it has come", async () => {
    const [one, two] = [photo(), photo()];
    const walk = new WalkBuilder({ member: driver, device, rig });
    const body = ({ sha256 }: { sha256: string }) => ({ sha256, bytes: 5_000, mime: "image/jpeg" });
    walk.add("photo", { ...body(one), check: "pin" }).mark("pin", "fault");
    walk.add("photo", body(two)).add("photo", body(one));
    await ingest(driver, { device: device.id, entries: walk.entries(), seals: [] });
    const expected = (arrived: boolean) => [
      { seq: 1, sha256: one.sha256, check: "pin", arrived },
      { seq: 3, sha256: two.sha256, check: null, arrived: false },
      { seq: 4, sha256: one.sha256, check: null, arrived },
    ];
    expect(await photosIn(walk)).toEqual(expected(false));
    await put(await placeOf(one.sha256), one.bytes);
    expect(await photosIn(walk)).toEqual(expected(true));
  });
});

describe("the tables", () => {
  test("finding by digest reads the index and no more, however many photographs there are", async () => {
    const walk = await named(photo());
    const many = Array.from({ length: 3_000 }, (_, index) => ({
      walkId: walk.id,
      seq: 100 + index,
      check: null,
      sha256: randomBytes(32),
      bytes: 1,
      mime: "image/jpeg",
    }));
    await tables().PhotoEntry.bulkCreate(many);
    const wanted = many[1_500]!.sha256.toString("hex");
    const { sql, replacements } = recordedQuery(driver, wanted);
    // ANALYZE runs the statement too and says how many rows each step really read.
    const plan = await database().query<{ table: string; key: string; r_rows: number }>(`ANALYZE ${sql}`, {
      type: QueryTypes.SELECT,
      replacements,
    });
    expect(plan.map(({ table, key, r_rows }) => [table, key, Number(r_rows)])).toEqual([
      ["p", "photo_entries_sha256", 1],
      ["w", "PRIMARY", 1],
    ]);
    expect(await placeFor(driver, wanted)).toHaveProperty("put");
    await tables().PhotoEntry.destroy({ where: { mime: "image/jpeg", bytes: 1 } });
  });

  test("are filled from entries that were there before them", async () => {
    await named(photo(), { check: "pin", mime: "image/webp", bytes: Number.MAX_SAFE_INTEGER });
    const all = () => tables().PhotoEntry.findAll({ order: ["walkId", "seq"], raw: true });
    const before = await all();
    expect(before.length).toBeGreaterThan(10);
    const note = new WalkBuilder({ member: driver, device, rig }).add("note", { text: '"type":"photo"' });
    await ingest(driver, { device: device.id, entries: note.entries(), seals: [] });
    const step = { context: database().getQueryInterface() };
    await down(step);
    await up(step);
    expect(await all()).toEqual(before);
  });
});
