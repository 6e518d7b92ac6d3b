import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords["base-plate"];
const bolts = [
  [50, 122],
  [50, 178],
  [340, 122],
  [340, 178],
] as const;

/** From in front of the car, low: cross tube on both frame rails, a pair of tabs on each side of it. */
export function BasePlateDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <BasePlateSmall />;
  return (
    <Frame {...words} height={338}>
      {(hatch) => (
        <>
          {/* What hides the frame rails. */}
          <path d="M26 -4H74V100H26ZM316 -4H364V100H316Z" className="dr-part" />
          <path d="M-4 -4H394V14Q360 32 300 34H90Q30 32 -4 14Z" className="dr-blank" />
          <path d="M-4 -4H394V14Q360 32 300 34H90Q30 32 -4 14Z" fill={hatch} />
          <path d="M-4 14Q30 32 90 34H300Q360 32 394 14" className="dr-edge dr-open" />

          <path d="M70 130H320V170H70Z" className="dr-edge" />
          <path d="M70 140H320" className="dr-fine dr-open" />
          <path d="M22 96H78V204H22ZM312 96H368V204H312Z" className="dr-edge dr-shade" />
          {bolts.map(([x, y]) => (
            <Bolt key={`${x}-${y}`} x={x} y={y} />
          ))}
          <Tabs x={122} />
          <Tabs x={268} />

          {/* Push down, pull up. */}
          <path
            d="M318 212V262M309 222L318 211L327 222M309 252L318 263L327 252"
            className="dr-part dr-open"
          />

          {/* A bolt close up. */}
          <path d="M40 190L50 246M60 188L110 240" className="dr-fine dr-open" />
          <circle cx="80" cy="278" r="48" className="dr-edge dr-shade" />
          <g transform="translate(80 278) scale(2.5)">
            <Bolt x={0} y={0} />
          </g>

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[156, 270]}
            to={[[102, 258]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[174, 78]}
            to={[
              [64, 122],
              [146, 172],
            ]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[360, 308]}
            to={[[318, 238]]}
            label="left"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** A hexagon head on its washer with one painted line over both and the plate. */
function Bolt({ x, y }: { x: number; y: number }) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle r="12.500" className="dr-fine" />
      <path d="M-4.500 -8L4.500 -8L9 0L4.500 8H-4.500L-9 0Z" className="dr-fine" />
      <path d="M0 0L11 -11" strokeWidth="3" className="dr-wire-out" />
    </g>
  );
}

/** Two tabs seen edge on, on the arm that carries them, with the weld along the tube. */
function Tabs({ x }: { x: number }) {
  return (
    <g transform={`translate(${x} 0)`}>
      <path d="M-20 164H20V238H-20Z" className="dr-part dr-shade" />
      <path d="M-32 182H32V196H-32ZM-32 224H32V238H-32Z" className="dr-edge" />
      <path d="M-6 182V196M6 182V196M-6 224V238M6 224V238" className="dr-behind" />
      <path
        d="M-28 170q4 8 8 0q4 8 8 0q4 8 8 0q4 8 8 0q4 8 8 0q4 8 8 0q4 8 8 0"
        className="dr-part dr-open"
      />
    </g>
  );
}

function BasePlateSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 0H88V10Q44 18 0 10Z" fill={hatch} />
          <path d="M0 10Q44 18 88 10" className="dr-part dr-open" />
          <path d="M18 28H70V38H18Z" className="dr-part" />
          <path d="M4 20H20V48H4ZM68 20H84V48H68Z" className="dr-part dr-shade" />
          {[28, 41].map((y) => (
            <g key={y}>
              <circle cx="12" cy={y} r="3.500" className="dr-solid" />
              <circle cx="76" cy={y} r="3.500" className="dr-solid" />
            </g>
          ))}
          <path d="M24 42H40V47H24ZM24 55H40V60H24ZM48 42H64V47H48ZM48 55H64V60H48Z" className="dr-part" />
          <path d="M32 47V55M56 47V55" className="dr-edge" />
        </>
      )}
    </SmallFrame>
  );
}
