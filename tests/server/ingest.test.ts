import { beforeAll, describe, expect, test, vi } from "vitest";
import type { Envelope, EnvelopeAnswer } from "@/lib/domain/field";
import { canonicalText } from "@/lib/domain/json";
import { receiptHolds } from "@/lib/domain/receipt";
import type { Algorithm } from "@/lib/domain/signature";
import { database, tables } from "@/lib/server/database";
import { ingest } from "@/lib/server/ingest/ingest";
import { serverKeys } from "@/lib/server/server-key";
import { freshDatabase } from "../support/database";
import { givenDevice, givenMember, givenRig, type GivenMember, type Key } from "../support/given";
import { WalkBuilder } from "../support/walk-builder";

freshDatabase();

let member: GivenMember;
let device: Key;
let rig: Awaited<ReturnType<typeof givenRig>>;

beforeAll(async () => {
  member = await givenMember({ role: "driver" });
  device = await givenDevice(member);
  rig = await givenRig(member.organisation);
});

const newWalk = () => new WalkBuilder({ member, device, rig });
const send = (entries: Envelope["entries"], seals: Envelope["seals"] = []) =>
  ingest(member, { device: device.id, entries, seals });
const stateOf = (answer: EnvelopeAnswer, walk: WalkBuilder) => answer.walks[walk.id];

async function storedTexts(walk: WalkBuilder): Promise<string[]> {
  const rows = await tables().Entry.findAll({ where: { walkId: walk.id }, order: ["seq"], raw: true });
  return rows.map(({ bytes }) => bytes.toString("utf8"));
}

describe("a walk that comes whole", () => {
  test("is stored byte for byte, replayed, sealed and receipted", async () => {
    const walk = newWalk().markAll().close();
    const now = new Date("2026-05-02T08:30:00.123Z");
    const answer = await ingest(member, walk.envelope(), now);
    expect(answer.refused).toEqual([]);
    const state = stateOf(answer, walk)!;
    expect(state).toMatchObject({
      stored: 7,
      digest: walk.head,
      state: "sealed",
      verdict: "no-hold",
      receipt: {
        v: 1,
        walk: walk.id,
        seal: walk.head,
        entries: 7,
        verdict: "no-hold",
        receivedAt: "2026-05-02T08:30:00.123Z",
        kid: serverKeys()[0]!.kid,
        alg: "Ed25519",
      },
    });
    expect(receiptHolds(state.receipt!, walk.head, serverKeys())).toBe(true);
    expect(await storedTexts(walk)).toEqual(walk.links.map(({ text }) => text));
    expect(await tables().Walk.findByPk(walk.id, { raw: true })).toMatchObject({
      rigId: rig.id,
      revisionId: rig.revision.id,
      memberId: member.id,
      organisationId: member.organisation.id,
      deviceId: device.id,
      purpose: "hook-up",
      depth: "full",
      source: null,
      openedAt: new Date("2026-05-01T12:00:00.000Z"),
      receivedAt: now,
      sortAt: new Date("2026-05-01T12:00:00.000Z"),
      state: "sealed",
      closedAs: null,
      marks: 5,
      faults: 0,
      entries: 7,
      elapsedMs: 60_000,
      sealedAt: now,
      sealAlg: "Ed25519",
      sealDeviceId: device.id,
    });
  });

  test("sent again has the same receipt, byte for byte, by whatever signature", async () => {
    const es256 = await givenDevice(member, "ES256");
    const walk = new WalkBuilder({ member, device: es256, rig }).markAll().close();
    const first = await ingest(member, walk.envelope(), new Date("2026-05-02T00:00:00.000Z"));
    const again = await ingest(member, walk.envelope(), new Date("2026-05-03T00:00:00.000Z"));
    expect(JSON.stringify(again)).toBe(JSON.stringify(first));
    const sealOnly = await ingest(member, { device: es256.id, entries: [], seals: [walk.seal()] });
    expect(JSON.stringify(sealOnly)).toBe(JSON.stringify(first));
  });

  test.each<Algorithm>(["Ed25519", "ES256"])("seals by a device with %s", async (alg) => {
    const key = await givenDevice(member, alg);
    const walk = new WalkBuilder({ member, device: key, rig }).markAll({ pin: "fault" }).close();
    const answer = await ingest(member, walk.envelope());
    expect(answer.refused).toEqual([]);
    expect(stateOf(answer, walk)).toMatchObject({ state: "sealed", verdict: "hold" });
  });

  test("keeps its own verdict and the phone's where they differ", async () => {
    const walk = newWalk().markAll({ cables: "fault" }).close({ verdict: "no-hold", marks: 1, faults: 0 });
    const state = stateOf(await ingest(member, walk.envelope()), walk)!;
    expect([state.verdict, state.receipt!.verdict]).toEqual(["hold", "hold"]);
    expect(await tables().Walk.findByPk(walk.id, { raw: true })).toMatchObject({
      verdict: "hold",
      closedAs: "no-hold",
      marks: 5,
      faults: 1,
    });
  });
});

describe("a walk that comes in pieces", () => {
  test("cut, doubled and out of order within a batch", async () => {
    const walk = newWalk().markAll().close();
    const [e0, e1, e2, e3, e4, e5, e6] = walk.entries() as [never, never, never, never, never, never, never];
    expect(stateOf(await send([e2, e0, e1, e0]), walk)).toEqual({
      stored: 3,
      digest: walk.links[2]!.digest,
      state: "open",
      verdict: "unfinished",
      receipt: null,
    });
    expect(stateOf(await send([e1, e2]), walk)!.stored).toBe(3);
    const answer = await send([e6, e5, e3, e4, e3, e5], [walk.seal(), walk.seal()]);
    expect(answer.refused).toEqual([]);
    expect(stateOf(answer, walk)).toMatchObject({ stored: 7, state: "sealed", verdict: "no-hold" });
    expect(await storedTexts(walk)).toEqual(walk.links.map(({ text }) => text));
  });

  test("keeps its verdict, counts and time current after every piece", async () => {
    const walk = newWalk();
    const row = () => tables().Walk.findByPk(walk.id, { raw: true });
    await send(walk.entries());
    expect(await row()).toMatchObject({ verdict: "unfinished", marks: 0, entries: 1, elapsedMs: 0 });
    walk.mark("pin", "fault");
    await send(walk.entries(1));
    expect(await row()).toMatchObject({
      verdict: "hold",
      marks: 1,
      faults: 1,
      entries: 2,
      elapsedMs: 10_000,
    });
    walk.mark("pin", "good", { because: "mis-tap" });
    await send(walk.entries(2));
    expect(await row()).toMatchObject({ verdict: "unfinished", marks: 1, faults: 0, entries: 3 });
  });

  test("sent twice at the same moment is stored once", async () => {
    const walk = newWalk().markAll().close();
    const answers = await Promise.all(Array.from({ length: 6 }, () => ingest(member, walk.envelope())));
    for (const answer of answers) {
      expect(answer.refused).toEqual([]);
      expect(JSON.stringify(answer)).toBe(JSON.stringify(answers[0]));
    }
    expect(await storedTexts(walk)).toHaveLength(7);
  });

  test("is received when its first entry came, and sealed when its seal came", async () => {
    const walk = newWalk().markAll().close();
    await ingest(member, { device: device.id, entries: walk.entries(0, 2), seals: [] }, new Date(1e12));
    const answer = await ingest(member, walk.envelope(), new Date(1e12 + 5000));
    expect(stateOf(answer, walk)!.receipt!.receivedAt).toBe("2001-09-09T01:46:45.000Z");
    expect(await tables().Walk.findByPk(walk.id, { raw: true })).toMatchObject({
      receivedAt: new Date(1e12),
      sortAt: new Date(1e12),
      sealedAt: new Date(1e12 + 5000),
    });
  });
});

describe("what is kept as it came", () => {
  test("unknown members, unknown types and names that objects inherit", async () => {
    const walk = newWalk();
    const body = JSON.parse(
      '{"__proto__":{"x":1},"constructor":"c","note":"\\u00e9\\ud83d\\ude00"}',
    ) as object;
    walk
      .add("constructor", { ...body })
      .add("toString", {})
      .add("smell", { of: "diesel" });
    const strange = JSON.parse(
      walk.links
        .at(-1)!
        .text.replace('"v":1', '"v":1,"zz":[1.5,null,true]')
        .replace("{", '{"__proto__":[1],'),
    ) as Envelope["entries"][number];
    const entries = [...walk.entries(0, -1), strange];
    const answer = await send(entries);
    expect(answer.refused).toEqual([]);
    expect(await storedTexts(walk)).toEqual(entries.map(canonicalText));
    expect((await storedTexts(walk)).at(-1)).toContain('"__proto__":[1]');
  });

  test("500 entries in one batch, in a handful of statements", async () => {
    const walk = newWalk();
    while (walk.links.length < 499) walk.mark("pin", "good");
    walk.close();
    const statements = vi.spyOn(database(), "query");
    const answer = await ingest(member, walk.envelope());
    expect(stateOf(answer, walk)).toMatchObject({ stored: 500, state: "sealed" });
    expect(statements.mock.calls.length).toBeLessThan(20);
    statements.mockRestore();
  });

  test("a walk from paper", async () => {
    const walk = new WalkBuilder({ member, device, rig, open: { source: "paper" } });
    await send(walk.entries());
    expect(await tables().Walk.findByPk(walk.id, { raw: true })).toMatchObject({ source: "paper" });
  });
});

describe("clocks", () => {
  const day = 24 * 3600_000;
  test.each([
    ["ten days ahead", Date.now() + 10 * day, "received"],
    ["ten days behind", Date.now() - 10 * day, "opened"],
    ["in 1970", 0, "opened"],
    ["in 9999", Date.UTC(9999, 11, 31), "received"],
  ])("%s is taken and listed by the earlier time", async (_, openedMs, earlier) => {
    const walk = new WalkBuilder({ member, device, rig, openedMs }).markAll().close();
    const now = new Date();
    const answer = await ingest(member, walk.envelope(), now);
    expect(answer.refused).toEqual([]);
    expect(await tables().Walk.findByPk(walk.id, { raw: true })).toMatchObject({
      openedAt: new Date(openedMs),
      sortAt: earlier === "opened" ? new Date(openedMs) : now,
    });
  });
});

test("walks in one envelope do not hold each other up", async () => {
  const good = newWalk().markAll().close();
  const broken = newWalk().mark("pin", "good");
  const other = newWalk();
  const answer = await send(
    [...broken.entries(1), ...good.entries(), ...other.entries()],
    [good.seal(), broken.seal()],
  );
  expect(answer.refused).toEqual([{ walk: broken.id, seq: 1, code: "gap", detail: "/seq: expected 0" }]);
  expect(answer.walks).toMatchObject({
    [broken.id]: { stored: 0, digest: null, state: "open", verdict: "unfinished", receipt: null },
    [good.id]: { stored: 7, state: "sealed" },
    [other.id]: { stored: 1, state: "open" },
  });
});

test("an empty envelope is answered with nothing", async () => {
  expect(await send([])).toEqual({ walks: {}, refused: [] });
});
