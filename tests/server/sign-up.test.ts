import { randomUUID } from "node:crypto";
import { beforeEach, describe, expect, test, vi, afterEach } from "vitest";
import { POST as postDevice } from "@/app/api/devices/route";
import { GET as readBundle } from "@/app/api/field/bundle/route";
import { POST as sendEntries } from "@/app/api/field/entries/route";
import { GET as whoAmI, POST as signIn } from "@/app/api/session/route";
import { POST as signUp } from "@/app/api/sign-up/route";
import { digestOf } from "@/lib/domain/digest";
import type { Bundle, EnvelopeAnswer } from "@/lib/domain/field";
import type { Member } from "@/lib/domain/member";
import type { ProblemDocument } from "@/lib/domain/problem";
import type { RevisionDocument } from "@/lib/domain/revision";
import { starterDocument } from "@/lib/domain/starter";
import { tables } from "@/lib/server/database";
import { ensureServerKey } from "@/lib/server/server-key";
import { SIGN_UPS } from "@/lib/server/sign-up-limit";
import { freshDatabase } from "../support/database";
import { givenMember, givenRig, newKey, request } from "../support/given";
import { document as smallDocument, rig as smallRig } from "../support/rig";
import { WalkBuilder } from "../support/walk-builder";

freshDatabase();

const PASSWORD = "fifteen letters";
let count = 0;
let network = "";
let email = "";

beforeEach(() => {
  count += 1;
  email = `new${count}@test.example`;
  network = `192.0.2.${count}`;
});
afterEach(() => void vi.useRealTimers());

const person = (over: object = {}) => ({
  email,
  name: "Sam",
  household: "Oak Bend",
  password: PASSWORD,
  ...over,
});
const post = (body: unknown, who: { cookie: string } | null = null, headers: Record<string, string> = {}) =>
  signUp(request("POST", "/api/sign-up", who, body, { "x-forwarded-for": network, ...headers }));
const newRig = (over: object = {}) => ({
  id: randomUUID(),
  name: "Our rig",
  document: smallDocument,
  ...over,
});

async function expectProblem(response: Response, status: number, code: string): Promise<ProblemDocument> {
  const problem = (await response.json()) as ProblemDocument;
  expect([response.status, problem.code]).toEqual([status, code]);
  expect(response.headers.get("set-cookie")).toBeNull();
  return problem;
}

/** How many rows there are of all that a sign-up makes. */
async function rows(): Promise<number[]> {
  const { Organisation, Member, Rig, Revision, Session } = tables();
  return Promise.all([Organisation.count(), Member.count(), Rig.count(), Revision.count(), Session.count()]);
}

describe("a sign-up", () => {
  test("makes a household with its manager and signs in", async () => {
    const response = await post(person({ email: `  ${email.toUpperCase()} `, name: " Sam " }));
    expect(response.status).toBe(201);
    const { member } = (await response.json()) as { member: Member };
    expect(member).toEqual({
      id: expect.stringMatching(/^[0-9a-f-]{36}$/),
      name: "Sam",
      email,
      role: "manager",
      organisation: { id: expect.any(String), name: "Oak Bend", kind: "household" },
    });
    expect(response.headers.get("set-cookie")).toMatch(
      /^hookfast=[a-z0-9]{40}; HttpOnly; Max-Age=2592000; Path=\/; SameSite=Lax$/,
    );
    const cookie = response.headers.get("set-cookie")!.split(";")[0]!;
    expect(await (await whoAmI(request("GET", "/api/session", { cookie }))).json()).toEqual({ member });
    const again = await signIn(request("POST", "/api/session", null, { email, password: PASSWORD }));
    expect(again.status).toBe(200);
    const { passwordHash } = (await tables().Member.findByPk(member.id))!;
    expect(passwordHash.split("$").slice(1, 4)).toEqual(["argon2id", "v=19", "m=19456,t=2,p=1"]);
  });

  test("ends the session that was there", async () => {
    const before = await givenMember({ role: "driver" });
    expect((await post(person(), before)).status).toBe(201);
    expect((await whoAmI(request("GET", "/api/session", before))).status).toBe(401);
  });

  test("takes the member id and the rigs as the phone made them, digests of what was received", async () => {
    const member = randomUUID();
    // An unknown member and another order of members: neither may change what is stored.
    const document = { extra: { z: 1, a: [1.5] }, ...structuredClone(smallDocument) } as RevisionDocument;
    const rigs = [newRig({ document }), newRig({ name: "Second" })];
    const response = await post(person({ member, rigs }));
    expect(response.status).toBe(201);
    expect(((await response.json()) as { member: Member }).member.id).toBe(member);
    const cookie = response.headers.get("set-cookie")!.split(";")[0]!;
    const bundle = (await (
      await readBundle(request("GET", "/api/field/bundle", { cookie }))
    ).json()) as Bundle;
    expect(bundle.rigs.map(({ id, name, revision }) => [id, name, revision.digest])).toEqual([
      [rigs[0]!.id, "Our rig", digestOf(document)],
      [rigs[1]!.id, "Second", digestOf(smallDocument)],
    ]);
    expect(bundle.rigs[0]!.revision.document).toEqual(document);
  });

  test("a walk recorded before it is received after it, untouched", async () => {
    ensureServerKey();
    const [member, device] = [{ id: randomUUID() }, newKey()];
    const document = starterDocument({
      name: "Our rig",
      hitch: "ball",
      brake: "none",
      lamps: "light-bar",
      airLine: false,
      manual: { says: "not-recorded" },
    });
    const id = randomUUID();
    const revision = { id, digest: digestOf(document), document };
    const walk = new WalkBuilder({ member, device, rig: { ...smallRig, id, revision } });
    const envelope = walk.markAll({ "manual-page": "fault", "brake-ready": "fault" }).close().envelope();

    const response = await post(person({ member: member.id, rigs: [{ id, name: "Our rig", document }] }));
    const who = { cookie: response.headers.get("set-cookie")!.split(";")[0]! };
    const { alg, publicKey } = device;
    const known = { id: device.id, alg, publicKey, label: "phone" };
    expect((await postDevice(request("POST", "/api/devices", who, known))).status).toBe(201);
    const sent = await sendEntries(request("POST", "/api/field/entries", who, envelope));
    const answer = (await sent.json()) as EnvelopeAnswer;
    expect(answer.refused).toEqual([]);
    expect(answer.walks[walk.id]).toMatchObject({ digest: walk.head, state: "sealed", verdict: "hold" });
    expect(answer.walks[walk.id]!.receipt).not.toBeNull();
  });
});

describe("what exists already is refused, and nothing is left behind", () => {
  test("an address, in any case", async () => {
    await givenMember({ role: "driver", email });
    const before = await rows();
    await expectProblem(
      await post(person({ email: email.toUpperCase(), rigs: [newRig()] })),
      409,
      "address-taken",
    );
    expect(await rows()).toEqual(before);
  });

  test("a member id", async () => {
    const { id } = await givenMember({ role: "driver" });
    const before = await rows();
    const { errors } = await expectProblem(
      await post(person({ member: id, rigs: [newRig()] })),
      409,
      "id-taken",
    );
    expect(errors).toEqual([{ pointer: "/member", detail: "exists already" }]);
    expect(await rows()).toEqual(before);
  });

  test("another organisation's rig id, which stays theirs", async () => {
    const owner = await givenMember({ role: "manager" });
    const theirs = await givenRig(owner.organisation, { name: "Theirs" });
    const before = await rows();
    const rigs = [newRig(), newRig({ id: theirs.id, name: "Mine now" })];
    const { errors } = await expectProblem(await post(person({ rigs })), 409, "id-taken");
    expect(errors).toEqual([{ pointer: "/rigs/1/id", detail: "exists already" }]);
    expect(await rows()).toEqual(before);
    expect(await tables().Rig.findByPk(theirs.id, { raw: true })).toMatchObject({
      name: "Theirs",
      keeperId: owner.organisation.id,
    });
    expect(await tables().Revision.count({ where: { rigId: theirs.id } })).toBe(1);
    // Nothing of the refused one stands in the way of the next.
    expect((await post(person({ rigs: rigs.slice(0, 1) }))).status).toBe(201);
  });

  test("of many at once for one address, one comes about", async () => {
    const before = await rows();
    const answers = await Promise.all(Array.from({ length: 5 }, () => post(person({ rigs: [newRig()] }))));
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409, 409]);
    expect(await rows()).toEqual(before.map((each) => each + 1));
  });
});

describe("what is not of the expected shape", () => {
  const taller = (depth: number): unknown => (depth === 0 ? 0 : [taller(depth - 1)]);
  test.each<[string, () => object, string]>([
    ["a password of fourteen characters", () => ({ password: "x".repeat(14) }), "/password"],
    ["fourteen characters of two units each", () => ({ password: "😀".repeat(14) }), "/password"],
    ["no address", () => ({ email: " " }), "/email"],
    ["an address without an @", () => ({ email: "sam" }), "/email"],
    ["no name", () => ({ name: " " }), "/name"],
    ["a household of 101 characters", () => ({ household: "x".repeat(101) }), "/household"],
    ["a member that is no id", () => ({ member: "me" }), "/member"],
    ["a member id in capitals", () => ({ member: randomUUID().toUpperCase() }), "/member"],
    ["six rigs", () => ({ rigs: Array.from({ length: 6 }, () => newRig()) }), "/rigs"],
    [
      "the same rig twice",
      () => {
        const rig = newRig();
        return { rigs: [rig, rig] };
      },
      "/rigs",
    ],
    ["a rig without a name", () => ({ rigs: [newRig({ name: "" })] }), "/rigs/0/name"],
    ["a document without walks", () => ({ rigs: [newRig({ document: { v: 1 } })] }), "/rigs/0/document"],
    [
      "a number that no record holds",
      () => ({ rigs: [newRig({ document: { ...smallDocument, x: 0.1234567 } })] }),
      "/rigs/0/document/x",
    ],
    [
      "a lone surrogate",
      () => ({ rigs: [newRig(), newRig({ document: { ...smallDocument, x: "\ud800" } })] }),
      "/rigs/1/document/x",
    ],
    [
      "nesting without end",
      () => ({ rigs: [newRig({ document: { ...smallDocument, x: taller(40) } })] }),
      "/rigs/0/document/x",
    ],
  ])("%s", async (_, change, pointer) => {
    const before = await rows();
    const { errors } = await expectProblem(await post(person(change())), 422, "wrong-shape");
    expect(errors!.some((error) => error.pointer.startsWith(pointer))).toBe(true);
    expect(await rows()).toEqual(before);
  });

  test("fifteen characters are enough, whatever they are", async () => {
    expect((await post(person({ password: " ".repeat(15) }))).status).toBe(201);
  });

  test("more than a mebibyte", async () => {
    await expectProblem(await post(person({ name: "x".repeat(1024 * 1024) })), 413, "too-large");
  });

  test("text that is no JSON", async () => {
    await expectProblem(await post("{"), 400, "not-json");
  });

  test("a request from another site", async () => {
    const before = await rows();
    const foreign = { origin: "https://elsewhere.example", "sec-fetch-site": "cross-site" };
    await expectProblem(await post(person(), null, foreign), 403, "foreign-origin");
    expect(await rows()).toEqual(before);
  });
});

describe("too many", () => {
  test("to one address, whatever came of them, until an hour is over", async () => {
    vi.useFakeTimers({ toFake: ["Date"], now: new Date("2026-05-01T12:00:00.000Z") });
    expect((await post(person())).status).toBe(201);
    for (let more = 1; more < SIGN_UPS.toAddress; more += 1) {
      await expectProblem(await post(person({ email: ` ${email.toUpperCase()}` })), 409, "address-taken");
    }
    vi.setSystemTime(new Date("2026-05-01T12:59:00.500Z"));
    const refused = await post(person(), null, { "x-forwarded-for": "198.51.100.1" });
    expect(refused.headers.get("retry-after")).toBe("60");
    await expectProblem(refused, 429, "too-many-attempts");
    vi.setSystemTime(new Date("2026-05-01T13:00:00.001Z"));
    await expectProblem(await post(person()), 409, "address-taken");
  });

  test("from one network address, successes too; what the caller says of itself does not count", async () => {
    const before = await tables().Member.count();
    const from = (at: number) =>
      post(person({ email: `n${at}-${email}` }), null, {
        "x-forwarded-for": `203.0.113.${at}, ${network}`,
      });
    for (let at = 0; at < SIGN_UPS.fromNetwork; at += 1) expect((await from(at)).status).toBe(201);
    await expectProblem(await from(SIGN_UPS.fromNetwork), 429, "too-many-attempts");
    expect(await tables().Member.count()).toBe(before + SIGN_UPS.fromNetwork);
    const elsewhere = await post(person(), null, { "x-forwarded-for": "198.51.100.2" });
    expect(elsewhere.status).toBe(201);
  });
});
