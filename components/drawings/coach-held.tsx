import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { DashLamp, onAmber } from "./dash-lamp";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";

const words = drawingWords["coach-held"];
const chock = "M-62 0L-40 -25Q-38 -27 -36 -25L-34 -21A42 42 0 0 0 -15 -3L-14 0Z";

/** Before the two meet: the rig on level ground; in the windows, the coach's lamp for its brake and the car's chocks. */
export function CoachHeldDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <CoachHeldSmall />;
  return (
    <Frame {...words} height={338}>
      {(hatch) => (
        <>
          <path d="M-4 284H394V294H-4Z" fill={hatch} />
          <path d="M-4 284H394" className="dr-edge" />
          <Vehicles />
          <path d="M30 126L24 208M368 126L358 251" className="dr-fine" />
          <circle cx="24" cy="226" r="17" className="dr-fine dr-open" />
          <circle cx="352" cy="270" r="19" className="dr-fine dr-open" />

          {/* The coach's dash. */}
          <path d="M10 10H186V126H10Z" className="dr-edge" />
          <path
            d="M11.6 82A52 52 0 0 1 62 124.4H11.6ZM184.4 82A52 52 0 0 0 134 124.4H184.4Z"
            className="dr-tone"
          />
          <path d="M11.6 82A52 52 0 0 1 62 125M184.4 82A52 52 0 0 0 134 125" className="dr-part dr-open" />
          <path
            d="M14 98L22 99M24 90L28 96M38 94L36 101M50 105L44 109M182 98L174 99M158 94L160 101M146 105L152 109M172 90L168 96"
            className="dr-fine"
          />
          <path d="M12 122L42 118M184 122L160 106" className="dr-part" />
          <DashLamp x={98} y={58} lit />

          {/* The car's wheel. */}
          <path d="M204 10H380V126H204Z" className="dr-edge" />
          <path d="M205.6 117H378.4V124.4H205.6Z" fill={hatch} />
          <path d="M204 116H380M206 66H240A52 52 0 0 1 344 66H378" className="dr-part dr-open" />
          <circle cx="292" cy="74" r="42" className="dr-edge dr-shade" />
          <circle cx="292" cy="74" r="27" className="dr-part" />
          <circle cx="292" cy="74" r="9" className="dr-fine dr-open" />
          <path d="M292 47V64M292 84V101M265 74H282M302 74H319" className="dr-fine" />
          <path d={chock} transform="translate(292 116)" className="dr-part dr-solid" />
          <path d={chock} transform="translate(292 116) scale(-1 1)" className="dr-part dr-solid" />

          <Callout letter="A" lines={words.callouts.A} at={[62, 156]} to={[[92, 76]]} onCallout={onCallout} />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[292, 158]}
            label="left"
            to={[
              [254, 107],
              [330, 107],
            ]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[140, 315]}
            to={[[128, 286]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** Coach and car one behind the other, apart; below the ground, a spirit level with its bubble in the middle. */
function Vehicles() {
  return (
    <>
      <path
        d="M22 186H210Q220 186 220 196V262Q220 268 214 268H14Q8 268 8 260V236Q10 200 22 186Z"
        className="dr-edge"
      />
      <path d="M24 196H48V228H13Q15 208 24 196Z" className="dr-part dr-shade" />
      <path d="M62 200H98V220H62ZM110 200H146V220H110ZM158 200H204V220H158Z" className="dr-fine dr-shade" />
      <path d="M8 244H220" className="dr-fine" />
      {[48, 172].map((x) => (
        <g key={x}>
          <circle cx={x} cy="267" r="17" className="dr-edge dr-shade" />
          <circle cx={x} cy="267" r="7" className="dr-fine" />
        </g>
      ))}
      <path d="M262 304H342V326H262Z" className="dr-edge dr-shade" />
      <path d="M276 309H328A6 6 0 0 1 328 321H276A6 6 0 0 1 276 309Z" className="dr-part" />
      <path d="M294 310V320M310 310V320" className="dr-fine" />
      <circle cx="302" cy="315" r="4.5" className="dr-part" />
      <path
        d="M262 272V252Q262 244 270 242L294 236L312 216Q315 213 320 213H350Q356 213 359 218L370 236Q378 240 378 250V272Z"
        className="dr-edge"
      />
      <path d="M300 236L316 219H331V236ZM337 219H350L359 236H337Z" className="dr-fine dr-shade" />
      {[288, 352].map((x) => (
        <g key={x}>
          <circle cx={x} cy="270" r="14" className="dr-edge dr-shade" />
          <circle cx={x} cy="270" r="5" className="dr-fine" />
        </g>
      ))}
      <path d="M333 284L341 275L346 284ZM371 284L363 275L358 284Z" className="dr-fine dr-solid" />
    </>
  );
}

function CoachHeldSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M0 68H88" className="dr-part" />
          <path d="M4 34Q6 22 12 20H38Q42 20 42 24V60H4Z" className="dr-part" />
          <path d="M9 36Q10 27 14 25H20V36Z" className="dr-fine dr-shade" />
          <circle cx="24" cy="60" r="7.5" className="dr-part dr-shade" />
          <path d="M50 60V50L56 47L63 36H76L82 47L85 50V60Z" className="dr-part" />
          <circle cx="68" cy="59" r="8.5" className="dr-part dr-shade" />
          <path d="M50 68L58 58L64 68ZM86 68L78 58L72 68Z" className="dr-fine dr-solid" />
          <circle cx="24" cy="10" r="7" className="dr-part dr-lit" />
          <path d="M22 14V6.5H25A2.2 2.2 0 0 1 25 11H22" stroke={onAmber} strokeWidth="1.6" fill="none" />
        </>
      )}
    </SmallFrame>
  );
}
