import type { Check } from "./revision";

const HELD = "Secure the car first: parking brake on, wheels chocked.";

type Words = Pick<Check, "key" | "part" | "ask" | "how" | "why" | "mend"> & Partial<Check>;

/** A look at a part whose fault means do not tow. */
export function hold(words: Words): Check {
  return { kind: "look", effect: "hold", mayBeAbsent: false, ...words };
}

/** A look at a part whose fault should be seen to soon. */
export function fix(words: Words): Check {
  return { kind: "look", effect: "fix", mayBeAbsent: false, ...words };
}

export const coachHeld = hold({
  key: "coach-held",
  part: "coach-held",
  ask: "Coach braked, car chocked",
  how: "The coach’s parking brake is set and its lamp is lit. A chock stands on each side of one car wheel. The ground is level.",
  why: "Between the vehicles is where people are crushed. Nothing may move while someone stands there.",
  mend: "Set the brake, chock the car, and come back only then.",
  caution: "Nobody between the vehicles while either can move.",
});

export const receiverPins = hold({
  key: "receiver-pins",
  part: "receiver",
  ask: "Receiver pins in, clips closed",
  how: "Two pins: one through the receiver, one through the drop receiver. Each goes all the way through, with its clip closed through its end.",
  why: "These pins hold everything behind the coach. A pin that walks out lets the whole bar slide out.",
  mend: "Push the pin through and close its clip. Replace a pin that is bent or worn.",
  who: "You, with a pin and clip of the maker’s kind. Cracked welds: a licensed shop.",
  touches: ["cables", "cord-and-lanyard"],
});

export const basePlate = hold({
  key: "base-plate",
  part: "base-plate",
  ask: "Base plate: none loose, no crack",
  how: "Take each tab by hand, push down and pull up. The car may rise on its springs; the plate itself does not move. Look at the paint around the fasteners.",
  why: "Everything between the vehicles hangs on this plate, the safeguards too.",
  mend: "Do not tighten it by feel. The plate’s own manual has the way, and a crack is not mended at a campsite.",
  who: "A licensed shop, by the plate maker’s manual.",
  touches: ["arm-left", "arm-right", "cables"],
});

/** One arm of the tow bar at the car's base plate. */
export function arm(side: "left" | "right"): Check {
  const name = side === "left" ? "Left" : "Right";
  return hold({
    key: `arm-${side}`,
    part: "arm",
    side,
    ask: `${name} arm: pin in, clip over it`,
    how: `Look at the ${side} arm where it meets the car. The pin is all the way down and the ring of the clip is snapped over its end.`,
    why: "A clip that is not over the pin shakes out on the road, and one arm alone does not hold a car in line.",
    mend: "Seat the pin to its full depth, then snap the ring over. Use the clip that belongs to this bar.",
    who: "You, with the clip that belongs to this bar.",
    touches: ["cables", "arms-locked"],
    caution: `The arm can drop on a hand when a pin comes out. ${HELD}`,
  });
}

export const cables = hold({
  key: "cables",
  part: "cables",
  ask: "Cables crossed, links screwed shut",
  how: "Both cables run from frame to frame and cross under the bar. Every link is screwed shut, and nothing hangs near the ground.",
  why: "If the bar lets go, the cables are what keeps the car behind the coach. Crossed, they also hold the bar up.",
  mend: "Cross them under the bar and screw each link closed. A cable with broken strands is replaced, not taped.",
  touches: ["cord-and-lanyard"],
});

export const cordAndLanyard = hold({
  key: "cord-and-lanyard",
  part: "cord",
  ask: "Cord latched, lanyard on the frame",
  how: "The cord is latched at both ends. The lanyard is hooked to the coach's frame, not to the bar or a cable, and has slack for a full turn.",
  why: "A lanyard on the bar leaves with the bar and never pulls the breakaway switch.",
  mend: "Latch the plugs. Move the lanyard to its own point on the frame.",
  touches: ["lamps"],
});

export const airLine = hold({
  key: "air-line",
  part: "air-line",
  ask: "Air line coupled, no hiss",
  how: "The coupling is home and does not come off with a tug. Listen at both ends with the coach's air up.",
  why: "Without air the car's brake does not work and the coach loses pressure.",
  mend: "Couple it again. If it still hisses, look at the seal and the line for a chafed place.",
});

export const steering = hold({
  key: "steering-free",
  part: "steering",
  ask: "Steering wheel turns both ways",
  how: "Turn the wheel by hand a little both ways. The column does not catch.",
  why: "A locked column drags the front tires sideways until they come apart.",
  mend: "Compare key and selector with the manual’s page again.",
  touches: ["end-state", "wheels-roll"],
});

export const chocksOut = hold({
  key: "chocks-out",
  part: "parking-brake",
  ask: "Parking brake off, chocks out",
  how: "The bar is attached. The lamp of the car’s parking brake is dark, and no chock is left at a wheel.",
  why: "A brake that stays on burns within a few miles, and nobody in the coach feels it.",
  mend: "Release it and look at the lamp again. Stow the chocks where they are counted.",
  touches: ["wheels-roll"],
});

export const armsLocked = hold({
  key: "arms-locked",
  part: "arms-locked",
  ask: "Both arms out and locked, tugged",
  how: "After pulling forward a few feet: each arm is all the way out and its latch is home. Push and pull each one by hand.",
  why: "An arm that is not locked slides in when the coach brakes.",
  mend: "Pull forward again, straight and slowly, or follow the bar’s own manual. No hammer.",
  caution: `Hands out of the latch while the coach can move. ${HELD}`,
  touches: ["arm-left", "arm-right"],
});

export const manualApply = hold({
  key: "manual-apply",
  part: "manual-apply",
  ask: "Brake answers the coach’s control",
  how: "Use the control in the coach at walking pace: the car’s brake is felt, or someone beside the rig sees its pedal go down.",
  why: "A unit that shows ready may still not reach the pedal.",
  mend: "Run the unit’s set-up again, as its manual has it.",
  caution: "Nobody between the vehicles while the coach moves.",
  touches: ["brake-ready"],
});

export const jacksUp = hold({
  key: "jacks-up",
  part: "jacks",
  ask: "Jacks up, air at travel height",
  how: "All feet of the coach are drawn up, and its air suspension stands at travel height.",
  why: "A low coach changes the angle of the bar, and a jack that is down tears off.",
  mend: "Raise them and wait until the coach has come up.",
});

export const rolling = hold({
  key: "wheels-roll",
  part: "wheels",
  ask: "All four car wheels roll",
  how: "Pull forward a few feet, straight, and stop. Someone beside the rig sees all four car wheels turn and both arms lock out.",
  why: "A wheel that slides means a brake is on or a column is locked. Tires wear through within a few miles.",
  mend: "Stop. Go back to the cabin and compare with the manual's page again.",
  touches: ["end-state", "steering-free", "chocks-out"],
  caution: "Nobody between the vehicles while the coach moves.",
});

export const lamps = hold({
  key: "lamps",
  kind: "lamps",
  part: "lamps",
  ask: "Each lamp answers its signal",
  how: "Stand behind the car. Go through the signals one at a time and look at both sides each time.",
  why: "The arrow on the dash does not show what the car's lamps do.",
  mend: "Seat the plugs first, then look at the ground. A dark lamp on one side only is often its bulb.",
  who: "You for plugs and bulbs; a licensed shop for the wiring.",
  touches: ["cord-and-lanyard"],
});

export const joints = hold({
  key: "joints",
  part: "last-look",
  drawn: "joints",
  ask: "Hands on every joint: none loose",
  how: "Walk around once more without talking. Push and pull each arm, each pin and each plug by hand.",
  why: "The check that is missed is the one that was interrupted.",
  mend: "Whatever moves that should not: go back to that station and look at it again.",
});

export const tires = fix({
  key: "tires",
  part: "last-look",
  drawn: "tires",
  ask: "Car tires: none low, none cracked",
  how: "Look at the tread and both sidewalls of each tire. Cracks are easiest to see near the rim.",
  why: "Nobody in the coach feels a flat tire on the car.",
  mend: "Fill a low tire to the pressure on the car's door label. Cracked sidewalls: have the tire looked at.",
  who: "You for air, with the tires cold; a licensed shop for a cracked one.",
  measure: {
    quantity: "pressure",
    unit: "kPa",
    ask: "The lowest of the four, by the gauge",
    beside: "What it should be, cold, is on the car's door label. Never let air out of a warm tire.",
  },
});

export const cordJacket = fix({
  key: "cord-jacket",
  part: "cord",
  ask: "Cord jacket whole, not scuffed",
  how: "Follow the cord from plug to plug. Look at the underside where it could touch the road.",
  why: "A scuffed jacket lets water in, and lamps begin to fail in the rain.",
  mend: "Tie the cord up so that it clears the ground. Replace it once copper or inner wires show.",
});

export const wheelHeat = hold({
  key: "wheel-heat",
  part: "wheels",
  drawn: "standing",
  ask: "No wheel hotter than its pair",
  how: "Hold the back of a hand near each car wheel, without touching. Compare left with right.",
  why: "One hot wheel means a brake that drags, or a bearing.",
  mend: "Let it cool. Look whether the brake unit holds the pedal down, then roll a few feet and feel again.",
  caution: "A hot wheel or hub can burn a hand.",
});

export const carHeld = hold({
  key: "car-held",
  part: "chocks",
  ask: "Car held: parking brake, chocks",
  how: "Before any pin comes out: the car's parking brake is on and a chock stands on each side of one wheel.",
  why: "The bar may be all that holds the car. Pull a pin and the car can roll onto whoever stands there.",
  mend: "Set the parking brake and chock a wheel, then come back to the bar.",
  caution: "Nobody between the vehicles while either can move.",
});

export const barStowed = hold({
  key: "bar-stowed",
  part: "bar-stowed",
  ask: "Bar folded, pins back in holes",
  how: "The arms are folded and latched for the road. Every pin and clip is back in its own hole.",
  why: "A bar that swings out hits what is next to the coach, and a pin left on the ground is missing tomorrow.",
  mend: "Fold it until the latch closes. Put each pin where it belongs before walking away.",
});

export const linesOff = fix({
  key: "lines-off",
  part: "cord",
  drawn: "off",
  ask: "Cord, cables, lanyard off, capped",
  how: "Everything that ran between the vehicles is off and put away, with the caps on the sockets.",
  why: "An open socket fills with water, and a cable that hangs gets caught.",
  mend: "Take them off and close the caps.",
});
