/** What is said of a sheet's values that cannot be so, or hardly are. Bounds of the unusual are our own. */
export const sheetFaultWords = {
  gcwrBelowGvwr:
    "GCWR is below GVWR. A coach may weigh its GVWR with nothing behind it, so one of the two was misread.",
  wheelbaseOverLength: "The wheelbase is longer than the vehicle.",
  zero: "This cannot be zero. Choose Not known where the plate cannot be read.",
  loadedBelowCurb: "Loaded is below curb weight. Look at both again.",
  axleOver: "This axle weighs more than its rating.",
  gvwrOverAxles:
    "GVWR is more than the axles’ ratings together. Look at the plate again, and whether there is a tag axle.",
  unbrakedOver: "The limit without brakes is above the one with brakes.",
  carWeight: "Few cars weigh this. Look at the unit.",
  coachWeight: "Few coaches weigh this. Look at the unit.",
  height: "Few are this high or low. Look at the unit, and measure at travel height.",
  twoCables: "Two cables are usual.",
} as const;
