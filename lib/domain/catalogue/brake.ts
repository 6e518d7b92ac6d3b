import { maybe, only, unsaid } from "./conditions";
import { text, type Entry, type Words } from "./entry";
import type { Facts } from "./facts";
import { makersManual } from "./origins";

const ready = { key: "brake-ready", station: "car-cabin", effect: "hold" } as const;
const pedalWhy = "A pedal that is held down a little drags the brakes until they smoke.";
const shared = {
  why: pedalWhy,
  who: "You, by the brake’s own manual; a licensed shop for the unit and its lines.",
  touches: ["lamps", "manual-apply"],
} satisfies Partial<Words>;

const boxHow = ({ sheet: { car, gear } }: Facts) =>
  text(
    "The unit stands against the seat with the floor mat out, its arm clamped to the pedal, and its ready light is lit. The pedal is all the way up.",
    car?.adjustablePedals && "Pedals that adjust are nearest the seat.",
    car?.booster !== "electric" &&
      car?.booster !== "none" &&
      "Where the unit’s manual wants no vacuum left in the booster, the pedal went hard before the unit was set.",
    car?.booster === "electric" &&
      (gear?.brake?.boosterMode
        ? "Its menu shows the mode for an electric booster, as its manual has it."
        : "This car has an electric booster: the unit’s manual says which mode that wants."),
    gear?.brake?.poweredFrom && `Its power, by the sheet: ${gear.brake.poweredFrom}.`,
  );

const builtInHow = ({ sheet: { car, gear } }: Facts) =>
  text(
    gear?.brake?.monitor === false
      ? "The unit shows that it is ready, as its own manual has it. Nothing stands at the pedal, and it is all the way up."
      : "The monitor in the coach is on, its ready lamp lit, its fault lamp dark. In the car the pedal is all the way up.",
    car?.adjustablePedals && "Pedals that adjust are where the unit’s manual wants them.",
    gear?.brake?.poweredFrom && `Its power, by the sheet: ${gear.brake.poweredFrom}.`,
  );

/** The brake that is set and idle, for each family of them. */
export const brakeReady: Entry[] = [
  {
    ...ready,
    id: "brake-box",
    when: [only("brake"), only("brakeBox")],
    words: (facts) => ({
      ...shared,
      kind: "brake-idle",
      part: "brake",
      ask: "Box ready, pedal all the way up",
      how: boxHow(facts),
      mend: "Run the box’s set-up again, as its manual has it, with the seat where that wants it.",
      origin: makersManual("brakes that stand at the pedal"),
    }),
  },
  {
    ...ready,
    id: "brake-built-in",
    when: [only("brake"), only("brakeBuiltIn")],
    words: (facts) => ({
      ...shared,
      kind: "brake-idle",
      ...(facts.sheet.gear?.brake?.monitor === false
        ? { part: "brake", drawn: "installed" }
        : { part: "monitor" }),
      ask: "Brake ready, pedal all the way up",
      how: builtInHow(facts),
      mend: "Seat the cord’s plugs, look at the fuse of the unit’s power, then at the page for faults in its manual.",
      origin: makersManual("brakes that are built in"),
    }),
  },
  {
    ...ready,
    id: "brake-air",
    when: [only("brake"), only("brakeAir")],
    words: ({ sheet: { gear } }) => ({
      ...shared,
      kind: "brake-idle",
      part: "brake-air",
      // Its drawing has a monitor lamp.
      ...(gear?.brake?.monitor !== true && { drawn: "place" as const }),
      ask: "Air up, pedal all the way up",
      how: text(
        "The coach’s air is up and nothing hisses. In the car the cylinder’s rod is in and the pedal is up on its stop.",
        gear?.brake?.monitor !== false &&
          "The brake’s lamp in the coach is lit while the coach’s brake pedal is down.",
      ),
      mend: "Press the car’s pedal by hand and let go. If it does not come back, look at the cylinder’s bracket. A hiss: look at the line for a chafed place.",
      origin: makersManual("brakes on the coach’s air"),
    }),
  },
  {
    ...ready,
    id: "brake-hydraulic",
    when: [only("brake"), only("brakeHydraulic")],
    words: () => ({
      ...shared,
      part: "brake-hydraulic",
      ask: "Brake line coupled, dry, pedal firm",
      how: "The coupling’s nose is all the way in and its sleeve home. It is dry, and so is the ground below it. The coach’s brake pedal is firm.",
      why: "Fluid lost here is lost to the coach’s own brakes.",
      mend: "Stop. Couple it again and wipe it dry. If it drips again, or the pedal is soft, neither vehicle moves until a shop has seen it.",
      caution: "Brake fluid hurts eyes and paint.",
      origin: makersManual("brakes on a line of fluid"),
    }),
  },
  {
    ...ready,
    id: "brake-surge",
    when: [only("brake"), only("brakeSurge")],
    words: () => ({
      ...shared,
      part: "brake-surge",
      ask: "Brake cable slack, pedal fully up",
      how: "With the rig at rest the cable is hooked on and hangs slack on both sides, and the car’s pedal is up on its stop. Where its stop lamps lit with the pedal pressed, they are dark now.",
      mend: "Level the rig and roll it forward a little so that the bar’s head comes out. A cable that stays taut is set by the bar’s own manual.",
      caution:
        "This brake comes on when the rig is pushed back, and when the bar is out of level. Do not back up.",
      origin: makersManual("bars with a brake of their own"),
    }),
  },
  {
    ...ready,
    id: "brake-unsaid",
    when: [unsaid("brake")],
    words: () => ({
      ...shared,
      kind: "brake-idle",
      part: "brake",
      drawn: "place",
      ask: "Brake ready, pedal all the way up",
      how: "The car’s brake for towing shows what its own manual calls ready, and the pedal is all the way up. If the car has no such brake, mark Fault.",
      mend: "Run its set-up again, as its own manual has it. Write on the sheet what kind it is.",
      origin: makersManual("supplemental brakes"),
    }),
  },
  {
    id: "monitor",
    key: "monitor",
    // It is seen from the coach's seat, where the pull begins.
    station: "pull",
    effect: "fix",
    when: [maybe("monitor")],
    words: () => ({
      part: "monitor",
      ask: "Brake monitor on, no fault shown",
      how: "The monitor stands where the driver sees it. It is on, its ready lamp is lit and its fault lamp is dark.",
      why: "A unit that stops working on the way says so here or nowhere.",
      mend: "Look the lamp or the word up in the unit’s own manual.",
      touches: ["brake-ready"],
      origin: makersManual("supplemental brakes"),
    }),
  },
];
