import { only } from "./conditions";
import { text, type Entry } from "./entry";
import { carsManual, practice } from "./origins";

const manualWhy =
  "Only this car’s own manual knows whether and how it may roll behind a coach. Another car’s way can wreck its driveline.";

/** What stands at the head of every walk that would tow a rig which its sheet rules out. */
export const ruledOutEntries: Entry[] = [
  {
    id: "manual-not-recorded",
    key: "manual-page",
    station: "coach-tail",
    effect: "hold",
    when: [only("manualMissing")],
    words: (facts) => ({
      part: "cabin",
      drawn: "place",
      ruled: true,
      ask: "The car’s own towing page is recorded",
      how: "The sheet has no page and end state from this car’s own manual.",
      why: manualWhy,
      mend: "Find the page for towing on four wheels in this car’s owner’s manual: its year, trim, engine and gearbox. Write its number and the end state on the sheet.",
      origin: carsManual(facts),
    }),
  },
  {
    id: "manual-forbids",
    key: "manual-page",
    station: "coach-tail",
    effect: "hold",
    when: [only("manualForbids")],
    words: (facts) => ({
      part: "cabin",
      drawn: "place",
      ruled: true,
      ask: "The manual allows all four wheels down",
      how: "By the sheet, this car’s own manual forbids towing it on its four wheels.",
      why: manualWhy,
      mend: "This car does not roll behind a coach on its own wheels. Ask a licensed shop about another way to take it along.",
      who: "A licensed shop.",
      origin: carsManual(facts),
    }),
  },
  {
    id: "ruled-out",
    key: "ruled-out",
    station: "coach-tail",
    effect: "hold",
    when: [only("ruledOut")],
    words: ({ ruleOuts }) => ({
      part: "receiver",
      drawn: "place",
      ruled: true,
      ask: "Nothing on the sheet rules it out",
      how: text(...ruleOuts.filter(({ code }) => !code.startsWith("manual-")).map(({ says }) => says)),
      why: "The weakest link decides. A part loaded beyond its maker’s figure can give way without a sign.",
      mend: "Have the part or the weight changed, then the sheet: a new list is made from it. A figure that was misread is put right on the sheet.",
      who: "A licensed shop, by the makers’ ratings and manuals.",
      origin: practice,
    }),
  },
];
