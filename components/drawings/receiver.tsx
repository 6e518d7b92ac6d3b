import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { HairpinBow, HairpinLeg } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.receiver;

/** Coach tail from the side and a little above: receiver, drop receiver and bar, each pinned and clipped. */
export function ReceiverDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ReceiverSmall />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          <path d="M-4 -4H108V46H-4Z" fill={hatch} />
          <path d="M108 -4V46" className="dr-edge" />
          <path d="M-4 40H112Q124 40 124 50V58Q124 68 112 68H-4" className="dr-edge" />
          <path d="M-4 50H116" className="dr-fine dr-open" />

          {/* Handles of the two pins, bent up on the far side. */}
          <Wire d="M188 104V58Q188 48 198 45L206 43" width={13} />
          <Wire d="M346 212V168Q346 158 356 155L364 153" width={13} />

          {/* Receiver tube with its collar. */}
          <path d="M-4 104H134L164 83H-4Z" className="dr-part dr-shade" />
          <path d="M-4 104H134V160H-4" className="dr-edge" />
          <path d="M132 98H162L192 77H162Z" className="dr-edge dr-shade" />
          <path d="M162 98L192 77V145L162 166Z" className="dr-edge dr-shade" />
          <path d="M132 98H162V166H132Z" className="dr-edge" />

          {/* Drop receiver: shank, drop, lower tube with its collar. */}
          <path d="M170 108H206L230 91H186Z" className="dr-part dr-shade" />
          <path d="M168 108H210V154H168Z" className="dr-edge" />
          <path d="M206 92H244L272 72H234Z" className="dr-edge dr-shade" />
          <path d="M244 92L272 72V262L244 282Z" className="dr-edge dr-shade" />
          <path d="M206 92H244V282H206Z" className="dr-edge" />
          <path d="M206 110q5 4 0 8t0 8t0 8t0 8t0 8" className="dr-fine dr-open" />
          <path d="M244 216H296L324 196H272L244 216Z" className="dr-part dr-shade" />
          <path d="M244 216H296V272H244Z" className="dr-edge" />
          <path d="M244 222q5 4 0 8t0 8t0 8t0 8t0 8" className="dr-fine dr-open" />
          <path d="M292 210H322L350 190H320Z" className="dr-edge dr-shade" />
          <path d="M322 210L350 190V258L322 278Z" className="dr-edge dr-shade" />
          <path d="M292 210H322V278H292Z" className="dr-edge" />
          <path d="M328 220H394V203H348Z" className="dr-part dr-shade" />
          <path d="M394 220H328V266H394" className="dr-edge" />

          {/* Shanks inside the tubes. */}
          <path d="M166 108H100V154H166M326 220H262V266H326" className="dr-behind dr-open" />

          <Pin x={147} y={131} />
          <Pin x={307} y={243} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[28, 252]}
            to={[[104, 181]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[196, 302]}
            to={[[258, 290]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[236, 28]}
            to={[[194, 100]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** A hitch pin coming toward you out of a collar, with a hairpin clip through its end. */
function Pin({ x, y }: { x: number; y: number }) {
  return (
    <>
      <circle cx={x} cy={y} r="12" className="dr-fine dr-shade" />
      <HairpinLeg x={x - 31} y={y + 22} />
      <Wire d={`M${x} ${y}L${x - 40} ${y + 28}`} width={20} />
      <circle cx={x - 40} cy={y + 28} r="8.4" className="dr-fine dr-shade" />
      <HairpinBow x={x - 31} y={y + 22} />
    </>
  );
}

function ReceiverSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 0H30V12H0Z" fill={hatch} />
          <path d="M0 12H30V0" className="dr-part dr-open" />
          <path d="M0 20H34V36H0" className="dr-part" />
          <path d="M34 22H44V12H54V64H44V34H34" className="dr-part dr-shade" />
          <path d="M54 44H70V62H54Z" className="dr-part dr-shade" />
          <path d="M88 47H70V59H88" className="dr-part" />
          <circle cx="26" cy="28" r="5" className="dr-part" />
          <circle cx="62" cy="53" r="5" className="dr-part" />
          <path d="M24 18Q17 28 24 39M60 43Q53 53 60 68" className="dr-fine dr-open" />
        </>
      )}
    </SmallFrame>
  );
}
