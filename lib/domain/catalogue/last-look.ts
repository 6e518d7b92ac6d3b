import { figure } from "../messages/catalogue-figures";
import { maybe, only } from "./conditions";
import { text, type Entry } from "./entry";
import { couplingRule, nextDriverRule, practice, treadRule } from "./origins";

export const lastLook: Entry[] = [
  {
    id: "joints",
    key: "joints",
    station: "last-look",
    effect: "hold",
    when: [only("every")],
    words: () => ({
      part: "last-look",
      ask: "Hands on every joint, no tire low",
      how: "Walk around once more without talking. Push and pull each arm, each pin and each plug by hand, and look at every tire. A prop that held a brake pedal down for the lamps is out.",
      why: "The check that is missed is the one that was interrupted.",
      mend: "Whatever moves that should not: go back to that station and look at it again.",
      origin: couplingRule,
    }),
  },
  {
    id: "jacks-up",
    key: "jacks-up",
    station: "last-look",
    effect: "hold",
    when: [maybe("jacks")],
    words: ({ jacks, airSuspension }) => {
      const both = jacks !== false && airSuspension !== false;
      const feet = "All feet of the coach are drawn up, well clear of the ground.";
      const air = "The coach’s air suspension stands at travel height.";
      return {
        part: "jacks",
        ...(!both && { drawn: "place" as const }),
        ask: both
          ? "Jacks up, air at travel height"
          : jacks === false
            ? "Coach at its travel height"
            : "Jacks all the way up",
        how: text(jacks !== false && feet, airSuspension !== false && air),
        why: text(
          jacks !== false && "A jack that is down tears off.",
          airSuspension !== false && "A coach that is low or high changes the angle of the bar.",
        ),
        mend: jacks === false ? "Wait until the coach has come to its height." : "Raise them and look again.",
        caution: "Stay out from under the coach while it moves up or down.",
        origin: practice,
      };
    },
  },
  {
    id: "tires",
    key: "tires",
    station: "last-look",
    effect: "fix",
    when: [only("every")],
    words: ({ sheet: { car } }) => ({
      part: "last-look",
      drawn: "tires",
      ask: "Car tires: none low, none cracked",
      how: "Look at the tread and both sidewalls of each tire. Cracks are easiest to see near the rim. All four are of one size.",
      why: "Nobody in the coach feels a flat tire on the car.",
      mend: "Fill a low tire to the pressure on the car’s door label. Cracked sidewalls: have the tire looked at.",
      who: "You for air, with the tires cold; a licensed shop for a cracked one.",
      measure: {
        quantity: "pressure",
        unit: "kPa",
        ask: "The lowest of the four, by the gauge",
        beside: text(
          car?.tirePressure
            ? `Cold, by the sheet: ${figure(car.tirePressure)}.`
            : "What it should be, cold, is on the car’s door label.",
          "Never let air out of a warm tire.",
        ),
      },
      origin: treadRule,
    }),
  },
  {
    id: "driver-shows",
    key: "driver-shows",
    station: "last-look",
    effect: "hold",
    when: [only("every")],
    words: ({ manual }) => ({
      part: "last-look",
      drawn: "place",
      ask: "The driver has hooked it up alone",
      how: text(
        "Whoever will drive has hooked the car up and taken it off, hands on, while you watched.",
        manual.says === "how" && "They did the manual’s page themselves and rolled the car a few feet.",
        "They know the highest speed, that the rig is never backed up, and that the car is held before any pin.",
      ),
      why: "What someone has only watched is not there on a wet evening at a campsite.",
      mend: "Let them do it again, with this list in hand.",
      origin: nextDriverRule,
    }),
  },
];
