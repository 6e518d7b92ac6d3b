import type { Signal } from "@/lib/domain/lamp-script";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";
import { Frame } from "./frame";
import { Wire } from "./wire";

const words = lampScriptWords.arms;

type Arm = "hanging" | "out" | "fist" | "lamp" | "waving";
type Pose = { left: Arm; right: Arm; lit: keyof typeof words.lit };

const poses: Record<Signal, Pose> = {
  tail: { left: "lamp", right: "hanging", lit: "both" },
  left: { left: "out", right: "hanging", lit: "left" },
  right: { left: "hanging", right: "out", lit: "right" },
  stop: { left: "fist", right: "fist", lit: "both" },
  hazard: { left: "waving", right: "waving", lit: "both" },
  "stop-left": { left: "out", right: "fist", lit: "both" },
  "stop-right": { left: "fist", right: "out", lit: "both" },
};

/** The watcher behind the car with the arms that ask for a signal, as a mirror or a rear camera shows it. */
export function ArmSignalDrawing({ signal }: { signal: Signal }) {
  const { left, right, lit } = poses[signal];
  const { name, arms } = lampScriptWords.signal[signal];
  return (
    <Frame title={words.title(name)} description={words.description(arms, words.lit[lit])} height={300}>
      {(hatch) => (
        <>
          <Body />
          <Car hatch={hatch} />
          <Lamp lit={lit !== "right"} />
          <g transform={mirrored}>
            <Lamp lit={lit !== "left"} />
          </g>
          <ArmOf arm={left} />
          <g transform={mirrored}>
            <ArmOf arm={right} />
          </g>
          <text x="34" y="284" textAnchor="middle" className="dr-label">
            {words.left}
          </text>
          <text x="356" y="284" textAnchor="middle" className="dr-label">
            {words.right}
          </text>
        </>
      )}
    </Frame>
  );
}

const mirrored = "translate(390 0) scale(-1 1)";

/** From high up at the coach: the hood is near, the tail far, and the watcher stands beyond it. */
function Car({ hatch }: { hatch: string }) {
  return (
    <>
      <path d="M82 308L100 224Q104 206 122 204H268Q286 206 290 224L308 308" className="dr-edge" />
      <path d="M120 262Q195 246 270 262L262 226Q195 216 128 226Z" className="dr-part" />
      <path d="M120 262Q195 246 270 262L262 226Q195 216 128 226Z" fill={hatch} />
      <path d="M112 284Q195 268 278 284" className="dr-fine dr-open" />
    </>
  );
}

function Lamp({ lit }: { lit: boolean }) {
  return (
    <>
      <path d="M104 204H132V190Q110 190 104 204Z" className={`dr-part ${lit ? "dr-lit" : ""}`} />
      {lit && <path d="M96 190L82 182M106 180L98 166M92 204H76" className="dr-edge" />}
    </>
  );
}

function Body() {
  return (
    <>
      <Wire d="M183 150L179 200M207 150L211 200" width={20} />
      <path d="M172 84Q195 76 218 84L212 156H178Z" className="dr-edge" />
      <circle cx="195" cy="52" r="22" className="dr-edge" />
      <path d="M172 48Q195 34 218 48" className="dr-part dr-open" />
    </>
  );
}

function ArmOf({ arm }: { arm: Arm }) {
  switch (arm) {
    case "hanging":
      return <Limb d="M174 92L164 128L166 158" />;
    case "lamp":
      return (
        <>
          <Limb d="M174 92L150 122L134 150" />
          <path d="M128 162L123 176M118 169L122 178L131 173" className="dr-edge dr-open" />
        </>
      );
    case "out":
      return <Limb d="M174 92L120 92L62 92" />;
    case "fist":
      return (
        <>
          <Limb d="M174 92L132 92L132 46" />
          <circle cx="132" cy="38" r="13" className="dr-edge" />
          <path d="M124 36H140M124 42H138" className="dr-fine" />
        </>
      );
    case "waving":
      return (
        <>
          <Limb d="M174 92L120 92L62 92" />
          <path d="M44 66Q34 92 44 118M42 76L44 66L53 71M42 108L44 118L53 113" className="dr-part dr-open" />
        </>
      );
  }
}

function Limb({ d }: { d: string }) {
  return <Wire d={d} width={18} />;
}
