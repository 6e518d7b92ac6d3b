import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { CableEnd, QuickLink } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.lanyard;

/** From the left side: the lanyard from the coach's frame to the pin of the switch on the car, the bar well below it. */
export function LanyardDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <LanyardSmall />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          {/* Coach: body, frame rail with the lanyard's eye, receiver. */}
          <path d="M-4 -4H60V78Q60 88 50 88H-4Z" fill={hatch} />
          <path d="M60 -4V78Q60 88 50 88H-4" className="dr-edge dr-open" />
          <path d="M-4 98H74V152H-4" className="dr-edge" />
          <path d="M-4 110H66V140H-4" className="dr-fine dr-open" />
          <path d="M20 152H52V222H20Z" className="dr-part" />

          {/* Bar. */}
          <path d="M-4 218H84V258H-4" className="dr-edge dr-shade" />
          <path d="M84 226H122V250H84" className="dr-edge" />
          <path d="M116 218H150V258H116Z" className="dr-edge dr-shade" />
          <path d="M150 225H240V251H150Z" className="dr-edge" />
          <path d="M240 229H310V247H240Z" className="dr-edge" />

          {/* Car: nose, base plate, switch on its bracket. */}
          <path d="M394 54C366 58 352 72 350 96L344 250C346 268 360 276 394 278Z" className="dr-edge" />
          <path d="M394 54C366 58 352 72 350 96L344 250C346 268 360 276 394 278Z" fill={hatch} />
          <path d="M296 222H346V254H296Z" className="dr-edge dr-shade" />
          <circle cx="310" cy="238" r="8" className="dr-part" />
          <path d="M322 158H336V222H322Z" className="dr-part dr-shade" />
          <path d="M282 112H332Q342 112 342 122V150Q342 160 332 160H282Z" className="dr-edge" />
          <path d="M300 124H326M300 134H326" className="dr-fine" />
          <path d="M270 117H284V155H270Z" className="dr-edge dr-shade" />

          {/* Pin fully in, its loop, the lanyard with slack, its end on the frame's own eye. */}
          <path d="M284 130H316V142H284" className="dr-behind dr-open" />
          <path d="M258 124H271V148H258Z" className="dr-part" />
          <circle cx="247" cy="136" r="10" strokeWidth="7" className="dr-wire-out" />
          <circle cx="247" cy="136" r="10" strokeWidth="2.6" className="dr-wire-in" />
          <Wire d="M213 142C202 206 152 206 131 139" width={8} kind="cable" />
          <CableEnd x={220} y={140} turn={-10} />
          <CableEnd x={122} y={130} turn={206} />
          <path d="M74 112H86Q98 112 98 124T86 138H74Z" className="dr-part" />
          <QuickLink x={98} y={124} turn={10} scale={1.15} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[302, 72]}
            to={[[265, 132]]}
            label="above"
            onCallout={onCallout}
          />
          <Callout letter="B" lines={words.callouts.B} at={[96, 44]} to={[[90, 118]]} onCallout={onCallout} />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[176, 296]}
            to={[[174, 190]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function LanyardSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 0H14V14H0Z" fill={hatch} />
          <path d="M14 0V14H0" className="dr-part dr-open" />
          <path d="M0 20H20V34H0" className="dr-part dr-shade" />
          <path d="M88 10Q78 14 77 24V60Q80 64 88 66Z" fill={hatch} />
          <path d="M88 10Q78 14 77 24V60Q80 64 88 66" className="dr-part dr-open" />
          <path d="M58 20H77V34H58Z" className="dr-part dr-shade" />
          <path d="M26 28C34 48 42 48 50 28" className="dr-edge dr-open" />
          <circle cx="23" cy="27" r="4.500" className="dr-part" />
          <circle cx="52" cy="27" r="4.500" className="dr-part" />
          <path d="M0 54H77V62H0Z" className="dr-part" />
        </>
      )}
    </SmallFrame>
  );
}
