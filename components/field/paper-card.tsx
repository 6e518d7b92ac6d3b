import { PartDrawing } from "@/components/drawings/part-drawing";
import { Button } from "@/components/ui/button";
import { outcomes, type Purpose } from "@/lib/domain/entry";
import type { BundleRig } from "@/lib/domain/field";
import { fieldWords } from "@/lib/domain/messages/field";
import { walkingWords } from "@/lib/domain/messages/walking";
import { stepsOf, type Step } from "./walk-plan";

const words = walkingWords.paper;

type PaperCardProps = { rig: BundleRig; purpose: Purpose; onBack: () => void };

/** One list on paper: a row a check with a box for each answer, for pen and clipboard. */
export function PaperCard({ rig, purpose, onBack }: PaperCardProps) {
  const steps = stepsOf(rig.revision.document, { purpose, depth: "full" });
  return (
    <main className="mx-auto w-full max-w-[60rem] pb-10 print:max-w-none print:pb-0 print:text-[10pt] print:leading-tight">
      <div className="acts-two px-3 py-3 print:hidden">
        <Button variant="good" onClick={() => window.print()}>
          {words.toPrinter}
        </Button>
        <Button variant="quiet" onClick={onBack}>
          {words.back}
        </Button>
      </div>
      <article className="px-4 print:px-0">
        <h1 className="text-[1.75rem] leading-tight font-extrabold print:text-[16pt]">
          {words.cardTitle(purpose, rig.name)}
        </h1>
        <p className="pt-1">{words.rule}</p>
        <p className="pt-1 font-semibold">{words.heldBy(words.hold)}</p>
        <p className="flex flex-wrap gap-x-6 gap-y-4 pt-6 pb-4">
          <Line label={words.date} />
          <Line label={words.who} />
        </p>
        <ol className="border-t-[3px] border-ink">
          {steps.map((step, at) => (
            <Row key={step.check.key} step={step} first={steps[at - 1]?.station.key !== step.station.key} />
          ))}
        </ol>
        <p className="border-t-hair border-rule pt-3 text-base print:text-[8pt]">
          {words.notStatement} {words.revision(rig.revision.digest.slice(0, 12))}. {fieldWords.product}
        </p>
      </article>
    </main>
  );
}

function Row({ step: { check, station, place }, first }: { step: Step; first: boolean }) {
  return (
    <li className="break-inside-avoid border-t-hair border-rule">
      {first && <h2 className="pt-2 font-extrabold print:pt-1">{station.title}</h2>}
      <div className="flex flex-wrap items-start gap-x-4 gap-y-2 py-2 print:py-1">
        <span className="tabular w-6 shrink-0">{place}</span>
        <span aria-hidden="true" className="w-16 shrink-0 print:w-12">
          <PartDrawing part={check.part} side={check.side} drawn={check.drawn} size="small" />
        </span>
        <span className="min-w-0 flex-[1_1_min(100%,14rem)]">
          <span className="block font-semibold">
            {check.ask} <span className="font-normal">({words[check.effect]})</span>
          </span>
          <span className="block text-base text-soft print:text-[9pt]">{check.how}</span>
          <span className="mt-6 block border-b-hair border-edge text-sm text-soft print:mt-3 print:text-[8pt]">
            {words.noted}
          </span>
        </span>
        <span className="flex max-w-full flex-wrap gap-x-2 gap-y-1 text-center text-sm leading-tight print:text-[7pt]">
          {outcomes.map((outcome) => (
            <span key={outcome} className="flex w-14 flex-col items-center gap-1 print:w-11">
              <span className="size-8 border-2 border-ink print:size-6" />
              {words.columns[outcome]}
            </span>
          ))}
        </span>
      </div>
    </li>
  );
}

function Line({ label }: { label: string }) {
  return (
    <span className="flex min-w-[min(100%,14rem)] flex-1 items-end gap-2">
      {label} <span className="flex-1 border-b-2 border-ink" />
    </span>
  );
}
