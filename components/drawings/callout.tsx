import { useContext } from "react";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";
import type { Stretch } from "./nearest";
import { ShownContext } from "./shown";
import { calloutAt, reachAttributes } from "./touch";

type Point = readonly [x: number, y: number];

type CalloutProps = {
  letter: CalloutLetter;
  lines?: readonly string[];
  /** Where the letter stands. */
  at: Point;
  /** What it points at; several where one letter means several of a kind. */
  to: readonly Point[];
  /** On which side of the letter its label stands. */
  label?: "left" | "right" | "below" | "above";
  onCallout?: (letter: CalloutLetter) => void;
};

const radius = 15;
const lineHeight = 18;
/** Half of what a knuckle needs, with something to spare for a drawing that is shown smaller than it was drawn. */
const touchRadius = 46;

/** A letter in a ring with its leader and its label, as on a workshop sheet. */
export function Callout({ letter, lines = [], at, to, label = "right", onCallout }: CalloutProps) {
  const { marked, effect, figures, bare } = useContext(ShownContext);
  if (bare) return null;
  const [x, y] = at;
  const figure = figures?.[letter];
  const rows = lines.length + (figure ? 1 : 0);
  const leaders = to.map(([toX, toY]) => {
    const reach = Math.hypot(toX - x, toY - y) || 1;
    const startX = x + ((toX - x) / reach) * radius;
    const startY = y + ((toY - y) / reach) * radius;
    return { d: `M${startX.toFixed(1)} ${startY.toFixed(1)}L${toX} ${toY}`, toX, toY };
  });
  const anchor = label === "left" ? "end" : label === "right" ? "start" : "middle";
  const textX = label === "left" ? x - radius - 8 : label === "right" ? x + radius + 8 : x;
  const firstY = {
    left: y + 5.5 - ((rows - 1) * lineHeight) / 2,
    right: y + 5.5 - ((rows - 1) * lineHeight) / 2,
    below: y + radius + 17,
    above: y - radius - 8 - (rows - 1) * lineHeight,
  }[label];
  const isMarked = marked?.includes(letter) ?? false;
  const beside = besideOf(lines, { x: textX, y: firstY + ((rows - 1) * lineHeight) / 2 - 5.5, anchor });
  const stretches: Stretch[] = [...to.map(([toX, toY]) => [x, y, toX, toY] as const), beside];
  return (
    <g
      onClick={
        onCallout &&
        ((event) => {
          onCallout(calloutAt(event) ?? letter);
        })
      }
      {...reachAttributes(letter, stretches)}
      className={`dr-callout ${onCallout ? "dr-touch" : ""} ${isMarked ? `dr-marked dr-marked-${effect ?? "fix"}` : ""}`}
    >
      {leaders.map(({ d }) => (
        <path key={d} d={d} className="dr-leader-halo" />
      ))}
      {leaders.map(({ d, toX, toY }) => (
        <g key={d}>
          <path d={d} className="dr-leader" />
          {isMarked ? <Cross x={toX} y={toY} /> : <circle cx={toX} cy={toY} r="3" className="dr-solid" />}
        </g>
      ))}
      <g className="dr-mark">
        {isMarked && <circle cx={x} cy={y} r={radius + 3.5} className="dr-mark-rim" />}
        <circle cx={x} cy={y} r={radius} className="dr-ring" />
        <text x={x} y={y + 6} className="dr-letter">
          {letter}
        </text>
      </g>
      {lines.map((line, index) => (
        <text key={line} x={textX} y={firstY + index * lineHeight} textAnchor={anchor} className="dr-label">
          {line}
        </text>
      ))}
      {figure && (
        <text
          x={textX}
          y={firstY + lines.length * lineHeight}
          textAnchor={anchor}
          className="dr-label dr-figure"
        >
          {figure}
        </text>
      )}
      {onCallout &&
        stretches.map(([fromX, fromY, toX, toY]) => (
          <path
            key={`${fromX} ${fromY} ${toX} ${toY}`}
            d={`M${fromX} ${fromY}L${toX} ${toY}`}
            strokeWidth={touchRadius * 2}
            className="dr-reach"
          />
        ))}
    </g>
  );
}

/** Along the middle of a label, about as long as its longest line is. */
function besideOf(
  lines: readonly string[],
  { x, y, anchor }: { x: number; y: number; anchor: string },
): Stretch {
  const length = Math.max(0, ...lines.map((line) => line.length)) * 7.8;
  const from = { start: 0, middle: -length / 2, end: -length }[anchor] ?? 0;
  return [x + from, y, x + from + length, y];
}

/** Struck out: this is what is not as drawn. */
function Cross({ x, y }: { x: number; y: number }) {
  const d = `M${x - 8} ${y - 8}L${x + 8} ${y + 8}M${x + 8} ${y - 8}L${x - 8} ${y + 8}`;
  return (
    <>
      <path d={d} className="dr-cross-halo" />
      <path d={d} className="dr-cross" />
    </>
  );
}
