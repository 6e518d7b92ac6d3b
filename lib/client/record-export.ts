import { get } from "idb-keyval";
import { format } from "date-fns/format";
import type { Link } from "../domain/entry";
import { canonicalText } from "../domain/json";
import { recordFile, type PhoneSealLine } from "../domain/record-file";
import type { RevisionDocument } from "../domain/revision";
import { sealMessage, verifies, type PublicKey } from "../domain/signature";
import type { Device } from "./device";
import type { KeptWalk, WalkShelf } from "./walk-shelf";

/** A walk in memory, whole: what a record file is made of. */
export interface HeldRecord {
  walk: KeptWalk;
  document: RevisionDocument;
  links: readonly Link[];
  /** This phone's key for the walk's member, where there is one. */
  publicKey?: PublicKey;
}

/** A file to be handed to the person, as text. */
export interface ExportFile {
  name: string;
  text: string;
  /** Its media type, where it is not a record's. */
  mime?: string;
}

/** The record file of a walk that this page holds; the store is not touched. */
export function exportHeld({ walk, document, links, publicKey }: HeldRecord): ExportFile {
  const texts = links.map((link) => link.text);
  return {
    name: `hookfast-${walk.purpose}-${format(walk.openedAt, "yyyy-MM-dd")}.ndjson`,
    text: recordFile(canonicalText(document), texts, sealLineOf(walk, publicKey)),
  };
}

function sealLineOf({ seal, receipt }: KeptWalk, publicKey: PublicKey | undefined): PhoneSealLine | null {
  if (!seal) return null;
  // A phone that lost its key has another one now, which may not be the one that made this signature.
  const signed = publicKey && verifies(publicKey, seal.alg, sealMessage(seal.seal), seal.signature);
  return {
    seal: seal.seal,
    alg: seal.alg,
    signature: seal.signature,
    ...(signed && { device: publicKey }),
    ...(receipt && { receipt }),
  };
}

/** The record file of a walk in the phone's store, made with no network; null where its list is not here. */
export async function exportWalk(shelf: WalkShelf, walk: KeptWalk): Promise<ExportFile | null> {
  const held = await readHeld(shelf, walk);
  return held && exportHeld(held);
}

/**
 * Every walk on this phone in one file, oldest first: one record file after the other, each beginning with its
 * `revision` line. A file each would be many downloads from one tap, which browsers stop after the first.
 */
export async function exportAll(shelf: WalkShelf, nowMs: number): Promise<ExportFile | null> {
  const walks = (await shelf.walks()).reverse();
  const files = await Promise.all(walks.map((walk) => exportWalk(shelf, walk)));
  const text = files.map((file) => file?.text ?? "").join("");
  return text ? { name: `hookfast-all-${format(nowMs, "yyyy-MM-dd")}.ndjson`, text } : null;
}

async function readHeld(shelf: WalkShelf, walk: KeptWalk): Promise<HeldRecord | null> {
  const [document, links, device] = await Promise.all([
    shelf.document(walk.revision),
    shelf.links(walk.id),
    get<Device>(["device", walk.member], shelf.store),
  ]);
  return document && { walk, document, links, ...(device && { publicKey: device.publicKey }) };
}

/** What became of a file that was handed over. */
export type HandedOver = "shared" | "downloaded" | "dismissed";

/**
 * Hands a file to the person: by the phone's own share sheet where it takes such a file, as a download elsewhere.
 * Works with no network. Call it soon after a tap; the share sheet opens only then.
 */
export async function handOver({
  name,
  text,
  mime = "application/x-ndjson",
}: ExportFile): Promise<HandedOver> {
  const file = new File([text], name, { type: mime });
  if (navigator.canShare?.({ files: [file] })) {
    try {
      await navigator.share({ files: [file], title: name });
      return "shared";
    } catch (error) {
      if (error instanceof DOMException && error.name === "AbortError") return "dismissed";
      // The share sheet would not open: the download does not need it.
    }
  }
  const address = URL.createObjectURL(file);
  const link = Object.assign(document.createElement("a"), { href: address, download: name });
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
  return "downloaded";
}
