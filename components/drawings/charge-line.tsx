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
          {/* Battery on its tray. */}
          <path d="M188 296H384V312H188Z" fill={hatch} />
          <path d="M188 296H384V312H188Z" className="dr-part dr-open" />
          <path d="M204 176H368V296H204Z" className="dr-edge" />
          <path d="M198 160H374V184H198Z" className="dr-edge dr-shade" />
          <path d="M222 214H350V276H222Z" className="dr-fine" />
          <path d="M240 237V253M232 245H248M324 245H340" className="dr-edge" />
          <path d="M322 146H346V160H322Z" className="dr-part" />
          <path d="M232 140H256V160H232Z" className="dr-part" />

          {/* Line: from the coach's side into the plug, on to the fuse, up to the post. */}
          <Wire d="M-4 96H40" width={13} />
          <Wire d="M124 96C150 96 150 96 166 96C236 96 222 96 238 120" width={13} />
          <Wire d="M-4 96H24" width={13} />

          {/* Plug and socket, pushed home. */}
          <path d="M16 76H70V116H16Z" className="dr-edge dr-shade" />
          <path d="M26 84V108M34 84V108M42 84V108" className="dr-fine" />
          <path d="M70 70H118V122H70Z" className="dr-edge" />
          <path d="M70 88H106M70 104H106" className="dr-behind" />

          {/* Clamp round the post. */}
          <path d="M222 122H266Q274 122 274 130V146H214V130Q214 122 222 122Z" className="dr-edge dr-shade" />
          <circle cx="244" cy="134" r="7" className="dr-part" />

          {/* Fuse holder, cover shut. */}
          <path d="M142 76H196V118H142Z" className="dr-edge" />
          <path d="M138 66H200V84H138Z" className="dr-edge dr-shade" />
          <path d="M154 118V128H162V118M176 118V128H184V118" className="dr-fine" />
          <path d="M156 94H182V108H156Z" className="dr-fine" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[58, 168]}
            to={[[70, 112]]}
            label="below"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[120, 28]}
            to={[[160, 74]]}
            label="right"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[258, 66]}
            to={[[248, 126]]}
            label="right"
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
