import { RigPlan } from "@/components/drawings/rig-plan";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { moveTo, PLAN } from "./address";
import type { Step } from "./walk-plan";

type WalkPlaceProps = { walk: string; step: Step; total: number; count?: string };

/** Where one stands: the station, its place on the plan, and which check of how many. A tap shows the stations. */
export function WalkPlace({ walk, step: { station, place }, total, count }: WalkPlaceProps) {
  return (
    <button
      type="button"
      aria-label={walkingWords.plan.open}
      aria-describedby="walk-place"
      onClick={() => moveTo({ walk, at: PLAN })}
      className="-my-2 flex min-h-field w-full flex-wrap items-center justify-between gap-x-2.5 px-4 py-1.5 text-left text-base"
    >
      <span className="min-w-0 font-extrabold">{station.title}</span>
      <RigPlan station={station.key} />
      <span id="walk-place" className="tabular">
        {count ?? fieldWords.walk.place(place, total)}
      </span>
    </button>
  );
}
