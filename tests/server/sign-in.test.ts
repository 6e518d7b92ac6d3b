import { afterEach, beforeAll, beforeEach, describe, expect, test, vi } from "vitest";
import { GET as whoAmI, POST as signIn } from "@/app/api/session/route";
import { tables } from "@/lib/server/database";
import { hashPassword, verifyPassword } from "@/lib/server/password";
import { freshDatabase } from "../support/database";
import { givenMember, request, type GivenMember } from "../support/given";

freshDatabase();

const PASSWORD = "walk the rig twice";

let member: GivenMember;
let passwordHash: string;
let count = 0;

beforeAll(async () => {
  passwordHash = await hashPassword(PASSWORD);
});

beforeEach(async () => {
  member = await givenMember({ role: "manager", email: `m${(count += 1)}@test.example`, passwordHash });
});

afterEach(() => {
  vi.useRealTimers();
});

const attempt = (email: string, password: string, who: { cookie: string } | null = null) =>
  signIn(request("POST", "/api/session", who, { email, password }));

async function expectWrong(response: Response): Promise<void> {
  expect([response.status, ((await response.json()) as { code: string }).code]).toEqual([
    401,
    "wrong-credentials",
  ]);
  expect(response.headers.get("set-cookie")).toBeNull();
}

describe("the right password", () => {
  test("answers with the member and a cookie that lasts thirty days", async () => {
    const response = await attempt(member.email, PASSWORD);
    expect(response.status).toBe(200);
    const { id, name, email, role, organisation } = member;
    expect(await response.json()).toEqual({ member: { id, name, email, role, organisation } });
    expect(response.headers.get("set-cookie")).toMatch(
      /^hookfast=[a-z0-9]{40}; HttpOnly; Max-Age=2592000; Path=\/; SameSite=Lax$/,
    );
  });

  test.each([(email: string) => ` ${email.toUpperCase()} `, (email: string) => `\t${email}\n`])(
    "whatever the address's case and the space around it",
    async (typed) => {
      expect((await attempt(typed(member.email), PASSWORD)).status).toBe(200);
    },
  );

  test("leaves only a digest of the session id in the database", async () => {
    const cookie = (await attempt(member.email, PASSWORD)).headers.get("set-cookie")!.split(";")[0]!;
    const sessions = await tables().Session.findAll({ where: { memberId: member.id }, raw: true });
    expect(sessions).toHaveLength(2);
    for (const { id } of sessions) {
      expect(id).toHaveLength(32);
      expect(cookie).not.toContain(id.toString("latin1"));
      expect(cookie).not.toContain(id.toString("hex"));
    }
  });

  test("ends the session that was there", async () => {
    expect((await attempt(member.email, PASSWORD, member)).status).toBe(200);
    expect((await whoAmI(request("GET", "/api/session", member))).status).toBe(401);
  });
});

describe("cookies of other programs on this host", () => {
  test.each(["a=%zz; ", "%zz=1; ", "hookfast-other=%; "])("%s does not stand in the way", async (other) => {
    const driver = await givenMember({ role: "driver" });
    const cookie = other + driver.cookie;
    expect((await whoAmI(request("GET", "/api/session", { cookie }))).status).toBe(200);
  });

  test("an unreadable one under our own name is no session, and signing in replaces it", async () => {
    const cookie = "hookfast=%zz";
    expect((await whoAmI(request("GET", "/api/session", { cookie }))).status).toBe(401);
    expect((await attempt(member.email, PASSWORD, { cookie })).status).toBe(200);
  });
});

describe("a wrong password", () => {
  test("and an unknown address have the same answer", async () => {
    const wrong = await attempt(member.email, "walk the rig once");
    const unknown = await attempt("nobody@test.example", PASSWORD);
    expect([...wrong.headers]).toEqual([...unknown.headers]);
    expect(await wrong.clone().text()).toBe(await unknown.clone().text());
    await expectWrong(wrong);
    await expectWrong(unknown);
  });

  test("and an unknown address cost the same work", async () => {
    // The parameters decide the time; the hash for nobody must not be left behind when they change.
    const parameters = (hash: string) => hash.split("$").slice(1, 4);
    expect(parameters(passwordHash)).toEqual(["argon2id", "v=19", "m=19456,t=2,p=1"]);
    const times = { known: [] as number[], unknown: [] as number[] };
    for (let round = 0; round < 7; round += 1) {
      for (const [who, hash] of [
        ["known", passwordHash],
        ["unknown", null],
      ] as const) {
        const began = performance.now();
        expect(await verifyPassword(hash, "wrong")).toBe(false);
        times[who].push(performance.now() - began);
      }
    }
    const quickest = (list: number[]) => Math.min(...list);
    expect(quickest(times.unknown) / quickest(times.known)).toBeGreaterThan(0.5);
    expect(quickest(times.unknown) / quickest(times.known)).toBeLessThan(2);
  });

  test.each([{}, { email: "a@b.example" }, { email: "", password: "x" }, { email: 1, password: "x" }])(
    "%o is of the wrong shape",
    async (body) => {
      expect((await signIn(request("POST", "/api/session", null, body))).status).toBe(422);
    },
  );
});

describe("failed attempts", () => {
  async function fail(times: number, email = member.email): Promise<void> {
    for (let time = 0; time < times; time += 1) await expectWrong(await attempt(email, "wrong"));
  }

  test("after ten even the right password waits, until five minutes from the first are over", async () => {
    vi.useFakeTimers({ toFake: ["Date"], now: new Date("2026-05-01T12:00:00.000Z") });
    await fail(10);
    vi.setSystemTime(new Date("2026-05-01T12:01:00.500Z"));
    const refused = await attempt(` ${member.email.toUpperCase()}`, PASSWORD);
    expect(refused.status).toBe(429);
    expect(((await refused.json()) as { code: string }).code).toBe("too-many-attempts");
    expect(refused.headers.get("retry-after")).toBe("240");
    vi.setSystemTime(new Date("2026-05-01T12:04:59.900Z"));
    expect((await attempt(member.email, PASSWORD)).headers.get("retry-after")).toBe("1");
    vi.setSystemTime(new Date("2026-05-01T12:05:00.001Z"));
    expect((await attempt(member.email, PASSWORD)).status).toBe(200);
  });

  test("nine are forgiven by a success", async () => {
    await fail(9);
    expect((await attempt(member.email, PASSWORD)).status).toBe(200);
    await fail(10);
    expect((await attempt(member.email, PASSWORD)).status).toBe(429);
  });

  test("of an unknown address are counted too, and of one address only", async () => {
    await fail(10, "stranger@test.example");
    expect((await attempt("stranger@test.example", PASSWORD)).status).toBe(429);
    expect((await attempt(member.email, PASSWORD)).status).toBe(200);
  });

  test("successes are never counted", async () => {
    for (let time = 0; time < 12; time += 1) {
      expect((await attempt(member.email, PASSWORD)).status).toBe(200);
    }
  });

  test("many at once try no more than a few passwords past the limit", async () => {
    const answers = await Promise.all(Array.from({ length: 40 }, () => attempt(member.email, "wrong")));
    const wrong = answers.filter(({ status }) => status === 401).length;
    expect(wrong).toBeLessThanOrEqual(20);
    expect((await attempt(member.email, PASSWORD)).status).toBe(429);
  });
});

describe("a session grows old", () => {
  const setExpiry = (days: number) =>
    tables().Session.update(
      { expiresAt: new Date(Date.now() + days * 24 * 3600_000) },
      { where: { memberId: member.id } },
    );

  test("past its half it is renewed and the cookie set again, under the same id", async () => {
    await setExpiry(14);
    const response = await whoAmI(request("GET", "/api/session", member));
    expect(response.status).toBe(200);
    expect(response.headers.get("set-cookie")).toContain(`${member.cookie}; HttpOnly; Max-Age=2592000`);
    const again = await whoAmI(request("GET", "/api/session", member));
    expect([again.status, again.headers.get("set-cookie")]).toEqual([200, null]);
    expect(await tables().Session.count({ where: { memberId: member.id } })).toBe(1);
  });

  test("run out, it is no session and its row goes", async () => {
    await setExpiry(-0.001);
    expect((await whoAmI(request("GET", "/api/session", member))).status).toBe(401);
    expect(await tables().Session.count({ where: { memberId: member.id } })).toBe(0);
  });
});
