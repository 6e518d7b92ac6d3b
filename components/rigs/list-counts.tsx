import Link from "next/link";
import { purposes } from "@/lib/domain/entry";
import { rigWords as words } from "@/lib/domain/messages/rigs";
import { purposeWords } from "@/lib/domain/messages/walk";
import type { RevisionDocument } from "@/lib/domain/revision";
import { sheetIn } from "@/lib/domain/sheet/sheet";
import { buttonClass } from "../ui/button";

type ListCountsProps = {
  document: RevisionDocument;
  /** The rig whose reviewer's page is one tap away; none for a revision that is not its latest. */
  rig?: string;
};

/** How long each walk of a revision is, full and short. */
export function ListCounts({ document, rig }: ListCountsProps) {
  const written = sheetIn(document) !== null;
  const figure = "tabular py-1.5 pl-4 text-right text-[0.9375rem]";
  return (
    <section className="break-inside-avoid">
      <h2 className="text-xl leading-tight font-extrabold">{words.list}</h2>
      <p className="text-base text-soft">
        {written ? words.listSub(document.catalogue) : words.listByHand(document.catalogue)}
      </p>
      <table className="mt-3 w-full text-base">
        <thead>
          <tr className="border-b-hair border-ink text-sm text-soft">
            <th scope="col" className="py-1.5 text-left font-semibold">
              {words.listHeads.walk}
            </th>
            <th scope="col" className="py-1.5 pl-4 text-right font-semibold">
              {words.listHeads.full}
            </th>
            <th scope="col" className="py-1.5 pl-4 text-right font-semibold">
              {words.listHeads.short}
            </th>
          </tr>
        </thead>
        <tbody>
          {purposes.map((purpose) => (
            <tr key={purpose} className="border-b border-rule">
              <th scope="row" className="py-1.5 text-left font-normal">
                {purposeWords[purpose]}
              </th>
              <td className={figure}>{document.walks[purpose].full.length}</td>
              <td className={figure}>{document.walks[purpose].short.length}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {rig && written && (
        <Link
          href={`/desk/list?rig=${rig}`}
          prefetch={false}
          className={`${buttonClass("plain", "desk")} mt-3 w-full print:hidden`}
        >
          {words.review}
        </Link>
      )}
    </section>
  );
}
