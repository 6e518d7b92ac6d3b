import type { Check, RevisionDocument } from "@/lib/domain/revision";
import * as check from "@/lib/domain/plain-checks";
import { plainDocument, type PlainList } from "@/lib/domain/plain-list";
import { longCoachSheet, shortCoachSheet } from "./fleet-sheets";

const brakeBox = check.hold({
  key: "brake-ready",
  part: "brake",
  ask: "Box ready, pedal all the way up",
  how: "The floor mat is out, the box stands against the seat and its ready light is on. The pedal is all the way up and the car's stop lamps are dark.",
  why: "A pedal that is held down a little drags the brakes until they smoke.",
  mend: "Take the mat out and run the box's set-up again.",
});

const installedBrake = check.hold({
  key: "brake-ready",
  part: "monitor",
  ask: "Controller lit, pedal fully up",
  how: "The controller in the coach shows that it is ready. The car's pedal is all the way up and its stop lamps are dark.",
  why: "The brake in the car takes its power through the cord. Dark here means no brake there.",
  mend: "Seat the cord's plugs, then look at the fuse of the charge line.",
});

const lightBar = check.hold({
  key: "light-bar",
  part: "light-bar",
  ask: "Light bar on, both straps tight",
  how: "The bar lies across the hatch with both straps tight and its plug home. The plate is not covered.",
  why: "A bar that slides off hangs by its wire, and the car is dark from behind.",
  mend: "Clean the glass, set the bar again and pull both straps.",
});

const chargeLine = check.fix({
  key: "charge-line",
  part: "charge-line",
  ask: "Charge line plugged in",
  how: "On the newer cord there is a thin second plug beside the large one. It is in its socket.",
  why: "Without it the car's battery may be flat at the end of the day.",
  mend: "Plug it in. Start the car before the next leg if it was out for long.",
  mayBeAbsent: true,
});

/** What the cabin must look like, by the page of that car's own manual. */
function endState(page: string, proof: string): Check {
  return check.hold({
    key: "end-state",
    part: "cabin",
    ask: `Cabin just as page ${page} shows`,
    how: `The page is in the door pocket, laminated. ${proof} The steering wheel turns freely.`,
    why: "Only this car's own manual knows how it may roll. Another car's way can wreck its driveline.",
    mend: "Do the page's steps again from the top, in its order.",
  });
}

/** What both of the fleet's lists have in common; `tail` is what there is to see at the car's tail. */
function list(brake: Check, cabin: Check, tail: Check[]): Omit<PlainList, "sheet"> {
  const hookUp = [
    check.receiverPins,
    check.arm("left"),
    check.arm("right"),
    check.cables,
    check.cordAndLanyard,
    check.cordJacket,
    chargeLine,
    cabin,
    brake,
    check.rolling,
    ...tail,
    check.joints,
    check.tires,
  ];
  const onTheWay = [
    check.receiverPins,
    check.arm("left"),
    check.arm("right"),
    check.cables,
    check.cordAndLanyard,
    check.wheelHeat,
    ...tail,
    check.tires,
  ];
  const unhook = [check.carHeld, check.linesOff, check.barStowed];
  return {
    catalogue: "hand-written 1",
    checks: {
      "coach-tail": [check.receiverPins, check.barStowed],
      "car-nose": [check.arm("left"), check.arm("right")],
      "cables-and-cord": [check.cables, check.cordAndLanyard, chargeLine, check.cordJacket, check.linesOff],
      "car-cabin": [cabin, brake, check.carHeld],
      pull: [check.rolling, check.wheelHeat],
      "car-tail": tail,
      "last-look": [check.joints, check.tires],
    },
    walks: {
      "hook-up": hookUp,
      "re-check": onTheWay,
      unhook,
      delivery: [...hookUp, ...unhook],
      "yard-out": hookUp,
      "yard-in": [check.wheelHeat, ...unhook, check.cordJacket, check.tires],
    },
  };
}

/** The fleet's long coach with the pickup: a brake installed in the car, its lamps on diodes. */
export const longCoachRig: RevisionDocument = plainDocument({
  sheet: longCoachSheet,
  ...list(installedBrake, endState("301", "Every step on it is done and its last line is proved."), [
    { ...check.lamps, lamps: { layout: "separate" } },
  ]),
});

/** The fleet's short coach with the hatchback: a portable box and a removable light bar. */
export const shortCoachRig: RevisionDocument = plainDocument({
  sheet: shortCoachSheet,
  ...list(brakeBox, endState("188", "Every step on it is done, the engine run before it too."), [
    lightBar,
    check.lamps,
  ]),
});
