import type { LampState, Signal } from "@/lib/domain/entry";
import { separateLook } from "@/lib/domain/lamp-board";
import { drawingWords, lampWords } from "@/lib/domain/messages/drawings";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

type LampsProps = Pick<DrawingProps, "size"> & {
  left?: LampState;
  right?: LampState;
  /** Two lamps a side for this signal: turn above, stop and tail below. */
  separate?: Signal;
};

const lens = "M46 128H100Q110 128 110 138V162Q110 172 100 172H42Q41 148 46 128Z";
const upper = "M46 128H100Q110 128 110 138V148H42Q43 138 46 128Z";
const lower = "M42 152H110V162Q110 172 100 172H42Z";
const rays = "M30 124L13 113M25 146L5 144M26 166L7 172";

/** The car's tail from behind, each lamp as the signal should show it; your left is the car's left. */
export function LampsDrawing({ size = "full", left = "steady", right = "steady", separate }: LampsProps) {
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
          <Side state={left} separate={separate} />
          <g transform="translate(390 0) scale(-1 1)">
            <Side state={right} separate={separate} />
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

function Side({ state, separate }: { state: LampState; separate?: Signal }) {
  const shown = separate && separateLook(separate, state);
  return (
    <>
      {shown ? (
        <>
          <Lens path={upper} top={130} height={16} state={shown.turn} />
          <Lens path={lower} top={154} height={16} state={shown.stop} />
        </>
      ) : (
        <Lens path={lens} top={130} height={40} state={state} />
      )}
      {(state === "steady" || state === "flashing") && (
        <path d={rays} strokeDasharray={state === "flashing" ? "5 5" : undefined} className="dr-edge" />
      )}
    </>
  );
}

type LensProps = { path: string; top: number; height: number; state: LampState };

/** Form tells the states apart: filled, striped, a thin core of light, dashed, a question. */
function Lens({ path, top, height, state }: LensProps) {
  const middle = top + height / 2;
  switch (state) {
    case "steady":
      return <path d={path} className="dr-edge dr-lit" />;
    case "flashing":
      return (
        <>
          <path d={path} className="dr-edge" />
          {[48, 64, 80, 96].map((x) => (
            <path key={x} d={`M${x} ${top}h8v${height}h-8Z`} className="dr-lit" />
          ))}
          <path d={path} className="dr-edge dr-lit dr-flash" />
        </>
      );
    case "dim":
      return (
        <>
          <path d={path} className="dr-edge" />
          <circle cx="78" cy={middle} r={height / 5} className="dr-fine dr-lit" />
        </>
      );
    case "dark":
      return (
        <>
          <path d={path} className="dr-edge" />
          <path d={`M58 ${top + height / 4}H98M56 ${top + (3 * height) / 4}H98`} className="dr-behind" />
        </>
      );
    case "wrong":
      return (
        <>
          <path d={path} className="dr-edge" />
          <path
            d={`M60 ${top + height / 5}L96 ${top + (4 * height) / 5}M96 ${top + height / 5}L60 ${top + (4 * height) / 5}`}
            className="dr-part"
          />
        </>
      );
  }
}

type SmallProps = { title: string; description: string; left: LampState; right: LampState };

function LampsSmall({ left, right, ...words }: SmallProps) {
  const look: Record<LampState, string> = {
    steady: "dr-lit",
    flashing: "dr-lit",
    dim: "",
    dark: "",
    wrong: "",
  };
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
