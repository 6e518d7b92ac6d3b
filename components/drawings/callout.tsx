import type { CalloutLetter } from "@/lib/domain/messages/drawings";

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

/** A letter in a ring with its leader and its label, as on a workshop sheet. */
export function Callout({ letter, lines = [], at, to, label = "right", onCallout }: CalloutProps) {
  const [x, y] = at;
  const leaders = to.map(([toX, toY]) => {
    const reach = Math.hypot(toX - x, toY - y) || 1;
    const startX = x + ((toX - x) / reach) * radius;
    const startY = y + ((toY - y) / reach) * radius;
    return { d: `M${startX.toFixed(1)} ${startY.toFixed(1)}L${toX} ${toY}`, toX, toY };
  });
  const anchor = label === "left" ? "end" : label === "right" ? "start" : "middle";
  const textX = label === "left" ? x - radius - 7 : label === "right" ? x + radius + 7 : x;
  const firstY = {
    left: y + 5.5 - ((lines.length - 1) * lineHeight) / 2,
    right: y + 5.5 - ((lines.length - 1) * lineHeight) / 2,
    below: y + radius + 17,
    above: y - radius - 8 - (lines.length - 1) * lineHeight,
  }[label];
  return (
    <g
      onClick={onCallout && (() => onCallout(letter))}
      className={`dr-callout ${onCallout ? "dr-touch" : ""}`}
    >
      {leaders.map(({ d }) => (
        <path key={d} d={d} className="dr-leader-halo" />
      ))}
      {leaders.map(({ d, toX, toY }) => (
        <g key={d}>
          <path d={d} className="dr-leader" />
          <circle cx={toX} cy={toY} r="3" className="dr-solid" />
        </g>
      ))}
      <circle cx={x} cy={y} r={radius} className="dr-ring" />
      <text x={x} y={y + 6} className="dr-letter">
        {letter}
      </text>
      {lines.map((line, index) => (
        <text key={line} x={textX} y={firstY + index * lineHeight} textAnchor={anchor} className="dr-label">
          {line}
        </text>
      ))}
      {onCallout && <circle cx={x} cy={y} r="36" className="dr-open" pointerEvents="all" />}
    </g>
  );
}
