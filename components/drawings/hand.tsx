type HandProps = { x: number; y: number; turn?: number; mirrored?: boolean };

/** Round strokes laid over each other and then filled by thinner ones: one outline round the whole hand. */
function Strokes({ strokes }: { strokes: readonly (readonly [d: string, width: number])[] }) {
  return (
    <>
      {strokes.map(([d, width]) => (
        <path key={d} d={d} strokeWidth={width} className="dr-wire-out" />
      ))}
      {strokes.map(([d, width]) => (
        <path key={d} d={d} strokeWidth={width - 4.8} className="dr-wire-in" />
      ))}
    </>
  );
}

const place = ({ x, y, turn = 0, mirrored = false }: HandProps) =>
  `translate(${x} ${y}) scale(${mirrored ? -1 : 1} 1) rotate(${turn})`;

/** A hand closed round something that runs up and down through the point given; the arm comes from the left. */
export function GripHand(props: HandProps) {
  return (
    <g transform={place(props)}>
      <Strokes
        strokes={[
          ["M-34 8L-120 178", 40],
          ["M-22 -8L-26 10", 44],
        ]}
      />
      <Strokes
        strokes={[
          ["M-16 -21L9 -22", 15],
          ["M-18 -8L13 -8", 15],
          ["M-18 5L12 6", 15],
          ["M-18 18L8 20", 15],
        ]}
      />
      <path d="M-26 -20V20" strokeWidth="15" className="dr-wire-in" />
      <Strokes strokes={[["M-30 -14L-8 -38", 16]]} />
      <path d="M-34 -4L-26 -14" strokeWidth="13" className="dr-wire-in" />
    </g>
  );
}

/** A hand that presses with one finger, its tip at the point given; the arm comes from the upper right. */
export function PressHand(props: HandProps) {
  return (
    <g transform={place(props)}>
      <Strokes
        strokes={[
          ["M52 -62L108 -112", 36],
          ["M0 -8L18 -46L40 -58", 15],
          ["M38 -54L50 -64", 44],
        ]}
      />
      <Strokes
        strokes={[
          ["M28 -36L40 -44", 14],
          ["M38 -28L50 -40", 14],
          ["M50 -26L62 -40", 14],
        ]}
      />
      <path d="M46 -46L62 -54" strokeWidth="16" className="dr-wire-in" />
    </g>
  );
}
