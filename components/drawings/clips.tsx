type At = { x: number; y: number };

/** The far half of a hairpin clip: the straight leg that goes through the pin. Draw it before the pin. */
export function HairpinLeg({ x, y }: At) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <path d="M3 -30L-2 30" strokeWidth="6" className="dr-wire-out" />
      <path d="M3 -30L-2 30" strokeWidth="2.4" className="dr-wire-in" />
    </g>
  );
}

/** The near half of a hairpin clip: eye and sprung leg, round the outside of the pin. Draw it after the pin. */
export function HairpinBow({ x, y }: At) {
  const d = "M3 -29C6 -44 -16 -46 -15 -32C-14 -24 -7 -22 -8 -15C-10 -8 -18 -4 -17 6C-16 13 -10 15 -12 26";
  return (
    <g transform={`translate(${x} ${y})`}>
      <path d={d} strokeWidth="6" className="dr-wire-out" />
      <path d={d} strokeWidth="2.4" className="dr-wire-in" />
    </g>
  );
}

type QuickLinkProps = At & { turn?: number; scale?: number };

/** A quick link with its threaded sleeve screwed shut. */
export function QuickLink({ x, y, turn = 0, scale = 1 }: QuickLinkProps) {
  const d = "M-9 -8H9A8 8 0 0 1 9 8H-9A8 8 0 0 1 -9 -8Z";
  return (
    <g transform={`translate(${x} ${y}) rotate(${turn}) scale(${scale})`}>
      <path d={d} strokeWidth="6" className="dr-wire-out" />
      <path d={d} strokeWidth="2.2" className="dr-wire-in" />
      <path d="M-7 -12H7V-4H-7Z" className="dr-fine dr-shade" />
      <path d="M-7 -8H7" className="dr-fine" />
    </g>
  );
}

/** The end of a cable: its eye and the ferrule that closes it. The eye lies ahead of the point given. */
export function CableEnd({ x, y, turn = 0 }: At & { turn?: number }) {
  return (
    <g transform={`translate(${x} ${y}) rotate(${turn})`}>
      <path d="M-2 0C4 -11 19 -9 19 0C19 9 4 11 -2 0Z" strokeWidth="5.6" className="dr-wire-out" />
      <path d="M-2 0C4 -11 19 -9 19 0C19 9 4 11 -2 0Z" strokeWidth="2" className="dr-wire-in" />
      <path d="M-14 -6H0V6H-14Z" className="dr-fine dr-shade" />
    </g>
  );
}
