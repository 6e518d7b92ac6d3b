import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["brake-hydraulic"];

/** The brake line's coupling at the coach from the side, cut where its sleeve holds the balls; the ground below is dry. */
export function BrakeHydraulicDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <BrakeHydraulicSmall />;
  return (
    <Frame {...words} height={330}>
      {(hatch) => (
        <>
          <path d="M-4 -4H112V78Q112 92 98 92H-4Z" fill={hatch} />
          <path d="M112 -4V78Q112 92 98 92H-4" className="dr-edge dr-open" />
          <path d="M-4 296H394V308H-4Z" fill={hatch} />
          <path d="M-4 296H394" className="dr-edge" />

          {/* Pipe and bracket at the coach. */}
          <Wire d="M-10 134C20 134 26 182 62 182H84" width={13} />
          <path d="M44 92H92V104H74V248H60V104H44Z" className="dr-edge dr-shade" />
          <path d="M40 170H62V194H40Z" className="dr-part dr-shade" />
          <path d="M72 158H92V206H72Z" className="dr-edge" />
          <path d="M72 174H92M72 190H92" className="dr-fine" />

          {/* Hose to the car. */}
          <Wire d="M296 182C344 182 352 226 400 232" width={30} />
          <path d="M236 160H262V204H236Z" className="dr-edge" />
          <path d="M236 174H262M236 190H262" className="dr-fine" />
          <path d="M262 162H306V202H262Z" className="dr-edge dr-shade" />
          <path d="M273 163V201M284 163V201M295 163V201" className="dr-fine" />

          {/* Coupling: body, nose in it, sleeve over both. */}
          <path d="M92 164H142V200H92Z" className="dr-edge" />
          <path d="M212 166H236V198H212Z" className="dr-part" />
          <path d="M136 146H214V218H136Z" className="dr-edge dr-shade" />
          <path d="M144 147V217M151 147V217M206 147V217M199 147V217" className="dr-fine" />
          <path d="M158 146q6 9 0 18t0 18t0 18t0 18H192q6 -9 0 -18t0 -18t0 -18t0 -18Z" className="dr-blank" />
          <path d="M160 147.6H192V160H160ZM160 204H192V216.4H160Z" fill={hatch} />
          <path
            d="M158 146q6 9 0 18t0 18t0 18t0 18M192 146q6 9 0 18t0 18t0 18t0 18M160 160H194M160 204H194"
            className="dr-fine dr-open"
          />
          <path d="M161 170H193M161 194H193" className="dr-part" />
          <circle cx="177" cy="165" r="5" className="dr-fine dr-solid" />
          <circle cx="177" cy="199" r="5" className="dr-fine dr-solid" />
          <path d="M136 146H214V218H136Z" className="dr-edge dr-open" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[190, 66]}
            to={[[178, 152]]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[236, 260]}
            to={[
              [178, 222],
              [178, 292],
            ]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function BrakeHydraulicSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 67H88V74H0Z" fill={hatch} />
          <path d="M0 66H88" className="dr-part" />
          <path d="M8 8H16V54H8Z" className="dr-part dr-shade" />
          <path d="M66 32Q80 32 92 44" strokeWidth="12" className="dr-wire-out" />
          <path d="M66 32Q80 32 92 44" strokeWidth="7.5" className="dr-wire-in" />
          <path d="M16 25H32V39H16ZM54 25H66V39H54Z" className="dr-part" />
          <path d="M30 18H56V46H30Z" className="dr-part dr-shade" />
          <path d="M37 19V45M43 19V45M49 19V45" className="dr-fine" />
        </>
      )}
    </SmallFrame>
  );
}
