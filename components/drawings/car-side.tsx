/** A small hatchback from its left side, nose to the left, standing on y = 282; far wheels hatched behind. */
export function CarSide({ hatch }: { hatch: string }) {
  const wheels = [216, 336];
  return (
    <>
      {wheels.map((x) => (
        <g key={x}>
          <circle cx={x + 16} cy="251" r="27" className="dr-fine" />
          <circle cx={x + 16} cy="251" r="27" fill={hatch} />
        </g>
      ))}
      <path
        d="M172 248V226Q172 212 186 208L234 196L268 164Q274 158 284 158H340Q352 158 358 166L374 196Q384 202 384 214V250H368A33 33 0 0 0 304 250H248A33 33 0 0 0 184 250H174Z"
        className="dr-edge"
      />
      <path d="M246 196L274 170H304V196ZM312 170H342L356 196H312Z" className="dr-part dr-shade" />
      <path d="M172 226Q200 218 244 218H384M308 196V248M262 226H276" className="dr-fine dr-open" />
      <path d="M180 212L196 210L190 220H176Z" className="dr-fine dr-shade" />
      {wheels.map((x) => (
        <g key={x}>
          <circle cx={x} cy="255" r="27" className="dr-edge dr-shade" />
          <circle cx={x} cy="255" r="14" className="dr-part" />
          <path d={`M${x - 18} 235A27 27 0 0 1 ${x + 18} 235`} className="dr-open" />
          <path d={`M${x} 241V269M${x - 14} 255H${x + 14}`} className="dr-fine" />
        </g>
      ))}
    </>
  );
}
