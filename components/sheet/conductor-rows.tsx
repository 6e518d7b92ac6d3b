import { useFieldArray, useFormContext, useWatch } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { conductorWords, optionWords } from "@/lib/domain/messages/sheet-wiring";
import { blankRow } from "@/lib/domain/sheet/draft";
import type { ListOutline } from "@/lib/domain/sheet/outline";
import { changing, conductorFields, wiresAt, type Conductor } from "@/lib/domain/sheet/wiring";
import { useDraftDesk } from "./draft-context";
import { FieldLine } from "./field-line";
import { RowHead, Where } from "./row-list";

/** As many wires as a sheet takes in one segment. */
const MOST = 16;

/** The wires of a segment: color, what each does at the near and at the far end, and a word where the two differ. */
export function ConductorRows({ list, name, at }: { list: ListOutline; name: string; at: number }) {
  const { fields: rows, append, remove } = useFieldArray({ name });
  const { getValues, setValue } = useFormContext();
  const { sheet } = useDraftDesk();
  const known = rows.length === 0 ? wiresAt(sheet.wiring ?? {}, at).slice(0, MOST) : [];
  const copy = () =>
    rows.forEach((_, at) => {
      const { near, far } = getValues(`${name}.${at}`) as Conductor;
      if (near && !far) setValue(`${name}.${at}.far`, near);
    });
  return (
    <div role="group" aria-label={list.title} className="mt-4">
      <h4 className="font-extrabold">{list.title}</h4>
      <Where words={conductorWords} />
      <div>
        {rows.map((row, at) => (
          <ConductorRow
            key={`${row.id} ${at}`}
            title={list.item(at + 1)}
            name={`${name}.${at}`}
            onRemove={() => remove(at)}
          />
        ))}
      </div>
      <div className="flex flex-wrap gap-2.5 pt-3">
        {known.length > 0 && (
          <Button
            size="desk"
            className="min-h-13"
            onClick={() => append(known.map((wire) => ({ ...blankRow(conductorFields), ...wire })))}
          >
            {at === 0 ? words.wiresOfSocket(known.length) : words.wiresOfSegment(known.length, at)}
          </Button>
        )}
        {rows.length < MOST && (
          <Button size="desk" className="min-h-13" onClick={() => append(blankRow(conductorFields))}>
            {words.conductorAdd}
          </Button>
        )}
        {rows.length > 0 && (
          <Button size="desk" variant="quiet" className="min-h-13" onClick={copy}>
            {words.copyFar}
          </Button>
        )}
      </div>
    </div>
  );
}

type ConductorRowProps = { title: string; name: string; onRemove: () => void };

function ConductorRow({ title, name, onRemove }: ConductorRowProps) {
  const wire = (useWatch({ name }) ?? {}) as Conductor;
  const differs = changing({ conductors: [wire] }).length > 0;
  const { color, near, far, tagged } = wire;
  return (
    <div role="group" aria-label={title} className="border-b border-rule py-3">
      <RowHead title={title} onRemove={onRemove} />
      <div className="grid grid-cols-2 gap-x-3 gap-y-2">
        <div className="col-span-2">
          <FieldLine
            name={`${name}.color`}
            field={conductorFields.color}
            words={conductorWords.color}
            compact
          />
        </div>
        <FieldLine name={`${name}.near`} field={conductorFields.near} words={conductorWords.near} compact />
        <FieldLine name={`${name}.far`} field={conductorFields.far} words={conductorWords.far} compact />
      </div>
      {differs && (
        <p role="status" className="mt-2 border-l-8 border-now pl-3 font-semibold">
          {words.changes(color || words.unnamedWire, optionWords[near!]!, optionWords[far!]!)}
        </p>
      )}
      {(differs || typeof tagged === "boolean" || tagged === null) && (
        <div className="mt-2">
          <FieldLine
            name={`${name}.tagged`}
            field={conductorFields.tagged}
            words={conductorWords.tagged}
            compact
          />
        </div>
      )}
    </div>
  );
}
