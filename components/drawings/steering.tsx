import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { GripHand } from "./hand";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.steering;

/** From the driver's seat: two hands turn the wheel a little both ways; dashed, its spokes as they come round. */
export function SteeringDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <SteeringSmall />;
  return (
    <Frame {...words} height={346}>
      {(hatch) => (
        <>
          <path d="M-4 62C90 46 300 46 394 62V216H-4Z" className="dr-tone" />
          <path d="M-4 62C90 46 300 46 394 62" className="dr-edge dr-open" />
          <path d="M92 112C100 58 290 58 298 112Z" className="dr-edge" />
          <path d="M-4 216H394" className="dr-part dr-open" />
          <path d="M14 96H56M14 108H56M14 120H56M334 96H376M334 108H376M334 120H376" className="dr-fine" />

          {/* Column. */}
          <path d="M156 196H234L240 250Q240 264 226 264H164Q150 264 150 250Z" fill={hatch} />
          <path d="M156 196H234L240 250Q240 264 226 264H164Q150 264 150 250Z" className="dr-edge dr-open" />

          <path
            d="M101 160C130 162 150 156 166 150H224C240 156 260 162 289 160V186C262 188 240 196 226 208H214L210 262H180L176 208H164C150 196 128 188 101 186Z"
            className="dr-edge"
          />
          <path
            d="M174 160H216Q226 160 226 172T212 196H178Q164 188 164 174T174 160Z"
            className="dr-part dr-shade"
          />
          <Wire d="M195 72A98 98 0 1 1 194.9 72Z" width={23} />
          <path d="M134 132A72 72 0 0 1 256 132" className="dr-edge dr-open" />
          <path d="M131 113L133 134L153 127M259 113L257 134L237 127" className="dr-edge dr-open" />

          <GripHand x={98} y={180} />
          <GripHand x={292} y={180} mirrored />

          <Callout letter="A" lines={words.callouts.A} at={[64, 28]} to={[[138, 92]]} onCallout={onCallout} />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[116, 322]}
            to={[[164, 226]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function SteeringSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <circle cx="44" cy="40" r="27" strokeWidth="9" className="dr-wire-out" />
          <circle cx="44" cy="40" r="27" strokeWidth="4.2" className="dr-wire-in" />
          <path d="M20 38H68V45L52 50V66H36V50L20 45Z" className="dr-line dr-shade" />
          <path
            d="M28 30A20 20 0 0 1 60 30M27 21L28 31L37 28M61 21L60 31L51 28"
            className="dr-line dr-open"
          />
          <path d="M10 42L4 66M78 42L84 66" strokeWidth="15" className="dr-wire-out" />
          <path d="M8 40H20M80 40H68" strokeWidth="17" className="dr-wire-out" />
          <path d="M10 42L4 68M78 42L84 68" strokeWidth="10" className="dr-wire-in" />
          <path d="M8 40H20M80 40H68" strokeWidth="12" className="dr-wire-in" />
          <path d="M12 38H24M12 43H24M76 38H64M76 43H64" className="dr-fine" />
        </>
      )}
    </SmallFrame>
  );
}
