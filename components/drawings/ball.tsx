import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { HairpinBow, HairpinLeg } from "./clips";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords.ball;

/** The coupler from the left side, coach to the left, cut open at the ball; latch down along its top. */
export function BallDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <BallSmall />;
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          {/* Ball mount: bar, nut below, collar and neck above. */}
          <path d="M144 294H172V322Q158 328 144 322Z" className="dr-part" />
          <path d="M144 304H172M144 313H172" className="dr-fine" />
          <path d="M130 284H186V302H130Z" className="dr-part dr-shade" />
          <path d="M148 284V302M168 284V302" className="dr-fine" />
          <path d="M-4 248H206Q216 248 216 258V276Q216 286 206 286H-4" className="dr-edge dr-shade" />
          <path d="M-4 258H212" className="dr-fine dr-open" />
          <path d="M124 238H192V250H124Z" className="dr-part" />
          <path d="M142 216L138 240H178L174 216Z" className="dr-edge" />

          {/* Bar's tongue and the coupler's shell, its front cut along the middle. */}
          <path d="M286 152H394V208H286Z" className="dr-edge" />
          <path d="M300 164H394" className="dr-fine dr-open" />
          <path
            d="M106 216V188Q106 138 158 138H300V212H250L238 226H208V186A46 46 0 0 0 116 186V216Z"
            className="dr-edge"
          />
          <path
            d="M106 216V188Q106 138 158 138H232q-6 11 0 22t0 22t0 22t0 22H208V186A46 46 0 0 0 116 186V216Z"
            fill={hatch}
          />
          <path d="M232 138q-6 11 0 22t0 22t0 22t0 22" className="dr-fine dr-open" />
          <circle cx="160" cy="186" r="42" className="dr-edge" />
          <path d="M132 172Q140 156 158 154" className="dr-fine dr-open" />

          {/* Clamp, closed under the ball. */}
          <path d="M206 208H224V238H192Q186 238 186 230V222Q200 218 206 208Z" className="dr-part dr-shade" />

          {/* Latch: ears for pivot and pin, lever, tab in its slot. */}
          <path
            d="M206 138V112Q206 100 218 100H232Q244 100 244 112V138ZM266 138V106Q266 98 274 98H298Q306 98 306 106V138Z"
            className="dr-part dr-shade"
          />
          <path d="M178 112H330Q346 112 350 98L360 100Q358 130 336 130H192V152H178Z" className="dr-edge" />
          <path d="M178 138H192V152H178Z" className="dr-solid" />
          <circle cx="225" cy="121" r="7" className="dr-part dr-shade" />

          <HairpinLeg x={286} y={121} />
          <circle cx="286" cy="121" r="11" className="dr-edge dr-shade" />
          <HairpinBow x={286} y={121} />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[96, 64]}
            to={[[185, 128]]}
            label="above"
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[214, 42]}
            to={[[280, 110]]}
            label="right"
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[258, 268]}
            to={[[172, 190]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function BallSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M0 56H48V66H0Z" className="dr-part dr-shade" />
          <path d="M30 44H40V57H30Z" className="dr-part" />
          <path d="M88 32H56V46H88" className="dr-part" />
          <path d="M17 46V38Q17 22 34 22H66V46H52V40A17 15 0 0 0 20 40V46Z" className="dr-part" />
          <path d="M17 46V38Q17 22 34 22H52V40A17 15 0 0 0 20 40V46Z" fill={hatch} />
          <circle cx="35" cy="39" r="13" className="dr-part" />
          <path d="M42 12H76Q80 12 82 8L86 9Q86 19 78 19H46V26H42Z" className="dr-part" />
          <circle cx="62" cy="15" r="4.5" className="dr-part dr-shade" />
          <path d="M62 4V26" className="dr-line" />
        </>
      )}
    </SmallFrame>
  );
}
