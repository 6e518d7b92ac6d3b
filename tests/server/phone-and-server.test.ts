import "fake-indexeddb/auto";
import fc from "fast-check";
import { QueryTypes } from "sequelize";
import { beforeAll, describe, expect, test } from "vitest";
import { POST as registerDevice } from "@/app/api/devices/route";
import { POST as sendEntries } from "@/app/api/field/entries/route";
import { GET as readRecord } from "@/app/api/walks/[id]/record/route";
import { deviceFor, registrationOf, type Device } from "@/lib/client/device";
import { drainOnce, isUnsent } from "@/lib/client/drain";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { WalkShelf } from "@/lib/client/walk-shelf";
import { outcomes, type Link } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { receiptHolds, type ServerKey } from "@/lib/domain/receipt";
import { database } from "@/lib/server/database";
import { ensureServerKey, serverKeys } from "@/lib/server/server-key";
import { freshDatabase } from "../support/database";
import { givenMember, givenRig, request, type GivenMember } from "../support/given";
import { document } from "../support/rig";

const RUNS = 200;
const checks = document.walks["hook-up"].full;

/** What the network does to one exchange. */
const faults = [
  "none",
  "marked-meanwhile",
  "request-lost",
  "answer-lost",
  "doubled",
  "delayed",
  "request-cut",
  "answer-cut",
] as const;

const step = fc.oneof(
  { weight: 2, arbitrary: fc.record({ do: fc.constant("open" as const) }) },
  {
    weight: 6,
    arbitrary: fc.record({
      do: fc.constant("mark" as const),
      walk: fc.nat(9),
      check: fc.constantFrom(...checks),
      outcome: fc.constantFrom(...outcomes),
    }),
  },
  { weight: 3, arbitrary: fc.record({ do: fc.constant("close" as const), walk: fc.nat(9) }) },
  {
    weight: 6,
    arbitrary: fc.record({ do: fc.constant("drain" as const), fault: fc.constantFrom(...faults) }),
  },
  { weight: 2, arbitrary: fc.record({ do: fc.constant("late" as const), which: fc.nat(9) }) },
);
type Step = typeof step extends fc.Arbitrary<infer S> ? S : never;

let member: GivenMember;
let rig: BundleRig;
let keys: ServerKey[];

freshDatabase();

beforeAll(async () => {
  await ensureServerKey();
  keys = await serverKeys();
  member = await givenMember({ role: "driver" });
  rig = await givenRig(member.organisation, { document });
});

let stores = 0;

/** A phone with a store and a key of its own, and the network between it and the server's real handler. */
class Phone {
  readonly shelf = new WalkShelf(openStore(`phone-${(stores += 1)}`));
  readonly recorders: Recorder[] = [];
  /** Every body that ever left, so that the network can deliver any of them again, at any time. */
  private readonly left: string[] = [];
  private now = Date.UTC(2026, 4, 1);
  device!: Device;

  async start(): Promise<this> {
    this.device = await deviceFor(this.shelf.store, member.id);
    const answer = await registerDevice(
      request("POST", "/api/devices", member, registrationOf(this.device, "test phone")),
    );
    expect(answer.status).toBe(201);
    return this;
  }

  clock = () => ({ wallMs: (this.now += 1_000), monoMs: this.now, monoEpoch: "test" });

  async take(what: Step): Promise<void> {
    if (what.do === "open") {
      const open = { member: member.id, purpose: "hook-up", depth: "full" } as const;
      this.recorders.push(
        await Recorder.open({ shelf: this.shelf, clock: this.clock, device: this.device }, rig, open),
      );
    } else if (what.do === "drain") {
      await this.drain(what.fault);
    } else if (what.do === "late") {
      const body = this.left[what.which % (this.left.length || 1)];
      if (body) await this.deliver(body);
    } else {
      const recorder = this.recorders[what.walk % (this.recorders.length || 1)];
      if (!recorder || recorder.view().walk.seal) return;
      await (what.do === "close" ? recorder.close() : recorder.mark(what.check, what.outcome));
    }
  }

  drain(fault: (typeof faults)[number]) {
    return drainOnce(this.shelf, this.device.id, keys, async (_, init) => {
      const body = String(init.body);
      this.left.push(body);
      const lost = new TypeError("Failed to fetch");
      if (fault === "request-lost" || fault === "delayed") throw lost;
      if (fault === "request-cut") return this.deliver(body.slice(0, body.length / 2));
      const [answer] = await Promise.all([
        this.deliver(body),
        ...(fault === "doubled" ? [this.deliver(body)] : []),
      ]);
      const open = this.recorders.find((recorder) => !recorder.view().walk.seal);
      if (fault === "marked-meanwhile") await open?.mark("pin", "good");
      if (fault === "answer-lost") throw lost;
      if (fault !== "answer-cut") return answer;
      const text = await answer.text();
      return new Response(text.slice(0, text.length / 2), answer);
    });
  }

  private deliver(body: string): Promise<Response> {
    return sendEntries(request("POST", "/api/field/entries", member, body));
  }
}

/** What the server stores of a walk, as text, by sequence number. */
async function stored(walk: string): Promise<string[]> {
  const rows = await database().query<{ seq: number; bytes: Buffer }>(
    "SELECT seq, bytes FROM entries WHERE walk_id = ? ORDER BY seq",
    { replacements: [walk], type: QueryTypes.SELECT },
  );
  expect(rows.map((row) => row.seq)).toEqual(rows.map((_, place) => place));
  return rows.map((row) => row.bytes.toString("utf8"));
}

const texts = (links: Link[]) => links.map((link) => link.text);

/** At no moment does the server hold anything but the beginning of what the phone wrote, nor less than it said. */
async function expectBeginning(phone: Phone): Promise<void> {
  for (const { id, acknowledged } of await phone.shelf.walks()) {
    const there = await stored(id);
    const here = texts(await phone.shelf.links(id));
    expect(there).toEqual(here.slice(0, there.length));
    expect(there.length).toBeGreaterThanOrEqual(acknowledged);
  }
}

describe("the phone's store and the server's ingest", () => {
  test(`nothing acknowledged is lost, nothing is stored twice, what arrives late arrives whole: ${RUNS} schedules`, async () => {
    const schedule = fc.array(step, { minLength: 4, maxLength: 18 });
    let sealed = 0;
    let repeats = 0;
    await fc.assert(
      fc.asyncProperty(schedule, async (steps) => {
        const phone = await new Phone().start();
        for (const what of [{ do: "open" } as const, ...steps]) {
          await phone.take(what);
          if (what.do === "drain" || what.do === "late") await expectBeginning(phone);
        }
        for (let tries = 0; (await phone.shelf.walks()).some(isUnsent); tries += 1) {
          expect(tries).toBeLessThan(5);
          await phone.drain("none");
        }
        for (const walk of await phone.shelf.walks()) {
          expect(await stored(walk.id)).toEqual(texts(await phone.shelf.links(walk.id)));
          expect(walk).toMatchObject({ acknowledged: walk.length, refused: null });
          expect(walk.receipt !== null).toBe(walk.seal !== null);
          if (!walk.seal) continue;
          sealed += 1;
          expect(receiptHolds(walk.receipt!, walk.seal.seal, keys)).toBe(true);
          expect(walk.receipt).toMatchObject({ entries: walk.length, verdict: walk.verdict });
        }
        const again = phone.recorders.at(-1)!.view().walk;
        const record = await readRecord(request("GET", `/api/walks/${again.id}/record`, member), {
          params: Promise.resolve({ id: again.id }),
        });
        const lines = (await record.text()).trimEnd().split("\n");
        expect(lines.slice(1, again.length + 1)).toEqual(texts(await phone.shelf.links(again.id)));
        expect(lines).toHaveLength(again.length + (again.seal ? 2 : 1));
        repeats += steps.filter((s) => s.do === "late" || (s.do === "drain" && s.fault === "doubled")).length;
      }),
      { numRuns: RUNS, seed: 20260501 },
    );
    // The schedules must have met what they are for.
    expect(sealed).toBeGreaterThan(RUNS / 4);
    expect(repeats).toBeGreaterThan(RUNS / 2);
  }, 300_000);
});
