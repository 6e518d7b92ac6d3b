import { type DrawingSide, drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

type ArmProps = DrawingProps & { side?: DrawingSide };

/** One arm end at the base plate, seen from that side of the rig: the coach lies to the left of the left arm. */
export function ArmDrawing({ side = "left", size = "full", onCallout }: ArmProps) {
  const words = drawingWords[`arm-${side}`];
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
            at={[x(122), 46]}
            to={[[x(166), 108]]}
            label={toward("left")}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[x(288), 304]}
            to={[[x(238), 292]]}
            label={toward("right")}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[x(268), 50]}
            to={[
              [x(251), 133],
              [x(246), 228],
            ]}
            label={toward("right")}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function Art({ hatch }: { hatch: string }) {
  const bumper = "M394 92C360 96 346 116 344 148L340 216C340 246 352 266 394 272";
  return (
    <>
      <path d={`${bumper}Z`} fill={hatch} />
      <path d={bumper} className="dr-edge dr-open" />
      <path d="M290 156H346V206H290Z" className="dr-edge dr-shade" />
      <circle cx="316" cy="181" r="10" className="dr-part" />
      <path d="M311 172.400L321 172.400L326 181L321 189.600H311L306 181Z" className="dr-fine dr-open" />

      {/* The base plate's two tabs and what joins them. */}
      <path
        d="M163 120H290V242H163A13 13 0 0 1 163 216H262V146H163A13 13 0 0 1 163 120Z"
        className="dr-edge"
      />
      {/* Arm: tube, collar, end. */}
      <path d="M-4 158H88V204H-4" className="dr-edge" />
      <path d="M-4 169H84" className="dr-fine dr-open" />
      <path d="M100 152H202A29 29 0 0 1 202 210H100Z" className="dr-edge" />
      <path d="M84 147H106V215H84Z" className="dr-edge dr-shade" />

      {/* Cut away around the pin, as on a section: tabs and arm end hatched, the pin not. */}
      <path
        d="M158 120q5 6 0 13t0 13H222q-5 -6 0 -13t0 -13ZM158 216q5 6 0 13t0 13H222q-5 -6 0 -13t0 -13Z"
        fill={hatch}
      />
      <path d="M160 152q6 15 0 29t0 29H220q-6 -15 0 -29t0 -29Z" fill={hatch} />
      <path
        d="M158 121q5 6 0 13t0 12M222 121q-5 6 0 13t0 12M158 217q5 6 0 13t0 12M222 217q-5 6 0 13t0 12M160 152q6 15 0 29t0 29M220 152q-6 15 0 29t0 29"
        className="dr-fine dr-open"
      />

      {/* Clip shank behind, pin before it, ring before both. */}
      <path d="M144 266L156 261H232V271H156Z" className="dr-part dr-shade" />
      <Wire d="M178 100C166 66 214 66 202 100" width={8} />
      <path d="M178 112H202V290Q190 302 178 290Z" className="dr-edge" />
      <path d="M184 122V288" className="dr-fine dr-open" />
      <path d="M178 261H202M178 271H202" className="dr-behind" />
      <path d="M164 98H216Q220 98 220 102V120H160V102Q160 98 164 98Z" className="dr-edge dr-shade" />
      <circle cx="234" cy="266" r="11" className="dr-part dr-shade" />
      <Wire d="M236 267C258 310 222 322 190 322C156 322 128 302 149 266" width={8} />
    </>
  );
}

function SmallArt({ hatch }: { hatch: string }) {
  return (
    <>
      <path d="M88 14Q76 16 76 30V48Q76 60 88 62Z" fill={hatch} />
      <path d="M88 14Q76 16 76 30V48Q76 60 88 62" className="dr-part dr-open" />
      <path d="M28 22H74V54H28V46H62V30H28Z" className="dr-part dr-shade" />
      <path d="M0 32H44A6 6 0 0 1 44 44H0" className="dr-part" />
      <path d="M34 14H44V64Q39 68 34 64Z" className="dr-part" />
      <path d="M29 9H49V15H29Z" className="dr-part dr-shade" />
      <path d="M26 60H52C58 74 20 74 26 60" className="dr-line dr-open" />
    </>
  );
}
