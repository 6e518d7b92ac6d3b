import "server-only";
import { UniqueConstraintError } from "sequelize";
import type { DeviceRegistration } from "@/lib/domain/field";
import { canonicalText } from "@/lib/domain/json";
import type { Member } from "@/lib/domain/member";
import { Problem } from "@/lib/domain/problem";
import { algorithmOf, bareKey, thumbprint, type Algorithm, type PublicKey } from "@/lib/domain/signature";
import { tables } from "./database";

interface Registered {
  id: string;
  alg: Algorithm;
  kid: string;
  label: string;
}

/**
 * Registers a device's key for a member. A device is known by id, key and member: the same three again are 200 (with
 * the label it has), anything else under a taken id is `device-taken`.
 */
export async function deviceRegistered(
  member: Member,
  { id: written, alg, publicKey, label }: DeviceRegistration,
): Promise<{ status: 200 | 201; json: Registered } | Problem> {
  if (alg !== algorithmOf(publicKey)) {
    const detail = `expected ${algorithmOf(publicKey)}, by the key's kind`;
    return new Problem("wrong-shape", { errors: [{ pointer: "/alg", detail }] });
  }
  const id = written.toLowerCase();
  const { Device } = tables();
  const kid = thumbprint(publicKey);
  try {
    await Device.create({
      id,
      memberId: member.id,
      alg,
      thumbprint: kid,
      publicKey: canonicalText(bareKey(publicKey)),
      label,
      createdAt: new Date(),
    });
    return { status: 201, json: { id, alg, kid, label } };
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
  }
  const taken = await Device.findOne({
    where: { id, memberId: member.id, thumbprint: kid },
    attributes: ["label"],
    raw: true,
  });
  return taken ? { status: 200, json: { id, alg, kid, label: taken.label } } : new Problem("device-taken");
}

/** A device's public key, if the device is registered to this member. */
export async function deviceKey(id: string, memberId: string): Promise<PublicKey | null> {
  const { Device } = tables();
  const row = await Device.findOne({ where: { id, memberId }, attributes: ["publicKey"], raw: true });
  return row && (JSON.parse(row.publicKey) as PublicKey);
}
