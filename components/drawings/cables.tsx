import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { CableEnd, QuickLink } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.cables;
const downward = "M108 127C124 133 135 147 147 160C184 200 230 249 276 247";
const upward = "M108 193C124 187 135 173 147 160C184 120 230 71 276 73";

/** Both safety cables from above: coach to the left, crossed under the bar, hooked to both frames. */
export function CablesDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <CablesSmall />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          <path d="M-4 16H20Q34 16 34 30V290Q34 304 20 304H-4Z" fill={hatch} />
          <path d="M-4 16H20Q34 16 34 30V290Q34 304 20 304H-4" className="dr-edge dr-open" />
          <path d="M34 88H50V232H34Z" className="dr-edge dr-shade" />

          {[116, 204].map((y) => (
            <path key={y} d={`M50 ${y - 11}H64Q72 ${y - 11} 72 ${y}T64 ${y + 11}H50Z`} className="dr-part" />
          ))}
          {[73, 247].map((y) => (
            <path
              key={y}
              d={`M372 ${y - 11}H336Q325 ${y - 11} 325 ${y}T336 ${y + 11}H372Z`}
              className="dr-part"
            />
          ))}

          <Wire d={downward} width={9} kind="cable" />
          <Wire d={upward} width={9} kind="cable" />
          <CableEnd x={98} y={123} turn={194} />
          <CableEnd x={98} y={197} turn={166} />
          <CableEnd x={288} y={247} />
          <CableEnd x={288} y={73} />
          <QuickLink x={72} y={117} turn={14} />
          <QuickLink x={72} y={203} turn={-14} />
          <QuickLink x={316} y={73} />
          <QuickLink x={316} y={247} />

          {/* The bar over them. */}
          <Wire d="M162 147L250 122" width={24} />
          <Wire d="M162 173L250 198" width={24} />
          <Wire d="M250 122L316 104" width={17} />
          <Wire d="M250 198L316 216" width={17} />
          {[104, 216].map((y) => (
            <g key={y}>
              <path d={`M372 ${y - 14}H312V${y + 14}H372`} className="dr-edge dr-shade" />
              <circle cx="323" cy={y} r="6.5" className="dr-part" />
            </g>
          ))}
          <path d="M50 144H92V176H50Z" className="dr-edge dr-shade" />
          <path d="M88 149H132V171H88Z" className="dr-edge" />
          <path d="M126 136H164Q180 136 180 150V170Q180 184 164 184H126Z" className="dr-edge" />
          <circle cx="166" cy="147" r="6" className="dr-part dr-shade" />
          <circle cx="166" cy="173" r="6" className="dr-part dr-shade" />

          <path d="M394 46C350 58 338 104 338 160C338 216 350 262 394 274" className="dr-edge" />
          <path d="M394 46C350 58 338 104 338 160C338 216 350 262 394 274Z" fill={hatch} />

          {/* Where they run beneath its head. */}
          <path d="M128 140L147 160L168 183M128 180L147 160L168 137" className="dr-behind dr-open" />

          <path d="M62 104L108 68M86 108L128 89" className="dr-fine dr-open" />
          <circle cx="146" cy="54" r="40" className="dr-part" />
          <QuickLink x={146} y={56} scale={1.7} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[306, 298]}
            label="left"
            to={[[328, 252]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[92, 244]}
            to={[[147, 160]]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[222, 36]}
            to={[[157, 43]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function CablesSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 6H10V68H0ZM88 6Q78 12 78 37T88 68Z" fill={hatch} />
          <path d="M0 6H10V68H0M88 6Q78 12 78 37T88 68" className="dr-part dr-open" />
          <path d="M10 24C24 26 26 34 30 37C42 52 60 64 78 62" className="dr-line dr-open" />
          <path d="M10 50C24 48 26 40 30 37C42 22 60 10 78 12" className="dr-line dr-open" />
          <path d="M34 32L78 22V28L40 37L78 46V52L34 42H10V32Z" className="dr-part dr-shade" />
        </>
      )}
    </SmallFrame>
  );
}
