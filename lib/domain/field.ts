import * as z from "zod/mini";
import { effects, revisionShape } from "./revision";
import { purposes, verdicts } from "./entry";
import { memberShape } from "./member";
import { receiptShape, serverKeyShape } from "./receipt";
import { countShape, deviceIdShape, digestShape, instantShape, uuidShape } from "./shapes";
import { algorithms, publicKeyShape } from "./signature";

/** What a phone keeps so that it can work with no network: the member, the rigs with their lists, the server's keys. */
export const bundleShape = z.object({
  generatedAt: instantShape,
  member: memberShape,
  rigs: z.array(
    z.object({
      id: uuidShape,
      name: z.string(),
      revision: z.object({ id: uuidShape, digest: digestShape, document: revisionShape }),
      openFindings: z.array(
        z.object({ id: uuidShape, check: z.string(), effect: z.enum(effects), since: instantShape }),
      ),
      lastWalk: z.nullable(
        z.object({ id: uuidShape, purpose: z.enum(purposes), verdict: z.enum(verdicts), at: instantShape }),
      ),
    }),
  ),
  keys: z.array(serverKeyShape),
});
export type Bundle = z.infer<typeof bundleShape>;
export type BundleRig = Bundle["rigs"][number];

/** A device as it registers: its id, its public key and a label to know it by. */
export const deviceShape = z.object({
  id: deviceIdShape,
  alg: z.enum(algorithms),
  publicKey: publicKeyShape,
  label: z.string().check(z.maxLength(100)),
});
export type DeviceRegistration = z.infer<typeof deviceShape>;

/** The most of one envelope: entries, seals and bytes. */
export const ENVELOPE = { entries: 500, seals: 500, bytes: 1024 * 1024 } as const;

/**
 * What a phone sends. An element needs only a readable walk and seq here; whatever else is wrong with it is answered
 * in `refused`, so that one bad entry does not hold up the others.
 */
export const envelopeShape = z.object({
  device: deviceIdShape,
  entries: z.array(z.looseObject({ walk: uuidShape, seq: countShape })),
  seals: z.array(z.looseObject({ walk: uuidShape })),
});
export type Envelope = z.infer<typeof envelopeShape>;

/** A seal as sent: the digest of the `close` entry, signed by the device. */
export const sealShape = z.looseObject({
  walk: uuidShape,
  seal: digestShape,
  alg: z.enum(algorithms),
  signature: z.string().check(z.maxLength(200)),
});
export type Seal = z.infer<typeof sealShape>;

/** Why an entry or seal was not taken, in the order in which the reasons are looked for. */
export const refusals = [
  "invalid",
  "version",
  "foreign-device",
  "not-yours",
  "unknown-rig",
  "unknown-revision",
  "fork",
  "sealed",
  "gap",
  "broken-chain",
  "incomplete",
  "bad-signature",
] as const;
export type RefusalCode = (typeof refusals)[number];

/** One refused entry, or seal (`seq` null). `detail` names the field where one is at fault. */
export const refusalShape = z.object({
  walk: uuidShape,
  seq: z.nullable(countShape),
  code: z.enum(refusals),
  detail: z.string(),
});
export type Refusal = z.infer<typeof refusalShape>;

/** Where the server stands with one walk. */
export const walkStateShape = z.object({
  stored: countShape,
  digest: z.nullable(digestShape),
  state: z.enum(["open", "sealed"]),
  verdict: z.enum(verdicts),
  receipt: z.nullable(receiptShape),
});
export type WalkState = z.infer<typeof walkStateShape>;

/** The server's answer to an envelope. */
export const envelopeAnswerShape = z.object({
  walks: z.record(uuidShape, walkStateShape),
  refused: z.array(refusalShape),
});
export type EnvelopeAnswer = z.infer<typeof envelopeAnswerShape>;
