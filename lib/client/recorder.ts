import { clockJump, nextLink, stamp, type Stamp } from "../domain/chain";
import { bytesDigest } from "../domain/digest";
import type { Depth, Entry, Link, MarkBody, Purpose } from "../domain/entry";
import type { BundleRig } from "../domain/field";
import { interruptionOf, type Interruption } from "../domain/interruption";
import { replay, type Replay } from "../domain/replay";
import type { RevisionDocument } from "../domain/revision";
import { thumbprint } from "../domain/signature";
import { uuidV7 } from "../domain/uuid";
import { APP } from "../domain/version";
import type { Clock } from "./clock";
import { signSeal, type Device } from "./device";
import { keepPhoto, type PhotoBytes } from "./photo-shelf";
import type { HeldRecord } from "./record-export";
import type { Beside, KeptWalk, WalkShelf } from "./walk-shelf";

/** What a screen shows of the walk being recorded; a new object whenever something was saved. */
export interface WalkView {
  walk: KeptWalk;
  document: RevisionDocument;
  replay: Replay;
  /** Why the walk does not simply go on; `resume` answers it. */
  interruption: Interruption | null;
}

/** What is to be walked, by whom, and how far. */
export interface WalkPlan {
  member: string;
  purpose: Purpose;
  depth: Depth;
  /** A card filled in by hand and entered later: no time is kept. */
  source?: "paper";
}

/** What a recorder stands on. */
export interface Ground {
  shelf: WalkShelf;
  clock: Clock;
  device: Device;
}

/**
 * Records one walk. Every entry is digested (and a closing one signed) first and then saved in one strict
 * transaction; the view moves on only after that, so what a screen shows is saved on this phone.
 */
export class Recorder {
  private listeners = new Set<() => void>();
  private line: Promise<unknown> = Promise.resolve();
  private current: WalkView;

  private constructor(
    private readonly ground: Ground,
    private readonly links: Link[],
    private takenUpMonoMs: number,
    walk: KeptWalk,
    document: RevisionDocument,
  ) {
    this.current = { walk, document, replay: this.replayed(document), interruption: null };
  }

  /** Opens a new walk on a rig's current revision. */
  static async open(
    ground: Ground,
    rig: BundleRig,
    { member, purpose, depth, source }: WalkPlan,
  ): Promise<Recorder> {
    const now = ground.clock();
    const id = uuidV7(now.wallMs, crypto.getRandomValues(new Uint8Array(10)));
    const { digest: revision, document } = rig.revision;
    const { id: device, publicKey } = ground.device;
    const body = {
      rig: rig.id,
      revision,
      purpose,
      depth,
      device,
      member,
      app: APP,
      key: thumbprint(publicKey),
      ...(source && { source }),
    };
    const open = nextLink(id, { revision }, "open", body, stamp(now, null, now.monoMs));
    const walk: KeptWalk = {
      id,
      rig: rig.id,
      rigName: rig.name,
      revision,
      purpose,
      depth,
      member,
      device,
      ...(source && { source }),
      openedAt: open.entry.at,
      length: 1,
      head: open.digest,
      acknowledged: 0,
      seal: null,
      verdict: null,
      receipt: null,
      refused: null,
    };
    await ground.shelf.begin(walk, open, document);
    return new Recorder(ground, [open], now.monoMs, walk, document);
  }

  /** Takes up a walk that is on this phone, or null where it is not. */
  static async takeUp(ground: Ground, id: string): Promise<Recorder | null> {
    const walk = await ground.shelf.walk(id);
    const document = walk && (await ground.shelf.document(walk.revision));
    if (!walk || !document) return null;
    const recorder = new Recorder(
      ground,
      await ground.shelf.links(id),
      ground.clock().monoMs,
      walk,
      document,
    );
    recorder.returned("load");
    return recorder;
  }

  view = (): WalkView => this.current;

  /** What this page holds of the walk: enough for its record file where the store cannot be read any more. */
  held = (): HeldRecord => {
    const { walk, document } = this.current;
    return { walk, document, links: [...this.links], publicKey: this.ground.device.publicKey };
  };

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Active walking time now, in milliseconds; stands still while the walk waits, and once it is closed. */
  elapsedMs = (): number => {
    const { walk, interruption, replay } = this.current;
    return walk.seal || interruption ? replay.elapsedMs : this.stamp().elapsedMs;
  };

  /**
   * Someone looks at the walk again: it may have been left meanwhile.
   * @param away `load` on a new page; else how long the page was out of sight, in milliseconds
   */
  returned(away: "load" | number): void {
    if (this.current.walk.source === "paper" || this.current.interruption) return;
    const marked = this.current.replay.marks.size > 0;
    const interruption = interruptionOf(this.links.at(-1)!.entry, marked, away, this.ground.clock().wallMs);
    if (interruption) this.show({ interruption });
  }

  /** Marks a check. Resolves when the mark is saved on this phone. */
  mark(check: string, outcome: MarkBody["outcome"], more: Partial<MarkBody> = {}): Promise<void> {
    return this.inLine(() => this.append("mark", { check, outcome, ...more }));
  }

  /** Leaves words beside the checks. */
  note(text: string): Promise<void> {
    return this.inLine(() => this.append("note", { text }));
  }

  /**
   * Keeps a photograph, of a check or of the walk as a whole. Resolves when it is saved on this phone with its entry.
   * A walk that was closed meanwhile takes no more.
   */
  photo(check: string | undefined, photo: PhotoBytes): Promise<void> {
    return this.inLine(async () => {
      const { bytes, mime } = photo;
      if (this.current.walk.seal) throw new Error("the walk is closed");
      const sha256 = bytesDigest(new Uint8Array(bytes));
      const body = { ...(check !== undefined && { check }), sha256, bytes: bytes.byteLength, mime };
      await this.append("photo", body, (shelf, link) => keepPhoto(shelf, link, photo));
    });
  }

  /** Walking time stops until the walk is resumed. */
  pause(): Promise<void> {
    return this.inLine(async () => {
      await this.append("pause", {});
      this.returned(0);
    });
  }

  /**
   * Goes on with the walk, voiding the marks of the checks that are asked again.
   * @param car whether anyone has been in the car since the cabin was marked, where that was asked
   */
  resume(again: readonly string[], car?: "untouched" | "entered"): Promise<void> {
    return this.inLine(async () => {
      if (this.current.interruption) this.takenUpMonoMs = this.ground.clock().monoMs;
      await this.append("resume", { again: [...again], ...(car && { car }) });
      if (this.current.interruption) this.show({ interruption: null });
    });
  }

  /** Closes and signs the walk as it stands. Resolves when both are saved on this phone; again is no error. */
  close(): Promise<void> {
    return this.inLine(async () => {
      if (this.current.walk.seal) return;
      await this.noteJump();
      const { verdict, counts } = this.current.replay;
      const link = this.link("close", { verdict, ...counts });
      const { device } = this.ground;
      const signature = await signSeal(device, link.digest);
      const seal = { walk: this.current.walk.id, seal: link.digest, alg: device.alg, signature };
      await this.save(link, { seal, verdict });
    });
  }

  private async append(type: string, body: Entry["body"], beside?: Beside): Promise<void> {
    await this.noteJump();
    await this.save(this.link(type, body), {}, beside);
  }

  /** A clock that was set since the last entry is recorded before anything else. */
  private async noteJump(): Promise<void> {
    const jump = clockJump(this.ground.clock(), this.links.at(-1)!.entry);
    if (jump) await this.save(this.link("disturbed", jump), {});
  }

  private link(type: string, body: Entry["body"]): Link {
    return nextLink(this.current.walk.id, this.links.at(-1)!, type, body, this.stamp());
  }

  private async save(link: Link, change: Partial<KeptWalk>, beside?: Beside): Promise<void> {
    const walk = await this.ground.shelf.append(link, change, beside);
    this.links.push(link);
    this.show({ walk, replay: this.replayed(this.current.document) });
  }

  private show(change: Partial<WalkView>): void {
    this.current = { ...this.current, ...change };
    for (const listener of this.listeners) listener();
  }

  private stamp(): Stamp {
    const last = this.links.at(-1)!.entry;
    const now = stamp(this.ground.clock(), last, this.takenUpMonoMs);
    const stands = this.current.walk.source === "paper" || this.current.interruption !== null;
    return stands ? { ...now, elapsedMs: last.elapsedMs } : now;
  }

  private replayed(document: RevisionDocument): Replay {
    return replay(
      document,
      this.links.map((link) => link.entry),
    );
  }

  /** One write after the other, in the order asked; one that failed does not hold up the next. */
  private inLine<T>(work: () => Promise<T>): Promise<T> {
    const done = this.line.then(work);
    this.line = done.catch(() => {});
    return done;
  }
}
