import { sha256 } from "@noble/hashes/sha2.js";
import { bytesToHex, utf8ToBytes } from "@noble/hashes/utils.js";
import { canonicalText } from "./json";

/** Lower-case hex SHA-256 of a text's UTF-8 bytes. */
export function sha256Hex(text: string): string {
  return bytesToHex(sha256(utf8ToBytes(text)));
}

/** Lower-case hex SHA-256 of bytes. */
export function bytesDigest(bytes: Uint8Array): string {
  return bytesToHex(sha256(bytes));
}

/** Lower-case hex SHA-256 of the RFC 8785 canonical bytes of a JSON value. */
export function digestOf(value: unknown): string {
  return sha256Hex(canonicalText(value));
}
