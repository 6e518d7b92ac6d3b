import { maybe, only, unless, unsaid } from "./conditions";
import { text, type Entry } from "./entry";
import { makersManual, practice, reCheckRule, trackingRule } from "./origins";

const HELD = "Secure the car first: parking brake on, wheels chocked.";
const CLEAR = "Nobody between the vehicles while the coach moves.";
const locked = { key: "arms-locked", station: "pull", effect: "hold" } as const;

export const pull: Entry[] = [
  {
    id: "wheels-roll",
    key: "wheels-roll",
    station: "pull",
    effect: "hold",
    when: [only("every")],
    words: ({ aligning, jacks, airSuspension }) => ({
      part: "wheels",
      // Its drawing has arms that slide.
      ...(!aligning && { drawn: "place" as const }),
      ask: "All four car wheels roll",
      how: text(
        "Pull forward a few feet, straight, and stop. Someone beside the rig sees all four car wheels turn and the front ones follow.",
        aligning && "Both arms come out and lock.",
      ),
      why: "A wheel that slides means a brake is on or a column is locked. Wheels that roll prove that nothing drags, not that the drivetrain is right: a car in first gear rolls too.",
      mend: "Stop. Go back to the cabin and compare with the manual’s page again.",
      caution: text(
        CLEAR,
        jacks !== false && "Any jack of the coach is up before it moves.",
        airSuspension && "Its air suspension is at travel height.",
      ),
      touches: ["end-state", "steering-free", "chocks-out"],
      origin: makersManual("tow bars"),
    }),
  },
  {
    ...locked,
    id: "arms-locked",
    when: [only("aligning")],
    words: () => ({
      part: "arms-locked",
      ask: "Both arms out and locked, tugged",
      how: "After pulling forward: each arm is all the way out and its latch is home. Push and pull each one by hand.",
      why: "An arm that is not locked slides in when the coach brakes, and the car weaves.",
      mend: "Pull forward again, straight and slowly, or follow the bar’s own manual. No hammer.",
      caution: `Hands out of the latch while the coach can move. ${HELD}`,
      touches: ["arm-left", "arm-right"],
      origin: makersManual("self-aligning tow bars"),
    }),
  },
  {
    ...locked,
    id: "bar-rigid",
    when: [unless("aligning")],
    words: () => ({
      part: "arms-locked",
      drawn: "place",
      ask: "Bar without play, both sides tugged",
      how: "After pulling forward: the car stands in line. Push and pull the bar by hand on both sides. Nothing gives at the car or at the coach.",
      why: "Play grows on the road until something works out or the car swings from side to side.",
      mend: "Look at what holds the bar on both sides again. Worn joints: the bar is not used.",
      who: "You for what pins and clips hold; a licensed shop for the bar.",
      caution: `Hands off the bar while the coach can move. ${HELD}`,
      touches: ["arm-left", "arm-right"],
      origin: trackingRule,
    }),
  },
  {
    ...locked,
    id: "bar-unsaid",
    when: [unsaid("aligning")],
    words: () => ({
      part: "arms-locked",
      drawn: "place",
      ask: "Bar drawn out, locked, tugged",
      how: "After pulling forward: arms that slide are all the way out with their latches home. Push and pull the bar by hand on both sides. Nothing gives.",
      why: "An arm that is not locked slides in when the coach brakes, and the car weaves.",
      mend: "Pull forward again, straight and slowly, or follow the bar’s own manual. No hammer.",
      caution: `Hands out of the latch while the coach can move. ${HELD}`,
      touches: ["arm-left", "arm-right"],
      origin: makersManual("tow bars"),
    }),
  },
  {
    id: "manual-apply",
    key: "manual-apply",
    station: "pull",
    effect: "hold",
    when: [maybe("manualApply")],
    words: () => ({
      part: "manual-apply",
      ask: "Brake answers the coach’s control",
      how: "Use the control in the coach at walking pace: the car’s brake is felt, or someone beside the rig sees its pedal go down and come up again.",
      why: "A unit that shows ready may still not reach the pedal.",
      mend: "Run the unit’s set-up again, as its manual has it.",
      caution: CLEAR,
      touches: ["brake-ready"],
      origin: makersManual("supplemental brakes"),
    }),
  },
  {
    id: "wheel-heat",
    key: "wheel-heat",
    station: "pull",
    effect: "hold",
    when: [only("every")],
    words: ({ brake, sheet: { coach } }) => ({
      part: "wheels",
      drawn: "standing",
      ask: "No hot wheel, no low tire",
      how: "Hold the back of a hand near each car wheel, without touching. Compare left with right. Straight off a long grade, wait first. No tire is low.",
      why: text(
        "One hot wheel means a brake that drags, or a bearing, and a soft tire runs hot until it comes apart.",
        coach?.engineBrakeLightsStopLamps &&
          brake !== "none" &&
          "This coach’s engine brake lights its stop lamps: a car brake that follows them is on all the way down a grade.",
      ),
      mend: text(
        "Let it cool. Look whether the parking brake is off.",
        brake !== "none" && "Look whether the car’s brake pedal is held down.",
        "Then roll a few feet and feel again. Fill a low tire once it is cold.",
      ),
      who: "You for air; a licensed shop where a wheel stays hot.",
      caution: "A hot wheel or hub can burn a hand.",
      touches: ["brake-ready", "chocks-out"],
      origin: reCheckRule,
    }),
  },
  {
    id: "tire-scrub",
    key: "tire-scrub",
    station: "pull",
    effect: "fix",
    when: [only("every")],
    words: () => ({
      part: "wheels",
      drawn: "standing",
      ask: "Tire treads even, none scrubbed",
      how: "Look at each car tire’s tread for a flat spot, feathered edges or one shoulder worn away. Compare left with right.",
      why: "A scrubbed tire shows that a wheel was dragged, or that the bar or the alignment is off.",
      mend: "Ask the driver what happened. Have the alignment and the tire looked at before the next trip.",
      who: "A licensed shop.",
      touches: ["tires"],
      origin: practice,
    }),
  },
];
