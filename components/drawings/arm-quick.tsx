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
            at={[x(136), 62]}
            to={[[x(174), 150]]}
            label={toward("left")}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[x(280), 62]}
            to={[[x(255), 146]]}
            label={toward("right")}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[x(122), 294]}
            to={[[x(174), 224]]}
            label={toward("left")}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

function Art({ hatch }: { hatch: string }) {
  const bumper = "M394 82C368 86 358 108 356 144L352 218C352 250 362 274 394 280";
  return (
    <>
      <path d={`${bumper}Z`} fill={hatch} />
      <path d={bumper} className="dr-edge dr-open" />

      {/* Arm: tube, collar, knuckle with its bolt, neck of the insert. */}
      <path d="M-4 155H46V207H-4" className="dr-edge" />
      <path d="M-4 167H42" className="dr-fine dr-open" />
      <path d="M62 152H112Q134 152 134 166V196Q134 210 112 210H62Z" className="dr-edge" />
      <path d="M42 142H68V220H42Z" className="dr-edge dr-shade" />
      <circle cx="100" cy="181" r="13" className="dr-part dr-shade" />
      <path d="M94 171L106 171L112 181L106 191H94L88 181Z" className="dr-fine dr-open" />
      <path d="M130 163H152V199H130Z" className="dr-edge" />

      {/* Socket, open where the insert's lugs lie behind its ledge. */}
      <path d="M192 136H356V226H192Z" className="dr-edge" />
      <path
        d="M268 136q7 11 0 23t0 22t0 23t0 22H344q7 -11 0 -23t0 -22t0 -23t0 -22Z"
        className="dr-part dr-shade"
      />
      <path d="M266 158H304V204H266Z" className="dr-part" />
      <path d="M274 136H290V156H274ZM274 226H290V206H274Z" className="dr-blank" />
      <path d="M274 136H290V156H274ZM274 226H290V206H274Z" fill={hatch} />
      <path d="M274 136V156H290V136M274 226V206H290V226" className="dr-part dr-open" />
      <path d="M296 143H318V219H296Z" className="dr-edge" />
      <path
        d="M268 136q7 11 0 23t0 22t0 23t0 22M344 226q7 -11 0 -23t0 -22t0 -23t0 -22"
        className="dr-part dr-open"
      />

      {/* Lip of the socket, flange of the insert against it, a mark on each. */}
      <path d="M174 122H200V240H174Z" className="dr-edge dr-shade" />
      <path d="M148 132H174V230H148Z" className="dr-edge" />
      <path d="M154 149L170 158L154 167ZM194 149L178 158L194 167Z" className="dr-solid" />

      {/* Spring clip: its leg through socket and insert, its bow closed around the outside. */}
      <path d="M226 140V222" className="dr-behind" />
      <path d="M220 112H232V136H220ZM220 226H232V252Q226 256 220 252Z" className="dr-part dr-shade" />
      <Wire d="M228 112C270 100 274 262 226 256C214 254 214 242 224 242H238" width={8.5} />
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
      <path d="M49 16V60M49 16C66 12 66 58 49 60Q44 58 49 54H54" className="dr-line dr-open" />
    </>
  );
}
