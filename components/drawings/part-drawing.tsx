import type { ReactNode } from "react";
import type { LampState, Signal } from "@/lib/domain/entry";
import type { CalloutLetter, DrawingSide } from "@/lib/domain/messages/drawings";
import type { DrawnState, PartKey } from "@/lib/domain/revision";
import { AirLineDrawing } from "./air-line";
import { ArmDrawing } from "./arm";
import { ArmQuickDrawing } from "./arm-quick";
import { ArmsLockedDrawing } from "./arms-locked";
import { BallDrawing } from "./ball";
import { BarStowedDrawing } from "./bar-stowed";
import { BasePlateDrawing } from "./base-plate";
import { BrakeDrawing } from "./brake";
import { BrakeAirDrawing } from "./brake-air";
import { BrakeHydraulicDrawing } from "./brake-hydraulic";
import { BrakeSurgeDrawing } from "./brake-surge";
import { CabinDrawing } from "./cabin";
import { CablesDrawing } from "./cables";
import { ChargeLineDrawing } from "./charge-line";
import { ChocksDrawing } from "./chocks";
import { CoachHeldDrawing } from "./coach-held";
import { CordDrawing } from "./cord";
import { FuseDrawing } from "./fuse";
import { JacksDrawing } from "./jacks";
import { LampsDrawing } from "./lamps";
import { LanyardDrawing } from "./lanyard";
import { LastLookDrawing } from "./last-look";
import { LightBarDrawing } from "./light-bar";
import { ManualApplyDrawing } from "./manual-apply";
import { MonitorDrawing } from "./monitor";
import { ParkingBrakeDrawing } from "./parking-brake";
import { PedalDrawing } from "./pedal";
import { PintleDrawing } from "./pintle";
import { ReceiverDrawing } from "./receiver";
import { ShortCablesDrawing } from "./short-cables";
import { type Shown, ShownContext } from "./shown";
import { SteeringDrawing } from "./steering";
import { WheelsDrawing } from "./wheels";

export type PartDrawingProps = Omit<Shown, "bare"> & {
  part: PartKey;
  /** Which arm; the other parts have one drawing for both sides. */
  side?: DrawingSide;
  /** How it differs from the part's usual drawing, by the check it is drawn for. */
  drawn?: DrawnState;
  /** full: with lettered callouts, as wide as its place. small: 88 by 74 or so, without words. */
  size?: "full" | "small";
  /** For part "lamps": what each lamp should show. */
  lamps?: { left: LampState; right: LampState; separate?: Signal };
  /** Called when someone touches a callout; offer the same by a button as well. */
  onCallout?: (letter: CalloutLetter) => void;
};

type ArtProps = Omit<PartDrawingProps, keyof Shown>;

const table: Record<PartKey, (props: ArtProps) => ReactNode> = {
  receiver: ReceiverDrawing,
  arm: ArmDrawing,
  cables: CablesDrawing,
  cord: ({ drawn, ...props }) => <CordDrawing off={drawn === "off"} {...props} />,
  cabin: CabinDrawing,
  brake: ({ drawn, ...props }) => <BrakeDrawing installed={drawn === "installed"} {...props} />,
  wheels: ({ drawn, ...props }) => <WheelsDrawing standing={drawn === "standing"} {...props} />,
  lamps: ({ size, lamps }) => <LampsDrawing size={size} {...lamps} />,
  "last-look": ({ drawn, ...props }) => (
    <LastLookDrawing only={drawn === "joints" || drawn === "tires" ? drawn : undefined} {...props} />
  ),
  chocks: ChocksDrawing,
  "bar-stowed": BarStowedDrawing,
  ball: BallDrawing,
  pintle: PintleDrawing,
  "arm-quick": ArmQuickDrawing,
  "base-plate": BasePlateDrawing,
  "short-cables": ShortCablesDrawing,
  "arms-locked": ArmsLockedDrawing,
  lanyard: LanyardDrawing,
  "air-line": AirLineDrawing,
  "charge-line": ChargeLineDrawing,
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

/** The drawing of one part as it should be, with what someone said is not so struck out. */
export function PartDrawing({ marked, effect, figures, ...art }: PartDrawingProps) {
  return (
    <ShownContext value={{ marked, effect, figures, bare: art.drawn === "place" }}>
      {table[art.part](art)}
    </ShownContext>
  );
}
