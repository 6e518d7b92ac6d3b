import "fake-indexeddb/auto";
import { createHash, randomBytes } from "node:crypto";
import { mkdtempSync, readdirSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { POST as registerDevice } from "@/app/api/devices/route";
import { GET as readBundle } from "@/app/api/field/bundle/route";
import { POST as sendEntries } from "@/app/api/field/entries/route";
import { POST as askForPhoto, PUT as sendPhoto } from "@/app/api/photos/[sha256]/route";
import { GET as readWalk } from "@/app/api/walks/[id]/route";
import type { Fetch } from "@/lib/client/api";
import { deviceFor } from "@/lib/client/device";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { Sync } from "@/lib/client/sync";
import type { BundleRig } from "@/lib/domain/field";
import { walkReadingShape } from "@/lib/domain/history";
import { ensureServerKey } from "@/lib/server/server-key";
import { settings } from "@/lib/server/settings";
import { freshDatabase } from "../support/database";
import { givenMember, givenRig, request, type GivenMember } from "../support/given";

const folder = mkdtempSync(path.join(tmpdir(), "hookfast-photos-"));
process.env.PHOTOS_DIR = folder;
freshDatabase();
afterAll(() => rmSync(folder, { recursive: true }));

let member: GivenMember;
let rig: BundleRig;
beforeAll(async () => {
  ensureServerKey();
  member = await givenMember({ role: "driver" });
  rig = await givenRig(member.organisation);
});

/** The server's real handlers by path. */
const server: Fetch = async (address, { method, headers, body }) => {
  const { pathname } = new URL(address, settings.ORIGIN);
  const sent = new Request(settings.ORIGIN + address, {
    method,
    headers: { cookie: member.cookie, origin: settings.ORIGIN, ...(headers as Record<string, string>) },
    body,
  });
  const photo = { params: Promise.resolve({ sha256: pathname.split("/").at(-1)! }) };
  if (pathname === "/api/devices") return registerDevice(sent);
  if (pathname === "/api/field/bundle") return readBundle(sent);
  if (pathname === "/api/field/entries") return sendEntries(sent);
  return method === "POST" ? askForPhoto(sent, photo) : sendPhoto(sent, photo);
};

let stores = 0;
/** A phone with a sync that runs in real time, and the network between it and the server. */
async function phone(network: (next: Fetch) => Fetch = (next) => next) {
  const asked: string[] = [];
  const carry = network(server);
  const sync = new Sync({
    store: openStore(`phone-photos-${(stores += 1)}`),
    nowMs: () => performance.now(),
    spread: 0,
    label: "test phone",
    fetch: (address, init) => {
      asked.push(`${init.method} ${address.split("?")[0]!.replace(/[0-9a-f]{64}/, "…")}`);
      return carry(address, init);
    },
    alone: async (work) => {
      await work();
      return true;
    },
  });
  const device = await deviceFor(sync.shelf.store, member.id);
  const clock = () => ({ wallMs: Date.now(), monoMs: performance.now(), monoEpoch: "test" });
  const plan = { member: member.id, purpose: "hook-up", depth: "full" } as const;
  const recorder = await Recorder.open({ shelf: sync.shelf, clock, device }, rig, plan);
  recorder.subscribe(() => void sync.saved());
  return { sync, recorder, asked };
}

function picture(size = 60_000) {
  const bytes = new Uint8Array(randomBytes(size)).buffer;
  const sha256 = createHash("sha256").update(new Uint8Array(bytes)).digest("hex");
  return { bytes, mime: "image/jpeg" as const, sha256 };
}

async function until(what: () => boolean): Promise<void> {
  await expect.poll(what, { timeout: 20_000, interval: 25 }).toBe(true);
}

async function photosAtTheDesk(walk: string) {
  const answer = await readWalk(request("GET", `/api/walks/${walk}`, member), {
    params: Promise.resolve({ id: walk }),
  });
  return walkReadingShape.parse(await answer.json()).photos;
}

const storedFile = (sha256: string) =>
  readdirSync(folder, { recursive: true, encoding: "utf8" }).find((name) => name.endsWith(sha256));

describe("photographs between a phone and the server", () => {
  test("go by themselves after the walk, each once, and are there to the byte", async () => {
    const { sync, recorder, asked } = await phone();
    const [one, two] = [picture(), picture()];
    await sync.start();
    await recorder.mark("pin", "fault");
    await recorder.photo("pin", one);
    await recorder.photo("pin", two);
    await recorder.photo(undefined, one);
    const { id } = recorder.view().walk;
    await until(() => sync.view().walks[0]!.acknowledged === 5);
    expect(asked.filter((each) => each.includes("photos"))).toEqual([]);
    expect(await photosAtTheDesk(id)).toMatchObject([
      { arrived: false },
      { arrived: false },
      { arrived: false },
    ]);

    await recorder.close();
    await until(() => sync.view().photos.every(({ state }) => state === "sent"));
    sync.stop();
    expect(sync.view().photos.map(({ check }) => check)).toEqual(["pin", "pin", null]);
    expect(sync.view().walks[0]!.receipt).not.toBeNull();
    expect(asked.filter((each) => each === "PUT /api/photos/…")).toHaveLength(2);
    expect((await photosAtTheDesk(id)).map(({ arrived }) => arrived)).toEqual([true, true, true]);
    for (const { sha256, bytes } of [one, two]) {
      const there = readFileSync(path.join(folder, storedFile(sha256)!));
      expect(there.equals(Buffer.from(bytes))).toBe(true);
    }
  });

  test("that hang hold up neither the next walk's entries nor its seal", async () => {
    let release = () => {};
    const hanging = new Promise<void>((done) => (release = done));
    const { sync, recorder } = await phone((next) => async (address, init) => {
      if (init.method === "PUT") await hanging;
      return next(address, init);
    });
    await sync.start();
    await recorder.photo(undefined, picture());
    await recorder.close();
    await until(() => sync.view().walks[0]?.receipt !== null);
    const device = await deviceFor(sync.shelf.store, member.id);
    const clock = () => ({ wallMs: Date.now() + 1_000, monoMs: performance.now(), monoEpoch: "test" });
    const plan = { member: member.id, purpose: "hook-up", depth: "full" } as const;
    const next = await Recorder.open({ shelf: sync.shelf, clock, device }, rig, plan);
    await next.mark("pin", "good");
    await next.close();
    await sync.saved();
    await until(() => sync.view().walks.length === 2 && sync.view().walks.every(({ receipt }) => receipt));
    expect(sync.view().photos).toMatchObject([{ state: "kept" }]);
    release();
    await until(() => sync.view().photos[0]!.state === "sent");
    sync.stop();
  });

  test("that fail hold up no seal, and go when the way is free", async () => {
    let broken = true;
    const { sync, recorder, asked } = await phone((next) => async (address, init) => {
      if (broken && address.startsWith("/api/photos/")) throw new TypeError("Failed to fetch");
      return next(address, init);
    });
    await sync.start();
    await recorder.photo("pin", picture());
    await recorder.close();
    await until(
      () => sync.view().walks[0]?.receipt !== null && asked.some((each) => each.includes("photos")),
    );
    expect(sync.view().reached).toBe(true);
    expect(sync.view().photos).toMatchObject([{ state: "kept" }]);
    broken = false;
    sync.stir();
    await until(() => sync.view().photos[0]!.state === "sent");
    sync.stop();
  });

  test("whose answers are lost go again, and are kept once", async () => {
    const lost = new Set<string>();
    const { sync, recorder } = await phone((next) => async (address, init) => {
      const answer = await next(address, init);
      const which = `${init.method} ${address.split("?")[0]}`;
      if (!address.startsWith("/api/photos/") || lost.has(which)) return answer;
      lost.add(which);
      throw new TypeError("Failed to fetch");
    });
    const one = picture();
    await sync.start();
    await recorder.photo("pin", one);
    await recorder.close();
    await until(() => sync.view().photos[0]?.state === "sent");
    sync.stop();
    expect(lost.size).toBe(2);
    const kept = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((name) =>
      name.includes(one.sha256),
    );
    expect(kept).toHaveLength(1);
  });
});
