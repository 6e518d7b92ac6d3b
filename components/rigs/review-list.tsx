import { useMemo } from "react";
import { compose } from "@/lib/domain/catalogue/compose";
import { review as reviewed } from "@/lib/domain/catalogue/review";
import type { Reviewed } from "@/lib/domain/catalogue/reviewed";
import { reviewWords as words } from "@/lib/domain/messages/review";
import { purposeWords } from "@/lib/domain/messages/walk";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import type { Review } from "./review-address";
import { ReviewCheck } from "./review-check";

type ReviewListProps = { sheet: Sheet; review: Review };

/** The catalogue's checks station by station in walking order, those that the reviewer asked for. */
export function ReviewList({ sheet, review }: ReviewListProps) {
  const all = useMemo(() => reviewed(sheet), [sheet]);
  const { list, walks } = useMemo(() => compose(sheet), [sheet]);
  const shown = all.filter((one) => fits(one, review));
  const listed = shown.filter((one) => one.listed).length;
  const walk = review.walk === null ? null : walks[review.walk].full;
  const asked = [
    review.show === "all" ? null : words.shows[review.show],
    review.walk && purposeWords[review.walk],
    review.holds ? words.holds : null,
  ].filter(Boolean);
  return (
    <>
      <p className="text-base">
        <span role="status" className="font-semibold">
          {shown.length > 0 ? words.shown(listed, shown.length - listed) : words.nothing}
        </span>
        {asked.length > 0 && <span className="hidden print:inline"> {asked.join(", ")}.</span>}
      </p>
      {list.stations.map(({ key, title }) => {
        const here = shown.filter(({ station }) => station === key);
        if (here.length === 0) return null;
        return (
          <section key={key} aria-labelledby={`at-${key}`} className="mt-6">
            <h2
              id={`at-${key}`}
              className="border-b-hair border-ink pb-1 text-xl leading-tight font-extrabold break-after-avoid"
            >
              {title}
            </h2>
            <ul>
              {here.map((one) => (
                <ReviewCheck key={one.id} reviewed={one} walk={walk} />
              ))}
            </ul>
          </section>
        );
      })}
    </>
  );
}

function fits({ listed, walks, check }: Reviewed, { show, walk, holds }: Review): boolean {
  if (show !== "all" && listed !== (show === "in")) return false;
  if (walk && !walks.includes(walk)) return false;
  return !holds || check.effect === "hold";
}
