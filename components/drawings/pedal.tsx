import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Footwell, Pedal, Seat } from "./footwell";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords.pedal;

/** The footwell at the last look: pedal on its stop, and dashed what may have stood there and is gone. */
export function PedalDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <PedalSmall />;
  return (
    <Frame {...words} height={222}>
      {(hatch) => (
        <>
          <Footwell hatch={hatch} />
          <Pedal />
          <Seat hatch={hatch} />

          {/* A prop with its clamp, gone. */}
          <path
            d="M-14 -38H18V-30H14V30H18V38H-14M18 -30V30"
            transform="translate(108 144) rotate(20)"
            className="dr-behind dr-open"
          />
          <path
            d="M0 -6H86M0 6H86M86 -12H186V12H86Z"
            transform="translate(128 152) rotate(8)"
            className="dr-behind dr-open"
          />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[196, 40]}
            to={[[131, 65]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[206, 104]}
            to={[[204, 160]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function PedalSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M8 0Q2 30 8 46L20 66H88V74H0V0Z" fill={hatch} />
          <path d="M8 0Q2 30 8 46L20 66H88" className="dr-part dr-open" />
          <path d="M24 4Q34 22 28 38" className="dr-edge dr-open" />
          <path d="M25 34L34 37L27 54L20 51Z" className="dr-part dr-shade" />
          <path d="M88 26Q80 26 80 34L78 62H88" className="dr-part dr-shade" />
          <path d="M38 42L76 50M36 50L74 58" className="dr-behind dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
