import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.pedal;

/** The footwell at the last look: pedal on its stop, and dashed what may have stood there and is gone. */
export function PedalDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <PedalSmall />;
  return (
    <Frame {...words} height={320}>
      {(hatch) => (
        <>
          <path d="M60 -4C44 60 40 130 46 204L96 286H394V298H-4V-4Z" fill={hatch} />
          <path d="M60 -4C44 60 40 130 46 204L96 286H394" className="dr-edge dr-open" />
          <path d="M57 20H150V72H118L112 46H54" className="dr-edge dr-shade" />
          <path d="M150 62H186V92H172V76H150Z" className="dr-part dr-shade" />
          <Wire d="M132 50C150 84 158 118 142 176" width={19} />
          <path d="M160 80H174V92H161Z" className="dr-solid" />
          <circle cx="132" cy="48" r="13" className="dr-edge" />
          <circle cx="132" cy="48" r="4" className="dr-solid" />
          <g transform="translate(142 190) rotate(20)">
            <path d="M-9 -36H5Q9 -36 9 -32V32Q9 36 5 36H-9Z" className="dr-edge dr-shade" />
            <path d="M3 -28H9M3 -20H9M3 -12H9M3 -4H9M3 4H9M3 12H9M3 20H9M3 28H9" className="dr-fine" />
          </g>
          <path d="M394 124H374Q350 124 348 148L342 252Q342 270 360 270H394Z" fill={hatch} />
          <path d="M394 124H374Q350 124 348 148L342 252Q342 270 360 270H394" className="dr-edge dr-open" />
          <path d="M356 270V286M386 270V286" className="dr-part" />

          {/* A prop with its clamp, gone. */}
          <path
            d="M170 150L184 155L158 226L144 221M174 184L262 210M168 198L257 224M262 202L334 222M252 230L330 252M262 202L252 230M334 222L330 252"
            className="dr-behind dr-open"
          />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[222, 56]}
            to={[[168, 86]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[222, 132]}
            to={[[216, 204]]}
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
