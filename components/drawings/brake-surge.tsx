import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Pedal } from "./footwell";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["brake-surge"];

/** From the bar's sliding head through the car's cut nose to its pedal: the cable slack, the pedal up. */
export function BrakeSurgeDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <BrakeSurgeSmall />;
  return (
    <Frame {...words} height={338}>
      {(hatch) => (
        <>
          {/* Nose and front wall of the car, cut. */}
          <path
            d="M394 236H286L250 168C244 120 246 80 258 34V26L196 44Q168 54 166 84V236Q166 248 178 248H394Z"
            fill={hatch}
          />
          <path
            d="M394 236H286L250 168C244 120 246 80 258 26L196 44Q168 54 166 84V236Q166 248 178 248H394"
            className="dr-edge dr-open"
          />
          <g transform="translate(218 30)">
            <Pedal />
          </g>

          {/* Bar: outer tube, sliding head, lever. */}
          <path d="M-4 196H66V224H-4" className="dr-edge" />
          <path d="M58 188H112V232H58Z" className="dr-edge dr-shade" />
          <path d="M112 198H150V222H112Z" className="dr-edge" />
          <path d="M144 190H184V230H144Z" className="dr-edge dr-shade" />
          <circle cx="158" cy="210" r="6" className="dr-part" />
          <path d="M72 206H100V214H72Z" className="dr-part" />
          <circle cx="94" cy="210" r="3" className="dr-solid" />
          <path d="M80 192L72 140H84L94 192Z" className="dr-part" />
          <circle cx="78" cy="148" r="4" className="dr-solid" />

          <Wire d="M80 148C90 196 138 196 160 142" width={8} kind="cable" />
          <Wire d="M166 139L250 131" width={15} />
          <path d="M158 130H174V150H158ZM244 121H258V141H244Z" className="dr-part dr-shade" />
          <Wire d="M258 131C276 172 306 168 324 128" width={8} kind="cable" />
          <circle cx="325" cy="125" r="6" className="dr-part" />
          <circle cx="79" cy="147" r="6" className="dr-part" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[126, 284]}
            to={[[122, 182]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[364, 296]}
            to={[[351, 96]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout letter="C" lines={words.callouts.C} at={[30, 84]} to={[[76, 143]]} onCallout={onCallout} />
        </>
      )}
    </Frame>
  );
}

function BrakeSurgeSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M44 10Q34 14 34 24V66H88V58H58L50 44Q46 24 52 6Z" fill={hatch} />
          <path d="M52 6L44 10Q34 14 34 24V66H88M52 6Q46 24 50 44L58 58H88" className="dr-part dr-open" />
          <path d="M0 46H14V58H0M14 43H26V61H14ZM26 47H38V57H26Z" className="dr-part dr-shade" />
          <path d="M68 2Q78 20 72 34" className="dr-edge dr-open" />
          <path d="M69 30L78 33L71 50L64 47Z" className="dr-part dr-shade" />
          <path d="M18 43V32Q26 48 38 34Q46 28 54 34Q62 46 72 28" className="dr-line dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
