import { beforeAll, describe, expect, test } from "vitest";
import { GET as readBundle } from "@/app/api/field/bundle/route";
import { POST as signIn } from "@/app/api/session/route";
import { GET as listWalks } from "@/app/api/walks/route";
import { digestOf } from "@/lib/domain/digest";
import { depths, purposes, type Outcome } from "@/lib/domain/entry";
import type { Bundle } from "@/lib/domain/field";
import type { WalkPage } from "@/lib/domain/history";
import { findJsonFault } from "@/lib/domain/json";
import { verdictOf } from "@/lib/domain/replay";
import { checksOf, revisionShape } from "@/lib/domain/revision";
import { tables } from "@/lib/server/database";
import { seedDemo } from "@/seeders/demo";
import { rigs } from "@/seeders/demo/rigs";
import { freshDatabase } from "../support/database";
import { request } from "../support/given";

freshDatabase();

const now = new Date("2026-06-15T10:00:00.000Z");

beforeAll(() => seedDemo(now), 60_000);

async function signedIn(email: string): Promise<{ cookie: string; member: Bundle["member"] }> {
  const body = { email, password: "walk the rig twice" };
  const response = await signIn(request("POST", "/api/session", null, body));
  const { member } = (await response.json()) as { member: Bundle["member"] };
  return { cookie: response.headers.get("set-cookie")!.split(";")[0]!, member };
}

const bundleOf = async (who: { cookie: string }) =>
  (await (await readBundle(request("GET", "/api/field/bundle", who))).json()) as Bundle;
const walksOf = async (who: { cookie: string }) =>
  (await (await listWalks(request("GET", "/api/walks", who))).json()) as WalkPage;

describe.each(Object.entries(rigs))("the list of the rig %s", (_, { document }) => {
  const checks = [...checksOf(document).values()];

  test("is a revision, and no other rig's", () => {
    expect(revisionShape.safeParse(document).error).toBeUndefined();
    expect(findJsonFault(document)).toBeNull();
    const digests = Object.values(rigs).map((rig) => digestOf(rig.document));
    expect(new Set(digests).size).toBe(digests.length);
  });

  test("has each station, with something to look at", () => {
    for (const station of document.list.stations) expect(station.checks.length).toBeGreaterThan(0);
    expect(document.list.stations).toHaveLength(7);
    expect(checks.some(({ kind }) => kind === "lamps")).toBe(true);
  });

  test("is no-hold when all is good, and hold at any hold's fault", () => {
    for (const purpose of purposes) {
      for (const depth of depths) {
        const keys = document.walks[purpose][depth];
        const good = new Map<string, { outcome: Outcome }>(keys.map((key) => [key, { outcome: "good" }]));
        expect(verdictOf(document, { purpose, depth }, good)).toBe("no-hold");
        for (const key of good.keys()) {
          const fault = new Map(good).set(key, { outcome: "fault" });
          const effect = checksOf(document).get(key)!.effect;
          expect(verdictOf(document, { purpose, depth }, fault)).toBe(effect === "hold" ? "hold" : "no-hold");
        }
      }
    }
  });

  test("speaks plainly: short, of what is seen, and of nothing that it must not say", () => {
    for (const check of checks) {
      const { ask, how, why, mend, caution = "" } = check;
      expect([ask, ask.length <= 38]).toEqual([ask, true]);
      const words = [ask, how, why, mend, caution].join(" ");
      expect(words).not.toMatch(/\b(safe|legal|passed|certified|compliant|roadworthy)\b/i);
      // What a transfer case does to park is a fact; what to do with one is not ours to say.
      expect(words.replace("With a transfer case in neutral, ", "")).not.toMatch(
        /\b(neutral|reverse|transmission|in park|in gear|torque|ft-lb|n·m)\b/i,
      );
      expect(words).not.toMatch(/!|\bplease\b/i);
      for (const sentence of [how, why, mend]) expect(sentence).toMatch(/^[A-Z].+[.”]$/);
    }
  });
});

describe("the demo's accounts", () => {
  test("a household with one rig that it walked at least three times", async () => {
    const driver = await signedIn("driver@demo.example");
    expect([driver.member.role, driver.member.organisation.kind]).toEqual(["manager", "household"]);
    const { rigs: kept } = await bundleOf(driver);
    expect(kept).toHaveLength(1);
    expect(kept[0]!.lastWalk).toMatchObject({ purpose: "hook-up", verdict: "no-hold" });
    const { walks } = await walksOf(driver);
    expect(walks.filter(({ state }) => state === "sealed").length).toBeGreaterThanOrEqual(3);
    expect(new Set(walks.map(({ verdict }) => verdict))).toEqual(new Set(["hold", "no-hold"]));
  });

  test("a shop with one rig on its floor", async () => {
    const installer = await signedIn("installer@demo.example");
    expect([installer.member.role, installer.member.organisation.kind]).toEqual(["installer", "shop"]);
    const { rigs: kept } = await bundleOf(installer);
    expect(kept.map(({ lastWalk }) => lastWalk)).toEqual([null]);
  });

  test("a fleet with two rigs and something to see in its history", async () => {
    const manager = await signedIn("manager@demo.example");
    expect([manager.member.role, manager.member.organisation.kind]).toEqual(["manager", "fleet"]);
    expect((await bundleOf(manager)).rigs).toHaveLength(2);
    const auditor = await signedIn("auditor@demo.example");
    expect(auditor.member.role).toBe("auditor");
    const page = await walksOf(auditor);
    expect(page).toEqual(await walksOf(manager));
    expect(new Set(page.walks.map(({ verdict }) => verdict))).toEqual(
      new Set(["hold", "no-hold", "unfinished"]),
    );
    expect(page.walks.some(({ verdict, counts }) => verdict === "no-hold" && counts.faults > 0)).toBe(true);
    expect(new Set(page.walks.map(({ state }) => state))).toEqual(new Set(["open", "sealed"]));
  });

  test("every walk came in the weeks before, and after it was made", async () => {
    const walks = await tables().Walk.findAll({ raw: true });
    for (const { openedAt, receivedAt, sealedAt, state, closedAs } of walks) {
      expect(openedAt.getTime()).toBeGreaterThan(now.getTime() - 30 * 24 * 3600_000);
      expect(receivedAt.getTime()).toBeGreaterThan(openedAt.getTime());
      expect(receivedAt.getTime()).toBeLessThan(now.getTime());
      expect(sealedAt !== null).toBe(state === "sealed");
      expect(closedAs).toBeNull();
    }
  });
});

describe("seeding again", () => {
  test("changes nothing, and completes what was cut short", async () => {
    const { Walk, Entry } = tables();
    const before = await Walk.count();
    await seedDemo(now);
    expect(await Walk.count()).toBe(before);
    const [last] = await Walk.findAll({ order: [["openedAt", "DESC"]], limit: 1, raw: true });
    await Entry.destroy({ where: { walkId: last!.id } });
    await Walk.destroy({ where: { id: last!.id } });
    await seedDemo(now);
    expect(await Walk.count()).toBe(before);
  });

  test("issues a list anew where the demo's is an older one, and only there", async () => {
    const { Revision } = tables();
    const before = await Revision.count();
    const rigId = rigs.household.id;
    await Revision.update({ digest: Buffer.alloc(32, 7) }, { where: { rigId } });
    await seedDemo(now);
    await seedDemo(now);
    const all = await Revision.findAll({ where: { rigId }, order: [["number", "ASC"]], raw: true });
    expect(all.map(({ number, digest }) => [number, digest.toString("hex")])).toEqual([
      [1, "07".repeat(32)],
      [2, digestOf(rigs.household.document)],
    ]);
    expect(await Revision.count()).toBe(before + 1);
  });
});
