import type { procedureFields } from "../sheet/procedure";
import type {
  conductorFields,
  contactFields,
  groundFields,
  segmentFields,
  spliceFields,
  wiringFields,
} from "../sheet/wiring";
import type { FieldWords, WordsOf } from "./sheet-vehicles";

const words = (label: string, where: string): FieldWords => ({ label, where });

export const wiringWords: WordsOf<typeof wiringFields> = {
  style: words(
    "How the car’s lamps are fed",
    "Diodes: the coach feeds the car’s own bulbs. Bulbs: extra ones in the housings. Or a light bar, or a trailer plug.",
  ),
  converter: words(
    "Converter",
    "A box that turns three signals into two or two into three. Where combined meets separate there is one, or a kit that needs none.",
  ),
  converterAt: words("Where the converter sits", "Inside and dry, with a ground of its own."),
  stopFeedRelay: words(
    "Relay in the stop lamps’ feed",
    "With a brake that presses the pedal: a relay that keeps the car’s own stop lamps from hiding the turn signal.",
  ),
};

export const contactWords: WordsOf<typeof contactFields> = {
  contact: words(
    "Contact",
    "Its number, or where it sits in the socket, seen from the front with the notch up.",
  ),
  does: words(
    "Does, as measured",
    "By a tester with a bulb, one signal at a time. Never by the wire’s color.",
  ),
};

export const segmentWords: WordsOf<typeof segmentFields> = {
  from: words("From", "The end nearer the coach."),
  to: words("To", "The end nearer the lamps."),
  gaugeAwg: words("Gauge, AWG", "Printed on the wire. The thinnest, where they differ."),
  length: words("Length", "Along the run, one way."),
};

export const conductorWords: WordsOf<typeof conductorFields> = {
  color: words("Color", "A description only: colors do not say what a wire does."),
  near: words("Does, at the near end", "As measured at the end nearer the coach."),
  far: words("Does, at the far end", "As measured at the end nearer the lamps."),
  tagged: words("Tagged at both ends", "A tag that says what it does there."),
};

export const spliceWords: WordsOf<typeof spliceFields> = {
  at: words("Place", "Where someone finds it again."),
  kind: words("Kind", "How the wires are joined."),
};

export const groundWords: WordsOf<typeof groundFields> = {
  at: words("Ground point", "The bolt or stud, on bare metal that the car’s manual allows."),
  devices: words("What hangs on it", "Every device that is grounded here, the brake unit too, with commas."),
};

export const procedureWords: WordsOf<typeof procedureFields> = {
  says: words(
    "What the car’s own manual says",
    "Under towing on four wheels, behind a motorhome, or recreational towing: for this year, trim, engine and gearbox.",
  ),
  manual: words("Which manual", "Its title, year and edition, as on its cover."),
  page: words("Page", "The page that has the steps."),
  photo: words("Photograph of the page", "So that it can be read beside the car."),
  bar: words("Its steps come", "Before or after the bar is on, as the manual has it."),
  endState: words(
    "The end state, in your words",
    "What can be seen in the cabin when the manual’s last step is done.",
  ),
  engineRunEveryHours: words(
    "Engine run every, in hours",
    "Where the manual asks to run the engine on the way.",
  ),
  engineRunEvery: words(
    "Engine run every, by distance",
    "Where the manual asks to run the engine on the way.",
  ),
  engineRunMinutes: words("Engine run for, in minutes", "As the manual has it."),
  speedCap: words("Highest speed", "As the manual has it."),
  battery: words("Battery", "What the manual wants done with it while towing, in your words."),
  fuse: words("Fuse that comes out", "Its number in the manual; leave empty where it names none."),
  fuseKept: words("Where the fuse is kept", "Where it is seen before anyone drives off."),
  backToDriving: words(
    "Back to driving, in your words",
    "What the manual wants before the car is driven again.",
  ),
};

/** What each option of a choice is called. */
export const optionWords: Record<string, string> = {
  hydraulic: "Hydraulic",
  air: "Air",
  "air-over-hydraulic": "Air over hydraulic",
  springs: "Springs only",
  combined: "Combined",
  separate: "Separate",
  "4-flat": "4-way flat",
  "5-flat": "5-way flat",
  "4-round": "4-way round",
  "6-round": "6-way round",
  "7-blade": "7-way blade",
  "hard-wired": "None, the cord stays on the car",
  other: "Other",
  manual: "Manual",
  automatic: "Automatic",
  cvt: "CVT",
  "dual-clutch": "Dual clutch",
  "direct-drive": "Direct drive (electric)",
  front: "Front",
  rear: "Rear",
  all: "All, always",
  "part-time-four": "Four, by choice",
  filament: "Filament",
  led: "LED",
  mixed: "Some of each",
  lever: "Lever",
  pedal: "Pedal",
  switch: "Switch (electric)",
  vacuum: "Vacuum",
  electric: "Electric",
  none: "None",
  drop: "Drop",
  rise: "Rise",
  direct: "Into the receiver",
  ball: "Coupler on a ball",
  pintle: "Ring on a pintle hook",
  coach: "On the coach",
  car: "On the car",
  pin: "Pin and clip",
  quick: "Quick-disconnect end",
  fixed: "Fixed",
  removable: "Removable",
  coiled: "Coiled",
  straight: "Straight",
  "in-cord": "In the cord’s plug",
  "own-plug": "A plug of its own",
  portable: "Box at the pedal",
  "installed-vacuum": "Built in, electric with its own vacuum",
  surge: "Surge or cable in the bar",
  straps: "Straps",
  magnets: "Magnets",
  brackets: "Brackets",
  cord: "The cord",
  "own-battery": "A battery of its own",
  diodes: "Diodes into the car’s own lamps",
  bulbs: "Separate bulbs in the housings",
  "light-bar": "Removable light bar",
  "trailer-plug": "Trailer plug",
  "three-to-two": "Three signals to two",
  "two-to-three": "Two signals to three",
  tail: "Tail",
  left: "Left turn",
  right: "Right turn",
  "left-stop": "Left turn and stop",
  "right-stop": "Right turn and stop",
  stop: "Stop",
  ground: "Ground",
  charge: "Charge",
  "brake-unit": "Brake unit",
  reverse: "Reverse",
  unused: "Nothing",
  soldered: "Soldered and sealed",
  "crimped-sealed": "Crimped and sealed",
  "crimped-open": "Crimped, not sealed",
  tap: "Displacement tap",
  "terminal-block": "Terminal block",
  plug: "Plug and socket",
  how: "It says how",
  forbidden: "It forbids it",
  "not-recorded": "Not written down yet",
  before: "Before the bar is on",
  after: "After the bar is on",
};
