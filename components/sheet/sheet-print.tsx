import { usePreferences } from "@/components/settings/use-preferences";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { optionWords } from "@/lib/domain/messages/sheet-wiring";
import { itemWords, readParts, valueWords } from "@/lib/domain/sheet/reading";
import { changing } from "@/lib/domain/sheet/wiring";
import { useDraftDesk } from "./draft-context";

/** The draft on paper, as a workshop sheet: the sections one after the other, what is filled in and what is not known. */
export function SheetPrint() {
  const { sheet } = useDraftDesk();
  const { units } = usePreferences();
  const wires = (sheet.wiring?.segments ?? []).flatMap(changing);
  return (
    <div className="hidden text-base print:block">
      {readParts(sheet)
        .map((part) => ({ ...part, lines: [...part.known, ...part.unknown] }))
        .filter(({ lines, lists }) => lines.length > 0 || lists.some(({ items }) => items.length > 0))
        .map(({ key, title, lines, lists }) => (
          <section key={key} className="mt-4">
            <h2 className="border-b-hair border-ink text-lg font-extrabold">{title}</h2>
            <dl className="columns-2">
              {lines.map(({ pointer, label, field, value }) => (
                <div
                  key={pointer}
                  className="flex break-inside-avoid justify-between gap-3 border-b border-rule"
                >
                  <dt>{label}</dt>
                  <dd className="text-right font-semibold">{valueWords(field, value, units)}</dd>
                </div>
              ))}
            </dl>
            {lists.map(({ outline, items }) =>
              items.map((item, at) => (
                <p key={`${outline.key} ${at}`} className="break-inside-avoid border-b border-rule">
                  <span className="font-semibold">{outline.item(at + 1)}.</span>{" "}
                  {itemWords(outline, item, units)}
                </p>
              )),
            )}
          </section>
        ))}
      {wires.map(({ color, near, far }, at) => (
        <p key={at} className="mt-2 border-l-8 border-ink pl-3 font-semibold">
          {words.changes(color || words.unnamedWire, optionWords[near!]!, optionWords[far!]!)}
        </p>
      ))}
    </div>
  );
}
