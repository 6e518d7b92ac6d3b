import { ed25519 } from "@noble/curves/ed25519.js";
import { expect, test } from "vitest";
import { sha256Hex } from "@/lib/domain/digest";
import { receiptHolds, receiptMessage, type Receipt } from "@/lib/domain/receipt";
import { recordFile } from "@/lib/domain/record-file";
import { thumbprint, type PublicKey } from "@/lib/domain/signature";

const { secretKey, publicKey } = ed25519.keygen();
const key: PublicKey = { kty: "OKP", crv: "Ed25519", x: Buffer.from(publicKey).toString("base64url") };
const seal = "ab".repeat(32);
const unsigned: Omit<Receipt, "signature"> = {
  v: 1,
  walk: "017f22e2-79b0-7cc3-98c4-dc0c0c07398f",
  seal,
  entries: 7,
  verdict: "no-hold",
  receivedAt: "2026-05-01T12:00:00.000Z",
  kid: thumbprint(key),
  alg: "Ed25519",
};
const sign = (message: string) =>
  Buffer.from(ed25519.sign(Buffer.from(message), secretKey)).toString("base64url");

test("the message is the digest of the receipt without its signature, signed or not", () => {
  const text =
    `{"alg":"Ed25519","entries":7,"kid":"${unsigned.kid}","receivedAt":"2026-05-01T12:00:00.000Z",` +
    `"seal":"${seal}","v":1,"verdict":"no-hold","walk":"017f22e2-79b0-7cc3-98c4-dc0c0c07398f"}`;
  expect(receiptMessage(unsigned)).toBe(`hookfast-receipt-v1:${sha256Hex(text)}`);
  expect(receiptMessage({ ...unsigned, signature: "x" } as Receipt)).toBe(receiptMessage(unsigned));
});

test("holds for its seal, under the key it names, among the pinned ones", () => {
  const receipt = { ...unsigned, signature: sign(receiptMessage(unsigned)) };
  expect(receiptHolds(receipt, seal, [key])).toBe(true);
  expect(receiptHolds(receipt, "ac".repeat(32), [key])).toBe(false);
  expect(receiptHolds(receipt, seal, [])).toBe(false);
  expect(receiptHolds({ ...receipt, entries: 8 }, seal, [key])).toBe(false);
  expect(receiptHolds({ ...receipt, signature: sign("else") }, seal, [key])).toBe(false);
});

test("a record file has the revision, the entries as they are, and the seal once there is one", () => {
  const entries = ['{"a":1}', '{"b":2}'];
  expect(recordFile('{"v":1}', entries, null)).toBe('{"revision":{"v":1}}\n{"a":1}\n{"b":2}\n');
  const receipt = { ...unsigned, signature: "s" };
  const sealed = recordFile('{"v":1}', [], { seal, alg: "Ed25519", signature: "x", device: key, receipt });
  expect(sealed.split("\n")[1]).toMatch(
    /^\{"alg":"Ed25519","device":\{.*\},"receipt":\{.*\},"seal":"(ab){32}","signature":"x"\}$/,
  );
});
