import type { Depth, Purpose } from "../domain/entry";
import type { BundleRig } from "../domain/field";
import { browserClock, type Clock } from "./clock";
import { deviceFor } from "./device";
import { Recorder, type Ground } from "./recorder";
import { openStore } from "./store";
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
  readonly sync: Sync;

  constructor() {
    this.sync = new Sync({
      store: openStore(),
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
    window.addEventListener("online", stir);
    document.addEventListener("visibilitychange", shown);
    void this.sync.start();
    return () => {
      window.removeEventListener("online", stir);
      document.removeEventListener("visibilitychange", shown);
      this.sync.stop();
    };
  }

  /** Opens a walk on a rig; resolves when its first entry is saved on this phone. */
  async open(rig: BundleRig, member: string, purpose: Purpose, depth: Depth): Promise<HeldWalk> {
    const recorder = await Recorder.open(await this.ground(member), rig, { member, purpose, depth });
    return (await this.hold(recorder.view().walk.id, async () => recorder)) as HeldWalk;
  }

  /**
   * Takes up a walk of this member's that is on this phone.
   * @returns null where it is not, "elsewhere" while another tab records it
   */
  async takeUp(member: string, walk: string): Promise<HeldWalk | "elsewhere" | null> {
    return this.hold(walk, async () => Recorder.takeUp(await this.ground(member), walk));
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
