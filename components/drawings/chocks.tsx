import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.chocks;

/** A car wheel from the side with a chock tight on each side of it; in the window, the parking brake pulled up. */
export function ChocksDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ChocksSmall />;
  return (
    <Frame {...words} height={352}>
      {(hatch) => (
        <>
          <path d="M-4 278H394V288H-4Z" fill={hatch} />
          <path d="M-4 278H394" className="dr-edge" />

          {/* Wheel arch and sill. */}
          <path d="M56 214A122 122 0 0 1 296 214L284 214A109 109 0 0 0 68 214Z" fill={hatch} />
          <path d="M-4 214H56A122 122 0 0 1 296 214H394" className="dr-edge dr-open" />
          <path d="M24 -4V214M-4 60H24M330 146V214" className="dr-fine dr-open" />

          <circle cx="176" cy="178" r="100" className="dr-edge dr-shade" />
          <circle cx="176" cy="178" r="91" className="dr-fine dr-open" />
          <circle cx="176" cy="178" r="64" className="dr-edge" />
          <circle cx="176" cy="178" r="54" className="dr-fine dr-open" />
          {[0, 72, 144, 216, 288].map((turn) => (
            <g key={turn} transform={`rotate(${turn} 176 178)`}>
              <path d="M166 160L160 126M186 160L192 126" className="dr-part" />
              <circle cx="176" cy="163" r="3" className="dr-solid" />
            </g>
          ))}
          <circle cx="176" cy="178" r="22" className="dr-part dr-open" />
          <circle cx="176" cy="178" r="8" className="dr-part dr-shade" />

          <Chock />
          <g transform="translate(352 0) scale(-1 1)">
            <Chock />
          </g>

          {/* Parking brake, up. */}
          <circle cx="324" cy="82" r="56" className="dr-edge" />
          <path d="M278 114Q324 122 372 112" className="dr-part dr-open" />
          <path d="M290 115Q290 98 304 98H330Q342 98 342 114" className="dr-part dr-shade" />
          <Wire d="M308 102L354 62" width={16} />
          <path d="M336 78L354 62" strokeWidth="16" className="dr-wire-out" />
          <path d="M354 92Q364 84 366 70M358 77L366 68L373 78" className="dr-fine dr-open" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[176, 312]}
            to={[
              [114, 262],
              [238, 262],
            ]}
            label="below"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[236, 28]}
            to={[[322, 88]]}
            label="left"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** The chock before the wheel; its face follows the tread. */
function Chock() {
  return (
    <>
      <path d="M18 278L76 222Q80 218 86 221L91 231A100 100 0 0 0 146 273.500L148 278Z" className="dr-edge" />
      <path d="M38 270H118M52 258H100M66 246H90" className="dr-fine" />
    </>
  );
}

function ChocksSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M0 68H88" className="dr-part" />
          <path d="M0 40H10A34 34 0 0 1 78 40H88" className="dr-part dr-open" />
          <circle cx="44" cy="40" r="28" className="dr-part dr-shade" />
          <circle cx="44" cy="40" r="16" className="dr-part" />
          <circle cx="44" cy="40" r="4" className="dr-solid" />
          <path
            d="M2 68L18 52L22 57Q26 64 36 67V68ZM86 68L70 52L66 57Q62 64 52 67V68Z"
            className="dr-part dr-solid"
          />
        </>
      )}
    </SmallFrame>
  );
}
