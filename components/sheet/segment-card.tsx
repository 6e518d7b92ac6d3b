import { useWatch } from "react-hook-form";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { ListOutline } from "@/lib/domain/sheet/outline";
import { ConductorRows } from "./conductor-rows";
import { FieldLine } from "./field-line";
import { RowHead, RowList } from "./row-list";

type SegmentCardProps = {
  list: ListOutline;
  at: number;
  of: number;
  onMove: (by: -1 | 1) => void;
  onRemove: () => void;
};

/** One run of wires between two places, with what each wire does at either end and where it is spliced. */
export function SegmentCard({ list, at, of, onMove, onRemove }: SegmentCardProps) {
  const name = `wiring.segments.${at}`;
  const title = list.item(at + 1);
  const from = useWatch({ name: `${name}.from` }) as unknown;
  const to = useWatch({ name: `${name}.to` }) as unknown;
  const { fields, words: labels } = list;
  const [conductors, splices] = list.lists as [ListOutline, ListOutline];
  return (
    <div role="group" aria-label={title} className="border-2 border-ink p-3">
      <RowHead title={title} onRemove={onRemove} />
      {from && to ? (
        <p className="text-lg leading-tight font-extrabold">
          {words.segmentBetween(String(from), String(to))}
        </p>
      ) : null}
      <div className="mt-2 grid grid-cols-[repeat(auto-fit,minmax(min(100%,15rem),1fr))] gap-x-4 gap-y-3">
        {Object.entries(fields).map(([key, field]) => (
          <FieldLine key={key} name={`${name}.${key}`} field={field} words={labels[key]!} compact />
        ))}
      </div>
      <ConductorRows list={conductors} name={`${name}.conductors`} at={at} />
      <div role="group" aria-label={`${title}, ${splices.title}`} className="mt-4">
        <h4 className="font-extrabold">{splices.title}</h4>
        <p className="text-base text-soft">{words.splicesLead}</p>
        <RowList name={`${name}.splices`} list={splices} most={16} add={words.spliceAdd} />
      </div>
      {of > 1 && (
        <div className="mt-4 flex flex-wrap gap-x-5 border-t border-rule pt-1">
          <Move label={words.up} title={title} disabled={at === 0} onMove={() => onMove(-1)} />
          <Move label={words.down} title={title} disabled={at === of - 1} onMove={() => onMove(1)} />
        </div>
      )}
    </div>
  );
}

type MoveProps = { label: string; title: string; disabled: boolean; onMove: () => void };

function Move({ label, title, disabled, onMove }: MoveProps) {
  return (
    <button
      type="button"
      aria-label={words.moveAloud(label, title)}
      disabled={disabled}
      onClick={onMove}
      className="min-h-11 text-base underline underline-offset-4 disabled:text-soft disabled:no-underline"
    >
      {label}
    </button>
  );
}
