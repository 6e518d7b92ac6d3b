import "fake-indexeddb/auto";
import { get } from "idb-keyval";
import { afterEach, beforeEach, expect, test, vi } from "vitest";
import { fetchBundle, keptBundle } from "@/lib/client/bundle";
import { deviceFor } from "@/lib/client/device";
import { keepRig, keptLocal, localBundle, TooManyRigs } from "@/lib/client/local-rigs";
import { Recorder } from "@/lib/client/recorder";
import { signUp, waiting } from "@/lib/client/sign-up";
import { openStore } from "@/lib/client/store";
import { isLocalOnly, Sync } from "@/lib/client/sync";
import { digestOf } from "@/lib/domain/digest";
import { bundleShape, type Bundle } from "@/lib/domain/field";
import { Problem, problemDocument, type ProblemCode } from "@/lib/domain/problem";
import { signUpShape } from "@/lib/domain/sign-up";
import { document, rig } from "../support/rig";

beforeEach(() => void vi.useFakeTimers({ toFake: ["setTimeout", "clearTimeout", "Date"], now: 0 }));
afterEach(() => void vi.useRealTimers());

type Store = ReturnType<typeof openStore>;
let stores = 0;
const freshStore = () => openStore(`local-${(stores += 1)}`);
const madeAt = "2026-05-01T08:00:00.000Z";
const keep = (store: Store, name = "Our rig") => keepRig(store, { name, document, madeAt });

const account = (id: string, rigs: Bundle["rigs"]): Bundle => ({
  generatedAt: madeAt,
  member: {
    id,
    name: "Sam",
    email: "sam@test.example",
    role: "manager",
    organisation: { id: "00000000-0000-4000-8000-0000000000fe", name: "Oak Bend", kind: "household" },
  },
  rigs,
  keys: [],
});

const refusal = (code: ProblemCode) =>
  Response.json(problemDocument(new Problem(code)), { status: new Problem(code).status });

async function pass(ms: number): Promise<void> {
  for (let left = ms; left > 0; left -= 250) {
    await vi.advanceTimersByTimeAsync(250);
    for (let turn = 0; turn < 40; turn += 1) await new Promise((resolve) => setImmediate(resolve));
  }
}

/** A phone whose every request is answered by path; `asked` has the paths in order. */
function phone(store: Store, replies: Record<string, () => Response | Promise<Response>>) {
  const asked: string[] = [];
  let attempts = 0;
  const fetch = async (path: string) => {
    asked.push(path);
    return replies[path]!();
  };
  const sync = new Sync({
    store,
    nowMs: () => Date.now(),
    spread: 1,
    label: "a phone",
    fetch,
    alone: async (work) => {
      attempts += 1;
      await work();
      return true;
    },
  });
  return { sync, asked, attempts: () => attempts };
}

async function closedWalk(sync: Sync): Promise<string> {
  const clock = () => ({ wallMs: Date.now(), monoMs: Date.now(), monoEpoch: "test" });
  const { member, rigs } = (await keptLocal(sync.shelf.store))!;
  const device = await deviceFor(sync.shelf.store, member);
  const recorder = await Recorder.open(
    { shelf: sync.shelf, clock, device },
    localBundle({ member, rigs }).rigs[0]!,
    {
      member,
      purpose: "unhook",
      depth: "full",
    },
  );
  await recorder.mark("pin", "good");
  await recorder.close();
  await sync.saved();
  return recorder.view().walk.id;
}

test("the first rig brings the member id, the next ones keep it, and there are five at most", async () => {
  const store = freshStore();
  expect(await keptLocal(store)).toBeNull();
  await keep(store);
  const { member } = (await keptLocal(store))!;
  for (const name of ["b", "c", "d", "e"]) await keep(store, name);
  await expect(keep(store, "f")).rejects.toThrow(TooManyRigs);
  const local = (await keptLocal(store))!;
  expect(local.member).toBe(member);
  expect(local.rigs.map(({ name }) => name)).toEqual(["Our rig", "b", "c", "d", "e"]);
  expect(new Set(local.rigs.map(({ id }) => id)).size).toBe(5);
});

test("two tabs that begin at once share one member", async () => {
  const store = freshStore();
  await Promise.all([keep(store, "a"), keep(store, "b")]);
  expect((await keptLocal(store))!.rigs).toHaveLength(2);
});

test("what was made here stands in for a server's bundle, under the digest that the server will take", async () => {
  const store = freshStore();
  await keep(store);
  const bundle = localBundle((await keptLocal(store))!);
  expect(bundleShape.safeParse(bundle).success).toBe(true);
  expect(bundle.rigs[0]!.revision.digest).toBe(digestOf(document));
  expect(bundle.member.name).toBe("This phone");
});

test("without an account nothing is sent, and the server is asked once each time the page comes back", async () => {
  const store = freshStore();
  await keep(store);
  const { sync, asked } = phone(store, { "/api/field/bundle": () => refusal("signed-out") });
  await sync.start();
  await closedWalk(sync);
  await pass(180_000);
  expect(isLocalOnly(sync.view())).toBe(true);
  expect(sync.view().walks).toHaveLength(1);
  expect(asked).toEqual(["/api/field/bundle"]);
  sync.stir();
  await pass(180_000);
  expect(asked).toEqual(["/api/field/bundle", "/api/field/bundle"]);
  sync.stop();
});

test("without an account and without a signal the phone does not knock again and again", async () => {
  const store = freshStore();
  await keep(store);
  const { sync, asked } = phone(store, { "/api/field/bundle": () => Promise.reject(new TypeError("gone")) });
  await sync.start();
  await pass(300_000);
  expect(asked).toHaveLength(1);
  sync.stop();
});

test("signed in to another account: rig and walk stay beside it, and are neither sent nor lost", async () => {
  const store = freshStore();
  await keep(store);
  const { sync, asked, attempts } = phone(store, {
    "/api/field/bundle": () => Response.json(account("00000000-0000-4000-8000-0000000000aa", [rig])),
    "/api/devices": () => Response.json({}, { status: 201 }),
  });
  await sync.start();
  const walk = await closedWalk(sync);
  await pass(60_000);
  const view = sync.view();
  expect(isLocalOnly(view)).toBe(false);
  expect(view.bundle!.rigs).toEqual([rig]);
  expect(view.local!.rigs.map(({ name }) => name)).toEqual(["Our rig"]);
  expect(view.walks.map(({ id, acknowledged, receipt }) => [id, acknowledged, receipt])).toEqual([
    [walk, 0, null],
  ]);
  expect(asked).toEqual(["/api/field/bundle", "/api/devices"]);
  // The walk that waits for a sign-up is no reason to try again.
  expect(attempts()).toBe(1);
  sync.stop();
});

test("the bundle of the same member takes the place of what was made here, in the same write", async () => {
  const store = freshStore();
  await keep(store);
  const { member, rigs } = (await keptLocal(store))!;
  const adopted = account(member, [{ ...rig, id: rigs[0]!.id, name: "Our rig" }]);
  const fetch = async () => Response.json(adopted);
  const broken: Store = (mode, work) =>
    store(mode, (shelf) => {
      shelf.put = () => {
        throw new DOMException("", "QuotaExceededError");
      };
      return work(shelf);
    });
  await expect(fetchBundle(broken, fetch)).rejects.toThrow();
  expect(await keptLocal(store)).not.toBeNull();
  expect(await keptBundle(store)).toBeNull();
  await fetchBundle(store, fetch);
  expect(await keptLocal(store)).toBeNull();
  expect(await keptBundle(store)).toEqual(adopted);
});

test("a rig made while the sign-up was under way stays", async () => {
  const store = freshStore();
  await keep(store);
  const { member, rigs } = (await keptLocal(store))!;
  await keep(store, "Late");
  await fetchBundle(store, async () => Response.json(account(member, [{ ...rig, id: rigs[0]!.id }])));
  expect((await keptLocal(store))!.rigs.map(({ name }) => name)).toEqual(["Late"]);
});

const form = { name: "Sam", household: "Oak Bend", email: "sam@test.example", password: "fifteen letters" };

test("a sign-up sends the member and the rigs, and then the account's bundle is on the phone", async () => {
  const store = freshStore();
  await keep(store);
  const { member, rigs } = (await keptLocal(store))!;
  const adopted = account(member, [{ ...rig, id: rigs[0]!.id }]);
  const sent: string[] = [];
  const answer = await signUp(store, form, async (path, init) => {
    if (path !== "/api/sign-up") return Response.json(adopted);
    sent.push(init.body as string);
    return Response.json({ member: adopted.member }, { status: 201 });
  });
  expect(answer.kind).toBe("answered");
  expect(sent).toHaveLength(1);
  const body: unknown = JSON.parse(sent[0]!);
  expect(signUpShape.safeParse(body).success).toBe(true);
  expect(body).toEqual({ ...form, member, rigs: [{ id: rigs[0]!.id, name: "Our rig", document }] });
  expect(await keptLocal(store)).toBeNull();
});

test.each<[string, () => Promise<Response>]>([
  ["refused", async () => refusal("address-taken")],
  ["without an answer", () => Promise.reject(new TypeError("gone"))],
])("a sign-up %s leaves everything on the phone", async (_, fetch) => {
  const store = freshStore();
  await keep(store);
  expect((await signUp(store, form, fetch)).kind).not.toBe("answered");
  expect((await keptLocal(store))!.rigs).toHaveLength(1);
});

test("a store that does not answer sends nothing; one that is forbidden has nothing to bring", async () => {
  const fetch = vi.fn(async () => refusal("address-taken"));
  const failing = (name: string) => (() => Promise.reject(new DOMException("", name))) as Store;
  await expect(signUp(failing("UnknownError"), form, fetch)).rejects.toThrow();
  expect(fetch).not.toHaveBeenCalled();
  await signUp(failing("SecurityError"), form, fetch);
  expect(fetch).toHaveBeenCalledTimes(1);
});

test("what waits for an account is named with its walks", async () => {
  const store = freshStore();
  expect(await waiting(store, async () => [])).toBeNull();
  await keep(store);
  const { member, rigs } = (await keptLocal(store))!;
  const id = rigs[0]!.id;
  const walks = [
    { member, rig: id },
    { member: "someone else", rig: id },
  ];
  expect(await waiting(store, async () => walks)).toEqual({ rigs: [{ id, name: "Our rig", walks: 1 }] });
  expect(await get(["local"], store)).toBeDefined();
});
