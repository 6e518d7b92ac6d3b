import canonicalize from "canonicalize";

/** Where and why a JSON value cannot be recorded. `pointer` is an RFC 6901 JSON pointer. */
export interface JsonFault {
  pointer: string;
  detail: string;
}

/** Deep enough for any record, shallow enough that no reader's stack overflows. */
const DEEPEST = 32;

/** Escapes one member name for use in an RFC 6901 pointer. */
export function pointerStep(name: string | number): string {
  return "/" + String(name).replaceAll("~", "~0").replaceAll("/", "~1");
}

/**
 * RFC 8785 text of a JSON value (its UTF-8 bytes are the canonical bytes).
 * Throws on what JSON cannot say; call {@link findJsonFault} first on anything received.
 */
export function canonicalText(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new TypeError("not a JSON value");
  return text;
}

/**
 * The first thing in a parsed JSON value that a record must not hold: a number that is not finite, over 2^53-1
 * in size or with more than 6 decimals, a lone surrogate, or nesting deeper than 32. Null when there is none.
 */
export function findJsonFault(value: unknown, pointer = "", depth = 0): JsonFault | null {
  if (typeof value === "number") return numberFault(value, pointer);
  if (typeof value === "string") return surrogateFault(value, pointer);
  if (value === null || typeof value !== "object") return null;
  if (depth >= DEEPEST) return { pointer, detail: `nested deeper than ${DEEPEST}` };
  for (const [name, inner] of Object.entries(value)) {
    const at = pointer + pointerStep(name);
    const fault = surrogateFault(name, at) ?? findJsonFault(inner, at, depth + 1);
    if (fault) return fault;
  }
  return null;
}

function numberFault(value: number, pointer: string): JsonFault | null {
  if (!Number.isFinite(value)) return { pointer, detail: "not a finite number" };
  if (Math.abs(value) > Number.MAX_SAFE_INTEGER) return { pointer, detail: "larger than 2^53-1" };
  return decimals(value) > 6 ? { pointer, detail: "more than 6 decimals" } : null;
}

/** Decimals in the shortest text that reads back as this number, which is the text RFC 8785 writes. */
function decimals(value: number): number {
  const [digits = "", exponent = "0"] = String(value).split("e");
  const fraction = digits.split(".")[1]?.length ?? 0;
  return Math.max(0, fraction - Number(exponent));
}

const LONE_SURROGATE = /[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/;

function surrogateFault(value: string, pointer: string): JsonFault | null {
  return LONE_SURROGATE.test(value) ? { pointer, detail: "a lone surrogate" } : null;
}

/** Words on one line as a record may hold them: a lone half of an emoji would make the whole walk unreadable. */
export function plainText(text: string): string {
  return text.replace(new RegExp(LONE_SURROGATE, "g"), "").replace(/\s+/g, " ").trim();
}
