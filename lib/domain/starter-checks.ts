import { fix, hold } from "./plain-checks";
import type { Check } from "./revision";

// The checks of a plain list that depend on its answers. They know nothing of the parts but their kind, so they ask
// only for what is the same on all of them and leave the rest to the parts' own manuals.

export const receiverPin = hold({
  key: "receiver-pins",
  part: "receiver",
  ask: "Receiver pins in, clips closed",
  how: "The pin goes all the way through the receiver, with its clip closed through its end. A drop receiver has a second pin of its own.",
  why: "This pin holds everything behind the coach. A pin that walks out lets the whole bar slide out.",
  mend: "Push the pin through and close its clip. Replace a pin that is bent or worn.",
});

export const ball = hold({
  key: "ball-coupler",
  part: "ball",
  ask: "Coupler down on ball, latch pinned",
  how: "The coupler sits all the way down on the ball. Its latch is closed, with a pin or lock through it. The nut under the ball is in place.",
  why: "A coupler whose latch is not pinned can be levered off the ball in a deep dip.",
  mend: "Lift the coupler off, look into it, set it down again and pin the latch. A cracked part is replaced.",
});

export const pintle = hold({
  key: "pintle-latch",
  part: "pintle",
  ask: "Ring on the hook, latch pinned",
  how: "The ring lies in the hook. The latch is closed over it, with its pin through.",
  why: "An open latch lets the ring lift off the hook where the road dips.",
  mend: "Close the latch until its pin goes through. A latch that does not close is replaced.",
});

/** The cord of a rig without a brake: nothing on it has a lanyard. */
export const cord = hold({
  key: "cord",
  part: "cord",
  drawn: "place",
  ask: "Cord latched at both ends",
  how: "The plugs are home and latched at the coach and at the car. The cord has slack for a full turn and clears the ground.",
  why: "A plug that works loose leaves the car dark from behind.",
  mend: "Seat and latch the plugs. Tie up what hangs near the ground.",
});

const brakeWhy = "A pedal that is held down a little drags the brakes until they smoke.";

export const brakeBox = hold({
  key: "brake-ready",
  part: "brake",
  ask: "Box set, pedal all the way up",
  how: "The box stands as its own manual shows and says that it is ready. The car’s pedal is all the way up.",
  why: brakeWhy,
  mend: "Run the box’s set-up again, as its manual has it.",
});

export const brakeBuiltIn = hold({
  key: "brake-ready",
  part: "monitor",
  ask: "Brake ready, pedal all the way up",
  how: "The monitor in the coach shows what the brake’s own manual says it should. The car’s pedal is all the way up.",
  why: brakeWhy,
  mend: "Seat the cord and the lines, then look at the page for faults in the brake’s manual.",
});

export const brakeMissing = hold({
  key: "brake-ready",
  part: "brake",
  drawn: "place",
  ask: "A brake for towing is on the car",
  how: "When this list was made, the car had none. If that is still so, mark Fault.",
  why: "The coach has to stop the car’s weight as well. Its maker sets a limit for a car without a brake, and so does local law.",
  mend: "Look up the coach maker’s limit and local law, have a brake put on, then make the list again.",
  who: "A licensed shop.",
});

const manualWhy =
  "Only this car’s own manual knows whether and how it may roll behind a coach. Another car’s way can wreck its driveline.";

export const manualNotRecorded = hold({
  key: "manual-page",
  part: "cabin",
  drawn: "place",
  ask: "The car’s own towing page is on this list",
  how: "It is not: no page of the car’s owner’s manual was written down when this list was made. Mark Fault.",
  why: manualWhy,
  mend: "Find the page for towing on four wheels in this car’s owner’s manual. Make the list again with its number and what it says.",
});

export const manualForbids = hold({
  key: "manual-page",
  part: "cabin",
  drawn: "place",
  ask: "The car’s manual allows four wheels down",
  how: "It does not: this list was made with a manual that forbids it. Mark Fault.",
  why: manualWhy,
  mend: "This car does not roll behind a coach on its own wheels. Ask a licensed shop about another way to take it along.",
});

/** The cabin as the car's own manual ends it, in the words of whoever read it there. */
export function endState(page: string, words: string): Check {
  return hold({
    key: "end-state",
    part: "cabin",
    ask: `Cabin just as page ${page} says`,
    how: `Page ${page} of this car’s owner’s manual, in your words: “${words}” The steering wheel turns freely.`,
    why: "Only this car’s own manual knows how it may roll. Another car’s way can wreck its driveline.",
    mend: "Do the page’s steps again from the top, in its order.",
  });
}

export const lightBar = hold({
  key: "light-bar",
  part: "light-bar",
  ask: "Light bar on, straps tight, plug home",
  how: "The bar sits where it can be seen from behind and does not move by hand. Its plug is home and the plate is not covered.",
  why: "A bar that slides off hangs by its wire, and the car is dark from behind.",
  mend: "Set the bar again and tighten what holds it.",
});

export const trailerPlug = fix({
  key: "trailer-plug",
  part: "lamps",
  drawn: "place",
  ask: "Trailer plug seated, wire tied up",
  how: "The plug is all the way in and its wire clears the tires and the road.",
  why: "A plug that shakes loose takes all lamps with it.",
  mend: "Seat the plug and tie the wire up.",
});
