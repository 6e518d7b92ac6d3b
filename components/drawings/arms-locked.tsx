import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords["arms-locked"];

/** The bar from above, coach to the left: both arms drawn out, both latch levers flat. In the window, a plunger down. */
export function ArmsLockedDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ArmsLockedSmall />;
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          <path d="M394 40C372 52 364 92 364 134S372 216 394 228Z" fill={hatch} />
          <path d="M394 40C372 52 364 92 364 134S372 216 394 228" className="dr-edge dr-open" />

          <g transform="translate(64 122) rotate(-12)">
            <Arm />
          </g>
          <g transform="translate(64 146) rotate(12)">
            <Arm flip />
          </g>
          {[66, 202].map((y) => (
            <g key={y}>
              <path d={`M368 ${y - 13}H334V${y + 13}H368Z`} className="dr-part dr-shade" />
              <circle cx="345" cy={y} r="6" className="dr-part" />
            </g>
          ))}
          <path d="M-4 122H34V146H-4" className="dr-edge dr-shade" />
          <path d="M30 104H62Q82 104 82 122V146Q82 164 62 164H30Z" className="dr-edge" />
          <circle cx="64" cy="121" r="7" className="dr-part dr-shade" />
          <circle cx="64" cy="147" r="7" className="dr-part dr-shade" />

          <Window hatch={hatch} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[30, 30]}
            to={[
              [193, 93],
              [193, 175],
            ]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[238, 134]}
            to={[
              [262, 82],
              [262, 186],
            ]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[48, 256]}
            to={[[177, 288]]}
            label="below"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** One latch close up, the arm cut along its middle: the plunger is through the outer tube and in the inner one. */
function Window({ hatch }: { hatch: string }) {
  return (
    <>
      <circle cx="194" cy="174" r="22" className="dr-fine dr-open" />
      <path d="M190 196L170 226M206 192L238 226" className="dr-fine dr-open" />
      <path d="M96 226H382V324H96Z" className="dr-edge" />
      <path d="M98 262H262V314H98Z" className="dr-part" />
      <path d="M120 272H380V304H120Z" className="dr-part" />
      <path d="M98 262H262V272H98ZM98 304H262V314H98Z" fill={hatch} />
      <path d="M262 256H278V272H262ZM262 304H278V320H262Z" className="dr-part dr-shade" />
      <path d="M156 240H206V262H156Z" className="dr-part dr-shade" />
      <path d="M171 236H191V290Q181 296 171 290Z" className="dr-part" />
      <path d="M166 272H196" className="dr-edge dr-open" />
      <path d="M112 244H172" strokeWidth="11" className="dr-wire-out" />
      <path d="M112 244H172" strokeWidth="6" className="dr-wire-in" />
    </>
  );
}

/** One arm along its own line: outer tube, inner tube, the lever flat upon it and the plunger's housing. */
function Arm({ flip = false }: { flip?: boolean }) {
  return (
    <g transform={flip ? "scale(1 -1)" : undefined}>
      <path d="M170 -9H286V9H170Z" className="dr-edge" />
      <path d="M-4 -15H168V15H-4Z" className="dr-edge" />
      <path d="M160 -19H178V19H160Z" className="dr-part dr-shade" />
      <path d="M112 -10H156V10H112Z" className="dr-part dr-shade" />
      <path d="M56 0H132" strokeWidth="11" className="dr-wire-out" />
      <path d="M56 0H132" strokeWidth="6" className="dr-wire-in" />
      <circle cx="132" cy="0" r="7" className="dr-part" />
    </g>
  );
}

function ArmsLockedSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M88 6Q78 14 78 37T88 68Z" fill={hatch} />
          <path d="M88 6Q78 14 78 37T88 68" className="dr-part dr-open" />
          {[-1, 1].map((way) => (
            <g key={way} transform={`translate(14 37) scale(1 ${way}) rotate(20)`}>
              <path d="M34 -3H66V3H34Z" className="dr-part" />
              <path d="M0 -5H38V5H0Z" className="dr-part" />
              <path d="M34 -7H41V7H34Z" className="dr-part dr-shade" />
              <path d="M10 0H26" className="dr-edge" />
              <circle cx="27" r="3.500" className="dr-solid" />
            </g>
          ))}
          <path d="M0 32H8V42H0Z" className="dr-part dr-shade" />
          <path d="M6 26H16Q22 26 22 32V42Q22 48 16 48H6Z" className="dr-part" />
        </>
      )}
    </SmallFrame>
  );
}
