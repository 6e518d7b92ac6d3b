import { useId, type ReactNode } from "react";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import {
  fieldsShown,
  isFilled,
  partIn,
  parts,
  type Part,
  type PartKey,
} from "@/lib/domain/sheet/draft-sections";
import { BookChoice } from "./book-choice";
import { useDraftDesk } from "./draft-context";
import { FieldLine } from "./field-line";

/** One thing of the sheet: the fields that the list hangs on, and behind a fold those for limits and geometry. */
export function PartFields({ part: key, alone = false }: { part: PartKey; alone?: boolean }) {
  const part = parts[key];
  const { sheet } = useDraftDesk();
  const { first, more } = fieldsShown(sheet, part);
  const values = partIn(sheet, part) ?? {};
  const filled = more.filter((field) => isFilled(values[field])).length;
  return (
    <Group title={part.title} hidden={alone}>
      {part.thing && <BookChoice part={part} />}
      <Lines part={part} keys={first} />
      {more.length > 0 && (
        <details className="group border-b border-rule">
          <summary className="flex min-h-14 flex-wrap items-center justify-between gap-x-3 font-semibold">
            <span className="underline decoration-2 underline-offset-4">{words.more}</span>
            <span className="tabular text-base text-soft">{words.moreCount(filled, more.length)}</span>
          </summary>
          <div className="border-l-4 border-rule pl-4">
            <Lines part={part} keys={more} />
          </div>
        </details>
      )}
    </Group>
  );
}

function Lines({ part, keys }: { part: Part; keys: readonly string[] }) {
  return keys.map((key) => (
    <FieldLine
      key={key}
      name={`${part.path.join(".")}.${key}`}
      field={part.fields[key]!}
      words={part.words[key]!}
    />
  ));
}

type GroupProps = { title: string; lead?: string; hidden?: boolean; children: ReactNode };

/** Fields that belong together under their name. */
export function Group({ title, lead, hidden = false, children }: GroupProps) {
  const id = useId();
  return (
    <div role="group" aria-labelledby={id} className="mt-2 mb-8">
      <h3
        id={id}
        className={hidden ? "sr-only" : "border-b-hair border-ink pb-1 text-xl leading-tight font-extrabold"}
      >
        {title}
      </h3>
      {lead && <p className="mt-2 max-w-prose text-base text-soft">{lead}</p>}
      {children}
    </div>
  );
}
