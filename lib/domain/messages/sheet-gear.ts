import type { gearFields, GearKey } from "../sheet/gear";
import type { FieldWords, WordsOf } from "./sheet-vehicles";

const words = (label: string, where: string): FieldWords => ({ label, where });

const RATING = "Stamped or on a sticker on the part itself, or in its manual.";
const piece = {
  description: words("In your words", "What someone would know this piece by."),
  serial: words("Serial number", "Stamped or on a sticker on the part."),
  lot: words("Lot or batch", "On the tag or the box it came in."),
  fittedOn: words("Fitted on", "On the job card, or the day you put it on."),
};
const bolted = {
  ...piece,
  torqueRecord: words(
    "Torque record",
    "Where the record of this fitting lies: job card, folder, wrench. The values are the part maker’s.",
  ),
};

/** What each piece of gear is called. */
export const gearNames: Record<GearKey, string> = {
  dropReceiver: "Drop receiver",
  towBar: "Tow bar",
  coupler: "Ball or pintle hook",
  basePlate: "Base plate",
  cables: "Safety cables",
  shortCables: "Short cables at the plate",
  cord: "Cord",
  chargeLine: "Charge line",
  airLine: "Air line",
  brake: "Supplemental brake",
  breakaway: "Breakaway switch",
  lightBar: "Light bar",
};

export const gearWords: { [K in GearKey]: WordsOf<(typeof gearFields)[K]> } = {
  dropReceiver: {
    there: words(
      "There is a drop receiver",
      "Between the coach’s receiver and the bar: a piece that goes down or up.",
    ),
    offset: words("By how much", "Center of one opening to the center of the other."),
    direction: words("Which way", "Drop: the bar sits lower than the coach’s receiver."),
    rating: words("Rating", RATING),
    ...bolted,
  },
  towBar: {
    coupling: words(
      "How it holds at the coach",
      "Direct: its shank goes into the receiver. Otherwise a coupler on a ball, or a ring on a pintle hook.",
    ),
    stowsOn: words("Where it stays folded", "On the coach’s tail or on the car’s nose."),
    armEnds: words(
      "How its arms hold at the car",
      "A pin through two tabs, or an end that snaps or twists in.",
    ),
    selfAligning: words(
      "Arms slide and lock",
      "Arms that slide out to meet the car and lock when it is pulled.",
    ),
    rating: words("Rating", RATING),
    slopeLimit: words(
      "How far out of level, at most",
      "In the bar’s manual. Not known is better than a rule of thumb.",
    ),
    armLength: words("Arm length, pulled out", "Coach’s end to the car’s end with both arms locked."),
    ...bolted,
  },
  coupler: {
    ballSize: words(
      "Ball diameter",
      "Stamped on top of the ball. The coupler has its own size stamped on it: they are the same.",
    ),
    rating: words("Rating", RATING),
    ...bolted,
  },
  basePlate: {
    arms: words("Its arms", "Removable: the visible arms come off the car when it is driven."),
    rating: words("Rating", RATING),
    tabSpacing: words("Tab to tab", "Center of the left tab to center of the right."),
    ...bolted,
  },
  cables: {
    count: words("How many", "Between the vehicles, not counting short ones at the plate."),
    rating: words("Rating of each", "On the tag at the cable’s end."),
    length: words("Length", "Hook to hook, pulled straight."),
    ...piece,
  },
  shortCables: {
    there: words("There is a short pair", "From each removable arm to the car’s frame."),
    rating: words("Rating of each", "On the tag at the cable’s end."),
    ...piece,
  },
  cord: {
    shape: words("Shape", "Coiled takes up its own slack; straight is tied to the bar or lies in it."),
    carEnd: words("Socket at the car", "At the car’s nose, or none where the cord stays on the car."),
    length: words("Length", "Plug to plug, not pulled."),
    ...piece,
  },
  chargeLine: {
    there: words("There is a charge line", "A wire that keeps the car’s battery up from the coach."),
    plug: words("How it is plugged", "In the cord’s own plug, or a thin second plug beside it."),
    fuseAmps: words(
      "Fuse at the car’s battery, in amperes",
      "Within a hand of the battery. The number on the fuse.",
    ),
    gaugeAwg: words("Wire gauge, AWG", "Printed on the wire."),
    ...piece,
  },
  airLine: {
    there: words("There is an air line", "A hose with a coupling between the vehicles."),
    ...piece,
  },
  brake: {
    family: words(
      "What kind it is",
      "A box at the pedal, a unit built into the car, or worked by air, fluid or the bar.",
    ),
    proportional: words(
      "Brakes in proportion",
      "In its manual. Proportional follows how hard the coach brakes; the others are on or off.",
    ),
    manualApply: words("Control in the coach", "A switch or lever that puts the car’s brake on by hand."),
    monitor: words("Monitor in the coach", "A lamp or display that shows what the unit does."),
    boosterMode: words(
      "Set for an electric booster",
      "In the unit’s menu, where its manual has such a mode.",
    ),
    poweredFrom: words(
      "Takes its power from",
      "The outlet, the car’s battery or the coach, and the fuse that is for it.",
    ),
    ...piece,
  },
  breakaway: {
    there: words(
      "There is a breakaway switch",
      "A switch with a pin on a lanyard: the car brakes itself if it comes away.",
    ),
    anchor: words(
      "Lanyard’s point on the coach",
      "A point of its own on the coach’s frame: not bar, ball, drop receiver or cable.",
    ),
    switchAt: words(
      "Where the switch sits",
      "Better not on the base plate alone, so that it stays when that goes.",
    ),
    battery: words("Power for it", "Which battery or tank works the brake when the pin is out."),
    lastPulledOn: words("Pin last pulled on", "The last day someone pulled it and saw the brake hold."),
    ...piece,
  },
  lightBar: {
    heldBy: words("Held by", "What keeps it on the car."),
    power: words("Power", "From the cord, or a battery of its own."),
    ...piece,
  },
};
