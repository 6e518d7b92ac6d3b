import type { Receipt } from "./receipt";
import type { Algorithm, PublicKey } from "./signature";
import { canonicalText } from "./json";

/** The last line of a sealed walk's record file. */
export interface SealLine {
  seal: string;
  alg: Algorithm;
  signature: string;
  device: PublicKey;
  receipt: Receipt;
}

/** As a phone writes it: without the receipt before there is one, without the key where it was lost. */
export type PhoneSealLine = Omit<SealLine, "device" | "receipt"> & Partial<SealLine>;

/**
 * A record file (`application/x-ndjson`): the revision, each entry's canonical text exactly as stored, and the seal.
 * @param revision canonical text of the revision document
 * @param entries canonical texts in order
 * @param seal null while the walk is open
 */
export function recordFile(
  revision: string,
  entries: readonly string[],
  seal: SealLine | PhoneSealLine | null,
): string {
  const lines = [`{"revision":${revision}}`, ...entries, ...(seal ? [canonicalText(seal)] : [])];
  return lines.map((line) => line + "\n").join("");
}
