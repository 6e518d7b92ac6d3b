import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["air-line"];

/** From the left side: the coach's coupler with the hose in it, the hose's loop, its other end at the car. */
export function AirLineDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <AirLineSmall />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          <path d="M-4 -4H34V160H-4Z" fill={hatch} />
          <path d="M34 -4V160H-4" className="dr-edge dr-open" />
          <path d="M394 60C372 64 362 80 360 100L356 240C358 256 370 262 394 264Z" className="dr-edge" />
          <path d="M394 60C372 64 362 80 360 100L356 240C358 256 370 262 394 264Z" fill={hatch} />

          {/* The bar, behind and below. */}
          <path d="M-4 272H394V294H-4" className="dr-edge" />
          <path d="M-4 279H394" className="dr-fine dr-open" />

          {/* The hose between the vehicles. */}
          <Wire d="M196 110C246 110 222 240 258 240C290 240 268 158 302 158" width={15} />

          <Coupler />
          {/* Its other end, in a coupler of the same kind. */}
          <path d="M348 140H360V176H348Z" className="dr-part dr-shade" />
          <path d="M340 146H350V170H340Z" className="dr-part" />
          <path d="M312 142H340V174H312Z" className="dr-part dr-shade" />
          <path d="M319 147V169M326 147V169M333 147V169" className="dr-fine" />
          <path d="M298 149H313V167H298Z" className="dr-part" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[72, 196]}
            to={[[112, 132]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[164, 242]}
            to={[[229, 200]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[274, 84]}
            to={[[326, 148]]}
            label="above"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** A coupler on its bulkhead with its sleeve forward and the hose's end pushed in. */
function Coupler() {
  return (
    <>
      <path d="M34 78H50V142H34Z" className="dr-part dr-shade" />
      <path d="M50 90H70V130H50Z" className="dr-part" />
      <path d="M50 100H70M50 120H70" className="dr-fine" />
      <path d="M144 96H160V124H144Z" className="dr-part" />
      <path d="M160 92H178V128H160Z" className="dr-edge dr-shade" />
      <path d="M178 100H202V120H178Z" className="dr-part dr-shade" />
      <path d="M184 100V120M190 100V120M196 100V120" className="dr-fine" />
      <path d="M70 86H92V134H70Z" className="dr-edge" />
      <path d="M98 80H144V140H98Z" className="dr-edge dr-shade" />
      <path d="M108 86V134M115 86V134M122 86V134M129 86V134" className="dr-fine" />
      <path d="M92 92H98V128H92Z" className="dr-part" />
    </>
  );
}

function AirLineSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 0H10V48H0Z" fill={hatch} />
          <path d="M10 0V48H0" className="dr-part dr-open" />
          <path d="M44 30C64 30 54 58 70 58C82 58 74 40 88 40" strokeWidth="8" className="dr-wire-out" />
          <path d="M44 30C64 30 54 58 70 58C82 58 74 40 88 40" strokeWidth="3.400" className="dr-wire-in" />
          <path d="M10 21H18V39H10Z" className="dr-part" />
          <path d="M18 17H36V43H18Z" className="dr-part dr-shade" />
          <path d="M23 21V39M28 21V39M32 21V39" className="dr-fine" />
          <path d="M36 23H44V37H36Z" className="dr-part" />
        </>
      )}
    </SmallFrame>
  );
}
