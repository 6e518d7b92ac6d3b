import { useFieldArray } from "react-hook-form";
import { Button } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { FieldWords } from "@/lib/domain/messages/sheet-vehicles";
import { blankRow } from "@/lib/domain/sheet/draft";
import type { ListOutline } from "@/lib/domain/sheet/outline";
import { FieldLine } from "./field-line";

type RowListProps = {
  name: string;
  list: ListOutline;
  most: number;
  add: string;
  /** Rows that can be put in at once where there are none. */
  fill?: { label: string; rows: Record<string, unknown>[] };
};

/** Rows of a few fields each. Where to find them is said once, above. */
export function RowList({ name, list, most, add, fill }: RowListProps) {
  const { fields, words: of, item: called } = list;
  const { fields: rows, append, remove } = useFieldArray({ name });
  return (
    <>
      <Where words={of} />
      <div>
        {rows.map((row, at) => (
          <div key={row.id} role="group" aria-label={called(at + 1)} className="border-b border-rule py-3">
            <RowHead title={called(at + 1)} onRemove={() => remove(at)} />
            <div className="grid grid-cols-[repeat(auto-fit,minmax(min(100%,15rem),1fr))] gap-x-4 gap-y-2">
              {Object.entries(fields).map(([key, field]) => (
                <FieldLine
                  key={`${at} ${key}`}
                  name={`${name}.${at}.${key}`}
                  field={field}
                  words={of[key]!}
                  compact
                />
              ))}
            </div>
          </div>
        ))}
      </div>
      <div className="flex flex-wrap gap-2.5 pt-3">
        {fill && rows.length === 0 && (
          <Button
            size="desk"
            className="min-h-13"
            onClick={() => append(fill.rows.map((row) => ({ ...blankRow(fields), ...row })))}
          >
            {fill.label}
          </Button>
        )}
        {rows.length < most && (
          <Button size="desk" className="min-h-13" onClick={() => append(blankRow(fields))}>
            {add}
          </Button>
        )}
      </div>
    </>
  );
}

/** What the fields of a row are and where they are found, once for all rows. */
export function Where({ words: of }: { words: Record<string, FieldWords> }) {
  return (
    <dl className="mt-2 max-w-prose text-base leading-snug text-soft">
      {Object.values(of).map(({ label, where }) => (
        <div key={label}>
          <dt className="inline font-semibold">{label}: </dt>
          <dd className="inline">{where}</dd>
        </div>
      ))}
    </dl>
  );
}

type RowHeadProps = { title: string; onRemove: () => void };

/** The head of a row: which one it is, and the way to be rid of it. */
export function RowHead({ title, onRemove }: RowHeadProps) {
  return (
    <div className="flex flex-wrap items-center justify-between gap-x-3">
      <p className="tabular text-base text-soft">{title}</p>
      <button
        type="button"
        aria-label={words.removeAloud(title)}
        onClick={onRemove}
        className="min-h-11 px-2 text-base underline underline-offset-4"
      >
        {words.remove}
      </button>
    </div>
  );
}
