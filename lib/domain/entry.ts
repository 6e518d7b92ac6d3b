import * as z from "zod/mini";
import { canonicalText, findJsonFault, pointerStep, type JsonFault } from "./json";
import { sha256Hex } from "./digest";
import { countShape, digestShape, instantShape, uuidShape } from "./shapes";

export const purposes = ["hook-up", "re-check", "unhook", "delivery", "yard-out", "yard-in"] as const;
export const depths = ["full", "short"] as const;
export const outcomes = ["good", "fault", "absent", "unseen"] as const;
export const verdicts = ["no-hold", "hold", "unfinished"] as const;
export const signals = ["tail", "left", "right", "stop", "hazard", "stop-left", "stop-right"] as const;
export const lamps = ["left", "right"] as const;
export const lampStates = ["steady", "flashing", "dim", "dark", "wrong"] as const;

export type Purpose = (typeof purposes)[number];
export type Depth = (typeof depths)[number];
export type Outcome = (typeof outcomes)[number];
export type Verdict = (typeof verdicts)[number];
export type Signal = (typeof signals)[number];
export type Lamp = (typeof lamps)[number];
export type LampState = (typeof lampStates)[number];

/** The most canonical bytes one entry may have. */
export const ENTRY_BYTES = 16 * 1024;

const keyShape = z.string().check(z.minLength(1), z.maxLength(100));
const wordsShape = z.string().check(z.maxLength(4000));
const quantityShape = z.looseObject({ value: z.number(), unit: keyShape });

const openShape = z.looseObject({
  rig: keyShape,
  revision: digestShape,
  purpose: z.enum(purposes),
  depth: z.enum(depths),
  device: keyShape,
  member: keyShape,
  app: keyShape,
  key: z.optional(keyShape),
  source: z.optional(z.literal("paper")),
});

const markShape = z.looseObject({
  check: keyShape,
  outcome: z.enum(outcomes),
  measured: z.optional(
    z.looseObject({
      quantity: keyShape,
      value: z.number(),
      unit: keyShape,
      entered: z.optional(quantityShape),
    }),
  ),
  seen: z.optional(z.partialRecord(z.enum(signals), z.partialRecord(z.enum(lamps), z.enum(lampStates)))),
  because: z.optional(wordsShape),
  note: z.optional(wordsShape),
});

const photoShape = z.looseObject({
  check: z.optional(keyShape),
  sha256: digestShape,
  bytes: countShape,
  mime: keyShape,
});

const closeShape = z.looseObject({ verdict: z.enum(verdicts), marks: countShape, faults: countShape });

/** The bodies whose meaning this version knows; an entry of any other type is kept and ignored on replay. */
const bodyShapes = {
  open: openShape,
  mark: markShape,
  photo: photoShape,
  note: z.looseObject({ text: wordsShape }),
  pause: z.looseObject({}),
  resume: z.looseObject({ again: z.array(keyShape) }),
  disturbed: z.looseObject({ wallMs: z.number(), monoMs: z.number() }),
  signed: z.looseObject({ name: z.string(), role: z.string(), strokes: z.unknown() }),
  close: closeShape,
};

export type OpenBody = z.infer<typeof openShape>;
export type MarkBody = z.infer<typeof markShape>;
export type PhotoBody = z.infer<typeof photoShape>;
export type CloseBody = z.infer<typeof closeShape>;
type KnownType = keyof typeof bodyShapes;
type BodyOf<T extends KnownType> = z.infer<(typeof bodyShapes)[T]>;

/** What every entry has, whatever its type and version. */
export const entryShape = z.looseObject({
  v: countShape,
  walk: uuidShape,
  seq: countShape,
  type: keyShape,
  at: instantShape,
  elapsedMs: countShape,
  monoMs: countShape,
  monoEpoch: keyShape,
  body: z.looseObject({}),
  prev: digestShape,
});

export type Entry = z.infer<typeof entryShape>;

/** An entry with the canonical text that is stored, sent and served, and the digest of that text. */
export interface Link {
  entry: Entry;
  text: string;
  digest: string;
}

/** An entry's body if the entry is of this type, else null. The entry must have come through {@link readEntry}. */
export function bodyOf<T extends KnownType>(entry: Entry, type: T): BodyOf<T> | null {
  return entry.type === type ? (entry.body as BodyOf<T>) : null;
}

/**
 * Reads one entry as received. The digest is taken of the value itself, before any schema touches it; nothing is
 * changed, defaulted or stripped.
 * @returns the link, or the first thing wrong with it
 */
export function readEntry(raw: unknown): Link | JsonFault {
  const fault = findJsonFault(raw);
  if (fault) return fault;
  const parsed = entryShape.safeParse(raw);
  if (!parsed.success) return firstIssue(parsed.error);
  if (isKnownType(parsed.data.type)) {
    const body = bodyShapes[parsed.data.type].safeParse(parsed.data.body);
    if (!body.success) return firstIssue(body.error, "/body");
  }
  const text = canonicalText(raw);
  if (utf8Length(text) > ENTRY_BYTES) return { pointer: "", detail: `over ${ENTRY_BYTES} bytes` };
  return { entry: raw as Entry, text, digest: sha256Hex(text) };
}

// Own members only: a type may be called "constructor".
function isKnownType(type: string): type is KnownType {
  return Object.hasOwn(bodyShapes, type);
}

function firstIssue(error: z.core.$ZodError, under = ""): JsonFault {
  const issue = error.issues[0]!;
  return {
    pointer: under + issue.path.map((step) => pointerStep(String(step))).join(""),
    detail: issue.message,
  };
}

function utf8Length(text: string): number {
  let bytes = 0;
  for (const char of text) {
    const code = char.codePointAt(0)!;
    bytes += code < 0x80 ? 1 : code < 0x800 ? 2 : code < 0x10000 ? 3 : 4;
  }
  return bytes;
}
