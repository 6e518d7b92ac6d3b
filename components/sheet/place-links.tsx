import type { FieldError } from "@/lib/domain/problem";
import { placeOf } from "@/lib/domain/sheet/draft-places";
import type { SectionKey } from "@/lib/domain/sheet/draft-sections";
import { fieldId, nameOf } from "./places";

export type Go = (section: SectionKey, field?: string) => void;

type PlaceLinksProps = { errors: readonly FieldError[]; onGo: Go };

/** What is said of fields, each with the way to its field. */
export function PlaceLinks({ errors, onGo }: PlaceLinksProps) {
  return (
    <ul className="mt-2 flex flex-col">
      {errors.map(({ pointer, detail }) => {
        const place = placeOf(pointer);
        return (
          <li key={pointer + detail} className="border-t border-rule">
            <button
              type="button"
              onClick={() => onGo(place.section, fieldId(nameOf(place.pointer)))}
              className="min-h-13 w-full py-2 text-left leading-snug"
            >
              <span className="font-semibold underline underline-offset-4">{place.words}</span>
              {detail && <span className="block text-base">{detail}</span>}
            </button>
          </li>
        );
      })}
    </ul>
  );
}
