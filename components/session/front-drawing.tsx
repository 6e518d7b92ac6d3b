import { frontWords } from "@/lib/domain/messages/session";
import { Frame } from "../drawings/frame";
import { Wire } from "../drawings/wire";

type Ring = { place: string; at: readonly [x: number, y: number]; to?: readonly [x: number, y: number] };

/** Where someone stands, by the number that the legend gives it. The last look goes around everything. */
const rings: readonly Ring[] = [
  { place: "1", at: [368, 62], to: [304, 112] },
  { place: "2", at: [478, 132], to: [470, 208] },
  { place: "3", at: [392, 160], to: [384, 250] },
  { place: "4", at: [624, 84], to: [628, 166] },
  { place: "5", at: [214, 150], to: [196, 216] },
  { place: "6", at: [846, 128], to: [812, 200] },
  { place: "7", at: [560, 302] },
];

const radius = 22;

/** A coach's tail and the car behind it, from the side, with the seven places to stand. */
export function FrontDrawing() {
  const { title, description } = frontWords.drawing;
  return (
    <Frame title={title} description={description} width={832} height={330}>
      {(hatch) => (
        <g transform="translate(-52 2)">
          <Coach hatch={hatch} />
          <Car />
          <Gear />
          <path d="M56 264H882" className="dr-line" />
          <path d="M848 302H76M76 302l16-9M76 302l16 9" className="dr-behind dr-open" />
          {rings.map((ring) => (
            <PlaceRing key={ring.place} {...ring} />
          ))}
        </g>
      )}
    </Frame>
  );
}

function Coach({ hatch }: { hatch: string }) {
  const cut = "M84 8C66 46 104 80 86 122C72 158 100 190 84 226";
  return (
    <>
      <path d={`${cut}H150A44 44 0 0 1 242 226H304V30Q304 8 282 8Z`} className="dr-edge" />
      <path d="M84 8C66 46 104 80 86 122C72 158 100 190 84 226H104V8Z" fill={hatch} stroke="none" />
      <rect x="124" y="44" width="118" height="52" rx="7" className="dr-part" />
      <path d="M104 186H304M262 8V226" className="dr-fine dr-open" />
      <rect x="288" y="160" width="16" height="30" className="dr-part dr-shade" />
      <circle cx="196" cy="232" r="32" className="dr-edge" />
      <circle cx="196" cy="232" r="13" className="dr-part dr-shade" />
      <path d="M278 226H318V236H278Z" className="dr-part dr-shade" />
    </>
  );
}

function Car() {
  const body =
    "M462 240Q454 216 466 200Q500 186 548 182L602 140Q612 132 632 132H724Q750 132 766 148L800 186Q816 190 818 210V240" +
    "H788A38 38 0 0 0 712 240H578A38 38 0 0 0 502 240Z";
  return (
    <>
      <path d={body} className="dr-edge" />
      <path
        d="M614 147L578 181H658V147ZM670 147V181H756L732 152Q728 147 720 147Z"
        className="dr-part dr-shade"
      />
      <path d="M664 147V232M676 196H694M482 196L470 212H500" className="dr-fine dr-open" />
      <path d="M800 192H815V214H804Z" className="dr-part dr-shade" />
      {[540, 750].map((x) => (
        <g key={x}>
          <circle cx={x} cy="234" r="30" className="dr-edge" />
          <circle cx={x} cy="234" r="12" className="dr-part dr-shade" />
        </g>
      ))}
    </>
  );
}

function Gear() {
  return (
    <>
      <Wire kind="cord" d="M300 214C340 188 410 238 466 212" width={3} />
      <Wire kind="cable" d="M312 240C350 264 424 262 470 236" width={6} />
      <path d="M304 228H338V242H356V230H344V222H304Z" className="dr-part dr-shade" />
      <Wire d="M350 236L462 228" width={9} />
      <path d="M452 218H476V238H452Z" className="dr-part dr-shade" />
      <path d="M457 212V244" className="dr-line" />
    </>
  );
}

function PlaceRing({ place, at: [x, y], to }: Ring) {
  const reach = to ? Math.hypot(to[0] - x, to[1] - y) : 1;
  const start = to && [x + ((to[0] - x) / reach) * radius, y + ((to[1] - y) / reach) * radius];
  const leader = to && start && `M${start[0]!.toFixed(1)} ${start[1]!.toFixed(1)}L${to[0]} ${to[1]}`;
  return (
    <g>
      {leader && <path d={leader} className="dr-leader-halo" />}
      {leader && <path d={leader} className="dr-leader" />}
      {to && <circle cx={to[0]} cy={to[1]} r="4" className="dr-solid" />}
      <circle cx={x} cy={y} r={radius} className="dr-ring" />
      <text x={x} y={y + 9} textAnchor="middle" className="fill-ink font-mono text-[26px] font-semibold">
        {place}
      </text>
    </g>
  );
}
