import { drawingWords } from "@/lib/domain/messages/drawings";
import { Callout } from "./callout";
import { Frame, type DrawingProps } from "./frame";
import { SmallFrame } from "./small-frame";
import { Wire } from "./wire";

const words = drawingWords["light-bar"];

/** The car's tail from behind with the removable light bar across it, both ends strapped, its cord in under the hatch. */
export function LightBarDrawing({ size = "full", onCallout }: DrawingProps) {
  if (size === "small") return <LightBarSmall />;
  return (
    <Frame {...words} height={342}>
      {(hatch) => (
        <>
          <g transform="translate(0 30)">
            <path
              d="M64 252V270Q64 280 74 280H104Q114 280 114 270V252M276 252V270Q276 280 286 280H316Q326 280 326 270V252"
              className="dr-edge dr-shade"
            />
            <path
              d="M88 38Q195 16 302 38L336 116Q348 124 350 152L348 238Q346 256 330 256H60Q44 256 42 238L40 152Q42 124 54 116Z"
              className="dr-edge"
            />
            <path d="M106 50Q195 34 284 50L308 108Q195 98 82 108Z" fill={hatch} />
            <path d="M106 50Q195 34 284 50L308 108Q195 98 82 108Z" className="dr-part dr-open" />
            <path
              d="M46 128H100Q110 128 110 138V162Q110 172 100 172H42Q41 148 46 128ZM344 128H290Q280 128 280 138V162Q280 172 290 172H348Q349 148 344 128Z"
              className="dr-fine"
            />
            <path d="M41 212Q195 226 349 212M41 222Q195 236 349 222" className="dr-fine dr-open" />
            <path d="M156 178H234V206H156Z" className="dr-part" />
            <path d="M166 192H224" className="dr-fine" />
          </g>

          <Strap />
          <g transform="translate(390 0) scale(-1 1)">
            <Strap />
          </g>

          {/* Bar. */}
          <path d="M30 150H360V188H30Z" className="dr-edge" />
          <path d="M36 156H120V182H36ZM354 156H270V182H354Z" className="dr-part dr-shade" />

          <Wire d="M254 189C240 214 282 216 266 243" width={8} kind="cord" />
          <path d="M258 240H276V250H258Z" className="dr-part dr-shade" />

          <Callout
            letter="A"
            lines={words.callouts.A}
            at={[195, 24]}
            to={[
              [82, 126],
              [308, 126],
            ]}
            onCallout={onCallout}
          />
          <Callout
            letter="B"
            lines={words.callouts.B}
            at={[240, 320]}
            to={[[264, 240]]}
            onCallout={onCallout}
          />
          <Callout
            letter="C"
            lines={words.callouts.C}
            at={[26, 320]}
            to={[[166, 226]]}
            onCallout={onCallout}
          />
        </>
      )}
    </Frame>
  );
}

/** A strap from the bar's end to the hatch's edge above and the bumper's below, hooked and drawn tight. */
function Strap() {
  return (
    <>
      <path d="M92 150L72 106M88 188L80 284" strokeWidth="13" className="dr-wire-out" />
      <path d="M92 150L72 106M88 188L80 284" strokeWidth="8" className="dr-wire-in" />
      <path d="M62 96L76 90L82 106L68 112ZM70 278H90V292H70Z" className="dr-part dr-shade" />
      <path d="M76 240H94V256H76Z" className="dr-part dr-shade" />
      <path d="M76 248H94" className="dr-fine" />
    </>
  );
}

function LightBarSmall() {
  return (
    <SmallFrame {...words}>
      {() => (
        <>
          <path d="M14 62V72H24V62M64 62V72H74V62" className="dr-part dr-shade" />
          <path d="M18 8Q44 2 70 8L80 30L82 62H6L8 30Z" className="dr-part" />
          <path d="M24 13Q44 8 64 13L70 26Q44 23 18 26Z" className="dr-fine dr-shade" />
          <path d="M18 34V12M70 34V12" className="dr-edge" />
          <path d="M2 34H86V46H2Z" className="dr-edge" />
          <path d="M6 37H24V43H6ZM82 37H64V43H82Z" className="dr-fine dr-shade" />
          <path d="M58 46Q56 53 61 58" className="dr-edge dr-open" />
          <path d="M34 50H54V58H34Z" className="dr-fine" />
        </>
      )}
    </SmallFrame>
  );
}
