import { calloutsOf } from "@/lib/domain/callouts";
import { Legend } from "./legend";
import { PartDrawing, type PartDrawingProps } from "./part-drawing";

/**
 * A drawing in all the room that its place has, and its legend where labels on it would be too small. Its place is a
 * flex column that grows; the sheet takes what is left of it and, where it is narrow, the lines of the legend more.
 */
export function DrawingSheet(props: Omit<PartDrawingProps, "size">) {
  const { marked, effect, figures, onCallout } = props;
  const callouts = calloutsOf(props);
  const legend = { callouts, marked, effect, figures, onCallout };
  return (
    <div className="dr-sheet">
      <div className="dr-stage">
        <div className="dr-room">
          <PartDrawing {...props} />
          {callouts.length > 0 && <Legend where="beside" {...legend} />}
        </div>
      </div>
      {callouts.length > 0 && <Legend where="below" {...legend} />}
    </div>
  );
}
