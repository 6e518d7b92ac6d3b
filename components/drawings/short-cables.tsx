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
          {/* Frame rails with their eyes, under the car's nose. */}
          {[112, 224].map((y) => (
            <path key={y} d={`M300 ${y - 22}H394V${y + 22}H300Z`} className="dr-part dr-shade" />
          ))}
          <path d="M296 134H312Q322 134 322 145T312 156H296ZM296 202H312Q322 202 322 191T312 180H296Z" className="dr-fine" />
          <path d="M272 78H302V258H272Z" className="dr-edge dr-shade" />

          <Half />
          <g transform="translate(0 336) scale(1 -1)">
            <Half />
          </g>

          <path d="M394 28C362 36 350 96 350 168S362 300 394 308Z" className="dr-edge" />
          <path d="M394 28C362 36 350 96 350 168S362 300 394 308Z" fill={hatch} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[82, 168]}
            to={[
              [180, 148],
              [180, 188],
            ]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[226, 300]}
            to={[[262, 196]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[72, 36]}
            to={[[131, 128]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** The left arm: in its socket at the cross tube, tabs toward the coach, its cable on the inside. */
function Half() {
  return (
    <>
      <path d="M236 92H276V132H236Z" className="dr-edge dr-shade" />
      <path d="M74 98H240V126H74A14 14 0 0 1 74 98Z" className="dr-edge" />
      <circle cx="78" cy="112" r="6" className="dr-part dr-shade" />
      <path d="M104 98V126" className="dr-fine" />
      <path d="M250 84V140" strokeWidth="7" className="dr-wire-out" />
      <path d="M250 84V140" strokeWidth="2.6" className="dr-wire-in" />
      <path d="M122 126H146Q146 138 134 138T122 126Z" className="dr-part" />
    </>
  );
}

function ShortCablesSmall() {
  return <SmallFrame {...words}>{() => null}</SmallFrame>;
}
