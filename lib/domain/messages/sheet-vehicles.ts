import type { carFields, coachFields } from "../sheet/vehicles";

/** A field as a person reads it: what it is called, and where on the vehicle it is found. */
export interface FieldWords {
  label: string;
  where: string;
}

export type WordsOf<T> = Record<keyof T & string, FieldWords>;

const words = (label: string, where: string): FieldWords => ({ label, where });

const PLATE = "On the federal label beside the driver’s seat or on the door post.";
const SCALE = "From a scale ticket, loaded for the road: people, water, fuel and all.";
const LEVEL = "On level ground, coach at travel height, jacks up.";

export const coachWords: WordsOf<typeof coachFields> = {
  description: words(
    "Coach, in your words",
    "Length, fuel and where the engine sits: what someone would know it by.",
  ),
  chassis: words("Chassis", "On the chassis maker’s label, often near the driver’s seat or under the hood."),
  gvwr: words("GVWR", `${PLATE} The most that the coach alone may weigh.`),
  gcwr: words(
    "GCWR",
    "On the chassis maker’s label or in its towing guide. The most that coach and car may weigh together.",
  ),
  frontAxleRating: words("Front axle rating", `${PLATE} It stands there as GAWR front.`),
  rearAxleRating: words("Rear axle rating", `${PLATE} It stands there as GAWR rear.`),
  tagAxleRating: words("Tag axle rating", `${PLATE} Only where a third axle runs behind the drive axle.`),
  frontAxleLoaded: words("Front axle, weighed", SCALE),
  rearAxleLoaded: words("Rear axle, weighed", SCALE),
  tagAxleLoaded: words("Tag axle, weighed", SCALE),
  weighedOn: words("Weighed on", "The date on the scale ticket."),
  towLimitBraked: words("Tow limit, car with brakes", "In the chassis maker’s towing guide."),
  towLimitUnbraked: words(
    "Tow limit, car without brakes",
    "In the chassis maker’s towing guide. It is often much lower.",
  ),
  receiverRating: words(
    "Receiver rating",
    "On the sticker or plate on the receiver itself. Take the figure for a trailer, not the one for a weight-carrying tongue.",
  ),
  receiverHeight: words("Receiver height", `Ground to the center of the receiver’s opening. ${LEVEL}`),
  brakes: words("Coach’s brakes", "In its chassis manual. Air brakes have gauges on the dash."),
  suspension: words("Coach’s suspension", "Look behind a rear wheel: rubber air bags, or springs only."),
  jacks: words("Leveling jacks", "Look under the coach at its corners."),
  signals: words(
    "Signals at the coach’s tail",
    "Combined: one red lamp a side brakes and turns. Separate: a turn lamp of its own, usually amber.",
  ),
  engineBrakeLightsStopLamps: words(
    "Engine brake lights the stop lamps",
    "Have someone watch the tail while the engine brake works, or ask the chassis maker.",
  ),
  socketType: words("Socket at the coach", "At the coach’s tail beside the receiver."),
  socketMeasuredOn: words("Contacts measured on", "The day someone put a tester on each contact."),
  length: words("Length", "Bumper to bumper, without the bar."),
  wheelbase: words("Wheelbase", "Front wheel’s center to the drive wheel’s center."),
  frontOverhang: words("Front overhang", "Front wheel’s center to the front bumper."),
  rearOverhang: words("Rear overhang", "Drive wheel’s center to the receiver’s pin."),
  identity: words("Unit or serial number", "On the federal label, or the number that your yard uses."),
};

export const carWords: WordsOf<typeof carFields> = {
  year: words("Model year", "On the title, or the tenth character of the number behind the windshield."),
  description: words("Car, in your words", "Body, doors and color: what someone would know it by."),
  makerModelTrim: words(
    "Maker, model and trim",
    "On the title and the tailgate. Whether it may be towed can hang on the trim.",
  ),
  gearbox: words("Gearbox", "In the owner’s manual. The same model can come with several."),
  drive: words(
    "Driven wheels",
    "In the owner’s manual, or under the car: a shaft to the rear means more than the front.",
  ),
  transferCase: words(
    "Transfer case",
    "In the owner’s manual. Without it in neutral the wheels turn the gearbox; with it in neutral, park does not hold.",
  ),
  curb: words("Curb weight", "In the owner’s manual: the car with fuel, without load."),
  loaded: words("Loaded weight", "The car on a scale as it will be towed, with everything in it."),
  basePlateHeight: words("Tab height", "Ground to the center of the base plate’s tab. On level ground."),
  lampType: words(
    "Lamps at the car’s tail",
    "Look into the housing: a glowing wire is a filament, dots are LEDs.",
  ),
  lampSignals: words(
    "Signals at the car’s tail",
    "Combined: one red lamp a side brakes and turns. Separate: a turn lamp of its own.",
  ),
  stopLampsWhileTowing: words(
    "Stop lamps light as towed",
    "With key and battery as the manual has them for towing, press the pedal after five minutes and look.",
  ),
  parkingBrake: words("Parking brake", "In the cabin: a lever, a pedal on the left, or a switch."),
  booster: words(
    "Brake booster",
    "In the owner’s manual. Hybrids and electric cars often have an electric one.",
  ),
  adjustablePedals: words("Pedals that adjust", "Look for a switch that moves the pedals."),
  airSuspension: words("Car’s air suspension", "In the owner’s manual."),
  tirePressure: words("Tire pressure, cold", "On the label at the driver’s door."),
  tireSize: words("Tire size", "On the sidewall. All four the same, and no compact spare among them."),
  length: words("Length", "Bumper to bumper, without the bar."),
  wheelbase: words("Wheelbase", "Front wheel’s center to rear wheel’s center."),
  frontOverhang: words("Front overhang", "Front wheel’s center to the base plate’s tab."),
  identity: words("Unit or serial number", "Behind the windshield, or the number that your yard uses."),
};
