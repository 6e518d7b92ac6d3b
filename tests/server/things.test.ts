import { randomUUID } from "node:crypto";
import { QueryTypes } from "sequelize";
import { beforeAll, describe, expect, test } from "vitest";
import { POST as saveRevision } from "@/app/api/rigs/[id]/revisions/route";
import { POST as makeRig } from "@/app/api/rigs/route";
import { GET as readThing } from "@/app/api/things/[id]/route";
import { GET as listThings } from "@/app/api/things/route";
import type { ProblemDocument } from "@/lib/domain/problem";
import { savedShape, thingListShape, thingReadingShape, type ThingReading } from "@/lib/domain/rigs";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { database, tables } from "@/lib/server/database";
import { freshDatabase } from "../support/database";
import { givenMember, givenOrganisation, request, type GivenMember } from "../support/given";
import { givenSheet } from "../support/sheet";

freshDatabase();

const at = (params: object) => ({ params: Promise.resolve(params) });

/** What saving a rig's sheet again and again comes to. */
class GivenRig {
  readonly id = randomUUID();
  base: string | null = null;

  constructor(private readonly member: GivenMember) {}

  send(sheet: Sheet, by = this.member): Promise<Response> {
    const { id, base } = this;
    return base === null
      ? makeRig(request("POST", "/api/rigs", by, { id, sheet }))
      : saveRevision(request("POST", `/api/rigs/${id}/revisions`, by, { base, sheet }), at({ id }));
  }

  async save(sheet: Sheet, by = this.member): Promise<void> {
    const response = await this.send(sheet, by);
    expect(response.status).toBe(201);
    this.base = savedShape.parse(await response.json()).revision.digest;
  }
}

const readOne = (who: { cookie: string } | null, id: string) =>
  readThing(request("GET", `/api/things/${id}`, who), at({ id }));

async function thing(who: GivenMember, id: string): Promise<ThingReading> {
  const response = await readOne(who, id);
  expect(response.status).toBe(200);
  return thingReadingShape.parse(await response.json());
}

async function list(who: GivenMember) {
  const response = await listThings(request("GET", "/api/things", who));
  expect(response.status).toBe(200);
  return thingListShape.parse(await response.json()).things;
}

async function expectFault(response: Response, pointer: string): Promise<void> {
  const { code, errors } = (await response.json()) as ProblemDocument;
  expect([response.status, code, errors?.map((error) => error.pointer)]).toEqual([
    422,
    "wrong-shape",
    [pointer],
  ]);
}

let member: GivenMember;
beforeAll(async () => {
  member = await givenMember({ role: "manager" });
});

describe("histories", () => {
  test("a bar that goes from one rig to another keeps its own", async () => {
    const bar = { id: randomUUID(), description: "Folding bar", serial: "TB-7" };
    const [first, second] = [new GivenRig(member), new GivenRig(member)];
    const old = givenSheet({ name: "Old coach", gear: { towBar: bar } });
    const young = givenSheet({ name: "New coach", gear: {} });
    await first.save(old);
    await second.save(young);
    // Says nothing else of the bar, so it is no row of its history.
    await first.save({ ...old, notes: "Washed." });
    await first.save({ ...old, gear: { towBar: { ...bar, torqueRecord: "Job card 12" } } });
    await first.save({ ...old, gear: {} });
    await second.save({ ...young, gear: { towBar: { ...bar, fittedOn: "2026-06-01" } } });

    const found = await thing(member, bar.id);
    expect(found).toMatchObject({
      id: bar.id,
      kind: "towBar",
      label: "Folding bar, TB-7",
      rigs: [{ id: second.id, name: "New coach" }],
    });
    const state = { description: bar.description, serial: bar.serial };
    expect(found.history.map(({ rig, revision, state: said }) => [rig.name, revision.number, said])).toEqual([
      ["New coach", 2, { ...state, fittedOn: "2026-06-01" }],
      ["Old coach", 4, null],
      ["Old coach", 3, { ...state, torqueRecord: "Job card 12" }],
      ["Old coach", 1, state],
    ]);
    expect(found.history[0]!.revision).toMatchObject({ digest: second.base, by: { id: member.id } });
    expect((await list(member)).find(({ id }) => id === bar.id)).toEqual({
      id: bar.id,
      kind: "towBar",
      label: "Folding bar, TB-7",
      rigs: [{ id: second.id, name: "New coach" }],
    });
  });

  test("a thing that left every rig is known by what was last said of it, and may come back", async () => {
    const rig = new GivenRig(member);
    const car = { id: randomUUID(), year: 2019, description: "A small blue car" };
    const sheet = givenSheet({ car });
    await rig.save(sheet);
    await rig.save({ ...sheet, car: undefined });
    expect(await thing(member, car.id)).toMatchObject({ label: "2019 A small blue car", rigs: [] });
    await rig.save(sheet);
    const found = await thing(member, car.id);
    expect(found.rigs).toHaveLength(1);
    expect(found.history.map(({ revision, state }) => [revision.number, state === null])).toEqual([
      [3, false],
      [2, true],
      [1, false],
    ]);
  });

  test("a piece that the sheet says is not there is none, and one without an id has no history", async () => {
    const rig = new GivenRig(member);
    const [drop, brake, line] = [randomUUID(), randomUUID(), randomUUID()];
    await rig.save({
      v: 1,
      name: "Little",
      coach: { description: "No id" },
      gear: {
        dropReceiver: { id: drop, there: false },
        brake: { id: brake, family: "none" },
        airLine: { id: line, there: true },
      },
    });
    expect((await readOne(member, drop)).status).toBe(404);
    expect((await readOne(member, brake)).status).toBe(404);
    expect(await thing(member, line)).toMatchObject({ kind: "airLine", label: "Air line" });
    expect(await tables().ThingState.count({ where: { rigId: rig.id } })).toBe(1);
  });
});

describe("ids", () => {
  test("of another kind, or twice on one sheet, are refused where they stand", async () => {
    const id = randomUUID();
    const sheet = givenSheet({ gear: { towBar: { id } } });
    await new GivenRig(member).save(sheet);
    const before = await tables().Rig.count();
    const other = givenSheet({ gear: { basePlate: { id } } });
    await expectFault(await new GivenRig(member).send(other), "/sheet/gear/basePlate/id");
    const twice = randomUUID();
    const both = givenSheet({ coach: { id: twice }, car: { id: twice } });
    await expectFault(await new GivenRig(member).send(both), "/sheet/car/id");
    expect(await tables().Rig.count()).toBe(before);
    expect(await tables().Thing.count({ where: { id: twice } })).toBe(0);
  });

  test("of another organisation's things are refused, and stay theirs", async () => {
    const sheet = givenSheet();
    await new GivenRig(member).save(sheet);
    const stranger = await givenMember({ role: "manager" });
    const mine = new GivenRig(stranger);
    await mine.save(givenSheet());
    for (const rig of [new GivenRig(stranger), mine]) {
      await expectFault(
        await rig.send({ v: 1, name: "Mine", coach: { id: sheet.coach!.id } }),
        "/sheet/coach/id",
      );
    }
    expect((await thing(member, sheet.coach!.id!)).history).toHaveLength(1);
  });

  test("come along with a rig that changes hands", async () => {
    const shop = await givenOrganisation("shop");
    const builder = await givenMember({ role: "installer", organisation: shop });
    const owner = await givenMember({ role: "manager" });
    const rig = new GivenRig(builder);
    const sheet = givenSheet();
    await rig.save(sheet);
    await tables().Rig.update({ keeperId: owner.organisation.id }, { where: { id: rig.id } });
    await rig.save({ ...sheet, coach: { ...sheet.coach, description: "Repainted" } }, owner);
    expect((await thing(owner, sheet.coach!.id!)).history).toHaveLength(2);
    expect((await list(owner)).map(({ kind }) => kind)).toEqual(["car", "coach", "towBar"]);
    expect(await list(builder)).toEqual([]);
    expect((await readOne(builder, sheet.coach!.id!)).status).toBe(404);
  });

  test("new ones on two rigs at once become one thing", async () => {
    const bar = { id: randomUUID(), description: "Shared bar" };
    const rigs = [1, 2, 3].map(() => new GivenRig(member));
    await Promise.all(rigs.map((rig) => rig.save(givenSheet({ gear: { towBar: bar } }))));
    expect((await thing(member, bar.id)).rigs).toHaveLength(3);
  });
});

describe("who sees them", () => {
  test.each(["driver", "installer", "manager", "auditor"] as const)(
    "a %s those of the organisation",
    async (role) => {
      const sheet = givenSheet();
      await new GivenRig(member).save(sheet);
      const colleague = await givenMember({ role, organisation: member.organisation });
      expect(await list(colleague)).toEqual(await list(member));
      expect(await thing(colleague, sheet.car!.id!)).toMatchObject({ kind: "car" });
    },
  );

  test("nobody those of another, which read like none at all", async () => {
    const sheet = givenSheet();
    await new GivenRig(member).save(sheet);
    const stranger = await givenMember({ role: "manager" });
    expect(await list(stranger)).toEqual([]);
    const [theirs, none] = [await readOne(stranger, sheet.car!.id!), await readOne(stranger, randomUUID())];
    expect([theirs.status, await theirs.text()]).toEqual([404, await none.text()]);
    expect((await readOne(null, sheet.car!.id!)).status).toBe(401);
  });

  test("by indexes", async () => {
    const plan = await database().query<{ table: string; type: string }>(
      `EXPLAIN SELECT t.id FROM things t JOIN thing_states s ON s.thing_id = t.id
        WHERE t.organisation_id = :id AND s.number = (
          SELECT MAX(number) FROM thing_states WHERE thing_id = s.thing_id AND rig_id = s.rig_id)`,
      { type: QueryTypes.SELECT, replacements: { id: member.organisation.id } },
    );
    expect(plan.every(({ type }) => type !== "ALL")).toBe(true);
  });
});
