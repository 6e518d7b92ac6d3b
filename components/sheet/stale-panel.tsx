import { useEffect, useRef, useState } from "react";
import { usePreferences } from "@/components/settings/use-preferences";
import { Button } from "@/components/ui/button";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { placeOf } from "@/lib/domain/sheet/draft-places";
import { withField, type Conflict } from "@/lib/domain/sheet/draft-merge";
import { valueWords } from "@/lib/domain/sheet/reading";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import type { UnitSystem } from "@/lib/domain/units";
import type { Stale } from "./use-saving";

type Side = "mine" | "theirs";
type StalePanelProps = { stale: Stale; onSave: (stale: Stale, sheet: Sheet) => Promise<void> };

/** Two people saved at once: what each changed, and a choice where both changed the same field. */
export function StalePanel({ stale, onSave }: StalePanelProps) {
  const { reading, merged } = stale;
  const [chosen, setChosen] = useState<Record<string, Side>>({});
  const [asked, setAsked] = useState(false);
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  const open = merged.conflicts.filter(({ pointer }) => !chosen[pointer]);
  const save = () => {
    setAsked(true);
    if (open.length > 0) return;
    const sheet = merged.conflicts.reduce(
      (done, conflict) => withField(done, conflict.pointer, conflict[chosen[conflict.pointer]!]),
      merged.sheet,
    );
    void onSave(stale, sheet);
  };
  return (
    <div className="mt-3 border-2 border-ink p-4">
      <h3 ref={heading} tabIndex={-1} className="text-xl leading-tight font-extrabold outline-none">
        {words.staleTitle}
      </h3>
      <p className="mt-1">{words.staleLead(reading.revision.number, reading.revision.by?.name ?? null)}</p>
      <Changed title={words.theirs} pointers={merged.fromThem} />
      <Changed title={words.mine} pointers={merged.fromMe} />
      {merged.conflicts.length > 0 && <h4 className="mt-4 font-extrabold">{words.conflicts}</h4>}
      {merged.conflicts.map((conflict) => (
        <Choose
          key={conflict.pointer}
          conflict={conflict}
          chosen={chosen[conflict.pointer]}
          onChoose={(side) => setChosen({ ...chosen, [conflict.pointer]: side })}
        />
      ))}
      <Button variant="good" size="desk" onClick={save} className="mt-4 min-h-14 w-full text-lg">
        {words.saveMerged}
      </Button>
      <p role="status" className="mt-2 font-semibold">
        {asked && open.length > 0 && words.chooseFirst}
      </p>
    </div>
  );
}

function Changed({ title, pointers }: { title: string; pointers: readonly string[] }) {
  if (pointers.length === 0) return null;
  return (
    <>
      <h4 className="mt-4 font-extrabold">{title}</h4>
      <ul className="list-disc pl-5">
        {pointers.map((pointer) => (
          <li key={pointer}>{placeOf(pointer).words}</li>
        ))}
      </ul>
    </>
  );
}

type ChooseProps = { conflict: Conflict; chosen: Side | undefined; onChoose: (side: Side) => void };

function Choose({ conflict, chosen, onChoose }: ChooseProps) {
  const { units } = usePreferences();
  const { pointer } = conflict;
  const sides = [
    ["mine", words.takeMine],
    ["theirs", words.takeTheirs],
  ] as const;
  return (
    <fieldset className="mt-2 border-t border-rule pt-2">
      <legend className="float-left mb-2 w-full font-semibold">{placeOf(pointer).words}</legend>
      <div className="clear-both grid grid-cols-[repeat(auto-fit,minmax(min(100%,11rem),1fr))] gap-2">
        {sides.map(([side, label]) => (
          <label
            key={side}
            className="relative flex min-h-13 flex-col justify-center rounded-[3px] border-2 border-edge px-3 py-2 leading-tight has-checked:border-ink has-checked:bg-ink has-checked:text-paper"
          >
            <input
              type="radio"
              name={pointer}
              checked={chosen === side}
              onChange={() => onChoose(side)}
              className="absolute -inset-0.5 cursor-pointer appearance-none rounded-[3px]"
            />
            <span className="text-base">{label}</span>
            <span className="font-semibold">{sideText(pointer, conflict[side], units)}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}

function sideText(pointer: string, value: unknown, units: UnitSystem): string {
  if (value === undefined) return words.emptied;
  if (Array.isArray(value)) return words.lines(value.length);
  const { field } = placeOf(pointer);
  return field ? valueWords(field, value, units) : String(value);
}
