import "server-only";
import {
  createPrivateKey,
  generateKeyPairSync,
  hkdfSync,
  randomUUID,
  sign,
  type KeyObject,
} from "node:crypto";
import { mkdirSync, readdirSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { receiptMessage, type Receipt, type ServerKey } from "@/lib/domain/receipt";
import { bareKey, thumbprint } from "@/lib/domain/signature";
import { settings } from "./settings";

/** A key file: a private Ed25519 JWK with its thumbprint and the time it was made. */
type KeyFile = {
  kty: "OKP";
  crv: "Ed25519";
  x: string;
  d: string;
  kid: string;
  createdAt: string;
};

/** Every public server key ever used, newest first. Makes the first one where there is none. */
export function serverKeys(): ServerKey[] {
  return keyFiles().map((file) => ({ ...bareKey(file), kid: file.kid }));
}

/** Sees to it that there is a key to sign with. */
export function ensureServerKey(): void {
  keyFiles();
}

/**
 * Signs a receipt with the newest server key.
 * @param walk what the receipt says of the walk
 */
export function signReceipt(
  walk: Pick<Receipt, "walk" | "seal" | "entries" | "verdict" | "receivedAt">,
): Receipt {
  const [newest] = keyFiles();
  const unsigned: Omit<Receipt, "signature"> = { v: 1, ...walk, kid: newest.kid, alg: "Ed25519" };
  const signature = sign(null, Buffer.from(receiptMessage(unsigned)), privateKey(newest));
  return { ...unsigned, signature: signature.toString("base64url") };
}

/**
 * A secret for one purpose, derived from the newest server key: the same in every process that shares the keys, and
 * another when a newer key comes.
 */
export function secretFor(purpose: string): Buffer {
  const [newest] = keyFiles();
  return Buffer.from(hkdfSync("sha256", Buffer.from(newest.d, "base64url"), "", `hookfast-${purpose}`, 32));
}

// Read anew each time: another process beside this one may have made a key, and its receipts need it served.
function keyFiles(): [KeyFile, ...KeyFile[]] {
  mkdirSync(settings.KEYS_DIR, { recursive: true, mode: 0o700 });
  const [first, ...others] = storedKeys();
  if (first) return [first, ...others];
  makeKey();
  return storedKeys() as [KeyFile, ...KeyFile[]];
}

function storedKeys(): KeyFile[] {
  return readdirSync(settings.KEYS_DIR)
    .filter((name) => name.endsWith(".jwk"))
    .map((name) => JSON.parse(readFileSync(join(settings.KEYS_DIR, name), "utf8")) as KeyFile)
    .sort((a, b) => (order(a) < order(b) ? 1 : -1));
}

function order({ createdAt, kid }: KeyFile): string {
  return createdAt + kid;
}

function makeKey(): void {
  const jwk = generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" }) as Omit<KeyFile, "kid">;
  const kid = thumbprint({ kty: jwk.kty, crv: jwk.crv, x: jwk.x });
  const file: KeyFile = { ...jwk, kid, createdAt: new Date().toISOString() };
  // Renamed into place, so that no reader ever sees half a key.
  const partial = join(settings.KEYS_DIR, `${randomUUID()}.partial`);
  writeFileSync(partial, JSON.stringify(file), { mode: 0o600, flag: "wx" });
  renameSync(partial, join(settings.KEYS_DIR, `${kid}.jwk`));
}

function privateKey({ kty, crv, x, d }: KeyFile): KeyObject {
  return createPrivateKey({ key: { kty, crv, x, d }, format: "jwk" });
}
