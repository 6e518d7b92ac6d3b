import type { RefusalCode } from "../field";
import type { JsonFault } from "../json";

/** What a refused entry or seal is told: the field at fault (an RFC 6901 pointer into it), then what is wrong. */
export const refusalDetails = {
  fault: ({ pointer, detail }: JsonFault) => (pointer ? `${pointer}: ${detail}` : detail),
  version: "/v: only version 1 is known",
  unregistered: "device: no device of yours that is registered",
  "foreign-open": "/body/device: not the device that sent this",
  "foreign-device": "device: another device opened this walk, and only that one adds to it",
  "not-yours": "/walk: another member opened this walk",
  "not-your-open": "/body/member: another member's id",
  "unknown-rig": "/body/rig: no rig that you can see",
  "unknown-revision": "/body/revision: no revision of this rig",
  fork: (seq: number) => `/seq: another content is stored at ${seq}; this one is kept apart`,
  misplaced: "/seq: `open` is the first entry, and only that",
  "after-close": "/seq: nothing follows `close`",
  sealed: "/seq: the walk is sealed",
  gap: (stored: number) => `/seq: expected ${stored}`,
  "broken-chain": (digest: string | null) =>
    digest ? `/prev: expected ${digest}` : "/prev: expected the revision's digest, as in /body/revision",
  "nothing-stored": "/seal: nothing of this walk is stored",
  "not-closed": "/seal: no `close` is stored yet",
  "not-the-head": (digest: string) => `/seal: the last entry is ${digest}`,
  "bad-signature": "/signature: does not verify with this device's key",
} as const;

/** A reason with its sentence. */
export interface RefusalReason {
  code: RefusalCode;
  detail: string;
}
