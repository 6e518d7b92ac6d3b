import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import {
  fieldsShown,
  isFilled,
  partIn,
  parts,
  partShows,
  sectionKeys,
  sectionParts,
} from "@/lib/domain/sheet/draft-sections";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { useDraftDesk } from "./draft-context";
import type { Go } from "./place-links";

/** What the list hangs on and nobody has filled in yet, section by section. */
export function Missing({ onGo }: { onGo: Go }) {
  const { sheet } = useDraftDesk();
  const sections = sectionKeys
    .map((section) => ({ section, labels: missingIn(sheet, section) }))
    .filter(({ labels }) => labels.length > 0);
  if (sections.length === 0) return <p className="mt-2">{words.missingNone}</p>;
  return (
    <>
      <p className="mt-2 max-w-prose text-base text-soft">{words.missingLead}</p>
      <ul className="mt-2">
        {sections.map(({ section, labels }) => (
          <li key={section} className="border-t border-rule">
            <button
              type="button"
              onClick={() => onGo(section)}
              className="min-h-13 w-full py-2 text-left leading-snug"
            >
              <span className="font-semibold underline underline-offset-4">{words.sections[section]}</span>
              <span className="block text-base">{labels.join(", ")}</span>
            </button>
          </li>
        ))}
      </ul>
    </>
  );
}

function missingIn(sheet: Sheet, section: keyof typeof sectionParts): string[] {
  return sectionParts[section]
    .filter((key) => partShows(sheet, key))
    .flatMap((key) => {
      const part = parts[key];
      const asked = key === "procedure" && sheet.procedure?.says === "how" ? manualNeeds : null;
      return fieldsShown(sheet, part)
        .first.filter((field) => (asked ?? [field]).includes(field))
        .filter((field) => !isFilled(partIn(sheet, part)?.[field]))
        .map((field) => part.words[field]!.label);
    });
}

// The rest of a manual's procedure is there only where the manual names it.
const manualNeeds = ["says", "manual", "page", "bar", "endState"];
