import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const filled = drawingWords.fuse;
const empty = drawingWords["fuse-off"];
const columns = [196, 244, 292, 340];
const rows = [66, 98, 130, 162, 194, 226];

type FuseProps = DrawingProps & { off?: boolean };

/** The fuse box beside the column with one place called out: its fuse in, or out and kept. */
export function FuseDrawing({ size = "full", off = false, onCallout }: FuseProps) {
  const words = off ? empty : filled;
  if (size === "small") return <FuseSmall off={off} />;
  return (
    <Frame {...words} height={334}>
      {(hatch) => (
        <>
          {/* Dash, column, part of the steering wheel. */}
          <path d="M-4 18H394V274H-4Z" className="dr-tone" />
          <path d="M-4 18H394M-4 274H394" className="dr-part dr-open" />
          <path d="M-4 54H66L82 70V104L66 120H-4Z" className="dr-edge" />
          <path d="M74 72L118 56" strokeWidth="11" className="dr-wire-out" />
          <path d="M74 72L118 56" strokeWidth="6" className="dr-wire-in" />
          <Wire d="M6 -12C44 14 52 60 46 96C42 122 26 148 -10 168" width={21} />

          {/* The box, open. */}
          <path
            d="M170 34H366Q376 34 376 44V248Q376 258 366 258H170Q160 258 160 248V44Q160 34 170 34Z"
            className="dr-edge"
          />
          {rows.flatMap((y, row) =>
            columns.map((x, column) => {
              if (row === 4 && column === 1) return null;
              return <Place key={`${x}-${y}`} x={x} y={y} />;
            }),
          )}
          {off ? (
            <>
              <path d="M223 183H265V205H223Z" fill={hatch} />
              <path d="M223 183H265V205H223Z" className="dr-edge dr-open" />
              <path d="M230 187H236V201H230ZM252 187H258V201H252Z" className="dr-solid" />
              <path
                d="M212 194C184 194 154 200 130 212M139 200L129 213L145 215"
                className="dr-line dr-open"
              />
            </>
          ) : (
            <>
              <path d="M223 183H265V205H223Z" className="dr-edge dr-shade" />
              <path d="M230 190H236V198H230ZM252 190H258V198H252ZM241 194H247" className="dr-fine" />
              <circle cx="244" cy="194" r="29" className="dr-fine dr-open" />
              <path d="M215 196L142 206" className="dr-fine" />
              <circle cx="86" cy="206" r="56" className="dr-edge" />
            </>
          )}
          <BladeFuse x={86} y={200} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[292, 306]}
            to={[[248, 200]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[30, 306]}
            to={[[72, 202]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** A fuse in the box, from its back. */
function Place({ x, y }: { x: number; y: number }) {
  return (
    <path
      d={`M${x - 19} ${y - 9}h38v18h-38ZM${x - 13} ${y - 3}h5v6h-5ZM${x + 8} ${y - 3}h5v6h-5Z`}
      className="dr-fine"
    />
  );
}

/** A blade fuse from its side, its strip whole in the clear body. */
function BladeFuse({ x, y }: { x: number; y: number }) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <path d="M-23 14V44L-18 49L-13 44V14ZM23 14V44L18 49L13 44V14Z" className="dr-part dr-shade" />
      <path d="M-30 -34H30V-20L27 20H-27L-30 -20Z" className="dr-edge" />
      <path d="M-30 -20H30" className="dr-fine" />
      <path d="M-18 20V-2C-18 -14 -6 -14 -2 -5S14 6 18 -8V20" className="dr-edge dr-open" />
    </g>
  );
}

function FuseSmall({ off }: { off: boolean }) {
  return (
    <SmallFrame {...(off ? empty : filled)}>
      {(hatch) => (
        <>
          <path d="M36 4H82Q86 4 86 8V66Q86 70 82 70H36Q32 70 32 66V8Q32 4 36 4Z" className="dr-part" />
          {[14, 28, 42, 60].map((y) => (
            <path
              key={y}
              d={`M64 ${y - 4}h16v8h-16Z${y === 28 || y === 42 ? "" : `M38 ${y - 4}h16v8h-16Z`}`}
              className="dr-fine"
            />
          ))}
          {off && <path d="M36 26H57V44H36Z" fill={hatch} />}
          <path d="M36 26H57V44H36Z" className={`dr-part ${off ? "dr-open" : "dr-shade"}`} />
          {off && <path d="M41 30V40M52 30V40" className="dr-edge" />}
          {!off && <path d="M41 38V35Q46 28 47 35T52 34V38" className="dr-line dr-open" />}
          <path d="M7 44V56M19 44V56" className={off ? "dr-edge" : "dr-open"} />
          {off && <path d="M3 28H23V44H3Z" className="dr-part dr-shade" />}
          {!off && <path d="M0 14Q14 26 12 44T0 66" className="dr-edge dr-open" />}
        </>
      )}
    </SmallFrame>
  );
}
