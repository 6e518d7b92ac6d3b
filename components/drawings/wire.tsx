type WireProps = {
  d: string;
  /** Outer thickness. */
  width?: number;
  /** cable: strands laid around it. cord: a plain jacket, filled. rod: bare metal. */
  kind?: "rod" | "cable" | "cord";
};

/** Anything round and long: a clip's wire, a cable, a cord. Its two edges are drawn by a line inside a line. */
export function Wire({ d, width = 6, kind = "rod" }: WireProps) {
  if (kind === "cord") return <path d={d} strokeWidth={width} className="dr-wire-out" />;
  const core = width - (width > 12 ? 5.2 : 3.6);
  return (
    <>
      <path d={d} strokeWidth={width} className="dr-wire-out" />
      <path d={d} strokeWidth={core} className="dr-wire-in" />
      {kind === "cable" && <path d={d} strokeWidth={core} className="dr-lay" />}
    </>
  );
}
