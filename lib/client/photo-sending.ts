import type { ProblemCode } from "../domain/problem";
import type { Answer, Fetch } from "./api";
import { nextTry } from "./drain-timing";
import { deliver } from "./photo-delivery";
import type { KeptPhoto, PhotoShelf } from "./photo-shelf";

/** What sending stands on; the rest of the sync's ground. */
export interface SendingGround {
  shelf: PhotoShelf;
  nowMs: () => number;
  spread: number;
  fetch?: Fetch;
  /** Runs the work unless another tab is at it. Resolves to whether it ran. */
  alone: (work: () => Promise<void>) => Promise<boolean>;
  /** The shelf changed: read it again, and plan. */
  changed: () => Promise<void>;
  /** The server turned a photograph down: perhaps someone else has signed in since. */
  doubted: () => void;
}

/** Refusals that stand against one photograph and not against the next. */
const OF_ONE: ReadonlySet<ProblemCode> = new Set(["not-found", "too-large", "wrong-media"]);

/**
 * Sends photographs beside the walks and at their own pace: however long one takes and however often it fails, no entry
 * and no seal waits for it. When to try is decided as for walks.
 */
export class PhotoSending {
  private waiting: readonly KeptPhoto[] = [];
  private readonly failed = new Map<string, number>();
  private timer: ReturnType<typeof setTimeout> | null = null;
  private trying = false;
  private signedOut = false;
  private stirredAt: number | null = null;
  private triedAt: number | null = null;
  private failures = 0;
  private notBefore: number | null = null;

  constructor(private readonly ground: SendingGround) {}

  /** The network, or a sign-in, may be back. */
  stir(): void {
    this.stirredAt = this.ground.nowMs();
  }

  /** Takes in which photographs may go now, and decides when to try. */
  plan(waiting: readonly KeptPhoto[]): void {
    this.waiting = waiting;
    this.stop();
    if (this.trying) return;
    const { nowMs, spread } = this.ground;
    const { signedOut, stirredAt, triedAt, failures, notBefore } = this;
    const pending = waiting.length > 0;
    const facts = { pending, signedOut, savedAt: null, stirredAt, triedAt, failures, notBefore, spread };
    const at = nextTry(facts);
    if (at !== null) this.timer = setTimeout(() => void this.attempt(), Math.max(0, at - nowMs()));
  }

  stop(): void {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
  }

  private async attempt(): Promise<void> {
    this.trying = true;
    const ran = await this.ground.alone(async () => {
      const outcome = await this.round();
      const refused = outcome.kind === "refused" ? outcome : null;
      this.failures = outcome.kind === "answered" ? 0 : this.failures + 1;
      this.signedOut = refused?.problem.code === "signed-out" || refused?.problem.code === "role-refused";
      this.notBefore = refused?.retryAfterS ? this.ground.nowMs() + refused.retryAfterS * 1000 : null;
      if (refused) this.ground.doubted();
    });
    if (!ran) this.failures += 1;
    this.triedAt = this.ground.nowMs();
    this.trying = false;
    await this.ground.changed();
  }

  /** Tries each photograph once, those that failed least first, until something stands against all of them. */
  private async round(): Promise<Answer<unknown>> {
    let outcome: Answer<unknown> = { kind: "answered", value: null };
    const failures = ({ sha256 }: KeptPhoto) => this.failed.get(sha256) ?? 0;
    for (const photo of [...this.waiting].sort((one, other) => failures(one) - failures(other))) {
      const { shelf, fetch } = this.ground;
      // A store that refuses a write ends this attempt, not all those after it.
      const answer = await deliver(shelf, photo, fetch).catch((): Answer<unknown> => ({ kind: "unreached" }));
      if (answer.kind === "answered") {
        await this.ground.changed();
        continue;
      }
      outcome = answer;
      this.failed.set(photo.sha256, failures(photo) + 1);
      if (answer.kind === "unreached" || !OF_ONE.has(answer.problem.code)) break;
    }
    return outcome;
  }
}
