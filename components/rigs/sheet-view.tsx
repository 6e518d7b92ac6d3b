import { rigWords as words } from "@/lib/domain/messages/rigs";
import { readParts, type ReadPart } from "@/lib/domain/sheet/reading";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { Notice } from "../ui/notice";
import { PartLines } from "./part-lines";
import { ProcedurePhoto } from "./procedure-photo";
import { WiringLists } from "./wiring-lists";

/** A sheet read back as a workshop sheet: part by part, what is known, what is not, what nobody has looked for. */
export function SheetView({ sheet }: { sheet: Sheet | null }) {
  return (
    <section>
      <h2 className="text-xl leading-tight font-extrabold">{words.sheet}</h2>
      {sheet ? (
        <>
          <p className="text-base text-soft">{words.sheetSub}</p>
          {readParts(sheet).map((part) => (
            <Part key={part.key} part={part} sheet={sheet} />
          ))}
        </>
      ) : (
        <div className="mt-3">
          <Notice tone="plain">{words.noSheet}</Notice>
        </div>
      )}
    </section>
  );
}

function Part({ part, sheet }: { part: ReadPart; sheet: Sheet }) {
  return (
    <section aria-labelledby={`part-${part.key}`} className="mt-5 break-inside-avoid-page">
      <h3
        id={`part-${part.key}`}
        className="border-b-hair border-ink pb-1 text-lg leading-tight font-extrabold break-after-avoid"
      >
        {part.title}
      </h3>
      {part.there ? <PartLines part={part} /> : <p className="py-2 text-base">{words.notOnRig}.</p>}
      {part.key === "wiring" && <WiringLists wiring={sheet.wiring} />}
      {part.key === "procedure" && <ProcedurePhoto procedure={sheet.procedure} />}
    </section>
  );
}
