import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.cabin;

/**
 * From the driver's seat: what the car shows and what its manual's page names are the same hatched mark, so that no
 * transmission position is drawn. Manuals contradict each other.
 */
export function CabinDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <CabinSmall />;
  return (
    <Frame {...words} height={358}>
      {(hatch) => (
        <>
          {/* Windshield, dash, instrument hood. */}
          <path d="M-4 54C90 34 300 34 394 54V-4H-4Z" fill={hatch} />
          <path d="M-4 54C90 34 300 34 394 54V172H-4Z" className="dr-tone" />
          <path d="M-4 54C90 34 300 34 394 54" className="dr-edge dr-open" />
          <path d="M38 100C44 58 200 58 206 100Z" className="dr-edge" />
          <path d="M-4 172H394" className="dr-part dr-open" />
          <path d="M12 92H32M10 102H30M12 112H28" className="dr-fine" />

          {/* What the car shows. */}
          <path
            d="M256 76H366Q374 76 374 84V150Q374 158 366 158H256Q248 158 248 150V84Q248 76 256 76Z"
            className="dr-edge"
          />
          <path d="M260 90H300M260 104H290M260 118H298M260 132H286" className="dr-fine" />
          <path d="M316 96H358V138H316Z" fill={hatch} />
          <path d="M316 96H358V138H316Z" className="dr-part dr-open" />

          {/* Steering wheel, both ways free. */}
          <path
            d="M34 166C60 168 84 160 92 158H152C160 160 184 168 210 166L206 190C182 192 160 200 152 206H140L138 262H106L104 206H92C84 200 60 192 38 190Z"
            className="dr-edge"
          />
          <path
            d="M104 168H140Q148 168 148 178T138 194H106Q96 194 96 182T104 168Z"
            className="dr-part dr-shade"
          />
          <Wire d="M122 96A84 84 0 1 1 121.9 96Z" width={21} />
          <path d="M76 144A58 58 0 0 1 168 144" className="dr-edge dr-open" />
          <path d="M72 128L75 146L92 140M172 128L169 146L152 140" className="dr-edge dr-open" />

          {/* The manual, open. */}
          <path
            d="M300 232C276 222 250 222 222 230V312C250 304 276 304 300 314C324 304 350 304 380 312V230C350 222 324 222 300 232Z"
            className="dr-edge"
          />
          <path
            d="M300 232V314M222 316C250 309 276 309 300 319C324 309 350 309 380 316"
            className="dr-part dr-open"
          />
          <path
            d="M236 242C254 239 272 239 288 244M236 254C254 251 272 251 288 256M236 266C254 263 272 263 288 268M236 278C254 275 268 275 276 278"
            className="dr-fine dr-open"
          />
          <path
            d="M312 246C318 244 324 243 330 242M312 296C330 291 352 290 368 294"
            className="dr-fine dr-open"
          />
          <path d="M326 248H368V284H326Z" fill={hatch} />
          <path d="M326 248H368V284H326Z" className="dr-part dr-open" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[348, 196]}
            to={[
              [340, 134],
              [348, 252],
            ]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[28, 306]}
            to={[[62, 242]]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[198, 332]}
            to={[[230, 300]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function CabinSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 14Q44 4 88 14" className="dr-part dr-open" />
          <circle cx="32" cy="42" r="25" strokeWidth="8" className="dr-wire-out" />
          <circle cx="32" cy="42" r="25" strokeWidth="3.6" className="dr-wire-in" />
          <path d="M10 38H54V44L38 48V64H26V48L10 44Z" className="dr-line dr-shade" />
          <path d="M48 50Q58 46 66 50Q76 46 86 50V72Q76 68 66 72Q58 68 48 72Z" className="dr-part" />
          <path d="M70 54H82V64H70ZM66 20H84V34H66Z" fill={hatch} />
          <path d="M66 50V72M70 54H82V64H70ZM66 20H84V34H66Z" className="dr-fine dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
