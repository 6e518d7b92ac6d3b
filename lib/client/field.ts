import type { BundleRig } from "../domain/field";
import { browserClock, type Clock } from "./clock";
import { deviceFor } from "./device";
import { askToKeep } from "./persistence";
import { Recorder, type Ground, type WalkPlan } from "./recorder";
import { openStore } from "./store";
import { browserOutside, StoreGuard } from "./store-guard";
import { Sync } from "./sync";

const DRAIN_LOCKS = { walks: "hookfast-drain", photos: "hookfast-drain-photos" } as const;
const CHANNEL = "hookfast";

/** A walk that this tab, and no other, records until it lets go. */
export interface HeldWalk {
  recorder: Recorder;
  release: () => void;
}

/** The field wing's one instance of everything that lives outside React: clock, store and sync. */
export class Field {
  readonly clock: Clock = browserClock(document);
  private readonly channel = new BroadcastChannel(CHANNEL);
  readonly guard = new StoreGuard(
    openStore(undefined, () => void this.emptied()),
    browserOutside(),
  );
  readonly sync: Sync;

  constructor() {
    this.sync = new Sync({
      store: this.guard.store,
      nowMs: () => performance.now(),
      spread: Math.random(),
      label: navigator.userAgent.slice(0, 100),
      alone: (work, what) =>
        navigator.locks.request(DRAIN_LOCKS[what], { ifAvailable: true }, async (lock) => {
          if (lock) await work();
          return lock !== null;
        }),
      tell: () => this.channel.postMessage("changed"),
    });
  }

  /** Starts to read and sync; what it returns stops it. */
  start(): () => void {
    const stir = () => this.sync.stir();
    const shown = () => document.visibilityState === "visible" && stir();
    this.channel.onmessage = () => void this.sync.read();
    const unguard = this.guard.follow(this.sync);
    window.addEventListener("online", stir);
    document.addEventListener("visibilitychange", shown);
    void this.sync.start();
    return () => {
      unguard();
      window.removeEventListener("online", stir);
      document.removeEventListener("visibilitychange", shown);
      this.sync.stop();
    };
  }

  /** The database was deleted under this page: says what is gone, and fetches the rigs anew. */
  private async emptied(): Promise<void> {
    await Promise.all([this.guard.check(), this.sync.read()]);
    this.sync.stir();
  }

  /** Opens a walk on a rig; resolves when its first entry is saved on this phone. */
  async open(rig: BundleRig, plan: WalkPlan): Promise<HeldWalk> {
    // The first walk is the moment: before it there is nothing to lose, and some browsers ask the person.
    if (this.sync.view().walks.length === 0) void askToKeep();
    const recorder = await Recorder.open(await this.ground(plan.member), rig, plan);
    return (await this.hold(recorder.view().walk.id, async () => recorder)) as HeldWalk;
  }

  /**
   * Takes up a walk that is on this phone.
   * @returns null where it is not, "elsewhere" while another tab records it
   */
  async takeUp(member: string, walk: string): Promise<HeldWalk | "elsewhere" | null> {
    // A walk made without an account goes on with its own device beside an account's.
    const opener = (await this.sync.shelf.walk(walk))?.member ?? member;
    return this.hold(walk, async () => Recorder.takeUp(await this.ground(opener), walk));
  }

  /** Keeps that a rig was left, or its car entered, after a closed walk: its verdict is stale from now on. */
  async left(walk: string): Promise<void> {
    await this.sync.shelf.amend(walk, () => ({ leftAt: new Date(this.clock().wallMs).toISOString() }));
    await this.sync.read();
  }

  /** One tab records a walk: the browser's lock is taken before the walk is read and kept until it is let go. */
  private async hold<T extends Recorder | null>(walk: string, take: () => Promise<T>) {
    return new Promise<HeldWalk | "elsewhere" | null>((resolve, reject) => {
      const held = navigator.locks.request(`hookfast-walk-${walk}`, { ifAvailable: true }, async (lock) => {
        if (!lock) return resolve("elsewhere");
        const recorder = await take();
        if (!recorder) return resolve(null);
        const unfollow = recorder.subscribe(() => void this.sync.saved());
        await this.sync.saved();
        await new Promise<void>((letGo) => {
          const release = () => {
            unfollow();
            letGo();
          };
          resolve({ recorder, release });
        });
      });
      held.catch(reject);
    });
  }

  private async ground(member: string): Promise<Ground> {
    const { shelf } = this.sync;
    return { shelf, clock: this.clock, device: await deviceFor(shelf.store, member) };
  }
}
