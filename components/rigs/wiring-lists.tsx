import { wiringReadingWords as words } from "@/lib/domain/messages/rigs";
import { sheetReadingWords } from "@/lib/domain/messages/sheet-reading";
import { contactWords, groundWords, spliceWords } from "@/lib/domain/messages/sheet-wiring";
import { contactFields, groundFields, spliceFields, type Wiring } from "@/lib/domain/sheet/wiring";
import { SegmentReading } from "./segment-reading";
import { Value } from "./value";

/** The wiring as lists: the socket as measured, each run of wires, where they are joined, and the ground points. */
export function WiringLists({ wiring }: { wiring: Wiring | undefined }) {
  const { socket = [], segments = [], grounds = [] } = wiring ?? {};
  const joined = segments.flatMap(({ from, to, splices = [] }, at) =>
    splices.map((splice) => ({ splice, on: ends(from, to, at) })),
  );
  return (
    <>
      <Pairs
        title={sheetReadingWords.socket}
        heads={[contactWords.contact.label, contactWords.does.label]}
        rows={socket.map(({ contact, does }) => [
          <Value key="contact" field={contactFields.contact} value={contact} />,
          <Value key="does" field={contactFields.does} value={does} />,
        ])}
      />
      {segments.length > 0 && (
        <section className="mt-4">
          <h4 className="text-base font-extrabold">{sheetReadingWords.segments}</h4>
          <p className="text-base text-soft">{words.segmentsSub}</p>
          {segments.map((segment, at) => (
            <SegmentReading key={at} segment={segment} title={ends(segment.from, segment.to, at)} />
          ))}
        </section>
      )}
      <Pairs
        title={sheetReadingWords.splices}
        heads={[spliceWords.at.label, spliceWords.kind.label]}
        rows={joined.map(({ splice, on }) => [
          <span key="at">
            <Value field={spliceFields.at} value={splice.at} />
            <span className="block font-normal text-soft">{on}</span>
          </span>,
          <Value key="kind" field={spliceFields.kind} value={splice.kind} />,
        ])}
      />
      <Pairs
        title={sheetReadingWords.grounds}
        heads={[groundWords.at.label, groundWords.devices.label]}
        rows={grounds.map(({ at, devices }) => [
          <Value key="at" field={groundFields.at} value={at} />,
          <Value key="devices" field={groundFields.devices} value={devices} />,
        ])}
      />
    </>
  );
}

function ends(from: string | null | undefined, to: string | null | undefined, at: number): string {
  if (!from && !to) return sheetReadingWords.segment(at + 1);
  return words.title(from ?? words.untitledEnd, to ?? words.untitledEnd);
}

type PairsProps = { title: string; heads: [string, string]; rows: [React.ReactNode, React.ReactNode][] };

function Pairs({ title, heads, rows }: PairsProps) {
  if (rows.length === 0) return null;
  return (
    <section className="mt-4 break-inside-avoid">
      <h4 className="text-base font-extrabold">{title}</h4>
      <table aria-label={title} className="w-full table-fixed text-base">
        <thead>
          <tr className="border-b border-ink text-sm text-soft">
            {heads.map((head) => (
              <th key={head} scope="col" className="py-1 pr-3 text-left align-bottom font-semibold">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((cells, at) => (
            <tr key={at} className="border-b border-rule align-baseline">
              {cells.map((cell, column) => (
                <td key={column} className="py-1.5 pr-3 font-semibold">
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
