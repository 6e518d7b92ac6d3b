import { PartDrawing } from "@/components/drawings/part-drawing";
import { Button } from "@/components/ui/button";
import { outcomes, type Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { stepsOf } from "./walk-plan";

const words = walkingWords.paper;
const boxes = outcomes.map((outcome) => ({ outcome, label: words.columns[outcome] }));

type PaperCardProps = { rig: BundleRig; purpose: Purpose; onBack: () => void };

/** One list on paper: a row a check with four boxes, for pen and clipboard. */
export function PaperCard({ rig, purpose, onBack }: PaperCardProps) {
  const steps = stepsOf(rig.revision.document, { purpose, depth: "full" });
  return (
    <main className="mx-auto w-full max-w-[60rem] pb-10 print:max-w-none print:text-[10pt] print:leading-tight">
      <div className="acts-two px-3 py-3 print:hidden">
        <Button variant="good" onClick={() => window.print()}>
          {words.toPrinter}
        </Button>
        <Button variant="quiet" onClick={onBack}>
          {words.back}
        </Button>
      </div>
      <article className="paper-card px-4">
        <h1 className="text-[1.75rem] leading-tight font-extrabold">{words.cardTitle(purpose, rig.name)}</h1>
        <p className="pt-1">{words.rule}</p>
        <p className="pt-1 font-semibold">{words.heldBy(words.hold)}</p>
        <p className="flex flex-wrap gap-x-6 pt-6 pb-3">
          <Line label={words.date} />
          <Line label={words.who} />
        </p>
        <table className="w-full border-t-[3px] border-ink text-left">
          <thead>
            <tr className="align-bottom text-base print:text-[8pt]">
              <th scope="col" colSpan={3} />
              {boxes.map(({ outcome, label }) => (
                <th
                  key={outcome}
                  scope="col"
                  className="w-14 px-1 py-1 text-center leading-tight font-semibold"
                >
                  {label}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {steps.map(({ check, station, place }, at) => (
              <tr key={check.key} className="break-inside-avoid border-t-hair border-rule align-top">
                <td className="tabular py-2 pr-2">{place}</td>
                <td className="w-16 py-2 print:w-12" aria-hidden="true">
                  <PartDrawing part={check.part} side={check.side} drawn={check.drawn} size="small" />
                </td>
                <td className="px-3 py-2">
                  {steps[at - 1]?.station.key !== station.key && (
                    <span className="block text-base font-extrabold print:text-[9pt]">{station.title}</span>
                  )}
                  <span className="block font-semibold">
                    {check.ask} <span className="font-normal">({words[check.effect]})</span>
                  </span>
                  <span className="block text-base text-soft print:text-[9pt]">{check.how}</span>
                  <span className="mt-5 block border-b-hair border-rule text-sm text-soft">
                    {words.noted}
                  </span>
                </td>
                {boxes.map(({ outcome, label }) => (
                  <td key={outcome} className="py-2 text-center">
                    <span
                      role="img"
                      aria-label={label}
                      className="inline-block size-8 border-2 border-ink print:size-6"
                    />
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
        <p className="border-t-hair border-rule pt-3 text-base print:text-[8pt]">
          {words.notStatement} {words.revision(rig.revision.digest.slice(0, 12))}. {fieldWords.product}
        </p>
      </article>
    </main>
  );
}

function Line({ label }: { label: string }) {
  return (
    <span className="flex min-w-56 flex-1 items-end gap-2">
      {label} <span className="flex-1 border-b-2 border-ink" />
    </span>
  );
}
