import { maybe, only } from "./conditions";
import { text, type Entry } from "./entry";
import type { Facts } from "./facts";
import { couplingRule, practice } from "./origins";

const holds = {
  straps: { ask: "Light bar on, straps tight", how: "Both straps are tight." },
  magnets: {
    ask: "Light bar on, magnets hold",
    how: "Both magnets sit on clean steel and do not slide by hand.",
  },
  brackets: { ask: "Light bar on, brackets closed", how: "Both brackets are closed and pinned." },
};

/** Whether the car's brake works by its pedal, and so lights its own stop lamps; unknown counts as yes. */
const pressesPedal = ({ brake }: Facts) => brake !== "none" && brake !== "hydraulic" && brake !== "surge";

function lampsHow(facts: Facts): string {
  const { wiring } = facts.sheet;
  return text(
    "Stand behind the car and look at both sides each time: tail, left, right, stop, hazard, stop with left, stop with right.",
    pressesPedal(facts) && "The brake unit is on and set as for the road while you look.",
    wiring?.converter === "two-to-three" &&
      "With this converter the hazards may show as red pulses: compare with what this rig did when it was known to be right.",
  );
}

function lampsWhy(facts: Facts): string {
  return text(
    "The arrow on the dash does not show what the car’s lamps do.",
    pressesPedal(facts) && "Stop with turn is where a brake that presses the pedal hides the turn.",
  );
}

export const carTail: Entry[] = [
  {
    id: "light-bar",
    key: "light-bar",
    station: "car-tail",
    effect: "hold",
    when: [maybe("lightBar")],
    words: ({ sheet: { gear } }) => {
      const { heldBy, power } = gear?.lightBar ?? {};
      const own = power === "own-battery";
      const drawnSo = heldBy === "straps" && !own;
      const held = heldBy
        ? holds[heldBy]
        : { ask: "Light bar on, both ends held", how: "Both ends are held." };
      return {
        part: "light-bar",
        // Its drawing has straps and a cord.
        ...(!drawnSo && { drawn: "place" as const }),
        ask: held.ask,
        how: text(
          "The light bar sits where it can be seen from behind and does not move by hand.",
          held.how,
          own && "Its battery is charged, as its own manual shows it.",
          power === "cord" && "Its cord is home and does not hang.",
          !power && "Its cord is home and does not hang, or its battery is charged.",
          "The plate is in view.",
        ),
        why: "A bar that slides off hangs by its wire or is gone, and the car is dark from behind.",
        mend: "Clean where it sits, set the bar again and make fast what holds it.",
        touches: ["lamps"],
        origin: practice,
      };
    },
  },
  {
    id: "trailer-plug",
    key: "trailer-plug",
    station: "car-tail",
    effect: "fix",
    when: [only("trailerPlug")],
    words: () => ({
      part: "lamps",
      drawn: "place",
      ask: "Trailer plug seated, wire tied up",
      how: "The plug is all the way in and its wire clears the tires and the road.",
      why: "A plug that shakes loose takes all lamps with it.",
      mend: "Seat the plug and tie the wire up.",
      touches: ["lamps"],
      origin: practice,
    }),
  },
  {
    id: "lamps",
    key: "lamps",
    station: "car-tail",
    effect: "hold",
    when: [only("every")],
    words: (facts) => ({
      kind: "lamps",
      part: "lamps",
      ask: "Each lamp answers its signal",
      how: lampsHow(facts),
      why: lampsWhy(facts),
      mend: "Seat the plugs first, then look at the ground. A dark lamp on one side only is often its bulb.",
      who: "You for plugs and bulbs; a licensed shop for the wiring.",
      touches: ["cord", "light-bar", "trailer-plug"],
      origin: couplingRule,
      ...(facts.layout && { lamps: { layout: facts.layout } }),
    }),
  },
];
