import { ed25519 } from "@noble/curves/ed25519.js";
import { p256 } from "@noble/curves/nist.js";
import { hexToBytes, utf8ToBytes } from "@noble/hashes/utils.js";
import { base64urlnopad } from "@scure/base";
import * as z from "zod/mini";
import { digestOf } from "./digest";

export const algorithms = ["Ed25519", "ES256"] as const;
export type Algorithm = (typeof algorithms)[number];

const coordinate = z.string().check(z.regex(/^[\w-]{43}$/, "32 bytes, base64url"));
const PRIVATE_MEMBERS = ["d", "p", "q", "dp", "dq", "qi", "oth", "k"];

/** A public JSON Web Key of one of the two kinds; other public members are ignored, private ones refused. */
export const publicKeyShape = z
  .discriminatedUnion("kty", [
    z.looseObject({ kty: z.literal("OKP"), crv: z.literal("Ed25519"), x: coordinate }),
    z.looseObject({ kty: z.literal("EC"), crv: z.literal("P-256"), x: coordinate, y: coordinate }),
  ])
  .check(z.refine((jwk) => PRIVATE_MEMBERS.every((name) => !(name in jwk)), "a private key"))
  .check(z.refine(isOnCurve, "not a usable point of its curve"));
export type PublicKey = z.infer<typeof publicKeyShape>;

/** The members that make a key what it is, and nothing else (RFC 7638, 3.2; RFC 8037, 2). */
export function bareKey(jwk: PublicKey): PublicKey {
  return jwk.kty === "EC"
    ? { crv: jwk.crv, kty: jwk.kty, x: jwk.x, y: jwk.y }
    : { crv: jwk.crv, kty: jwk.kty, x: jwk.x };
}

/** The key's RFC 7638 thumbprint, base64url: its `kid` and its identity. */
export function thumbprint(jwk: PublicKey): string {
  return base64urlnopad.encode(hexToBytes(digestOf(bareKey(jwk))));
}

/** The algorithm that a key signs with. */
export function algorithmOf(jwk: PublicKey): Algorithm {
  return jwk.kty === "EC" ? "ES256" : "Ed25519";
}

/**
 * Whether a signature over the UTF-8 bytes of a message holds.
 * @param signature base64url; ES256 as r and s, 32 bytes each
 */
export function verifies(jwk: PublicKey, alg: Algorithm, message: string, signature: string): boolean {
  if (alg !== algorithmOf(jwk)) return false;
  try {
    const bytes = base64urlnopad.decode(signature);
    const text = utf8ToBytes(message);
    return jwk.kty === "EC"
      ? p256.verify(bytes, text, point(jwk.x, jwk.y), { lowS: false })
      : ed25519.verify(bytes, text, base64urlnopad.decode(jwk.x), { zip215: false });
  } catch {
    // Not base64url, or not of a signature's length.
    return false;
  }
}

/** What a device signs when it seals a walk. */
export function sealMessage(seal: string): string {
  return `hookfast-walk-v1:${seal}`;
}

function point(x: string, y: string): Uint8Array {
  return Uint8Array.of(4, ...base64urlnopad.decode(x), ...base64urlnopad.decode(y));
}

function isOnCurve(jwk: { kty: string; x: string; y?: unknown }): boolean {
  try {
    if (jwk.kty === "EC") {
      p256.Point.fromBytes(point(jwk.x, jwk.y as string)).assertValidity();
      return true;
    }
    // Anyone can sign by a key of small order.
    return !ed25519.Point.fromBytes(base64urlnopad.decode(jwk.x)).isSmallOrder();
  } catch {
    return false;
  }
}
