import { randomUUID } from "node:crypto";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { DELETE as withdraw } from "@/app/api/invitations/[id]/route";
import { GET as listInvitations, POST as invite } from "@/app/api/invitations/route";
import { GET as readInvitation, POST as join } from "@/app/api/join/[token]/route";
import { GET as listPeople } from "@/app/api/members/route";
import { GET as whoAmI, POST as signIn } from "@/app/api/session/route";
import {
  invitationListShape,
  invitationReadingShape,
  invitedAs,
  madeInvitationShape,
  peopleShape,
  TOKEN,
} from "@/lib/domain/invitation";
import { organisationKinds, roles, type Member, type Role } from "@/lib/domain/member";
import type { ProblemDocument } from "@/lib/domain/problem";
import { tables } from "@/lib/server/database";
import { SIGN_UPS } from "@/lib/server/sign-up-limit";
import { freshDatabase } from "../support/database";
import { givenMember, givenOrganisation, request, type GivenMember } from "../support/given";

freshDatabase();

const PASSWORD = "fifteen letters";
let count = 0;
let email = "";
let manager: GivenMember;

beforeEach(async () => {
  count += 1;
  email = `joined${count}@test.example`;
  manager = await givenMember({ role: "manager", organisation: await givenOrganisation("household") });
});
afterEach(() => void vi.useRealTimers());

const at = (params: object) => ({ params: Promise.resolve(params) });
const ask = (who: { cookie: string } | null, role: string = "driver") =>
  invite(request("POST", "/api/invitations", who, { role }));
const look = (token: string) => readInvitation(request("GET", `/api/join/${token}`, null), at({ token }));
const enter = (token: string, over: object = {}, who: { cookie: string } | null = null) =>
  join(
    request(
      "POST",
      `/api/join/${token}`,
      who,
      { name: "Lee", email, password: PASSWORD, ...over },
      { "x-forwarded-for": `192.0.2.${count}` },
    ),
    at({ token }),
  );
const takeBack = (who: { cookie: string } | null, id: string) =>
  withdraw(request("DELETE", `/api/invitations/${id}`, who), at({ id }));

async function givenInvitation(who = manager, role: Role = "driver"): Promise<{ id: string; token: string }> {
  const response = await ask(who, role);
  expect(response.status).toBe(201);
  const { id, url } = madeInvitationShape.parse(await response.json());
  return { id, token: new URL(url, "http://x").searchParams.get("token")! };
}

async function open(who: GivenMember) {
  const response = await listInvitations(request("GET", "/api/invitations", who));
  expect(response.status).toBe(200);
  return invitationListShape.parse(await response.json()).invitations;
}

async function people(who: GivenMember) {
  const response = await listPeople(request("GET", "/api/members", who));
  expect(response.status).toBe(200);
  return peopleShape.parse(await response.json()).members;
}

async function expectProblem(response: Response, status: number, code: string): Promise<ProblemDocument> {
  const problem = (await response.json()) as ProblemDocument;
  expect([response.status, problem.code]).toEqual([status, code]);
  expect(response.headers.get("set-cookie")).toBeNull();
  return problem;
}

describe("an invitation", () => {
  test("makes a second member, who is signed in and can come back", async () => {
    vi.useFakeTimers({ toFake: ["Date"], now: new Date("2026-05-01T12:00:00.000Z") });
    const made = madeInvitationShape.parse(await (await ask(manager)).json());
    expect(made).toMatchObject({ role: "driver", expiresAt: "2026-05-08T12:00:00.000Z" });
    const { pathname, searchParams } = new URL(made.url, "http://x");
    const token = searchParams.get("token")!;
    expect([pathname, TOKEN.test(token)]).toEqual(["/join", true]);
    expect(await open(manager)).toEqual([
      { id: made.id, role: "driver", by: "a manager", expiresAt: made.expiresAt },
    ]);
    expect(invitationReadingShape.parse(await (await look(token)).json())).toEqual({
      organisation: { name: "a household", kind: "household" },
      role: "driver",
      by: "a manager",
      expiresAt: made.expiresAt,
    });

    const response = await enter(token, { email: ` ${email.toUpperCase()} `, name: " Lee " });
    expect(response.status).toBe(201);
    const { member } = (await response.json()) as { member: Member };
    expect(member).toEqual({
      id: expect.any(String),
      name: "Lee",
      email,
      role: "driver",
      organisation: manager.organisation,
    });
    const cookie = response.headers.get("set-cookie")!.split(";")[0]!;
    expect(await (await whoAmI(request("GET", "/api/session", { cookie }))).json()).toEqual({ member });
    const again = await signIn(request("POST", "/api/session", null, { email, password: PASSWORD }));
    expect(again.status).toBe(200);
    expect(await open(manager)).toEqual([]);
    expect(await people(manager)).toEqual([
      { id: manager.id, name: "a manager", role: "manager" },
      { id: member.id, name: "Lee", role: "driver" },
    ]);
  });

  test("leaves no token in the database", async () => {
    const { id, token } = await givenInvitation();
    const row = await tables().Invitation.findByPk(id, { raw: true });
    expect(row!.tokenDigest).toHaveLength(32);
    expect(JSON.stringify(row)).not.toContain(token);
    expect(row!.tokenDigest.equals(Buffer.from(token, "base64url"))).toBe(false);
  });

  test("ends the session that was there", async () => {
    const { token } = await givenInvitation();
    expect((await enter(token, {}, manager)).status).toBe(201);
    expect((await whoAmI(request("GET", "/api/session", manager))).status).toBe(401);
  });

  test("that is used, withdrawn, run out or unknown answers the same", async () => {
    vi.useFakeTimers({ toFake: ["Date"], now: new Date("2026-05-01T12:00:00.000Z") });
    const late = await givenInvitation();
    vi.setSystemTime(new Date("2026-05-02T12:00:00.000Z"));
    const [used, taken] = [await givenInvitation(), await givenInvitation()];
    expect((await enter(used.token)).status).toBe(201);
    expect((await takeBack(manager, taken.id)).status).toBe(204);
    vi.setSystemTime(new Date("2026-05-08T11:59:59.999Z"));
    expect((await look(late.token)).status).toBe(200);
    vi.setSystemTime(new Date("2026-05-08T12:00:00.000Z"));
    const before = await tables().Member.count();
    const answers: string[] = [];
    for (const token of [used.token, taken.token, late.token, "A".repeat(43), "no token"]) {
      for (const response of [await look(token), await enter(token, { email: `x-${email}` })]) {
        expect(response.status).toBe(404);
        answers.push(await response.text());
      }
    }
    expect(new Set(answers).size).toBe(1);
    expect(await tables().Member.count()).toBe(before);
    // It is still there until the next one is made, and not offered meanwhile.
    expect(await open(manager)).toEqual([]);
    await givenInvitation();
    expect(await tables().Invitation.count({ where: { id: late.id } })).toBe(0);
  });

  test("is used once, however many come at once", async () => {
    const { token } = await givenInvitation();
    const answers = await Promise.all(
      Array.from({ length: 4 }, (_, index) => enter(token, { email: `${index}-${email}` })),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 404, 404, 404]);
    expect(await people(manager)).toHaveLength(2);
  });

  test("stays open where its taker could not come in", async () => {
    const { token } = await givenInvitation();
    await givenMember({ role: "driver", email });
    await expectProblem(await enter(token), 409, "address-taken");
    const { errors } = await expectProblem(
      await enter(token, { password: "x".repeat(14), name: " " }),
      422,
      "wrong-shape",
    );
    expect(errors!.map(({ pointer }) => pointer).sort()).toEqual(["/name", "/password"]);
    expect((await enter(token, { email: `y-${email}` })).status).toBe(201);
  });

  test("counts as a sign-up, so that addresses cannot be tried without end", async () => {
    const { token } = await givenInvitation();
    await givenMember({ role: "driver", email });
    for (let more = 0; more < SIGN_UPS.toAddress; more += 1) {
      await expectProblem(await enter(token), 409, "address-taken");
    }
    await expectProblem(await enter(token), 429, "too-many-attempts");
  });
});

describe("who invites, and as what", () => {
  test.each(organisationKinds)("a %s", async (kind) => {
    const member = await givenMember({ role: "manager", organisation: await givenOrganisation(kind) });
    for (const role of roles) {
      const response = await ask(member, role);
      if (invitedAs[kind].includes(role)) expect(response.status).toBe(201);
      else {
        const { errors } = await expectProblem(response, 422, "wrong-shape");
        expect(errors!.map(({ pointer }) => pointer)).toEqual(["/role"]);
      }
    }
  });

  test.each(["driver", "installer", "auditor"] as const)("no %s", async (role) => {
    const member = await givenMember({ role, organisation: manager.organisation });
    const { id } = await givenInvitation();
    await expectProblem(await ask(member), 403, "role-refused");
    await expectProblem(await takeBack(member, id), 403, "role-refused");
    for (const list of [listInvitations, listPeople]) {
      await expectProblem(await list(request("GET", "/", member)), 403, "role-refused");
    }
    expect(await open(manager)).toHaveLength(1);
  });

  test("nobody for another organisation, whose invitations read like none at all", async () => {
    const { id } = await givenInvitation();
    const stranger = await givenMember({ role: "manager" });
    const [theirs, none] = [await takeBack(stranger, id), await takeBack(stranger, randomUUID())];
    expect([theirs.status, await theirs.text()]).toEqual([404, await none.text()]);
    expect(await open(stranger)).toEqual([]);
    expect(await people(stranger)).toEqual([{ id: stranger.id, name: "a manager", role: "manager" }]);
    expect(await open(manager)).toHaveLength(1);
  });
});
