import { figure } from "../messages/catalogue-figures";
import { only, told } from "./conditions";
import { text, type Entry } from "./entry";
import type { Facts } from "./facts";
import { carsManual, couplingRule, makersManual, practice } from "./origins";

const wrongWay =
  "Only this car’s own manual knows how it may roll. Another car’s way can wreck its driveline.";

/** A headline with the page in it, or without where the page is too long for one. */
function withPage({ manual }: Facts, lead: string, otherwise: string): string {
  const line = manual.says === "how" ? `${lead} ${manual.page}` : otherwise;
  return line.length <= 38 ? line : otherwise;
}

/** What the owner read, as they wrote it down, and where. Nothing of ours stands in it. */
function quoted({ manual, sheet: { procedure } }: Facts): string {
  const name = procedure?.manual ?? "this car’s owner’s manual";
  if (manual.says !== "how") return `The page of ${name} is not recorded.`;
  return `Page ${manual.page} of ${name}, in the owner’s words: “${manual.endState}”`;
}

function engineRun({ sheet: { procedure = {} } }: Facts): string | false {
  const { engineRunEveryHours: hours, engineRunEvery: way, engineRunMinutes: minutes } = procedure;
  const every = [hours ? `every ${hours} h` : null, way ? `every ${figure(way)}` : null].filter(Boolean);
  const run = [minutes ? `${minutes} min` : null, every.join(" or ")].filter(Boolean).join(", ");
  return run !== "" && `Engine run, as recorded: ${run}.`;
}

/** What undoes the towing state, as far as it is written down. */
function drivingAgain({ backToDriving, sheet: { procedure } }: Facts): string {
  const name = procedure?.manual ?? "this car’s owner’s manual";
  return text(
    procedure?.battery && `The battery while towing, by the sheet: “${procedure.battery}”.`,
    backToDriving
      ? `From ${name}, in the owner’s words: “${backToDriving}”`
      : "The sheet does not have what this car’s own manual wants before it is driven: look there.",
  );
}

/** The rest of what is recorded beside the end state. */
function recorded({ fuse, sheet: { procedure = {} } }: Facts): string {
  const { battery, fuseKept, speedCap } = procedure;
  return text(
    battery && `Battery: “${battery}”.`,
    fuse && `Fuse that comes out: “${fuse}”.`,
    fuse && fuseKept && `Kept: “${fuseKept}”.`,
    speedCap && `Highest speed, as recorded: ${figure(speedCap)}.`,
  );
}

// A fact of how these cars are built, and no instruction: what is done about it is in the car's own manual.
const PARK =
  "With a transfer case in neutral, park does not hold the car and no gear does: parking brake and chocks do.";

const parkingBrakeOff = {
  lever: "The lever is all the way down and",
  pedal: "The brake’s own pedal is all the way up and",
  switch: "The switch shows it released and",
};

export const cabin: Entry[] = [
  {
    id: "end-state",
    key: "end-state",
    station: "car-cabin",
    effect: "hold",
    when: [only("manualRecorded")],
    words: (facts) => ({
      part: "cabin",
      ask: withPage(facts, "Cabin as on page", "Cabin as on the manual’s page"),
      how: text(quoted(facts), recorded(facts), engineRun(facts)),
      why: wrongWay,
      mend: "Do the page’s steps again from the top, in its order.",
      touches: ["steering-free", "wheels-roll"],
      origin: carsManual(facts),
    }),
  },
  {
    id: "engine-run",
    key: "engine-run",
    station: "car-cabin",
    effect: "hold",
    when: [only("manualRecorded"), only("engineRun")],
    words: (facts) => ({
      part: "cabin",
      ask: withPage(facts, "Cabin again as on page", "Cabin again as on the page"),
      how: text(
        engineRun(facts),
        "If it fell due by this stop, it was run, the cabin is again as the page ends, and the parking brake is off.",
        quoted(facts),
      ),
      why: `A run that is left out can ruin the gearbox, and a car that was started is in another state than it was towed in. ${wrongWay}`,
      mend: "Do the page’s steps again from the top, in its order.",
      touches: ["end-state", "steering-free", "wheels-roll"],
      origin: carsManual(facts),
    }),
  },
  {
    id: "steering-free",
    key: "steering-free",
    station: "car-cabin",
    effect: "hold",
    when: [only("every")],
    words: () => ({
      part: "steering",
      ask: "Steering wheel turns both ways",
      how: "Turn the wheel by hand a little both ways. The column does not catch.",
      why: "A locked column drags the front tires sideways until they come apart.",
      mend: "Compare the cabin with the manual’s page again.",
      touches: ["end-state", "wheels-roll"],
      origin: couplingRule,
    }),
  },
  {
    id: "chocks-out",
    key: "chocks-out",
    station: "car-cabin",
    effect: "hold",
    when: [only("every")],
    words: ({ sheet: { car } }) => ({
      part: "parking-brake",
      // Its drawing has a lever.
      ...(car?.parkingBrake !== "lever" && { drawn: "place" as const }),
      ask: "Parking brake off, chocks out",
      how: text(
        "The bar is attached.",
        car?.parkingBrake ? parkingBrakeOff[car.parkingBrake] : "The car’s parking brake is released and",
        "its lamp is dark. No chock is left at a wheel.",
        car?.parkingBrake === "switch" &&
          "An electric parking brake can set itself: the car’s own manual says how that is kept off.",
      ),
      why: "A brake that stays on burns within a few miles, and nobody in the coach feels it.",
      mend: "Release it and look at the lamp again. Stow the chocks where they are counted.",
      caution: "From here on only the bar and the coach’s brake hold the car.",
      touches: ["wheels-roll"],
      origin: makersManual("tow bars"),
    }),
  },
  {
    id: "car-held",
    key: "car-held",
    station: "car-cabin",
    effect: "hold",
    when: [only("every")],
    words: ({ transferCase, manual, sheet: { car } }) => ({
      part: "chocks",
      ask: "Car held: parking brake, chocks",
      how: text(
        "Before any pin comes out or any latch is opened: the car’s parking brake is on, and a chock stands tight on each side of one wheel. The coach’s own brake is set.",
        transferCase && `This car has a transfer case. ${PARK}`,
        transferCase === null && `The sheet does not say whether this car has a transfer case. ${PARK}`,
        car?.parkingBrake === "switch" &&
          "An electric parking brake sets only with the car’s battery connected: the chocks come first.",
        manual.says === "how" &&
          "What the car’s manual wants while the car still hangs on the bar comes before the pins.",
      ),
      why: "The bar may be all that holds the car. Pull a pin and the car can roll onto whoever stands there.",
      mend: "Set the parking brake and chock a wheel, then come back to the bar.",
      caution: "Nobody between the vehicles while either can move.",
      origin: makersManual("tow bars"),
    }),
  },
  {
    id: "fuse-back",
    key: "fuse-back",
    station: "car-cabin",
    effect: "hold",
    when: [only("fuse")],
    words: ({ fuse, sheet: { procedure } }) => ({
      part: "fuse",
      ask: fuse && /^\w{1,6}$/.test(fuse) ? `Fuse ${fuse} back in its place` : "Fuse back in its place",
      how: text(
        "The place that the car’s manual names has its fuse in it, pressed home, its strip whole.",
        fuse && `On the sheet: “${fuse}”.`,
        procedure?.fuseKept && `Kept while towing: “${procedure.fuseKept}”.`,
      ),
      why: "The manual has it out only while towing. The car should not be driven without it.",
      mend: "Take it from where it is kept and press it home. A blown one is replaced by one of the same rating.",
      origin: { kind: "vehicle-manual", says: "This car’s owner’s manual, as the sheet has it." },
    }),
  },
  {
    id: "back-to-driving",
    key: "back-to-driving",
    station: "car-cabin",
    effect: "hold",
    when: [told("backToDriving")],
    words: (facts) => ({
      part: "cabin",
      drawn: "place",
      ask: "Car as the manual wants it to drive",
      how: drivingAgain(facts),
      why: "A car that is driven as it was towed can be damaged, or roll away where it is parked.",
      mend: "Do what the manual wants, in its order, before anyone drives.",
      origin: { kind: "vehicle-manual", says: "This car’s owner’s manual." },
    }),
  },
  {
    id: "gear-counted",
    key: "gear-counted",
    station: "car-cabin",
    effect: "fix",
    when: [only("every")],
    words: ({ sheet, fuse, brake, wiring, airLine, drop }) => ({
      part: "last-look",
      drawn: "place",
      ask: "Tow set whole, as on the sheet",
      how: text(
        "Bar, cables, cord, chocks and the manuals are there.",
        drop && "So is the drop receiver.",
        airLine && "So is the air line.",
        wiring === "light-bar" && "So is the light bar.",
        brake !== null && brake !== "none" && "So is what belongs to the brake.",
        fuse && "So is the fuse that comes out.",
        serials(sheet),
      ),
      why: "What is missing on the lot is found by the driver at a campsite.",
      mend: "Put back what is missing, or change the sheet where another piece is on.",
      origin: practice,
    }),
  },
];

/** The serial numbers to compare, as far as they are written down. */
function serials({ gear }: Facts["sheet"]): string | false {
  const { towBar, basePlate, brake } = gear ?? {};
  const known = [
    towBar?.serial && `bar ${towBar.serial}`,
    basePlate?.serial && `base plate ${basePlate.serial}`,
    brake?.family !== "none" && brake?.serial && `brake ${brake.serial}`,
  ].filter(Boolean);
  return known.length > 0 && `Serial numbers on the sheet: ${known.join(", ")}.`;
}
