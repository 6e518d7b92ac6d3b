import type { ReactNode } from "react";
import type { CalloutLetter, DrawingSide } from "@/lib/domain/messages/drawings";
import type { PartKey } from "@/lib/domain/revision";
import { ArmDrawing } from "./arm";
import { BarStowedDrawing } from "./bar-stowed";
import { BrakeDrawing } from "./brake";
import { CabinDrawing } from "./cabin";
import { CablesDrawing } from "./cables";
import { ChocksDrawing } from "./chocks";
import { CordDrawing } from "./cord";
import { type LampLook, LampsDrawing } from "./lamps";
import { LastLookDrawing } from "./last-look";
import { ReceiverDrawing } from "./receiver";
import { WheelsDrawing } from "./wheels";

export type PartDrawingProps = {
  part: PartKey;
  /** Which arm; the other parts have one drawing for both sides. */
  side?: DrawingSide;
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
  cord: CordDrawing,
  cabin: CabinDrawing,
  brake: BrakeDrawing,
  wheels: WheelsDrawing,
  lamps: ({ size, lamps }) => <LampsDrawing size={size} left={lamps?.left} right={lamps?.right} />,
  "last-look": LastLookDrawing,
  chocks: ChocksDrawing,
  "bar-stowed": BarStowedDrawing,
};

/** The drawing of one part as it should be. */
export function PartDrawing(props: PartDrawingProps) {
  return table[props.part](props);
}
