import { clockText } from "@/lib/client/time-words";
import { markWords, walkWords } from "@/lib/domain/messages/desk";
import type { WalkPhoto } from "@/lib/domain/photo";
import { segmentOf, type ReadCheck } from "@/lib/domain/walk-reading";
import { MarkDetail } from "./mark-detail";
import { PhotoGallery } from "./photo-gallery";

type CheckRowProps = { read: ReadCheck; photos?: readonly WalkPhoto[] };

/** One check read back: what was asked, the mark that counts, when, its photographs, and the marks before it. */
export function CheckRow({ read: { check, asked, mark, earlier, segment }, photos = [] }: CheckRowProps) {
  const time = "tabular text-right text-[0.9375rem] text-soft";
  return (
    <li
      id={check.key}
      className="grid scroll-mt-4 grid-cols-[1.25rem_minmax(0,1fr)_auto] items-baseline gap-x-3 border-b border-rule py-2.5 text-base target:bg-shade @lg:grid-cols-[1.25rem_minmax(0,1fr)_10.5rem_4rem]"
    >
      <span aria-hidden="true" className="tape flex w-4 self-start pt-0.5">
        <span className={`tape-seg tape-${segment} h-5`} />
      </span>
      <p className="@max-lg:col-span-2">
        {check.ask}
        {!asked && <span className="block text-soft">{walkWords.notAsked}</span>}
      </p>
      <p
        className={`@max-lg:col-start-2 ${segment === "hold" ? "font-extrabold text-hold" : mark && "font-semibold"} ${mark ? "" : "text-soft"}`}
      >
        {mark ? markWords(check, mark.outcome, segment) : walkWords.notMarked}
      </p>
      <p className={time}>{mark && clockText(mark.elapsedMs)}</p>
      {mark && <MarkDetail mark={mark} />}
      {photos.length > 0 && (
        <div className="col-start-2 -col-end-1">
          <PhotoGallery photos={photos} of={check.ask} />
        </div>
      )}
      {earlier.length > 0 && (
        <ul className="col-start-2 -col-end-1 mt-1 text-sm text-soft">
          {earlier.map((was) => (
            <li key={was.seq} className="flex items-baseline justify-between gap-3">
              <span>
                <span className="sr-only">{walkWords.earlier}: </span>
                <s>{markWords(check, was.outcome, segmentOf(check, was.outcome))}</s>
                {was.note && <s>, {was.note}</s>}
              </span>
              <s className="tabular">{clockText(was.elapsedMs)}</s>
            </li>
          ))}
        </ul>
      )}
    </li>
  );
}
