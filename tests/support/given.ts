import { randomUUID } from "node:crypto";
import { ed25519 } from "@noble/curves/ed25519.js";
import { p256 } from "@noble/curves/nist.js";
import { utf8ToBytes } from "@noble/hashes/utils.js";
import { base64urlnopad } from "@scure/base";
import { digestOf } from "@/lib/domain/digest";
import type { BundleRig } from "@/lib/domain/field";
import { canonicalText } from "@/lib/domain/json";
import type { Member, OrganisationKind, Role } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import type { RevisionDocument } from "@/lib/domain/revision";
import { sealMessage, type Algorithm, type PublicKey } from "@/lib/domain/signature";
import { tables } from "@/lib/server/database";
import { deviceRegistered } from "@/lib/server/devices";
import { beginSession } from "@/lib/server/session";
import { settings } from "@/lib/server/settings";
import { document as smallDocument } from "./rig";

export type Organisation = Member["organisation"];

/** A member of the database with a session: `cookie` is what their browser sends. */
export type GivenMember = Member & { cookie: string };

export async function givenOrganisation(kind: OrganisationKind = "fleet"): Promise<Organisation> {
  const organisation = { id: randomUUID(), name: `a ${kind}`, kind };
  await tables().Organisation.create(organisation);
  return organisation;
}

/** A member who is signed in; of an organisation of their own unless one is given. */
export async function givenMember(wanted: {
  role: Role;
  organisation?: Organisation;
  email?: string;
  passwordHash?: string;
}): Promise<GivenMember> {
  const id = randomUUID();
  const organisation = wanted.organisation ?? (await givenOrganisation());
  const { role, email = `${id}@test.example` } = wanted;
  const member = { id, name: `a ${role}`, email, role };
  await tables().Member.create({
    ...member,
    organisationId: organisation.id,
    passwordHash: wanted.passwordHash ?? "none",
    createdAt: new Date(),
  });
  return { ...member, organisation, cookie: (await beginSession(id)).split(";")[0]! };
}

/** A rig that the organisation keeps, with its revisions, as a bundle has it; the last revision is the latest. */
export async function givenRig(
  keeper: Organisation,
  wanted: {
    name?: string;
    document?: RevisionDocument;
    earlier?: RevisionDocument[];
    builder?: Organisation;
  } = {},
): Promise<BundleRig> {
  const { Rig, Revision } = tables();
  const { name = "Test rig", document = smallDocument, earlier = [] } = wanted;
  const id = randomUUID();
  const createdAt = new Date();
  await Rig.create({ id, name, keeperId: keeper.id, builderId: wanted.builder?.id ?? null, createdAt });
  const revisions = [...earlier, document].map((each, index) => ({
    id: randomUUID(),
    rigId: id,
    number: index + 1,
    digest: Buffer.from(digestOf(each), "hex"),
    document: Buffer.from(canonicalText(each)),
    createdAt,
  }));
  await Revision.bulkCreate(revisions);
  const revision = { id: revisions.at(-1)!.id, digest: digestOf(document), document };
  return { id, name, revision, openFindings: [], lastWalk: null };
}

/** A key pair of a phone that has not registered yet. */
export interface Key {
  id: string;
  alg: Algorithm;
  publicKey: PublicKey;
  /** The signature over a seal, base64url. */
  sign(seal: string): string;
}

export function newKey(alg: Algorithm = "Ed25519"): Key {
  const encode = base64urlnopad.encode;
  const message = (seal: string) => utf8ToBytes(sealMessage(seal));
  const id = randomUUID();
  if (alg === "Ed25519") {
    const { secretKey, publicKey } = ed25519.keygen();
    return {
      id,
      alg,
      publicKey: { kty: "OKP", crv: "Ed25519", x: encode(publicKey) },
      sign: (seal) => encode(ed25519.sign(message(seal), secretKey)),
    };
  }
  const { secretKey } = p256.keygen();
  const point = p256.getPublicKey(secretKey, false);
  return {
    id,
    alg,
    publicKey: {
      kty: "EC",
      crv: "P-256",
      x: encode(point.slice(1, 33)),
      y: encode(point.slice(33)),
    },
    // r and s, 32 bytes each; the message is hashed with SHA-256 first.
    sign: (seal) => encode(p256.sign(message(seal), secretKey)),
  };
}

/** A key that is registered to the member. */
export async function givenDevice(member: Member, alg: Algorithm = "Ed25519"): Promise<Key> {
  const key = newKey(alg);
  const { id, publicKey } = key;
  const registered = await deviceRegistered(member, { id, alg, publicKey, label: "test phone" });
  if (registered instanceof Problem) throw new Error(registered.code);
  return key;
}

/** A request as a browser on one of our own pages sends it; a string for a body is sent as it is. */
export function request(
  method: string,
  path: string,
  who: { cookie: string } | null,
  body?: unknown,
  headers: Record<string, string> = {},
): Request {
  return new Request(settings.ORIGIN + path, {
    method,
    headers: {
      ...(who && { cookie: who.cookie }),
      ...(method !== "GET" && { origin: settings.ORIGIN, "sec-fetch-site": "same-origin" }),
      ...headers,
    },
    ...(body !== undefined && { body: typeof body === "string" ? body : JSON.stringify(body) }),
  });
}
