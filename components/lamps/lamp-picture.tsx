import { ArmSignalDrawing } from "@/components/drawings/arm-signals";
import { LampsDrawing } from "@/components/drawings/lamps";
import type { Signal } from "@/lib/domain/entry";
import type { LampPair } from "@/lib/domain/lamp-board";
import type { Clip } from "./clip-marker";
import { ClipPicture } from "./clip-picture";

type LampPictureProps = {
  pair: LampPair;
  signal: Signal;
  separate: boolean;
  /** Beside the lamps, the arms that ask the driver for this signal. */
  arms: boolean;
  /** Under the lamps, what was filmed of this signal. */
  clip: Clip | null;
};

/** The car's tail as this signal should light it, and what helps to give the signal or to see it. */
export function LampPicture({ pair, signal, separate, arms, clip }: LampPictureProps) {
  return (
    <div className="flex flex-1 flex-col">
      <div className="flex min-h-44 flex-1">
        <Fitted>
          <LampsDrawing {...pair} separate={separate ? signal : undefined} />
        </Fitted>
        {arms && (
          <Fitted>
            <ArmSignalDrawing signal={signal} />
          </Fitted>
        )}
      </div>
      {clip && <ClipPicture clip={clip} signal={signal} />}
    </div>
  );
}

function Fitted({ children }: { children: React.ReactNode }) {
  return (
    <div className="relative flex-1">
      <div className="absolute inset-0 flex justify-center *:h-full *:w-auto *:max-w-full">{children}</div>
    </div>
  );
}
