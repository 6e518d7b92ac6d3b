import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { progressOf, sectionKeys, sectionOf, type SectionKey } from "@/lib/domain/sheet/draft-sections";
import type { FieldError } from "@/lib/domain/problem";
import { useDraftDesk } from "./draft-context";

type ContentsProps = {
  section: SectionKey;
  faults: readonly FieldError[];
  onGo: (section: SectionKey) => void;
};

/** The sections of the sheet with how far each is, and what in it has to be mended. */
export function Contents({ section, faults, onGo }: ContentsProps) {
  const { sheet } = useDraftDesk();
  return (
    <nav aria-label={words.contents}>
      <ol>
        {sectionKeys.map((key) => {
          const { filled, of } = progressOf(sheet, key);
          // A name that nobody has given yet is not a mistake.
          const told = faults.filter(({ pointer }) => sheet.name || pointer !== "/name");
          const wrong = told.filter(({ pointer }) => sectionOf(pointer) === key).length;
          const current = key === section;
          return (
            <li key={key}>
              <button
                type="button"
                aria-current={current ? "step" : undefined}
                onClick={() => onGo(key)}
                className={`-ml-2.5 flex min-h-13 w-[calc(100%+0.625rem)] flex-wrap items-center justify-between gap-x-3 border-l-4 px-2.5 py-1 text-left text-base leading-tight @4xl:min-h-11 ${current ? "border-now font-extrabold" : "border-transparent font-semibold"}`}
              >
                <span>{words.sections[key]}</span>
                {wrong > 0 ? (
                  <span className="font-extrabold">{words.wrong(wrong)}</span>
                ) : (
                  of > 0 && (
                    <span className="tabular text-soft">
                      <span aria-hidden="true">{words.progress(filled, of)}</span>
                      <span className="sr-only">{words.progressAloud(filled, of)}</span>
                    </span>
                  )
                )}
              </button>
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
