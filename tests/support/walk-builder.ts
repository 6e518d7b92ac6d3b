import { randomBytes } from "node:crypto";
import { nextLink } from "@/lib/domain/chain";
import type { Depth, Entry, Link, MarkBody, OpenBody, Purpose } from "@/lib/domain/entry";
import type { BundleRig, Envelope, Seal } from "@/lib/domain/field";
import { replay } from "@/lib/domain/replay";
import { uuidV7 } from "@/lib/domain/uuid";
import type { Key } from "./given";

type Wanted = {
  member: { id: string };
  device: Key;
  rig: BundleRig;
  purpose?: Purpose;
  depth?: Depth;
  /** When it is opened, milliseconds since 1970. */
  openedMs?: number;
  /** Replaces members of the `open` body. */
  open?: Partial<OpenBody>;
};

/** Builds a walk entry by entry, the way a phone chains them, and lets a test bend any of it. */
export class WalkBuilder {
  readonly id: string;
  readonly links: Link[] = [];
  private readonly openedMs: number;

  constructor(private readonly wanted: Wanted) {
    const { member, device, rig, purpose = "hook-up", depth = "full" } = wanted;
    this.openedMs = wanted.openedMs ?? Date.UTC(2026, 4, 1, 12);
    this.id = uuidV7(this.openedMs, randomBytes(10));
    this.add("open", {
      rig: rig.id,
      revision: rig.revision.digest,
      purpose,
      depth,
      device: device.id,
      member: member.id,
      app: "test 1",
      ...wanted.open,
    });
  }

  /** Appends an entry ten seconds of walking after the one before. */
  add(type: string, body: Entry["body"]): this {
    const elapsedMs = this.links.length * 10_000;
    const when = {
      at: new Date(this.openedMs + elapsedMs).toISOString(),
      elapsedMs,
      monoMs: elapsedMs,
      monoEpoch: "test",
    };
    const revision = this.wanted.open?.revision ?? this.wanted.rig.revision.digest;
    this.links.push(nextLink(this.id, this.links.at(-1) ?? { revision }, type, body, when));
    return this;
  }

  mark(check: string, outcome: MarkBody["outcome"], more: Partial<MarkBody> = {}): this {
    return this.add("mark", { check, outcome, ...more });
  }

  /** Marks every check of the walk good, save those named. */
  markAll(except: Record<string, MarkBody["outcome"]> = {}): this {
    const { rig, purpose = "hook-up", depth = "full" } = this.wanted;
    for (const key of rig.revision.document.walks[purpose][depth]) this.mark(key, except[key] ?? "good");
    return this;
  }

  /** Closes with what the entries add up to, or with what is claimed. */
  close(claimed: Partial<Entry["body"]> = {}): this {
    const { verdict, counts } = replay(
      this.wanted.rig.revision.document,
      this.links.map(({ entry }) => entry),
    );
    return this.add("close", { verdict, ...counts, ...claimed });
  }

  /** The entries as they come out of the envelope's JSON. */
  entries(from = 0, to = this.links.length): Envelope["entries"] {
    return this.links.slice(from, to).map(({ text }) => JSON.parse(text) as Envelope["entries"][number]);
  }

  /** Digest of the last entry. */
  get head(): string {
    return this.links.at(-1)!.digest;
  }

  /** The seal over the last entry, by the device that opened the walk or by another key. */
  seal(by: Key = this.wanted.device): Seal {
    return { walk: this.id, seal: this.head, alg: by.alg, signature: by.sign(this.head) };
  }

  /** Everything in one envelope, sealed. */
  envelope(): Envelope {
    return { device: this.wanted.device.id, entries: this.entries(), seals: [this.seal()] };
  }
}
