import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { DashLamp } from "./dash-lamp";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["parking-brake"];

/** The chocks drawing undone: the wheel stands free, dashed where its chocks were; in the window, lever down, lamp dark. */
export function ParkingBrakeDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ParkingBrakeSmall />;
  return (
    <Frame {...words} height={352}>
      {(hatch) => (
        <>
          <path d="M-4 278H394V288H-4Z" fill={hatch} />
          <path d="M-4 278H394" className="dr-edge" />

          <path d="M36 216A106 106 0 0 1 248 216L237 216A95 95 0 0 0 47 216Z" fill={hatch} />
          <path d="M-4 216H36A106 106 0 0 1 248 216H394" className="dr-edge dr-open" />
          <path d="M16 -4V216M-4 64H16M336 138V216" className="dr-fine dr-open" />
          <circle cx="142" cy="192" r="86" className="dr-edge dr-shade" />
          <circle cx="142" cy="192" r="78" className="dr-fine dr-open" />
          <circle cx="142" cy="192" r="55" className="dr-edge" />
          <circle cx="142" cy="192" r="46" className="dr-fine dr-open" />
          {[0, 72, 144, 216, 288].map((turn) => (
            <g key={turn} transform={`rotate(${turn} 142 192)`}>
              <path d="M134 176L128 148M150 176L156 148" className="dr-part" />
              <circle cx="142" cy="179" r="2.6" className="dr-solid" />
            </g>
          ))}
          <circle cx="142" cy="192" r="19" className="dr-part dr-open" />
          <circle cx="142" cy="192" r="7" className="dr-part dr-shade" />

          <Gone />
          <g transform="translate(284 0) scale(-1 1)">
            <Gone />
          </g>

          {/* Lever down, lamp dark. */}
          <path d="M222 10H382V126H222Z" className="dr-edge" />
          <path d="M232 110Q286 118 342 108" className="dr-part dr-open" />
          <path d="M242 111Q242 94 256 94H278Q290 94 290 110" className="dr-part dr-shade" />
          <Wire d="M260 98L328 92" width={16} />
          <path d="M300 94.5L328 92" strokeWidth="16" className="dr-wire-out" />
          <path d="M306 50Q318 62 318 78M311 70L318 79L325 71" className="dr-fine dr-open" />
          <DashLamp x={350} y={42} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[180, 34]}
            to={[
              [330, 44],
              [272, 98],
            ]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[142, 320]}
            to={[
              [64, 268],
              [220, 268],
            ]}
            label="right"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** Where a chock was, and which way it went. */
function Gone() {
  return (
    <>
      <path d="M6 278L58 230Q62 226 66 229" className="dr-line dr-open" strokeDasharray="6 6" />
      <path d="M52 258H22M32 249L21 258L32 267" className="dr-line dr-open" />
    </>
  );
}

function ParkingBrakeSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M0 68H88" className="dr-part" />
          <path d="M0 40H10A34 34 0 0 1 78 40H88" className="dr-part dr-open" />
          <circle cx="44" cy="40" r="28" className="dr-part dr-shade" />
          <circle cx="44" cy="40" r="16" className="dr-part" />
          <circle cx="44" cy="40" r="4" className="dr-solid" />
          <path d="M18 59H4M10 53L4 59L10 65M70 59H84M78 53L84 59L78 65" className="dr-line dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
