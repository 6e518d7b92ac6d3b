import { drawingWords, lampWords } from "@/lib/domain/messages/drawings";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

export type LampLook = "steady" | "flashing" | "dark";
type LampsProps = Pick<DrawingProps, "size"> & { left?: LampLook; right?: LampLook };

const lens = "M46 128H100Q110 128 110 138V162Q110 172 100 172H42Q41 148 46 128Z";
const stripes = [46, 62, 78, 94];
const rays = "M30 124L13 113M25 146L5 144M26 166L7 172";

/** The car's tail from behind, each lamp as the signal should show it; your left is the car's left. */
export function LampsDrawing({ size = "full", left = "steady", right = "steady" }: LampsProps) {
  const { title, description } = drawingWords.lamps;
  const told = `${description} ${lampWords.description(lampWords[left], lampWords[right])}`;
  if (size === "small") return <LampsSmall title={title} description={told} left={left} right={right} />;
  return (
    <Frame title={title} description={told} height={304}>
      {(hatch) => (
        <>
          <path
            d="M64 252V278Q64 288 74 288H104Q114 288 114 278V252M276 252V278Q276 288 286 288H316Q326 288 326 278V252"
            className="dr-edge dr-shade"
          />
          <path d="M72 262H106M72 272H106M284 262H318M284 272H318" className="dr-fine" />
          <path
            d="M88 38Q195 16 302 38L336 116Q348 124 350 152L348 238Q346 256 330 256H60Q44 256 42 238L40 152Q42 124 54 116Z"
            className="dr-edge"
          />
          <path d="M106 50Q195 34 284 50L308 108Q195 98 82 108Z" className="dr-part" />
          <path d="M106 50Q195 34 284 50L308 108Q195 98 82 108Z" fill={hatch} />
          <path d="M170 34Q195 31 220 34" className="dr-edge" />
          <path d="M110 148H280M168 116H222" className="dr-fine" />
          <path d="M41 208Q195 222 349 208" className="dr-part dr-open" />
          <path d="M41 218Q195 232 349 218" className="dr-fine dr-open" />
          <path
            d="M156 160H234Q237 160 237 163V187Q237 190 234 190H156Q153 190 153 187V163Q153 160 156 160Z"
            className="dr-part"
          />
          <path d="M182 240H208" className="dr-fine" />
          <Lamp look={left} />
          <g transform="translate(390 0) scale(-1 1)">
            <Lamp look={right} />
          </g>
          <text x="78" y="199" textAnchor="middle" className="dr-label">
            {lampWords[left]}
          </text>
          <text x="312" y="199" textAnchor="middle" className="dr-label">
            {lampWords[right]}
          </text>
          <text x="50" y="26" textAnchor="middle" className="dr-mono">
            {lampWords.left}
          </text>
          <text x="340" y="26" textAnchor="middle" className="dr-mono">
            {lampWords.right}
          </text>
        </>
      )}
    </Frame>
  );
}

function Lamp({ look }: { look: LampLook }) {
  if (look === "dark") {
    return (
      <>
        <path d={lens} className="dr-edge" />
        <path d="M58 140H98M56 150H98M56 160H98" className="dr-behind" />
      </>
    );
  }
  const flashing = look === "flashing";
  return (
    <>
      <path d={lens} className={`dr-edge ${flashing ? "" : "dr-lit"}`} />
      {flashing && stripes.map((x) => <path key={x} d={`M${x} 130h8v40h-8Z`} className="dr-lit" />)}
      {flashing && <path d={lens} className="dr-edge dr-lit dr-flash" />}
      <path d={rays} strokeDasharray={flashing ? "5 5" : undefined} className="dr-edge" />
    </>
  );
}

type SmallProps = { title: string; description: string; left: LampLook; right: LampLook };

function LampsSmall({ left, right, ...words }: SmallProps) {
  const look = { steady: "dr-lit", flashing: "dr-lit", dark: "" };
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M14 62V72H24V62M64 62V72H74V62" className="dr-part dr-shade" />
          <path d="M18 8Q44 2 70 8L80 30L82 62H6L8 30Z" className="dr-part" />
          <path d="M24 13Q44 8 64 13L70 26Q44 23 18 26Z" className="dr-fine dr-shade" />
          <path d="M8 33H25V46H7Z" className={`dr-part ${look[left]}`} />
          <path d="M80 33H63V46H81Z" className={`dr-part ${look[right]}`} />
          {left === "flashing" && <path d="M13 34H18V45H13Z" className="dr-blank" />}
          {right === "flashing" && <path d="M70 34H75V45H70Z" className="dr-blank" />}
          <path d="M36 40H52V48H36Z" className="dr-fine" />
        </>
      )}
    </SmallFrame>
  );
}
