import type { RevisionDocument } from "@/lib/domain/revision";
import * as check from "@/lib/domain/plain-checks";
import { plainDocument } from "@/lib/domain/plain-list";
import { feet, inches, milesPerHour, pounds } from "./quantities";

const sheet = {
  name: "Bay 3 build",
  coach: {
    description: "40 ft diesel coach, rear engine, three slides",
    chassis: "diesel motorhome chassis, 36,400 lb",
    gvwr: pounds(36400),
    gcwr: pounds(46400),
    frontAxle: { rating: pounds(14600), loaded: pounds(13260), weighedOn: "2025-05-06" },
    rearAxle: { rating: pounds(22000), loaded: pounds(19480), weighedOn: "2025-05-06" },
    receiver: { rating: pounds(10000), height: inches(24) },
    socket: {
      type: "7-way blade",
      pins: {
        tail: "tail",
        left: "left and stop",
        right: "right and stop",
        ground: "ground",
        hot: "12 V with the key on",
      },
      measuredOn: "2025-05-07",
    },
    signals: "combined",
    engineBrakeLightsStopLamps: true,
    length: feet(40.2),
    wheelbase: inches(274),
    rearOverhang: inches(136),
  },
  car: {
    year: 2019,
    description: "two-door off-roader, four-wheel drive, removable top",
    gearbox: "automatic with a transfer case",
    curb: pounds(3970),
    loaded: pounds(4420),
    basePlateHeight: inches(21),
    lamps: { type: "filament", signals: "combined" },
    length: inches(167),
    wheelbase: inches(97),
  },
  gear: {
    towBar: {
      kind: "self-aligning, folds on the coach",
      rating: pounds(10000),
      serial: "A-31906",
      fitted: "2025-05-08",
    },
    basePlate: {
      kind: "two arms that come off the car",
      rating: pounds(8000),
      serial: "B-2240",
      fitted: "2025-05-08",
    },
    dropReceiver: { drop: inches(2), rating: pounds(10000), serial: "D-1410", fitted: "2025-05-08" },
    cables: { count: 2, rating: pounds(10000), lot: "C-2604", fitted: "2025-05-08" },
    shortCables: { count: 2, rating: pounds(10000), lot: "C-2604", fitted: "2025-05-08" },
    cord: { kind: "straight, in the bar", lot: "U-2603", fitted: "2025-05-08" },
    airLine: { kind: "coiled line from the coach's air", lot: "L-2602", fitted: "2025-05-11" },
    brake: { family: "air-assisted, installed in the car", serial: "N-0778", fitted: "2025-05-11" },
    breakawaySwitch: {
      kind: "pull pin with its own air tank on the car",
      lot: "S-2602",
      fitted: "2025-05-11",
    },
  },
  wiring: {
    style: "diodes into the car's lamps",
    segments: [
      {
        from: "car socket",
        to: "diode block",
        gaugeAwg: 14,
        length: feet(12),
        splices: 0,
        carries: ["tail", "left", "right", "ground"],
      },
      {
        from: "diode block",
        to: "left lamp",
        gaugeAwg: 16,
        length: feet(5),
        splices: 1,
        carries: ["tail", "left"],
      },
      {
        from: "diode block",
        to: "right lamp",
        gaugeAwg: 16,
        length: feet(9),
        splices: 1,
        carries: ["tail", "right"],
      },
    ],
    grounds: [{ at: "frame, left rear corner", devices: ["left lamp", "right lamp", "diode block"] }],
  },
  procedure: {
    source: "owner's manual of this car",
    page: "412",
    bar: "before the bar is attached",
    endState: "as printed on pages 412 and 413, the last step of page 413 proved",
    engineRun: null,
    speedCap: milesPerHour(70),
    battery: "stays connected, charge line from the coach",
    fuse: null,
  },
};

const shortCables = check.hold({
  key: "short-cables",
  part: "short-cables",
  ask: "Short pair on the removable arms",
  how: "Each removable arm of the base plate has its own short cable to the car's frame, link screwed shut.",
  why: "Without them, an arm that comes out of the plate takes the long cables along.",
  mend: "Hook the short pair on and screw both links shut.",
});

const endState = check.hold({
  key: "end-state",
  part: "cabin",
  ask: "Cabin just as page 413 ends",
  how: "Compare with pages 412 and 413 of this car's manual, and do the proof that the last step asks for. The steering wheel turns freely.",
  why: "Only this car's own manual knows how it may roll. Another car's way can wreck its driveline.",
  mend: "Start again at the top of page 412.",
});

const brakeReady = check.hold({
  key: "brake-ready",
  part: "brake-air",
  ask: "Air up, pedal all the way up",
  how: "The coach's air is up and the monitor lamp in the coach is on. The car's pedal is all the way up and its stop lamps are dark.",
  why: "A pedal that stays down a little drags the brakes all day.",
  mend: "Press the pedal by hand and let go. If it does not come back, look at the cylinder's bracket.",
});

const hookUp = [
  check.receiverPins,
  check.arm("left"),
  check.arm("right"),
  check.cables,
  shortCables,
  check.cordAndLanyard,
  check.cordJacket,
  check.airLine,
  endState,
  brakeReady,
  check.rolling,
  check.lamps,
  check.joints,
];
const unhook = [check.carHeld, check.linesOff, check.barStowed];

/** The rig on the shop's floor: air-assisted brake, diode wiring, a base plate whose arms come off. */
export const shopRig: RevisionDocument = plainDocument({
  sheet,
  catalogue: "hand-written 1",
  checks: {
    "coach-tail": [check.receiverPins, check.barStowed],
    "car-nose": [check.arm("left"), check.arm("right")],
    "cables-and-cord": [
      check.cables,
      shortCables,
      check.cordAndLanyard,
      check.airLine,
      check.cordJacket,
      check.linesOff,
    ],
    "car-cabin": [endState, brakeReady, check.carHeld],
    pull: [check.rolling, check.wheelHeat],
    "car-tail": [check.lamps],
    "last-look": [check.joints],
  },
  walks: {
    "hook-up": hookUp,
    "re-check": [
      check.receiverPins,
      check.arm("left"),
      check.arm("right"),
      check.cables,
      shortCables,
      check.airLine,
      check.cordJacket,
      check.wheelHeat,
      check.lamps,
    ],
    unhook,
    delivery: [...hookUp, ...unhook],
    "yard-out": hookUp,
    "yard-in": unhook,
  },
});
