import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const box = drawingWords.brake;
const builtIn = drawingWords["brake-installed"];

type BrakeProps = DrawingProps & { installed?: boolean };

/** The driver's footwell from the side: brake unit between seat and pedal, pedal up, ready light lit. */
export function BrakeDrawing({ size = "full", installed = false, onCallout }: BrakeProps) {
  const words = installed ? builtIn : box;
  if (size === "small") return <BrakeSmall installed={installed} />;
  return (
    <Frame {...words} height={338}>
      {(hatch) => (
        <>
          <path d="M60 -4C44 60 40 130 46 204L96 286H394V298H-4V-4Z" fill={hatch} />
          <path d="M60 -4C44 60 40 130 46 204L96 286H394" className="dr-edge dr-open" />

          {/* Pedal: bracket, stop, arm, pad. */}
          <path d="M57 20H150V72H118L112 46H54" className="dr-edge dr-shade" />
          <path d="M150 62H186V92H172V76H150Z" className="dr-part dr-shade" />
          <Wire d="M132 50C150 84 158 118 142 176" width={19} />
          <path d="M160 80H174V92H161Z" className="dr-solid" />
          <circle cx="132" cy="48" r="13" className="dr-edge" />
          <circle cx="132" cy="48" r="4" className="dr-solid" />
          <g transform="translate(142 190) rotate(20)">
            <path d="M-9 -36H5Q9 -36 9 -32V32Q9 36 5 36H-9Z" className="dr-edge dr-shade" />
            <path d="M3 -28H9M3 -20H9M3 -12H9M3 -4H9M3 4H9M3 12H9M3 20H9M3 28H9" className="dr-fine" />
          </g>

          {/* Seat. */}
          <path d="M394 124H374Q350 124 348 148L342 252Q342 270 360 270H394Z" fill={hatch} />
          <path d="M394 124H374Q350 124 348 148L342 252Q342 270 360 270H394" className="dr-edge dr-open" />
          <path d="M356 270V286M386 270V286" className="dr-part" />
          {!installed && <Box onCallout={onCallout} />}
          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[222, 66]}
            to={[[168, 86]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** The unit, its arm to a clamp round the pad, and its ready light. */
function Box({ onCallout }: Pick<DrawingProps, "onCallout">) {
  return (
    <>
      <path d="M158 203L224 226" strokeWidth="13" className="dr-wire-out" />
      <path d="M158 203L224 226" strokeWidth="8.5" className="dr-wire-in" />
      <path d="M194 208L228 219L222 236L188 224Z" className="dr-part dr-shade" />
      <path d="M232 204H322Q342 204 342 222V276H222V214Q222 204 232 204Z" className="dr-edge" />
      <path d="M222 254H342" className="dr-part" />
      <path d="M232 276H252V286H232ZM312 276H332V286H312Z" className="dr-part dr-solid" />
      <path d="M288 204V192Q288 186 294 186H324Q330 186 330 192V204" className="dr-part" />
      <path d="M236 216H282V244H236Z" className="dr-part dr-shade" />
      <path d="M242 224H270M242 232H264" className="dr-fine" />
      <path d="M292 266H330" className="dr-fine" />
      <g transform="translate(142 190) rotate(20)">
        <path d="M-16 -46H18V-34H-4V34H18V46H-16Z" className="dr-blank" fillOpacity="0" />
        <path d="M22 -10V12H30V-10ZM18 -46H-14V-32M18 46H-14V32M18 -46V46" className="dr-edge dr-open" />
        <path d="M13 -46H24V46H13Z" className="dr-edge" />
        <path d="M-15 -46H14V-38H-7V-30H-15ZM-15 46H14V38H-7V30H-15Z" className="dr-part" />
      </g>

      {/* Ready light. */}
      <path d="M302 228A10 10 0 0 1 322 228V236H302Z" className="dr-part dr-lit" />
      <path d="M296 236H328" className="dr-part" />
      <path d="M299 218L294 213M325 218L330 213" className="dr-fine" />
      <Callout letter="B" lines={box.callouts.B} at={[206, 142]} to={[[166, 172]]} onCallout={onCallout} />
      <Callout
        letter="C"
        lines={box.callouts.C}
        at={[306, 130]}
        to={[[312, 215]]}
        label="above"
        onCallout={onCallout}
      />
      <Callout
        letter="D"
        lines={box.callouts.D}
        at={[360, 310]}
        to={[[343, 262]]}
        label="left"
        onCallout={onCallout}
      />
    </>
  );
}

function BrakeSmall({ installed }: { installed: boolean }) {
  return (
    <SmallFrame {...(installed ? builtIn : box)}>
      {(hatch) => (
        <>
          <path d="M8 0Q2 30 8 46L20 66H88V74H0V0Z" fill={hatch} />
          <path d="M8 0Q2 30 8 46L20 66H88" className="dr-part dr-open" />
          <path d="M24 4Q34 22 28 38" className="dr-edge dr-open" />
          <path d="M25 34L34 37L27 54L20 51Z" className="dr-part dr-shade" />
          {!installed && <path d="M32 46L46 50" strokeWidth="6" className="dr-wire-out" />}
          {!installed && <path d="M46 42H78V64H46Z" className="dr-part" />}
          <path d="M88 26Q80 26 80 34L78 62H88" className="dr-part dr-shade" />
          {!installed && <circle cx="66" cy="52" r="5" className="dr-fine dr-lit" />}
        </>
      )}
    </SmallFrame>
  );
}
