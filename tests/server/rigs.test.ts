import { randomUUID } from "node:crypto";
import { QueryTypes } from "sequelize";
import { beforeAll, describe, expect, test } from "vitest";
import { GET as readBundle } from "@/app/api/field/bundle/route";
import { GET as readRevision } from "@/app/api/rigs/[id]/revisions/[sha256]/route";
import { POST as saveRevision } from "@/app/api/rigs/[id]/revisions/route";
import { GET as readRig } from "@/app/api/rigs/[id]/route";
import { GET as listRigs, POST as makeRig } from "@/app/api/rigs/route";
import { CATALOGUE, compose } from "@/lib/domain/catalogue/compose";
import { ruledOut } from "@/lib/domain/catalogue/rule-outs";
import { digestOf } from "@/lib/domain/digest";
import { bundleShape } from "@/lib/domain/field";
import type { ProblemDocument } from "@/lib/domain/problem";
import {
  revisionReadingShape,
  rigListShape,
  rigReadingShape,
  savedShape,
  SHEET_BYTES,
  type RigReading,
  type RigRow,
  type Saved,
} from "@/lib/domain/rigs";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { database, tables } from "@/lib/server/database";
import { ingest } from "@/lib/server/ingest/ingest";
import { RIG_LIST } from "@/lib/server/rigs/reading";
import { down, up } from "@/migrations/0003-rig-sheets";
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
import { document as handWritten } from "../support/rig";
import { givenSheet } from "../support/sheet";
import { WalkBuilder } from "../support/walk-builder";

freshDatabase();

type Who = { cookie: string } | null;

const at = (params: object) => ({ params: Promise.resolve(params) });
const make = (who: Who, body: unknown) => makeRig(request("POST", "/api/rigs", who, body));
const save = (who: Who, id: string, body: unknown) =>
  saveRevision(request("POST", `/api/rigs/${id}/revisions`, who, body), at({ id }));
const read = (who: Who, id: string) => readRig(request("GET", `/api/rigs/${id}`, who), at({ id }));
const readOne = (who: Who, id: string, sha256: string) =>
  readRevision(request("GET", `/api/rigs/${id}/revisions/${sha256}`, who), at({ id, sha256 }));

async function expectProblem(response: Response, status: number, code: string): Promise<ProblemDocument> {
  const problem = (await response.json()) as ProblemDocument;
  expect([response.status, problem.code]).toEqual([status, code]);
  return problem;
}

async function saved(response: Promise<Response> | Response, status = 201): Promise<Saved> {
  const answer = await response;
  const body: unknown = await answer.json();
  expect([answer.status, body]).toEqual([status, expect.anything()]);
  return savedShape.parse(body);
}

async function reading(who: Who, id: string): Promise<RigReading> {
  const response = await read(who, id);
  expect(response.status).toBe(200);
  return rigReadingShape.parse(await response.json());
}

async function rows(who: Who): Promise<RigRow[]> {
  const response = await listRigs(request("GET", "/api/rigs", who));
  expect(response.status).toBe(200);
  return rigListShape.parse(await response.json()).rigs;
}

/** How many rows there are of all that saving makes. */
async function stored(): Promise<number[]> {
  const { Rig, Revision, Thing, ThingState, SheetPhoto } = tables();
  return Promise.all([Rig.count(), Revision.count(), Thing.count(), ThingState.count(), SheetPhoto.count()]);
}

let shop: Organisation;
let installer: GivenMember;
let manager: GivenMember;

beforeAll(async () => {
  shop = await givenOrganisation("shop");
  installer = await givenMember({ role: "installer", organisation: shop });
  manager = await givenMember({ role: "manager", organisation: shop });
});

/** A rig that the installer has just made of a sheet. */
async function givenSaved(sheet: Sheet = givenSheet()): Promise<{ id: string; sheet: Sheet; base: string }> {
  const id = randomUUID();
  const { revision } = await saved(make(installer, { id, sheet }));
  return { id, sheet, base: revision.digest };
}

describe("a new rig", () => {
  test("is stored as it was sent, with the list that the catalogue makes of it", async () => {
    const id = randomUUID();
    const sheet = givenSheet({ name: "Oak Bend" });
    const { rig, revision } = await saved(make(installer, { id, sheet }));
    expect(rig).toBe(id);
    expect(revision).toEqual({
      digest: digestOf(compose(sheet)),
      number: 1,
      createdAt: expect.stringMatching(/^\d{4}-.*Z$/),
      by: { id: installer.id, name: "a installer" },
      catalogue: CATALOGUE,
    });
    const found = await reading(manager, id);
    expect(found).toMatchObject({
      id,
      name: "Oak Bend",
      keeper: { id: shop.id, name: "a shop" },
      builder: { id: shop.id, name: "a shop" },
      mayWrite: true,
      revision,
      revisions: [revision],
      ruledOut: ruledOut(sheet).map(({ says }) => says),
      newerList: false,
    });
    expect(found.document).toEqual(JSON.parse(JSON.stringify(compose(sheet))));
    expect(found.document.sheet).toEqual(sheet);
    const one = await readOne(manager, id, revision.digest);
    expect(revisionReadingShape.parse(await one.json())).toEqual({
      ...revision,
      rig: id,
      document: found.document,
    });
  });

  test("round trip: what was read back makes another rig with the same digest", async () => {
    const { id, base } = await givenSaved();
    const { document } = await reading(installer, id);
    const stranger = await givenMember({ role: "manager" });
    const sheet = structuredClone(document.sheet) as unknown as Sheet;
    // Another organisation has no part in the things of this one.
    const copy = { id: randomUUID(), sheet };
    await expectProblem(await make(stranger, copy), 422, "wrong-shape");
    const { revision } = await saved(make(installer, copy));
    expect(revision.digest).toBe(base);
  });

  test("the same id and sheet again make nothing, whatever came after; another sheet is refused", async () => {
    const { id, sheet, base } = await givenSaved();
    await saved(save(installer, id, { base, sheet: { ...sheet, name: "Renamed" } }));
    const before = await stored();
    const again = await saved(make(manager, { id, sheet }), 200);
    expect(again.revision).toMatchObject({ number: 1, digest: base, by: { id: installer.id } });
    const other = await expectProblem(await make(installer, { id, sheet: givenSheet() }), 409, "id-taken");
    expect(other.errors).toEqual([{ pointer: "/id", detail: expect.any(String) }]);
    const stranger = await givenMember({ role: "manager" });
    await expectProblem(await make(stranger, { id, sheet }), 409, "id-taken");
    expect(await stored()).toEqual(before);
  });

  test("sent five times at once is made once", async () => {
    const before = await tables().Rig.count();
    const body = { id: randomUUID(), sheet: givenSheet() };
    const answers = await Promise.all(Array.from({ length: 5 }, () => make(installer, body)));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 200, 200, 201]);
    expect(await tables().Rig.count()).toBe(before + 1);
  });

  test("of a household or a fleet has no builder", async () => {
    for (const kind of ["household", "fleet"] as const) {
      const member = await givenMember({ role: "manager", organisation: await givenOrganisation(kind) });
      const id = randomUUID();
      await saved(make(member, { id, sheet: givenSheet() }));
      expect((await reading(member, id)).builder).toBeNull();
    }
  });

  test("of a sheet with nothing but a name is taken", async () => {
    const { id } = await givenSaved({ v: 1, name: "Empty" });
    expect((await reading(installer, id)).document.sheet).toEqual({ v: 1, name: "Empty" });
  });
});

describe("a new revision", () => {
  test("stands before the older ones, which stay as they were", async () => {
    const { id, sheet, base } = await givenSaved();
    const changed = { ...sheet, name: "Renamed", notes: "Bar repainted." };
    const { revision } = await saved(save(manager, id, { base, sheet: changed }));
    expect(revision).toMatchObject({ number: 2, by: { id: manager.id }, digest: digestOf(compose(changed)) });
    const found = await reading(installer, id);
    expect(found.name).toBe("Renamed");
    expect(found.revisions.map(({ number, digest }) => [number, digest])).toEqual([
      [2, revision.digest],
      [1, base],
    ]);
    const old = await (await readOne(installer, id, base)).json();
    expect(old).toMatchObject({ number: 1, document: { sheet } });
    const bundle = bundleShape.parse(
      await (await readBundle(request("GET", "/api/field/bundle", installer))).json(),
    );
    expect(bundle.rigs.find((rig) => rig.id === id)).toMatchObject({
      name: "Renamed",
      revision: { digest: revision.digest, document: { sheet: changed } },
    });
  });

  test("that changes nothing is none, over whatever base", async () => {
    const { id, sheet, base } = await givenSaved();
    const changed = { ...sheet, notes: "Once." };
    const { revision } = await saved(save(installer, id, { base, sheet: changed }));
    const before = await stored();
    for (const over of [base, revision.digest]) {
      expect((await saved(save(manager, id, { base: over, sheet: changed }), 200)).revision).toEqual(
        revision,
      );
    }
    // Another order of members is the same sheet.
    const turned = Object.fromEntries(Object.entries(changed).reverse());
    expect((await saved(save(manager, id, { base, sheet: turned }), 200)).revision).toEqual(revision);
    expect(await stored()).toEqual(before);
  });

  test("over one that is not the latest any more is refused", async () => {
    const { id, sheet, base } = await givenSaved();
    await saved(save(installer, id, { base, sheet: { ...sheet, notes: "First." } }));
    const before = await stored();
    await expectProblem(
      await save(manager, id, { base, sheet: { ...sheet, notes: "Second." } }),
      409,
      "stale-base",
    );
    await expectProblem(
      await save(manager, id, { base: "0".repeat(64), sheet: { ...sheet, notes: "Second." } }),
      409,
      "stale-base",
    );
    expect(await stored()).toEqual(before);
  });

  test("of two people who save at once one is taken and the other told", async () => {
    for (let round = 0; round < 10; round += 1) {
      const { id, sheet, base } = await givenSaved();
      const answers = await Promise.all(
        [installer, manager].map((who, at) =>
          save(who, id, { base, sheet: { ...sheet, notes: `Round ${round}, hand ${at}.` } }),
        ),
      );
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
      const winner = answers.findIndex(({ status }) => status === 201);
      const problem = (await answers[1 - winner]!.json()) as ProblemDocument;
      expect(problem.code).toBe("stale-base");
      const found = await reading(installer, id);
      expect(found.revisions).toHaveLength(2);
      expect(found.document.sheet).toMatchObject({ notes: `Round ${round}, hand ${winner}.` });
    }
  });

  test("going back makes a third, and walks on either of the two that are alike are taken", async () => {
    const { id, sheet, base } = await givenSaved();
    const there = await saved(save(installer, id, { base, sheet: { ...sheet, notes: "There." } }));
    const back = await saved(save(installer, id, { base: there.revision.digest, sheet }));
    expect(back.revision).toMatchObject({ number: 3, digest: base });
    const found = await reading(installer, id);
    expect(found.revisions.map(({ number }) => number)).toEqual([3, 2, 1]);
    expect(found.document.sheet).toEqual(sheet);
    expect(await (await readOne(installer, id, base)).json()).toMatchObject({ number: 3 });
    // Who still holds the first of the two saves over what they have seen.
    const on = await saved(save(manager, id, { base, sheet: { ...sheet, notes: "On." } }));
    expect(on.revision.number).toBe(4);

    const device = await givenDevice(installer);
    const { document } = found;
    const rig = {
      id,
      name: sheet.name,
      revision: { id: randomUUID(), digest: base, document },
      openFindings: [],
      lastWalk: null,
    };
    const walk = new WalkBuilder({ member: installer, device, rig });
    const { refused } = await ingest(installer, { device: device.id, entries: walk.entries(), seals: [] });
    expect(refused).toEqual([]);

    const context = database().getQueryInterface();
    await down({ context });
    const left = await database().query<{ number: number; walks: number }>(
      `SELECT v.number, (SELECT COUNT(*) FROM walks WHERE revision_id = v.id) AS walks
        FROM revisions v WHERE v.rig_id = :id ORDER BY v.number`,
      { type: QueryTypes.SELECT, replacements: { id } },
    );
    expect(left).toEqual([
      { number: 1, walks: 1 },
      { number: 2, walks: 0 },
      { number: 4, walks: 0 },
    ]);
    await up({ context });
  });
});

describe("what a sheet is refused for, by the field", () => {
  const cases: [string, (sheet: Sheet) => unknown, string, string][] = [
    ["a newer version", (sheet) => ({ ...sheet, v: 2, flux: 1 }), "newer-schema", ""],
    ["no version", ({ name }) => ({ name }), "wrong-shape", "/sheet/v"],
    ["no name", (sheet) => ({ ...sheet, name: "" }), "wrong-shape", "/sheet/name"],
    ["a member that nobody knows", (sheet) => ({ ...sheet, coah: {} }), "wrong-shape", "/sheet"],
    [
      "a negative weight",
      (sheet) => ({ ...sheet, coach: { gvwr: { massKg: -1, entered: { value: -1, unit: "kg" } } } }),
      "wrong-shape",
      "/sheet/coach/gvwr/massKg",
    ],
    [
      "an entered value that is another",
      (sheet) => ({ ...sheet, car: { curb: { massKg: 1400, entered: { value: 1400, unit: "lb" } } } }),
      "wrong-shape",
      "/sheet/car/curb",
    ],
    [
      "a number with seven decimals",
      (sheet) => ({ ...sheet, car: { curb: { massKg: 0.1234567, entered: { value: 1, unit: "kg" } } } }),
      "wrong-shape",
      "/sheet/car/curb/massKg",
    ],
    ["a lone surrogate", (sheet) => ({ ...sheet, notes: "\ud800" }), "wrong-shape", "/sheet/notes"],
    [
      "a gearbox that there is not",
      (sheet) => ({ ...sheet, car: { gearbox: "none" } }),
      "wrong-shape",
      "/sheet/car/gearbox",
    ],
    [
      "GCWR below GVWR",
      (sheet) => ({
        ...sheet,
        coach: { gvwr: quantityOf("mass", 22000, "lb"), gcwr: quantityOf("mass", 21999, "lb") },
      }),
      "impossible-sheet",
      "/sheet/coach/gcwr",
    ],
    [
      "a wire of no gauge",
      (sheet) => ({ ...sheet, wiring: { segments: [{}, { gaugeAwg: 0 }] } }),
      "impossible-sheet",
      "/sheet/wiring/segments/1/gaugeAwg",
    ],
    [
      "an id that is none",
      (sheet) => ({ ...sheet, coach: { id: "mine" } }),
      "wrong-shape",
      "/sheet/coach/id",
    ],
  ];

  test.each(cases)("%s", async (_, change, code, pointer) => {
    const { id, sheet, base } = await givenSaved();
    const before = await stored();
    const wrong = change(sheet);
    for (const response of [
      await save(installer, id, { base, sheet: wrong }),
      await make(installer, { id: randomUUID(), sheet: wrong }),
    ]) {
      const { errors = [{ pointer: "" }] } = await expectProblem(response, 422, code);
      expect(errors.map((error) => error.pointer)).toContain(pointer);
    }
    expect(await stored()).toEqual(before);
  });

  test.each([
    ["no sheet", { id: randomUUID() }, "/sheet"],
    ["a sheet that is a list", { id: randomUUID(), sheet: [] }, "/sheet"],
    ["no id", { sheet: givenSheet() }, "/id"],
    ["an id in capitals", { id: randomUUID().toUpperCase(), sheet: givenSheet() }, "/id"],
    ["a member beside", { id: randomUUID(), sheet: givenSheet(), list: {} }, "/list"],
  ])("a request with %s", async (_, body, pointer) => {
    const { errors } = await expectProblem(await make(installer, body), 422, "wrong-shape");
    expect(errors!.map((error) => error.pointer)).toEqual([pointer]);
  });

  test("more bytes than a sheet has", async () => {
    const body = { id: randomUUID(), sheet: { ...givenSheet(), notes: "x".repeat(SHEET_BYTES + 1024) } };
    await expectProblem(await make(installer, body), 413, "too-large");
  });

  test("unusual is taken", async () => {
    await givenSaved(givenSheet({ car: { curb: quantityOf("mass", 9000, "lb") } }));
  });
});

describe("who sees and saves which rigs", () => {
  let keeper: Organisation;
  const people: Record<string, GivenMember> = {};
  let id: string;
  let base: string;
  const sheet = givenSheet({ name: "Kept" });

  beforeAll(async () => {
    keeper = await givenOrganisation("fleet");
    for (const role of ["driver", "installer", "manager", "auditor"] as const) {
      people[role] = await givenMember({ role, organisation: keeper });
    }
    people.builder = installer;
    people.stranger = await givenMember({ role: "manager" });
    ({ id, base } = await givenSaved(sheet));
    await tables().Rig.update({ keeperId: keeper.id }, { where: { id } });
  });

  test.each([
    ["driver", 200, false, 403],
    ["installer", 200, true, 201],
    ["manager", 200, true, 201],
    ["auditor", 200, false, 403],
    ["builder", 200, false, 403],
    ["stranger", 404, false, 404],
  ])("%s", async (who, seen, mayWrite, savedAs) => {
    const person = people[who]!;
    expect((await read(person, id)).status).toBe(seen);
    expect((await readOne(person, id, base)).status).toBe(seen);
    const listed = (await rows(person)).filter((rig) => rig.id === id);
    expect(listed.map((rig) => rig.mayWrite)).toEqual(seen === 200 ? [mayWrite] : []);
    const { revision } = seen === 200 ? await reading(person, id) : { revision: { digest: base } };
    const response = await save(person, id, { base: revision.digest, sheet: { ...sheet, notes: who } });
    expect(response.status).toBe(savedAs);
    if (savedAs === 403) expect(await response.json()).toMatchObject({ code: "role-refused" });
  });

  test.each(["driver", "auditor"])("a %s makes no rig", async (who) => {
    const body = { id: randomUUID(), sheet: givenSheet() };
    await expectProblem(await make(people[who]!, body), 403, "role-refused");
  });

  test("nobody who is signed out reads or saves any", async () => {
    await expectProblem(await listRigs(request("GET", "/api/rigs", null)), 401, "signed-out");
    await expectProblem(await read(null, id), 401, "signed-out");
    await expectProblem(await readOne(null, id, base), 401, "signed-out");
    await expectProblem(await make(null, { id: randomUUID(), sheet }), 401, "signed-out");
    await expectProblem(await save(null, id, { base, sheet }), 401, "signed-out");
  });

  test("what is not theirs and what is not there are the same, byte for byte", async () => {
    const { stranger } = people as { stranger: GivenMember };
    const nowhere = randomUUID();
    const pairs = [
      [await read(stranger, id), await read(stranger, nowhere)],
      [await readOne(stranger, id, base), await readOne(stranger, nowhere, base)],
      [await readOne(stranger, id, base), await readOne(people.manager!, id, "0".repeat(64))],
      [await save(stranger, id, { base, sheet }), await save(stranger, nowhere, { base, sheet })],
    ] as const;
    for (const [theirs, none] of pairs) {
      expect([theirs.status, await theirs.text(), [...theirs.headers]]).toEqual([
        404,
        await none.text(),
        [...none.headers],
      ]);
    }
  });

  test("an address that is none", async () => {
    await expectProblem(await read(installer, "me"), 404, "not-found");
    await expectProblem(await readOne(installer, id, base.toUpperCase()), 404, "not-found");
  });
});

describe("a list of rigs", () => {
  test("goes by name, each once, whoever built it", async () => {
    const organisation = await givenOrganisation("shop");
    const member = await givenMember({ role: "manager", organisation });
    const other = await givenOrganisation("household");
    await givenRig(organisation, { name: "Birch", builder: organisation });
    await givenRig(organisation, { name: "Alder" });
    await givenRig(other, { name: "Cedar", builder: organisation });
    await givenRig(other, { name: "Dogwood" });
    expect((await rows(member)).map(({ name, mayWrite }) => [name, mayWrite])).toEqual([
      ["Alder", true],
      ["Birch", true],
      ["Cedar", false],
    ]);
  });

  test("a list from before there were sheets reads as it is", async () => {
    const organisation = await givenOrganisation();
    const member = await givenMember({ role: "manager", organisation });
    const rig = await givenRig(organisation, { document: handWritten });
    const [row] = await rows(member);
    expect(row).toMatchObject({
      ruledOut: [],
      newerList: false,
      revision: { number: 1, by: null, catalogue: "test", digest: rig.revision.digest },
    });
    const found = await reading(member, rig.id);
    expect(found.document).toEqual(handWritten);
    // Its first sheet goes over it like any other.
    await saved(save(member, rig.id, { base: rig.revision.digest, sheet: givenSheet() }));
  });

  test("says where a newer catalogue would make another list", async () => {
    const organisation = await givenOrganisation();
    const member = await givenMember({ role: "manager", organisation });
    const sheet = givenSheet();
    const older = { ...structuredClone(compose(sheet)), catalogue: "hookfast 0" };
    const rig = await givenRig(organisation, { document: older });
    expect((await rows(member))[0]).toMatchObject({ newerList: true, revision: { catalogue: "hookfast 0" } });
    // Accepting it is saving the same sheet again.
    const { revision } = await saved(save(member, rig.id, { base: rig.revision.digest, sheet }));
    expect(revision).toMatchObject({ number: 2, catalogue: CATALOGUE });
    expect((await rows(member))[0]).toMatchObject({ newerList: false });
  });

  test("says what on the sheet rules a rig out", async () => {
    const organisation = await givenOrganisation();
    const member = await givenMember({ role: "manager", organisation });
    const sheet = givenSheet({ procedure: { says: "forbidden" } });
    await saved(make(member, { id: randomUUID(), sheet }));
    const [row] = await rows(member);
    expect(row!.ruledOut.length).toBeGreaterThan(0);
    expect(row!.ruledOut).toEqual(ruledOut(sheet).map(({ says }) => says));
  });

  test("reads the organisation's rigs and no others", async () => {
    const organisation = await givenOrganisation();
    for (let count = 0; count < 3; count += 1) await givenRig(organisation);
    const plan = await database().query<{ table: string; type: string; key: string | null }>(
      `EXPLAIN ${RIG_LIST}`,
      { type: QueryTypes.SELECT, replacements: { organisation: organisation.id } },
    );
    expect(plan.filter(({ table, type }) => table === "rigs" && type === "ALL")).toEqual([]);
    expect(plan.filter(({ table, type }) => ["v", "revisions"].includes(table) && type === "ALL")).toEqual(
      [],
    );
  });
});
