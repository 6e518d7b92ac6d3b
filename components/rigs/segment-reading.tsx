import { wiringReadingWords as words } from "@/lib/domain/messages/rigs";
import { optionWords, segmentWords } from "@/lib/domain/messages/sheet-wiring";
import {
  changing,
  conductorFields,
  segmentFields,
  type Conductor,
  type Segment,
} from "@/lib/domain/sheet/wiring";
import { Value } from "./value";

// As in the history, a table of grids: four abreast where there is room, two to a line where there is not.
const grid =
  "grid grid-cols-2 gap-x-3 @xl:grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)_minmax(0,1.2fr)_minmax(0,1fr)] print:grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)_minmax(0,1.2fr)_minmax(0,1fr)]";
const small = "block text-sm text-soft @xl:sr-only print:sr-only";

type SegmentReadingProps = { segment: Segment; title: string };

/** One run of wires: what each wire does at either end, and a word where one color does two things. */
export function SegmentReading({ segment, title }: SegmentReadingProps) {
  const { conductors = [], gaugeAwg, length } = segment;
  const ends = [segment.from ?? words.nearEnd, segment.to ?? words.farEnd] as const;
  const heads = [
    words.heads.color,
    words.heads.near(ends[0]),
    words.heads.far(ends[1]),
    words.heads.tag,
  ] as const;
  const changes = changing(segment);
  return (
    <section className="mt-3 break-inside-avoid border-l-hair border-ink pl-3">
      <h5 className="text-base leading-snug font-semibold">{title}</h5>
      <p className="flex flex-wrap gap-x-5 text-base">
        <span>
          <span className="text-soft">{segmentWords.gaugeAwg.label}:</span>{" "}
          <Value field={segmentFields.gaugeAwg} value={gaugeAwg} />
        </span>
        <span>
          <span className="text-soft">{segmentWords.length.label}:</span>{" "}
          <Value field={segmentFields.length} value={length} />
        </span>
      </p>
      {conductors.length > 0 && (
        <table role="table" aria-label={title} className="mt-1 block text-base">
          <thead role="rowgroup" className="sr-only @xl:not-sr-only @xl:block print:not-sr-only print:block">
            <tr role="row" className={`${grid} border-b border-ink text-sm text-soft`}>
              {heads.map((head) => (
                <th key={head} role="columnheader" scope="col" className="py-1 text-left font-semibold">
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody role="rowgroup" className="block">
            {conductors.map((wire, at) => (
              <Wire key={at} wire={wire} heads={heads} ends={ends} changes={changes.includes(wire)} />
            ))}
          </tbody>
        </table>
      )}
    </section>
  );
}

type WireProps = {
  wire: Conductor;
  heads: readonly string[];
  ends: readonly [string, string];
  changes: boolean;
};

function Wire({ wire, heads, ends, changes }: WireProps) {
  const { color, near, far, tagged } = wire;
  return (
    <tr role="row" className={`${grid} items-baseline border-b border-rule py-1.5`}>
      <td role="cell">{color || <span className="text-soft italic">{words.noColor}</span>}</td>
      <td role="cell" className="font-semibold @max-xl:row-start-2 print:row-start-auto">
        <span className={small}>{heads[1]} </span>
        <Value field={conductorFields.near} value={near} />
      </td>
      <td role="cell" className="font-semibold @max-xl:row-start-2 print:row-start-auto">
        <span className={small}>{heads[2]} </span>
        <Value field={conductorFields.far} value={far} />
      </td>
      <td role="cell" className={changes && tagged !== true ? "font-extrabold" : ""}>
        {tagText(changes, tagged)}
      </td>
      {changes && (
        <td role="cell" className="col-span-full mt-1 border-l-8 border-ink pl-3">
          <strong>
            {words.changes(
              color || words.thisWire,
              optionWords[near!]!,
              ends[0],
              optionWords[far!]!,
              ends[1],
            )}
          </strong>{" "}
          {tagged !== true && words.tagWanted}
        </td>
      )}
    </tr>
  );
}

/** A tag is asked for only where one color does two things; elsewhere it is said where somebody looked. */
function tagText(changes: boolean, tagged: boolean | null | undefined): string {
  if (tagged === true) return words.tagged;
  if (changes) return words.tagNeeded;
  if (tagged === false) return words.untagged;
  return tagged === null ? words.tagUnknown : "";
}
