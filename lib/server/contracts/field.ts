import { bundleShape, ENVELOPE, envelopeAnswerShape, envelopeShape } from "@/lib/domain/field";
import { contract } from "../contract";

export const readBundle = contract({
  method: "GET",
  path: "/api/field/bundle",
  summary:
    "What a phone keeps: the member, the rigs kept by the member's organisation, and the server's keys.",
  action: "walks.record",
  answers: { 200: { json: bundleShape } },
});

export const sendEntries = contract({
  method: "POST",
  path: "/api/field/entries",
  summary:
    "Send entries and seals of walks. What could not be taken is named in `refused`; the rest is stored.",
  action: "walks.record",
  body: { shape: envelopeShape, limit: ENVELOPE.bytes, tooMany },
  answers: { 200: { json: envelopeAnswerShape } },
});

function tooMany(raw: unknown): string | null {
  const { entries, seals } = Object(raw) as { entries?: unknown; seals?: unknown };
  if (Array.isArray(entries) && entries.length > ENVELOPE.entries) {
    return `The most is ${ENVELOPE.entries} entries.`;
  }
  if (Array.isArray(seals) && seals.length > ENVELOPE.seals) return `The most is ${ENVELOPE.seals} seals.`;
  return null;
}
