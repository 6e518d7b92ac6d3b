import "fake-indexeddb/auto";
import { deviceFor, registrationOf, type Device } from "@/lib/client/device";
import { Recorder } from "@/lib/client/recorder";
import { openStore } from "@/lib/client/store";
import { WalkShelf } from "@/lib/client/walk-shelf";
import type { MarkBody } from "@/lib/domain/entry";
import type { BundleRig, DeviceRegistration, Envelope } from "@/lib/domain/field";
import { walkChecks } from "@/lib/domain/revision";
import type { DemoWalk } from "./walks";

const MINUTE_MS = 60_000;
const ALL_GOOD: Pick<MarkBody, "outcome"> = { outcome: "good" };
const DAY_MS = 24 * 60 * MINUTE_MS;

/** One person's phone, with its clock in the hands of the seeder: the recorder and the store are the real ones. */
export class DemoPhone {
  private wallMs = 0;
  private monoMs = 0;

  private constructor(
    private readonly member: string,
    private readonly shelf: WalkShelf,
    private readonly device: Device,
  ) {}

  static async of(member: string): Promise<DemoPhone> {
    const store = openStore(`demo-${member}-${crypto.randomUUID()}`);
    return new DemoPhone(member, new WalkShelf(store), await deviceFor(store, member));
  }

  registration(): DeviceRegistration {
    return registrationOf(this.device, "Demo phone");
  }

  /**
   * Walks a rig and returns what the phone then sends, and when.
   * @param today midnight UTC of the day from which the walk's days are counted back
   */
  async walk(rig: BundleRig, plan: DemoWalk, today: Date): Promise<{ envelope: Envelope; sentAt: Date }> {
    const [hours = 0, minutes = 0] = plan.at.split(":").map(Number);
    this.wallMs = today.getTime() - plan.daysAgo * DAY_MS + (hours * 60 + minutes) * MINUTE_MS + 4_217;
    this.monoMs = 9_000;
    const monoEpoch = crypto.randomUUID();
    const clock = () => ({ wallMs: this.wallMs, monoMs: this.monoMs, monoEpoch });
    const ground = { shelf: this.shelf, clock, device: this.device };
    const { member } = this;
    const recorder = await Recorder.open(ground, rig, { member, purpose: plan.purpose, depth: plan.depth });
    await this.mark(recorder, rig, plan);
    if (plan.brokenOffAfter === undefined) {
      this.pass(6_400);
      await recorder.close();
    }
    const { walk } = recorder.view();
    const links = await this.shelf.links(walk.id);
    return {
      envelope: {
        device: this.device.id,
        entries: links.map(({ text }) => JSON.parse(text) as Envelope["entries"][number]),
        seals: walk.seal ? [walk.seal] : [],
      },
      sentAt: new Date(this.wallMs + plan.offlineMinutes * MINUTE_MS),
    };
  }

  private async mark(recorder: Recorder, rig: BundleRig, plan: DemoWalk): Promise<void> {
    const checks = walkChecks(rig.revision.document, plan.purpose, plan.depth).slice(0, plan.brokenOffAfter);
    for (const [index, { check }] of checks.entries()) {
      const { outcome, ...more } = plan.marks?.[check.key] ?? ALL_GOOD;
      // People take their time over a fault and over the lamps, and nobody is quite regular.
      const dwell = (check.kind === "lamps" ? 74_000 : 16_000) + (outcome === "good" ? 0 : 41_000);
      this.pass(dwell + ((index * 7_919 + plan.daysAgo * 3_571) % 19_000));
      await recorder.mark(check.key, outcome, more);
    }
    for (const { check, outcome, ...more } of plan.then ?? []) {
      this.pass(187_000);
      await recorder.mark(check, outcome, more);
    }
  }

  private pass(ms: number): void {
    this.wallMs += ms;
    this.monoMs += ms;
  }
}
