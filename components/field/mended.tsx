import { fieldWords } from "@/lib/domain/messages/field";
import type { Replay } from "@/lib/domain/replay";
import { checksOf, type RevisionDocument } from "@/lib/domain/revision";

type MendedProps = { document: RevisionDocument; marks: Replay["marks"] };

/** What was at fault on this walk and is good now, with what was done about it. */
export function Mended({ document, marks }: MendedProps) {
  const mended = [...checksOf(document).values()].flatMap(({ key, ask }) => {
    const because = marks.get(key)?.because;
    return because ? [{ key, ask, because }] : [];
  });
  if (mended.length === 0) return null;
  return (
    <section>
      <h3 className="px-4 pt-4 pb-1.5 font-extrabold">{fieldWords.result.mended}</h3>
      <ul className="border-t-hair border-rule">
        {mended.map(({ key, ask, because }) => (
          <li key={key} className="border-b-hair border-rule px-4 py-2.5">
            <span className="block leading-snug font-semibold">{ask}</span>
            <span className="block text-base text-soft">{because}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}
