export type SegmentState = "todo" | "now" | "good" | "hold" | "fix" | "unseen" | "absent";
export type StripStation = { key: string; segments: readonly SegmentState[] };

type StripProps = {
  stations: readonly StripStation[];
  /** The whole strip in words; the picture itself has none. */
  label: string;
  /** field: 26 px high for the head of a walk. small: for rows and lists. */
  size?: "field" | "small";
};

/** A walk as a strip of tape: a segment a check, a wider gap between stations. */
export function Strip({ stations, label, size = "field" }: StripProps) {
  const held = stations.filter((station) => station.segments.length > 0);
  const small = size === "small";
  const between = small ? "ml-1" : "ml-[7px]";
  const inside = small ? "ml-px" : "ml-0.5";
  return (
    <div role="img" aria-label={label} className={`tape flex w-full ${small ? "tape-small h-4" : "h-6.5"}`}>
      {held.flatMap((station, place) =>
        station.segments.map((state, at) => {
          const gap = at > 0 ? inside : place > 0 ? between : "";
          return <span key={`${station.key}-${at}`} className={`tape-seg tape-${state} ${gap}`} />;
        }),
      )}
    </div>
  );
}
