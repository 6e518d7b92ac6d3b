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

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[52, 30]}
            to={[
              [186, 92],
              [186, 176],
            ]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** One arm along its own line: outer tube, inner tube, the lever flat beside it and the plunger's housing. */
function Arm({ flip = false }: { flip?: boolean }) {
  return (
    <g transform={flip ? "scale(1 -1)" : undefined}>
      <path d="M170 -9H286V9H170Z" className="dr-edge" />
      <path d="M-4 -15H168V15H-4Z" className="dr-edge" />
      <path d="M160 -19H178V19H160Z" className="dr-part dr-shade" />
      <path d="M112 -10H158V10H112Z" className="dr-part dr-shade" />
      <path d="M62 0H134" strokeWidth="11" className="dr-wire-out" />
      <path d="M62 0H134" strokeWidth="6" className="dr-wire-in" />
      <circle cx="134" cy="0" r="7" className="dr-part" />
    </g>
  );
}

function ArmsLockedSmall() {
  return <SmallFrame {...words}>{() => null}</SmallFrame>;
}
