import { fields } from "./field";

const words = { kind: "text", most: 80 } as const;
const serial = { kind: "text", most: 40 } as const;

/** What is written down of the coach. */
export const coachFields = fields({
  description: words,
  chassis: words,
  gvwr: { kind: "mass" },
  gcwr: { kind: "mass" },
  frontAxleRating: { kind: "mass" },
  rearAxleRating: { kind: "mass" },
  tagAxleRating: { kind: "mass" },
  frontAxleLoaded: { kind: "mass" },
  rearAxleLoaded: { kind: "mass" },
  tagAxleLoaded: { kind: "mass" },
  weighedOn: { kind: "date" },
  towLimitBraked: { kind: "mass" },
  towLimitUnbraked: { kind: "mass" },
  receiverRating: { kind: "mass" },
  receiverHeight: { kind: "length" },
  brakes: { kind: "choice", of: ["hydraulic", "air", "air-over-hydraulic"] },
  suspension: { kind: "choice", of: ["springs", "air"] },
  jacks: { kind: "yes-no" },
  signals: { kind: "choice", of: ["combined", "separate"] },
  engineBrakeLightsStopLamps: { kind: "yes-no" },
  socketType: { kind: "choice", of: ["4-flat", "5-flat", "6-round", "7-blade", "other"] },
  socketMeasuredOn: { kind: "date" },
  length: { kind: "length" },
  wheelbase: { kind: "length" },
  frontOverhang: { kind: "length" },
  rearOverhang: { kind: "length" },
  identity: serial,
});

/** What is written down of the car. */
export const carFields = fields({
  year: { kind: "year" },
  description: words,
  makerModelTrim: words,
  gearbox: { kind: "choice", of: ["manual", "automatic", "cvt", "dual-clutch", "direct-drive", "other"] },
  drive: { kind: "choice", of: ["front", "rear", "all", "part-time-four"] },
  transferCase: { kind: "yes-no" },
  curb: { kind: "mass" },
  loaded: { kind: "mass" },
  basePlateHeight: { kind: "length" },
  lampType: { kind: "choice", of: ["filament", "led", "mixed"] },
  lampSignals: { kind: "choice", of: ["combined", "separate"] },
  stopLampsWhileTowing: { kind: "yes-no" },
  parkingBrake: { kind: "choice", of: ["lever", "pedal", "switch"] },
  booster: { kind: "choice", of: ["vacuum", "electric", "none"] },
  adjustablePedals: { kind: "yes-no" },
  airSuspension: { kind: "yes-no" },
  tirePressure: { kind: "pressure" },
  tireSize: serial,
  length: { kind: "length" },
  wheelbase: { kind: "length" },
  frontOverhang: { kind: "length" },
  identity: serial,
});
