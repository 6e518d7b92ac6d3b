import type { Depth, MarkBody, Purpose } from "@/lib/domain/entry";
import type { DemoMemberKey } from "./people";
import type { DemoRigKey } from "./rigs";

/** One demo walk. Every check of it is marked good, save what `marks` says; `then` is marked after those. */
export interface DemoWalk {
  member: DemoMemberKey;
  rig: DemoRigKey;
  purpose: Purpose;
  depth: Depth;
  daysAgo: number;
  /** When it was opened, hours and minutes UTC. */
  at: `${number}:${number}`;
  /** Minutes from its end until the phone had signal again. */
  offlineMinutes: number;
  marks?: Record<string, Pick<MarkBody, "outcome" | "seen" | "note">>;
  then?: Pick<MarkBody, "check" | "outcome" | "because">[];
  /** Broken off after this many marks, and never signed. */
  brokenOffAfter?: number;
}

/** The demo's walks, oldest first for each member. */
export const demoWalks: DemoWalk[] = [
  {
    member: "driver",
    rig: "household",
    purpose: "hook-up",
    depth: "full",
    daysAgo: 27,
    at: "15:12",
    offlineMinutes: 87,
    marks: {
      lamps: {
        outcome: "fault",
        seen: { right: { left: "dark", right: "dark" }, stop: { left: "steady", right: "dark" } },
        note: "Right side dark on turn and stop. Going to look at the plug.",
      },
    },
  },
  {
    member: "driver",
    rig: "household",
    purpose: "hook-up",
    depth: "short",
    daysAgo: 27,
    at: "15:48",
    offlineMinutes: 52,
    marks: { lamps: { outcome: "good", note: "Right bulb was loose in its socket." } },
  },
  {
    member: "driver",
    rig: "household",
    purpose: "re-check",
    depth: "full",
    daysAgo: 27,
    at: "18:05",
    offlineMinutes: 2,
  },
  {
    member: "driver",
    rig: "household",
    purpose: "unhook",
    depth: "full",
    daysAgo: 27,
    at: "22:31",
    offlineMinutes: 640,
  },
  {
    member: "driver",
    rig: "household",
    purpose: "hook-up",
    depth: "full",
    daysAgo: 9,
    at: "14:20",
    offlineMinutes: 31,
    marks: { tires: { outcome: "fault", note: "Small cracks near the rim, left rear." } },
  },
  {
    member: "driver",
    rig: "household",
    purpose: "unhook",
    depth: "full",
    daysAgo: 8,
    at: "20:02",
    offlineMinutes: 4,
  },
  {
    member: "driver",
    rig: "household",
    purpose: "hook-up",
    depth: "full",
    daysAgo: 2,
    at: "16:40",
    offlineMinutes: 118,
  },
  {
    member: "fleetDriver",
    rig: "longCoach",
    purpose: "yard-out",
    depth: "full",
    daysAgo: 20,
    at: "13:05",
    offlineMinutes: 1,
  },
  {
    member: "fleetDriver",
    rig: "longCoach",
    purpose: "yard-in",
    depth: "full",
    daysAgo: 14,
    at: "21:40",
    offlineMinutes: 1,
    marks: {
      "cord-jacket": { outcome: "fault", note: "Scuffed through to the inner wires under the bar." },
    },
  },
  {
    member: "fleetDriver",
    rig: "longCoach",
    purpose: "yard-out",
    depth: "full",
    daysAgo: 12,
    at: "13:22",
    offlineMinutes: 2,
    marks: {
      "arm-right": { outcome: "fault", note: "No clip on the right pin." },
      "charge-line": { outcome: "good" },
    },
  },
  {
    member: "fleetDriver",
    rig: "longCoach",
    purpose: "yard-out",
    depth: "full",
    daysAgo: 11,
    at: "12:58",
    offlineMinutes: 1,
    marks: { "arm-left": { outcome: "fault" } },
    then: [{ check: "arm-left", outcome: "good", because: "fixed: ring snapped over the pin" }],
  },
  {
    member: "manager",
    rig: "shortCoach",
    purpose: "yard-out",
    depth: "full",
    daysAgo: 6,
    at: "14:10",
    offlineMinutes: 1,
    marks: { "charge-line": { outcome: "absent" } },
  },
  {
    member: "manager",
    rig: "shortCoach",
    purpose: "yard-in",
    depth: "full",
    daysAgo: 4,
    at: "19:30",
    offlineMinutes: 3,
    marks: {
      "wheel-heat": {
        outcome: "fault",
        note: "Left front much hotter than the right. Coach and car stay here until the shop has looked.",
      },
    },
  },
  {
    member: "fleetDriver",
    rig: "shortCoach",
    purpose: "re-check",
    depth: "full",
    daysAgo: 3,
    at: "17:15",
    offlineMinutes: 44,
    marks: { lamps: { outcome: "unseen", note: "Alone at a fuel stop, nobody to press the pedal." } },
  },
  {
    member: "fleetDriver",
    rig: "longCoach",
    purpose: "re-check",
    depth: "short",
    daysAgo: 1,
    at: "18:26",
    offlineMinutes: 6,
    brokenOffAfter: 4,
  },
];
