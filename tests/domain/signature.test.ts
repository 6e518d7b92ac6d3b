import { describe, expect, test } from "vitest";
import { sha256Hex } from "@/lib/domain/digest";
import {
  algorithmOf,
  bareKey,
  publicKeyShape,
  sealMessage,
  thumbprint,
  verifies,
  type PublicKey,
} from "@/lib/domain/signature";

const encode = (hex: string) => Buffer.from(hex, "hex").toString("base64url");

// RFC 8037 A.2 and A.3, whose key is that of RFC 8032, 7.1 TEST 1; from memory, and the thumbprint agrees.
const okp: PublicKey = {
  kty: "OKP",
  crv: "Ed25519",
  x: encode("d75a980182b10ab7d54bfed3c964073a0ee172f3daa62325af021a68f707511a"),
};

// RFC 7515 A.3; from memory, and its signature verifies.
const ec: PublicKey = {
  kty: "EC",
  crv: "P-256",
  x: "f83OJ3D2xF1Bg8vub9tLe1gHMzV76e8Tus9uPHvRVEU",
  y: "x_FEzRu9m36HLN_tue659LNpXW6pCyStikYjKIWI5a0",
};
const jwsInput =
  "eyJhbGciOiJFUzI1NiJ9.eyJpc3MiOiJqb2UiLA0KICJleHAiOjEzMDA4MTkzODAsDQogImh0dHA6Ly9leGFt" +
  "cGxlLmNvbS9pc19yb290Ijp0cnVlfQ";
const jwsSignature = "DtEhU3ljbEg8L38VWAfUAqOyKAM6-Xx-F4GawxaepmXFCgfTjDxw5djxLa8ISlSApmWQxfKTUJqPP3-Kg6NU1Q";

describe("thumbprint", () => {
  test("RFC 8037 A.3", () => {
    expect(thumbprint(okp)).toBe("kPrK_qmxVWaYVA9wwBF6Iuo3vVzz7TxHCTwXBygrS4k");
  });

  test("of an EC key is that of crv, kty, x and y in this order, RFC 7638, 3.2", () => {
    const text = `{"crv":"P-256","kty":"EC","x":"${ec.x}","y":"${String(ec.y)}"}`;
    expect(thumbprint(ec)).toBe(encode(sha256Hex(text)));
  });

  test("ignores other members", () => {
    expect(thumbprint({ ...okp, kid: "x", use: "sig", alg: "EdDSA" })).toBe(thumbprint(okp));
    expect(bareKey({ ...ec, use: "sig" })).toEqual(ec);
  });
});

describe("signatures", () => {
  // RFC 8032, 7.1 TEST 1 and TEST 2; from memory, and they verify.
  const empty =
    "e5564300c360ac729086e2cc806e828a84877f1eb8e5d974d873e065224901555fb8821590a33bacc61e39701cf9b46b" +
    "d25bf5f0595bbe24655141438e7a100b";
  const second: PublicKey = {
    kty: "OKP",
    crv: "Ed25519",
    x: encode("3d4017c3e843895a92b70aa74d1b7ebc9c982ccf2ec4968cc0cd55f12af4660c"),
  };
  const r =
    "92a009a9f0d4cab8720e820b5f642540a2b27b5416503f8fb3762223ebdb69da085ac1e43e15996e458f3613d0f11d8c" +
    "387b2eaeb4302aeeb00d291612bb0c00";

  test.each<[string, PublicKey, "Ed25519" | "ES256", string, string, boolean]>([
    ["RFC 8032 TEST 1", okp, "Ed25519", "", encode(empty), true],
    ["RFC 8032 TEST 2", second, "Ed25519", "r", encode(r), true],
    ["another message", second, "Ed25519", "s", encode(r), false],
    ["another key", okp, "Ed25519", "r", encode(r), false],
    ["RFC 7515 A.3", ec, "ES256", jwsInput, jwsSignature, true],
    ["another message, ES256", ec, "ES256", jwsInput + "x", jwsSignature, false],
    ["the other algorithm's name", ec, "Ed25519", jwsInput, jwsSignature, false],
    ["padded", okp, "Ed25519", "", encode(empty) + "==", false],
    ["standard base64", okp, "Ed25519", "", Buffer.from(empty, "hex").toString("base64"), false],
    ["cut", okp, "Ed25519", "", encode(empty.slice(2)), false],
    ["empty", ec, "ES256", jwsInput, "", false],
    ["hex", okp, "Ed25519", "", empty, false],
  ])("%s", (_, key, alg, message, signature, holds) => {
    expect(verifies(key, alg, message, signature)).toBe(holds);
  });

  test("a seal is signed as text", () => {
    expect(sealMessage("ab")).toBe("hookfast-walk-v1:ab");
  });
});

describe("public keys", () => {
  test.each<[string, unknown, boolean]>([
    ["Ed25519", okp, true],
    ["P-256", ec, true],
    ["with other public members", { ...okp, kid: "x", key_ops: ["verify"] }, true],
    ["with its private part", { ...okp, d: "x" }, false],
    ["a symmetric key", { kty: "oct", k: "x" }, false],
    ["another curve", { ...ec, crv: "P-384" }, false],
    ["without y", { kty: "EC", crv: "P-256", x: ec.x }, false],
    ["x of another length", { ...okp, x: okp.x.slice(1) }, false],
    ["a point beside its curve", { ...ec, y: ec.x }, false],
    ["no object", "key", false],
  ])("%s", (_, value, is) => {
    expect(publicKeyShape.safeParse(value).success).toBe(is);
  });

  test("the algorithm follows from the kind", () => {
    expect([algorithmOf(okp), algorithmOf(ec)]).toEqual(["Ed25519", "ES256"]);
  });
});
