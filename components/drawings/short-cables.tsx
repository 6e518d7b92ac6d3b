import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { CableEnd, QuickLink } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["short-cables"];

/** From above, the car's nose to the right: each removable arm in its socket, tied to the frame by its own short cable. */
export function ShortCablesDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ShortCablesSmall />;
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          {/* Frame rails, cross tube, and the sockets on it. */}
          {[84, 252].map((y) => (
            <path key={y} d={`M300 ${y - 22}H394V${y + 22}H300Z`} className="dr-part" />
          ))}
          <path d="M276 48H306V288H276Z" className="dr-edge dr-shade" />

          <Half />
          <g transform="translate(0 336) scale(1 -1)">
            <Half />
          </g>

          <path d="M394 20C362 28 348 92 348 168S362 308 394 316Z" className="dr-edge" />
          <path d="M394 20C362 28 348 92 348 168S362 308 394 316Z" fill={hatch} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[94, 168]}
            to={[
              [188, 150],
              [188, 186],
            ]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[244, 306]}
            to={[[290, 240]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[60, 30]}
            to={[[136, 116]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** The arm on the right, heading for the coach, in its socket on the cross tube, and the short cable on its inside. */
function Half() {
  return (
    <>
      <path d="M276 104H258Q246 104 246 114T258 124H276Z" className="dr-part" />
      <path d="M120 98H148V108Q148 120 134 120T120 108Z" className="dr-part" />
      <Wire d="M158 138C172 154 208 154 224 136" width={8} kind="cable" />
      <CableEnd x={154} y={133} turn={226} />
      <CableEnd x={229} y={131} turn={-42} />
      <QuickLink x={138} y={116} turn={48} />
      <QuickLink x={252} y={116} turn={-20} />

      <path d="M42 66H244V102H42A18 18 0 0 1 42 66Z" className="dr-edge" />
      <circle cx="46" cy="84" r="8" className="dr-part dr-shade" />
      <path d="M74 66V102M42 76H232" className="dr-fine" />
      <path d="M228 58H278V110H228Z" className="dr-edge dr-shade" />
      <circle cx="253" cy="84" r="8" className="dr-part" />
      <path d="M246 84H260" className="dr-fine" />
    </>
  );
}

function ShortCablesSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M88 4Q76 12 76 37T88 70Z" fill={hatch} />
          <path d="M88 4Q76 12 76 37T88 70" className="dr-part dr-open" />
          <path d="M60 8H70V66H60Z" className="dr-part dr-shade" />
          <path d="M4 12H60V22H4ZM4 52H60V62H4Z" className="dr-part" />
          <path d="M20 23C22 36 52 36 58 25M20 51C22 38 52 38 58 49" className="dr-line dr-open" />
          {[23, 51].map((y) => (
            <g key={y}>
              <circle cx="20" cy={y} r="4" className="dr-part" />
              <circle cx="59" cy={y} r="4" className="dr-part" />
            </g>
          ))}
        </>
      )}
    </SmallFrame>
  );
}
