import { createHash, randomBytes, randomUUID } from "node:crypto";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { GET as readPhoto, POST as askForPhoto, PUT as sendPhoto } from "@/app/api/photos/[sha256]/route";
import { POST as makeRig } from "@/app/api/rigs/route";
import { photoAnswerShape } from "@/lib/domain/photo";
import { tables } from "@/lib/server/database";
import { freshDatabase } from "../support/database";
import { givenMember, givenOrganisation, request, type GivenMember } from "../support/given";
import { givenSheet } from "../support/sheet";

const folder = mkdtempSync(path.join(tmpdir(), "hookfast-sheet-photos-"));
process.env.PHOTOS_DIR = folder;
freshDatabase();
afterAll(() => rmSync(folder, { recursive: true }));

let installer: GivenMember;
beforeAll(async () => {
  installer = await givenMember({ role: "installer", organisation: await givenOrganisation("shop") });
});

const at = (sha256: string) => ({ params: Promise.resolve({ sha256 }) });
const ask = (sha256: string, who: GivenMember) =>
  askForPhoto(request("POST", `/api/photos/${sha256}`, who), at(sha256));
const read = (sha256: string, who: GivenMember) =>
  readPhoto(request("GET", `/api/photos/${sha256}`, who), at(sha256));

function photo() {
  const bytes = randomBytes(3_000);
  return { bytes, sha256: createHash("sha256").update(bytes).digest("hex") };
}

/** A rig whose sheet names the photograph as the manual's page. */
async function named({ sha256, bytes }: ReturnType<typeof photo>, by: GivenMember, mime = "image/jpeg") {
  const id = randomUUID();
  const procedure = { says: "how", page: "7-21", photo: { sha256, bytes: bytes.length, mime } } as const;
  const body = { id, sheet: givenSheet({ procedure }) };
  expect((await makeRig(request("POST", "/api/rigs", by, body))).status).toBe(201);
  return id;
}

/** Sends the bytes as a phone does. */
async function sent({ sha256, bytes }: ReturnType<typeof photo>, by: GivenMember): Promise<void> {
  const answer = photoAnswerShape.parse(await (await ask(sha256, by)).json());
  if ("have" in answer) throw new Error("it is there already");
  const { url, headers } = answer.put;
  const put = request("PUT", url, by, undefined, headers);
  const response = await sendPhoto(
    new Request(put, { body: bytes, duplex: "half" } as RequestInit),
    at(sha256),
  );
  expect(response.status).toBe(204);
}

test("the manual's page is taken once its sheet is saved, and shown to whoever may read the rig", async () => {
  const page = photo();
  expect((await ask(page.sha256, installer)).status).toBe(404);
  const id = await named(page, installer);
  const driver = await givenMember({ role: "driver", organisation: installer.organisation });
  expect((await read(page.sha256, driver)).status).toBe(404);
  await sent(page, installer);
  expect(await (await ask(page.sha256, installer)).json()).toEqual({ have: true });
  const shown = await read(page.sha256, driver);
  expect([shown.status, shown.headers.get("content-type")]).toEqual([200, "image/jpeg"]);
  expect(Buffer.from(await shown.arrayBuffer()).equals(page.bytes)).toBe(true);

  // It goes with the rig: the next keeper reads it, the shop that built the rig still does, nobody else.
  const owner = await givenMember({ role: "manager" });
  expect((await read(page.sha256, owner)).status).toBe(404);
  await tables().Rig.update({ keeperId: owner.organisation.id }, { where: { id } });
  expect((await read(page.sha256, owner)).status).toBe(200);
  expect((await read(page.sha256, driver)).status).toBe(200);
});

test("a digest written into a sheet of one's own brings no bytes", async () => {
  const page = photo();
  await named(page, installer);
  await sent(page, installer);
  const stranger = await givenMember({ role: "manager" });
  await named(page, stranger);
  expect((await read(page.sha256, stranger)).status).toBe(404);
  // It is theirs when they have sent it themselves.
  await sent(page, stranger);
  expect((await read(page.sha256, stranger)).status).toBe(200);
});

test("what is no photograph by its sheet has no place", async () => {
  const page = photo();
  await named(page, installer, "application/pdf");
  expect((await ask(page.sha256, installer)).status).toBe(415);
  const large = { sha256: photo().sha256, bytes: Buffer.alloc(2 * 1024 * 1024 + 1) };
  await named(large, installer);
  expect((await ask(large.sha256, installer)).status).toBe(413);
});
