import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { HairpinBow, HairpinLeg } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords.pintle;

/** The hook from the left side, coach to the left, the ring cut through its middle. */
export function PintleDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <PintleSmall />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          {/* Mounting plate with its bolts. */}
          <path d="M-4 104H40V276H-4Z" fill={hatch} />
          <path d="M-4 104H40V276H-4" className="dr-edge dr-open" />
          {[122, 244].map((y) => (
            <path key={y} d={`M64 ${y}H78V${y + 18}H64Z`} className="dr-part dr-shade" />
          ))}
          <path d="M40 92H64V288H40Z" className="dr-edge dr-shade" />

          {/* Far half of the ring, then hook, then what is cut. */}
          <path d="M170 166H312V218H170Z" className="dr-part" />
          <path d="M312 172H394V212H312Z" className="dr-edge" />
          <path d="M326 184H394" className="dr-fine dr-open" />
          <path
            d="M64 156H126Q138 156 138 170V192A32 32 0 0 0 202 194L206 168Q212 152 226 158Q240 166 238 186Q232 266 168 270H64Z"
            className="dr-edge"
          />
          <path d="M64 258H160" className="dr-fine dr-open" />
          <circle cx="170" cy="192" r="26" className="dr-edge" />
          <circle cx="170" cy="192" r="26" fill={hatch} />
          <circle cx="306" cy="192" r="26" className="dr-edge" />
          <circle cx="306" cy="192" r="26" fill={hatch} />

          {/* Latch closed on the hook's tip; its pivot, then its pin. */}
          <path
            d="M78 156V126Q78 104 100 104H174Q236 108 248 158Q250 172 238 174L222 172Q212 172 208 164Q198 148 172 148H138V156Z"
            className="dr-edge"
          />
          <circle cx="100" cy="130" r="9" className="dr-part dr-shade" />
          <HairpinLeg x={152} y={127} />
          <circle cx="152" cy="127" r="11" className="dr-edge dr-shade" />
          <HairpinBow x={152} y={127} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[256, 76]}
            to={[[232, 164]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[40, 44]}
            to={[[144, 118]]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[258, 282]}
            to={[
              [182, 206],
              [302, 206],
            ]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function PintleSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 14H12V66H0Z" className="dr-part dr-shade" />
          <path d="M38 30H74V48H38ZM74 32H88V46H74Z" className="dr-part" />
          <path d="M12 28H26V38A11 11 0 0 0 48 38L50 30Q58 24 60 36Q58 62 36 64H12Z" className="dr-part" />
          <circle cx="37" cy="38" r="8.5" className="dr-part" />
          <circle cx="37" cy="38" r="8.5" fill={hatch} />
          <circle cx="72" cy="39" r="8.5" className="dr-part" />
          <circle cx="72" cy="39" r="8.5" fill={hatch} />
          <path d="M16 28V20Q16 12 24 12H40Q58 14 62 30L54 33Q50 24 38 24H26V28Z" className="dr-part" />
          <path d="M33 6V30" className="dr-line" />
          <circle cx="33" cy="18" r="4.5" className="dr-part dr-shade" />
        </>
      )}
    </SmallFrame>
  );
}
