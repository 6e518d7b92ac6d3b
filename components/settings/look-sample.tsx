import { PartDrawing } from "@/components/drawings/part-drawing";
import { Strip, type StripStation } from "@/components/tape/strip";
import { buttonClass } from "@/components/ui/button";
import { settingsWords } from "@/lib/domain/messages/settings";

const words = settingsWords.sample;

const stations: StripStation[] = [
  { key: "a", segments: ["good", "good", "hold"] },
  { key: "b", segments: ["fix", "now", "todo"] },
  { key: "c", segments: ["todo", "todo", "todo"] },
];

/** A piece of a walk in the look, size and hand that are chosen: to be looked at, not touched. */
export function LookSample() {
  return (
    <figure aria-label={words.title} className="border-y-hair border-rule bg-paper">
      <div className="px-4 pt-3">
        <Strip stations={stations} label={words.strip} />
      </div>
      <div className="mx-auto max-w-96 px-4 py-2">
        <PartDrawing part="arm" side="left" />
      </div>
      <div aria-hidden="true" className="flex flex-col gap-2.5 px-3 pb-3" data-sample="acts">
        <div className="by-hand flex flex-wrap gap-2.5">
          <span className={`${buttonClass("good")} min-w-[min(100%,10.5rem)] flex-[2_1_0.625rem]`}>
            <span>{words.good}</span>
            <span className="mt-1 text-base leading-tight font-normal">{words.goodHint}</span>
          </span>
          <span className={`${buttonClass("fault-hold")} min-w-25 flex-1`}>{words.fault}</span>
        </div>
        <div className="by-hand flex flex-wrap gap-2.5">
          {words.others.map((label) => (
            <span key={label} className={`${buttonClass("quiet")} min-w-23 flex-1`}>
              {label}
            </span>
          ))}
        </div>
      </div>
    </figure>
  );
}
