type DashLampProps = {
  x: number;
  y: number;
  lit?: boolean;
  /** What the lamp says: parking brake, or a fault. */
  sign?: "parking" | "fault";
};

const rays = "M0 -27V-35M19 -19L25 -25M27 0H35M19 19L25 25M0 27V35M-19 19L-25 25M-27 0H-35M-19 -19L-25 -25";

/** Dark in both looks: the ink of the night look would vanish on a lit lamp. */
export const onAmber = "#14130f";

/** A lamp on a dash with its sign. Amber and its rays only where it is lit. */
export function DashLamp({ x, y, lit = false, sign = "parking" }: DashLampProps) {
  const tone = lit ? "dr-lit" : "";
  return (
    <g transform={`translate(${x} ${y})`}>
      {sign === "parking" ? (
        <>
          <circle r="14" className={`dr-part ${tone}`} />
          <path
            d="M-3.5 7.5V-7.5H1.5A4.3 4.3 0 0 1 1.5 1.5H-3.5"
            stroke={lit ? onAmber : undefined}
            strokeWidth="2.4"
            fill="none"
            className={lit ? undefined : "dr-line dr-open"}
          />
          <path
            d="M-15 -14A20.5 20.5 0 0 0 -15 14M15 -14A20.5 20.5 0 0 1 15 14"
            className="dr-line dr-open"
          />
        </>
      ) : (
        <>
          <path d="M0 -17L19 15H-19Z" className={`dr-part ${tone}`} />
          <path d="M0 -6V4" className="dr-edge" />
          <circle cy="10" r="1.8" className="dr-solid" />
        </>
      )}
      {lit && <path d={rays} className="dr-line" />}
    </g>
  );
}
