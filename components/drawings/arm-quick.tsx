import { type DrawingSide, drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

type ArmProps = DrawingProps & { side?: DrawingSide };

/** An arm that ends in an insert, from that side of the rig; the base plate's socket is cut open where the lugs are. */
export function ArmQuickDrawing({ side = "left", size = "full", onCallout }: ArmProps) {
  const words = drawingWords[`arm-quick-${side}`];
  const right = side === "right";
  const turn = right ? `translate(${size === "small" ? 88 : 390} 0) scale(-1 1)` : undefined;
  if (size === "small") {
    return (
      <SmallFrame {...words}>{(hatch) => <g transform={turn}>{<SmallArt hatch={hatch} />}</g>}</SmallFrame>
    );
  }
  const x = (left: number) => (right ? 390 - left : left);
  const toward = (label: "left" | "right") => (right ? (label === "left" ? "right" : "left") : label);
  return (
    <Frame {...words} height={336}>
      {(hatch) => (
        <>
          <g transform={turn}>
            <Art hatch={hatch} />
          </g>
          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[x(130), 58]}
            to={[[x(188), 160]]}
            label={toward("left")}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[x(286), 60]}
            to={[[x(247), 140]]}
            label={toward("right")}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[x(132), 288]}
            to={[[x(180), 208]]}
            label={toward("left")}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function Art({ hatch }: { hatch: string }) {
  const bumper = "M394 92C366 96 354 116 352 148L348 216C348 246 360 266 394 272";
  return (
    <>
      <path d={`${bumper}Z`} fill={hatch} />
      <path d={bumper} className="dr-edge dr-open" />

      {/* Arm: tube, collar, knuckle with its bolt. */}
      <path d="M-4 158H64V204H-4" className="dr-edge" />
      <path d="M-4 169H60" className="dr-fine dr-open" />
      <path d="M80 156H128Q146 156 146 168V194Q146 206 128 206H80Z" className="dr-edge" />
      <path d="M60 147H84V215H60Z" className="dr-edge dr-shade" />
      <circle cx="116" cy="181" r="11" className="dr-part dr-shade" />
      <path d="M111 172.400L121 172.400L126 181L121 189.600H111L106 181Z" className="dr-fine dr-open" />

      {/* Insert: neck, flange against the socket. */}
      <path d="M142 166H166V196H142Z" className="dr-edge" />

      {/* Socket, open where the lugs lie behind its ledge. */}
      <path d="M196 146H352V216H196Z" className="dr-edge" />
      <path d="M264 146q6 9 0 17t0 18t0 18t0 17H336q6 -9 0 -17t0 -18t0 -18t0 -17Z" className="dr-part dr-shade" />
      <path d="M260 160H310V202H260Z" className="dr-part" />
      <path d="M267 146H284V158H267ZM267 216H284V204H267Z" className="dr-part" />
      <path d="M267 146H284V158H267ZM267 216H284V204H267Z" fill={hatch} />
      <path d="M290 150H310V212H290Z" className="dr-edge" />
      <path d="M262 162H262V200H262Z" className="dr-fine" />
      <path d="M264 146q6 9 0 17t0 18t0 18t0 17M336 216q6 -9 0 -17t0 -18t0 -18t0 -17" className="dr-fine dr-open" />
      <path d="M182 136H202V226H182Z" className="dr-edge dr-shade" />
      <path d="M162 144H182V218H162Z" className="dr-edge" />
      <path d="M166 162H198" className="dr-edge" />

      {/* Spring clip: its leg through socket and insert, its bow closed around the outside. */}
      <path d="M226 148V214" className="dr-behind" />
      <Wire d="M226 146V128C226 112 262 118 262 150C262 172 246 176 246 190C246 206 256 236 236 246C226 250 220 244 226 236V216" width={9} />
    </>
  );
}

function SmallArt({ hatch }: { hatch: string }) {
  return (
    <>
      <path d="M88 14Q80 16 80 30V48Q80 60 88 62Z" fill={hatch} />
      <path d="M88 14Q80 16 80 30V48Q80 60 88 62" className="dr-part dr-open" />
      <path d="M0 32H14V44H0ZM14 29H22V47H14ZM22 32H32V44H22Z" className="dr-part" />
      <path d="M40 27H80V49H40Z" className="dr-part" />
      <path d="M36 23H42V53H36Z" className="dr-part dr-shade" />
      <path d="M30 25H36V51H30Z" className="dr-part" />
      <path d="M30 33H42" className="dr-edge" />
      <path d="M58 31H72V45H58Z" className="dr-fine dr-shade" />
      <path d="M50 20C50 14 62 14 62 26C62 36 56 36 56 42C56 50 60 58 54 60C50 61 48 58 50 54" className="dr-line dr-open" />
    </>
  );
}
