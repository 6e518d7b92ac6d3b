import * as z from "zod/mini";
import { digestOf } from "./digest";
import { verdicts } from "./entry";
import { countShape, digestShape, instantShape, uuidShape } from "./shapes";
import { algorithms, publicKeyShape, thumbprint, verifies, type PublicKey } from "./signature";

/** The server's signed answer that it has a sealed walk. */
export const receiptShape = z.object({
  v: z.literal(1),
  walk: uuidShape,
  seal: digestShape,
  entries: countShape,
  verdict: z.enum(verdicts),
  receivedAt: instantShape,
  kid: z.string(),
  alg: z.enum(algorithms),
  signature: z.string(),
});
export type Receipt = z.infer<typeof receiptShape>;

/** A public server key as served: a JWK with its `kid`. */
export const serverKeyShape = z.intersection(publicKeyShape, z.looseObject({ kid: z.string() }));
export type ServerKey = PublicKey & { kid: string };

/** What the server signs: the digest of the receipt without its signature. */
export function receiptMessage(receipt: Omit<Receipt, "signature">): string {
  // JSON has no place for what is undefined: the signature leaves the digested text whole.
  return `hookfast-receipt-v1:${digestOf({ ...receipt, signature: undefined })}`;
}

/**
 * Whether a receipt is for this seal and one of these keys signed it.
 * @param keys the pinned server keys
 */
export function receiptHolds(receipt: Receipt, seal: string, keys: readonly PublicKey[]): boolean {
  const key = keys.find((candidate) => thumbprint(candidate) === receipt.kid);
  return (
    key !== undefined &&
    receipt.seal === seal &&
    verifies(key, receipt.alg, receiptMessage(receipt), receipt.signature)
  );
}
