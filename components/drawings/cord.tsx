import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const on = drawingWords.cord;
const capped = drawingWords["cord-off"];

type CordProps = DrawingProps & { off?: boolean };

/** Between the vehicles from the left side: lanyard above, bar in the middle, cord below and clear of the ground. */
export function CordDrawing({ size = "full", off = false, onCallout }: CordProps) {
  const words = off ? capped : on;
  if (size === "small") return <CordSmall off={off} />;
  return (
    <Frame {...words} height={340}>
      {(hatch) => (
        <>
          <path d="M-4 -4H74V104Q74 118 60 118H-4Z" fill={hatch} />
          <path d="M74 -4V104Q74 118 60 118H-4" className="dr-edge dr-open" />
          <path d="M-4 326H394" className="dr-edge" />
          <path d="M-4 327H394V340H-4Z" fill={hatch} />

          {/* Coach: frame rail with the lanyard's own eye, receiver below it, socket below that. */}
          <path d="M-4 128H84V166H-4" className="dr-edge" />
          <path d="M-4 137H76V157H-4" className="dr-fine dr-open" />
          <path d="M28 166H56V186H28Z" className="dr-part" />
          <path d="M-4 184H92V214H-4" className="dr-edge dr-shade" />
          <path d="M40 214H66V230H40Z" className="dr-part" />
          <path d="M36 228H92V258H36Z" className="dr-edge" />
          <path d="M84 147H94" strokeWidth="8" className="dr-wire-out" />
          <circle cx="102" cy="147" r="8" strokeWidth="6.5" className="dr-wire-out" />
          <circle cx="102" cy="147" r="8" strokeWidth="2.6" className="dr-wire-in" />

          {/* Car: base plate, switch and socket, then the nose that they come out of. */}
          <path d="M276 190H322V214H276Z" className="dr-edge dr-shade" />
          <path d="M320 134H274Q270 134 270 138V156Q270 160 274 160H320Z" className="dr-edge" />
          <path d="M280 134V160M288 142H300M288 150H300" className="dr-fine" />
          <path d="M322 228H284V258H322Z" className="dr-edge" />
          <path
            d="M394 84C360 86 334 94 324 110L316 140Q308 146 308 160V242Q308 256 322 260L342 264A56 56 0 0 1 394 222Z"
            className="dr-edge"
          />
          <path d="M328 116Q346 110 372 116L356 138L322 140Z" className="dr-part dr-shade" />
          <path d="M308 172H342M308 181H342M308 222H350" className="dr-fine" />
          <path d="M394 234A46 46 0 0 0 394 326Z" className="dr-edge dr-shade" />
          <path d="M394 256A25 25 0 0 0 394 304Z" className="dr-part" />

          {/* Bar. */}
          <path d="M93 190H126V208H93" className="dr-edge" />
          <path d="M122 184H148V214H122Z" className="dr-edge dr-shade" />
          <path d="M146 190H226V208H146Z" className="dr-edge" />
          <path d="M226 193H284V205H226Z" className="dr-edge" />
          <circle cx="284" cy="199" r="6" className="dr-part" />

          {off ? <Off onCallout={onCallout} /> : <On onCallout={onCallout} />}
        </>
      )}
    </Frame>
  );
}

type LinesProps = Pick<DrawingProps, "onCallout">;

function On({ onCallout }: LinesProps) {
  return (
    <>
      {/* Lanyard with a loop at each end. */}
      <Wire d="M256 147C216 178 150 178 108 151" width={5.6} kind="cable" />
      <path d="M270 147H262" strokeWidth="7" className="dr-wire-out" />
      <circle cx="256" cy="147" r="6" className="dr-line" />

      {/* Cord with a plug at each end. */}
      <Wire d="M118 243C132 312 244 312 258 243" width={9} kind="cord" />
      <path d="M92 231H104L122 236V250L104 255H92Z" className="dr-edge dr-shade" />
      <path d="M284 231H272L254 236V250L272 255H284Z" className="dr-edge dr-shade" />
      <path d="M60 228Q76 216 98 222L102 231" className="dr-part dr-open" />
      <path d="M308 228Q296 216 278 222L274 231" className="dr-part dr-open" />

      <Callout letter="A" lines={on.callouts.A} at={[24, 298]} to={[[72, 244]]} onCallout={onCallout} />
      <Callout letter="B" lines={on.callouts.B} at={[158, 246]} to={[[204, 313]]} onCallout={onCallout} />
      <Callout letter="C" lines={on.callouts.C} at={[142, 40]} to={[[102, 140]]} onCallout={onCallout} />
      <Callout
        letter="D"
        lines={on.callouts.D}
        at={[248, 102]}
        to={[[276, 140]]}
        label="left"
        onCallout={onCallout}
      />
      <path d="M204 300V323M198 307L204 299L210 307M198 316L204 324L210 316" className="dr-fine dr-open" />
    </>
  );
}

/** The pin stays in the switch: what comes off is the lanyard's other end. */
function Off({ onCallout }: LinesProps) {
  return (
    <>
      <circle cx="262" cy="147" r="6" className="dr-line" />
      <path d="M36 222H88Q96 222 96 230V262H88V232H36Z" className="dr-edge dr-shade" />
      <path d="M322 222H288Q280 222 280 230V262H288V232H322Z" className="dr-edge dr-shade" />
      <Callout
        letter="A"
        lines={capped.callouts.A}
        at={[150, 282]}
        to={[
          [92, 248],
          [284, 248],
        ]}
        onCallout={onCallout}
      />
      <Callout
        letter="B"
        lines={capped.callouts.B}
        at={[182, 84]}
        to={[
          [106, 140],
          [258, 140],
        ]}
        label="above"
        onCallout={onCallout}
      />
    </>
  );
}

function CordSmall({ off }: { off: boolean }) {
  return (
    <SmallFrame {...(off ? capped : on)}>
      {(hatch) => (
        <>
          <path d="M0 0H16V26H0ZM0 70H88V74H0Z" fill={hatch} />
          <path d="M16 0V26H0M0 70H88" className="dr-part dr-open" />
          <path d="M88 10Q72 12 70 26V56Q72 60 78 62" className="dr-part dr-open" />
          <path d="M62 18H72V28H62Z" className="dr-part dr-shade" />
          {!off && <path d="M18 22Q40 34 62 24" className="dr-fine dr-open" />}
          <path d="M0 34H70V40H0" className="dr-part" />
          {!off && <path d="M22 48C26 72 58 72 62 48" strokeWidth="5" className="dr-wire-out" />}
          <path d="M0 44H22V52H0M72 44H62V52H72" className="dr-part dr-shade" />
          <circle cx="18" cy="22" r="3" className="dr-part" />
        </>
      )}
    </SmallFrame>
  );
}
