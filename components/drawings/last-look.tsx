import { drawingWords, type DrawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const both = drawingWords["last-look"];
const walk = "M20 270H352Q384 270 384 238V82Q384 50 352 50H22";
const joints = [
  [108, 160],
  [244, 128],
  [244, 192],
  [98, 128],
  [98, 192],
  [258, 94],
  [258, 226],
  [92, 106],
  [92, 214],
  [252, 109],
  [252, 211],
] as const;
const tires = [
  [40, 84],
  [40, 236],
  [284, 80],
  [284, 240],
  [352, 80],
  [352, 240],
] as const;

type LastLookProps = DrawingProps & { only?: "joints" | "tires" };

/** The whole rig from above with the walk around it: a ring for each joint to put a hand on, a bar for each tire. */
export function LastLookDrawing({ size = "full", only, onCallout }: LastLookProps) {
  const words = only ? drawingWords[`last-look-${only}`] : both;
  if (size === "small") return <LastLookSmall words={words} />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          {tires.map(([x, y]) => (
            <path key={`${x}-${y}`} d={`M${x - 20} ${y - 8}h40v16h-40Z`} className="dr-part dr-solid" />
          ))}
          <path d="M-4 80H76Q88 80 88 92V228Q88 240 76 240H-4" className="dr-edge" />
          <path d="M-4 98H58V222H-4" className="dr-fine dr-open" />
          <path d="M-4 98H58V222H-4Z" fill={hatch} />

          {/* Cables, cord, lanyard, then the bar over them. */}
          <path
            d="M98 128C124 146 180 228 258 226M98 192C124 174 180 92 258 94"
            className="dr-line dr-open"
          />
          <path d="M92 214C136 256 212 256 252 211" strokeWidth="5" className="dr-wire-out" />
          <path d="M92 106C140 122 200 122 252 109" className="dr-fine dr-open" />
          <path d="M86 118H98V138H86ZM86 182H98V202H86Z" className="dr-part" />
          <path d="M88 152H122V168H88Z" className="dr-part dr-shade" />
          <path d="M118 148H140L254 120V134L146 160L254 186V200L140 172H118Z" className="dr-part" />

          <path
            d="M256 96Q250 160 256 224Q258 236 272 236H356Q372 234 374 216Q378 160 374 104Q372 86 356 84H272Q258 84 256 96Z"
            className="dr-edge"
          />
          <path
            d="M290 104Q282 160 290 216L308 206Q304 160 308 114ZM360 108Q364 160 360 212L350 204V116Z"
            className="dr-part dr-shade"
          />
          <path d="M308 114H350M308 206H350" className="dr-part" />

          <path d={walk} className="dr-behind dr-open" />
          <path
            d="M34 42L20 50L34 58M160 263L174 270L160 277M376 174L384 160L392 174"
            className="dr-line dr-open"
          />
          {only !== "tires" && (
            <>
              {joints.map(([x, y]) => (
                <g key={`${x}-${y}`}>
                  <circle cx={x} cy={y} r="7.5" className="dr-part" />
                  <circle cx={x} cy={y} r="3.2" className="dr-solid" />
                </g>
              ))}
              <Hand x={236} y={102} turn={162} />
              <Callout
                letter="A"
                lines={words.callouts.A}
                at={[110, 26]}
                to={[[108, 160]]}
                onCallout={onCallout}
              />
            </>
          )}
          {only !== "joints" && (
            <Callout
              letter={only ? "A" : "B"}
              lines={only ? words.callouts.A : words.callouts.B}
              at={[250, 302]}
              to={[
                [284, 244],
                [346, 244],
              ]}
              label="left"
              onCallout={onCallout}
            />
          )}
        </>
      )}
    </Frame>
  );
}

/** A hand laid on a joint; its outline is one line round palm and fingers. */
function Hand({ x, y, turn }: { x: number; y: number; turn: number }) {
  const fingers = "M-9 0L-11 -17M-3 -2L-4 -23M4 -2L4 -22M10 0L12 -16M-12 12L-21 3";
  const palm = "M-3 4H4V12H-3Z";
  return (
    <g transform={`translate(${x} ${y}) rotate(${turn}) scale(-1 1)`}>
      <path d="M0 12V40" strokeWidth="19" className="dr-wire-out" />
      <path d={fingers} strokeWidth="9" className="dr-wire-out" />
      <path d={palm} strokeWidth="20" className="dr-wire-out" />
      <path d="M0 12V44" strokeWidth="14.5" className="dr-wire-in" />
      <path d={palm} strokeWidth="15.5" className="dr-wire-in" />
      <path d={fingers} strokeWidth="4.5" className="dr-wire-in" />
    </g>
  );
}

function LastLookSmall({ words }: { words: DrawingWords }) {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M4 8H78Q84 8 84 14V60Q84 66 78 66H4" className="dr-behind dr-open" />
          <path d="M0 18H24V56H0" className="dr-part dr-shade" />
          <path d="M24 37L50 27V47Z" className="dr-part" />
          <path d="M50 22H68Q76 22 76 37T68 52H50Z" className="dr-part" />
          <path d="M54 18H64M54 56H64M4 15H14M4 59H14" className="dr-edge" />
          <circle cx="26" cy="37" r="4" className="dr-solid" />
          <circle cx="50" cy="27" r="4" className="dr-solid" />
          <circle cx="50" cy="47" r="4" className="dr-solid" />
        </>
      )}
    </SmallFrame>
  );
}
