import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { HairpinBow, HairpinLeg } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["bar-stowed"];

/** From behind the coach: arms folded to one side under the stow latch, each arm's pin back in its own hole. */
export function BarStowedDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <BarStowedSmall />;
  return (
    <Frame {...words} height={316}>
      {(hatch) => (
        <>
          {/* Coach tail: wall, bumper, hitch cross tube. */}
          <path d="M-4 -4H394V22H-4Z" fill={hatch} />
          <path d="M-4 22H394V62H-4" className="dr-edge" />
          <path d="M-4 33H394M-4 52H394" className="dr-fine" />
          <path d="M10 -4V12H44V-4M346 -4V12H380V-4" className="dr-part" />
          <path d="M-4 62H394V88H-4Z" fill={hatch} />
          <path d="M-4 88H394V118H-4" className="dr-edge dr-shade" />

          {/* Receiver's mouth with the bar's shank in it and the hitch pin across. */}
          <HairpinLeg x={44} y={146} />
          <Wire d="M64 146H34" width={18} />
          <circle cx="33" cy="146" r="8" className="dr-fine dr-shade" />
          <HairpinBow x={44} y={146} />
          <path d="M64 112H128V180H64Z" className="dr-edge" />
          <path d="M76 124H116V168H76Z" className="dr-part dr-shade" />

          {/* Bar's head, folded arms. */}
          <path d="M82 130H112L176 122V222H168L112 162H82Z" className="dr-edge" />
          <Arm y={136} />
          <Arm y={212} />
          <path d="M64 138H82M64 154H82M112 138H128M112 154H128" className="dr-behind" />
          <circle cx="164" cy="136" r="8" className="dr-part dr-shade" />
          <circle cx="164" cy="212" r="8" className="dr-part dr-shade" />

          {/* Stow latch round both arms. */}
          <path d="M222 112H244V236H222Z" className="dr-edge dr-shade" />
          <path d="M216 112H250V100H216ZM216 236H250V246H216Z" className="dr-part dr-shade" />
          <path d="M233 128V220" className="dr-fine" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[166, 276]}
            to={[[233, 232]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[362, 286]}
            to={[
              [345, 252],
              [354, 174],
            ]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[28, 226]}
            to={[[34, 168]]}
            label="right"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** A folded arm with its pin down through the arm's end and the clip's ring over the pin. */
function Arm({ y }: { y: number }) {
  return (
    <g transform={`translate(0 ${y})`}>
      <path d="M300 -9H346A9 9 0 0 1 346 9H300Z" className="dr-edge" />
      <path d="M156 -14H290V14H156A14 14 0 0 1 156 -14Z" className="dr-edge" />
      <path d="M290 -17H304V17H290Z" className="dr-edge dr-shade" />
      <path d="M324 22H356" strokeWidth="6" className="dr-wire-out" />
      <path d="M334 -9V32Q340 38 346 32V-9Z" className="dr-part" />
      <path d="M328 -17H352V-9H328Z" className="dr-part dr-shade" />
      <path d="M324 22C318 48 362 48 356 22" className="dr-line dr-open" />
    </g>
  );
}

function BarStowedSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 0H88V7H0Z" fill={hatch} />
          <path d="M0 7H88V15H0" className="dr-part dr-shade" />
          <path d="M3 27H14" strokeWidth="6" className="dr-wire-out" />
          <path d="M12 15H34V40H12Z" className="dr-part" />
          <path d="M18 21H30L44 18V54L30 33H18Z" className="dr-part dr-shade" />
          <path
            d="M40 18H78A5 5 0 0 1 78 28H40A5 5 0 0 1 40 18ZM40 46H78A5 5 0 0 1 78 56H40A5 5 0 0 1 40 46Z"
            className="dr-part"
          />
          <path d="M54 12H62V62H54Z" className="dr-part dr-shade" />
          <path
            d="M74 16V36M74 44V64M69 33Q68 41 74 41T79 33M69 61Q68 69 74 69T79 61"
            className="dr-line dr-open"
          />
        </>
      )}
    </SmallFrame>
  );
}
