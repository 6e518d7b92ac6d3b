import { chainFault, type Head } from "@/lib/domain/chain";
import { bodyOf, readEntry, type Link, type OpenBody } from "@/lib/domain/entry";
import { refusalDetails as details, type RefusalReason } from "@/lib/domain/messages/refusals";
import type { WalkBatch } from "./batch";
import type { Ground } from "./ground";
import type { Sender } from "./sender";
import type { StoredWalk } from "./stored-walk";

/** What of a batch's entries is to be stored, and the first that is not. */
export interface JudgedEntries {
  links: Link[];
  fork: Link | null;
  /** What the walk stands on; null when nothing of it is stored and nothing is to be. */
  ground: Ground | null;
  /** The head once `links` are stored. */
  head: Head;
  refused: ({ seq: number } & RefusalReason) | null;
}

/** What is stored of the walk that a batch goes on with. */
export interface Before {
  stored: StoredWalk | null;
  /** What is stored at the batch's sequence numbers. */
  digests: ReadonlyMap<number, string>;
  /** Finds the rig and revision that an `open` names, or says why not. */
  findGround: (open: OpenBody) => Promise<Ground | RefusalReason>;
}

/**
 * Judges the entries of one walk in order; the first that is refused ends it. The reasons are looked for in the order
 * of the closed list.
 */
export async function judgeEntries(
  sender: Sender,
  { stored, digests, findGround }: Before,
  { entries }: WalkBatch,
): Promise<JudgedEntries> {
  const known = new Map(digests);
  const judged: JudgedEntries = {
    links: [],
    fork: null,
    ground: stored && { rigId: stored.rigId, revisionId: stored.revisionId },
    head: headOf(stored),
    refused: null,
  };
  for (const raw of entries) {
    const refuse = (reason: RefusalReason): JudgedEntries => ({
      ...judged,
      refused: { seq: raw.seq, ...reason },
    });
    const link = readEntry(raw);
    if ("pointer" in link) return refuse({ code: "invalid", detail: details.fault(link) });
    const { entry, digest } = link;
    const stranger = strangerReason(sender, stored, link);
    if (stranger) return refuse(stranger);
    if (known.get(entry.seq) === digest) continue;

    const open = entry.seq === 0 ? bodyOf(entry, "open") : null;
    const ground = open && (await findGround(open));
    if (ground && "code" in ground) return refuse(ground);

    if (known.has(entry.seq)) {
      judged.fork = link;
      return refuse({ code: "fork", detail: details.fork(entry.seq) });
    }
    const fault = chainReason(judged.head, link);
    if (fault) return refuse(fault);

    judged.links.push(link);
    judged.ground ??= ground;
    known.set(entry.seq, digest);
    judged.head = { stored: entry.seq + 1, digest, closed: entry.type === "close", sealed: false };
  }
  return judged;
}

function headOf(stored: StoredWalk | null): Head {
  return {
    stored: stored?.entries ?? 0,
    digest: stored?.head.toString("hex") ?? null,
    closed: Boolean(stored?.closed),
    sealed: stored?.state === "sealed",
  };
}

function strangerReason(sender: Sender, stored: StoredWalk | null, { entry }: Link): RefusalReason | null {
  const open = bodyOf(entry, "open");
  const mine = stored === null || stored.memberId === sender.member.id;
  if (entry.v !== 1) return { code: "version", detail: details.version };
  if (!sender.key) return { code: "foreign-device", detail: details.unregistered };
  if (open && open.device.toLowerCase() !== sender.device) {
    return { code: "foreign-device", detail: details["foreign-open"] };
  }
  // Of another member's walk the device is foreign too, but that is not what is wrong.
  if (stored && mine && stored.deviceId !== sender.device) {
    return { code: "foreign-device", detail: details["foreign-device"] };
  }
  if (!mine) return { code: "not-yours", detail: details["not-yours"] };
  if (open && open.member !== sender.member.id) {
    return { code: "not-yours", detail: details["not-your-open"] };
  }
  return null;
}

function chainReason(head: Head, link: Link): RefusalReason | null {
  const code = chainFault(head, link);
  switch (code) {
    case null:
      return null;
    case "invalid":
      return { code, detail: head.closed ? details["after-close"] : details.misplaced };
    case "sealed":
      return { code, detail: details.sealed };
    case "gap":
      return { code, detail: details.gap(head.stored) };
    case "broken-chain":
      return { code, detail: details["broken-chain"](head.digest) };
  }
}
