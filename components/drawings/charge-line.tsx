import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["charge-line"];

/** The charge line from its plug, through its fuse, to the car's battery. */
export function ChargeLineDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <ChargeLineSmall />;
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          {/* Battery on its tray, the minus post under its cap. */}
          <path d="M104 298H384V316H104Z" fill={hatch} />
          <path d="M104 298H384V316H104Z" className="dr-part dr-open" />
          <path d="M120 192H368V298H120Z" className="dr-edge" />
          <path d="M150 214H338V276H150Z" className="dr-fine" />
          <path d="M303 235V255M293 245H313M175 245H195" className="dr-edge dr-open" />
          <path d="M112 172H376V196H112Z" className="dr-edge dr-shade" />
          <path d="M172 154H196V172H172Z" className="dr-part" />
          <path d="M291 150H315V172H291Z" className="dr-part" />

          {/* The line: into the plug, on to the fuse, down to the post. */}
          <Wire d="M-4 94H30" width={13} />
          <Wire d="M112 94H230C286 94 276 100 286 136" width={13} />

          {/* Plug and socket, pushed home. */}
          <path d="M16 74H70V114H16Z" className="dr-edge dr-shade" />
          <path d="M26 82V106M34 82V106M42 82V106" className="dr-fine" />
          <path d="M70 68H118V120H70Z" className="dr-edge" />
          <path d="M70 86H106M70 102H106" className="dr-behind" />

          {/* Clamp round the post. */}
          <path d="M275 132H325Q333 132 333 140V160H267V140Q267 132 275 132Z" className="dr-edge dr-shade" />
          <circle cx="303" cy="146" r="7.5" className="dr-part" />

          {/* Fuse holder, cover shut. */}
          <path d="M154 72H214V120H154Z" className="dr-edge" />
          <path d="M149 60H219V80H149Z" className="dr-edge dr-shade" />
          <path d="M168 92H200V108H168Z" className="dr-fine" />
          <path d="M176 92V108M192 92V108" className="dr-fine" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[52, 162]}
            to={[[70, 110]]}
            label="below"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[126, 30]}
            to={[[172, 70]]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[324, 80]}
            to={[[314, 138]]}
            label="above"
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function ChargeLineSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M0 18H60V32" strokeWidth="6" className="dr-wire-out" />
          <path d="M6 10H20V26H6ZM20 8H30V28H20Z" className="dr-part dr-shade" />
          <path d="M36 11H52V25H36Z" className="dr-part" />
          <path d="M38 40H84V68H38Z" className="dr-part" />
          <path d="M35 34H87V42H35Z" className="dr-part dr-shade" />
          <path d="M53 26H67V34H53Z" className="dr-part" />
          <path d="M48 50V60M43 55H53M70 55H80" className="dr-edge" />
        </>
      )}
    </SmallFrame>
  );
}
