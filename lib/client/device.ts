import { get, promisifyRequest, type UseStore } from "idb-keyval";
import { base64urlnopad } from "@scure/base";
import type { DeviceRegistration } from "../domain/field";
import { algorithmOf, bareKey, sealMessage, type Algorithm, type PublicKey } from "../domain/signature";

/** This phone's identity for one member: its key signs that member's walks and cannot leave the phone. */
export interface Device {
  id: string;
  alg: Algorithm;
  publicKey: PublicKey;
  privateKey: CryptoKey;
  registered: boolean;
}

const deviceKey = (member: string) => ["device", member];

/**
 * The member's device on this phone, made on first use. Where two tabs make one at once, the first to be stored is
 * the one that both use.
 */
export async function deviceFor(store: UseStore, member: string): Promise<Device> {
  const known = await get<Device>(deviceKey(member), store);
  if (known) return known;
  const made = await makeDevice();
  return store("readwrite", async (shelf) => {
    const first: Device | undefined = await promisifyRequest(shelf.get(deviceKey(member)));
    if (!first) await promisifyRequest(shelf.add(made, deviceKey(member)));
    return first ?? made;
  });
}

/** Remembers that the server knows this device. */
export async function setRegistered(store: UseStore, member: string, registered: boolean): Promise<void> {
  await store("readwrite", async (shelf) => {
    const device: Device | undefined = await promisifyRequest(shelf.get(deviceKey(member)));
    if (device) await promisifyRequest(shelf.put({ ...device, registered }, deviceKey(member)));
  });
}

/** What the server is told of a device. */
export function registrationOf({ id, alg, publicKey }: Device, label: string): DeviceRegistration {
  return { id, alg, publicKey, label };
}

/** The device's signature over a seal, base64url (ES256 as r and s). */
export async function signSeal(device: Device, seal: string): Promise<string> {
  const algorithm = device.alg === "ES256" ? { name: "ECDSA", hash: "SHA-256" } : { name: "Ed25519" };
  const message = new TextEncoder().encode(sealMessage(seal));
  return base64urlnopad.encode(
    new Uint8Array(await crypto.subtle.sign(algorithm, device.privateKey, message)),
  );
}

async function makeDevice(): Promise<Device> {
  const { publicKey, privateKey } = await makeKeys();
  const jwk = bareKey((await crypto.subtle.exportKey("jwk", publicKey)) as PublicKey);
  return { id: crypto.randomUUID(), alg: algorithmOf(jwk), publicKey: jwk, privateKey, registered: false };
}

async function makeKeys(): Promise<CryptoKeyPair> {
  try {
    return (await crypto.subtle.generateKey({ name: "Ed25519" }, false, ["sign", "verify"])) as CryptoKeyPair;
  } catch {
    // Browsers from before 2025 know only the NIST curves.
    return crypto.subtle.generateKey({ name: "ECDSA", namedCurve: "P-256" }, false, ["sign", "verify"]);
  }
}
