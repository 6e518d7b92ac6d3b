import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { DashLamp } from "./dash-lamp";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords.monitor;

/** The brake's monitor on the coach's dash: its ready lamp lit, its fault lamp dark. */
export function MonitorDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <MonitorSmall />;
  return (
    <Frame {...words} height={320}>
      {(hatch) => (
        <>
          {/* Windshield post, dash, the coach's wheel. */}
          <path d="M-4 -4H22L10 214H-4Z" fill={hatch} />
          <path d="M22 -4L10 214" className="dr-edge" />
          <path d="M-4 214C90 204 300 204 394 214V324H-4Z" className="dr-tone" />
          <path d="M-4 214C90 204 300 204 394 214" className="dr-edge dr-open" />
          <Wire d="M-20 300C60 262 190 262 256 330" width={22} />

          {/* Monitor on its foot, its wire down into the dash. */}
          <path
            d="M180 172H212V208H236Q242 208 242 216H150Q150 208 156 208H180Z"
            className="dr-edge dr-shade"
          />
          <Wire d="M318 150C346 160 350 190 342 212" width={6} kind="cord" />
          <path
            d="M86 44H304Q320 44 320 60V164Q320 180 304 180H86Q70 180 70 164V60Q70 44 86 44Z"
            className="dr-edge"
          />
          <path d="M86 62H214V162H86Z" className="dr-part dr-shade" />
          <path
            d="M98 112H146Q150 112 150 116V134H98Q94 134 94 130V116Q94 112 98 112ZM150 128H164M164 134V126L172 122L178 114H194L202 122V134Z"
            className="dr-part"
          />
          <path d="M96 78H150M96 90H132" className="dr-fine" />
          {[106, 138, 174, 194].map((x) => (
            <circle key={x} cx={x} cy="137" r="6" className="dr-part" />
          ))}
          <circle cx="266" cy="90" r="15" className="dr-part dr-lit" />

          <path
            d="M266 68V61M282 74L287 69M288 90H295M250 74L245 69M244 90H237M282 106L287 111M250 106L245 111"
            className="dr-line"
          />
          <DashLamp x={266} y={142} sign="fault" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[350, 30]}
            to={[[276, 82]]}
            label="left"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[350, 262]}
            to={[[276, 148]]}
            label="left"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function MonitorSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M0 66Q44 60 88 66" className="dr-part dr-open" />
          <path d="M38 50H50V64H38Z" className="dr-part dr-shade" />
          <path d="M12 10H76Q80 10 80 14V48Q80 52 76 52H12Q8 52 8 48V14Q8 10 12 10Z" className="dr-part" />
          <path d="M15 17H52V45H15Z" className="dr-fine dr-shade" />
          <path d="M20 27H44M20 35H36" className="dr-fine" />
          <circle cx="66" cy="22" r="6" className="dr-part dr-lit" />
          <path d="M66 34L73 45H59Z" className="dr-fine" />
        </>
      )}
    </SmallFrame>
  );
}
