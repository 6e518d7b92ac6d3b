/** Why a sheet rules its rig out: always a comparison with what a maker or a manual says, never a permission. */
export const ruleOutWords = {
  manualForbids: "The car’s own manual forbids towing it on its four wheels.",
  manualNotRecorded: "What the car’s own manual says is not recorded: its page and the end state it names.",
  noBrake:
    "The car has no brake for towing. The coach maker’s limit for a car without one decides, and so does local law.",
  unbraked: (limit: string, weight: string) => `That limit is ${limit}; the car weighs ${weight}.`,
  loaded: (weight: string) => `The car weighs ${weight} loaded`,
  curb: (weight: string) => `The car weighs ${weight} even before it is loaded`,
  over: (weight: string, part: string, rating: string) => `${weight}; ${part} ${rating}.`,
  each: (count: number, rating: string) => `${count} times ${rating}`,
  rated: {
    "over-receiver": "the coach’s receiver is rated",
    "over-tow-limit": "the coach maker’s limit for a car with brakes is",
    "over-drop-receiver": "the drop receiver is rated",
    "over-coupler": "the ball or pintle hook is rated",
    "over-tow-bar": "the tow bar is rated",
    "over-base-plate": "the base plate is rated",
    "over-cables": "the safety cables together are rated",
  },
  gcwr: (gcwr: string, coach: string, left: string, weight: string) =>
    `GCWR ${gcwr} less the coach as weighed, ${coach}, leaves ${left}. ${weight}.`,
  level: (off: string, limit: string) =>
    `The tow bar stands ${off} out of level; its maker’s limit is ${limit}.`,
} as const;
