import { createHash } from "node:crypto";
import { QueryTypes } from "sequelize";
import { beforeAll, describe, expect, test } from "vitest";
import { GET as readBundle } from "@/app/api/field/bundle/route";
import { GET as readRecord } from "@/app/api/walks/[id]/record/route";
import { GET as readWalk } from "@/app/api/walks/[id]/route";
import { GET as listWalks } from "@/app/api/walks/route";
import { bundleShape } from "@/lib/domain/field";
import { walkPageShape, walkReadingShape, type WalkPage } from "@/lib/domain/history";
import { canonicalText } from "@/lib/domain/json";
import { receiptHolds, type Receipt } from "@/lib/domain/receipt";
import { sealMessage, verifies, type Algorithm, type PublicKey } from "@/lib/domain/signature";
import { database, tables } from "@/lib/server/database";
import { ingest } from "@/lib/server/ingest/ingest";
import { serverKeys } from "@/lib/server/server-key";
import { walkListQuery } from "@/lib/server/walk-list";
import { freshDatabase } from "../support/database";
import {
  givenDevice,
  givenMember,
  givenOrganisation,
  givenRig,
  request,
  type GivenMember,
  type Organisation,
} from "../support/given";
import { document } from "../support/rig";
import { WalkBuilder } from "../support/walk-builder";

freshDatabase();

type Rig = Awaited<ReturnType<typeof givenRig>>;

/** A walk from a device of the member's own; sealed unless it is to stay open. */
async function givenWalk(
  member: GivenMember,
  rig: Rig,
  wanted: { openedMs?: number; receivedMs?: number; open?: true; alg?: Algorithm } = {},
): Promise<WalkBuilder> {
  const device = await givenDevice(member, wanted.alg);
  const walk = new WalkBuilder({ member, device, rig, openedMs: wanted.openedMs }).mark("pin", "good");
  if (!wanted.open) walk.markAll().close();
  const { entries, seals } = wanted.open
    ? { entries: walk.entries(), seals: [] }
    : { entries: walk.entries(), seals: [walk.seal()] };
  const now = new Date(wanted.receivedMs ?? Date.UTC(2026, 4, 2));
  const { refused } = await ingest(member, { device: device.id, entries, seals }, now);
  expect(refused).toEqual([]);
  return walk;
}

async function page(member: GivenMember, query = ""): Promise<WalkPage> {
  const response = await listWalks(request("GET", `/api/walks${query}`, member));
  expect(response.status).toBe(200);
  const body: unknown = await response.json();
  return walkPageShape.parse(body);
}

const ids = ({ walks }: WalkPage) => walks.map(({ id }) => id);
const at = (id: string) => ({ params: Promise.resolve({ id }) });

describe("who sees which walks", () => {
  let fleet: Organisation;
  let before: Organisation;
  const people: Record<string, GivenMember> = {};
  const walks: Record<string, string> = {};

  beforeAll(async () => {
    fleet = await givenOrganisation();
    before = await givenOrganisation("household");
    for (const role of ["driver", "installer", "manager", "auditor"] as const) {
      people[role] = await givenMember({ role, organisation: fleet });
    }
    people.stranger = await givenMember({ role: "manager" });
    people.earlier = await givenMember({ role: "manager", organisation: before });
    const kept = await givenRig(fleet);
    const bought = await givenRig(before);
    const built = await givenRig(before, { builder: fleet });
    walks.driver = (await givenWalk(people.driver!, kept, { openedMs: 5e12 })).id;
    walks.manager = (await givenWalk(people.manager!, kept, { receivedMs: 1e12 })).id;
    walks.built = (await givenWalk(people.manager!, built, { receivedMs: 9e11 })).id;
    walks.bought = (await givenWalk(people.earlier!, bought, { receivedMs: 8e11 })).id;
    await tables().Rig.update({ keeperId: fleet.id }, { where: { id: bought.id } });
  });

  // A walk of a rig that is kept now is seen whoever made it, and its maker's organisation goes on seeing it.
  test.each([
    ["driver", ["driver"]],
    ["installer", ["driver", "manager", "built", "bought"]],
    ["manager", ["driver", "manager", "built", "bought"]],
    ["auditor", ["driver", "manager", "built", "bought"]],
    ["earlier", ["built", "bought"]],
    ["stranger", []],
  ])("%s", async (who, seen) => {
    expect(ids(await page(people[who]!))).toEqual(seen.map((name) => walks[name]));
    for (const [name, id] of Object.entries(walks)) {
      const status = seen.includes(name) ? 200 : 404;
      expect((await readWalk(request("GET", "/", people[who]!), at(id))).status).toBe(status);
      expect((await readRecord(request("GET", "/", people[who]!), at(id))).status).toBe(status);
    }
  });
});

describe("pages", () => {
  let member: GivenMember;
  let rig: Rig;
  const sorted: string[] = [];

  beforeAll(async () => {
    member = await givenMember({ role: "manager" });
    rig = await givenRig(member.organisation, { name: "Page rig" });
    const made: { id: string; sortAt: number }[] = [];
    // Seven walks at three moments, so that pages end within a moment as well as between two.
    for (const [openedMs, receivedMs] of [
      [3e12, 1e12],
      [1e12, 3e12],
      [1e12, 1e12],
      [2e12, 9e12],
      [9e12, 2e12],
      [3e12, 3e12],
      [3e12, 4e12],
    ] as const) {
      const { id } = await givenWalk(member, rig, { openedMs, receivedMs });
      made.push({ id, sortAt: Math.min(openedMs, receivedMs) });
    }
    made.sort((a, b) => b.sortAt - a.sortAt || (a.id < b.id ? 1 : -1));
    sorted.push(...made.map(({ id }) => id));
  });

  test("newest first by the earlier of opened and received, then by id", async () => {
    const all = await page(member);
    expect(ids(all)).toEqual(sorted);
    expect(all.next).toBeNull();
    expect(all.names).toEqual({ [rig.id]: "Page rig", [member.id]: "a manager" });
  });

  test.each([1, 2, 3, 6, 7])("of %d, one after the other, miss and repeat nothing", async (limit) => {
    const found: string[] = [];
    let after: string | null = null;
    do {
      const next: WalkPage = await page(member, `?limit=${limit}${after ? `&after=${after}` : ""}`);
      expect(next.walks.length).toBeLessThanOrEqual(limit);
      found.push(...ids(next));
      after = next.next;
    } while (after);
    expect(found).toEqual(sorted);
  });

  test("a walk that arrives meanwhile does not shift the pages", async () => {
    const first = await page(member, "?limit=3");
    await givenWalk(member, rig, { openedMs: 8e12, receivedMs: 8e12, open: true });
    expect(ids(await page(member, `?after=${first.next}`))).toEqual(sorted.slice(3));
  });

  test("a row says what the design says", async () => {
    const [row] = (await page(member, "?limit=1")).walks;
    expect(row).toEqual({
      id: row!.id,
      rig: rig.id,
      revision: rig.revision.digest,
      purpose: "hook-up",
      member: member.id,
      openedAt: new Date(8e12).toISOString(),
      receivedAt: new Date(8e12).toISOString(),
      state: "open",
      verdict: "unfinished",
      counts: { marks: 1, faults: 0 },
    });
  });

  test.each([
    ["?limit=0", "limit"],
    ["?limit=201", "limit"],
    ["?limit=ten", "limit"],
    ["?limit=1.5", "limit"],
    ["?limit=1&limit=2", "limit"],
    ["?after=", "after"],
    ["?after=abc", "after"],
    [`?after=${Buffer.from("[1,2]").toString("base64url")}`, "after"],
    [`?after=${Buffer.from('[1e999,"x"]').toString("base64url")}`, "after"],
    ["?rig=x", "rig"],
    ["?__proto__=x", "__proto__"],
  ])("wrong-shape: %s", async (query, pointer) => {
    const response = await listWalks(request("GET", `/api/walks${query}`, member));
    expect(response.status).toBe(422);
    expect(await response.json()).toMatchObject({ code: "wrong-shape", errors: [{ pointer }] });
  });

  test("walk down an index, wherever they begin", async () => {
    await manyWalks(member, rig, 3000);
    const middle = { sortAt: new Date(Date.UTC(2024, 1, 20)), id: sorted[0]! };
    for (const [who, index] of [
      [member, "walks_organisation"],
      [{ ...member, role: "driver" as const }, "walks_member"],
    ] as const) {
      for (const place of [null, middle]) {
        const { sql, replacements } = walkListQuery(who, place, 51);
        // ANALYZE runs the statement too and says how many rows each step really read.
        const plan = await database().query<{ key: string; Extra: string; r_rows: number }>(
          `ANALYZE ${sql}`,
          { type: QueryTypes.SELECT, replacements },
        );
        const [reads] = plan.filter(({ key }) => key === index);
        expect(Number(reads!.r_rows)).toBe(51);
        expect(reads!.Extra).not.toContain("filesort");
      }
    }
  });

  async function manyWalks(owner: GivenMember, on: Rig, wanted: number): Promise<void> {
    const { Walk } = tables();
    const [model] = await Walk.findAll({ where: { memberId: owner.id }, limit: 1, raw: true });
    const rows = Array.from({ length: wanted }, (_, index) => ({
      ...model!,
      id: `00000000-0000-7000-8000-${String(index).padStart(12, "0")}`,
      rigId: on.id,
      sortAt: new Date(Date.UTC(2024, 0, 1) + index * 3600_000),
    }));
    await Walk.bulkCreate(rows);
    await database().query("ANALYZE TABLE walks", { type: QueryTypes.SELECT });
  }
});

describe("one walk", () => {
  test("read back", async () => {
    const member = await givenMember({ role: "driver" });
    const rig = await givenRig(member.organisation, { name: "One rig" });
    const walk = await givenWalk(member, rig);
    const response = await readWalk(request("GET", `/api/walks/${walk.id}`, member), at(walk.id));
    const body: unknown = await response.json();
    const reading = walkReadingShape.parse(body);
    expect(body).toEqual(reading);
    expect(reading).toMatchObject({
      walk: { id: walk.id, state: "sealed", verdict: "no-hold", counts: { marks: 5, faults: 0 } },
      names: { rig: "One rig", member: "a driver" },
      depth: "full",
      elapsedMs: 70_000,
      closedAs: null,
      document,
      seal: { seal: walk.head, alg: "Ed25519", receipt: { entries: 8 } },
    });
    expect(reading.device).toBe(reading.seal!.device);
    expect(reading.entries.map(({ digest, entry }) => [digest, canonicalText(entry)])).toEqual(
      walk.links.map(({ digest, text }) => [digest, text]),
    );
  });
});

describe("the record file", () => {
  test.each<Algorithm>(["Ed25519", "ES256"])("is checked with standard tools alone: %s", async (alg) => {
    const member = await givenMember({ role: "driver" });
    const rig = await givenRig(member.organisation);
    const walk = await givenWalk(member, rig, { alg });
    const response = await readRecord(request("GET", `/api/walks/${walk.id}/record`, member), at(walk.id));
    expect(response.headers.get("content-type")).toBe("application/x-ndjson");
    expect(response.headers.get("content-disposition")).toBe(
      `attachment; filename="hookfast-walk-${walk.id}.ndjson"`,
    );
    const text = await response.text();
    expect(text.endsWith("}\n")).toBe(true);
    const lines = text.slice(0, -1).split("\n");
    expect(lines.slice(1, -1)).toEqual(walk.links.map((link) => link.text));

    const sha256 = (bytes: string) => createHash("sha256").update(bytes).digest("hex");
    let prev = sha256(lines[0]!.slice('{"revision":'.length, -1));
    expect(prev).toBe(rig.revision.digest);
    for (const line of lines.slice(1, -1)) {
      expect((JSON.parse(line) as { prev: string }).prev).toBe(prev);
      prev = sha256(line);
    }
    const last = JSON.parse(lines.at(-1)!) as {
      seal: string;
      alg: Algorithm;
      signature: string;
      device: PublicKey;
      receipt: Receipt;
    };
    expect(Object.keys(last)).toEqual(["alg", "device", "receipt", "seal", "signature"]);
    expect([last.seal, last.alg]).toEqual([prev, alg]);
    expect(verifies(last.device, last.alg, sealMessage(last.seal), last.signature)).toBe(true);
    expect(receiptHolds(last.receipt, last.seal, serverKeys())).toBe(true);
  });

  test("of an open walk has no last line yet", async () => {
    const member = await givenMember({ role: "driver" });
    const walk = await givenWalk(member, await givenRig(member.organisation), { open: true });
    const text = await (await readRecord(request("GET", "/", member), at(walk.id))).text();
    expect(text).toBe(
      [`{"revision":${canonicalText(document)}}`, ...walk.links.map((link) => link.text), ""].join("\n"),
    );
  });
});

describe("the bundle", () => {
  const bundle = async (member: GivenMember) => {
    const response = await readBundle(request("GET", "/api/field/bundle", member));
    expect(response.status).toBe(200);
    const body: unknown = await response.json();
    expect(bundleShape.parse(body)).toEqual(body);
    return bundleShape.parse(body);
  };

  test("holds the member, the kept rigs by name with their latest revision, and the server's keys", async () => {
    const member = await givenMember({ role: "installer" });
    const newer = { ...document, catalogue: "newer" };
    const second = await givenRig(member.organisation, { name: "B", document: newer, earlier: [document] });
    const first = await givenRig(member.organisation, { name: "A" });
    await givenRig(await givenOrganisation(), { name: "built only", builder: member.organisation });
    const { cookie, ...itself } = member;
    expect(cookie).not.toBe("");
    expect(await bundle(member)).toEqual({
      generatedAt: expect.any(String) as string,
      member: itself,
      rigs: [first, second],
      keys: serverKeys(),
    });
  });

  test("has fifty rigs at the most", async () => {
    const member = await givenMember({ role: "manager" });
    for (let number = 0; number < 51; number += 1) {
      await givenRig(member.organisation, { name: `rig ${String(number).padStart(2, "0")}` });
    }
    const names = (await bundle(member)).rigs.map(({ name }) => name);
    expect([names.length, names[0], names.at(-1)]).toEqual([50, "rig 00", "rig 49"]);
  });

  test("names the newest sealed walk, whoever made it and however late an older one arrives", async () => {
    const driver = await givenMember({ role: "driver" });
    const manager = await givenMember({ role: "manager", organisation: driver.organisation });
    const rig = await givenRig(driver.organisation);
    expect((await bundle(driver)).rigs[0]!.lastWalk).toBeNull();
    const first = await givenWalk(driver, rig, { openedMs: 2e12, receivedMs: 3e12 });
    await givenWalk(driver, rig, { openedMs: 1e12, receivedMs: 4e12 });
    await givenWalk(driver, rig, { receivedMs: 5e12, open: true });
    const walkOf = ({ id }: WalkBuilder, openedMs: number) => ({
      id,
      purpose: "hook-up",
      verdict: "no-hold",
      at: new Date(openedMs).toISOString(),
    });
    expect((await bundle(driver)).rigs[0]!.lastWalk).toEqual(walkOf(first, 2e12));
    const theirs = await givenWalk(manager, rig, { openedMs: 2.5e12, receivedMs: 3e12 });
    expect((await bundle(driver)).rigs[0]!.lastWalk).toEqual(walkOf(theirs, 2.5e12));
  });
});
