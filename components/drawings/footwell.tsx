/** The driver's footwell from the side, cut: wall to the left, floor on y = 206. */
export function Footwell({ hatch, to = 394 }: { hatch: string; to?: number }) {
  const edge = `M40 -4C28 50 26 90 32 138L68 206H${to}`;
  return (
    <>
      <path d={`${edge}V216H-4V-4Z`} fill={hatch} />
      <path d={edge} className="dr-edge dr-open" />
    </>
  );
}

/** The front edge of the driver's seat on that floor, cut. */
export function Seat({ hatch }: { hatch: string }) {
  const edge = "M394 66H350Q328 66 326 86L322 174Q322 190 338 190H394";
  return (
    <>
      <path d={`${edge}Z`} fill={hatch} />
      <path d={edge} className="dr-edge dr-open" />
      <path d="M340 190V206M384 190V206" className="dr-part" />
    </>
  );
}

/** The brake pedal in that footwell with its bracket and stop; pressed, its place at rest is dashed. */
export function Pedal({ pressed = false }: { pressed?: boolean }) {
  return (
    <>
      <path d="M36 14H116V54H92L86 36H33" className="dr-edge dr-shade" />
      <path d="M116 44H150V70H136V57H116Z" className="dr-part dr-shade" />
      {pressed && (
        <path
          d="M-8 -29H4Q8 -29 8 -25V25Q8 29 4 29H-8Z"
          transform="translate(108 144) rotate(20)"
          className="dr-behind dr-open"
        />
      )}
      <g transform={pressed ? "rotate(17 100 36)" : undefined}>
        <path d={arm} strokeWidth="17" className="dr-wire-out" />
        <path d={arm} strokeWidth="11.6" className="dr-wire-in" />
        <g transform="translate(108 144) rotate(20)">
          <path d="M-8 -29H4Q8 -29 8 -25V25Q8 29 4 29H-8Z" className="dr-edge dr-shade" />
          <path d="M2 -21H8M2 -13H8M2 -5H8M2 3H8M2 11H8M2 19H8" className="dr-fine" />
        </g>
      </g>
      <path d="M124 58H136V70H125Z" className="dr-solid" />
      <circle cx="100" cy="36" r="11" className="dr-edge" />
      <circle cx="100" cy="36" r="3.5" className="dr-solid" />
    </>
  );
}

const arm = "M100 38C116 64 120 96 108 134";
