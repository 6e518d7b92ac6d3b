import "fake-indexeddb/auto";
import { ed25519 } from "@noble/curves/ed25519.js";
import { utf8ToBytes } from "@noble/hashes/utils.js";
import { base64urlnopad } from "@scure/base";
import { describe, expect, test } from "vitest";
import { deviceFor } from "@/lib/client/device";
import { drainOnce, isUnsent } from "@/lib/client/drain";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { WalkShelf } from "@/lib/client/walk-shelf";
import type { Entry } from "@/lib/domain/entry";
import type { EnvelopeAnswer, RefusalCode, Seal } from "@/lib/domain/field";
import { receiptMessage, type Receipt } from "@/lib/domain/receipt";
import { thumbprint, type PublicKey } from "@/lib/domain/signature";
import { rig } from "../support/rig";

const member = "00000000-0000-4000-8000-0000000000ff";
const server = newServerKey();

function newServerKey() {
  const { secretKey, publicKey } = ed25519.keygen();
  const jwk: PublicKey = { kty: "OKP", crv: "Ed25519", x: base64urlnopad.encode(publicKey) };
  return { jwk, sign: (text: string) => base64urlnopad.encode(ed25519.sign(utf8ToBytes(text), secretKey)) };
}

function receipt(walk: string, seal: Seal, entries: number, signer = server): Receipt {
  const unsigned = {
    v: 1,
    walk,
    seal: seal.seal,
    entries,
    verdict: "unfinished",
    receivedAt: "2026-05-01T08:30:00.000Z",
    kid: thumbprint(server.jwk),
    alg: "Ed25519",
  } as const;
  return { ...unsigned, signature: signer.sign(receiptMessage(unsigned)) };
}

interface Sent {
  entries: Entry[];
  seals: Seal[];
}

let stores = 0;
async function phone(marks = 1) {
  const shelf = new WalkShelf(openStore(`drain-${(stores += 1)}`));
  const device = await deviceFor(shelf.store, member);
  const clock = () => ({ wallMs: 1_000, monoMs: 1_000, monoEpoch: "test" });
  const open = { member, purpose: "hook-up", depth: "full" } as const;
  const recorder = await Recorder.open({ shelf, clock, device }, rig, open);
  for (let i = 0; i < marks; i += 1) await recorder.mark("pin", "good");
  await recorder.close();
  const { id, seal } = recorder.view().walk;
  const sent: Sent[] = [];

  /** Drains once against a server that answers as told. */
  async function drain(answer: Partial<EnvelopeAnswer["walks"][string]>, refused: RefusalCode[] = []) {
    await drainOnce(shelf, device.id, [server.jwk], async (_, init) => {
      sent.push(JSON.parse(String(init.body)) as Sent);
      const state = {
        stored: 0,
        digest: null,
        state: "open",
        verdict: "unfinished",
        receipt: null,
        ...answer,
      };
      const rows = refused.map((code) => ({ walk: id, seq: 0, code, detail: "" }));
      return Response.json({ walks: { [id]: state }, refused: rows });
    });
    return (await shelf.walk(id))!;
  }
  const digestAt = async (seq: number) => (await shelf.links(id, seq, 1))[0]!.digest;
  return { shelf, id, seal: seal!, sent, drain, digestAt };
}

describe("what a phone sends and what it believes", () => {
  test("a long walk goes in envelopes of 500 entries, its seal with the last", async () => {
    const { sent, drain, digestAt } = await phone(610);
    const half = await drain({ stored: 500, digest: await digestAt(499) });
    expect(half).toMatchObject({ length: 612, acknowledged: 500 });
    await drain({ stored: 612, digest: await digestAt(611) });
    expect(sent.map(({ entries, seals }) => [entries[0]!.seq, entries.length, seals.length])).toEqual([
      [0, 500, 0],
      [500, 112, 1],
    ]);
  });

  test("what the server says it stores is what is acknowledged, not what was sent", async () => {
    const { drain, digestAt } = await phone();
    expect(await drain({ stored: 2, digest: await digestAt(1) })).toMatchObject({
      length: 3,
      acknowledged: 2,
    });
    expect(await drain({ stored: 1, digest: await digestAt(0) })).toMatchObject({
      acknowledged: 1,
      refused: null,
    });
  });

  test("a receipt that a pinned key signed is believed", async () => {
    const { id, seal, drain, digestAt } = await phone();
    const answer = {
      stored: 3,
      digest: await digestAt(2),
      state: "sealed",
      receipt: receipt(id, seal, 3),
    } as const;
    const walk = await drain(answer);
    expect(walk.receipt).toEqual(answer.receipt);
    expect(isUnsent(walk)).toBe(false);
  });

  test.each<[string, (id: string, seal: Seal) => Receipt]>([
    ["by another key", (id, seal) => receipt(id, seal, 3, newServerKey())],
    ["for another seal", (id, seal) => receipt(id, { ...seal, seal: "00".repeat(32) }, 3)],
    ["for another walk", (_, seal) => receipt("00000000-0000-4000-8000-000000000001", seal, 3)],
    ["for fewer entries", (id, seal) => receipt(id, seal, 2)],
    ["altered since", (id, seal) => ({ ...receipt(id, seal, 3), verdict: "no-hold" })],
  ])("a receipt %s is not", async (_, made) => {
    const { id, seal, drain, digestAt } = await phone();
    const walk = await drain({
      stored: 3,
      digest: await digestAt(2),
      state: "sealed",
      receipt: made(id, seal),
    });
    expect(walk.receipt).toBeNull();
    expect(isUnsent(walk)).toBe(true);
  });

  test.each<[RefusalCode, RefusalCode | null]>([
    ["gap", null],
    ["incomplete", null],
    ["foreign-device", null],
    ["unknown-revision", "unknown-revision"],
    ["broken-chain", "broken-chain"],
  ])("after %s the walk is refused: %s", async (code, refused) => {
    const { drain, sent } = await phone();
    const walk = await drain({}, [code]);
    expect(walk).toMatchObject({ refused, acknowledged: 0 });
    await drain({});
    expect(sent).toHaveLength(refused ? 1 : 2);
  });

  test("where the server holds another chain under this id, nothing is written over", async () => {
    const { drain } = await phone();
    expect(await drain({ stored: 2, digest: "ab".repeat(32) })).toMatchObject({
      refused: "fork",
      acknowledged: 0,
    });
  });
});
