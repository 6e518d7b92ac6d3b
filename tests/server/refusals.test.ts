import { randomUUID } from "node:crypto";
import { beforeAll, describe, expect, test } from "vitest";
import { nextLink } from "@/lib/domain/chain";
import type { Envelope, EnvelopeAnswer, Refusal, RefusalCode } from "@/lib/domain/field";
import { tables } from "@/lib/server/database";
import { ingest } from "@/lib/server/ingest/ingest";
import { freshDatabase } from "../support/database";
import {
  givenDevice,
  givenMember,
  givenOrganisation,
  givenRig,
  newKey,
  type GivenMember,
  type Key,
} from "../support/given";
import { WalkBuilder } from "../support/walk-builder";

freshDatabase();

type Raw = Envelope["entries"][number];
type Rig = Awaited<ReturnType<typeof givenRig>>;

let member: GivenMember;
let device: Key;
let rig: Rig;
let other: GivenMember;
let otherDevice: Key;

beforeAll(async () => {
  member = await givenMember({ role: "driver" });
  device = await givenDevice(member);
  rig = await givenRig(member.organisation);
  other = await givenMember({ role: "driver", organisation: member.organisation });
  otherDevice = await givenDevice(other);
});

const newWalk = (open = {}) => new WalkBuilder({ member, device, rig, open });
const send = (entries: Envelope["entries"], seals: Envelope["seals"] = [], from: Key = device) =>
  ingest(member, { device: from.id, entries, seals });
const codes = ({ refused }: EnvelopeAnswer) => refused.map(({ seq, code }) => [seq, code]);
const changed = (raw: Raw, over: object): Raw => ({ ...raw, ...over });
const bodied = (raw: Raw, over: object): Raw => ({ ...raw, body: { ...(raw.body as object), ...over } });

/** Sends one entry in place of a new walk's `open` and expects it refused, with nothing stored. */
async function expectRefused(raw: Raw, expected: Omit<Refusal, "walk">): Promise<void> {
  const answer = await send([raw]);
  expect(answer.refused).toEqual([{ walk: raw.walk, ...expected }]);
  expect(answer.walks[raw.walk]).toEqual({
    stored: 0,
    digest: null,
    state: "open",
    verdict: "unfinished",
    receipt: null,
  });
  expect(await tables().Walk.count({ where: { id: raw.walk } })).toBe(0);
}

describe("invalid: the entry itself cannot be read", () => {
  const digest = "0".repeat(64);
  test.each<[string, (raw: Raw) => Raw, string]>([
    ["no type", (raw) => changed(raw, { type: undefined }), "/type"],
    ["a type that is no text", (raw) => changed(raw, { type: 7 }), "/type"],
    ["a nonsense date", (raw) => changed(raw, { at: "2026-02-30T00:00:00.000Z" }), "/at"],
    ["a date of another form", (raw) => changed(raw, { at: "2026-05-01 12:00" }), "/at"],
    ["a date before 1970", (raw) => changed(raw, { at: "1969-12-31T23:59:59.999Z" }), "/at"],
    ["a date without milliseconds", (raw) => changed(raw, { at: "2026-05-01T12:00:00Z" }), "/at"],
    ["a thirteenth month", (raw) => changed(raw, { at: "2026-13-01T12:00:00.000Z" }), "/at"],
    ["time that runs back", (raw) => changed(raw, { elapsedMs: -1 }), "/elapsedMs"],
    ["half a millisecond", (raw) => changed(raw, { monoMs: 0.5 }), "/monoMs"],
    ["a digest in upper case", (raw) => changed(raw, { prev: "A".repeat(64) }), "/prev"],
    ["no body", (raw) => changed(raw, { body: null }), "/body"],
    ["a list for a body", (raw) => changed(raw, { body: [] }), "/body"],
    ["an unknown purpose", (raw) => bodied(raw, { purpose: "joyride" }), "/body/purpose"],
    ["an unknown depth", (raw) => bodied(raw, { depth: "deep" }), "/body/depth"],
    ["another source than paper", (raw) => bodied(raw, { source: "memory" }), "/body/source"],
    ["a lone surrogate", (raw) => bodied(raw, { app: "\ud800" }), "/body/app"],
    ["a lone surrogate in a name", (raw) => changed(raw, { "x\udc00": 1 }), "/x\udc00"],
    ["seven decimals", (raw) => bodied(raw, { depthMm: 0.1234567 }), "/body/depthMm"],
    ["a number over 2^53-1", (raw) => bodied(raw, { big: 2 ** 53 }), "/body/big"],
    ["a member whose name needs escapes", (raw) => bodied(raw, { "a/b~c": 2 ** 60 }), "/body/a~1b~0c"],
    ["nesting without end", (raw) => bodied(raw, { deep: nested(40) }), "/body/deep"],
    [
      "a mark without an outcome",
      (raw) => changed(raw, { type: "mark", body: { check: "pin" } }),
      "/body/outcome",
    ],
    [
      "a photo without a size",
      (raw) => changed(raw, { type: "photo", body: { sha256: digest, mime: "image/jpeg" } }),
      "/body/bytes",
    ],
    [
      "lamps that do not exist",
      (raw) =>
        changed(raw, {
          type: "mark",
          body: { check: "pin", outcome: "fault", seen: { left: { middle: "dark" } } },
        }),
      "/body/seen",
    ],
  ])("%s", async (_, change, pointer) => {
    const raw = change(newWalk().entries()[0]!);
    const { refused } = await send([raw]);
    expect(refused).toHaveLength(1);
    expect(refused[0]).toMatchObject({ walk: raw.walk, seq: 0, code: "invalid" });
    expect(refused[0]!.detail.startsWith(pointer)).toBe(true);
  });

  function nested(levels: number): object {
    return levels === 0 ? {} : { in: nested(levels - 1) };
  }

  test("more than 16 KiB", async () => {
    const raw = bodied(newWalk().entries()[0]!, { long: "x".repeat(16 * 1024) });
    await expectRefused(raw, { seq: 0, code: "invalid", detail: "over 16384 bytes" });
  });

  test("another first entry than `open`", async () => {
    const raw = changed(newWalk().entries()[0]!, { type: "note", body: { text: "first" } });
    const detail = "/seq: `open` is the first entry, and only that";
    await expectRefused(raw, { seq: 0, code: "invalid", detail });
  });

  test("a second `open`", async () => {
    const walk = newWalk();
    walk.add("open", walk.links[0]!.entry.body);
    const answer = await send(walk.entries());
    expect(codes(answer)).toEqual([[1, "invalid"]]);
    expect(answer.walks[walk.id]!.stored).toBe(1);
  });

  test("anything after `close`", async () => {
    const walk = newWalk().markAll().close().mark("pin", "fault");
    const answer = await send(walk.entries());
    expect(answer.refused).toEqual([
      { walk: walk.id, seq: 7, code: "invalid", detail: "/seq: nothing follows `close`" },
    ]);
    expect(answer.walks[walk.id]!.stored).toBe(7);
  });
});

test("version: another than 1", async () => {
  const raw = changed(newWalk().entries()[0]!, { v: 2 });
  await expectRefused(raw, { seq: 0, code: "version", detail: "/v: only version 1 is known" });
});

describe("foreign-device", () => {
  test("a device that nobody registered", async () => {
    const key = newKey();
    const walk = new WalkBuilder({ member, device: key, rig });
    const answer = await send(walk.entries(), [], key);
    expect(codes(answer)).toEqual([[0, "foreign-device"]]);
  });

  test("another member's device", async () => {
    const walk = new WalkBuilder({ member, device: otherDevice, rig });
    const answer = await send(walk.entries(), [walk.seal()], otherDevice);
    expect(codes(answer)).toEqual([[0, "foreign-device"]]);
  });

  test("an `open` that names another device", async () => {
    const answer = await send(newWalk({ device: otherDevice.id }).entries());
    expect(codes(answer)).toEqual([[0, "foreign-device"]]);
  });

  test("but not one that is written in capitals", async () => {
    const walk = newWalk({ device: device.id.toUpperCase() }).add("close", {
      verdict: "unfinished",
      marks: 0,
      faults: 0,
    });
    const answer = await ingest(member, {
      device: device.id.toUpperCase(),
      entries: walk.entries(),
      seals: [walk.seal()],
    });
    expect(codes(answer)).toEqual([]);
    expect(answer.walks[walk.id]!.state).toBe("sealed");
  });

  test("another of the member's own devices going on with a walk", async () => {
    const walk = newWalk().mark("pin", "good");
    await send(walk.entries(0, 1));
    const second = await givenDevice(member);
    const answer = await send(walk.entries(1), [], second);
    expect(codes(answer)).toEqual([[1, "foreign-device"]]);
    expect(answer.walks[walk.id]!.stored).toBe(1);
  });
});

describe("not-yours", () => {
  test("an `open` that names another member", async () => {
    expect(codes(await send(newWalk({ member: other.id }).entries()))).toEqual([[0, "not-yours"]]);
  });

  test("a walk that another member opened: nothing of it is shown to a driver", async () => {
    const theirs = new WalkBuilder({ member: other, device: otherDevice, rig }).mark("pin", "good");
    await ingest(other, { device: otherDevice.id, entries: theirs.entries(0, 1), seals: [] });
    const answer = await send(theirs.entries(1), [theirs.seal(device)]);
    expect(codes(answer)).toEqual([[1, "not-yours"]]);
    expect(answer.walks).toEqual({});
    expect(codes(await send([], [theirs.seal(device)]))).toEqual([[null, "not-yours"]]);
  });

  test("whoever may see the walk is told where it stands", async () => {
    const manager = await givenMember({ role: "manager", organisation: member.organisation });
    const key = await givenDevice(manager);
    const walk = newWalk().mark("pin", "good");
    await send(walk.entries());
    const answer = await ingest(manager, { device: key.id, entries: walk.entries(1), seals: [] });
    expect(codes(answer)).toEqual([[1, "not-yours"]]);
    expect(answer.walks[walk.id]!.stored).toBe(2);
  });
});

describe("unknown-rig and unknown-revision", () => {
  test.each(["no id at all", "ключ", randomUUID()])("a rig that is nowhere: %s", async (id) => {
    const detail = "/body/rig: no rig that you can see";
    await expectRefused(newWalk({ rig: id }).entries()[0]!, { seq: 0, code: "unknown-rig", detail });
  });

  test("a rig of others, refused as if it were nowhere", async () => {
    const theirs = await givenRig(await givenOrganisation());
    const walk = new WalkBuilder({ member, device, rig: theirs });
    const detail = "/body/rig: no rig that you can see";
    await expectRefused(walk.entries()[0]!, { seq: 0, code: "unknown-rig", detail });
  });

  test("a rig that the organisation built is seen", async () => {
    const built = await givenRig(await givenOrganisation(), { builder: member.organisation });
    const walk = new WalkBuilder({ member, device, rig: built });
    expect((await send(walk.entries())).refused).toEqual([]);
  });

  test("a digest that is no revision of this rig", async () => {
    const raw = newWalk({ revision: "ab".repeat(32) }).entries()[0]!;
    const detail = "/body/revision: no revision of this rig";
    await expectRefused(raw, { seq: 0, code: "unknown-revision", detail });
  });

  test("an earlier revision is as good as the latest", async () => {
    const document = { ...rig.revision.document, catalogue: "newer" };
    const twice = await givenRig(member.organisation, { document, earlier: [rig.revision.document] });
    const walk = new WalkBuilder({ member, device, rig: { ...twice, revision: rig.revision } });
    expect((await send(walk.entries())).refused).toEqual([]);
  });

  test("a walk goes on although its rig went to others", async () => {
    const leaving = await givenRig(member.organisation);
    const walk = new WalkBuilder({ member, device, rig: leaving }).markAll().close();
    await send(walk.entries(0, 3));
    await tables().Rig.update({ keeperId: (await givenOrganisation()).id }, { where: { id: leaving.id } });
    const answer = await send(walk.entries(), [walk.seal()]);
    expect(answer.refused).toEqual([]);
    expect(answer.walks[walk.id]).toMatchObject({ stored: 7, state: "sealed" });
  });
});

describe("fork: a second content at a stored sequence number", () => {
  const forks = async (walk: WalkBuilder) =>
    (await tables().Fork.findAll({ where: { walkId: walk.id }, order: ["seq", "digest"], raw: true })).map(
      ({ seq, bytes, deviceId, memberId }) => [seq, bytes.toString("utf8"), deviceId, memberId],
    );

  test("is kept apart, once, and never overwrites", async () => {
    const walk = newWalk().mark("pin", "good").mark("cables", "good");
    await send(walk.entries());
    const fork = nextLink(walk.id, walk.links[0]!, "mark", { check: "pin", outcome: "fault" }, stampOf(walk));
    const raw = JSON.parse(fork.text) as Raw;
    for (let times = 0; times < 2; times += 1) {
      const answer = await send([raw, ...walk.entries(2)]);
      expect(codes(answer)).toEqual([[1, "fork"]]);
      expect(answer.walks[walk.id]).toMatchObject({ stored: 3, digest: walk.head });
    }
    expect(await forks(walk)).toEqual([[1, fork.text, device.id, member.id]]);
    expect((await send(walk.entries())).refused).toEqual([]);
  });

  test("even when the walk is sealed", async () => {
    const walk = newWalk().markAll().close();
    await ingest(member, walk.envelope());
    const answer = await send([bodied(walk.entries()[6]!, { verdict: "hold" })]);
    expect(codes(answer)).toEqual([[6, "fork"]]);
    expect(answer.walks[walk.id]).toMatchObject({ state: "sealed", verdict: "no-hold" });
    expect(await forks(walk)).toHaveLength(1);
  });

  test("of the `open`, and within one batch", async () => {
    const walk = newWalk();
    const answer = await send([...walk.entries(), bodied(walk.entries()[0]!, { app: "test 2" })]);
    expect(codes(answer)).toEqual([[0, "fork"]]);
    expect(answer.walks[walk.id]).toMatchObject({ stored: 1, digest: walk.head });
    expect(await forks(walk)).toHaveLength(1);
  });

  const stampOf = (walk: WalkBuilder) => walk.links[1]!.entry;
});

describe("sealed, gap and broken-chain", () => {
  test("sealed: one more entry after the seal", async () => {
    const walk = newWalk().markAll().close();
    await ingest(member, walk.envelope());
    walk.mark("pin", "fault");
    expect(codes(await send(walk.entries(7)))).toEqual([[7, "sealed"]]);
  });

  test.each([
    ["nothing stored", 0, 2, 0],
    ["one missing", 2, 3, 2],
  ])("gap: %s", async (_, stored, from, expected) => {
    const walk = newWalk().markAll();
    if (stored > 0) await send(walk.entries(0, stored));
    const answer = await send(walk.entries(from, from + 2));
    expect(answer.refused).toEqual([
      { walk: walk.id, seq: from, code: "gap", detail: `/seq: expected ${expected}` },
    ]);
    expect(answer.walks[walk.id]!.stored).toBe(stored);
  });

  test("gap: a number far away", async () => {
    const raw = changed(newWalk().mark("pin", "good").entries()[1]!, { seq: Number.MAX_SAFE_INTEGER });
    expect(codes(await send([raw]))).toEqual([[Number.MAX_SAFE_INTEGER, "gap"]]);
  });

  test("broken-chain: an entry that follows another one; what came before stays", async () => {
    const walk = newWalk().markAll();
    const entries = walk.entries();
    entries[3] = changed(entries[3]!, { prev: walk.links[0]!.digest });
    const answer = await send(entries);
    expect(answer.refused).toEqual([
      {
        walk: walk.id,
        seq: 3,
        code: "broken-chain",
        detail: `/prev: expected ${walk.links[2]!.digest}`,
      },
    ]);
    expect(answer.walks[walk.id]).toMatchObject({ stored: 3, digest: walk.links[2]!.digest });
  });

  test("broken-chain: an `open` that does not follow its revision", async () => {
    const raw = changed(newWalk().entries()[0]!, { prev: "ab".repeat(32) });
    const detail = "/prev: expected the revision's digest, as in /body/revision";
    await expectRefused(raw, { seq: 0, code: "broken-chain", detail });
  });
});

describe("seals", () => {
  const closed = async () => {
    const walk = newWalk().markAll().close();
    await send(walk.entries());
    return walk;
  };

  test.each<[string, object, RefusalCode, string]>([
    ["no digest", { seal: "abc" }, "invalid", "/seal"],
    ["an unknown algorithm", { alg: "RS256" }, "invalid", "/alg"],
    ["no signature", { signature: undefined }, "invalid", "/signature"],
    ["a lone surrogate", { note: "\ud800" }, "invalid", "/note"],
    ["another entry than the last", { seal: "ab".repeat(32) }, "incomplete", "/seal"],
    ["the other algorithm", { alg: "ES256" }, "bad-signature", "/signature"],
    ["a signature that is no base64url", { signature: "+/+/" }, "bad-signature", "/signature"],
    ["a signature of nothing", { signature: "" }, "bad-signature", "/signature"],
    ["zeros", { signature: Buffer.alloc(64).toString("base64url") }, "bad-signature", "/signature"],
    // A loose object may carry members that look like an answer of ours.
    ["a member called code", { code: "fork", signature: "" }, "bad-signature", "/signature"],
  ])("%s", async (_, over, code, pointer) => {
    const walk = await closed();
    const answer = await send([], [{ ...walk.seal(), ...over }]);
    expect(codes(answer)).toEqual([[null, code]]);
    expect(answer.refused[0]!.detail.startsWith(pointer)).toBe(true);
    expect(answer.walks[walk.id]).toMatchObject({ state: "open", receipt: null });
  });

  test("bad-signature: forged by another key of another member", async () => {
    const walk = await closed();
    const forged = { ...walk.seal(), signature: otherDevice.sign(walk.head) };
    expect(codes(await send([], [forged]))).toEqual([[null, "bad-signature"]]);
    await send([], [walk.seal()]);
    expect(codes(await send([], [forged]))).toEqual([[null, "bad-signature"]]);
  });

  test("incomplete: nothing stored, not closed, or not the last entry", async () => {
    const walk = newWalk().markAll();
    expect(codes(await send([], [walk.seal()]))).toEqual([[null, "incomplete"]]);
    const early = await send(walk.entries(), [walk.seal()]);
    expect(early.refused).toEqual([
      { walk: walk.id, seq: null, code: "incomplete", detail: "/seal: no `close` is stored yet" },
    ]);
    walk.close();
    const before = { ...walk.seal(), seal: walk.links[5]!.digest };
    expect(codes(await send(walk.entries(), [before]))).toEqual([[null, "incomplete"]]);
    expect((await send([], [walk.seal()])).refused).toEqual([]);
  });

  test("foreign-device: by a device that is not registered", async () => {
    const walk = await closed();
    const key = newKey();
    expect(codes(await send([], [walk.seal(key)], key))).toEqual([[null, "foreign-device"]]);
  });

  test("a new device of the same member seals what the lost key left behind", async () => {
    const walk = await closed();
    const second = await givenDevice(member, "ES256");
    const answer = await send([], [walk.seal(second)], second);
    expect(answer.refused).toEqual([]);
    expect(answer.walks[walk.id]).toMatchObject({ state: "sealed" });
    expect(await tables().Walk.findByPk(walk.id, { raw: true })).toMatchObject({
      deviceId: device.id,
      sealDeviceId: second.id,
      sealAlg: "ES256",
    });
  });

  test("a walk's refused entry leaves its seals out, with one row in all", async () => {
    const walk = newWalk().markAll().close();
    const entries = walk.entries();
    entries[6] = bodied(entries[6]!, { marks: -1 });
    const answer = await send(entries, [walk.seal(), walk.seal()]);
    expect(codes(answer)).toEqual([[6, "invalid"]]);
    expect(answer.walks[walk.id]).toMatchObject({ stored: 6, state: "open" });
  });
});
