import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Footwell, Pedal, Seat } from "./footwell";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["brake-air"];

/** A brake on the coach's air: the cylinder back at the pedal; below, the line coupled, and the coach's pedal and lamp. */
export function BrakeAirDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <BrakeAirSmall />;
  return (
    <Frame {...words} height={350}>
      {(hatch) => (
        <>
          <Footwell hatch={hatch} />
          <Pedal />
          <Cylinder />
          <Seat hatch={hatch} />

          {/* The line between the vehicles. */}
          <path d="M10 230H194V340H10Z" className="dr-edge" />
          <Coupling />

          {/* In the coach: pedal down, lamp lit. */}
          <path d="M202 230H380V340H202Z" className="dr-edge" />
          <CoachPedal />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[196, 34]}
            to={[
              [134, 66],
              [140, 150],
            ]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[34, 256]}
            to={[[96, 306]]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[226, 256]}
            to={[[233, 306]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** The cylinder between pedal and floor, its rod in. */
function Cylinder() {
  return (
    <>
      <path d="M246 190L236 206H276L264 182Z" className="dr-part dr-shade" />
      <Wire d="M226 186C216 200 206 201 190 201H76" width={7} kind="cord" />
      <g transform="translate(122 150) rotate(14)">
        <path d="M-2 0H30" strokeWidth="10" className="dr-wire-out" />
        <path d="M-2 0H30" strokeWidth="5.4" className="dr-wire-in" />
        <path d="M-14 -19H4V-9H-4V9H4V19H-14" className="dr-part dr-open" />
        <path d="M4 -12H12V12H4Z" className="dr-part dr-shade" />
        <path d="M24 -16H116V16H24Z" className="dr-edge" />
        <path d="M24 -19H36V19H24ZM104 -19H118V19H104Z" className="dr-part dr-shade" />
        <path d="M40 -8H100" className="dr-fine" />
        <path d="M118 -6H130A6 6 0 0 1 130 6H118Z" className="dr-part" />
        <circle cx="131" r="3.5" className="dr-solid" />
      </g>
    </>
  );
}

function Coupling() {
  return (
    <>
      <path d="M10 298H60V314H10M194 298H144V314H194" className="dr-part" />

      <path d="M44 296H66V316H44ZM138 296H160V316H138Z" className="dr-part dr-shade" />
      <path d="M66 298H80V314H66ZM124 298H138V314H124Z" className="dr-part" />
      <path d="M80 290H124V322H80Z" className="dr-edge dr-shade" />
      <path d="M88 291V321M94 291V321M100 291V321M106 291V321M112 291V321" className="dr-fine" />
    </>
  );
}

/** The coach's brake pedal down, dashed where it stood, and the lamp that answers it. */
function CoachPedal() {
  return (
    <>
      <path d="M222 312A12 12 0 0 1 246 312V324H222Z" className="dr-part dr-lit" />
      <path d="M216 324H252" className="dr-part" />
      <path d="M216 302L209 296M252 302L259 296M234 293V287" className="dr-line" />
      <path d="M288 326L342 294L346 301L294 334" className="dr-behind dr-open" />
      <path d="M286 327L358 312" strokeWidth="13" className="dr-wire-out" />
      <path d="M286 327L358 312" strokeWidth="7.5" className="dr-wire-in" />
      <circle cx="288" cy="328" r="5" className="dr-part" />
      <path d="M362 284V304M354 295L362 305L370 295" className="dr-edge dr-open" />
    </>
  );
}

function BrakeAirSmall() {
  return (
    <SmallFrame {...words}>
      {(hatch) => (
        <>
          <path d="M8 0Q2 30 8 46L20 66H88V74H0V0Z" fill={hatch} />
          <path d="M8 0Q2 30 8 46L20 66H88" className="dr-part dr-open" />
          <path d="M24 4Q34 22 28 38" className="dr-edge dr-open" />
          <path d="M25 34L34 37L27 54L20 51Z" className="dr-part dr-shade" />
          <path d="M32 44L42 47" strokeWidth="6" className="dr-wire-out" />
          <path d="M41 39L76 47L73 60L38 52Z" className="dr-part" />
          <path d="M76 53L82 66H68L72 56" className="dr-part dr-shade" />
          <path d="M60 56Q58 64 44 64H30" strokeWidth="4" className="dr-wire-out" />
        </>
      )}
    </SmallFrame>
  );
}
