import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { CarSide } from "./car-side";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const rolled = drawingWords.wheels;
const stopped = drawingWords["wheels-standing"];

type WheelsProps = DrawingProps & { standing?: boolean };

/** The rig after a few feet straight ahead: every car wheel has turned; in the window, both arms out and latched. */
export function WheelsDrawing({ size = "full", standing = false, onCallout }: WheelsProps) {
  const words = standing ? stopped : rolled;
  if (size === "small") return <WheelsSmall standing={standing} />;
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          <path d="M-4 282H394" className="dr-edge" />
          <path d="M-4 283H394V292H-4Z" fill={hatch} />

          {/* Coach tail, pulling to the left. */}
          <path d="M-4 132H76Q88 132 88 144V232Q88 244 76 244H-4" className="dr-edge" />
          <path d="M80 176H88V204H80Z" className="dr-part dr-shade" />
          <path d="M-4 214H88" className="dr-fine" />
          <circle cx="22" cy="250" r="31" className="dr-edge dr-shade" />
          <circle cx="22" cy="250" r="16" className="dr-part" />
          {!standing && <path d="M70 160H20M34 148L18 160L34 172" className="dr-edge dr-open" />}
          <path d="M88 236H104V250H88Z" className="dr-part dr-shade" />
          <path d="M104 236H138V250H104ZM138 238H174V248H138Z" className="dr-part" />

          <CarSide hatch={hatch} />

          {!standing && <ArmsWindow onCallout={onCallout} />}
          <Callout
            letter={standing ? "A" : "B"}
            lines={standing ? stopped.callouts.A : rolled.callouts.B}
            at={[166, 310]}
            to={[
              [216, 262],
              [336, 262],
            ]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** The window on the arms at the bar's middle. */
function ArmsWindow({ onCallout }: Pick<DrawingProps, "onCallout">) {
  return (
    <>
      <circle cx="138" cy="243" r="21" className="dr-fine dr-open" />
      <path d="M130 224L118 108" className="dr-fine dr-open" />
      <path d="M108 10H382V108H108Z" className="dr-edge" />
      <LatchedArm y={36} />
      <LatchedArm y={84} />

      <Callout
        letter="A"
        lines={rolled.callouts.A}
        at={[150, 132]}
        to={[
          [232, 22],
          [232, 70],
        ]}
        onCallout={onCallout}
      />
    </>
  );
}

/** A telescoping arm drawn out to its end, the latch's plunger dropped into the inner tube. */
function LatchedArm({ y }: { y: number }) {
  return (
    <g transform={`translate(0 ${y})`}>
      <path d="M109 -13H250V13H109" className="dr-part" />
      <path d="M250 -9H381M250 9H381" className="dr-part" />
      <path d="M244 -16H256V16H244Z" className="dr-part dr-shade" />
      <path d="M212 -20H240V-8H212Z" className="dr-part dr-shade" />
      <path d="M226 -8V6" strokeWidth="7" className="dr-wire-out" />
      <path d="M212 -16H150" strokeWidth="8" className="dr-wire-out" />
      <path d="M212 -16H150" strokeWidth="3.6" className="dr-wire-in" />
      <path d="M206 9H250M206 -9H250M206 -9V9" className="dr-behind dr-open" />
    </g>
  );
}

function WheelsSmall({ standing }: { standing: boolean }) {
  return (
    <SmallFrame {...(standing ? stopped : rolled)}>
      {() => (
        <>
          <path d="M0 66H88" className="dr-part" />
          <path d="M0 18H16V56H0" className="dr-part dr-shade" />
          <path d="M16 54H34" className="dr-edge" />
          <path d="M34 58V48L44 44L52 34H76L84 44V58Z" className="dr-part" />
          <circle cx="46" cy="58" r="8" className="dr-part dr-shade" />
          <circle cx="74" cy="58" r="8" className="dr-part dr-shade" />
          {!standing && <path d="M70 16H30M40 8L29 16L40 24" className="dr-edge dr-open" />}
        </>
      )}
    </SmallFrame>
  );
}
