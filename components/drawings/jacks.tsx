import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords.jacks;

/** The coach's rear from the left side with its skirt cut away: jack drawn up, air bag filled to travel height. */
export function JacksDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <JacksSmall />;
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          <path d="M-4 306H394V318H-4Z" fill={hatch} />
          <path d="M-4 306H394" className="dr-edge" />

          {/* Body, skirt cut, bumper, receiver. */}
          <path d="M-4 -4H342Q352 60 350 108H-4Z" className="dr-edge" />
          <path d="M-4 108H350V122q-22 7 -44 0t-44 0t-44 0t-44 0t-44 0t-44 0t-44 0t-44 0Z" fill={hatch} />
          <path
            d="M350 108V122q-22 7 -44 0t-44 0t-44 0t-44 0t-44 0t-44 0t-44 0t-44 0"
            className="dr-fine dr-open"
          />
          <path d="M338 52H349V84H336Z" className="dr-part dr-shade" />
          <path d="M-4 20H318V-4" className="dr-fine dr-open" />

          {/* Frame rail. */}
          <path d="M-4 134H338V162H-4" className="dr-edge" />
          <path d="M-4 142H330V154H-4" className="dr-fine dr-open" />
          <path d="M338 140H376V158H338Z" className="dr-edge dr-shade" />

          {/* Suspension: hanger, beam, air bag. */}
          <path d="M-4 162H14V230H-4Z" className="dr-part dr-shade" />
          <path d="M78 232L214 226V244L78 254Z" className="dr-edge dr-shade" />
          <path d="M160 170H208V162H160ZM160 226H208V234H160Z" className="dr-part dr-shade" />
          <path
            d="M162 170H206Q222 172 220 184T206 198Q222 200 220 212T206 226H162Q146 224 148 212T162 198Q146 196 148 184T162 170Z"
            className="dr-edge"
          />
          <path d="M162 198H206" className="dr-part" />
          <path
            d="M240 166V224M234 174L240 165L246 174M234 216L240 225L246 216M226 226H250"
            className="dr-fine dr-open"
          />

          {/* Wheel. */}
          <circle cx="78" cy="240" r="66" className="dr-edge dr-shade" />
          <circle cx="78" cy="240" r="58" className="dr-fine dr-open" />
          <circle cx="78" cy="240" r="36" className="dr-edge" />
          <circle cx="78" cy="240" r="13" className="dr-part dr-shade" />
          {[0, 60, 120, 180, 240, 300].map((turn) => (
            <circle
              key={turn}
              cx="78"
              cy="217"
              r="3"
              transform={`rotate(${turn} 78 240)`}
              className="dr-solid"
            />
          ))}

          {/* Jack, drawn up. */}
          <path d="M274 162H314V172H274Z" className="dr-part dr-shade" />
          <path d="M280 172H308V230H280Z" className="dr-edge" />
          <path d="M286 180V222" className="dr-fine" />
          <path d="M288 230H300V238H288Z" className="dr-part" />
          <path d="M272 238H316Q316 248 308 248H280Q272 248 272 238Z" className="dr-edge dr-shade" />
          <path
            d="M294 256V302M288 264L294 255L300 264M288 294L294 303L300 294"
            className="dr-fine dr-open"
          />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[350, 228]}
            to={[[312, 243]]}
            label="above"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[58, 66]}
            to={[[178, 184]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function JacksSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M0 70H88" className="dr-part" />
          <path d="M0 4H80V20H0" className="dr-part" />
          <path d="M0 20H78V28H0" className="dr-part dr-shade" />
          <path d="M20 48H54V52H20Z" className="dr-part dr-shade" />
          <path d="M40 28H52Q57 32 52 38Q57 42 52 48H40Q35 42 40 38Q35 32 40 28Z" className="dr-part" />
          <circle cx="18" cy="52" r="17" className="dr-part dr-shade" />
          <circle cx="18" cy="52" r="8" className="dr-part" />
          <path d="M66 28H76V44H66Z" className="dr-part" />
          <path d="M62 44H80V49H62Z" className="dr-part dr-solid" />
          <path d="M71 66V54M66 59L71 53L76 59" className="dr-line dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
