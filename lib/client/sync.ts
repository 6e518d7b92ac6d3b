import type { UseStore } from "idb-keyval";
import * as z from "zod/mini";
import type { Bundle, EnvelopeAnswer } from "../domain/field";
import { call, type Answer, type Fetch } from "./api";
import { fetchBundle, keptBundle } from "./bundle";
import { deviceFor, registrationOf, setRegistered } from "./device";
import { drainOnce, isUnsent } from "./drain";
import { nextTry } from "./drain-timing";
import { keptLocal, localBundle } from "./local-rigs";
import { deliverable } from "./photo-delivery";
import { PhotoSending } from "./photo-sending";
import { PhotoShelf, type KeptPhoto } from "./photo-shelf";
import { WalkShelf, type KeptWalk } from "./walk-shelf";

/** What the field wing shows of the phone's store and of its dealings with the server. */
export interface SyncView {
  /** False until the store was read for the first time. */
  ready: boolean;
  /** The browser would not let the store be read: nothing can be kept here. */
  storeRefused: boolean;
  /** The server's bundle; where none ever came, what was made here without an account. */
  bundle: Bundle | null;
  /** What was made here without an account, also beside an account's bundle. */
  local: Bundle | null;
  /** The walks on this phone of the bundle's member and of those made without an account, newest first. */
  walks: KeptWalk[];
  /** The photographs that these walks name, oldest first, each with its own state. */
  photos: KeptPhoto[];
  /** The server said that nobody is signed in; recording goes on. */
  signedOut: boolean;
  /** The server said that the role of whoever is signed in makes no walks. */
  roleRefused: boolean;
  /** Whether the last attempt reached the server; null before the first. */
  reached: boolean | null;
}

/** What a sync stands on; injected so that tests run it on simulated time. */
export interface SyncGround {
  store: UseStore;
  nowMs: () => number;
  /** From 0 to 1, see {@link nextTry}. */
  spread: number;
  label: string;
  fetch?: Fetch;
  /** Runs the work unless another tab is at the same. Resolves to whether it ran. */
  alone: (work: () => Promise<void>, what: "walks" | "photos") => Promise<boolean>;
  /** Called after every attempt, so that other tabs read the store again. */
  tell?: () => void;
}

const BUNDLE_AGE_MS = 5 * 60_000;

/** Keeps the phone's walks and bundle in step with the server: one attempt at a time, at moments nextTry decides. */
export class Sync {
  readonly shelf: WalkShelf;
  readonly photos: PhotoShelf;
  private readonly sending: PhotoSending;
  private listeners = new Set<() => void>();
  private current: SyncView = {
    ready: false,
    storeRefused: false,
    bundle: null,
    local: null,
    walks: [],
    photos: [],
    signedOut: false,
    roleRefused: false,
    reached: null,
  };
  private timer: ReturnType<typeof setTimeout> | null = null;
  private trying = false;
  private savedAt: number | null = null;
  private stirredAt: number | null = null;
  private triedAt: number | null = null;
  private bundleAt: number | null = null;
  private failures = 0;
  private notBefore: number | null = null;

  constructor(private readonly ground: SyncGround) {
    this.shelf = new WalkShelf(ground.store);
    this.photos = new PhotoShelf(ground.store);
    const { nowMs, spread, fetch } = ground;
    this.sending = new PhotoSending({
      ...{ shelf: this.photos, nowMs, spread, fetch },
      alone: (work) => ground.alone(work, "photos"),
      changed: () => this.changed(),
      doubted: () => (this.bundleAt = null),
    });
  }

  view = (): SyncView => this.current;

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Reads the store, then begins to try. */
  async start(): Promise<void> {
    await this.read();
    this.stir();
  }

  stop(): void {
    this.sending.stop();
    this.unplan();
  }

  /** Something new is saved on this phone. */
  async saved(): Promise<void> {
    this.savedAt = this.ground.nowMs();
    await this.changed();
  }

  /** The network, or a sign-in, may be back. */
  stir(): void {
    this.stirredAt = this.ground.nowMs();
    this.sending.stir();
    this.plan();
  }

  /** Reads the store again without trying anything. */
  async read(): Promise<void> {
    try {
      const { store } = this.ground;
      const kept = await keptLocal(store);
      const local = kept && localBundle(kept);
      const bundle = (await keptBundle(store)) ?? local;
      const members = [bundle?.member.id, local?.member.id];
      const walks = (await this.shelf.walks()).filter((walk) => members.includes(walk.member));
      const ids = new Set(walks.map(({ id }) => id));
      const photos = (await this.photos.all()).filter(({ walk }) => ids.has(walk));
      this.show({ ready: true, storeRefused: false, bundle, local, walks, photos });
    } catch {
      this.show({ storeRefused: true });
    }
  }

  private show(change: Partial<SyncView>): void {
    this.current = { ...this.current, ...change };
    for (const listener of this.listeners) listener();
  }

  /** The store changed under this tab's hands: everyone reads it again, and what is left to do is planned anew. */
  private async changed(): Promise<void> {
    await this.read();
    this.ground.tell?.();
    this.plan();
  }

  private unplan(): void {
    if (this.timer) clearTimeout(this.timer);
    this.timer = null;
  }

  private plan(): void {
    // Nobody signed in, or someone who makes no walks: either way only a sign-in helps.
    const signedOut = this.current.signedOut || this.current.roleRefused;
    // Until the server has said who is signed in, a photograph could be offered in someone else's name.
    const sure = this.bundleAt !== null && !signedOut;
    this.sending.plan(sure ? deliverable(this.current.photos, this.current.walks) : []);
    this.unplan();
    if (this.trying) return;
    const { nowMs, spread } = this.ground;
    const { savedAt, stirredAt, triedAt, failures, notBefore } = this;
    const pending = isLocalOnly(this.current) ? this.stirred() : this.hasSomething();
    const at = nextTry({ pending, signedOut, savedAt, stirredAt, triedAt, failures, notBefore, spread });
    if (at !== null) this.timer = setTimeout(() => void this.attempt(), Math.max(0, at - nowMs()));
  }

  private hasSomething(): boolean {
    const { bundle, walks } = this.current;
    // Walks made without an account beside one wait for a sign-up, which may never come.
    return this.wantsBundle() || walks.some((walk) => walk.member === bundle?.member.id && isUnsent(walk));
  }

  /**
   * Without an account there is nothing to send. Only a sign-in changes that, and someone may have signed in before
   * the rig was made or in another tab: so the server is asked once each time the page is opened or comes back, and
   * not again and again at a campsite with no signal.
   */
  private stirred(): boolean {
    return this.stirredAt !== null && (this.triedAt === null || this.stirredAt > this.triedAt);
  }

  private wantsBundle(): boolean {
    // Fetched and yet not here: the store was emptied since.
    if (this.current.bundle === null) return true;
    return this.bundleAt === null || this.ground.nowMs() - this.bundleAt > BUNDLE_AGE_MS;
  }

  private async attempt(): Promise<void> {
    this.trying = true;
    const ran = await this.ground.alone(async () => {
      // A store that refuses a write ends this attempt, not all those after it.
      const outcome = await this.exchange().catch((): Answer<unknown> => ({ kind: "unreached" }));
      const code = outcome.kind === "refused" ? outcome.problem.code : null;
      this.failures = outcome.kind === "answered" ? 0 : this.failures + 1;
      // A refusal may mean that someone else has signed in since: ask who, before anything else.
      if (outcome.kind === "refused") this.bundleAt = null;
      const wait = outcome.kind === "refused" ? outcome.retryAfterS : null;
      this.notBefore = wait === null ? null : this.ground.nowMs() + wait * 1000;
      this.show({
        signedOut: code === "signed-out",
        roleRefused: code === "role-refused",
        reached: outcome.kind !== "unreached",
      });
    }, "walks");
    if (!ran) this.failures += 1;
    this.triedAt = this.ground.nowMs();
    this.trying = false;
    await this.changed();
  }

  /** The bundle if it is due, the device if it is new, then envelopes until nothing more can go. */
  private async exchange(): Promise<Answer<unknown>> {
    const { store, fetch, label } = this.ground;
    if (this.wantsBundle()) {
      const answer = await fetchBundle(store, fetch);
      if (answer.kind !== "answered") return answer;
      this.bundleAt = this.ground.nowMs();
    }
    const bundle = await keptBundle(store);
    if (!bundle) return { kind: "unreached" };
    const member = bundle.member.id;
    const device = await deviceFor(store, member);
    if (!device.registered) {
      const answer = await call(z.unknown(), "POST", "/api/devices", registrationOf(device, label), fetch);
      if (answer.kind !== "answered") return answer;
      await setRegistered(store, member, true);
    }
    return this.drain(device.id, member, bundle);
  }

  private async drain(device: string, member: string, bundle: Bundle): Promise<Answer<unknown>> {
    for (;;) {
      const before = await this.progress();
      const answer = await drainOnce(this.shelf, device, bundle.keys, this.ground.fetch);
      if (!answer) return { kind: "answered", value: null };
      if (answer.kind !== "answered") return answer;
      if (isForeign(answer.value)) {
        this.bundleAt = null;
        await setRegistered(this.ground.store, member, false);
      }
      // The server answered and yet nothing moved: wait as after a failure instead of asking in a circle.
      if ((await this.progress()) === before) return { kind: "unreached" };
    }
  }

  private async progress(): Promise<string> {
    const walks = await this.shelf.walks();
    return walks.map((w) => `${w.acknowledged} ${w.receipt !== null} ${w.refused}`).join();
  }
}

/** Whether this phone has never had an account's bundle, only what was made on it without one. */
export function isLocalOnly({ bundle, local }: Pick<SyncView, "bundle" | "local">): boolean {
  return local !== null && bundle === local;
}

function isForeign(answer: EnvelopeAnswer): boolean {
  return answer.refused.some((row) => row.code === "foreign-device");
}
