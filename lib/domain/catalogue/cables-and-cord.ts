import { figure } from "../messages/catalogue-figures";
import { maybe, only, unless, unsaid } from "./conditions";
import { text, type Entry, type Words } from "./entry";
import type { Facts } from "./facts";
import { breakawayRule, cablesRule, makersManual, practice } from "./origins";

const cablesKey = { key: "cables", station: "cables-and-cord", effect: "hold" } as const;
const CABLES =
  "Both cables run from the coach’s frame to the car’s frame, none to the bar, and cross under it. Every link is screwed shut. They have slack for a full turn, and nothing hangs near the ground.";

function cableWords({ sheet: { gear } }: Facts): Omit<Words, "ask" | "how"> {
  const rating = gear?.cables?.rating;
  return {
    part: "cables",
    why: "If the bar lets go, the cables are what keeps the car behind the coach. Crossed, they also hold the bar up.",
    mend: "Cross them under the bar and screw each link closed. A cable with broken strands or a flattened link is replaced, not taped.",
    who: "You, with cables rated for the car. Eyes and brackets on the frame: a licensed shop.",
    touches: ["lanyard", "cord"],
    origin: cablesRule,
    ...(rating && { figures: { A: `${figure(rating)} each` } }),
  };
}

const cordEnds = ({ sheet: { gear } }: Facts) =>
  gear?.cord?.carEnd === "hard-wired"
    ? "The cord’s plug is home and latched at the coach; at the car it is fixed in."
    : "The cord’s plugs are home and latched at the coach and at the car.";

const cordSlack = ({ sheet: { gear } }: Facts) =>
  gear?.cord?.shape === "straight"
    ? "It is tied to the bar or lies in it, has slack for a full turn and clears the ground."
    : "It has slack for a full turn and clears the ground.";

/** What runs down while a breakaway switch's pin is out, by what the brake draws on. */
function pinOut(brake: Facts["brake"]): string {
  if (brake === "surge" || brake === "hydraulic") return "for as long as it is.";
  return brake === "air" ? "and its stored air runs down." : "and its battery runs down in minutes.";
}

const cordKey = { key: "cord", station: "cables-and-cord", effect: "hold" } as const;

function cordWhy({ brake }: Facts): string {
  return text(
    "A plug that works loose leaves the car dark from behind.",
    brake === "installed-vacuum" && "The brake in the car takes its signal and power through the cord too.",
  );
}

function cordWords(facts: Facts): Pick<Words, "why" | "touches" | "who"> {
  return {
    why: cordWhy(facts),
    touches: ["lamps", "brake-ready"],
    who: "You for the plugs; a licensed shop for a damaged cord or socket.",
  };
}

export const cablesAndCord: Entry[] = [
  {
    ...cablesKey,
    id: "cables",
    when: [unless("shortPair")],
    words: (facts) => ({
      ...cableWords(facts),
      ask: "Cables crossed, links screwed shut",
      how: CABLES,
    }),
  },
  {
    ...cablesKey,
    id: "cables-and-short-pair",
    when: [only("shortPair")],
    words: (facts) => ({
      ...cableWords(facts),
      ask: "Cables crossed, short pair on, shut",
      how: text(
        CABLES,
        "Each removable arm has a short cable of its own to the part of the base plate that stays on the car, its link screwed shut too.",
        facts.sheet.gear?.shortCables?.there === false &&
          "The sheet has no short pair: without one, mark Fault.",
      ),
    }),
  },
  {
    ...cablesKey,
    id: "cables-short-pair-unsaid",
    when: [unsaid("shortPair")],
    words: (facts) => ({
      ...cableWords(facts),
      ask: "Cables crossed, links screwed shut",
      how: text(CABLES, "Arms that come off the base plate have a short cable each, its link shut too."),
    }),
  },
  {
    id: "short-cables",
    key: "short-cables",
    station: "cables-and-cord",
    effect: "hold",
    when: [maybe("shortPair")],
    words: ({ sheet: { gear } }) => {
      const rating = gear?.shortCables?.rating;
      return {
        part: "short-cables",
        ask: "Short pair on the removable arms",
        how: "Each removable arm of the base plate has its own short cable to the part that stays on the car, link screwed shut.",
        why: "Without them, an arm that comes out of the plate takes the long cables along.",
        mend: "Hook the short pair on and screw both links shut.",
        touches: ["cables"],
        origin: makersManual("base plates with arms that come off"),
        ...(rating && { figures: { A: figure(rating) } }),
      };
    },
  },
  {
    id: "lanyard",
    key: "lanyard",
    station: "cables-and-cord",
    effect: "hold",
    when: [maybe("breakaway")],
    words: ({ brake, sheet: { gear } }) => ({
      part: "lanyard",
      ask: "Lanyard on its own frame point",
      how: text(
        "The switch’s pin is fully in. The lanyard runs from it in line with the switch to a point of its own on the coach’s frame: not the bar, its mount, a cable or a cable’s hook.",
        "It has slack for a full turn and does not drag.",
        gear?.breakaway?.anchor && `Its point, by the sheet: ${gear.breakaway.anchor}.`,
      ),
      why: "A lanyard on a part that leaves with the bar never pulls the switch. On a cable’s hook, one failure takes both.",
      mend: "Move it to its own point on the frame. How long it should be against the cables, the switch’s own manual says.",
      caution: text("Do not leave the pin out: the brake stays on", pinOut(brake)),
      origin: makersManual("breakaway switches"),
    }),
  },
  {
    ...cordKey,
    id: "cord",
    when: [maybe("cord"), unless("airLine")],
    words: (facts) => ({
      ...cordWords(facts),
      part: "cord",
      // The part's drawing has the lanyard on it, which is a check of its own.
      drawn: "place",
      ask: "Cord latched, clear of the ground",
      how: text(cordEnds(facts), cordSlack(facts)),
      mend: "Seat and latch the plugs. Tie up what hangs near the ground.",
      origin: practice,
    }),
  },
  {
    ...cordKey,
    id: "cord-and-air",
    when: [only("airLine")],
    words: (facts) => ({
      ...cordWords(facts),
      part: "air-line",
      ask: "Cord and air line latched and clear",
      how: text(
        cordEnds(facts),
        cordSlack(facts),
        "The air line is coupled at both ends and does not come off with a tug. With the coach’s air up, nothing hisses, and the line has no kink and rubs on nothing.",
      ),
      why: text(
        cordWhy(facts),
        "Without its air the car’s brake does not work, and a leak lowers the coach’s.",
      ),
      mend: "Seat and latch the plugs, couple the line again. If it still hisses, look at the seal and at the line for a chafed place.",
      origin: practice,
    }),
  },
  {
    ...cordKey,
    id: "cord-air-unsaid",
    when: [maybe("cord"), unsaid("airLine")],
    words: (facts) => ({
      ...cordWords(facts),
      part: "cord",
      drawn: "place",
      ask: "Cord latched, clear of the ground",
      how: text(
        cordEnds(facts),
        cordSlack(facts),
        "An air line, where there is one, is coupled at both ends and does not hiss.",
      ),
      mend: "Seat and latch the plugs. Tie up what hangs near the ground.",
      origin: practice,
    }),
  },
  {
    id: "cord-jacket",
    key: "cord-jacket",
    station: "cables-and-cord",
    effect: "fix",
    when: [maybe("cord")],
    words: () => ({
      part: "cord",
      drawn: "place",
      ask: "Cord jacket whole, not scuffed",
      how: "Follow the cord from end to end. Look at the underside where it could touch the road, and where it enters a plug.",
      why: "A scuffed jacket lets water in, and lamps begin to fail in the rain.",
      mend: "Tie the cord up so that it clears the ground. Replace it once copper or inner wires show.",
      who: "You; a licensed shop where wires show.",
      touches: ["cord", "lamps"],
      origin: practice,
    }),
  },
  {
    id: "charge-line",
    key: "charge-line",
    station: "cables-and-cord",
    effect: "fix",
    when: [maybe("chargeLine")],
    words: ({ sheet: { gear } }) => {
      const { plug, fuseAmps } = gear?.chargeLine ?? {};
      return {
        part: "charge-line",
        // Its drawing has a plug of its own.
        ...(plug !== "own-plug" && { drawn: "place" as const }),
        ask: plug === "own-plug" ? "Charge line plugged in, fuse in" : "Charge line: fuse in, clamp on",
        how: text(
          plug === "in-cord" && "The charge line runs in the cord.",
          plug === "own-plug" && "The charge line’s plug is home beside the cord’s.",
          !plug && "Where the charge line has a plug of its own, that is home.",
          "At the car’s battery its fuse is in, the holder’s cover shut and the clamp tight on its post.",
        ),
        why: "Without it the car’s battery may be flat at the end of the day, and what hangs on it with it.",
        mend: "Plug it in and look at its fuse. A fuse that blows again: leave it out and have the line looked at.",
        who: "You for plug and fuse; a licensed shop for the line.",
        caution: "A fuse of a higher number than the line was built for can set it on fire.",
        origin: practice,
        ...(fuseAmps && plug === "own-plug" && { figures: { B: `${fuseAmps} A` } }),
      };
    },
  },
  {
    id: "breakaway-pull",
    key: "breakaway-pull",
    station: "cables-and-cord",
    effect: "hold",
    when: [maybe("breakaway")],
    words: ({ brake, sheet: { gear } }) => {
      const { battery, lastPulledOn } = gear?.breakaway ?? {};
      return {
        part: "lanyard",
        drawn: "place",
        ask: "Breakaway pin out: brake on and holds",
        how: text(
          "As the switch’s own manual has it: with the pin out, the car’s brake comes on at once and stays on. Then the pin is fully in again and the brake is off.",
          battery && `Its power, by the sheet: ${battery}.`,
          lastPulledOn && `By the sheet it was last pulled on ${lastPulledOn}.`,
        ),
        why: text(
          "A switch that was never pulled seizes.",
          brake !== "air" && brake !== "surge" && "A battery at rest shows nothing of what it can hold.",
        ),
        mend: "Work the pin, and look at what powers the brake then, by the switch’s own manual. A seized switch is replaced.",
        who: "A licensed shop, by the switch’s own manual.",
        caution: "Leave the pin out for minutes only. Nobody between the vehicles while either can move.",
        touches: ["lanyard", "brake-ready"],
        origin: breakawayRule,
      };
    },
  },
];
