import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Footwell, Pedal } from "./footwell";
import { Frame, type DrawingProps } from "./frame";
import { PressHand } from "./hand";
import { SmallFrame } from "./small-frame";

const words = drawingWords["manual-apply"];

/** Two windows: a hand presses the coach's control, and the car's pedal goes down from its dashed place. */
export function ManualApplyDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ManualApplySmall />;
  return (
    <Frame {...words} height={318}>
      {(hatch) => (
        <>
          <path d="M8 10H190V246H8Z" className="dr-edge" />
          <path d="M9.6 196H188.4V244.4H9.6Z" className="dr-tone" />
          <path d="M9 196H189" className="dr-part" />
          <path
            d="M34 152H164Q172 152 172 160V204Q172 212 164 212H34Q26 212 26 204V160Q26 152 34 152Z"
            className="dr-edge"
          />
          <path d="M40 166H84V198H40Z" className="dr-part dr-shade" />
          <path d="M46 176H76M46 186H68" className="dr-fine" />
          <circle cx="140" cy="182" r="9" className="dr-part dr-lit" />
          <path
            d="M140 168V163M150 172L154 168M154 182H159M150 192L154 196M140 196V201M130 192L126 196M126 182H121M130 172L126 168"
            className="dr-fine"
          />
          <path d="M98 142H126V154H98Z" className="dr-part dr-shade" />
          <PressHand x={110} y={144} />
          <path d="M-4 -4H394V8.4H-4ZM191.6 4H204V250H191.6Z" className="dr-blank" />
          <path d="M8 10H190V246H8Z" className="dr-edge dr-open" />

          <path d="M200 10H382V246H200Z" className="dr-edge" />
          <g transform="translate(204 18)">
            <Footwell hatch={hatch} to={176} />
            <Pedal pressed />
          </g>

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[34, 282]}
            to={[[104, 150]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[226, 282]}
            to={[[284, 164]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function ManualApplySmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M6 40H40V62H6Z" className="dr-part" />
          <path d="M16 34H28V40H16Z" className="dr-part dr-shade" />
          <circle cx="32" cy="51" r="4" className="dr-fine dr-lit" />
          <path d="M22 26L30 12L46 0" strokeWidth="11" className="dr-wire-out" />
          <path d="M22 26L30 12L46 0" strokeWidth="6.5" className="dr-wire-in" />
          <path d="M50 0V74H88V66H60L54 50Z" fill={hatch} />
          <path d="M54 0Q50 30 54 50L60 66H88" className="dr-part dr-open" />
          <path d="M72 2Q74 20 64 34" className="dr-edge dr-open" />
          <path d="M62 30L71 36L62 50L55 45Z" className="dr-part dr-shade" />
          <path d="M82 44H72M76 39L71 44L76 49" className="dr-line dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
