import type { ReactNode } from "react";
import type { CalloutLetter, DrawingSide } from "@/lib/domain/messages/drawings";
import type { DrawnState, PartKey } from "@/lib/domain/revision";
import { ArmDrawing } from "./arm";
import { BarStowedDrawing } from "./bar-stowed";
import { BrakeDrawing } from "./brake";
import { CabinDrawing } from "./cabin";
import { CablesDrawing } from "./cables";
import { ChocksDrawing } from "./chocks";
import { CordDrawing } from "./cord";
import { type LampLook, LampsDrawing } from "./lamps";
import { LastLookDrawing } from "./last-look";
import { CoachHeldDrawing } from "./coach-held";
import { SteeringDrawing } from "./steering";
import { ParkingBrakeDrawing } from "./parking-brake";
import { FuseDrawing } from "./fuse";
import { PedalDrawing } from "./pedal";
import { BrakeAirDrawing } from "./brake-air";
import { BrakeHydraulicDrawing } from "./brake-hydraulic";
import { BrakeSurgeDrawing } from "./brake-surge";
import { MonitorDrawing } from "./monitor";
import { ManualApplyDrawing } from "./manual-apply";
import { JacksDrawing } from "./jacks";
import { LightBarDrawing } from "./light-bar";
import { ReceiverDrawing } from "./receiver";
import { WheelsDrawing } from "./wheels";

export type PartDrawingProps = {
  part: PartKey;
  /** Which arm; the other parts have one drawing for both sides. */
  side?: DrawingSide;
  /** How it differs from the part's usual drawing, by the check it is drawn for. */
  drawn?: DrawnState;
  /** full: with lettered callouts, as wide as its place. small: 88 by 74 or so, without words. */
  size?: "full" | "small";
  /** For part "lamps": what each lamp should show. */
  lamps?: { left: LampLook; right: LampLook };
  /** Called when someone touches a callout; offer the same by a button as well. */
  onCallout?: (letter: CalloutLetter) => void;
};

const table: Record<PartKey, (props: PartDrawingProps) => ReactNode> = {
  receiver: ReceiverDrawing,
  arm: ArmDrawing,
  cables: CablesDrawing,
  cord: ({ drawn, ...props }) => <CordDrawing off={drawn === "off"} {...props} />,
  cabin: CabinDrawing,
  brake: ({ drawn, ...props }) => <BrakeDrawing installed={drawn === "installed"} {...props} />,
  wheels: ({ drawn, ...props }) => <WheelsDrawing standing={drawn === "standing"} {...props} />,
  lamps: ({ size, lamps }) => <LampsDrawing size={size} left={lamps?.left} right={lamps?.right} />,
  "last-look": ({ drawn, ...props }) => (
    <LastLookDrawing only={drawn === "joints" || drawn === "tires" ? drawn : undefined} {...props} />
  ),
  chocks: ChocksDrawing,
  "bar-stowed": BarStowedDrawing,
  "coach-held": CoachHeldDrawing,
  steering: SteeringDrawing,
  "parking-brake": ParkingBrakeDrawing,
  fuse: ({ drawn, ...props }) => <FuseDrawing off={drawn === "off"} {...props} />,
  pedal: PedalDrawing,
  "brake-air": BrakeAirDrawing,
  "brake-hydraulic": BrakeHydraulicDrawing,
  "brake-surge": BrakeSurgeDrawing,
  monitor: MonitorDrawing,
  "manual-apply": ManualApplyDrawing,
  jacks: JacksDrawing,
  "light-bar": LightBarDrawing,
};

/** The drawing of one part as it should be. */
export function PartDrawing(props: PartDrawingProps) {
  return table[props.part](props);
}
