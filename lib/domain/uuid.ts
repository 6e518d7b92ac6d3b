const LAYOUT = [8, 4, 4, 4, 12];

/** A lower-case UUID of any version, as text. */
export const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

/**
 * A version 7 UUID (RFC 9562, 5.7).
 * @param unixMs milliseconds since 1970, the first 48 bits
 * @param random ten random bytes; six of their bits are overwritten by version and variant
 */
export function uuidV7(unixMs: number, random: Uint8Array): string {
  if (random.length !== 10) throw new RangeError("a version 7 UUID takes ten random bytes");
  const tail = Uint8Array.from(random);
  tail[0] = (tail[0]! & 0x0f) | 0x70;
  tail[2] = (tail[2]! & 0x3f) | 0x80;
  const hex =
    unixMs.toString(16).padStart(12, "0") + Array.from(tail, (b) => b.toString(16).padStart(2, "0")).join("");
  let from = 0;
  return LAYOUT.map((length) => hex.slice(from, (from += length))).join("-");
}
