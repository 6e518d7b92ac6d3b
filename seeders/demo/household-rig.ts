import type { Check, RevisionDocument } from "@/lib/domain/revision";
import * as check from "@/lib/domain/plain-checks";
import { plainDocument } from "@/lib/domain/plain-list";
import { feet, inches, milesPerHour, pounds } from "./quantities";

const sheet = {
  name: "Maple rig",
  coach: {
    description: "32 ft gas coach, front engine, one slide",
    chassis: "gasoline motorhome chassis, 22,000 lb",
    gvwr: pounds(22000),
    gcwr: pounds(26000),
    frontAxle: { rating: pounds(8000), loaded: pounds(7320), weighedOn: "2025-04-18" },
    rearAxle: { rating: pounds(15000), loaded: pounds(13840), weighedOn: "2025-04-18" },
    receiver: { rating: pounds(5000), height: inches(21.5) },
    socket: {
      type: "7-way blade",
      pins: { tail: "tail", left: "left and stop", right: "right and stop", ground: "ground" },
      measuredOn: "2025-04-20",
    },
    signals: "combined",
    engineBrakeLightsStopLamps: false,
    length: feet(32.5),
    wheelbase: inches(228),
    rearOverhang: inches(128),
  },
  car: {
    year: 2015,
    description: "five-door wagon, front-wheel drive, manual gearbox",
    gearbox: "manual, 5 speeds",
    curb: pounds(2780),
    loaded: pounds(3040),
    basePlateHeight: inches(17),
    lamps: { type: "filament", signals: "combined" },
    length: inches(172),
    wheelbase: inches(103),
  },
  gear: {
    towBar: {
      kind: "self-aligning, folds on the coach",
      rating: pounds(6500),
      serial: "A-20418",
      fitted: "2024-03-08",
    },
    basePlate: { kind: "two tabs, fixed", rating: pounds(5000), serial: "B-1177", fitted: "2024-03-08" },
    dropReceiver: { drop: inches(4), rating: pounds(5000), serial: "D-0932", fitted: "2024-03-08" },
    cables: { count: 2, rating: pounds(5000), lot: "C-2502", fitted: "2024-03-08" },
    cord: { kind: "coiled, 7 to 6", lot: "U-2411", fitted: "2024-03-08" },
    brake: { family: "portable pedal-mounted box, proportional", serial: "P-55102", fitted: "2024-03-08" },
    breakawaySwitch: { kind: "pull pin on the base plate, left", lot: "S-2501", fitted: "2024-03-08" },
  },
  wiring: {
    style: "separate bulbs in the housings",
    segments: [
      {
        from: "car socket",
        to: "rear harness",
        gaugeAwg: 16,
        length: feet(19),
        splices: 0,
        carries: ["tail", "left", "right", "ground"],
      },
      {
        from: "rear harness",
        to: "left bulb",
        gaugeAwg: 16,
        length: feet(4),
        splices: 1,
        carries: ["tail", "left"],
      },
      {
        from: "rear harness",
        to: "right bulb",
        gaugeAwg: 16,
        length: feet(7),
        splices: 1,
        carries: ["tail", "right"],
      },
    ],
    grounds: [{ at: "stud in the spare-wheel well", devices: ["left bulb", "right bulb", "rear harness"] }],
  },
  procedure: {
    source: "owner's manual of this car",
    page: "214",
    bar: "after the bar is attached",
    endState: "as printed on page 214, with the key and the selector as in its picture",
    engineRun: null,
    speedCap: milesPerHour(65),
    battery: "stays connected",
    fuse: "fuse 31 out while towing",
  },
};

const endState = check.hold({
  key: "end-state",
  part: "cabin",
  ask: "Cabin just as page 214 shows",
  how: "Open the owner's manual of this car at page 214. Key, selector and fuse 31 are as printed there, and the steering wheel turns freely.",
  why: "Only this car's own manual knows how it may roll. Another car's way can wreck its gearbox.",
  mend: "Do the page's steps again from the top, in its order.",
});

const brakeReady = check.hold({
  key: "brake-ready",
  kind: "brake-idle",
  part: "brake",
  ask: "Box ready, pedal all the way up",
  how: "The box stands against the seat, its ready light is on, and the pedal is all the way up.",
  why: "A pedal that is held down a little drags the brakes until they smoke.",
  mend: "Run the box's set-up again. Slide the seat until the arm just meets the pedal.",
});

const fuseBack = check.hold({
  key: "fuse-back",
  part: "fuse",
  ask: "Fuse 31 back in its place",
  how: "Look into the fuse box beside the steering column: place 31 is filled.",
  why: "The manual has it out only while towing. The car should not be driven without it.",
  mend: "Take the fuse from the clip on the sun visor and press it home.",
});

const cables = { ...check.cables, figures: { A: "5,000 lb each" } };
const lamps: Check = { ...check.lamps, lamps: { layout: "combined" } };

const hookUp = [
  check.coachHeld,
  check.receiverPins,
  check.basePlate,
  check.arm("left"),
  check.arm("right"),
  cables,
  check.cordAndLanyard,
  endState,
  check.steering,
  brakeReady,
  check.chocksOut,
  check.rolling,
  check.armsLocked,
  check.manualApply,
  lamps,
  check.joints,
  check.jacksUp,
  check.tires,
];
const unhook = [check.carHeld, check.linesOff, check.barStowed, fuseBack];

/** The household's rig: a bulb kit, a portable brake box and a fuse that the manual has out while towing. */
export const householdRig: RevisionDocument = plainDocument({
  sheet,
  catalogue: "hand-written 1",
  checks: {
    "coach-tail": [check.coachHeld, check.receiverPins, check.barStowed],
    "car-nose": [check.basePlate, check.arm("left"), check.arm("right")],
    "cables-and-cord": [cables, check.cordAndLanyard, check.linesOff],
    "car-cabin": [endState, check.steering, brakeReady, check.chocksOut, check.carHeld, fuseBack],
    pull: [check.rolling, check.armsLocked, check.manualApply, check.wheelHeat],
    "car-tail": [lamps],
    "last-look": [check.joints, check.jacksUp, check.tires],
  },
  walks: {
    "hook-up": hookUp,
    "re-check": [
      check.receiverPins,
      check.arm("left"),
      check.arm("right"),
      cables,
      check.cordAndLanyard,
      check.wheelHeat,
      lamps,
      check.tires,
    ],
    unhook,
    delivery: [...hookUp, ...unhook],
    "yard-out": hookUp,
    "yard-in": [...unhook, check.tires],
  },
});
