import { DrawingSheet } from "@/components/drawings/drawing-sheet";
import { PartDrawing } from "@/components/drawings/part-drawing";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";
import type { Check } from "@/lib/domain/revision";

type CheckPictureProps = {
  check: Check;
  /** What was touched as not as drawn. */
  marked: readonly CalloutLetter[];
  onTouch: (letter: CalloutLetter) => void;
  /** A question below needs the room, and has the callouts as buttons. */
  asking: boolean;
};

/** A check's part as it should be, to be touched where it is not. */
export function CheckPicture({ check, marked, onTouch, asking }: CheckPictureProps) {
  const { part, side, drawn, effect, figures } = check;
  const drawing = { part, side, drawn, effect, figures, marked, onCallout: onTouch };
  if (!asking) return <DrawingSheet {...drawing} />;
  return (
    <div className="relative min-h-36 flex-1">
      <div className="absolute inset-0 flex justify-center *:h-full *:w-auto *:max-w-full">
        <PartDrawing {...drawing} />
      </div>
    </div>
  );
}
